package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** What a caller may do on the way: stop, go on elsewhere, take the supply away and give it back; and a stall that waits. */
class StepperDetoursTest {
    private static final int CIRCUITS = 40;

    private static final int MOST_EVENTS = 1500;

    private record Happened(Event event, double seconds, double ramp) {}

    private static Happened next(Stepper stepper, double limit) {
        Event event = stepper.advance(limit);
        return new Happened(event, stepper.seconds(), stepper.rampVolts());
    }

    private static Network network(long seed) {
        return seed % 2 == 0 ? DrawnNetworks.direct(seed) : DrawnNetworks.throughTransformer(seed);
    }

    private static List<Happened> happened(Network n, SourceWave wave, int stops) {
        List<Happened> list = new ArrayList<>();
        Stepper stepper = new Stepper(n);
        stepper.start(wave, Mode.OFF, 0.5, 0);
        for (int stop = 1; stop <= stops; stop++) {
            double limit = wave.seconds() * stop / stops;
            while (stepper.seconds() < limit) {
                Happened now = next(stepper, limit);
                assertThat(list.size()).isLessThan(MOST_EVENTS);
                if (now.event != Event.END || stop == stops) {
                    list.add(now);
                }
            }
        }
        return list;
    }

    private static void assertSame(List<Happened> is, List<Happened> should, String which) {
        assertThat(is.stream().map(Happened::event))
                .as(which)
                .containsExactlyElementsOf(should.stream().map(Happened::event).toList());
        for (int i = 0; i < should.size(); i++) {
            assertThat(is.get(i).seconds).as(which).isCloseTo(should.get(i).seconds, within(1e-11));
            assertThat(is.get(i).ramp).as(which).isCloseTo(should.get(i).ramp, within(1e-6));
        }
    }

    @Test
    void stoppingOnTheWayChangesNothing() {
        for (long seed = 0; seed < CIRCUITS; seed++) {
            Network n = network(seed);
            SourceWave wave = DrawnNetworks.sine(seed);
            assertSame(happened(n, wave, 7), happened(n, wave, 1), "seed " + seed);
        }
    }

    /** A pulse that did not turn the thyristor on gets its supply back as if it had never been taken. */
    @Test
    void aTriedPulseThatIsTakenBackLeavesNoTrace() {
        int tried = 0;
        for (long seed = 0; seed < CIRCUITS; seed++) {
            Network n = network(seed);
            SourceWave wave = DrawnNetworks.sine(seed);
            SourceWave conducting = new SourceWave();
            conducting.setConstant(1, wave.seconds());
            List<Happened> list = new ArrayList<>();
            Stepper stepper = new Stepper(n);
            stepper.start(wave, Mode.OFF, 0.5, 0);
            while (stepper.seconds() < wave.seconds()) {
                Happened now = next(stepper, wave.seconds());
                list.add(now);
                assertThat(list.size()).isLessThan(MOST_EVENTS);
                if (now.event == Event.FIRES) {
                    tried++;
                    double flux = stepper.fluxAmps();
                    stepper.switchSource(conducting);
                    collapsed(n, stepper, wave.seconds(), "seed " + seed);
                    stepper.switchSource(wave);
                    stepper.returnToFiring(now.seconds, now.ramp, flux);
                    assertThat(stepper.seconds()).isEqualTo(now.seconds);
                    assertThat(stepper.rampVolts()).isEqualTo(now.ramp);
                    assertThat(stepper.fluxAmps()).isEqualTo(flux);
                    assertThat(stepper.mode()).isEqualTo(Mode.ON);
                }
            }
            assertSame(list, happened(n, wave, 1), "seed " + seed);
        }
        assertThat(tried).isGreaterThan(CIRCUITS);
    }

    /** With a volt left behind the dropper the pulse is the capacitor's alone, and its switches agree with that volt. */
    private static void collapsed(Network n, Stepper stepper, double limit, String which) {
        double before = stepper.rampVolts();
        Event event;
        int events = 0;
        do {
            assertThat(++events).as(which).isLessThan(MOST_EVENTS);
            double from = stepper.seconds();
            event = stepper.advance(limit);
            Piece piece = stepper.piece();
            piece.look((from + stepper.seconds()) / 2);
            Kirchhoff nodes = Kirchhoff.where(n, piece);
            assertThat(nodes.sourceVolts).as(which).isEqualTo(1);
            assertThat(piece.rectifies).as(which).isEqualTo(nodes.supplyVolts < 1);
            assertThat(nodes.supplyImbalance()).as(which).isCloseTo(0, within(1e-12));
        } while (event != Event.VALLEY && event != Event.END);
        assertThat(stepper.rampVolts()).as(which).isLessThan(before);
    }

