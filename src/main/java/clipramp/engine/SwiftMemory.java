package clipramp.engine;

import java.util.Arrays;

/**
 * How pieces of a unit ended before: by state, supply rising or falling, and how often the state was entered in the half
 * cycle.
 */
final class SwiftMemory {
    private static final int KINDS = 2 * SwiftLaws.STATES;
    private static final int VISITS = 24;
    private static final int COLUMNS = 4;

    private final double[] columns = new double[KINDS * VISITS * COLUMNS];
    private final int[] targets = new int[KINDS * VISITS];
    private final int[] units = new int[KINDS * VISITS];
    private final int[] visits = new int[KINDS];
    private int unit;
    private int slot;

    /** Forgets everything: another unit. */
    void forget() {
        unit++;
    }

    /** Begins another half cycle of the same unit. */
    void start() {
        Arrays.fill(visits, 0);
    }

    /** Looks where a piece like this one ended; says what it ended in, NONE if there was none, or nothing to look for. */
    int recall(SwiftPiece piece, int state, boolean falling) {
        int kind = state + (falling ? SwiftLaws.STATES : 0);
        int visit = Math.min(visits[kind]++, VISITS - 1);
        slot = kind * VISITS + visit;
        int from = units[slot] != unit && visit > 0 ? slot - 1 : slot;
        if (units[from] != unit || targets[from] == SwiftPiece.END) {
            return SwiftPiece.NONE;
        }
        int at = from * COLUMNS;
        piece.lookAfter(columns[at], columns[at + 1], columns[at + 2], columns[at + 3]);
        return targets[from];
    }

    /** What a piece like the one last recalled for ended in with another unit; the given one if there was none. */
    int usual(int otherwise) {
        return units[slot] == 0 ? otherwise : targets[slot];
    }

    /** Keeps how the piece that was last recalled for ended. */
    void keep(SwiftPiece piece, int target, double decay) {
        units[slot] = unit;
        targets[slot] = target;
        int at = slot * COLUMNS;
        columns[at] = piece.ahead;
        columns[at + 1] = decay;
        columns[at + 2] = piece.turnSine();
        columns[at + 3] = piece.turnCosine();
    }
}
