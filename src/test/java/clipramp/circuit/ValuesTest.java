package clipramp.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.ClipSupply.Tap;
import clipramp.circuit.PotLaw.Table.Point;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.Unijunction.BaseOnePulse;
import clipramp.circuit.Wanted.Goal;
import clipramp.circuit.Wanted.Measure;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What a part's record takes, what it refuses and at which edge, and the figure that stands for a spread. */
class ValuesTest {
    private static final OptionalDouble NONE = OptionalDouble.empty();

    @Test
    void theNominalFigureIsTheTypicalOneElseTheMiddleElseWhatThereIs() {
        assertThat(Characteristic.of(1, 5, 6).nominal()).isEqualTo(5);
        Characteristic limits = new Characteristic(OptionalDouble.of(1), NONE, OptionalDouble.of(4));
        assertThat(limits.nominal()).isEqualTo(2.5);
        assertThat(limits.lowest()).isEqualTo(1);
        assertThat(limits.highest()).isEqualTo(4);
        Characteristic least = new Characteristic(OptionalDouble.of(3), NONE, NONE);
        assertThat(least.nominal()).isEqualTo(3);
        assertThat(least.highest()).isEqualTo(3);
        Characteristic most = new Characteristic(NONE, NONE, OptionalDouble.of(7));
        assertThat(most.nominal()).isEqualTo(7);
        assertThat(most.lowest()).isEqualTo(7);
        assertThat(Characteristic.of(2, 2, 2).lowest()).isEqualTo(2);
    }

    @Test
    void partsReachFromTheirLowerToTheirUpperTolerance() {
        Part part = new Part(1000, new Tolerance(0.1, 0.2), NONE, NONE);
        assertThat(part.lowest()).isCloseTo(900, within(1e-9));
        assertThat(part.highest()).isCloseTo(1200, within(1e-9));
        assertThat(part.withValue(50).highest()).isCloseTo(60, within(1e-9));
        assertThat(new Tolerance(0, 0.1).isNone()).isFalse();
        assertThat(new Tolerance(0.1, 0).isNone()).isFalse();
        assertThat(Tolerance.NONE.isNone()).isTrue();
    }

    private static ThrowingCallable making(ThrowingCallable made) {
        return made;
    }

    private static Arguments refused(String says, ThrowingCallable made) {
        return Arguments.of(says, made);
    }

