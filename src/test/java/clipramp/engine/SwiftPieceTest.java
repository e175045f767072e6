package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** Looks along a piece against the library's sine, cosine and exponential, and zeros against zeros put there. */
class SwiftPieceTest {
    private static final double OMEGA = 100 * Math.PI;
    private static final double START = 0.4;
    private static final int FORM = SwiftLaws.DEVICE;

    private final double[] rows = new double[64];
    private final SwiftPiece piece = new SwiftPiece(rows);

    /** Begins at 0.4 rad of the supply with 4 V of exponential over 7 V + 2 V sine - 1 V cosine. */
    private void begin(double rate) {
        rows[SwiftLaws.RATE] = rate;
        rows[SwiftLaws.STEADY] = 7;
        rows[SwiftLaws.SINE] = 2;
        rows[SwiftLaws.COSINE] = -1;
        piece.start(false);
        piece.take(OMEGA, 0.01);
        double sine = Math.sin(START);
        double cosine = Math.cos(START);
        double limit = 0.01 - START / OMEGA;
        piece.begin(0, START / OMEGA, limit, 4 + 7 + 2 * sine - cosine, sine, cosine);
    }

    private void form(double p, double q, double r) {
        rows[FORM] = p;
        rows[FORM + 1] = q;
        rows[FORM + 2] = r;
        rows[FORM + 3] = 0;
        rows[FORM + 4] = OMEGA * (Math.abs(q) + Math.abs(r));
    }

    private double truth(double seconds) {
        double angle = START + OMEGA * seconds;
        return rows[FORM] * 4 * Math.exp(-piece.rate * seconds)
                + rows[FORM + 1] * Math.sin(angle)
                + rows[FORM + 2] * Math.cos(angle)
                + rows[FORM + 3];
    }

    private void assertLooksAt(double seconds) {
        assertThat(piece.ahead).isCloseTo(seconds, within(1e-15));
        assertThat(piece.s).isCloseTo(Math.sin(START + OMEGA * seconds), within(1e-14));
        assertThat(piece.c).isCloseTo(Math.cos(START + OMEGA * seconds), within(1e-14));
        assertThat(piece.x).isCloseTo(4 * Math.exp(-piece.rate * seconds), within(1e-13));
        assertThat(piece.decay()).isCloseTo(Math.exp(-piece.rate * seconds), within(1e-13));
        assertThat(piece.turnSine()).isCloseTo(Math.sin(OMEGA * seconds), within(1e-14));
        assertThat(piece.turnCosine()).isCloseTo(Math.cos(OMEGA * seconds), within(1e-14));
        double ramp = 7 + 2 * piece.s - piece.c + piece.x;
        assertThat(piece.rampVolts()).isCloseTo(ramp, within(1e-13));
    }

    /** Over every length of turn, each of which has its own polynomials. */
    @Test
    void aLookWhereAPartIsLeftIsALookAtItsTime() {
        for (double rate : new double[] {200, 5e3}) {
            begin(rate);
            for (double turn : new double[] {1e-4, 0.05, 0.0999, 0.1001, 0.7, 1.39, 1.41, 2.6}) {
                piece.lookWhere(Math.exp(-rate * turn / OMEGA));
                assertThat(piece.ahead).isCloseTo(turn / OMEGA, within(1e-13));
                assertThat(piece.s).isCloseTo(Math.sin(START + OMEGA * piece.ahead), within(1e-14));
                assertThat(piece.c).isCloseTo(Math.cos(START + OMEGA * piece.ahead), within(1e-14));
            }
        }
    }

    @Test
    void theEndIsTheHalfCyclesEnd() {
        begin(300);
        assertThat(piece.lookAtEnd()).isEqualTo(SwiftPiece.END);
        assertThat(piece.aim(SwiftPiece.END)).isEqualTo(SwiftPiece.END);
        assertLooksAt(0.01 - START / OMEGA);
    }

    /** A zero put somewhere, looked for from before and from behind it. */
    @Test
    void seekingEndsAtTheZero() {
        for (long seed = 0; seed < 400; seed++) {
            SplittableRandom random = new SplittableRandom(seed);
            begin(200 * Math.pow(500, random.nextDouble()));
            double zero = (0.1 + 1.5 * random.nextDouble()) / piece.rate;
            form(-0.5 - random.nextDouble(), 0.2 * random.nextDouble() - 0.1, 0.2 * random.nextDouble() - 0.1);
            rows[FORM + 3] = -truth(zero);
            double from = zero + (random.nextDouble() - 0.5) * 0.4 * zero;
            piece.lookAfter(from, Math.exp(-piece.rate * from), Math.sin(OMEGA * from), Math.cos(OMEGA * from));
            if (!(piece.slope(FORM) > 0.1 * piece.rate)) {
                continue;
            }
            assertThat(piece.seek(FORM)).as("seed " + seed).isTrue();
            assertThat(piece.ahead).as("seed " + seed).isCloseTo(zero, within(1e-12 * (1 + 1e3 / piece.rate)));
            assertLooksAt(piece.ahead);
        }
    }

