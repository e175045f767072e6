package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** What the swift way says of a half cycle as a whole: how its end moves with its start, what is near an edge, what is rough. */
class SwiftHalfCycleTest {
    private static final int CIRCUITS = 150;
    private static final int MOST_EVENTS = 1500;

    private record Half(List<Event> events, double ramp, double firing, double kept, double shift, boolean edge) {}

    private static SwiftStepper stepper(long seed, SourceWave wave) {
        SwiftStepper swift = new SwiftStepper(DrawnNetworks.direct(seed));
        swift.take(wave);
        return swift;
    }

    private static Half half(SwiftStepper swift, SourceWave wave, double startVolts, boolean rough, boolean proven) {
        List<Event> events = new ArrayList<>();
        double firing = Double.NaN;
        swift.start(Mode.OFF, startVolts, rough, proven);
        while (swift.seconds() < wave.seconds()) {
            assertThat(events.size()).isLessThan(MOST_EVENTS);
            Event event = swift.advance();
            events.add(event);
            firing = event == Event.FIRES ? swift.seconds() : firing;
        }
        return new Half(events, swift.rampVolts(), firing, swift.kept(), swift.firingShift(), swift.nearEdge());
    }

    /** Ramp at the end and last firing instant by the ramp at the start, against a central difference quotient. */
    @Test
    void itKnowsHowTheEndMovesWithTheStart() {
        int followed = 0;
        double step = 1e-5;
        for (long seed = 0; seed < CIRCUITS; seed++) {
            SourceWave wave = DrawnNetworks.sine(seed);
            SwiftStepper swift = stepper(seed, wave);
            Half middle = half(swift, wave, 0.5, false, false);
            Half above = half(swift, wave, 0.5 + step, false, false);
            Half below = half(swift, wave, 0.5 - step, false, false);
            if (middle.edge || Double.isNaN(middle.kept) || !above.events.equals(below.events)) {
                continue;
            }
            followed++;
            double kept = (above.ramp - below.ramp) / (2 * step);
            assertThat(middle.kept).as("seed " + seed).isCloseTo(kept, within(1e-3 * Math.abs(kept) + 1e-6));
            if (Double.isNaN(middle.firing)) {
                assertThat(middle.shift).as("seed " + seed).isNaN();
            } else {
                double shift = (above.firing - below.firing) / (2 * step);
                assertThat(middle.shift).as("seed " + seed).isCloseTo(shift, within(1e-3 * Math.abs(shift) + 1e-8));
            }
        }
        assertThat(followed).isGreaterThan(CIRCUITS / 4);
    }

    /** Where it says that no event nearly took another's place, a tenth of a millivolt takes none away and brings none. */
    @Test
    void awayFromEdgesANeighbourPassesTheSameEvents() {
        int inside = 0;
        for (long seed = 0; seed < CIRCUITS; seed++) {
            SourceWave wave = DrawnNetworks.sine(seed);
            SwiftStepper swift = stepper(seed, wave);
            Half middle = half(swift, wave, 0.5, false, false);
            if (!middle.edge) {
                inside++;
                assertThat(half(swift, wave, 0.5 + 1e-4, false, false).events)
                        .as("seed " + seed)
                        .isEqualTo(middle.events);
            }
        }
        assertThat(inside).isGreaterThan(CIRCUITS / 3);
    }

    @Test
    void aRoughHalfCycleIsRoughlyRight() {
        int otherwise = 0;
        for (long seed = 0; seed < CIRCUITS; seed++) {
            SourceWave wave = DrawnNetworks.sine(seed);
            SwiftStepper swift = stepper(seed, wave);
            Half fine = half(swift, wave, 0.5, false, false);
            Half rough = half(stepper(seed, wave), wave, 0.5, true, true);
            Half known = half(swift, wave, 0.5, false, true);
            if (fine.edge) {
                continue;
            }
            assertThat(rough.events).as("seed " + seed).isEqualTo(fine.events);
            assertThat(known.events).as("seed " + seed).isEqualTo(fine.events);
            if (!Double.isNaN(fine.firing)) {
                otherwise += rough.firing == fine.firing ? 0 : 1;
                assertThat(rough.firing).as("seed " + seed).isCloseTo(fine.firing, within(1e-6));
                assertThat(known.firing).as("seed " + seed).isCloseTo(fine.firing, within(1e-11));
            }
        }
        assertThat(otherwise).as("only roughly").isPositive();
    }
}
