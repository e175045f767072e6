package clipramp.spread;

import clipramp.circuit.Design;
import clipramp.circuit.SampleDesigns;
import clipramp.engine.UnitValues;
import clipramp.power.SwiftPoint;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Threads;
import org.openjdk.jmh.annotations.Warmup;

/**
 * Units of the heater with every tolerance drawn, on two threads. The floor is the same draws by the same counting
 * generator (Chance: two rounds of a 64-bit mixer a draw) and one exponential and one logarithm a unit.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.SECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
@Threads(2)
public class SpreadBenchmark {
    private static final int POSITIONS = 11;

    private final Design design = SampleDesigns.heater();
    private final Lot lot = new Lot(design, Factors.of(design), DrawLaw.NORMAL, 1);
    private final UnitValues unit = lot.blank();
    private final SwiftPoint swift = new SwiftPoint(design);
    private long number;

    @Setup
    public void apart() {
        number = Thread.currentThread().getId() << 32;
    }

    @Benchmark
    public double units() {
        lot.draw(number++, unit);
        swift.solve(unit, unit.rampOhms(0.5));
        return swift.watts();
    }

    @Benchmark
    public double maps() {
        lot.draw(number++, unit);
        double sum = 0;
        for (int i = 0; i < POSITIONS; i++) {
            swift.solve(unit, unit.rampOhms(i / (POSITIONS - 1.0)));
            sum += swift.watts();
        }
        return sum;
    }

    @Benchmark
    public double floor() {
        lot.draw(number++, unit);
        return Math.exp(-unit.standoff) + Math.log(unit.capacitorFarads);
    }
}
