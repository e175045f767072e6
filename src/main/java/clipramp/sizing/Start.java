package clipramp.sizing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Part;
import clipramp.circuit.PotLaw;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Tolerance;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import clipramp.firing.PublishedRelations;
import clipramp.power.LoadPower;
import clipramp.units.PreferredSeries;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Where the search begins: every open part by a published relation or by common practice, one line each. */
final class Start {
    /** Supply current at the crest of the low line, A: bar, ramp and zener live on it (common practice). */
    static final double CREST_AMPS = 0.027;

    /** A winding's supply costs no heat at line potential, so that it may clip earlier. */
    static final double WINDING_CREST_AMPS = 0.043;

    /** A zener well under the crest clips early. */
    static final double ZENER_SHARE = 0.42;

    static final double WINDING_ZENER_SHARE = 0.5;
    private static final double MOST_ZENER_VOLTS = 20.5;

    /** Blocking voltage over the crest of the high line; what the margin asks to hold. */
    static final double VOLTS_RESERVE = 1.2;

    private static final double AMPS_RESERVE = 1.2;
    private static final double SENSITIVE_AMPS = 2e-3;
    private static final double LARGE_CAPACITOR = 220e-9;
    private static final double SMALL_CAPACITOR = 100e-9;
    private static final double STANDING_RESERVE = 1.3;
    private static final double MOST_BASE_ONE = 100;
    private static final double USUAL_BASE_TWO = 470;
    private static final double LEAST_BASE_TWO = 100;
    private static final double FINE_TOLERANCE = 0.01;
    private static final double USUAL_TOLERANCE = 0.05;
    private static final double TRACK_TOLERANCE = 0.1;

    private final SizingRequest request;
    private Design design;

    private Start(SizingRequest request) {
        this.request = request;
        this.design = request.design();
    }

    static Design of(SizingRequest request) {
        return of(request, Optional.empty());
    }

    /** Starts with the first thyristor whose gate is of the other class: sensitive in place of ordinary, or the reverse. */
    static List<Design> others(SizingRequest request) {
        if (!request.isOpen(OpenPart.THYRISTOR)) {
            return List.of();
        }
        List<ThyristorDevice> all = thyristors(request, request.design());
        return all.stream()
                .filter(d -> isSensitive(d) != isSensitive(all.get(0)))
                .findFirst()
                .map(d -> List.of(of(request, Optional.of(d))))
                .orElse(List.of());
    }

    private static Design of(SizingRequest request, Optional<ThyristorDevice> device) {
        Start start = new Start(request);
        start.bare();
        start.thyristor(device);
        start.supply();
        start.trigger();
        start.gate();
        start.ramp();
        return start.design;
    }

    /** Trimmers and what lies across the pot come last, if they are needed at all. */
    private void bare() {
        if (request.isOpen(OpenPart.LAW) && design.ramp().pot().isPresent()) {
            design = Edit.law(design, new PotLaw.Linear());
        }
        if (request.isOpen(OpenPart.TRIM_HIGH)) {
            design = Edit.trimHigh(design, Optional.empty());
        }
        if (request.isOpen(OpenPart.TRIM_LOW) && request.isOpen(OpenPart.ACROSS)) {
            design = Edit.trimLow(design, Optional.empty(), Optional.empty());
        }
    }

    /** A resistor of the request's series; the finer series are made to a finer tolerance (IEC 60063). */
    static Part resistor(SizingRequest request, double ohms) {
        double tolerance =
                request.series().perDecade() > PreferredSeries.E24.perDecade() ? FINE_TOLERANCE : USUAL_TOLERANCE;
        return new Part(
                request.series().nearest(ohms),
                new Tolerance(tolerance, tolerance),
                OptionalDouble.of(Stock.ratedWatts(0, 1)),
                OptionalDouble.empty());
    }

    private Part resistor(double ohms) {
        return resistor(request, ohms);
    }

