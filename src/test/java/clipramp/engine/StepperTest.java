package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.EnumMap;
import java.util.Map;
import org.junit.jupiter.api.Test;

/**
 * Half cycles of drawn circuits: at every event and all along every piece each switch obeys its own law, and the energy
 * that the line gives is what the parts dissipate and the ramp and the core store.
 */
class StepperTest {
    private static final int CIRCUITS = 60;
    private static final int HALF_CYCLES = 3;
    /** None of these circuits passes more events in a half cycle: one that does has lost its way. */
    private static final int MOST_EVENTS = 1500;

    private static final double VOLTS = 1e-8;
    private static final double AMPS = 1e-10;

    /** What is told of each piece that the circuit went through. */
    private interface Witness {
        void passed(Network n, Stepper stepper, double from, Event event, String which);
    }

    private static void run(Network n, SourceWave wave, Witness witness, String which) {
        Stepper stepper = new Stepper(n);
        Mode mode = Mode.OFF;
        double ramp = 0;
        double flux = 0;
        for (int half = 0; half < HALF_CYCLES; half++) {
            stepper.start(wave, mode, ramp, flux);
            int events = 0;
            while (stepper.seconds() < wave.seconds()) {
                assertThat(++events).as(which).isLessThan(MOST_EVENTS);
                double from = stepper.seconds();
                Event event = stepper.advance(wave.seconds());
                witness.passed(n, stepper, from, event, which + " half cycle " + half + " to " + stepper.seconds());
            }
            mode = stepper.mode();
            ramp = stepper.rampVolts();
            flux = stepper.fluxAmps();
        }
    }

    private static void everyCircuit(Witness witness) {
        for (long seed = 0; seed < CIRCUITS; seed++) {
            Network n = seed % 2 == 0 ? DrawnNetworks.direct(seed) : DrawnNetworks.throughTransformer(seed);
            run(n, DrawnNetworks.sine(seed), witness, "seed " + seed);
            if (seed % 3 == 0) {
                run(DrawnNetworks.starved(seed), DrawnNetworks.sine(seed), witness, "starved " + seed);
            }
        }
    }

    @Test
    void everyEventComesWhereItsLawSays() {
        Map<Event, Integer> seen = new EnumMap<>(Event.class);
        everyCircuit((n, stepper, from, event, which) -> {
            seen.merge(event, 1, Integer::sum);
            Kirchhoff nodes = Kirchhoff.where(n, stepper.piece());
            switch (event) {
                case RECTIFIER -> close(nodes.sourceVolts, nodes.supplyVolts, VOLTS, which);
                case ZENER -> close(nodes.supplyVolts, n.zenerKneeVolts, VOLTS, which);
                case GATE -> close(nodes.gateVolts, n.gateKneeVolts, VOLTS, which);
                case VALLEY -> close(nodes.emitterAmps, n.valleySiemens * nodes.supplyVolts, AMPS, which);
                case UNSTALLS -> leaves(stepper.piece(), stepper.seconds() > from, which);
                case CLAMP -> clampTurns(stepper.piece(), n, nodes, which);
                case FIRES, STALLS ->
                    assertThat(nodes.rampVolts).as(which).isGreaterThanOrEqualTo(nodes.peakVolts - VOLTS);
                case END -> assertThat(stepper.seconds()).as(which).isGreaterThan(from);
            }
        });
        assertThat(seen.keySet()).as("kinds of events").containsExactlyInAnyOrder(Event.values());
    }

    /** A stall ends as its emitter current falls to nothing; one that begins under that ends at once. */
    private static void leaves(Piece piece, boolean lasted, String which) {
        assertThat(piece.emitterAmps()).as(which).isLessThan(AMPS);
        if (lasted) {
            close(piece.emitterAmps(), 0, AMPS, which);
        }
    }

    private static void clampTurns(Piece piece, Network n, Kirchhoff nodes, String which) {
        close(piece.clamps ? nodes.clampAmps : nodes.baseOneVolts, piece.clamps ? 0 : -n.clampVolts, VOLTS, which);
    }

    private static void close(double is, double should, double apart, String which) {
        assertThat(is).as(which).isCloseTo(should, within(apart));
    }

