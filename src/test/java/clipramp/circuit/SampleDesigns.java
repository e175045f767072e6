package clipramp.circuit;

import clipramp.circuit.ClipSupply.Rectifier;
import clipramp.circuit.ClipSupply.Tap;
import clipramp.circuit.GateDrive.Coupling;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.ThyristorDevice.Gate;
import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.circuit.ThyristorDevice.Limits;
import clipramp.circuit.ThyristorDevice.NonTrigger;
import clipramp.circuit.ThyristorDevice.OnState;
import clipramp.circuit.ThyristorDevice.Quadrant;
import clipramp.circuit.Wanted.Goal;
import clipramp.circuit.Wanted.Measure;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Designs for tests of every room: scenarios of our own around JEDEC types. Device figures are those of the types'
 * sheets where a sheet has them; the rest (valley voltage, gate knee, on-state line) is typical of the class.
 */
public final class SampleDesigns {
    private SampleDesigns() {}

    /** A 1.2 kW heater on 230 V 50 Hz, bridge with the thyristor on its dc side, direct gate drive. */
    public static Design heater() {
        return new Design(
                "Drying cabinet",
                "",
                Document.EMPTY,
                line230(),
                Stage.BRIDGE_DC,
                new StageDiodes(0.9, 0),
                new Load.Resistor(230.0 * 230.0 / 1200),
                clip(Tap.LINE, Rectifier.BRIDGE, part(10_000, 0.05, 20), Optional.empty()),
                ramp(100e-9, 5_600, 68_000),
                unijunctionTrigger(39, 470),
                directGate(1_000),
                new Thyristor(scr16Amps(), OptionalDouble.of(4)),
                Optional.empty(),
                new Surroundings(0, 50),
                new Wanted(
                        Optional.of(new Goal(Measure.FRACTION, 0.12, 0.12, 0)),
                        Optional.of(new Goal(Measure.FRACTION, 0.9, 0.9, 1))),
                0.5,
                Map.of());
    }

    /** The heater with one thyristor and a single-diode supply: half the power at most. */
    public static Design halfWaveHeater() {
        Design heater = heater();
        return heater.withStage(Stage.HALF_WAVE)
                .withClip(clip(Tap.LINE, Rectifier.DIODE, part(10_000, 0.05, 12), Optional.empty()))
                .withWanted(new Wanted(Optional.empty(), Optional.empty()));
    }

    /** The heater with a triac, fired through a pulse transformer from a bridge across the line. */
    public static Design triacHeater() {
        return heater().withStage(Stage.TRIAC)
                .withGate(transformerGate(1))
                .withThyristor(new Thyristor(triac8Amps(), OptionalDouble.of(4)));
    }

    /** The heater with two thyristors in inverse parallel, fired through two secondaries. */
    public static Design inverseParallelHeater() {
        return heater().withStage(Stage.INVERSE_PARALLEL).withGate(transformerGate(2));
    }

    /** The heater on the ac side of the bridge, the supply across the thyristor: one pulse a half cycle. */
    public static Design thyristorTapHeater() {
        return heater().withStage(Stage.BRIDGE_AC)
                .withClip(clip(Tap.THYRISTOR, Rectifier.BRIDGE, part(10_000, 0.05, 20), Optional.empty()));
    }

    /** The triac heater with an isolated 24 V synchronising winding. */
    public static Design windingHeater(double lagRad, boolean opposite) {
        return triacHeater()
                .withClip(clip(
                        Tap.LINE,
                        Rectifier.BRIDGE,
                        part(470, 0.05, 5),
                        Optional.of(new Winding(230, 24, opposite, lagRad))));
    }

    /** The heater fired by a programmable unijunction transistor. */
    public static Design programmableHeater() {
        return heater().withTrigger(new Trigger.ProgrammableTrigger(
                        programmable2n6027(), part(47, 0.05, 0.5), part(10_000, 0.05, 0.25), part(18_000, 0.05, 0.25)))
                .withRamp(ramp(100e-9, 10_000, 68_000));
    }

    /** 230 V 50 Hz, 10 % either way. */
    public static Line line230() {
        return new Line(230, 50, 207, 253, List.of());
    }

    /** A part with a symmetrical tolerance (fraction) and a rating in watts. */
    public static Part part(double value, double tolerance, double ratedWatts) {
        return new Part(
                value, new Tolerance(tolerance, tolerance), OptionalDouble.of(ratedWatts), OptionalDouble.empty());
    }

