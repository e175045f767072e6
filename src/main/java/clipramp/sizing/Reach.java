package clipramp.sizing;

import clipramp.circuit.Characteristic;
import clipramp.circuit.ClipSupply;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Wanted.Goal;
import clipramp.engine.ProgrammableDevice;
import clipramp.firing.Firing;
import clipramp.firing.HalfCycle;
import clipramp.firing.PublishedRelations;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.power.KnobSearch;
import clipramp.power.LoadPower;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Between which whole ramp resistances the wanted settings lie, at every judged condition at once, from the exact
 * engine: the firing instant grows with R_E, nearly in proportion, so that few solutions find it. Everything but the
 * ramp's resistors is as the design has it.
 *
 * @param highestFrom least R_E that does not give more than the highest setting's band, ohm; 0 without a band
 * @param highestTo largest R_E that still gives the highest setting, ohm
 * @param lowestFrom least R_E that gives no more than the lowest setting, ohm
 * @param lowestTo largest R_E that does not give less than the lowest setting's band, ohm; infinite without a band
 * @param collapse largest R_E whose ramp arrives before the supply's collapse, ohm
 * @param clip least R_E whose ramp arrives after the supply is clipped, ohm
 * @param valley least R_E that does not feed the least valley current of the sheet, ohm
 */
