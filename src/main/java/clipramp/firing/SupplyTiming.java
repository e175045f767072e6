package clipramp.firing;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.engine.LineWave;
import clipramp.engine.SourceWave;

/**
 * The half cycles that the firing supply sees in turn. A bridge sees each half of the line; a single diode sees whole
 * periods, the second half unfed.
 */
final class SupplyTiming {
    private final SourceWave[] waves;
    private final double[] startRad;
    private final boolean[] positive;
    private final boolean wholePeriods;

    private SupplyTiming(SourceWave[] waves, double[] startRad, boolean[] positive, boolean wholePeriods) {
        this.waves = waves;
        this.startRad = startRad;
        this.positive = positive;
        this.wholePeriods = wholePeriods;
    }

    static SupplyTiming of(Design design, LineWave line) {
        ClipSupply clip = design.clip();
        double ratio = clip.windingRatio();
        double lag = clip.lagRad();
        boolean opposite = clip.isTurnedOver();
        double drop = clip.rectifierVolts();
        double[] zeros = {line.positiveStartRad(), line.negativeStartRad()};
        double firstLength = (zeros[1] - zeros[0]) / line.omega();
        double period = 2 * Math.PI / line.omega();
        if (clip.rectifier() == ClipSupply.Rectifier.DIODE) {
            int fed = opposite ? 1 : 0;
            SourceWave wave = wave(line, zeros[fed], opposite ? -ratio : ratio, drop, period);
            return new SupplyTiming(
                    new SourceWave[] {wave}, new double[] {zeros[fed] + lag}, new boolean[] {!opposite}, true);
        }
        SourceWave first = wave(line, zeros[0], ratio, drop, firstLength);
        if (line.isHalfWaveSymmetric()) {
            return new SupplyTiming(
                    new SourceWave[] {first, first},
                    new double[] {zeros[0] + lag, zeros[0] + Math.PI + lag},
                    new boolean[] {true, false},
                    false);
        }
        SourceWave second = wave(line, zeros[1], -ratio, drop, period - firstLength);
        return new SupplyTiming(
                new SourceWave[] {first, second},
                new double[] {zeros[0] + lag, zeros[1] + lag},
                new boolean[] {true, false},
                false);
    }

    private static SourceWave wave(LineWave line, double startRad, double scale, double drop, double seconds) {
        SourceWave wave = new SourceWave();
        if (line.isPureSine()) {
            double amplitude = Math.abs(scale) * line.voltsAt(Math.PI / 2);
            wave.setSine(line.omega(), amplitude, drop, seconds);
        } else {
            wave.set(line, startRad, scale, drop, seconds);
        }
        return wave;
    }

    private int slot(int half) {
        return half % waves.length;
    }

    /** Source behind the dropper in the half cycle with this running number. */
    SourceWave wave(int half) {
        return waves[slot(half)];
    }

    /** Angle of the load's line at which it begins, rad, 0 to 2 pi for lag 0. */
    double startRad(int half) {
        return startRad[slot(half)];
    }

    /** Whether it begins with the line's positive half. */
    boolean isPositive(int half) {
        return positive[slot(half)];
    }

    /** Half cycles after which the supply repeats: one if all are alike. */
    int period() {
        return waves.length == 2 && waves[0] != waves[1] ? 2 : 1;
    }

    /** Whether one "half cycle" is a whole line period. */
    boolean isWholePeriods() {
        return wholePeriods;
    }
}
