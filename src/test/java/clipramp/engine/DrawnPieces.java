package clipramp.engine;

import java.util.SplittableRandom;

/** Pieces that begin in a drawn state of a drawn network, switches settled, under a line with and without a harmonic. */
final class DrawnPieces {
    /** A piece, and what it was begun with. */
    record Begun(long seed, Network n, Piece piece, SourceWave wave, double fromSeconds, double ramp, double flux) {
        /** How far the piece's own equation is followed: a few of its time constants, within the half cycle. */
        double toSeconds() {
            double span = piece.mode == Mode.ON ? 4e-4 : 3e-3;
            return Math.min(fromSeconds + span, wave.seconds);
        }

        @Override
        public String toString() {
            return "seed " + seed + " " + piece.mode;
        }
    }

    private DrawnPieces() {}

    static Begun direct(long seed) {
        return begin(seed, DrawnNetworks.direct(seed), Mode.values()[(int) (seed % 3)]);
    }

    static Begun throughTransformer(long seed) {
        return begin(seed, DrawnNetworks.throughTransformer(seed), Mode.values()[(int) (seed / 3 % 3)]);
    }

    private static Begun begin(long seed, Network n, Mode mode) {
        SplittableRandom random = new SplittableRandom(~seed);
        SourceWave wave = DrawnNetworks.sine(seed);
        if (seed % 2 == 0) {
            addFifth(wave, 0.05 * random.nextDouble(), 6 * random.nextDouble());
        }
        Piece piece = new Piece();
        piece.mode = mode;
        double from = (0.05 + 0.7 * random.nextDouble()) * wave.seconds;
        double ramp = mode == Mode.ON ? 8 + 8 * random.nextDouble() : 8 * random.nextDouble();
        double flux = n.transformerCoupled ? 0.02 * (random.nextDouble() - 0.3) : 0;
        NodeLaws.settle(n, piece, ramp, flux, wave.at(from));
        piece.begin(n, wave, from, ramp, flux);
        return new Begun(seed, n, piece, wave, from, ramp, flux);
    }

    private static void addFifth(SourceWave wave, double share, double phase) {
        wave.rates = new double[] {wave.rates[0], 5 * wave.rates[0]};
        wave.amplitudes = new double[] {wave.amplitudes[0], share * wave.amplitudes[0]};
        wave.phases = new double[] {0.02, phase};
        wave.count = 2;
    }
}