    @Test
    void goingOnInAnotherStepperChangesNothing() {
        for (long seed = 0; seed < CIRCUITS; seed += 2) {
            Network n = network(seed);
            SourceWave wave = DrawnNetworks.sine(seed);
            Stepper stepper = new Stepper(n);
            Stepper other = new Stepper(n);
            stepper.start(wave, Mode.OFF, 0.5, 0);
            while (stepper.seconds() < wave.seconds()) {
                boolean rectifies = stepper.rectifies();
                boolean clips = stepper.clips();
                other.resume(
                        wave,
                        stepper.mode(),
                        rectifies,
                        clips,
                        stepper.gateConducts(),
                        stepper.seconds(),
                        stepper.rampVolts());
                other.settleResumed();
                assertThat(other.fluxAmps()).isZero();
                assertThat(other.seconds()).isEqualTo(stepper.seconds());
                Happened should = next(stepper, wave.seconds());
                // A switch that has just turned over may stand a rounding on either side of its edge, and turn on the
                // spot.
                Happened is = next(other, wave.seconds());
                for (int i = 0; i < 3 && is.seconds < should.seconds - 1e-11; i++) {
                    is = next(other, wave.seconds());
                }
                if (stepper.piece().mode() != Mode.STALLED) {
                    assertSame(List.of(is), List.of(should), "seed " + seed);
                }
            }
        }
    }

    /** A charged ramp without a supply empties through the emitter as the half cycle begins, whatever state it comes in. */
    @Test
    void everyModeCanBeCarriedOverALineZero() {
        for (long seed = 0; seed < CIRCUITS; seed++) {
            Network n = network(seed);
            SourceWave wave = DrawnNetworks.sine(seed);
            for (Mode mode : Mode.values()) {
                Stepper stepper = new Stepper(n);
                stepper.start(wave, mode, 3, 0);
                assertThat(stepper.mode()).isEqualTo(mode);
                assertThat(stepper.rampVolts()).isEqualTo(3);
                assertThat(stepper.seconds()).isZero();
                assertThat(stepper.rectifies()).isFalse();
                assertThat(stepper.clips()).isFalse();
                stepper.advance(wave.seconds() / 1000);
                stepper.advance(wave.seconds() / 1000);
                assertThat(stepper.rampVolts()).as("seed " + seed + " " + mode).isLessThan(3);
            }
        }
    }

    /**
     * A programmable device on a low divider: at half a volt of supply its emitter already gets the peak-point current, but
     * its saturated line, which begins at 0.6 V, carries nothing yet. It waits until that carries more than the valley current.
     */
    @Test
    void aStallOnANearlyDeadSupplyWaitsUntilThePulseWouldRegenerate() {
        Network n = DrawnNetworks.direct(3);
        n.upperOhms = 40e3;
        n.lowerOhms = 10e3;
        n.emitterDropVolts = 0.35;
        n.peakCurrentAmps = 1e-6;
        n.rampOhms = 20e3;
        n.capacitorFarads = 1e-9;
        n.dropperOhms = 1e3;
        n.derive();
        SourceWave wave = new SourceWave();
        wave.setSine(100 * Math.PI, 34, 0, 0.01);
        Stepper stepper = new Stepper(n);
        stepper.start(wave, Mode.OFF, 0, 0);
        Event event = stepper.advance(wave.seconds());
        for (int events = 0; events < 100 && event != Event.STALLS; events++) {
            event = stepper.advance(wave.seconds());
        }
        assertThat(stepper.advance(wave.seconds())).isEqualTo(Event.FIRES);
        Piece held = stepper.piece();
        assertThat(held.emitterAmps()).isGreaterThan(n.peakCurrentAmps);
        assertThat(overValley(n, stepper.seconds(), held)).as("just enough").isBetween(0.0, 1e-9);
        assertThat(overValley(n, stepper.seconds() - 1e-6, held))
                .as("a microsecond before")
                .isNegative();
    }

    /** By how much the saturated line would exceed the valley current were it fired at a time, A. */
    private static double overValley(Network n, double seconds, Piece held) {
        held.look(seconds);
        Piece on = new Piece();
        on.mode = Mode.ON;
        NodeLaws.settle(n, on, held.rampVolts(), 0, held.sourceVolts());
        Kirchhoff fired = Kirchhoff.at(n, on, held.rampVolts(), 0, held.sourceVolts());
        return fired.emitterAmps - n.valleySiemens * fired.supplyVolts;
    }
}
