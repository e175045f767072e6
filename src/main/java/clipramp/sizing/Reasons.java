package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.PotLaw;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import clipramp.margins.Margin;
import clipramp.margins.MarginKind;
import clipramp.margins.Verdict;
import clipramp.runs.Watch;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.CancellationException;
import java.util.stream.Collectors;

/** Says of every chosen part why it is what it is, and what its neighbours would do. */
public final class Reasons {
    private static final int FIGURES = 3;
    private static final int MOST_NAMED = 2;
    private static final double LEAST_CHANGE = 0.01;

    private final SizingRequest request;
    private final SizingAnswer answer;
    private final Design design;
    private final Reach reach;

    private Reasons(SizingRequest request, SizingAnswer answer) {
        this.request = request;
        this.answer = answer;
        this.design = answer.design();
        this.reach = Reach.of(design);
    }

    /**
     * One reason for each open part that the design has, in the order of the signal. Each neighbour is judged by the engine.
     *
     * @param request what the answer was found for
     * @param answer the design as sized
     */
    public static List<Reason> of(SizingRequest request, SizingAnswer answer) {
        return of(request, answer, Watch.NONE);
    }

    /**
     * The same, watched.
     *
     * @param request what the answer was found for
     * @param answer the design as sized
     * @param watch told of parts done, of all open ones; may end it
     * @throws CancellationException where the watch cancelled
     */
    public static List<Reason> of(SizingRequest request, SizingAnswer answer, Watch watch) {
        Reasons reasons = new Reasons(request, answer);
        List<Reason> all = new ArrayList<>();
        int done = 0;
        for (OpenPart part : request.open()) {
            watch.step("finding the reasons", done++, request.open().size());
            reasons.relation(part)
                    .ifPresent(relation -> all.add(
                            new Reason(part, relation, reasons.neighbour(part, 1), reasons.neighbour(part, -1))));
        }
        return all;
    }

    private Optional<String> relation(OpenPart part) {
        return switch (part) {
            case ZENER -> Optional.of(zener());
            case DROPPER -> Optional.of(dropper());
            case CAPACITOR -> Optional.of(capacitor());
            case FIXED -> Optional.of(fixed());
            case TRACK -> design.ramp().pot().map(p -> track());
            case LAW -> design.ramp().pot().map(p -> law());
            case ACROSS -> across();
            case TRIM_HIGH -> design.ramp().trimmers().high().map(t -> trimHigh());
            case TRIM_LOW -> design.ramp().trimmers().low().map(t -> trimLow());
            case TRIGGER_DEVICE -> Optional.of(device());
            case BASE_ONE -> Optional.of(baseOne());
            case BASE_TWO -> baseTwo();
            case UPPER, LOWER -> divider();
            case SERIES -> Optional.of(series());
            case SHUNT -> design.gate().shunt().map(p -> "holds the gate down between pulses: 1 kΩ is common practice");
            case TRANSFORMER -> design.gate().transformer().map(t -> "a small pulse transformer, typical of the class");
            case THYRISTOR -> Optional.of(thyristor());
            case SINK -> sink();
        };
    }

    private String zener() {
        double crest = Start.crestVolts(design);
        double share = design.clip().isIsolated() ? Start.WINDING_ZENER_SHARE : Start.ZENER_SHARE;
        return "well under the low line's crest, so that it clips early: V_Z <= " + text(share, Unit.FRACTION) + " x "
                + text(crest, Unit.VOLT) + " = " + text(share * crest, Unit.VOLT);
    }

    private String dropper() {
        double amps = design.clip().isIsolated() ? Start.WINDING_CREST_AMPS : Start.CREST_AMPS;
        return "(low crest - V_Z - rectifier)/" + text(amps, Unit.AMPERE) + " = "
                + text(Start.dropperOhms(design), Unit.OHM);
    }

    private String capacitor() {
        return "large enough for the gate's charge and peak current, small enough for R_E over the valley's "
                + text(reach.valley(), Unit.OHM);
    }

    private String fixed() {
        return "R_E for the highest setting at every line and temperature: at most " + text(reach.highestTo(), Unit.OHM)
                + ", at least " + text(Math.max(reach.valley(), reach.clip()), Unit.OHM);
    }

    private String track() {
        return "R_E for the lowest setting: at least " + text(reach.lowestFrom(), Unit.OHM)
                + ", before the collapse at most " + text(reach.collapse(), Unit.OHM) + "; with this track "
                + text(Math.max(design.ramp().rampOhms(0), design.ramp().rampOhms(1)), Unit.OHM);
    }

    private Optional<String> across() {
        return design.ramp()
                .pot()
                .flatMap(p -> p.shunt())
                .map(s -> "with its trimmer at the low end the slowest unit still fires before the collapse");
    }

