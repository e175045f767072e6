package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.engine.DrawnPieces.Begun;
import java.util.function.LongFunction;
import java.util.stream.IntStream;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;

/**
 * A piece's closed form against Commons Math's adaptive Dormand-Prince integrator on the capacitor's and the inductance's
 * own laws, C dV/dt = i and L di/dt = v.
 */
class PieceTest {
    private static final int PIECES = 36;

    private static void each(LongFunction<Begun> draw, java.util.function.Consumer<Begun> judge) {
        for (long seed = 0; seed < PIECES; seed++) {
            judge.accept(draw.apply(seed));
        }
    }

    private static void each(java.util.function.Consumer<Begun> judge) {
        each(DrawnPieces::direct, judge);
        each(DrawnPieces::throughTransformer, judge);
    }

    /** e(t) as the line's law writes it. */
    private static double source(SourceWave wave, double t) {
        return IntStream.range(0, wave.count)
                        .mapToDouble(i -> wave.amplitudes[i] * Math.sin(wave.rates[i] * t + wave.phases[i]))
                        .sum()
                - wave.dropVolts;
    }

    private static double sourceSlope(SourceWave wave, double t) {
        return IntStream.range(0, wave.count)
                .mapToDouble(i -> wave.amplitudes[i] * wave.rates[i] * Math.cos(wave.rates[i] * t + wave.phases[i]))
                .sum();
    }

    private static double[] integrated(Begun b, double from, double to, double[] state) {
        FirstOrderDifferentialEquations laws = new FirstOrderDifferentialEquations() {
            @Override
            public int getDimension() {
                return 2;
            }

            @Override
            public void computeDerivatives(double t, double[] y, double[] rate) {
                Kirchhoff nodes = Kirchhoff.at(b.n(), b.piece(), y[0], y[1], source(b.wave(), t));
                rate[0] = (nodes.rampResistorAmps() - nodes.emitterAmps) / b.n().capacitorFarads;
                rate[1] = b.n().transformerCoupled ? nodes.primaryVolts / b.n().magnetisingHenries : 0;
                if (b.piece().mode == Mode.STALLED) {
                    rate[0] = 0;
                }
            }
        };
        double[] out = state.clone();
        new DormandPrince853Integrator(1e-15, 1e-3, 1e-13, 1e-12).integrate(laws, from, out, to, out);
        return out;
    }

    @Test
    void rampAndMagnetisingCurrentFollowTheirOwnLaws() {
        each(b -> {
            double[] truth = integrated(b, b.fromSeconds(), b.toSeconds(), new double[] {b.ramp(), b.flux()});
            b.piece().look(b.toSeconds());
            if (b.piece().mode != Mode.STALLED) {
                assertThat(b.piece().rampVolts()).as(b.toString()).isCloseTo(truth[0], within(1e-8));
            }
            assertThat(b.piece().fluxAmps()).as(b.toString()).isCloseTo(truth[1], within(1e-9));
        });
    }

    @Test
    void beginsWhereItIsPut() {
        each(b -> {
            b.piece().look(b.fromSeconds());
            if (b.piece().mode != Mode.STALLED) {
                assertThat(b.piece().rampVolts()).as(b.toString()).isCloseTo(b.ramp(), within(1e-10));
            }
            assertThat(b.piece().fluxAmps()).as(b.toString()).isCloseTo(b.flux(), within(1e-12));
            assertThat(b.piece().startSeconds()).isEqualTo(b.fromSeconds());
        });
    }

    @Test
    void aHeldRampIsThePeakPoint() {
        each(b -> {
            if (b.piece().mode == Mode.STALLED) {
                b.piece().look((b.fromSeconds() + b.toSeconds()) / 2);
                assertThat(b.piece().rampVolts())
                        .as(b.toString())
                        .isCloseTo(b.piece().peakPointVolts(), within(1e-10));
            }
        });
    }

