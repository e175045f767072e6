package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Test;

/** Integrals over a piece against their antiderivatives. */
class PieceQuadratureTest {
    private int nodes;

    private double integral(Piece piece, double from, double to, ToDoubleFunction<Piece> of) {
        double[] sum = new double[1];
        nodes = 0;
        PieceQuadrature.visit(piece, from, to, (at, weight) -> {
            nodes++;
            sum[0] += weight * of.applyAsDouble(at);
        });
        return sum[0];
    }

    private static Piece lag(SourceWave wave, double startSeconds, double startVolts, double rate) {
        Network n = new Network();
        n.rampOhms = 1 / rate;
        n.capacitorFarads = 1;
        return Lag.begin(n, wave, startSeconds, startVolts);
    }

    private static double square(double x) {
        return x * x;
    }

    /** V = exp(-a t): its square's integral is (1 - exp(-2 a T))/(2 a), short and long against the time constant. */
    @Test
    void anExponentialAndItsSquare() {
        SourceWave nothing = new SourceWave();
        nothing.setConstant(0, 1);
        for (double rate : new double[] {10, 1e3, 1e5, 1e7}) {
            Piece piece = lag(nothing, 2e-3, 1, rate);
            double exact = -Math.expm1(-2 * rate * 0.01) / (2 * rate);
            double found = integral(piece, 2e-3, 12e-3, p -> square(p.rampVolts()));
            assertThat(found / exact).as("rate " + rate).isCloseTo(1, within(1e-10));
            assertThat(nodes)
                    .as("no more than a rule of ten between each two edges")
                    .isLessThanOrEqualTo(90);
        }
    }

    @Test
    void aPartOfAPieceThatBeganBefore() {
        SourceWave nothing = new SourceWave();
        nothing.setConstant(0, 1);
        Piece piece = lag(nothing, 1e-3, 1, 2e3);
        double exact = (Math.exp(-2 * 2e3 * 0.5e-3) - Math.exp(-2 * 2e3 * 4e-3)) / (2 * 2e3);
        assertThat(integral(piece, 1.5e-3, 5e-3, p -> square(p.rampVolts())) / exact)
                .isCloseTo(1, within(1e-10));
        assertThat(integral(piece, 1.5e-3, 5e-3, p -> 1)).isCloseTo(3.5e-3, within(1e-17));
    }

    /** sin² over a half cycle: a quarter of the period. A panel turns by no more than a quarter radian. */
    @Test
    void aSinusoidAndItsSquare() {
        SourceWave sine = new SourceWave();
        sine.setSine(100 * Math.PI, 1, 0, 0.01);
        Piece piece = lag(sine, 0, 0, 1);
        assertThat(integral(piece, 0, 0.01, p -> square(p.sourceVolts()))).isCloseTo(0.005, within(1e-15));
        assertThat(integral(piece, 0, 0.01, p -> Math.pow(p.sourceVolts(), 16)))
                .as("mean of sin^16: 12870/65536")
                .isCloseTo(0.01 * 12870 / 65536, within(1e-15));
        assertThat(nodes).isBetween(130, 150);
    }

    @Test
    void anEmptySpanIsNotLookedAt() {
        SourceWave sine = new SourceWave();
        sine.setSine(100 * Math.PI, 1, 0, 0.01);
        Piece piece = lag(sine, 0, 0, 1);
        assertThat(integral(piece, 2e-3, 2e-3, p -> 1)).isZero();
        assertThat(nodes).isZero();
    }

    /** A held ramp has no exponential: the source's sinusoids alone decide on the panels. */
    @Test
    void aStallIsIntegratedLikeItsSource() {
        Network n = DrawnNetworks.direct(1);
        SourceWave sine = DrawnNetworks.sine(1);
        Piece piece = new Piece();
        piece.mode = Mode.STALLED;
        piece.rectifies = true;
        NodeLaws.shape(n, piece);
        piece.begin(n, sine, 0, 0, 0);
        assertThat(piece.ratePerSecond()).isZero();
        assertThat(integral(piece, 0, sine.seconds(), p -> 1)).isCloseTo(sine.seconds(), within(1e-16));
    }
}