record Reach(
        double highestFrom,
        double highestTo,
        double lowestFrom,
        double lowestTo,
        double collapse,
        double clip,
        double valley) {
    private static final int MOST_STEPS = 8;
    private static final double NEAR_RAD = 2e-4;

    /** Where nothing is wanted of the high end, or more than the stage can give: 160° of conduction. */
    private static final double EARLY_RAD = Math.toRadians(20);

    private static final double LATE_RAD = Math.toRadians(160);

    /** A conducting programmable device at its valley, and its sheet's supply (DEVELOPERS.md, The conducting device), V. */
    private static final double JUNCTION_VOLTS = 0.6;

    private static final double PROGRAMMABLE_TEST_VOLTS = 10;

    /** Firing angle at one R_E, and how it moves. */
    private record Found(double ohms, double radPerOhm) {}

    /** The reach of a design whose ramp resistors are open. */
    static Reach of(Design design) {
        List<Condition> conditions = conditions(design);
        Condition nominal = conditions.get(0);
        Optional<Goal> highest = design.wanted().highest();
        Optional<Goal> lowest = design.wanted().lowest();
        Found early = ohmsFor(design, nominal, angle(design, nominal, highest, false, EARLY_RAD), 0);
        Found late = ohmsFor(design, nominal, angle(design, nominal, lowest, true, LATE_RAD), early.ohms());
        double highestFrom = 0;
        double highestTo = Double.POSITIVE_INFINITY;
        double lowestFrom = 0;
        double lowestTo = Double.POSITIVE_INFINITY;
        double collapse = Double.POSITIVE_INFINITY;
        double clip = 0;
        for (Condition at : conditions) {
            Solution first = Firing.solve(design, at, early.ohms());
            highestTo = Math.min(highestTo, moved(early, first, angle(design, at, highest, false, EARLY_RAD)));
            if (highest.map(Goal::isBand).orElse(false)) {
                highestFrom = Math.max(highestFrom, moved(early, first, angle(design, at, highest, true, EARLY_RAD)));
            }
            OptionalDouble clips = first.shown().clipFromRad();
            if (clips.isPresent()) {
                clip = Math.max(clip, moved(early, first, clips.getAsDouble()));
            }
            Solution last = Firing.solve(design, at, late.ohms());
            lowestFrom = Math.max(lowestFrom, moved(late, last, angle(design, at, lowest, true, LATE_RAD)));
            if (lowest.map(Goal::isBand).orElse(false)) {
                lowestTo = Math.min(lowestTo, moved(late, last, angle(design, at, lowest, false, LATE_RAD)));
            }
            collapse = Math.min(collapse, moved(late, last, collapseRad(design, last.shown())));
        }
        return new Reach(highestFrom, highestTo, lowestFrom, lowestTo, collapse, clip, valleyOhms(design));
    }

    /** (V - V_V)/I_V at the zener's voltage, the valley current of the least unit proportional to the supply. */
    private static double valleyOhms(Design design) {
        double supply = design.clip().zener().volts().nominal();
        if (design.trigger() instanceof ProgrammableTrigger programmable) {
            double amps = ProgrammableDevice.amps(
                    programmable.device().valleyCurrentAmps(),
                    ProgrammableDevice.gateOhms(programmable),
                    Characteristic::lowest);
            return PublishedRelations.smallestRampOhms(supply, JUNCTION_VOLTS, amps * supply / PROGRAMMABLE_TEST_VOLTS);
        }
        UnijunctionTrigger trigger = (UnijunctionTrigger) design.trigger();
        Unijunction.Valley valley = trigger.device().valley();
        double share = supply / valley.atVolts();
        return PublishedRelations.smallestRampOhms(
                supply, valley.volts().nominal() * share, valley.amps().lowest() * share);
    }

    /** Nominal first, then the corners of line and temperature. */
    static List<Condition> conditions(Design design) {
        List<Condition> all = new ArrayList<>(List.of(design.nominalCondition()));
        double hertz = design.line().hertz();
        for (double volts : List.of(design.line().lowVolts(), design.line().highVolts())) {
            for (double celsius : List.of(
                    design.surroundings().coldestCelsius(),
                    design.surroundings().hottestCelsius())) {
                Condition corner = new Condition(volts, hertz, celsius);
                if (!all.contains(corner)) {
                    all.add(corner);
                }
            }
        }
        return all;
    }

    /** A supply across the thyristor ends with the pulse; without one it would end as it began. */
    private static double collapseRad(Design design, HalfCycle half) {
        if (design.clip().tap() == ClipSupply.Tap.THYRISTOR) {
            return Math.PI - half.clipFromRad().orElse(0);
        }
        return !half.positive() && half.collapseRad() > Math.PI ? half.collapseRad() - Math.PI : half.collapseRad();
    }

    /**
     * The firing angle that a goal comes to.
     *
     * @param least whether the goal's larger power counts, so that the angle is the least that is still allowed
     */
    private static double angle(Design design, Condition at, Optional<Goal> goal, boolean least, double otherwise) {
        return goal.map(wanted -> angle(design, at, wanted, least)).orElse(otherwise);
    }

    private static double angle(Design design, Condition at, Goal goal, boolean least) {
        double value = least ? goal.to() : goal.from();
        double watts = switch (goal.measure()) {
            // An angle runs against the power.
            case ANGLE -> Double.NaN;
            case FRACTION -> value * LoadPower.fullWatts(design, at);
            case WATTS -> value;
            case VOLTS -> value * value / design.load().resistanceOhms();
        };
        if (Double.isNaN(watts)) {
            return least ? goal.from() : goal.to();
        }
        return KnobSearch.firingRadForWatts(design, at, watts).orElse(watts > 0 ? EARLY_RAD : Math.PI);
    }

    /**
     * What R_E another unit needs to fire where the nominal one does with one of its own, as a share of that; at the
     * nominal condition.
     */
    static double share(Design design, Design unit, double ohms) {
        Condition at = design.nominalCondition();
        return ohmsFor(unit, at, firing(design, at, ohms), ohms).ohms() / ohms;
    }

    /** R_E corrected for another condition, the firing instant taken as straight over so small a step. */
    private static double moved(Found found, Solution there, double targetRad) {
        double rad = firstRad(there);
        double ohms = found.ohms() + (targetRad - rad) / found.radPerOhm();
        return Double.isNaN(ohms) ? found.ohms() : Math.max(1, ohms);
    }

    /** Where a solution's first pulse begins, rad; NaN without one. */
    static double firstRad(Solution solution) {
        return solution.shown().pulses().stream()
                .min(Comparator.comparingDouble(Pulse::startSeconds))
                .map(Pulse::startRad)
                .orElse(Double.NaN);
    }

    private static Found ohmsFor(Design design, Condition at, double targetRad, double startOhms) {
        double target = Math.max(targetRad, Math.toRadians(2));
        double ohms = startOhms > 0 ? startOhms : guess(design, at, target);
        double rad = firing(design, at, ohms);
        double slope = rad / ohms;
        double next = ohms + (target - rad) / slope;
        for (int step = 0; step < MOST_STEPS && Math.abs(target - rad) > NEAR_RAD; step++) {
            next = Math.max(ohms / 8, Math.min(ohms * 8, next));
            double there = firing(design, at, next);
            double measured = (there - rad) / (next - ohms);
            slope = measured > 0 ? measured : slope;
            ohms = next;
            rad = there;
            next = ohms + (target - rad) / slope;
        }
        return new Found(ohms, slope);
    }

    /** A ramp that never arrives counts as arriving as much later as its resistance is too large. */
    private static double firing(Design design, Condition at, double ohms) {
        double rad = firstRad(Firing.solve(design, at, ohms));
        return Double.isNaN(rad)
                ? Math.max(
                        Math.PI, at.omega() * ohms * design.ramp().capacitor().value())
                : rad;
    }

    private static double guess(Design design, Condition at, double rad) {
        return rad / at.omega() / design.ramp().capacitor().value();
    }
}