    private void thyristor(Optional<ThyristorDevice> device) {
        if (request.isOpen(OpenPart.THYRISTOR)) {
            device.or(() -> thyristors(request, design).stream().findFirst())
                    .ifPresent(d -> design = Edit.thyristor(design, d));
        }
        if (request.isOpen(OpenPart.TRANSFORMER)) {
            design = Edit.transformer(
                    design,
                    new PulseTransformer(
                            1,
                            design.stage() == Stage.INVERSE_PARALLEL ? 2 : 1,
                            2e-3,
                            0.5,
                            0.5,
                            true,
                            OptionalDouble.of(250e-6)));
        }
    }

    /** Devices of the stage's kind that bear line and load, the smallest and easiest to drive first. */
    static List<ThyristorDevice> thyristors(SizingRequest request, Design design) {
        boolean triac = design.stage() == Stage.TRIAC;
        double crest = design.line().crestVolts(design.line().highVolts());
        Condition high = new Condition(design.line().highVolts(), design.line().hertz(), Condition.SHEET_CELSIUS);
        double amps = LoadPower.atFiringAngle(design, high, 0).thyristorRmsAmps();
        double cold = design.surroundings().coldestCelsius();
        return request.stock().thyristors().stream()
                .filter(d -> (d.kind() == ThyristorDevice.Kind.TRIAC) == triac)
                .filter(d -> d.limits().volts().orElse(0) >= VOLTS_RESERVE * crest)
                .filter(d -> d.limits().rmsAmps().orElse(0) >= AMPS_RESERVE * amps)
                .filter(d -> !triac
                        || d.gate()
                                .quadrants()
                                .keySet()
                                .containsAll(ThyristorDevice.quadrantsOf(
                                        design.gate().polarity())))
                .sorted(Comparator.comparingDouble(
                                (ThyristorDevice d) -> d.limits().rmsAmps().orElse(0))
                        .thenComparingDouble(d -> d.gate().trigger().ampsAt(cold))
                        .thenComparingDouble(d -> d.limits().volts().orElse(0))
                        .thenComparing(ThyristorDevice::id))
                .toList();
    }

    private boolean sensitive() {
        return isSensitive(design.thyristor().device());
    }

    private static boolean isSensitive(ThyristorDevice device) {
        return device.gate().trigger().ampsAt(Condition.SHEET_CELSIUS) < SENSITIVE_AMPS;
    }

    /** Crest of the low line as the supply sees it, V. */
    static double crestVolts(Design design) {
        double ratio = design.clip().windingRatio();
        return design.line().crestVolts(design.line().lowVolts()) * ratio;
    }

    private void supply() {
        boolean isolated = design.clip().isIsolated();
        if (request.isOpen(OpenPart.ZENER)) {
            double most =
                    Math.min(MOST_ZENER_VOLTS, (isolated ? WINDING_ZENER_SHARE : ZENER_SHARE) * crestVolts(design));
            List<Zener> zeners = request.stock().zeners();
            Optional<Zener> under = zeners.stream()
                    .filter(z -> z.volts().nominal() <= most)
                    .max(Comparator.comparingDouble(z -> z.volts().nominal()));
            under.or(() -> zeners.stream().findFirst()).ifPresent(z -> design = Edit.zener(design, z));
        }
        if (request.isOpen(OpenPart.DROPPER)) {
            design = Edit.dropper(design, resistor(Math.max(100, dropperOhms(design))));
        }
    }

    /** (crest of the low line - zener - rectifier)/crest current, ohm. */
    static double dropperOhms(Design design) {
        double drops = design.clip().rectifierVolts();
        double over = crestVolts(design) - design.clip().zener().volts().nominal() - drops;
        return over / (design.clip().isIsolated() ? WINDING_CREST_AMPS : CREST_AMPS);
    }

