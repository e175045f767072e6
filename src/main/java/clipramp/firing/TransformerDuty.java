package clipramp.firing;

import clipramp.engine.Mode;
import clipramp.engine.Network;
import clipramp.engine.Piece;
import clipramp.engine.PieceQuadrature;
import java.util.List;

/**
 * What the pulse transformer bears in the periodic state.
 *
 * @param voltSeconds largest integral of the primary's voltage over one pulse, Vs
 * @param magnetisingPeakAmps largest magnetising current, A
 * @param leftAmps magnetising current that a pulse before has left when the next one begins, beyond the first pulse's
 *     own start, A: the staircase towards saturation
 * @param reverseGateVolts largest reverse gate-cathode voltage after turn-off, V
 */
public record TransformerDuty(
        double voltSeconds, double magnetisingPeakAmps, double leftAmps, double reverseGateVolts) {

    static TransformerDuty of(Network network, List<List<PieceLog.Entry>> halves) {
        Sums sums = new Sums(network);
        for (List<PieceLog.Entry> half : halves) {
            sums.firstStart = Double.NaN;
            half.forEach(sums::take);
        }
        return new TransformerDuty(sums.voltSeconds, sums.peakAmps, sums.leftAmps, sums.reverseVolts);
    }

    private static final class Sums {
        private final Network network;
        private double voltSeconds;
        private double peakAmps;
        private double leftAmps;
        private double reverseVolts;
        private double firstStart = Double.NaN;
        private double running;
        private boolean inPulse;

        Sums(Network network) {
            this.network = network;
        }

        void take(PieceLog.Entry entry) {
            Piece piece = entry.piece();
            boolean on = piece.mode() == Mode.ON;
            piece.look(entry.fromSeconds());
            if (on && !inPulse) {
                running = 0;
                if (Double.isNaN(firstStart)) {
                    firstStart = piece.fluxAmps();
                }
                leftAmps = Math.max(leftAmps, piece.fluxAmps() - firstStart);
            }
            inPulse = on;
            peaks(piece);
            PieceQuadrature.visit(piece, entry.fromSeconds(), entry.toSeconds(), (p, weight) -> {
                running += on ? weight * p.primaryVolts() : 0;
                peaks(p);
            });
            voltSeconds = Math.max(voltSeconds, running);
            piece.look(entry.toSeconds());
            peaks(piece);
        }

        private void peaks(Piece piece) {
            peakAmps = Math.max(peakAmps, piece.fluxAmps());
            reverseVolts = Math.max(reverseVolts, -piece.primaryVolts() / network.turnsRatio);
        }
    }
}
