package clipramp.firing;

import clipramp.circuit.Characteristic;
import clipramp.circuit.ClipSupply;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Document;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.Part;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.Ramp;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.Surroundings;
import clipramp.circuit.TemperatureCurve;
import clipramp.circuit.Thyristor;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger;
import clipramp.circuit.TriggerDemand;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Wanted;
import clipramp.circuit.Winding;
import clipramp.circuit.Zener;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;

/**
 * Circuits drawn over the whole range that somebody might build: unijunction transistor, direct coupling, resistive
 * load; every stage that such a drive can serve, lines of 24 to 400 V, ramps from the latched-on low end to a stall. A
 * seed always gives the same circuit.
 */
final class RandomCircuits {
    /** One drawn circuit and what it is solved at. */
    record Drawn(long seed, Design design, Condition condition, double rampOhms) {
        @Override
        public String toString() {
            return "seed " + seed + " (" + design.title() + ", " + condition + ", R_E " + rampOhms + ")";
        }
    }

    private enum Build {
        BRIDGE_LINE,
        DIODE_LINE,
        THYRISTOR_TAP,
        BRIDGE_WINDING,
        DIODE_WINDING
    }

    private final SplittableRandom random;

    private RandomCircuits(long seed) {
        random = new SplittableRandom(seed);
    }

    static Drawn draw(long seed) {
        RandomCircuits circuits = new RandomCircuits(seed);
        while (true) {
            Drawn drawn = circuits.circuit(seed);
            if (isADevice(drawn)) {
                return drawn;
            }
        }
    }

    /** The same with a programmable device, a pulse transformer or both. */
    static Drawn drawCoupled(long seed) {
        RandomCircuits circuits = new RandomCircuits(seed);
        while (true) {
            Drawn drawn = circuits.circuit(seed);
            if (isADevice(drawn)) {
                return circuits.random.nextInt(3) == 0
                        ? circuits.programmable(drawn)
                        : circuits.throughTransformer(
                                circuits.random.nextBoolean() ? drawn : circuits.programmable(drawn));
            }
        }
    }

    /** Ranges around the sheets of the class: data-sheet figures of programmable unijunction transistors. */
    private Drawn programmable(Drawn drawn) {
        OptionalDouble none = OptionalDouble.empty();
        double spread = linear(0.5, 2);
        ProgrammableUnijunction device = new ProgrammableUnijunction(
                "drawn",
                List.of(at(10e3, linear(0.2, 0.5)), at(1e6, linear(0.5, 1))),
                Characteristic.exactly(linear(0.7, 1.2)),
                50e-3,
                List.of(at(10e3, 4e-6 * spread), at(1e6, 1.25e-6 * spread)),
                List.of(at(200, 3e-3 * spread), at(10e3, 150e-6 * spread), at(1e6, 18e-6 * spread)),
                new ProgrammableUnijunction.Limits(none, none, none, none, none, none, none, none));
        double share = linear(0.4, 0.8);
        double gateOhms = logarithmic(11e3, 300e3);
        Trigger trigger = new Trigger.ProgrammableTrigger(
                device, drawn.design().trigger().baseOne(), Part.of(gateOhms / share), Part.of(gateOhms / (1 - share)));
        return new Drawn(drawn.seed(), drawn.design().withTrigger(trigger), drawn.condition(), drawn.rampOhms());
    }

    private static ProgrammableUnijunction.AtGateResistance at(double gateOhms, double value) {
        return new ProgrammableUnijunction.AtGateResistance(gateOhms, Characteristic.exactly(value));
    }

    private Drawn throughTransformer(Drawn drawn) {
        GateDrive gate = drawn.design().gate();
        boolean inversePair = drawn.design().stage().isFullWave()
                && drawn.design().clip().tap() == ClipSupply.Tap.LINE
                && random.nextInt(3) == 0;
        PulseTransformer transformer = new PulseTransformer(
                oneOf(1.0, 1.0, 2.0, linear(0.7, 3)),
                inversePair ? 2 : 1,
                logarithmic(0.2e-3, 20e-3),
                logarithmic(0.1, 5),
                logarithmic(0.1, 5),
                random.nextBoolean(),
                OptionalDouble.empty());
        Design design = drawn.design()
                .withGate(new GateDrive(
                        GateDrive.Coupling.TRANSFORMER,
                        gate.series(),
                        gate.shunt(),
                        gate.overdrive(),
                        gate.chargeSeconds(),
                        gate.polarity(),
                        Optional.of(transformer)));
        return new Drawn(
                drawn.seed(),
                inversePair ? design.withStage(Stage.INVERSE_PARALLEL) : design,
                drawn.condition(),
                drawn.rampOhms());
    }

