package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.engine.DrawnPieces.Begun;
import java.util.function.Consumer;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.api.Test;

/** What can be read from a piece: crests, currents, when the gate current passes a level; against Kirchhoff and sampling. */
class PieceReadingsTest {
    private static final int SAMPLES = 400;

    private static void each(Consumer<Begun> judge) {
        for (long seed = 0; seed < 90; seed++) {
            judge.accept(DrawnPieces.direct(seed));
            judge.accept(DrawnPieces.throughTransformer(seed));
        }
    }

    private static double[] sampled(Begun b, double from, double to, DoubleUnaryOperator reading) {
        double[] values = new double[SAMPLES + 1];
        for (int i = 0; i <= SAMPLES; i++) {
            b.piece().look(from + (to - from) * i / SAMPLES);
            values[i] = reading.applyAsDouble(0);
        }
        return values;
    }

    private static double greatest(double[] values) {
        double most = Double.NEGATIVE_INFINITY;
        for (double value : values) {
            most = Math.max(most, value);
        }
        return most;
    }

    /** The supply's while the emitter blocks, the gate's in a pulse: what they are asked for. */
    @Test
    void theCrestIsAsHighAsAnythingSampled() {
        int[] inside = new int[1];
        each(b -> {
            double from = b.fromSeconds();
            double to = b.wave().seconds;
            boolean pulse = b.piece().mode == Mode.ON;
            DoubleUnaryOperator reading =
                    t -> pulse ? b.piece().gateVolts() : b.piece().supplyVolts();
            double at = pulse ? b.piece().gateCrestSeconds(from, to) : b.piece().supplyCrestSeconds(from, to);
            inside[0] += at > from && at < to ? 1 : 0;
            b.piece().look(at);
            double crest = reading.applyAsDouble(at);
            double most = greatest(sampled(b, from, to, reading));
            assertThat(crest).as(b.toString()).isGreaterThanOrEqualTo(most - 1e-9);
        });
        assertThat(inside[0]).as("crests between the ends").isGreaterThan(20);
    }

    /** sin wt alone: its crest is a quarter of a turn from its zero. */
    @Test
    void theCrestOfASineIsAtItsQuarter() {
        SourceWave sine = new SourceWave();
        sine.setSine(100 * Math.PI, 325, 0, 0.01);
        Piece piece = Lag.behind(sine, 0, 0);
        assertThat(piece.supplyCrestSeconds(0, 0.01)).isCloseTo(0.005, within(1e-12));
        assertThat(piece.supplyCrestSeconds(0, 0.004)).isEqualTo(0.004);
        assertThat(piece.supplyCrestSeconds(0.006, 0.01)).isEqualTo(0.006);
        assertThat(piece.supplyCrestSeconds(0.012, 0.018))
                .as("a trough between")
                .isEqualTo(0.012);
        assertThat(piece.supplyCrestSeconds(0.012, 0.0185))
                .as("and its higher end")
                .isEqualTo(0.0185);
    }

    @Test
    void baseTwoStandsBelowTheSupplyByWhatItsResistorDrops() {
        each(b -> {
            b.piece().look((b.fromSeconds() + b.toSeconds()) / 2);
            Kirchhoff nodes = Kirchhoff.where(b.n(), b.piece());
            assertThat(b.piece().baseTwoAmps(b.n())).as(b.toString()).isCloseTo(nodes.baseTwoAmps(), within(1e-12));
            double drop = (b.n().programmable ? b.n().upperOhms : b.n().baseTwoOhms) * nodes.baseTwoAmps();
            assertThat(b.piece().baseTwoVolts(b.n()))
                    .as(b.toString())
                    .isCloseTo(nodes.supplyVolts - drop, within(1e-9));
        });
    }

    @Test
    void theReadingsAreTheNodes() {
        each(b -> {
            b.piece().look(b.toSeconds());
            Kirchhoff nodes = Kirchhoff.where(b.n(), b.piece());
            assertThat(b.piece().supplyVolts()).isEqualTo(nodes.supplyVolts);
            assertThat(b.piece().baseOneVolts()).isEqualTo(nodes.baseOneVolts);
            assertThat(b.piece().gateVolts()).isEqualTo(nodes.gateVolts);
            assertThat(b.piece().emitterAmps()).isEqualTo(nodes.emitterAmps);
            assertThat(b.piece().peakPointVolts()).isEqualTo(nodes.peakVolts);
            assertThat(b.piece().gateAmps(b.n())).as(b.toString()).isCloseTo(nodes.junctionAmps(), within(1e-12));
            assertThat(b.piece().dropperAmps(b.n())).as(b.toString()).isCloseTo(nodes.dropperAmps(), within(1e-12));
            assertThat(b.piece().zenerAmps(b.n())).as(b.toString()).isCloseTo(nodes.zenerAmps(), within(1e-12));
            if (b.n().transformerCoupled) {
                assertThat(b.piece().primaryVolts()).isEqualTo(nodes.primaryVolts);
            }
            assertThat(nodes.supplyVolts).isNotZero();
            assertThat(nodes.peakVolts).isNotZero();
            assertThat(b.piece().mode()).isEqualTo(b.piece().mode);
            assertThat(b.piece().isRectifying()).isEqualTo(b.piece().rectifies);
            assertThat(b.piece().isClipping()).isEqualTo(b.piece().clips);
        });
    }

