package clipramp.engine;

import java.util.SplittableRandom;

/**
 * Networks of parts that nobody has, every number drawn over many decades or left out altogether: milliohms against
 * gigaohms, no emitter drop, no clamp drop. Many rest on a threshold, where rounding decides. A seed always gives the same.
 */
final class AbsurdNetworks {
    private final SplittableRandom random;
    private final Network n = new Network();

    private AbsurdNetworks(long seed) {
        random = new SplittableRandom(seed);
    }

    /** A network with a pulse transformer; every third has a programmable device. */
    static Network throughTransformer(long seed) {
        return new AbsurdNetworks(seed).fill(seed % 3 == 0);
    }

    static SourceWave sine(long seed) {
        AbsurdNetworks drawn = new AbsurdNetworks(~seed);
        SourceWave wave = new SourceWave();
        wave.setSine(100 * Math.PI, drawn.decades(1, 1e5), drawn.orNone(0.3, 1.4), 0.01);
        return wave;
    }

    private double decades(double low, double high) {
        return low * Math.pow(high / low, random.nextDouble());
    }

    private double orNone(double chance, double value) {
        return random.nextDouble() < chance ? 0 : value;
    }

    private Network fill(boolean programmable) {
        n.dropperOhms = decades(1e-6, 1e5);
        n.zenerKneeVolts = orNone(0.1, decades(1e-2, 30));
        n.zenerSlopeOhms = decades(1e-9, 1e2);
        n.rampOhms = decades(1e-3, 1e8);
        n.capacitorFarads = decades(1e-12, 1e-5);
        n.baseOneOhms = decades(1e-3, 1e4);
        n.baseTwoOhms = orNone(0.3, decades(1, 1e4));
        n.interbaseOhms = decades(1e2, 1e10);
        n.standoff = random.nextDouble();
        n.peakCurrentAmps = orNone(0.3, decades(1e-12, 1e-2));
        n.onOhms = decades(1e-3, 1e3);
        n.valleySiemens = orNone(0.2, decades(1e-8, 1e-2));
        n.onIntercept = programmable ? 0 : orNone(0.3, decades(1e-5, 0.5));
        n.modulatedOhms = decades(1, 1e9);
        n.emitterDropVolts = orNone(0.4, decades(1e-9, 1));
        n.programmable = programmable;
        n.upperOhms = decades(1, 1e7);
        n.lowerOhms = decades(1, 1e7);
        n.gateKneeVolts = orNone(0.2, 0.7);
        n.gateSlopeOhms = decades(1e-3, 100);
        n.gateShuntSiemens = orNone(0.4, decades(1e-5, 1));
        n.transformerCoupled = true;
        n.turnsRatio = decades(0.1, 10);
        n.secondaries = 1 + random.nextInt(2);
        n.magnetisingHenries = decades(1e-7, 1);
        n.primaryOhms = orNone(0.2, decades(1e-3, 100));
        n.secondaryOhms = orNone(0.2, decades(1e-3, 100));
        n.clampVolts = random.nextBoolean() ? orNone(0.3, 0.7) : Double.POSITIVE_INFINITY;
        n.derive();
        return n;
    }
}
