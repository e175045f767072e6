package clipramp.firing;

import clipramp.engine.Piece;
import java.util.ArrayList;
import java.util.List;

/** Keeps every piece of the solution's half cycles, in order. */
final class PieceLog implements PieceSink {
    /**
     * One piece of a half cycle.
     *
     * @param piece the piece
     * @param fromSeconds when the circuit entered it, s since the half cycle's line zero
     * @param toSeconds when it left it, s
     */
    record Entry(Piece piece, double fromSeconds, double toSeconds) {}

    private final List<List<Entry>> halves = new ArrayList<>();
    private double lastEnd = Double.POSITIVE_INFINITY;

    @Override
    public void passed(Piece piece, double fromSeconds, double toSeconds) {
        if (halves.isEmpty() || fromSeconds < lastEnd) {
            halves.add(new ArrayList<>());
        }
        lastEnd = toSeconds;
        if (toSeconds > fromSeconds) {
            current().add(new Entry(piece.copy(), fromSeconds, toSeconds));
        }
    }

    @Override
    public void takeBack(double fromSeconds) {
        current().removeIf(entry -> entry.fromSeconds() >= fromSeconds);
        lastEnd = fromSeconds;
    }

    private List<Entry> current() {
        return halves.get(halves.size() - 1);
    }

    /** The pieces by half cycle, as the solution orders them. */
    List<List<Entry>> halves() {
        return halves;
    }
}