    @Test
    void theSourceIsTheLinesOwn() {
        each(b -> {
            double t = (b.fromSeconds() + b.toSeconds()) / 2;
            b.piece().look(t);
            assertThat(b.piece().sourceVolts()).isCloseTo(source(b.wave(), t), within(1e-10));
            assertThat(b.wave().at(t)).isCloseTo(source(b.wave(), t), within(1e-10));
            assertThat(b.wave().slopeAt(t)).isCloseTo(sourceSlope(b.wave(), t), within(1e-7));
        });
    }

    /** A central difference over h is off by h² times the third derivative. */
    @Test
    void slopesAreTheSlopesOfWhatIsShown() {
        each(b -> {
            double t = (b.fromSeconds() + b.toSeconds()) / 2;
            double h = 1e-3 / Math.max(b.piece().ratePerSecond(), b.piece().fastestRate());
            for (Affine form : forms(b)) {
                b.piece().look(t - h);
                double before = b.piece().value(form);
                b.piece().look(t + h);
                double after = b.piece().value(form);
                b.piece().look(t);
                assertThat(b.piece().slope(form) * h)
                        .as(b.toString())
                        .isCloseTo(
                                (after - before) / 2,
                                within(1e-6 * Math.abs(after - before)
                                        + 1e-11 * b.piece().magnitude(form)
                                        + 1e-18));
            }
        });
    }

    private static Affine[] forms(Begun b) {
        Piece piece = b.piece();
        Affine rampItself = new Affine();
        rampItself.set(1, 0, 0);
        return new Affine[] {piece.supply, piece.baseOne, piece.emitter, piece.gate, piece.peak, rampItself};
    }

    /** Beginning anew half way from what is reached there changes nothing. */
    @Test
    void splittingAPieceChangesNothing() {
        each(b -> {
            double middle = (b.fromSeconds() + b.toSeconds()) / 2;
            b.piece().look(middle);
            double ramp = b.piece().rampVolts();
            double flux = b.piece().fluxAmps();
            b.piece().look(b.toSeconds());
            double rampWhole = b.piece().rampVolts();
            double fluxWhole = b.piece().fluxAmps();
            b.piece().begin(b.n(), b.wave(), middle, ramp, flux);
            b.piece().look(b.toSeconds());
            assertThat(b.piece().rampVolts()).as(b.toString()).isCloseTo(rampWhole, within(1e-9));
            assertThat(b.piece().fluxAmps()).as(b.toString()).isCloseTo(fluxWhole, within(1e-11));
        });
    }

    @Test
    void aLookBackAtTheStartIsALookAtTheStart() {
        each(b -> {
            Piece piece = b.piece();
            piece.look(b.toSeconds());
            piece.lookAtStart();
            double[] back = looked(b);
            piece.look(b.fromSeconds());
            assertThat(back).as(b.toString()).containsExactly(looked(b), within(1e-9));
        });
    }

    private static double[] looked(Begun b) {
        Piece piece = b.piece();
        return new double[] {
            piece.rampVolts,
            piece.rampSlope * 1e-3,
            piece.fluxAmps,
            piece.sourceVolts,
            piece.sourceSlope * 1e-3,
            piece.sourceBend * 1e-6,
            piece.supplyVolts(),
            piece.baseOneVolts(),
            piece.gateVolts(),
            piece.emitterAmps(),
            piece.peakPointVolts(),
            piece.value(piece.primary),
            piece.value(piece.clamp)
        };
    }

    @Test
    void aCopyStaysAsItWasWhenThePieceGoesOn() {
        each(b -> {
            Piece copy = b.piece().copy();
            Begun kept = new Begun(b.seed(), b.n(), copy, b.wave(), b.fromSeconds(), b.ramp(), b.flux());
            b.piece().look(b.toSeconds());
            double[] expected = looked(b);
            double rate = b.piece().ratePerSecond();
            NodeLaws.settle(b.n(), b.piece(), 0, 0, 0);
            b.piece().begin(b.n(), b.wave(), 0, 0, 0);
            copy.look(b.toSeconds());
            assertThat(looked(kept)).as(b.toString()).containsExactly(expected, within(1e-12));
            assertThat(copy.startSeconds()).isEqualTo(b.fromSeconds());
            assertThat(copy.ratePerSecond()).isEqualTo(rate);
        });
    }