    @Test
    void theGateCurrentPassesALevelWhereSamplingSeesIt() {
        int[] passed = new int[1];
        each(b -> {
            if (!b.piece().gateConducts) {
                assertThat(b.piece().gateReaches(b.n(), 1e-3, false, b.fromSeconds(), b.toSeconds()))
                        .as(b.toString())
                        .isEqualTo(Double.POSITIVE_INFINITY);
                return;
            }
            double[] amps =
                    sampled(b, b.fromSeconds(), b.toSeconds(), t -> b.piece().gateAmps(b.n()));
            double level = 0.5 * (amps[0] + amps[SAMPLES]);
            if (amps[0] > amps[SAMPLES] + 1e-7 && level > 0) {
                passed[0]++;
                assertThat(b.piece().gateReaches(b.n(), level, false, b.fromSeconds(), b.toSeconds()))
                        .as(b.toString())
                        .isCloseTo(fallsAt(b, amps, level), within(1e-12));
            }
        });
        assertThat(passed[0]).as("fell past the level").isGreaterThan(20);
    }

    /** 1 V behind 1 kilohm onto 1 uF at the gate: 20 mA through 10 ohm over a knee of 0.2 V flow at 0.4 V. */
    @Test
    void aRisingGateCurrentPassesALevelOnItsWayUp() {
        Network n = Lag.network();
        n.gateKneeVolts = 0.2;
        n.gateSlopeOhms = 10;
        Piece piece = Lag.charging(0, 0);
        piece.gate.set(1, 0, 0);
        piece.gateConducts = true;
        assertThat(piece.gateReaches(n, 20e-3, true, 0, 1)).isCloseTo(-1e-3 * Math.log(0.6), within(1e-15));
        assertThat(piece.gateReaches(n, 20e-3, false, 2e-3, 1)).isEqualTo(Double.POSITIVE_INFINITY);
        piece.gateConducts = false;
        assertThat(piece.gateReaches(n, 20e-3, true, 0, 1)).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(piece.gateAmps(n)).isZero();
    }

    private static double fallsAt(Begun b, double[] amps, double level) {
        int i = 1;
        while (amps[i] > level) {
            i++;
        }
        double step = (b.toSeconds() - b.fromSeconds()) / SAMPLES;
        DoubleUnaryOperator over = t -> {
            b.piece().look(t);
            return b.piece().gateAmps(b.n()) - level;
        };
        return new BrentSolver(1e-16, 1e-16)
                .solve(200, over::applyAsDouble, b.fromSeconds() + (i - 1) * step, b.fromSeconds() + i * step);
    }

    /** A sum rounds by the size of what it is summed from, and by nothing much larger. */
    @Test
    void theMagnitudeOfAFormIsThatOfItsTerms() {
        each(b -> {
            Piece piece = b.piece();
            piece.look((b.fromSeconds() + b.toSeconds()) / 2);
            Affine mixed = new Affine();
            mixed.set(0.5, -0.25, 3);
            mixed.flux = b.n().transformerCoupled ? 40 : 0;
            mixed.sourceSlope = 1e-4;
            mixed.below(7);
            double terms = 0.5 * Math.abs(piece.rampVolts())
                    + Math.abs(mixed.flux * piece.fluxAmps())
                    + 0.25 * Math.abs(piece.sourceVolts())
                    + 1e-4 * Math.abs(piece.sourceSlope)
                    + 4
                    + 7;
            assertThat(piece.magnitude(mixed)).as(b.toString()).isBetween(terms, 4 * terms + 60);
            Affine source = new Affine();
            source.set(0, 1, 0);
            // e = A sin wt - drop: near its zero both are of the drop's size.
            assertThat(piece.magnitude(source))
                    .as(b.toString())
                    .isGreaterThanOrEqualTo(
                            Math.abs(piece.sourceVolts() + b.wave().dropVolts) + b.wave().dropVolts - 1e-9);
        });
    }

    /** 1 V behind 1 kilohm onto 1 uF from -9 V: near V_C = 0 a volt and a volt cancel. */
    @Test
    void theMagnitudeOfARampNearZeroIsThatOfWhatCancels() {
        Piece piece = Lag.charging(0, -9);
        piece.look(1e-3 * Math.log(10));
        Affine ramp = new Affine();
        ramp.set(-1, 0, 0);
        assertThat(piece.rampVolts()).isCloseTo(0, within(1e-14));
        assertThat(piece.magnitude(ramp)).isCloseTo(2, within(1e-12));
    }
}
