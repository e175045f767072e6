package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** What is proven to stay under zero does so wherever it is sampled, and most of what does is proven. */
class SwiftProofTest {
    private static final int DRAWN = 4000;
    private static final double OMEGA = 100 * Math.PI;
    private static final double FAR_UNDER = -1e6;

    private final double[] rows = new double[64];
    private final SwiftPiece piece = new SwiftPiece(rows);
    private final SwiftProof proof = new SwiftProof(piece);

    private void form(int at, double p, double q, double r, double k) {
        rows[at] = p;
        rows[at + 1] = q;
        rows[at + 2] = r;
        rows[at + 3] = k;
        rows[at + 4] = OMEGA * (Math.abs(q) + Math.abs(r));
    }

    /** A piece of no form but far under zero, its exponential of so many volts. */
    private void begin(double rate, double angle, double volts) {
        java.util.Arrays.fill(rows, 0);
        rows[SwiftLaws.RATE] = rate;
        for (int at = SwiftLaws.DEVICE; at <= SwiftLaws.TRIGGER; at += SwiftLaws.FORM_COLUMNS) {
            form(at, 0, 0, 0, FAR_UNDER);
        }
        piece.start(false);
        piece.take(OMEGA, 0.01);
        piece.begin(0, 0, 1, volts, Math.sin(angle), Math.cos(angle));
        proof.start();
        proof.begin();
    }

    private void look(double seconds) {
        double rate = rows[SwiftLaws.RATE];
        piece.lookAfter(seconds, Math.exp(-rate * seconds), Math.sin(OMEGA * seconds), Math.cos(OMEGA * seconds));
    }

    private double value(int at, double seconds) {
        look(seconds);
        return rows[at] * piece.x + rows[at + 1] * piece.s + rows[at + 2] * piece.c + rows[at + 3];
    }

    /** Greatest value before the end, the end's own apart; by sampling, then by thirds. */
    private double greatest(int at, double end) {
        int best = 0;
        double most = Double.NEGATIVE_INFINITY;
        for (int i = 0; i <= 100; i++) {
            double value = value(at, end * i / 100);
            if (value > most) {
                most = value;
                best = i;
            }
        }
        double low = end * Math.max(0, best - 1) / 100;
        double high = end * Math.min(100, best + 1) / 100;
        for (int i = 0; i < 40; i++) {
            double left = low + (high - low) / 3;
            double right = high - (high - low) / 3;
            if (value(at, left) < value(at, right)) {
                low = left;
            } else {
                high = right;
            }
        }
        return Math.max(most, value(at, (low + high) / 2));
    }

    @Test
    void whatSomewhereIsOverZeroIsNeverProvenAndWhatIsUnderItMostlyIs() {
        int proven = 0;
        int asked = 0;
        int crossing = 0;
        for (long seed = 0; seed < DRAWN; seed++) {
            SplittableRandom random = new SplittableRandom(seed);
            begin(200 * Math.pow(500, random.nextDouble()), Math.PI * random.nextDouble(), 4);
            int at = seed % 2 == 0 ? SwiftLaws.ZENER : SwiftLaws.DEVICE;
            form(at, 2 * random.nextDouble() - 1, 4 * random.nextDouble() - 2, 0.5 * random.nextDouble() - 0.25, 0);
            double end = 9e-3 * random.nextDouble();
            double most = greatest(at, end);
            double margin = 0.3 * Math.pow(1e-4, random.nextDouble());
            boolean over = seed % 4 < 2;
            rows[at + 3] = over ? margin - most : -margin - most;
            if (over && value(at, 0) >= 0) {
                continue; // a state that does not agree with itself is no beginning
            }
            look(end);
            int told = proof.judge(SwiftPiece.END, false, true);
            if (over) {
                crossing++;
                assertThat(told).as("seed " + seed).isNotEqualTo(SwiftPiece.NONE);
            } else {
                asked++;
                proven += told == SwiftPiece.NONE ? 1 : 0;
                assertThat(told).as("seed " + seed).isIn(SwiftPiece.NONE, SwiftProof.DOUBT, SwiftLaws.DEVICE);
            }
        }
        assertThat(crossing).isGreaterThan(DRAWN / 8);
        assertThat((double) proven / asked).as("share that is proven").isGreaterThan(0.88);
    }