    private String law() {
        KnobShape shape = KnobShape.of(design, KnobShape.What.POWER);
        String here = "the load's power lies at most " + text(shape.largestDeparture(), Unit.FRACTION)
                + " of full off a straight line over the rotation";
        if (design.ramp().pot().orElseThrow().law() instanceof PotLaw.Linear) {
            return here;
        }
        KnobShape linear = KnobShape.of(Edit.law(design, new PotLaw.Linear()), KnobShape.What.POWER);
        return here + "; with a linear one it would be " + text(linear.largestDeparture(), Unit.FRACTION);
    }

    private String trimHigh() {
        return trim("highest", Timing.highPosition(design));
    }

    private String trimLow() {
        return trim("lowest", Timing.lowPosition(design));
    }

    private String trim(String setting, double position) {
        return "set on every unit at the " + setting + " setting: R_E there from "
                + text(CornerUnits.slowest(design).ramp().rampOhms(position), Unit.OHM) + " for the slowest unit to "
                + text(CornerUnits.fastest(design).ramp().rampOhms(position), Unit.OHM) + " for the fastest";
    }

    private String device() {
        if (!(design.trigger() instanceof UnijunctionTrigger u)) {
            return "as given";
        }
        OptionalDouble pulse = u.device().baseOnePulse().map(p -> p.minVolts()).orElse(OptionalDouble.empty());
        return "strongest guaranteed pulse"
                + (pulse.isPresent() ? ", V_OB1 at least " + text(pulse.getAsDouble(), Unit.VOLT) : "")
                + "; least valley current " + text(u.device().valley().amps().lowest(), Unit.AMPERE);
    }

    private String baseOne() {
        return "standing gate voltage under V_GD: V_GD (R_BB,min + R2)/(V_Z - V_GD) = "
                + text(Start.standingOhms(design), Unit.OHM);
    }

    private Optional<String> baseTwo() {
        if (!(design.trigger() instanceof UnijunctionTrigger)) {
            return Optional.empty();
        }
        OptionalDouble flat = Start.driftFreeOhms(design);
        return Optional.of("peak point steady against temperature, dV_P/dT = 0: "
                + (flat.isPresent() ? text(flat.getAsDouble(), Unit.OHM) : "no resistor does it at this supply"));
    }

    private Optional<String> divider() {
        return design.trigger() instanceof UnijunctionTrigger
                ? Optional.empty()
                : Optional.of(
                        "standoff ratio lower/(upper + lower) near 0.6, low in resistance for its valley current");
    }

    private String series() {
        return "holds the pulse back where the gate would get more than it bears; none is needed otherwise";
    }

    private String thyristor() {
        ThyristorDevice d = design.thyristor().device();
        double crest = design.line().crestVolts(design.line().highVolts());
        double amps = answer.check().knob().stream()
                .mapToDouble(p -> p.load().thyristorRmsAmps())
                .max()
                .orElse(0);
        return "the smallest that blocks " + text(Start.VOLTS_RESERVE, Unit.NUMBER) + " x " + text(crest, Unit.VOLT)
                + " and bears " + text(amps, Unit.AMPERE) + ": "
                + text(d.limits().volts().orElse(0), Unit.VOLT) + ", "
                + text(d.limits().rmsAmps().orElse(0), Unit.AMPERE);
    }

    private Optional<String> sink() {
        return answer.check().margins().stream()
                .filter(m -> m.kind() == MarginKind.JUNCTION_TEMPERATURE)
                .findFirst()
                .map(Margin::formula);
    }

    private String neighbour(OpenPart part, int step) {
        Optional<Design> there = part == OpenPart.THYRISTOR || part == OpenPart.TRIGGER_DEVICE
                ? device(part, step)
                : Moves.next(request, design, part, step);
        return there.map(d -> value(part, d) + ": " + effect(part, Ratings.fit(request, d)))
                .orElse("");
    }

    private Optional<Design> device(OpenPart part, int step) {
        List<Design> all = part == OpenPart.THYRISTOR
                ? Start.thyristors(request, design).stream()
                        .map(d -> Edit.thyristor(design, d))
                        .toList()
                : Start.devices(request).stream()
                        .map(d -> Edit.device(design, d))
                        .toList();
        List<String> names = all.stream().map(d -> value(part, d)).toList();
        int at = names.indexOf(value(part, design)) + step;
        return names.contains(value(part, design)) && at >= 0 && at < all.size()
                ? Optional.of(all.get(at))
                : Optional.empty();
    }

