package clipramp.engine;

import java.util.SplittableRandom;

/**
 * Networks drawn around the JEDEC types' sheets (2N2646 to 2N4871, 2N6027): lines from 24 to 240 V, ramps from the
 * latched-on low end to a stall. A seed always gives the same network and source.
 */
final class DrawnNetworks {
    private final SplittableRandom random;
    private final Network n = new Network();
    private double crestVolts;

    private DrawnNetworks(long seed) {
        random = new SplittableRandom(seed);
    }

    static Network direct(long seed) {
        return new DrawnNetworks(seed).fill(seed % 3 == 0, false);
    }

    static Network throughTransformer(long seed) {
        return new DrawnNetworks(seed).fill(seed % 3 == 0, true);
    }

    /** Either coupling, with a ramp resistor that at the zener's voltage brings too little for the peak-point current. */
    static Network starved(long seed) {
        Network n = seed % 2 == 0 ? direct(seed) : throughTransformer(seed);
        DrawnNetworks drawn = new DrawnNetworks(~seed);
        n.peakCurrentAmps = drawn.between(3e-6, 5e-6);
        n.rampOhms = n.zenerKneeVolts * (1 - n.peakShare) / n.peakCurrentAmps * drawn.between(1, 2);
        n.capacitorFarads = drawn.between(1e-3, 3e-3) / n.rampOhms;
        return n;
    }

    /** Half cycle of a sinusoidal line that suits the network of the same seed. */
    static SourceWave sine(long seed) {
        DrawnNetworks drawn = new DrawnNetworks(seed);
        drawn.fill(false, false);
        SourceWave wave = new SourceWave();
        double hertz = seed % 2 == 0 ? 50 : 60;
        wave.setSine(2 * Math.PI * hertz, drawn.crestVolts, 1.4, 0.5 / hertz);
        return wave;
    }

    double between(double low, double high) {
        return low + (high - low) * random.nextDouble();
    }

    private double logarithmic(double low, double high) {
        return low * Math.pow(high / low, random.nextDouble());
    }

    private Network fill(boolean programmable, boolean transformer) {
        crestVolts = Math.sqrt(2) * logarithmic(24, 240);
        n.zenerKneeVolts = between(9, Math.min(22, 0.6 * crestVolts));
        n.zenerSlopeOhms = between(5, 40);
        n.dropperOhms = (crestVolts - n.zenerKneeVolts) / between(8e-3, 30e-3);
        n.rampOhms = logarithmic(4e3, 150e3);
        n.capacitorFarads = logarithmic(40e-9, 300e-9);
        n.baseOneOhms = logarithmic(20, 100);
        n.peakCurrentAmps = logarithmic(0.4e-6, 5e-6);
        gate();
        if (programmable) {
            programmable();
        } else {
            unijunction();
        }
        if (transformer) {
            transformer();
        }
        n.derive();
        return n;
    }

    private void gate() {
        n.gateSeriesOhms = random.nextInt(3) == 0 ? 0 : between(5, 47);
        n.gateShuntSiemens = random.nextInt(4) == 0 ? 0 : 1 / between(470, 2200);
        n.gateKneeVolts = between(0.5, 0.9);
        n.gateSlopeOhms = between(2, 20);
        n.triggerAmps = logarithmic(1e-3, 30e-3);
    }

    private void unijunction() {
        n.baseTwoOhms = between(0, 1000);
        n.interbaseOhms = between(4e3, 10e3);
        n.standoff = between(0.5, 0.8);
        n.emitterDropVolts = between(0.3, 0.7);
        n.onOhms = between(5, 20);
        n.onIntercept = between(0.05, 0.1);
        n.valleySiemens = between(1.5e-4, 4e-4);
        n.modulatedOhms = between(400, 900);
    }

    private void programmable() {
        n.programmable = true;
        n.upperOhms = between(8e3, 40e3);
        n.lowerOhms = between(10e3, 60e3);
        n.emitterDropVolts = between(0.2, 0.6);
        n.onOhms = between(2, 10);
        n.onIntercept = 0;
        n.valleySiemens = between(0.5e-5, 2e-5);
    }

    private void transformer() {
        n.transformerCoupled = true;
        n.turnsRatio = between(0.7, 3);
        n.secondaries = 1 + random.nextInt(2);
        n.magnetisingHenries = logarithmic(0.2e-3, 20e-3);
        n.primaryOhms = logarithmic(0.1, 5);
        n.secondaryOhms = logarithmic(0.1, 5);
        n.clampVolts = random.nextBoolean() ? 0.7 : Double.POSITIVE_INFINITY;
    }
}
