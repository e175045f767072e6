package clipramp.firing;

import clipramp.circuit.Condition;
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
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * The nominal heater at mid-knob, from a discharged capacitor to the periodic state: by the swift path, by the reference
 * path, and by Commons Math's DormandPrince853 with event handling at the accuracy of {@link AgainstIntegratorTest}.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class IntegratorBenchmark {
    private final Design design = SampleDesigns.heater();
    private final Condition condition = design.nominalCondition();
    private final double rampOhms = design.ramp().rampOhms(0.5);
    private final UnitValues unit = UnitValues.nominal(design);
    private final SwiftPoint swift = new SwiftPoint(design);

    @Benchmark
    public double swiftPath() {
        swift.solve(unit, rampOhms);
        return swift.firingRad();
    }

    @Benchmark
    public Object referencePath() {
        return Firing.solve(design, condition, rampOhms);
    }

    @Benchmark
    public Object dormandPrince() {
        return ReferenceIntegrator.solve(design, condition, rampOhms);
    }
}