    /** The form whose zero is looked at: under it all the way there, or once over it before. */
    @Test
    void aZeroThatIsNotTheFirstIsNeverProven() {
        int first = 0;
        int proven = 0;
        for (long seed = 0; seed < DRAWN; seed++) {
            SplittableRandom random = new SplittableRandom(seed);
            begin(200 * Math.pow(500, random.nextDouble()), Math.PI * random.nextDouble(), 4);
            int at = SwiftLaws.DEVICE;
            form(at, 2 * random.nextDouble() - 1, 4 * random.nextDouble() - 2, 0.5 * random.nextDouble() - 0.25, 0);
            double end = 9e-3 * random.nextDouble();
            rows[at + 3] = -value(at, end);
            double before = greatest(at, 0.999 * end);
            look(end);
            if (!(piece.slope(at) > 1) || Math.abs(before) < 1e-4 || value(at, 0) >= 0) {
                continue;
            }
            look(end);
            int told = proof.judge(at, false, true);
            if (before > 0) {
                assertThat(told).as("seed " + seed).isEqualTo(SwiftProof.DOUBT);
            } else {
                first++;
                proven += told == SwiftPiece.NONE ? 1 : 0;
            }
        }
        assertThat(first).isGreaterThan(DRAWN / 8);
        assertThat((double) proven / first).as("share that is proven").isGreaterThan(0.97);
    }

    @Test
    void aFormPastItsZeroAtTheEndIsNamed() {
        for (int at = SwiftLaws.DEVICE; at <= SwiftLaws.JUNCTION; at += SwiftLaws.FORM_COLUMNS) {
            begin(1000, 0.5, 4);
            form(at, -1, 0, 0, 2);
            look(2e-3);
            boolean asked = at != SwiftLaws.JUNCTION;
            assertThat(proof.judge(SwiftPiece.END, true, true)).isEqualTo(at);
            assertThat(proof.judge(SwiftPiece.END, false, true)).isEqualTo(asked ? at : SwiftPiece.NONE);
            assertThat(proof.judge(SwiftPiece.END, true, false))
                    .as("without proof too")
                    .isEqualTo(at);
        }
    }

    @Test
    void whatRoundingMightTurnOverIsDoubted() {
        begin(1000, 0.5, 4);
        form(SwiftLaws.ZENER, 0, 0, 0, -1e-12);
        look(1e-3);
        assertThat(proof.judge(SwiftPiece.END, false, true)).isEqualTo(SwiftProof.DOUBT);
        form(SwiftLaws.ZENER, 0, 0, 0, 1e-12);
        assertThat(proof.judge(SwiftPiece.END, false, false)).isEqualTo(SwiftProof.DOUBT);
    }

    /** Within a millivolt, or a microampere of the valley, another event nearly took place. */
    @Test
    void aFormThatEndsJustUnderZeroIsAnEdge() {
        for (double volts : new double[] {-0.5e-3, -2e-3}) {
            begin(1000, 0.5, 4);
            form(SwiftLaws.ZENER, 0, 0, 0, volts);
            look(1e-3);
            assertThat(proof.judge(SwiftPiece.END, true, true)).isEqualTo(SwiftPiece.NONE);
            assertThat(proof.nearEdge()).isEqualTo(volts > -1e-3);
        }
        for (double amps : new double[] {-0.5e-6, -2e-6}) {
            begin(1000, 0.5, 4);
            form(SwiftLaws.DEVICE, 0, 0, 0, amps);
            look(1e-3);
            proof.judge(SwiftPiece.END, true, true);
            assertThat(proof.nearEdge()).as("valley").isEqualTo(amps > -1e-6);
            proof.start();
            proof.judge(SwiftPiece.END, false, true);
            assertThat(proof.nearEdge()).as("volts of a blocking device").isTrue();
        }
        proof.start();
        assertThat(proof.nearEdge()).isFalse();
        proof.doubt();
        assertThat(proof.nearEdge()).isTrue();
    }
}