    /** A supply of a 20 V zener and a dropping resistor rated 500 V. */
    public static ClipSupply clip(Tap tap, Rectifier rectifier, Part dropper, Optional<Winding> winding) {
        Part rated = new Part(dropper.value(), dropper.tolerance(), dropper.ratedWatts(), OptionalDouble.of(500));
        return new ClipSupply(tap, rectifier, 0.7, rated, zener20(), winding);
    }

    /** A 20 V 1 W zener, figures typical of the class. */
    public static Zener zener20() {
        return new Zener("zener-20v", Characteristic.of(19, 20, 21), 12.5e-3, 22, 0.85e-3, OptionalDouble.of(1));
    }

    /** Capacitor of 100 V, fixed resistor, linear pot that gives more power clockwise. */
    public static Ramp ramp(double farads, double fixedOhms, double trackOhms) {
        return new Ramp(
                new Part(farads, new Tolerance(0.1, 0.1), OptionalDouble.empty(), OptionalDouble.of(100)),
                part(fixedOhms, 0.05, 0.5),
                Optional.of(new Pot(
                        part(trackOhms, 0.2, 0.5), 0, new PotLaw.Linear(), Pot.Sense.FALLING, Optional.empty())));
    }

    public static Trigger.UnijunctionTrigger unijunctionTrigger(double baseOneOhms, double baseTwoOhms) {
        return new Trigger.UnijunctionTrigger(
                unijunction2n2646(), part(baseOneOhms, 0.05, 0.5), part(baseTwoOhms, 0.05, 0.5));
    }

    /** 2N2646, JEDEC type; V_V is on no sheet (common practice 1.5..3.5 V). */
    public static Unijunction unijunction2n2646() {
        return new Unijunction(
                "2n2646",
                Characteristic.of(0.56, 0.655, 0.75),
                Characteristic.of(4700, 7000, 9100),
                Characteristic.of(0.001, 0.005, 0.009),
                Characteristic.exactly(0.47),
                Characteristic.exactly(-2.5e-3),
                new Characteristic(OptionalDouble.empty(), OptionalDouble.of(1e-6), OptionalDouble.of(5e-6)),
                new Unijunction.Valley(
                        new Characteristic(OptionalDouble.of(4e-3), OptionalDouble.of(6e-3), OptionalDouble.empty()),
                        Characteristic.of(1.5, 2, 3.5),
                        20),
                new Unijunction.Saturation(Characteristic.exactly(3.5), 50e-3, 10),
                Optional.of(new Unijunction.Modulated(Characteristic.exactly(15e-3), 10)),
                Optional.of(new Unijunction.BaseOnePulse(OptionalDouble.of(3), OptionalDouble.of(5), 20, 0.2e-6, 20)),
                new Unijunction.Limits(
                        OptionalDouble.of(35),
                        OptionalDouble.of(2),
                        OptionalDouble.of(50e-3),
                        OptionalDouble.of(30),
                        OptionalDouble.of(10e-6),
                        OptionalDouble.of(30),
                        OptionalDouble.of(0.3),
                        OptionalDouble.of(3e-3)));
    }

    /** 2N6027, JEDEC type. */
    public static ProgrammableUnijunction programmable2n6027() {
        return new ProgrammableUnijunction(
                "2n6027",
                List.of(
                        new AtGateResistance(10e3, Characteristic.of(0.2, 0.35, 0.6)),
                        new AtGateResistance(1e6, Characteristic.of(0.2, 0.70, 1.6))),
                new Characteristic(OptionalDouble.empty(), OptionalDouble.of(0.8), OptionalDouble.of(1.5)),
                50e-3,
                List.of(
                        new AtGateResistance(
                                10e3,
                                new Characteristic(
                                        OptionalDouble.empty(), OptionalDouble.of(4e-6), OptionalDouble.of(5e-6))),
                        new AtGateResistance(
                                1e6,
                                new Characteristic(
                                        OptionalDouble.empty(), OptionalDouble.of(1.25e-6), OptionalDouble.of(2e-6)))),
                List.of(
                        new AtGateResistance(
                                10e3,
                                new Characteristic(
                                        OptionalDouble.of(70e-6), OptionalDouble.of(150e-6), OptionalDouble.empty())),
                        new AtGateResistance(
                                1e6,
                                new Characteristic(
                                        OptionalDouble.empty(), OptionalDouble.of(18e-6), OptionalDouble.of(50e-6)))),
                new ProgrammableUnijunction.Limits(
                        OptionalDouble.of(40),
                        OptionalDouble.of(5),
                        OptionalDouble.of(150e-3),
                        OptionalDouble.of(2),
                        OptionalDouble.of(20e-6),
                        OptionalDouble.of(0.3),
                        OptionalDouble.of(4e-3),
                        OptionalDouble.of(250e-6)));
    }

