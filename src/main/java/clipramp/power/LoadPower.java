package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.engine.LineWave;
import clipramp.firing.Solution;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a load gets from the pulses of a solution. A resistor's means are closed forms (quadrature on a line with
 * harmonics); a filament is a resistor at the temperature that its own rms voltage gives it; an inductive load is run
 * from pulse to extinction until it repeats within 1e-12 of the crest current. Derivations: DEVELOPERS.md, Power, and
 * Loads with memory. Every method throws {@link clipramp.circuit.RefusedCircuit} where the line has more than two zeros a period.
 */
public final class LoadPower {
    private LoadPower() {}

    /**
     * Power, currents and on-state loss over whole periods of the line.
     *
     * @param design stage, load and thyristor
     * @param condition line voltage; temperature for the latching current of an inductive load
     * @param solution the firing circuit's periodic state there
     */
    public static LoadResult of(Design design, Condition condition, Solution solution) {
        return of(design, condition, Firings.of(design, condition, solution));
    }

    /**
     * The same with every half cycle fired at one angle: what a firing angle is worth, whatever makes it.
     *
     * @param design stage, load and thyristor
     * @param condition line voltage
     * @param firingRad from the fundamental's zero that begins the half cycle, rad, 0..pi
     */
    public static LoadResult atFiringAngle(Design design, Condition condition, double firingRad) {
        return of(design, condition, Firings.heldFrom(design, condition, firingRad));
    }

    /**
     * Power and currents where something beside the thyristor, such as a shorted diode, carries every negative half cycle
     * whole. The thyristor's own currents are those of both together.
     *
     * @param design stage, load and thyristor
     * @param condition line voltage
     * @param solution the firing circuit's periodic state there; of its pulses only those of positive half cycles act
     */
    public static LoadResult withNegativeHalvesFree(Design design, Condition condition, Solution solution) {
        return of(design, condition, negativeHalvesFree(design, condition, solution));
    }

    /** The load's current itself, where something beside the thyristor carries every negative half cycle whole. */
    public static LoadPeriod periodWithNegativeHalvesFree(Design design, Condition condition, Solution solution) {
        return period(design, condition, negativeHalvesFree(design, condition, solution));
    }

    private static Firings negativeHalvesFree(Design design, Condition condition, Solution solution) {
        return Firings.of(design, condition, solution.firingOnlyPositive())
                .withNegativeHalvesFree(new LineWave(design.line(), condition));
    }

    /** The load's current itself, for what needs more of it than means: harmonics, waveforms, commutation. */
    public static LoadPeriod period(Design design, Condition condition, Solution solution) {
        return period(design, condition, Firings.of(design, condition, solution));
    }

    /** The load's current with every half cycle fired at one angle in rad from the zero that begins it, 0..pi. */
    public static LoadPeriod periodAtFiringAngle(Design design, Condition condition, double firingRad) {
        return period(design, condition, Firings.heldFrom(design, condition, firingRad));
    }

    /** Power of the same load with the thyristor always on, without drops, W: what fractions are shares of. */
    public static double fullWatts(Design design, Condition condition) {
        return FullPower.watts(design, condition);
    }

    /** Rms current of the same load with the thyristor always on, without drops, A. */
    public static double fullRmsAmps(Design design, Condition condition) {
        double watts = fullWatts(design, condition);
        return design.load() instanceof Load.Filament
                ? watts / (condition.lineVolts() * design.line().rmsFactor())
                : Math.sqrt(watts / design.load().resistanceOhms());
    }

    private static LoadResult of(Design design, Condition condition, Firings firings) {
        if (design.load() instanceof Load.Inductive) {
            return SpanTotals.of(
                    design, condition, period(design, condition, firings), firings.halves(), firings.slots());
        }
        if (design.load() instanceof Load.Filament filament) {
            FilamentLaw law = new FilamentLaw(filament);
            LoadResult lit = resistive(warmed(design, condition, law, firings), condition, firings);
            return lit.withLight(lit.watts() / fullWatts(design, condition), law.lightShareAt(lit.rmsVolts()));
        }
        return resistive(design, condition, firings);
    }

    /** The same design with the resistor that a filament is at these firings. */
    private static Design warmed(Design design, Condition condition, FilamentLaw law, Firings firings) {
        double ohms = law.settledOhms(trial -> resistive(design.withLoad(new Load.Resistor(trial)), condition, firings)
                .rmsVolts());
        return design.withLoad(new Load.Resistor(ohms));
    }

    private static LoadPeriod period(Design design, Condition condition, Firings firings) {
        if (design.load() instanceof Load.Inductive inductive) {
            return new InductiveRun(
                            LoadLoop.of(design, condition, inductive),
                            firings.windows(),
                            firings.spanRad(),
                            firings.latchingAmps(),
                            firings.turnOnRad(),
                            SpanTotals.highestOrder(design.line()))
                    .settle();
        }
        if (design.load() instanceof Load.Filament filament) {
            return resistivePeriod(warmed(design, condition, new FilamentLaw(filament), firings), condition, firings);
        }
        return resistivePeriod(design, condition, firings);
    }

    private static LoadPeriod resistivePeriod(Design design, Condition condition, Firings firings) {
        ResistorCurrent path = new ResistorCurrent(design, condition);
        List<CurrentSpan> spans = new ArrayList<>();
        OptionalDouble fired = OptionalDouble.empty();
        OptionalDouble ended = OptionalDouble.empty();
        for (int half = 0; half < firings.slots().size(); half++) {
            ActingPulses.Slot slot = firings.slots().get(half);
            if (slot.firingRad().isPresent() && !blocked(design, slot)) {
                double zero = half * Math.PI;
                Optional<CurrentSpan> span =
                        path.spanFiredAt(slot.positive(), slot.firingRad().getAsDouble(), zero);
                span.ifPresent(spans::add);
                if (span.isPresent() && fired.isEmpty()) {
                    fired = OptionalDouble.of(span.get().fromRad() - zero);
                    ended = OptionalDouble.of(span.get().toRad() - zero);
                }
            }
        }
        return new LoadPeriod(firings.spanRad(), spans, fired, ended, 0, true, true);
    }

    private static boolean blocked(Design design, ActingPulses.Slot slot) {
        return design.stage() == Stage.HALF_WAVE && !slot.positive();
    }

    private static LoadResult resistive(Design design, Condition condition, Firings firings) {
        ResistorCurrent path = new ResistorCurrent(design, condition);
        ResistorTotals totals = new ResistorTotals(firings.halves());
        for (ActingPulses.Slot slot : firings.slots()) {
            boolean conducts = slot.firingRad().isPresent() && !blocked(design, slot);
            totals.add(
                    slot,
                    conducts ? path.firedAt(slot.positive(), slot.firingRad().getAsDouble()) : HalfCycleCurrent.NONE);
        }
        return totals.result(design, condition);
    }
}