    static Stream<Arguments> refusals() {
        return Stream.of(
                refused("above zero", () -> new Condition(0, 50, 25)),
                refused("line frequency", () -> new Condition(230, 0, 25)),
                refused("temperature", () -> new Condition(230, 50, Double.NaN)),
                refused("line voltage", () -> new Condition(Double.POSITIVE_INFINITY, 50, 25)),
                refused("out of order", () -> new Line(230, 50, 231, 253, List.of())),
                refused("out of order", () -> new Line(230, 50, 207, 229, List.of())),
                refused("low line voltage", () -> new Line(230, 50, 0, 253, List.of())),
                refused("line frequency", () -> new Line(230, -50, 207, 253, List.of())),
                refused("2..100", () -> new Line.Harmonic(1, 0.1, 0)),
                refused("2..100", () -> new Line.Harmonic(101, 0.1, 0)),
                refused("harmonic share", () -> new Line.Harmonic(3, 1.01, 0)),
                refused("harmonic phase", () -> new Line.Harmonic(3, 0.1, Double.NaN)),
                refused("at least one", () -> new Characteristic(NONE, NONE, NONE)),
                refused("out of order", () -> Characteristic.of(2, 1, 3)),
                refused("out of order", () -> Characteristic.of(2, 4, 3)),
                refused("out of order", () -> new Characteristic(OptionalDouble.of(4), NONE, OptionalDouble.of(3))),
                refused("part value", () -> Part.of(-1)),
                refused("tolerance below", () -> new Tolerance(1.01, 0)),
                refused("tolerance above", () -> new Tolerance(0, -0.01)),
                refused("load resistance", () -> new Load.Resistor(0)),
                refused("cold ratio must be 1 or more", () -> new Load.Resistor(10, 0.99)),
                refused("cold ratio must be 1 or more", () -> new Load.Resistor(10, Double.POSITIVE_INFINITY)),
                refused("load resistance", () -> new Load.Inductive(0, 1, Optional.empty())),
                refused("load inductance", () -> new Load.Inductive(1, 0, Optional.empty())),
                refused("rated power", () -> new Load.Filament(0, 230, 1.55, 12)),
                refused("rated voltage", () -> new Load.Filament(100, 0, 1.55, 12)),
                refused("power exponent", () -> new Load.Filament(100, 230, 0, 12)),
                refused("cold ratio", () -> new Load.Filament(100, 230, 1.55, 0.5)),
                refused("winding primary", () -> new Winding(0, 24, false, 0)),
                refused("winding secondary", () -> new Winding(230, 0, false, 0)),
                refused("winding lag", () -> new Winding(230, 24, false, Math.PI / 2)),
                refused("winding lag", () -> new Winding(230, 24, false, -Math.PI / 2)),
                refused("coldest", () -> new Surroundings(31, 30)),
                refused("coldest", () -> new Surroundings(Double.NaN, 30)),
                refused("hottest", () -> new Surroundings(0, Double.POSITIVE_INFINITY)),
                refused("snubber resistance", () -> new Snubber(0, 1e-7)),
                refused("snubber capacitance", () -> new Snubber(100, 0)),
                refused("stage diode drop", () -> new StageDiodes(-0.1, 0)),
                refused("stage diode slope", () -> new StageDiodes(0.9, -0.1)),
                refused("low to high", () -> new Goal(Measure.WATTS, 2, 1, 0)),
                refused("knob position", () -> new Goal(Measure.WATTS, 1, 2, 1.1)),
                refused("transformer ratio", () -> transformer(0, 1, 1e-3, 0, 0)),
                refused("magnetising", () -> transformer(1, 1, 0, 0, 0)),
                refused("primary resistance", () -> transformer(1, 1, 1e-3, -1, 0)),
                refused("secondary resistance", () -> transformer(1, 1, 1e-3, 0, -1)),
                refused("not 0", () -> transformer(1, 0, 1e-3, 0, 0)),
                refused("not 3", () -> transformer(1, 3, 1e-3, 0, 0)),
                refused("zener voltage", () -> zener(0, 5e-3, 20, 0)),
                refused("test current", () -> zener(20, -1e-3, 20, 0)),
                refused("zener slope", () -> zener(20, 5e-3, 0, 0)),
                refused("zener drift", () -> zener(20, 5e-3, 20, Double.NaN)),
                refused("overdrive", () -> Changed.with(SampleDesigns.directGate(1000), "overdrive", 0.9)),
                refused("charge time", () -> Changed.with(SampleDesigns.directGate(1000), "chargeSeconds", -1e-6)),
                refused(
                        "goes with transformer",
                        () -> Changed.with(SampleDesigns.directGate(1000), "coupling", GateDrive.Coupling.TRANSFORMER)),
                refused(
                        "goes with transformer",
                        () -> Changed.with(SampleDesigns.transformerGate(1), "coupling", GateDrive.Coupling.DIRECT)),
                refused("diode drop", () -> Changed.with(SampleDesigns.heater(), "clip.diodeDropVolts", -0.1)),
                refused("dropping resistor", () -> Changed.with(SampleDesigns.heater(), "clip.dropper.value", 0.0)),
                refused(
                        "excludes tap thyristor",
                        () -> Changed.with(SampleDesigns.windingHeater(0, false), "clip.tap", Tap.THYRISTOR)),
                refused("resistor derating", () -> SampleDesigns.heater().withResistorDerating(1.1)),
                refused("standoff ratio", () -> device("standoff", Characteristic.exactly(1.1))),
                refused("interbase resistance", () -> device("interbaseOhms", Characteristic.exactly(0))),
                refused("emitter diode drop", () -> device("emitterDropVolts", Characteristic.exactly(-0.1))),
                refused("peak-point current", () -> device("peakCurrentAmps", Characteristic.exactly(-1e-6))),
                refused("valley current", () -> device("valley.amps", Characteristic.exactly(0))),
                refused("valley voltage", () -> device("valley.volts", Characteristic.exactly(0))),
                refused("valley point", () -> device("valley.atVolts", 0.0)),
                refused("saturation voltage", () -> device("saturation.volts", Characteristic.exactly(0))),
                refused("saturation current", () -> device("saturation.amps", 0.0)),
                refused("saturation point", () -> device("saturation.atVolts", 0.0)),
                refused("modulated interbase current", () -> device("modulated.amps", Characteristic.exactly(0))),
                refused("modulated current", () -> device("modulated.atVolts", 0.0)),
                refused("min or typ", () -> new BaseOnePulse(NONE, NONE, 20, 2e-7, 20)),
                refused("test supply", () -> new BaseOnePulse(NONE, OptionalDouble.of(5), 0, 2e-7, 20)),
                refused("test capacitor", () -> new BaseOnePulse(NONE, OptionalDouble.of(5), 20, 0, 20)),
                refused("base-one resistor", () -> new BaseOnePulse(NONE, OptionalDouble.of(5), 20, 2e-7, 0)),
                refused("gate resistance", () -> new AtGateResistance(0, Characteristic.exactly(1))),
                refused("at least one row", () -> programmable("offsetVolts", List.of())),
                refused("at least one row", () -> programmable("peakCurrentAmps", List.of())),
                refused("forward voltage", () -> programmable("forwardVolts", Characteristic.exactly(0))),
                refused("forward current", () -> programmable("forwardAmps", 0.0)),
                refused("at least one point", () -> new TemperatureCurve(List.of())),
                refused("current must be", () -> TemperatureCurve.at25(0)),
                refused("temperature", () -> new TemperatureCurve.Point(Double.NaN, 1)),
                refused("at least one point", () -> new TriggerDemand(List.of())),
                refused("trigger current", () -> new TriggerDemand.Point(25, 0, 1)),
                refused("trigger voltage", () -> new TriggerDemand.Point(25, 1, 0)),
                refused("non-trigger", () -> new ThyristorDevice.NonTrigger(0, 125)),
                refused("on-state threshold", () -> new ThyristorDevice.OnState(-1, 0)),
                refused("on-state slope", () -> new ThyristorDevice.OnState(1, -0.1)),
                refused("gate knee", () -> SampleDesigns.scr16Amps().gate().withJunction(-0.1, 10)),
                refused("gate slope", () -> SampleDesigns.scr16Amps().gate().withJunction(0.7, 0)),
                refused("pot track", () -> pot("track.value", 0.0)),
                refused("pot end", () -> pot("endOhms", -1.0)),
                refused("ramp capacitor", () -> Changed.with(SampleDesigns.heater(), "ramp.capacitor.value", 0.0)),
                refused("fixed ramp resistor", () -> new Ramp(Part.of(1e-7), Part.of(0), Optional.empty())),
                refused(
                        "there is none",
                        () -> new Ramp(
                                Part.of(1e-7),
                                Part.of(1000),
                                Optional.empty(),
                                new Trimmers(Optional.empty(), Optional.of(Part.of(1e5))))),
                refused("between 0 and 0.5", () -> new PotLaw.Logarithmic(0.5)),
                refused("between 0 and 0.5", () -> new PotLaw.Logarithmic(0)),
                refused("between 0 and 0.5", () -> new PotLaw.ReverseLogarithmic(0.5)),
                refused("rotation 0 to rotation 1", () -> table(0.1, 0, 1, 1)),
                refused("rotation 0 to rotation 1", () -> table(0, 0, 0.9, 1)),
                refused("rotation 0 to rotation 1", () -> new PotLaw.Table(List.of(new Point(0, 0)))),
                refused("never fall", () -> table(0, 0, 0.5, 0.5, 1, 0.4)),
                refused("never fall", () -> table(0, 0, 0.5, 0.2, 0.5, 0.4, 1, 1)),
                refused("track share", () -> table(0, 0, 1, 1.2)),
                refused("rotation", () -> new Point(-0.1, 0)));
    }

