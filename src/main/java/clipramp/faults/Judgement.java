package clipramp.faults;

import java.util.List;

/** The load's power in one word. */
final class Judgement {
    /** Under this share of full power a load gets nothing. */
    private static final double NOTHING = 0.005;

    /** From this share of the most that the stage can give it is full. */
    private static final double FULL = 0.97;

    /** Within this share of the healthy power nothing has changed. */
    private static final double SAME = 0.05;

    /** More dc than this share of the rms current comes of missing half cycles. */
    private static final double DIRECT = 0.2;

    /** A knob that moves the power by less than this share of full power is dead. */
    private static final double KNOB = 0.02;

    private Judgement() {}

    /**
     * That word.
     *
     * @param there the load with the fault
     * @param before the load without it
     * @param most share of full power that the stage gives when fired at the line's zero
     */
    static LoadGets gets(LoadAt there, LoadAt before, double most) {
        if (there.fraction() < NOTHING) {
            return before.fraction() < NOTHING ? LoadGets.AS_BEFORE : LoadGets.NOTHING;
        }
        if (directShare(there) > DIRECT && directShare(before) < DIRECT) {
            return LoadGets.HALF;
        }
        double change = there.watts() / before.watts() - 1;
        if (Math.abs(change) <= SAME) {
            return LoadGets.AS_BEFORE;
        }
        if (there.fraction() >= FULL * most) {
            return LoadGets.FULL;
        }
        return change < 0 ? LoadGets.LESS : LoadGets.MORE;
    }

    private static double directShare(LoadAt at) {
        return at.rmsAmps() > 0 ? Math.abs(at.dcAmps()) / at.rmsAmps() : 0;
    }

    /** Whether the knob moves the power; the load at its positions is given. */
    static boolean knobActs(List<LoadAt> knob) {
        double least = knob.stream().mapToDouble(LoadAt::fraction).min().orElse(0);
        double most = knob.stream().mapToDouble(LoadAt::fraction).max().orElse(0);
        return most - least > KNOB;
    }
}
