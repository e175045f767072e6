package clipramp.firing;

import clipramp.engine.Piece;

/** Notes when the zener conducts through a half cycle, and where the supply's crest is while it has not yet. */
final class SupplyWatch {
    private double clipFrom = Double.POSITIVE_INFINITY;
    private double clipUntil = Double.NEGATIVE_INFINITY;
    private double crestVolts = Double.NEGATIVE_INFINITY;
    private double crestSeconds;

    /** Takes in a piece that the circuit went through. */
    void passed(Piece piece, double from, double to) {
        if (clipFrom == Double.POSITIVE_INFINITY) {
            double crest = piece.supplyCrestSeconds(from, to);
            piece.look(crest);
            if (piece.supplyVolts() > crestVolts) {
                crestVolts = piece.supplyVolts();
                crestSeconds = crest;
            }
        }
    }

    /**
     * Takes in the zener's state after an event.
     *
     * @param before whether it conducted before
     * @param now whether it conducts now
     */
    void zener(boolean before, boolean now, double seconds) {
        if (now) {
            clipFrom = Math.min(clipFrom, seconds);
        } else if (before) {
            clipUntil = seconds;
        }
    }

    /** The half cycle is over. */
    void end(boolean clips, double seconds) {
        if (clips) {
            clipUntil = seconds;
        }
    }

    /** Time from which the zener conducts, s; POSITIVE_INFINITY for never. */
    double clipFrom() {
        return clipFrom;
    }

    /** When the supply begins to collapse: the zener's last stop, or the supply's crest if it never conducts, s. */
    double collapse() {
        return clipFrom < Double.POSITIVE_INFINITY ? clipUntil : crestSeconds;
    }
}
