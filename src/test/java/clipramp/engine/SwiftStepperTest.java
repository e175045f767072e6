package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.SampleDesigns;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The swift way through a half cycle against the reference way, event by event, on drawn circuits. */
class SwiftStepperTest {
    private static final int CIRCUITS = 150;
    private static final int HALF_CYCLES = 3;
    /** None of these circuits passes more events in a half cycle: one that does has lost its way. */
    private static final int MOST_EVENTS = 1500;

    /** Both are good to a billionth of a half cycle (DEVELOPERS.md, Many units at once). */
    private static final double SHARE = 1e-9;

    /** Where a switch's form hardly bends the swift search ends a little sooner; firing and valley do not feel it, s. */
    private static final double SWITCHING = 1e-10;

    /** What is told of each event on both ways. */
    private interface Witness {
        void both(Network n, SwiftStepper swift, Stepper stepper, double from, Event event, String which);
    }

    private static void everyCircuit(int circuits, Witness witness) {
        for (long seed = 0; seed < circuits; seed++) {
            Network n = DrawnNetworks.direct(seed);
            run(n, new SwiftStepper(n), DrawnNetworks.sine(seed), witness, "seed " + seed);
            if (seed % 6 == 2) {
                Network starved = DrawnNetworks.starved(seed);
                run(starved, new SwiftStepper(starved), DrawnNetworks.sine(seed), witness, "starved " + seed);
            }
        }
    }

    private static void run(Network n, SwiftStepper swift, SourceWave wave, Witness witness, String which) {
        Stepper stepper = new Stepper(n);
        swift.take(wave);
        Mode mode = Mode.OFF;
        double ramp = 0;
        for (int half = 0; half < HALF_CYCLES; half++) {
            swift.start(mode, ramp, false, false);
            stepper.start(wave, mode, ramp, 0);
            long events = swift.pieces() + MOST_EVENTS;
            while (stepper.seconds() < wave.seconds()) {
                assertThat(swift.pieces()).as(which).isLessThan(events);
                double from = stepper.seconds();
                Event event = stepper.advance(wave.seconds());
                String here = which + " half cycle " + half + " to " + stepper.seconds();
                assertThat(advance(swift, event)).as(here).isEqualTo(event);
                witness.both(n, swift, stepper, from, event, here);
            }
            mode = stepper.mode();
            ramp = stepper.rampVolts();
        }
    }

    /**
     * The next event that takes time, or the expected one: where a switch's instant was met a picosecond early, it turns
     * back and over again on the spot.
     */
    private static Event advance(SwiftStepper swift, Event expected) {
        double before = swift.seconds();
        Event event = swift.advance();
        for (int turns = 0;
                turns < 20
                        && event != expected
                        && (event == Event.RECTIFIER || event == Event.ZENER || event == Event.GATE)
                        && swift.seconds() - before < SWITCHING;
                turns++) {
            event = swift.advance();
        }
        return event;
    }

    private static void agree(SwiftStepper swift, Stepper stepper, Event event, String which) {
        boolean switches = event == Event.RECTIFIER || event == Event.ZENER || event == Event.GATE;
        assertThat(swift.seconds()).as(which).isCloseTo(stepper.seconds(), within(switches ? SWITCHING : SHARE * 0.01));
        assertThat(swift.rampVolts()).as(which).isCloseTo(stepper.rampVolts(), within(1e-6));
        assertThat(swift.mode()).as(which).isEqualTo(stepper.mode());
        assertThat(swift.clips()).as(which).isEqualTo(stepper.clips());
    }

    @Test
    void everyEventIsTheReferencesOwn() {
        everyCircuit(CIRCUITS, (n, swift, stepper, from, event, which) -> agree(swift, stepper, event, which));
    }

    /** After a doubt the careful stepper's rest after a switch holds on, or the two would turn it to and fro on the spot. */
    @Test
    void noSwitchTurnsForEverWhereTheTwoSteppersMeet() {
        for (long seed : List.of(1428L, 2409L, 2616L)) {
            Network n = DrawnNetworks.direct(seed);
            SwiftStepper swift = new SwiftStepper(n);
            swift.take(DrawnNetworks.sine(seed));
            swift.start(Mode.OFF, 0.5, false, false);
            int events = 1;
            while (swift.advance() != Event.END && events < MOST_EVENTS) {
                events++;
            }
            assertThat(events).as("seed " + seed).isLessThan(100);
        }
    }

    @Test
    void aDyingSupplyThatOnlyJustFeedsTheValleyFiresNothing() {
        long seed = 96;
        Network n = DrawnNetworks.starved(seed);
        Witness agrees = (network, swift, stepper, from, event, which) -> agree(swift, stepper, event, which);
        run(n, new SwiftStepper(n), DrawnNetworks.sine(seed), agrees, "starved " + seed);
    }

    /** A single diode's supply works over whole periods, its second half unfed. */
    @Test
    void wholePeriodsToo() {
        for (long seed = 0; seed < 30; seed++) {
            SourceWave half = DrawnNetworks.sine(seed);
            SourceWave wave = new SourceWave();
            wave.setSine(half.rates[0], half.amplitudes[0], 0.7, 2 * half.seconds);
            Network n = DrawnNetworks.direct(seed);
            Witness agrees = (network, swift, stepper, from, event, which) -> agree(swift, stepper, event, which);
            run(n, new SwiftStepper(n), wave, agrees, "period of seed " + seed);
        }
    }