    @ParameterizedTest(name = "{index} {0}")
    @MethodSource("refusals")
    void refusesWhatNoPartCanBeAndSaysWhichFigure(String says, ThrowingCallable made) {
        assertThatThrownBy(made)
                .satisfies(e -> assertThat(rootOf(e))
                        .isInstanceOf(IllegalArgumentException.class)
                        .hasMessageContaining(says));
    }

    static Stream<ThrowingCallable> edges() {
        return Stream.of(
                making(() -> new Line(230, 50, 230, 230, List.of())),
                making(() -> new Line.Harmonic(2, 0, 0)),
                making(() -> new Line.Harmonic(100, 1, -7)),
                making(() -> Characteristic.of(2, 2, 2)),
                making(() -> Part.of(0)),
                making(() -> new Tolerance(1, 9)),
                making(() -> new Load.Resistor(10, 1)),
                making(() -> new Surroundings(25, 25)),
                making(() -> new Goal(Measure.ANGLE, 1, 1, 1)),
                making(() -> transformer(1, 2, 1e-3, 0, 0)),
                making(() -> zener(20, 0, 20, -1e-3)),
                making(() -> new StageDiodes(0, 0)),
                making(() -> Changed.with(SampleDesigns.directGate(1000), "overdrive", 1.0)),
                making(() -> Changed.with(SampleDesigns.heater(), "clip.diodeDropVolts", 0.0)),
                making(() -> Changed.with(SampleDesigns.heater(), "ramp.fixed.value", 0.0)),
                making(() -> table(0, 0.3, 0.5, 0.3, 1, 0.3)),
                making(() -> table(0, 0, 1, 1)),
                making(() -> pot("endOhms", 0.0)));
    }

