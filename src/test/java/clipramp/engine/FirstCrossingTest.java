package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.engine.DrawnPieces.Begun;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** First crossings against closed forms, and against dense sampling where there is none. */
class FirstCrossingTest {
    private static final double NEVER = Double.POSITIVE_INFINITY;
    private static final double OMEGA = 2000;

    /** sin(2000 t) behind a millisecond's lag. */
    private static Piece swinging() {
        SourceWave sine = new SourceWave();
        sine.setSine(OMEGA, 1, 0, 1);
        return Lag.behind(sine, 0, 0);
    }

    private static Affine form(double ofRamp, double ofSource, double constant) {
        Affine form = new Affine();
        form.set(ofRamp, ofSource, constant);
        return form;
    }

    @Test
    void aRampReachesALevelAfterTheLogarithmOfTheBooks() {
        double eta = 0.655;
        double found = FirstCrossing.after(Lag.charging(2e-3, 0), form(1, 0, -eta), 2e-3, 1);
        assertThat(found).isCloseTo(2e-3 + 1e-3 * Math.log(1 / (1 - eta)), within(1e-15));
    }

    @Test
    void aCrossingBeyondTheLimitIsNone() {
        Piece piece = Lag.charging(0, 0);
        double at = FirstCrossing.after(piece, form(1, 0, -0.5), 0, 1);
        assertThat(FirstCrossing.after(piece, form(1, 0, -0.5), 0, at * (1 + 1e-9)))
                .isCloseTo(at, within(1e-15));
        assertThat(FirstCrossing.after(piece, form(1, 0, -0.5), 0, at * (1 - 1e-9)))
                .isEqualTo(NEVER);
    }

    @Test
    void whatItNeverReachesIsNotFound() {
        assertThat(FirstCrossing.after(Lag.charging(0, 0), form(1, 0, -1.001), 0, 1))
                .isEqualTo(NEVER);
        assertThat(FirstCrossing.after(Lag.charging(0, 0.9), form(-1, 0, 0.5), 0, 1))
                .isEqualTo(NEVER);
        assertThat(FirstCrossing.after(Lag.charging(0, 0), form(0, 0, -1), 0, 1))
                .isEqualTo(NEVER);
    }

    @Test
    void aFormThatIsPastItsZeroCrossesAtOnce() {
        assertThat(FirstCrossing.after(Lag.charging(0, 0.7), form(1, 0, -0.5), 0, 1))
                .isZero();
        assertThat(FirstCrossing.after(Lag.charging(0, 0), form(1, 0, -0.5), 0.9e-3, 1))
                .isEqualTo(0.9e-3);
        assertThat(FirstCrossing.after(Lag.charging(0, 0), form(-1, 0, 0.5), 1e-4, 1))
                .isEqualTo(1e-4);
    }

    @Test
    void theSearchBeginsWhereItIsTold() {
        // sin wt > 0.5 between pi/6 and 5 pi/6 and again from 13 pi/6 on.
        Piece piece = swinging();
        Affine over = form(0, 1, -0.5);
        assertThat(FirstCrossing.after(piece, over, 0, 1)).isCloseTo(Math.PI / 6 / OMEGA, within(1e-15));
        assertThat(FirstCrossing.after(piece, over, 3 / OMEGA, 1)).isCloseTo(13 * Math.PI / 6 / OMEGA, within(1e-14));
        Affine under = form(0, -1, 0.5);
        under.negate();
        under.negate();
        assertThat(FirstCrossing.after(piece, under, 1 / OMEGA, 1)).isCloseTo(5 * Math.PI / 6 / OMEGA, within(1e-15));
    }

    @Test
    void aFormAtZeroCrossesOnlyIfItRises() {
        Piece piece = swinging();
        assertThat(FirstCrossing.after(piece, form(0, 1, 0), 0, 1)).as("rises").isZero();
        assertThat(FirstCrossing.after(piece, form(0, -1, 0), 0, 1))
                .as("falls, and comes back after half a turn")
                .isCloseTo(Math.PI / OMEGA, within(1e-15));
        assertThat(FirstCrossing.after(piece, form(0, 0, 0), 0, 1))
                .as("stays at zero")
                .isEqualTo(NEVER);
        Affine turning = new Affine();
        turning.sourceSlope = -1 / OMEGA;
        turning.constant = 1;
        assertThat(FirstCrossing.after(piece, turning, 0, 1))
                .as("1 - cos stands still at zero and rises all the same")
                .isZero();
    }

    /** Adding 1e-13 V to something of a volt is rounding, adding 1e-9 V is not. */
    @Test
    void whatRoundingLeavesUnderZeroIsZero() {
        assertThat(FirstCrossing.after(Lag.charging(0, 0.5), form(1, 0, -0.5 - 1e-13), 0, 1))
                .isZero();
        assertThat(FirstCrossing.after(Lag.charging(0, 0.5), form(1, 0, -0.5 - 1e-9), 0, 1))
                .isCloseTo(2e-12, within(1e-15));
        assertThat(FirstCrossing.after(Lag.charging(0, 0.5), form(-1, 0, 0.5 + 1e-13), 0, 1))
                .as("falls from it")
                .isEqualTo(NEVER);
    }