    private void trigger() {
        if (request.isOpen(OpenPart.TRIGGER_DEVICE)) {
            devices(request).stream().findFirst().ifPresent(d -> design = Edit.device(design, d));
        }
        if (request.isOpen(OpenPart.BASE_ONE)) {
            boolean byTransformer = design.gate().coupling() == GateDrive.Coupling.TRANSFORMER;
            double most =
                    byTransformer ? MOST_BASE_ONE : Math.min(MOST_BASE_ONE, standingOhms(design) / STANDING_RESERVE);
            design = Edit.baseOne(
                    design, resistor(request.series().atMost(Math.max(10, sensitive() && !byTransformer ? 22 : most))));
        }
        if (request.isOpen(OpenPart.BASE_TWO)) {
            design = Edit.baseTwo(design, resistor(baseTwoOhms(design)));
        }
        if (request.isOpen(OpenPart.UPPER) || request.isOpen(OpenPart.LOWER)) {
            design = Edit.divider(design, resistor(1000), resistor(1500));
        }
    }

    /** Strongest guaranteed pulse and largest valley current first. */
    static List<Unijunction> devices(SizingRequest request) {
        return request.stock().unijunctions().stream()
                .sorted(Comparator.comparingDouble((Unijunction u) -> -u.baseOnePulse()
                                .map(p -> p.minVolts().orElse(0))
                                .orElse(0.0))
                        .thenComparingDouble(u -> -u.valley().amps().lowest())
                        .thenComparing(Unijunction::id))
                .toList();
    }

    /** Largest base-one resistor by the standing gate voltage, ohm. */
    static double standingOhms(Design design) {
        double volts = design.thyristor()
                .device()
                .gate()
                .nonTrigger()
                .map(ThyristorDevice.NonTrigger::volts)
                .orElse(0.2);
        double supply = design.clip().zener().volts().nominal();
        return design.trigger() instanceof UnijunctionTrigger u
                ? PublishedRelations.largestBaseOneOhms(
                        volts, supply, u.device().interbaseOhms().lowest(), USUAL_BASE_TWO)
                : MOST_BASE_ONE;
    }

    /** Base two's resistor that keeps the peak point still over temperature, as far as that is one to build with, ohm. */
    static double baseTwoOhms(Design design) {
        return Math.max(LEAST_BASE_TWO, driftFreeOhms(design).orElse(USUAL_BASE_TWO));
    }

    /** Base two's resistor by dV_P/dT = 0 at the typical drifts, ohm. */
    static OptionalDouble driftFreeOhms(Design design) {
        if (!(design.trigger() instanceof UnijunctionTrigger u)) {
            return OptionalDouble.empty();
        }
        Unijunction d = u.device();
        return PublishedRelations.driftFreeBaseTwoOhms(
                d.standoff().nominal(),
                design.clip().zener().volts().nominal(),
                d.interbaseOhms().nominal(),
                d.interbaseDriftPerKelvin().nominal(),
                d.emitterDriftVoltsPerKelvin().nominal(),
                u.baseOne().value());
    }

    private void gate() {
        if (request.isOpen(OpenPart.SERIES)) {
            design = Edit.series(design, sensitive() ? resistor(150) : Part.of(0));
        }
        if (request.isOpen(OpenPart.SHUNT)) {
            design = Edit.shunt(design, Optional.of(resistor(1000)));
        }
    }

    private void ramp() {
        if (request.isOpen(OpenPart.CAPACITOR)) {
            double farads = request.capacitorSeries().nearest(sensitive() ? SMALL_CAPACITOR : LARGE_CAPACITOR);
            design = Edit.capacitor(
                    design,
                    new Part(
                            farads,
                            new Tolerance(USUAL_TOLERANCE, USUAL_TOLERANCE),
                            OptionalDouble.empty(),
                            OptionalDouble.of(Stock.capacitorVolts(0))));
        }
        if (request.isOpen(OpenPart.FIXED)) {
            design = Edit.fixed(design, resistor(3900));
        }
        if (request.isOpen(OpenPart.TRACK) && design.ramp().pot().isPresent()) {
            design = Edit.track(
                    design,
                    new Part(
                            25e3,
                            new Tolerance(TRACK_TOLERANCE, TRACK_TOLERANCE),
                            OptionalDouble.of(0.5),
                            OptionalDouble.empty()));
        }
    }
}