    @Test
    void aCopyKeepsModeAndSwitches() {
        for (int switches = 0; switches < 16; switches++) {
            Piece piece = new Piece();
            piece.mode = Mode.STALLED;
            piece.rectifies = (switches & 1) != 0;
            piece.clips = (switches & 2) != 0;
            piece.gateConducts = (switches & 4) != 0;
            piece.clamps = (switches & 8) != 0;
            Piece copy = piece.copy();
            assertThat(copy.mode()).isEqualTo(Mode.STALLED);
            assertThat(copy.isRectifying()).isEqualTo(piece.rectifies);
            assertThat(copy.isClipping()).isEqualTo(piece.clips);
            assertThat(copy.gateConducts).isEqualTo(piece.gateConducts);
            assertThat(copy.clamps).isEqualTo(piece.clamps);
        }
    }

    /** Long after its start only the source's sinusoids move a form, each by as much as it is said to give. */
    @Test
    void whenTheExponentialsAreGoneTheSinusoidsAreLeft() {
        each(b -> {
            Piece piece = b.piece();
            if (piece.mode == Mode.STALLED) {
                return;
            }
            double slowest = b.n().transformerCoupled ? piece.slowRate() : piece.quickRate();
            double late = b.fromSeconds() + 60 / slowest;
            for (Affine form : new Affine[] {piece.supply, piece.baseOne, mixed(b)}) {
                double apart = swung(b, form, late + 2e-3) - swung(b, form, late);
                piece.look(late + 2e-3);
                double moved = piece.value(form);
                piece.look(late);
                moved -= piece.value(form);
                assertThat(moved).as(b.toString()).isCloseTo(apart, within(1e-9));
            }
        });
    }

    private static Affine mixed(Begun b) {
        Affine form = new Affine();
        form.set(1, 0, 0);
        form.flux = b.n().transformerCoupled ? 300 : 0;
        return form;
    }

    private static double swung(Begun b, Affine form, double seconds) {
        Piece piece = b.piece();
        double sum = 0;
        for (int i = 0; i < piece.sinusoids(); i++) {
            double angle = piece.sinusoidRate(i) * seconds + b.wave().phases[i];
            sum += piece.sineOf(form, i) * Math.sin(angle) + piece.cosineOf(form, i) * Math.cos(angle);
        }
        return sum;
    }

    /** 1 V behind 1 kilohm onto 1 uF: a millisecond's time constant, and 1 - 1/e of a volt after it. */
    @Test
    void aResistorChargesACapacitorExponentially() {
        Piece piece = Lag.charging(2e-3, 0);
        piece.look(3e-3);
        assertThat(piece.rampVolts()).isCloseTo(1 - Math.exp(-1), within(1e-15));
        assertThat(piece.ratePerSecond()).isCloseTo(1e3, within(1e-9));
        assertThat(piece.fastestRate()).isZero();
    }

    /** sin wt behind R onto C, long after its start: |V_C| = 1/sqrt(1 + (w R C)²), an angle atan(w R C) behind. */
    @Test
    void aResistorAndACapacitorLag() {
        SourceWave sine = new SourceWave();
        sine.setSine(2000, 1, 0, 1);
        Piece piece = Lag.behind(sine, 0, 0);
        piece.look(0.5);
        assertThat(piece.rampVolts()).isCloseTo(Math.sin(1000 - Math.atan(2)) / Math.sqrt(5), within(1e-12));
        assertThat(piece.fastestRate()).isEqualTo(2000);
    }
}
