package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Ideal and absurd parts, which rest on their thresholds, where rounding decides: time goes on, and the books are met. */
class StepperThresholdsTest {
    /**
     * No dropper to speak of, no zener slope, no emitter drop, no base bar's load: the circuit of the books, which rests on
     * its thresholds all the time. R_E C_E ln(1/(1 - eta)) from pulse to pulse; Mehta, Principles of Electronics, 21.11 (his
     * 5 kilohm, 0.2 uF and 0.54; exact 1287.8 Hz).
     */
    @Test
    void idealPartsDoNotHoldItUp() {
        Network n = ideal();
        double period = 1 / 1287.8;
        SourceWave constant = new SourceWave();
        constant.setConstant(1000, 0.01);
        Stepper stepper = new Stepper(n);
        stepper.start(constant, Mode.OFF, 0, 0);
        List<Double> fires = new ArrayList<>();
        int events = 0;
        while (stepper.seconds() < 0.01) {
            if (stepper.advance(0.01) == Event.FIRES) {
                fires.add(stepper.seconds());
            }
            assertThat(++events).as("events in a hundredth of a second").isLessThan(300);
        }
        assertThat(fires).hasSize(12);
        assertThat(fires.get(0)).isCloseTo(period, within(1e-4 * period));
        assertThat(fires.get(1) - fires.get(0)).isCloseTo(period, within(2e-3 * period));
    }

    /** The same on a line that swings so high that the supply clips from its zero on, every half cycle anew. */
    @Test
    void idealPartsOnALineNeitherHoldItUp() {
        double period = 1 / 1287.8;
        for (double crest : new double[] {1e3, 1e4, 1e5, 1e6}) {
            Network n = ideal();
            n.dropperOhms = crest / 10;
            n.zenerSlopeOhms = 1e-6;
            SourceWave sine = new SourceWave();
            sine.setSine(100 * Math.PI, crest, 0, 0.01);
            Stepper stepper = new Stepper(n);
            Mode mode = Mode.OFF;
            double ramp = 0;
            for (int half = 0; half < 3; half++) {
                List<Double> fires = new ArrayList<>();
                stepper.start(sine, mode, ramp, 0);
                int events = 0;
                while (stepper.seconds() < 0.01) {
                    if (stepper.advance(0.01) == Event.FIRES) {
                        fires.add(stepper.seconds());
                    }
                    assertThat(++events)
                            .as("events of a half cycle at " + crest)
                            .isLessThan(300);
                }
                double clips = 20 / crest / (100 * Math.PI);
                assertThat(fires.get(0)).as("at " + crest).isCloseTo(period, within(clips + 2e-3 * period));
                mode = stepper.mode();
                ramp = stepper.rampVolts();
            }
        }
    }

    /**
     * Found among three hundred absurd networks: these switch to and fro on a threshold without getting on, until their
     * searches pause a little.
     */
    @Test
    void aCircuitThatRestsOnAThresholdGoesOnAllTheSame() {
        for (long seed : new long[] {11, 23, 37, 45, 79, 87, 97, 127, 209}) {
            SourceWave wave = AbsurdNetworks.sine(seed);
            Stepper stepper = new Stepper(AbsurdNetworks.throughTransformer(seed));
            stepper.start(wave, Mode.OFF, 0, 0);
            int events = 0;
            while (stepper.seconds() < wave.seconds()) {
                double before = stepper.seconds();
                stepper.advance(wave.seconds());
                assertThat(stepper.seconds()).as("seed " + seed).isGreaterThanOrEqualTo(before);
                assertThat(++events).as("events with seed " + seed).isLessThan(300);
                assertDeviceAgrees(stepper, before, "seed " + seed + " at " + before);
            }
            assertThat(stepper.rampVolts()).as("seed " + seed).isFinite();
        }
    }

    /** A pause is short enough for nothing to be missed meanwhile. */
    private static void assertDeviceAgrees(Stepper stepper, double from, String which) {
        Piece piece = stepper.piece();
        piece.look((from + stepper.seconds()) / 2);
        double rounding = 1e-6 * (1 + Math.abs(piece.rampVolts()));
        if (piece.mode() == Mode.OFF) {
            assertThat(piece.rampVolts()).as(which).isLessThan(piece.peakPointVolts() + rounding);
        } else if (piece.mode() == Mode.STALLED && stepper.seconds() - from > 1e-9) {
            assertThat(piece.emitterAmps()).as(which).isGreaterThan(-1e-9);
        }
    }

    private static Network ideal() {
        Network n = new Network();
        n.dropperOhms = 1e-3;
        n.zenerKneeVolts = 20;
        n.zenerSlopeOhms = 1e-9;
        n.rampOhms = 5e3;
        n.capacitorFarads = 0.2e-6;
        n.baseOneOhms = 0.1;
        n.interbaseOhms = 1e10;
        n.standoff = 0.54;
        n.peakCurrentAmps = 1e-9;
        n.onOhms = 0.05;
        n.valleySiemens = 8e-3 / 20;
        n.onIntercept = 1e-5;
        n.modulatedOhms = 1e9;
        n.gateKneeVolts = 0.7;
        n.gateSlopeOhms = 10;
        n.derive();
        return n;
    }
}
