package clipramp.files;

import com.code_intelligence.jazzer.junit.FuzzTest;
import org.junit.jupiter.api.condition.EnabledIfEnvironmentVariable;

/**
 * Coverage-guided search for inputs that break a reader. {@code JAZZER_FUZZ=1 mvn test -Dtest=DesignFuzzTest#readsAnyBytes}
 * searches for one target, beginning at its saved corpus; {@link FuzzCorpusTest} reads every corpus in every ordinary run,
 * where the fuzzer's agent would slow down all other tests in the same JVM.
 */
@EnabledIfEnvironmentVariable(named = "JAZZER_FUZZ", matches = ".+")
class DesignFuzzTest {
    @FuzzTest(maxDuration = "20m")
    void readsAnyBytes(byte[] bytes) {
        FuzzTarget.DESIGN.read(bytes);
    }

    @FuzzTest(maxDuration = "15m")
    void readsAnyReadings(byte[] bytes) {
        FuzzTarget.READINGS.read(bytes);
    }

    @FuzzTest(maxDuration = "10m")
    void readsAnyRecordedLine(byte[] bytes) {
        FuzzTarget.RECORDED_LINE.read(bytes);
    }

    @FuzzTest(maxDuration = "15m")
    void readsAnyQuantity(byte[] bytes) {
        FuzzTarget.QUANTITY.read(bytes);
    }
}