    /** One stepper for circuit after circuit, as many units are drawn: what it remembers of one misleads no other. */
    @Test
    void whatItRemembersOfOneUnitMisleadsNoOther() {
        Network n = new Network();
        SwiftStepper swift = new SwiftStepper(n);
        for (int i = 0; i < 120; i++) {
            UnitValues unit = UnitValues.nominal(SampleDesigns.heater());
            unit.lineVolts = 207 + i % 7 * 8;
            unit.standoff = 0.56 + 0.19 * (i % 11) / 10;
            unit.capacitorFarads *= 0.9 + 0.2 * (i % 5) / 4;
            unit.fill(n, 6e3 + 1e3 * (i % 13) * (i % 13));
            SourceWave wave = new SourceWave();
            wave.setSine(100 * Math.PI, unit.lineVolts * Math.sqrt(2), 1.4, 0.01);
            Witness agrees = (network, s, stepper, from, event, which) -> agree(s, stepper, event, which);
            run(n, swift, wave, agrees, "unit " + i);
        }
        assertThat(swift.pieces()).isGreaterThan(2000);
        assertThat((double) swift.carefulPieces() / swift.pieces())
                .as("left to the reference way: that is what makes it swift")
                .isLessThan(2e-3);
    }

    /** Until when a pulse holds the trigger current, against the piece's own first crossing. */
    @Test
    void theTriggerCurrentIsHeldAsLongAsThePieceSays() {
        int[] told = new int[4];
        everyCircuit(CIRCUITS, (n, swift, stepper, from, event, which) -> {
            double held = swift.triggerHeldUntil();
            Piece piece = stepper.piece();
            piece.look(from);
            double before = piece.gateAmps(n) - n.triggerAmps;
            if (Double.isNaN(held)) {
                told[3]++;
                return;
            }
            if (before < 0) {
                told[0]++;
                assertThat(held).as(which).isEqualTo(Double.NEGATIVE_INFINITY);
                return;
            }
            double until = piece.gateReaches(n, n.triggerAmps, false, from, stepper.seconds());
            told[until < Double.POSITIVE_INFINITY ? 1 : 2]++;
            if (until < Double.POSITIVE_INFINITY) {
                assertThat(held).as(which).isCloseTo(until, within(SHARE * 0.01));
            } else {
                assertThat(held).as(which).isEqualTo(until);
            }
        });
        assertThat(told[0]).as("under it").isPositive();
        assertThat(told[2]).as("over it throughout").isPositive();
        assertThat(told[3]).as("left unsaid, where hardly any pulse rises").isLessThan(CIRCUITS / 50);
        assertThat(told[1]).as("falling to it").isGreaterThan(CIRCUITS);
    }

    /** Held on by its resistor, the device's exponential is long gone: the line alone moves the gate, up or down. */
    @Test
    void howLongAHeldDeviceTriggersIsLeftUnsaid() {
        Network n = DrawnNetworks.direct(1);
        n.baseOneOhms = 100;
        n.gateSeriesOhms = 0;
        n.gateShuntSiemens = 0;
        n.baseTwoOhms = 0;
        n.modulatedOhms = 300;
        n.dropperOhms = 500;
        n.rampOhms = 1000;
        n.valleySiemens = 1e-4;
        n.derive();
        int[] unsaid = new int[1];
        run(
                n,
                new SwiftStepper(n),
                DrawnNetworks.sine(1),
                (network, swift, stepper, from, event, which) -> {
                    boolean held = stepper.piece().gateConducts && stepper.seconds() - from > 1e-3;
                    unsaid[0] += held ? 1 : 0;
                    assertThat(held && !Double.isNaN(swift.triggerHeldUntil()))
                            .as(which)
                            .isFalse();
                },
                "held");
        assertThat(unsaid[0]).isPositive();
    }

    /** DEVELOPERS.md: R_E alone feeds more than the valley current. */
    @Test
    void aDeviceHeldOnByItsResistorIsSeen() {
        int[] seen = new int[2];
        everyCircuit(CIRCUITS, (n, swift, stepper, from, event, which) -> {
            Piece piece = stepper.piece();
            piece.look(stepper.seconds());
            if (piece.mode == Mode.STALLED) {
                return;
            }
            Kirchhoff nodes = Kirchhoff.where(n, piece);
            double over = nodes.rampResistorAmps() - n.valleySiemens * nodes.supplyVolts;
            if (Math.abs(over) > 1e-9) {
                seen[over > 0 ? 1 : 0]++;
                assertThat(swift.isHeldByResistor()).as(which).isEqualTo(over > 0);
            }
        });
        assertThat(seen[0]).isGreaterThan(100);
        assertThat(seen[1]).isGreaterThan(20);
    }

    @Test
    void whatItIsNotForIsRefused() {
        Network direct = DrawnNetworks.direct(1);
        SourceWave constant = new SourceWave();
        constant.setConstant(1, 0.01);
        SourceWave late = DrawnNetworks.sine(1);
        late.phases[0] = 0.1;
        SwiftStepper swift = new SwiftStepper(direct);
        for (SourceWave wave : List.of(constant, late)) {
            assertThatThrownBy(() -> swift.take(wave)).isInstanceOf(IllegalArgumentException.class);
        }
        SwiftStepper coupled = new SwiftStepper(DrawnNetworks.throughTransformer(1));
        assertThatThrownBy(() -> coupled.take(DrawnNetworks.sine(1))).isInstanceOf(IllegalArgumentException.class);
    }
}
