package clipramp.firing;

import clipramp.engine.Piece;

/** Notes when the zener conducts through a half cycle, and where the supply's crest is while it has not yet. */
final class SupplyWatch {
    private double clipFromSeconds = Double.POSITIVE_INFINITY;
    private double clipUntilSeconds = Double.NEGATIVE_INFINITY;
    private double crestVolts = Double.NEGATIVE_INFINITY;
    private double crestSeconds;

    /** Takes in a piece that the circuit went through. */
    void passed(Piece piece, double from, double to) {
        if (clipFromSeconds == Double.POSITIVE_INFINITY) {
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
            clipFromSeconds = Math.min(clipFromSeconds, seconds);
        } else if (before) {
            clipUntilSeconds = seconds;
        }
    }

    /** The half cycle is over. */
    void end(boolean clips, double seconds) {
        if (clips) {
            clipUntilSeconds = seconds;
        }
    }

    /** Time from which the zener conducts, s; POSITIVE_INFINITY for never. */
    double clipFromSeconds() {
        return clipFromSeconds;
    }

    /** When the supply begins to collapse: the zener's last stop, or the supply's crest if it never conducts, s. */
    double collapseSeconds() {
        return clipFromSeconds < Double.POSITIVE_INFINITY ? clipUntilSeconds : crestSeconds;
    }
}