    /** A level that was taken off rounds by its own size, however little is left of the constant. */
    @Test
    void whatCancelledRoundsByItsOwnSize() {
        Affine form = form(0, 1, 20 - 1e-10);
        form.below(20);
        assertThat(form.constant).isCloseTo(-1e-10, within(1e-14));
        assertThat(FirstCrossing.after(swinging(), form, 0, 1)).isZero();
        assertThat(FirstCrossing.after(swinging(), form(0, 1, -1e-10), 0, 1)).isGreaterThan(1e-14);
    }

    /** A pair of zeros a hundredth of a radian apart, which a coarse sampling would step over. */
    @Test
    void noPairOfZerosIsMissed() {
        double level = Math.cos(0.005);
        assertThat(FirstCrossing.after(swinging(), form(0, 1, -level), 0, 1))
                .isCloseTo((Math.PI / 2 - 0.005) / OMEGA, within(1e-14));
    }

    /** A crest that just reaches a level is found on its rising side, one that just does not is none. */
    @Test
    void aCrestThatJustReachesIsFoundAndOneThatJustDoesNotIsNone() {
        int crests = 0;
        for (long seed = 0; seed < 200; seed++) {
            Begun b = seed % 2 == 0 ? DrawnPieces.direct(seed) : DrawnPieces.throughTransformer(seed);
            Affine form = mixed(b);
            double crest = crestSeconds(b, form);
            if (Double.isNaN(crest)) {
                continue;
            }
            crests++;
            b.piece().look(crest);
            double height = b.piece().value(form);
            double size = b.piece().magnitude(form);
            form.constant -= height - 1e-6 * size;
            double found = FirstCrossing.after(b.piece(), form, b.fromSeconds(), b.wave().seconds);
            assertThat(found).as(b.toString()).isLessThan(crest);
            b.piece().look(found);
            assertThat(b.piece().value(form)).as(b.toString()).isCloseTo(0, within(1e-10 * size));
            form.constant -= 2e-6 * size;
            assertThat(FirstCrossing.after(b.piece(), form, b.fromSeconds(), b.wave().seconds))
                    .as(b.toString())
                    .isEqualTo(NEVER);
        }
        assertThat(crests).isGreaterThan(60);
    }

    /** Ramp, core and source in drawn shares, the ramp's and the core's of either sign. */
    private static Affine mixed(Begun b) {
        SplittableRandom random = new SplittableRandom(b.seed());
        Affine form = new Affine();
        form.set(b.piece().mode == Mode.STALLED ? 0 : 4 * random.nextDouble() - 2, 0.1 * random.nextDouble(), 0);
        form.flux = b.n().transformerCoupled ? 200 * random.nextDouble() - 100 : 0;
        return form;
    }

    /** Where the form is highest over the whole piece, if that is between its ends; else NaN. */
    private static double crestSeconds(Begun b, Affine form) {
        double span = b.wave().seconds - b.fromSeconds();
        double best = Double.NEGATIVE_INFINITY;
        int at = 0;
        for (int i = 0; i <= 2000; i++) {
            b.piece().look(b.fromSeconds() + span * i / 2000);
            if (b.piece().value(form) > best) {
                best = b.piece().value(form);
                at = i;
            }
        }
        if (at == 0 || at == 2000) {
            return Double.NaN;
        }
        double low = b.fromSeconds() + span * (at - 1) / 2000;
        double high = b.fromSeconds() + span * (at + 1) / 2000;
        for (int i = 0; i < 50; i++) {
            double middle = (low + high) / 2;
            b.piece().look(middle);
            if (b.piece().slope(form) > 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    @Test
    void nothingSampledCrossesBeforeWhatIsFound() {
        int crossings = 0;
        for (long seed = 0; seed < 60; seed++) {
            for (Begun b : List.of(DrawnPieces.direct(seed), DrawnPieces.throughTransformer(seed))) {
                crossings += compare(b);
            }
        }
        assertThat(crossings).as("crossings seen").isGreaterThan(60);
    }

    private static int compare(Begun b) {
        SplittableRandom random = new SplittableRandom(b.seed());
        int crossings = 0;
        for (Affine of : List.of(b.piece().supply, b.piece().gate, b.piece().emitter, b.piece().peak)) {
            // A level between what is seen on the way.
            b.piece().look(b.fromSeconds() + 0.5 * random.nextDouble() * (b.toSeconds() - b.fromSeconds()));
            double level = b.piece().value(of);
            Affine form = new Affine();
            form.copy(of);
            form.constant -= level;
            if (random.nextBoolean()) {
                form.negate();
            }
            double found = FirstCrossing.after(b.piece(), form, b.fromSeconds(), b.toSeconds());
            if (found < NEVER) {
                crossings++;
                b.piece().look(found);
                assertThat(b.piece().value(form))
                        .as(b.toString())
                        .isGreaterThanOrEqualTo(-1e-9 * b.piece().magnitude(form));
            }
            if (found > b.fromSeconds()) {
                assertNoneBefore(b, form, Math.min(found, b.toSeconds()));
            }
        }
        return crossings;
    }

    private static void assertNoneBefore(Begun b, Affine form, double end) {
        for (int i = 1; i < 120; i++) {
            double t = b.fromSeconds() + (end - b.fromSeconds()) * i / 120;
            b.piece().look(t);
            assertThat(b.piece().value(form))
                    .as(b + " at " + t)
                    .isLessThanOrEqualTo(1e-9 * b.piece().magnitude(form) + 1e-15);
        }
    }
}
