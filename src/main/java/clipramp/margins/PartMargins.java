package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Trigger;
import clipramp.firing.Dissipation;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/** Resistors, capacitor and zener against their ratings (DEVELOPERS.md, Margins). */
final class PartMargins {
    private final Bench bench;
    private final Design design;

    PartMargins(Bench bench) {
        this.bench = bench;
        this.design = bench.design();
    }

    List<Margin> all() {
        List<Margin> margins = new ArrayList<>();
        Part dropper = design.clip().dropper();
        margins.add(power(MarginKind.DROPPER_POWER, dropper, "clip.dropper", Dissipation::dropperWatts));
        margins.add(Ceiling.over(
                MarginKind.DROPPER_VOLTAGE,
                bench.conditions(),
                dropper.ratedVolts(),
                "clip.dropper states no voltage rating: write it after the value, such as 10 kohm 12 W 500 V",
                at -> bench.hardest(at.condition(), Dissipation::dropperPeakVolts),
                Say::volts));
        margins.add(Ceiling.over(
                MarginKind.ZENER_POWER,
                bench.conditions(),
                design.clip().zener().ratedWatts(),
                "the profile states no clip.zener.power",
                at -> bench.hardest(at.condition(), Dissipation::zenerWatts),
                Say::watts));
        margins.add(Ceiling.over(
                MarginKind.CAPACITOR_VOLTAGE,
                bench.conditions(),
                design.ramp().capacitor().ratedVolts(),
                "ramp.capacitor states no voltage rating: write it after the value, such as 100 nF 63 V",
                at -> bench.hardest(at.condition(), Dissipation::capacitorVolts),
                Say::volts));
        margins.add(power(
                MarginKind.BASE_ONE_POWER, design.trigger().baseOne(), "trigger.base-one", Dissipation::baseOneWatts));
        margins.add(baseTwo());
        margins.add(rampFixed());
        design.ramp().pot().ifPresent(pot -> margins.add(pot(pot.track())));
        return margins;
    }

    private Margin baseTwo() {
        if (design.trigger() instanceof Trigger.UnijunctionTrigger trigger) {
            return power(MarginKind.BASE_TWO_POWER, trigger.baseTwo(), "trigger.base-two", Dissipation::baseTwoWatts);
        }
        Trigger.ProgrammableTrigger trigger = (Trigger.ProgrammableTrigger) design.trigger();
        return power(MarginKind.BASE_TWO_POWER, trigger.upper(), "trigger.upper", Dissipation::baseTwoWatts);
    }

    private Margin power(MarginKind kind, Part part, String key, ToDoubleFunction<Dissipation> figure) {
        return derated(kind, part.ratedWatts(), key, at -> bench.hardest(at.condition(), figure));
    }

    private Margin derated(
            MarginKind kind, OptionalDouble rated, String key, ToDoubleFunction<JudgedCondition> offered) {
        if (rated.isEmpty()) {
            return Ceiling.unjudged(kind, key + " states no power rating: write it after the value, such as 0.5 W");
        }
        List<Finding> findings = new ArrayList<>();
        double allowed = design.resistorDerating() * rated.getAsDouble();
        for (JudgedCondition at : bench.conditions()) {
            double there = offered.applyAsDouble(at);
            findings.add(new Finding(
                    at.words(),
                    allowed,
                    there,
                    kind.sense(),
                    Say.watts(there) + " against " + Say.share(design.resistorDerating()) + " x "
                            + Say.watts(rated.getAsDouble()) + " = " + Say.watts(allowed)));
        }
        return Finding.worst(kind, findings);
    }

    private Margin rampFixed() {
        double fixed = design.ramp().fixed().value();
        return derated(
                MarginKind.RAMP_RESISTOR_POWER,
                design.ramp().fixed().ratedWatts(),
                "ramp.fixed",
                at -> Math.max(
                                squareAmps(at.condition(), bench.leastOhms()),
                                squareAmps(at.condition(), bench.mostOhms()))
                        * fixed);
    }

    /** Mean square of the ramp resistor's current, A². */
    private double squareAmps(Condition condition, double ohms) {
        return ohms > 0 ? bench.dissipation(condition, ohms).rampWatts() / ohms : 0;
    }

    /** At its low end no track is in use and the current harms none: the worst is looked for a tenth away from it. */
    private Margin pot(Part track) {
        double nearLeast = bench.settings().stream()
                .filter(ohms -> ohms > bench.leastOhms())
                .min(Double::compare)
                .orElse(bench.mostOhms());
        return derated(
                MarginKind.POT_POWER,
                track.ratedWatts(),
                "ramp.pot.track",
                at -> squareAmps(at.condition(), nearLeast) * track.value());
    }
}