    /** The same circuit with windings that have no resistance and a diode that resets the core. */
    static Drawn withIdealWindings(Drawn drawn) {
        GateDrive gate = drawn.design().gate();
        PulseTransformer own = gate.transformer().orElseThrow();
        PulseTransformer ideal = new PulseTransformer(
                own.ratio(), own.secondaries(), own.magnetisingHenries(), 0, 0, true, OptionalDouble.empty());
        GateDrive through = new GateDrive(
                gate.coupling(),
                gate.series(),
                gate.shunt(),
                gate.overdrive(),
                gate.chargeSeconds(),
                gate.polarity(),
                Optional.of(ideal));
        return new Drawn(drawn.seed(), drawn.design().withGate(through), drawn.condition(), drawn.rampOhms());
    }

    /** Independent figures do not always make a unijunction: its saturated line must rise and end under the peak. */
    private static boolean isADevice(Drawn drawn) {
        ReferenceParameters p = new ReferenceParameters(drawn.design(), drawn.condition(), drawn.rampOhms());
        double baseOne = 1 / (1 / p.baseOneOhms + 1 / (p.seriesOhms + 1 / p.shuntSiemens));
        double peak = (baseOne + p.standoff * p.interbaseOhms) / (baseOne + p.interbaseOhms + p.baseTwoOhms);
        double valley = p.intercept
                + p.slopeOhms * p.valleySiemens
                + p.baseOneOhms * (p.valleySiemens + 1 / (p.baseTwoOhms + p.onBaseTwoOhms));
        return p.slopeOhms > 1 && p.slopeOhms < 200 && p.intercept > 0 && valley < 0.8 * peak;
    }

    private Drawn circuit(long seed) {
        double lineVolts = logarithmic(24, 400);
        double hertz = random.nextBoolean() ? 50 : 60;
        Build build = oneOf(
                Build.BRIDGE_LINE,
                Build.BRIDGE_LINE,
                Build.BRIDGE_LINE,
                Build.DIODE_LINE,
                Build.THYRISTOR_TAP,
                Build.BRIDGE_WINDING,
                Build.BRIDGE_WINDING,
                Build.DIODE_WINDING);
        Optional<Winding> winding = build == Build.BRIDGE_WINDING || build == Build.DIODE_WINDING
                ? Optional.of(new Winding(
                        lineVolts, linear(24, 60), random.nextBoolean(), Math.toRadians(oneOf(0.0, linear(-20, 20)))))
                : Optional.empty();
        Stage stage = switch (build) {
            case BRIDGE_LINE -> Stage.BRIDGE_DC;
            case DIODE_LINE, DIODE_WINDING -> Stage.HALF_WAVE;
            case THYRISTOR_TAP -> Stage.BRIDGE_AC;
            case BRIDGE_WINDING -> oneOf(Stage.BRIDGE_DC, Stage.BRIDGE_AC, Stage.TRIAC, Stage.HALF_WAVE);
        };
        Condition condition = new Condition(lineVolts, hertz, oneOf(25.0, linear(-20, 70)));
        Unijunction device = device();
        double crest = Math.sqrt(2) * winding.map(Winding::secondaryVolts).orElse(lineVolts);
        ClipSupply clip = clip(build, crest, device, winding);
        // One in seven is starved (a large ramp resistor stalls), one in seven has the large capacitor and small
        // resistor
        // that hunt or latch on at the knob's low end.
        int size = random.nextInt(7);
        double farads = size == 0 ? logarithmic(2e-9, 6e-9) : size == 1 ? linear(2e-7, 1e-6) : logarithmic(2e-9, 1e-6);
        double share = size == 0 ? linear(0.5, 1.5) : size == 1 ? linear(0.03, 0.4) : linear(0.06, 1.4);
        double ohms = share
                * condition.halfCycleSeconds()
                / (farads * Math.log(1 / (1 - device.standoff().nominal())));
        double rampOhms = Math.min(2e7, Math.max(800, ohms));
        Design design = new Design(
                build + " " + stage
                        + (clip.winding().isPresent() ? " " + clip.winding().get() : ""),
                "",
                Document.EMPTY,
                new Line(lineVolts, hertz, lineVolts * 0.9, lineVolts * 1.1, harmonics()),
                stage,
                new StageDiodes(linear(0.6, 1.1), linear(0, 0.02)),
                new Load.Resistor(lineVolts * lineVolts / logarithmic(50, 2400)),
                clip,
                new Ramp(Part.of(farads), Part.of(rampOhms), Optional.empty()),
                new Trigger.UnijunctionTrigger(
                        device,
                        Part.of(logarithmic(10, 150)),
                        Part.of(random.nextInt(8) == 0 ? 0 : logarithmic(1, 1500))),
                gate(),
                thyristor(stage),
                Optional.empty(),
                new Surroundings(-20, 70),
                new Wanted(Optional.empty(), Optional.empty()),
                0.5,
                Map.of());
        return new Drawn(seed, design, condition, rampOhms);
    }

    private List<Line.Harmonic> harmonics() {
        List<Line.Harmonic> harmonics = new ArrayList<>();
        if (random.nextInt(3) == 0) {
            harmonics.add(new Line.Harmonic(oneOf(3, 5, 7), linear(0.005, 0.05), linear(-Math.PI, Math.PI)));
            if (random.nextInt(3) == 0) {
                harmonics.add(new Line.Harmonic(2, linear(0.002, 0.02), linear(-Math.PI, Math.PI)));
            }
        }
        return harmonics;
    }