    /** Between two events nothing is missed: every switch stays on its own side. */
    @Test
    void betweenTwoEventsEverySwitchAgrees() {
        everyCircuit((n, stepper, from, event, which) -> {
            Piece piece = stepper.piece();
            for (int i = 0; i <= 6 && stepper.seconds() > from; i++) {
                piece.look(from + (stepper.seconds() - from) * i / 6);
                Kirchhoff nodes = Kirchhoff.where(n, piece);
                assertThat((piece.rectifies ? 1 : -1) * (nodes.sourceVolts - nodes.supplyVolts))
                        .as(which)
                        .isGreaterThan(-1e-6);
                assertThat((piece.clips ? 1 : -1) * (nodes.supplyVolts - n.zenerKneeVolts))
                        .as(which)
                        .isGreaterThan(-1e-6);
                deviceAgrees(n, piece, nodes, which);
                if (piece.clamps) {
                    assertThat(nodes.clampAmps).as(which).isGreaterThan(-1e-9);
                } else {
                    assertThat(nodes.baseOneVolts).as(which).isGreaterThan(-n.clampVolts - 1e-6);
                }
            }
        });
    }

    private static void deviceAgrees(Network n, Piece piece, Kirchhoff nodes, String which) {
        switch (piece.mode) {
            case OFF -> assertThat(nodes.rampVolts).as(which).isLessThan(nodes.peakVolts + 1e-6);
            case ON -> {
                assertThat(nodes.emitterAmps - n.valleySiemens * nodes.supplyVolts)
                        .as(which)
                        .isGreaterThan(-1e-9);
                assertThat((piece.gateConducts ? 1 : -1) * (nodes.gateVolts - n.gateKneeVolts))
                        .as(which)
                        .isGreaterThan(-1e-6);
            }
            case STALLED -> {
                double emitter = piece.emitterAmps();
                assertThat(emitter).as(which).isGreaterThan(-1e-9);
                if (emitter > n.peakCurrentAmps + 1e-12) {
                    assertThat(overValley(n, piece, nodes))
                            .as("regenerates, " + which)
                            .isLessThan(1e-7);
                }
            }
        }
    }

    /** By how much the saturated line would exceed the valley current, A. */
    private static double overValley(Network n, Piece piece, Kirchhoff nodes) {
        Piece on = new Piece();
        on.mode = Mode.ON;
        on.clamps = piece.clamps;
        NodeLaws.settle(n, on, nodes.rampVolts, nodes.fluxAmps, nodes.sourceVolts);
        Kirchhoff fired = Kirchhoff.at(n, on, nodes.rampVolts, nodes.fluxAmps, nodes.sourceVolts);
        return fired.emitterAmps - n.valleySiemens * fired.supplyVolts;
    }

    /** Fires given the peak-point current, stalls given less (DEVELOPERS.md, To fire or to stall). */
    @Test
    void atThePeakPointTheEmittersCurrentDecides() {
        everyCircuit((n, stepper, from, event, which) -> {
            Piece off = stepper.piece();
            if (off.mode != Mode.OFF || (event != Event.FIRES && event != Event.STALLS)) {
                return;
            }
            Kirchhoff nodes = Kirchhoff.where(n, off);
            Piece held = new Piece();
            held.mode = Mode.STALLED;
            held.rectifies = off.rectifies;
            held.clips = off.clips;
            held.clamps = off.clamps;
            NodeLaws.shape(n, held);
            double emitter = held.emitter.at(nodes.rampVolts, nodes.fluxAmps, nodes.sourceVolts)
                    + held.emitter.sourceSlope * off.sourceSlope;
            boolean above = nodes.rampVolts > nodes.peakVolts + 1e-9;
            boolean given = above || emitter >= n.peakCurrentAmps;
            boolean regenerates = overValley(n, off, nodes) > 1e-6 * n.valleySiemens * nodes.supplyVolts;
            assertThat(event).as(which).isEqualTo(given && regenerates ? Event.FIRES : Event.STALLS);
            assertThat(stepper.mode()).as(which).isEqualTo(event == Event.FIRES ? Mode.ON : Mode.STALLED);
        });
    }

    @Test
    void aStallFiresAsSoonAsItsEmitterGetsThePeakPointCurrent() {
        int[] fired = new int[1];
        everyCircuit((n, stepper, from, event, which) -> {
            Piece piece = stepper.piece();
            if (piece.mode == Mode.STALLED && event == Event.FIRES) {
                fired[0]++;
                assertThat(piece.emitterAmps()).as(which).isGreaterThanOrEqualTo(n.peakCurrentAmps - 1e-12);
                assertThat(overValley(n, piece, Kirchhoff.where(n, piece)))
                        .as(which)
                        .isPositive();
            }
        });
        assertThat(fired[0]).isGreaterThan(10);
    }