    @ParameterizedTest
    @MethodSource("edges")
    void takesWhatLiesJustOnTheEdge(ThrowingCallable made) {
        assertThatCode(made).doesNotThrowAnyException();
    }

    private static Throwable rootOf(Throwable e) {
        return e.getCause() == null ? e : rootOf(e.getCause());
    }

    private static PulseTransformer transformer(double ratio, int secondaries, double henries, double p, double s) {
        return new PulseTransformer(ratio, secondaries, henries, p, s, false, NONE);
    }

    private static Zener zener(double volts, double amps, double slope, double drift) {
        return new Zener("z", Characteristic.exactly(volts), amps, slope, drift, NONE);
    }

    private static Unijunction device(String path, Object value) {
        return Changed.with(SampleDesigns.unijunction2n2646(), path, value);
    }

    private static ProgrammableUnijunction programmable(String path, Object value) {
        return Changed.with(SampleDesigns.programmable2n6027(), path, value);
    }

    private static Pot pot(String path, Object value) {
        return Changed.with(SampleDesigns.heater().ramp().pot().orElseThrow(), path, value);
    }

    private static PotLaw.Table table(double... pairs) {
        Point[] points = new Point[pairs.length / 2];
        for (int i = 0; i < points.length; i++) {
            points[i] = new Point(pairs[2 * i], pairs[2 * i + 1]);
        }
        return new PotLaw.Table(List.of(points));
    }

    @Test
    void tablesAgainstGateResistanceAreKeptInOrder() {
        List<AtGateResistance> falling = List.of(
                new AtGateResistance(1e6, Characteristic.exactly(0.7)),
                new AtGateResistance(1e4, Characteristic.exactly(0.35)));
        assertThat(programmable("offsetVolts", falling).offsetVolts())
                .extracting(AtGateResistance::gateOhms)
                .containsExactly(1e4, 1e6);
    }

    @Test
    void aBandOfOneValueIsNone() {
        assertThat(new Goal(Measure.WATTS, 1, 1, 0).isBand()).isFalse();
        assertThat(new Goal(Measure.WATTS, 1, 2, 0).isBand()).isTrue();
    }

    @Test
    void baseOnePulsesStandForTheirTypicalValueElseTheirLeast() {
        assertThat(new BaseOnePulse(OptionalDouble.of(3), OptionalDouble.of(5), 20, 2e-7, 20).nominalVolts())
                .isEqualTo(5);
        assertThat(new BaseOnePulse(OptionalDouble.of(3), NONE, 20, 2e-7, 20).nominalVolts())
                .isEqualTo(3);
    }

    @ParameterizedTest
    @ValueSource(doubles = {50, 60, 400})
    void halfAnAngularTurnTakesHalfACycle(double hertz) {
        Condition condition = new Condition(230, hertz, 25);
        assertThat(condition.omega() * condition.halfCycleSeconds()).isCloseTo(Math.PI, within(1e-12));
        assertThat(condition.halfCycleSeconds() * 2 * hertz).isCloseTo(1, within(1e-12));
    }

    @Test
    void aFilamentsHotResistanceIsThatOfItsRating() {
        // Joule's law: 230 V, 100 W: 529 ohm.
        Load.Filament lamp = new Load.Filament(100, 230, 1.55, 12);
        assertThat(lamp.resistanceOhms()).isCloseTo(529, within(1e-9));
        assertThat(((Load) lamp).coldRatio()).isEqualTo(12);
        assertThat(new Load.Inductive(1, 1, Optional.empty()).coldRatio()).isEqualTo(1);
        assertThat(new Winding(230, 24, false, 0).ratio()).isCloseTo(24 / 230.0, within(1e-15));
    }
}
