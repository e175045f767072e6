package clipramp.firing;

import clipramp.engine.Mode;
import clipramp.engine.Network;
import clipramp.engine.Piece;
import java.util.ArrayList;
import java.util.List;

/** Samples the logged pieces of one half cycle (all of them for a half-wave stage) into waveforms. */
final class Sampler {
    /** Samples inside a pulse, bunched towards its start where everything moves. */
    private static final int PULSE_SAMPLES = 40;

    private static final int COLUMNS = 12;

    private final FiringCase firing;
    private final double step;
    private final List<double[]> rows = new ArrayList<>();

    private Sampler(FiringCase firing, double step) {
        this.firing = firing;
        this.step = step;
    }

    /**
     * The waveforms of half cycles of the periodic state.
     *
     * @param firing what was solved
     * @param halves logged pieces by half cycle, the first of which has the running number 0
     * @param samples about how many instants
     */
    static Waveforms sample(FiringCase firing, List<List<PieceLog.Entry>> halves, int samples) {
        double length = 0;
        for (int h = 0; h < halves.size(); h++) {
            length += firing.timing().wave(h).seconds();
        }
        Sampler sampler = new Sampler(firing, length / Math.max(1, samples - 1));
        double before = 0;
        for (int h = 0; h < halves.size(); h++) {
            for (PieceLog.Entry entry : halves.get(h)) {
                sampler.piece(entry, h, before);
            }
            before += firing.timing().wave(h).seconds();
        }
        return sampler.waveforms();
    }

    private void piece(PieceLog.Entry entry, int half, double before) {
        double from = entry.fromSeconds();
        double length = entry.toSeconds() - from;
        boolean pulse = entry.piece().mode() == Mode.ON;
        int count = Math.max(pulse ? PULSE_SAMPLES : 1, (int) Math.ceil(length / step));
        for (int i = 0; i <= count; i++) {
            double share = (double) i / count;
            // Squaring puts half of a pulse's samples into its first quarter.
            double time = i == count ? entry.toSeconds() : from + length * (pulse ? share * share : share);
            row(entry.piece(), half, time, before);
        }
    }

    private void row(Piece piece, int half, double time, double before) {
        Network n = firing.network();
        piece.look(time);
        double angle = firing.lineRad(half, time);
        rows.add(new double[] {
            angle,
            before + time,
            firing.line().voltsAt(angle),
            piece.supplyVolts(),
            piece.rampVolts(),
            piece.peakPointVolts(),
            piece.baseOneVolts(),
            piece.gateVolts(),
            piece.gateAmps(n),
            piece.emitterAmps(),
            piece.dropperAmps(n),
            piece.zenerAmps(n)
        });
    }

    private Waveforms waveforms() {
        double[][] columns = new double[COLUMNS][rows.size()];
        for (int r = 0; r < rows.size(); r++) {
            for (int c = 0; c < COLUMNS; c++) {
                columns[c][r] = rows.get(r)[c];
            }
        }
        return new Waveforms(
                columns[0],
                columns[1],
                columns[2],
                columns[3],
                columns[4],
                columns[5],
                columns[6],
                columns[7],
                columns[8],
                columns[9],
                columns[10],
                columns[11]);
    }
}