    /** An open part's value for people. */
    static String value(OpenPart part, Design d) {
        return switch (part) {
            case ZENER -> d.clip().zener().id();
            case DROPPER -> ohms(d.clip().dropper());
            case CAPACITOR -> text(d.ramp().capacitor().value(), Unit.FARAD);
            case FIXED -> ohms(d.ramp().fixed());
            case TRACK -> d.ramp().pot().map(p -> ohms(p.track())).orElse("");
            case LAW -> d.ramp().pot().map(p -> p.law().word()).orElse("");
            case ACROSS ->
                d.ramp().pot().flatMap(p -> p.shunt()).map(Reasons::ohms).orElse("none");
            case TRIM_HIGH -> d.ramp().trimmers().high().map(Reasons::ohms).orElse("none");
            case TRIM_LOW -> d.ramp().trimmers().low().map(Reasons::ohms).orElse("none");
            case TRIGGER_DEVICE -> d.trigger().deviceId();
            case BASE_ONE -> ohms(d.trigger().baseOne());
            case BASE_TWO -> d.trigger() instanceof UnijunctionTrigger u ? ohms(u.baseTwo()) : "";
            case UPPER -> d.trigger() instanceof ProgrammableTrigger p ? ohms(p.upper()) : "";
            case LOWER -> d.trigger() instanceof ProgrammableTrigger p ? ohms(p.lower()) : "";
            case SERIES -> ohms(d.gate().series());
            case SHUNT -> d.gate().shunt().map(Reasons::ohms).orElse("none");
            case THYRISTOR -> d.thyristor().device().id();
            case TRANSFORMER, SINK -> "";
        };
    }

    private static String ohms(Part part) {
        return text(part.value(), Unit.OHM);
    }

    private String effect(OpenPart part, Design there) {
        Check check = Judge.check(there, OptionalDouble.empty(), OptionalDouble.empty());
        Set<String> before = failing(answer.check());
        Set<String> now = failing(check);
        Set<String> more = new TreeSet<>(now);
        more.removeAll(before);
        if (!more.isEmpty()) {
            return more.stream().limit(MOST_NAMED).collect(Collectors.joining(" and "))
                    + (more.size() == 1 ? " fails" : " fail");
        }
        boolean moves = part.group().equals("ramp")
                || part.group().equals("clip")
                || part.group().equals("bases")
                || part == OpenPart.TRIGGER_DEVICE;
        boolean reaching = moves && part != OpenPart.FIXED && part != OpenPart.TRACK;
        Timing timing = Timing.of(there, reaching ? Reach.of(there) : reach);
        List<String> changes = new ArrayList<>();
        if (design.ramp().trimmers().isNone()) {
            changed(changes, "yield", timing.yield(), answer.yield(), Unit.FRACTION);
        }
        changed(changes, "dead travel", timing.deadTravel(), answer.deadTravel(), Unit.FRACTION);
        changed(changes, "heat", Grade.watts(check.dissipation()), answer.watts(), Unit.WATT);
        mostMoved(part, check).ifPresent(changes::add);
        return changes.isEmpty() ? "nothing to speak of" : String.join(", ", changes);
    }

    private static void changed(List<String> changes, String what, double now, double before, Unit unit) {
        String there = QuantityText.format(now, unit, 2);
        String here = QuantityText.format(before, unit, 2);
        if (!there.equals(here)) {
            changes.add(what + " " + there + " in place of " + here);
        }
    }

    /** Of the margins that the part moves, the one that it moves most. */
    private Optional<String> mostMoved(OpenPart part, Check check) {
        String most = "";
        double farthest = LEAST_CHANGE;
        for (Margin now : check.margins()) {
            Optional<Margin> before = answer.check().margins().stream()
                    .filter(m -> m.kind() == now.kind())
                    .findFirst();
            double ratio = now.ratio().orElse(0);
            double was = before.map(m -> m.ratio().orElse(0)).orElse(0.0);
            boolean own = now.parts().stream().anyMatch(key -> key.startsWith(part.key()));
            if (own && ratio > 0 && was > 0 && Math.abs(Math.log(ratio / was)) > farthest) {
                farthest = Math.abs(Math.log(ratio / was));
                most = now.name() + " at " + QuantityText.number(ratio, FIGURES) + " of its demand in place of "
                        + QuantityText.number(was, FIGURES);
            }
        }
        return most.isEmpty() ? Optional.empty() : Optional.of(most);
    }

    private static Set<String> failing(Check check) {
        return check.margins().stream()
                .filter(m -> m.verdict() == Verdict.FAILS)
                .map(Margin::name)
                .collect(Collectors.toCollection(TreeSet::new));
    }

    private static String text(double value, Unit unit) {
        return QuantityText.format(value, unit, FIGURES);
    }
}