    @Test
    void everyEventLeadsToItsState() {
        everyCircuit((n, stepper, from, event, which) -> {
            Piece before = stepper.piece();
            switch (event) {
                case RECTIFIER -> assertThat(stepper.rectifies()).as(which).isEqualTo(!before.rectifies);
                case ZENER -> assertThat(stepper.clips()).as(which).isEqualTo(!before.clips);
                case GATE -> assertThat(stepper.gateConducts()).as(which).isEqualTo(!before.gateConducts);
                case FIRES -> assertThat(stepper.mode()).as(which).isEqualTo(Mode.ON);
                case STALLS -> assertThat(stepper.mode()).as(which).isEqualTo(Mode.STALLED);
                case UNSTALLS -> assertThat(stepper.mode()).as(which).isEqualTo(Mode.OFF);
                case VALLEY -> assertThat(stepper.mode()).as(which).isNotEqualTo(Mode.ON);
                default -> assertThat(stepper.mode()).as(which).isEqualTo(before.mode());
            }
        });
    }

    /** A piece begins at the ramp voltage and magnetising current that the last one ended in. */
    @Test
    void neitherRampNorCoreJumps() {
        double[] last = new double[3];
        everyCircuit((n, stepper, from, event, which) -> {
            Piece piece = stepper.piece();
            piece.look(from);
            if (from > 0) {
                assertThat(piece.fluxAmps()).as(which).isCloseTo(last[1], within(1e-10));
                // Out of a valley that lies over the peak point the ramp goes there at once.
                if (piece.mode != Mode.STALLED || last[2] != Event.VALLEY.ordinal()) {
                    assertThat(piece.rampVolts()).as(which).isCloseTo(last[0], within(1e-7));
                }
            }
            piece.look(stepper.seconds());
            assertThat(stepper.rampVolts()).as(which).isEqualTo(piece.rampVolts());
            assertThat(stepper.fluxAmps()).as(which).isEqualTo(piece.fluxAmps());
            last[0] = stepper.rampVolts();
            last[1] = stepper.fluxAmps();
            last[2] = event.ordinal();
        });
    }

    /** Energy given by the line = dissipated in every part + stored in capacitor and core, over every half cycle. */
    @Test
    void theLineGivesWhatThePartsTake() {
        double[] joules = new double[2];
        everyCircuit((n, stepper, from, event, which) -> {
            Piece piece = stepper.piece();
            if (!(stepper.seconds() > from)) {
                return;
            }
            double[] given = new double[1];
            double[] taken = new double[1];
            PieceQuadrature.visit(piece, from, stepper.seconds(), (at, weight) -> {
                Kirchhoff nodes = Kirchhoff.where(n, at);
                given[0] += weight * nodes.sourceVolts * nodes.dropperAmps();
                taken[0] += weight * dissipatedWatts(n, nodes, at.mode == Mode.STALLED ? at.emitterAmps() : 0);
            });
            piece.look(from);
            double stored = -stored(n, piece);
            piece.look(stepper.seconds());
            stored += stored(n, piece);
            joules[0] += given[0];
            joules[1] += taken[0] + stored;
            if (event == Event.END) {
                assertThat(joules[1] / joules[0]).as(which).isCloseTo(1, within(1e-8));
                joules[0] = 0;
                joules[1] = 0;
            }
        });
    }

    private static double stored(Network n, Piece piece) {
        return 0.5 * n.capacitorFarads * piece.rampVolts() * piece.rampVolts()
                + 0.5 * n.magnetisingHenries * piece.fluxAmps() * piece.fluxAmps();
    }

    /** Every resistor i²R, every source of voltage v i; a held emitter takes its current from the ramp to ground. */
    private static double dissipatedWatts(Network n, Kirchhoff nodes, double heldAmps) {
        double dropper = nodes.dropperAmps() * nodes.dropperAmps() * n.dropperOhms;
        double zener = nodes.supplyVolts * nodes.zenerAmps();
        double ramp = nodes.rampResistorAmps() * nodes.rampResistorAmps() * n.rampOhms;
        double emitter = heldAmps == 0 ? nodes.emitterAmps : heldAmps;
        double device = nodes.supplyVolts * nodes.baseTwoAmps()
                + nodes.rampVolts * emitter
                - nodes.baseOneVolts * nodes.deviceAmps();
        double baseOne = nodes.baseOneVolts * nodes.baseOneVolts / n.baseOneOhms;
        double clamp = -nodes.baseOneVolts * nodes.clampAmps;
        double gates = n.transformerCoupled ? n.secondaries : 1;
        double lead = nodes.leadAmps();
        double gate = gates * (lead * lead * (n.gateSeriesOhms + n.secondaryOhms) + nodes.gateVolts * lead);
        double primary = nodes.coupledAmps() * nodes.coupledAmps() * n.primaryOhms;
        return dropper + zener + ramp + device + baseOne + clamp + gate + primary;
    }
}