    private ClipSupply clip(Build build, double crest, Unijunction device, Optional<Winding> winding) {
        double zenerVolts = Math.min(linear(12, 27), 0.85 * crest);
        double barAmps = zenerVolts / device.interbaseOhms().nominal();
        double zenerAmps = random.nextInt(10) == 0 ? -0.3 * barAmps : linear(1e-3, 12e-3);
        boolean diode = build == Build.DIODE_LINE || build == Build.DIODE_WINDING;
        return new ClipSupply(
                build == Build.THYRISTOR_TAP ? ClipSupply.Tap.THYRISTOR : ClipSupply.Tap.LINE,
                diode ? ClipSupply.Rectifier.DIODE : ClipSupply.Rectifier.BRIDGE,
                linear(0.5, 1),
                Part.of((crest - zenerVolts) / (barAmps + zenerAmps)),
                new Zener(
                        "zener",
                        Characteristic.exactly(zenerVolts),
                        linear(3e-3, 10e-3),
                        linear(2, 30),
                        linear(-5e-4, 1e-3),
                        OptionalDouble.of(5)),
                winding);
    }

    /** Between the sheets of the class: data-sheet figures of unijunction transistors. */
    private Unijunction device() {
        OptionalDouble none = OptionalDouble.empty();
        return new Unijunction(
                "drawn",
                Characteristic.exactly(linear(0.5, 0.85)),
                Characteristic.exactly(linear(4e3, 12e3)),
                Characteristic.exactly(linear(0.001, 0.009)),
                Characteristic.exactly(linear(0.4, 0.65)),
                Characteristic.exactly(linear(-3e-3, -2e-3)),
                Characteristic.exactly(logarithmic(0.2e-6, 8e-6)),
                new Unijunction.Valley(
                        Characteristic.exactly(linear(2e-3, 10e-3)), Characteristic.exactly(linear(1, 3)), 20),
                new Unijunction.Saturation(Characteristic.exactly(linear(2, 4)), 50e-3, oneOf(10.0, 20.0)),
                random.nextInt(5) == 0
                        ? Optional.empty()
                        : Optional.of(new Unijunction.Modulated(Characteristic.exactly(linear(8e-3, 20e-3)), 10)),
                random.nextInt(3) > 0
                        ? Optional.empty()
                        : Optional.of(new Unijunction.BaseOnePulse(
                                OptionalDouble.of(3), OptionalDouble.of(linear(4, 8)), 20, 0.2e-6, 20)),
                new Unijunction.Limits(none, none, none, none, none, none, none, none));
    }

    private GateDrive gate() {
        return new GateDrive(
                GateDrive.Coupling.DIRECT,
                Part.of(random.nextInt(3) == 0 ? 0 : logarithmic(1, 100)),
                random.nextInt(5) == 0 ? Optional.empty() : Optional.of(Part.of(logarithmic(100, 2200))),
                3,
                20e-6,
                GateDrive.Polarity.POSITIVE,
                Optional.empty());
    }

    private Thyristor thyristor(Stage stage) {
        OptionalDouble none = OptionalDouble.empty();
        TriggerDemand demand =
                new TriggerDemand(List.of(new TriggerDemand.Point(25, logarithmic(0.2e-3, 30e-3), linear(0.6, 1.5))));
        boolean triac = stage == Stage.TRIAC;
        return new Thyristor(
                new ThyristorDevice(
                        triac ? ThyristorDevice.Kind.TRIAC : ThyristorDevice.Kind.SCR,
                        "drawn",
                        new ThyristorDevice.Gate(
                                linear(0.5, 0.9),
                                linear(5, 40),
                                demand,
                                triac
                                        ? Map.of(
                                                ThyristorDevice.Quadrant.I_PLUS, demand,
                                                ThyristorDevice.Quadrant.III_PLUS, demand)
                                        : Map.of(),
                                Optional.of(new ThyristorDevice.NonTrigger(0.2, 125)),
                                OptionalDouble.of(oneOf(1e-9, linear(0.5e-6, 3e-6))),
                                new ThyristorDevice.GateLimits(none, none, none, none, none, none)),
                        Optional.of(TemperatureCurve.at25(logarithmic(1e-3, 0.1))),
                        Optional.of(TemperatureCurve.at25(1e-3)),
                        none,
                        Optional.empty(),
                        new ThyristorDevice.OnState(linear(0, 1), linear(0, 0.1)),
                        new ThyristorDevice.Limits(none, none, none, none, none, none, none, none),
                        none),
                OptionalDouble.of(1));
    }

    private double linear(double from, double to) {
        return from + (to - from) * random.nextDouble();
    }

    private double logarithmic(double from, double to) {
        return from * Math.exp(Math.log(to / from) * random.nextDouble());
    }

    @SafeVarargs
    private <T> T oneOf(T... choices) {
        return choices[random.nextInt(choices.length)];
    }
}
