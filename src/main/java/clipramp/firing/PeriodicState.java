package clipramp.firing;

import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.Stage;
import clipramp.engine.Mode;
import java.util.ArrayList;
import java.util.List;

/**
 * Runs half cycles until they repeat, then once more through those that differ (DEVELOPERS.md, Half cycle and periodic
 * state).
 */
final class PeriodicState {
    /** Two ramp voltages nearer than this are the same, V. */
    private static final double SAME_VOLTS = 1e-9;

    /** Two magnetising currents nearer than this are the same, A. */
    private static final double SAME_AMPS = 1e-10;

    /** Two extinctions nearer than this are the same, s. */
    private static final double SAME_SECONDS = 1e-12;

    private static final int MOST_HALVES = 60;

    /** How many half cycles are shown of a circuit that never settles. */
    private static final int SHOWN_UNSETTLED = 8;

    private PeriodicState() {}

    private record State(Mode mode, double rampVolts, double fluxAmps, double conductsUntilSeconds) {
        static State of(HalfCycleRun run) {
            return new State(run.mode(), run.rampVolts(), run.fluxAmps(), run.conductsUntilSeconds());
        }

        /** A device whose conducting line feeds itself; without a refusal it would pass for a circuit that stays off. */
        State requireFinite() {
            if (!Double.isFinite(rampVolts) || !Double.isFinite(fluxAmps)) {
                throw new RefusedCircuit(
                        "trigger.device",
                        "with these values the ramp grows without end while trigger.device conducts. Check its valley and"
                                + " saturation against the data sheet, or make trigger.base-one smaller.");
            }
            return this;
        }

        boolean isSameAs(State other) {
            return mode == other.mode
                    && Math.abs(rampVolts - other.rampVolts) < SAME_VOLTS
                    && Math.abs(fluxAmps - other.fluxAmps) < SAME_AMPS
                    && Math.abs(conductsUntilSeconds - other.conductsUntilSeconds) < SAME_SECONDS;
        }
    }

    /** Solves, and shows the sink every piece of the half cycles that make up the solution. */
    static Solution solve(FiringCase firing, PieceSink sink) {
        if (!Double.isFinite(firing.network().rampOhms)) {
            throw new IllegalArgumentException("R_E is " + firing.network().rampOhms + " ohm");
        }
        HalfCycleRun run = new HalfCycleRun(firing);
        int period = firing.timing().period();
        List<State> states = new ArrayList<>();
        states.add(State.of(run));
        Solution.Settling settling = Solution.Settling.NEVER;
        int repeats = 0;
        while (states.size() <= MOST_HALVES && repeats == 0) {
            run.skip();
            states.add(State.of(run).requireFinite());
            if (repeatsAfter(states, period)) {
                settling = Solution.Settling.STEADY;
                repeats = period;
            } else if (repeatsAfter(states, 2 * period)) {
                settling = feelsEverySecond(firing) ? Solution.Settling.STEADY : Solution.Settling.HUNTS;
                repeats = 2 * period;
            }
        }
        int shown = repeats == 0 ? SHOWN_UNSETTLED : shownHalves(firing, repeats);
        return new Solution(firing.condition(), firing.network().rampOhms, settling, record(firing, run, shown, sink));
    }

    private static int shownHalves(FiringCase firing, int repeats) {
        return feelsEverySecond(firing) ? Math.max(2, repeats) : repeats;
    }

    /** A half-wave load on a bridge's supply feels every second half cycle only: both are told, and may differ. */
    private static boolean feelsEverySecond(FiringCase firing) {
        return firing.design().stage() == Stage.HALF_WAVE && !firing.timing().isWholePeriods();
    }

    private static boolean repeatsAfter(List<State> states, int halves) {
        int last = states.size() - 1;
        return last >= halves && states.get(last).isSameAs(states.get(last - halves));
    }

    private static List<HalfCycle> record(FiringCase firing, HalfCycleRun run, int shown, PieceSink sink) {
        // The positive half comes first in every answer.
        if ((run.lastHalf() + 1) % 2 == 1) {
            run.skip();
        }
        List<HalfCycleDraft> drafts = new ArrayList<>();
        for (int i = 0; i < shown; i++) {
            run.next(sink);
            drafts.add(run.draft());
        }
        if (run.pulseIsGoing()) {
            run.next(PieceSink.NONE);
        }
        List<HalfCycle> halves =
                drafts.stream().map(draft -> draft.finished(firing)).toList();
        return LoadHalves.fromSupplyHalves(firing, halves);
    }
}