    @Test
    void aRoughSearchEndsSooner() {
        begin(1000);
        form(-1, 0, 0);
        rows[FORM + 3] = 4 * Math.exp(-0.5);
        piece.lookAfter(4.9e-4, Math.exp(-0.49), Math.sin(OMEGA * 4.9e-4), Math.cos(OMEGA * 4.9e-4));
        piece.start(true);
        assertThat(piece.seek(FORM)).isTrue();
        assertThat(Math.abs(piece.ahead - 5e-4)).isBetween(1e-13, 1e-6);
        piece.start(false);
        assertThat(piece.seek(FORM)).isTrue();
        assertThat(piece.ahead).isCloseTo(5e-4, within(1e-15));
    }

    @Test
    void aFallingFormOrAZeroBeforeTheStartIsNotFound() {
        begin(1000);
        form(1, 0, 0);
        rows[FORM + 3] = -3;
        piece.lookAfter(0, 1, 0, 1);
        assertThat(piece.seek(FORM)).as("falls").isFalse();
        form(-1, 0, 0);
        rows[FORM + 3] = 5;
        piece.lookAfter(0, 1, 0, 1);
        assertThat(piece.seek(FORM)).as("was zero before").isFalse();
    }

    /** A fast exponential: aimed where it alone comes to zero, but for what the sinusoid moves meanwhile. */
    @Test
    void anExponentialIsAimedAtByItsLogarithm() {
        begin(20e3);
        form(-1, 0, 0);
        rows[FORM + 3] = 1;
        assertThat(piece.aim(FORM)).isEqualTo(FORM);
        assertLooksAt(Math.log(4) / 20e3);
        // It fades to nothing and never gets there; nor does a sinusoid that is not there.
        rows[FORM + 3] = -0.5;
        assertThat(piece.aim(FORM)).isEqualTo(SwiftPiece.END);
    }

    /** A supply that rises to a level: sin = 0.2, 0.9 are on its way, 0.3 was before it, -0.1 comes on its way down. */
    @Test
    void aSinusoidIsAimedAtByItsArcsine() {
        begin(100);
        form(0, 1, 0);
        rows[FORM + 3] = -0.9;
        assertThat(piece.aim(FORM)).isEqualTo(FORM);
        assertThat(piece.s).isCloseTo(0.9, within(1e-12));
        assertThat(piece.c).isPositive();
        rows[FORM + 3] = -0.3;
        assertThat(piece.aim(FORM)).isEqualTo(FORM);
        assertThat(piece.ahead).as("from the start on").isZero();
        rows[FORM + 3] = -1.1;
        assertThat(piece.aim(FORM)).as("out of reach").isEqualTo(SwiftPiece.END);
        assertThat(piece.ahead).isEqualTo(piece.limit);
        form(0, -1, 0);
        rows[FORM + 3] = 0.25;
        assertThat(piece.aim(FORM)).as("falling").isEqualTo(FORM);
        assertThat(piece.s).as("by three terms of the arcsine").isCloseTo(0.25, within(1e-5));
        assertThat(piece.c).isNegative();
        rows[FORM + 3] = -0.1;
        assertThat(piece.aim(FORM)).as("beyond the half cycle").isEqualTo(SwiftPiece.END);
    }

    /**
     * Where the sinusoid falls meanwhile, the form turns round: alone the exponential would come to a hundredth of itself,
     * when the sinusoid already falls faster than it rises. It is aimed at while it still rises.
     */
    @Test
    void itIsAimedAtWhereTheFormStillRises() {
        begin(3e3);
        form(-1, -2, 0);
        rows[FORM + 3] = 0.04 + 2 * Math.sin(START);
        rows[FORM + 4] = 0;
        piece.lookWhere(0.01);
        assertThat(piece.slope(FORM)).isNegative();
        piece.aim(FORM);
        assertThat(piece.slope(FORM)).isPositive();
    }

    @Test
    void turnsAreBroughtBackOntoTheCircle() {
        begin(100);
        piece.lookAfter(1e-3, 0.9, Math.sin(0.1 * Math.PI) * (1 + 1e-7), Math.cos(0.1 * Math.PI) * (1 + 1e-7));
        piece.straighten();
        assertThat(Math.hypot(piece.s, piece.c)).isCloseTo(1, within(1e-13));
        assertThat(Math.atan2(piece.s, piece.c)).isCloseTo(START + 0.1 * Math.PI, within(1e-13));
    }

    @Test
    void anExponentialOfNothingDecaysAllTheSame() {
        begin(500);
        piece.startX = 0;
        piece.lookAfter(1e-3, Math.exp(-0.5), 0, 1);
        assertThat(piece.decay()).isCloseTo(Math.exp(-0.5), within(1e-15));
    }
}
