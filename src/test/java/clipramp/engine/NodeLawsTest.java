package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/**
 * The node equations of every mode and switch, direct and through a transformer, against Kirchhoff's laws branch by branch.
 */
class NodeLawsTest {
    private static final int NETWORKS = 60;
    private static final int SWITCHES = 16;
    private static final double AMPS = 1e-12;
    private static final double VOLTS = 1e-10;

    /** A state that the node equations are asked at; any will do, they hold for all. */
    private record State(double ramp, double flux, double source) {
        static State draw(long seed) {
            SplittableRandom random = new SplittableRandom(seed);
            return new State(
                    20 * random.nextDouble(), 0.05 * (random.nextDouble() - 0.3), 60 * random.nextDouble() - 2);
        }
    }

    private interface Judge {
        void judge(Network n, Piece piece, State state, String which);
    }

    private static void overEverything(Judge judge) {
        for (long seed = 0; seed < NETWORKS; seed++) {
            for (int switches = 0; switches < SWITCHES; switches++) {
                for (Mode mode : Mode.values()) {
                    Network n = seed % 2 == 0 ? DrawnNetworks.direct(seed) : DrawnNetworks.throughTransformer(seed);
                    if ((switches & 8) != 0 && !(n.clampVolts < 100)) {
                        continue;
                    }
                    Piece piece = new Piece();
                    piece.mode = mode;
                    piece.rectifies = (switches & 1) != 0;
                    piece.clips = (switches & 2) != 0;
                    piece.gateConducts = (switches & 4) != 0;
                    piece.clamps = (switches & 8) != 0;
                    NodeLaws.shape(n, piece);
                    judge.judge(n, piece, State.draw(seed), "seed " + seed + " " + mode + " switches " + switches);
                }
            }
        }
    }

    private static Kirchhoff at(Network n, Piece piece, State s) {
        return Kirchhoff.at(n, piece, s.ramp, n.transformerCoupled ? s.flux : 0, s.source);
    }

    @Test
    void whatEntersTheSupplyLeavesIt() {
        overEverything((n, piece, state, which) ->
                assertThat(at(n, piece, state).supplyImbalance()).as(which).isCloseTo(0, within(AMPS)));
    }

    @Test
    void whatEntersBaseOneLeavesIt() {
        overEverything((n, piece, state, which) ->
                assertThat(at(n, piece, state).baseOneImbalance()).as(which).isCloseTo(0, within(AMPS)));
    }

    @Test
    void theGatesAndThePrimarysLoopsClose() {
        overEverything((n, piece, state, which) -> {
            Kirchhoff nodes = at(n, piece, state);
            assertThat(nodes.gateLoopVolts()).as(which).isCloseTo(0, within(VOLTS));
            assertThat(nodes.primaryLoopVolts()).as(which).isCloseTo(0, within(VOLTS));
        });
    }

    @Test
    void theJunctionConductsOnlyWithTheDeviceOn() {
        overEverything((n, piece, state, which) -> {
            if (piece.mode != Mode.ON) {
                assertThat(piece.gateConducts).as(which).isFalse();
            }
        });
    }

    @Test
    void aClampedBaseOneStandsADiodeDropUnderTheCommon() {
        overEverything((n, piece, state, which) -> {
            if (piece.clamps) {
                assertThat(at(n, piece, state).baseOneVolts).as(which).isCloseTo(-n.clampVolts, within(VOLTS));
            }
        });
    }

    @Test
    void theSaturatedEmitterKeepsToItsLine() {
        overEverything((n, piece, state, which) -> {
            Kirchhoff nodes = at(n, piece, state);
            if (piece.mode == Mode.ON) {
                assertThat(nodes.emitterLineVolts()).as(which).isCloseTo(0, within(VOLTS));
            } else if (piece.mode == Mode.OFF) {
                assertThat(nodes.emitterAmps).as(which).isZero();
            }
        });
    }

    @Test
    void thePeakPointIsTheTapsVoltageAndTheJunctionsDrop() {
        overEverything((n, piece, state, which) -> {
            if (piece.mode != Mode.ON) {
                Kirchhoff nodes = at(n, piece, state);
                assertThat(nodes.peakVolts).as(which).isCloseTo(nodes.tapVolts(), within(VOLTS));
            }
        });
    }

    /** In a stall the emitter gets what the resistor brings and the capacitor, held at V_P, does not take. */
    @Test
    void aHeldCapacitorLeavesTheRestToTheEmitter() {
        overEverything((n, piece, state, which) -> {
            if (piece.mode != Mode.STALLED) {
                return;
            }
            Kirchhoff nodes = at(n, piece, state);
            double sourceSlope = 7000;
            double fluxSlope = n.transformerCoupled ? nodes.primaryVolts / n.magnetisingHenries : 0;
            // Linear, so that a whole second's change is the slope.
            double peakSlope = Kirchhoff.at(
                                    n,
                                    piece,
                                    state.ramp,
                                    (n.transformerCoupled ? state.flux : 0) + fluxSlope,
                                    state.source + sourceSlope)
                            .peakVolts
                    - nodes.peakVolts;
            double emitter = nodes.emitterAmps + piece.emitter.sourceSlope * sourceSlope;
            assertThat(emitter)
                    .as(which)
                    .isCloseTo(nodes.rampResistorAmps() - n.capacitorFarads * peakSlope, within(1e-9));
        });
    }

    @Test
    void settledSwitchesAgreeWithTheirOwnLaws() {
        for (long seed = 0; seed < 20 * NETWORKS; seed++) {
            Network n = seed % 2 == 0 ? DrawnNetworks.direct(seed) : DrawnNetworks.throughTransformer(seed);
            State state = State.draw(~seed);
            for (Mode mode : Mode.values()) {
                Piece piece = new Piece();
                piece.mode = mode;
                double flux = n.transformerCoupled ? state.flux : 0;
                NodeLaws.settle(n, piece, state.ramp, flux, state.source);
                Kirchhoff nodes = Kirchhoff.at(n, piece, state.ramp, flux, state.source);
                String which = "seed " + seed + " " + mode;
                assertThat(piece.rectifies).as(which).isEqualTo(state.source > nodes.supplyVolts);
                assertThat(piece.clips).as(which).isEqualTo(nodes.supplyVolts > n.zenerKneeVolts);
                assertThat(piece.gateConducts)
                        .as(which)
                        .isEqualTo(mode == Mode.ON && nodes.gateVolts > n.gateKneeVolts);
                assertThat(piece.clamps)
                        .as(which)
                        .isEqualTo(piece.clamps ? nodes.clampAmps > 0 : nodes.baseOneVolts < -n.clampVolts);
                assertThat(nodes.supplyImbalance()).as(which).isCloseTo(0, within(AMPS));
                assertThat(nodes.baseOneImbalance()).as(which).isCloseTo(0, within(AMPS));
            }
        }
    }

    /** Nothing stored, no line: every switch stands exactly on its edge and opens. */
    @Test
    void aDeadCircuitSwitchesEverythingOff() {
        Network n = DrawnNetworks.throughTransformer(1);
        n.zenerKneeVolts = 0;
        n.clampVolts = 0;
        Piece piece = new Piece();
        piece.rectifies = true;
        piece.clips = true;
        piece.clamps = true;
        NodeLaws.settle(n, piece, 0, 0, 0);
        assertThat(piece.rectifies).isFalse();
        assertThat(piece.clips).isFalse();
        assertThat(piece.clamps).isFalse();
        assertThat(piece.gateConducts).isFalse();
    }
}