    public static GateDrive directGate(double shuntOhms) {
        return new GateDrive(
                Coupling.DIRECT,
                Part.of(0),
                Optional.of(part(shuntOhms, 0.05, 0.25)),
                3,
                20e-6,
                Polarity.POSITIVE,
                Optional.empty());
    }

    public static GateDrive transformerGate(int secondaries) {
        return new GateDrive(
                Coupling.TRANSFORMER,
                Part.of(0),
                Optional.of(part(1_000, 0.05, 0.25)),
                3,
                20e-6,
                Polarity.POSITIVE,
                Optional.of(new PulseTransformer(1, secondaries, 2e-3, 0.5, 0.5, true, OptionalDouble.of(250e-6))));
    }

    /** A 16 A SCR, 600 V, with a gate of the more sensitive kind; typical of the class. */
    public static ThyristorDevice scr16Amps() {
        return new ThyristorDevice(
                Kind.SCR,
                "scr-16a",
                new Gate(
                        0.7,
                        10,
                        new TriggerDemand(List.of(
                                new TriggerDemand.Point(-40, 20e-3, 1.5), new TriggerDemand.Point(25, 10e-3, 1.0))),
                        Map.of(),
                        Optional.of(new NonTrigger(0.2, 125)),
                        OptionalDouble.of(1.5e-6),
                        gateLimits()),
                Optional.of(curve(60e-3, 40e-3)),
                Optional.of(curve(45e-3, 30e-3)),
                OptionalDouble.of(50e-6),
                Optional.empty(),
                new OnState(1.0, 0.02),
                new Limits(
                        OptionalDouble.of(600),
                        OptionalDouble.of(16),
                        OptionalDouble.of(10),
                        OptionalDouble.of(160),
                        OptionalDouble.of(145),
                        OptionalDouble.of(125),
                        OptionalDouble.empty(),
                        OptionalDouble.empty()),
                OptionalDouble.of(1.5));
    }

    /** An 8 A triac, 600 V, specified in all four quadrants; typical of the class. */
    public static ThyristorDevice triac8Amps() {
        return new ThyristorDevice(
                Kind.TRIAC,
                "triac-8a",
                new Gate(
                        0.8,
                        10,
                        demand(10e-3, 1.3),
                        Map.of(
                                Quadrant.I_PLUS, demand(10e-3, 1.3),
                                Quadrant.I_MINUS, demand(10e-3, 1.3),
                                Quadrant.III_MINUS, demand(10e-3, 1.3),
                                Quadrant.III_PLUS, demand(25e-3, 1.3)),
                        Optional.of(new NonTrigger(0.2, 125)),
                        OptionalDouble.of(1.5e-6),
                        gateLimits()),
                Optional.of(curve(60e-3, 40e-3)),
                Optional.of(curve(45e-3, 30e-3)),
                OptionalDouble.empty(),
                Optional.empty(),
                new OnState(0.9, 0.05),
                new Limits(
                        OptionalDouble.of(600),
                        OptionalDouble.of(8),
                        OptionalDouble.of(8),
                        OptionalDouble.of(100),
                        OptionalDouble.of(40),
                        OptionalDouble.of(125),
                        OptionalDouble.empty(),
                        OptionalDouble.empty()),
                OptionalDouble.of(2.2));
    }

    private static GateLimits gateLimits() {
        return new GateLimits(
                OptionalDouble.of(2),
                OptionalDouble.of(10),
                OptionalDouble.of(5),
                OptionalDouble.of(20),
                OptionalDouble.of(1e-6),
                OptionalDouble.of(0.5));
    }

    private static TriggerDemand demand(double amps, double volts) {
        return new TriggerDemand(List.of(new TriggerDemand.Point(25, amps, volts)));
    }

    private static TemperatureCurve curve(double coldAmps, double amps) {
        return new TemperatureCurve(
                List.of(new TemperatureCurve.Point(-40, coldAmps), new TemperatureCurve.Point(25, amps)));
    }
}
