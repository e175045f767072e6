package clipramp.files;

import com.code_intelligence.jazzer.junit.FuzzTest;
import org.junit.jupiter.api.condition.EnabledIfEnvironmentVariable;

/**
 * Coverage-guided search for inputs that break the reader. {@code JAZZER_FUZZ=1 mvn test -Dtest=DesignFuzzTest} searches,
 * beginning at the saved corpus; {@link FuzzCorpusTest} reads that corpus in every ordinary run, where the fuzzer's agent
 * would slow down all other tests in the same JVM.
 */
@EnabledIfEnvironmentVariable(named = "JAZZER_FUZZ", matches = ".+")
class DesignFuzzTest {
    @FuzzTest(maxDuration = "5m")
    void readsAnyBytes(byte[] bytes) {
        FuzzCorpusTest.readEveryWay(bytes);
    }
}
