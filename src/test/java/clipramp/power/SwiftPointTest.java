package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Design;
import clipramp.circuit.SampleDesigns;
import clipramp.engine.UnitValues;
import clipramp.firing.Firing;
import clipramp.firing.FiringState;
import clipramp.firing.Solution;
import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.EnumSet;
import org.junit.jupiter.api.Test;

/** The swift path against the reference path, unit for unit. */
class SwiftPointTest {
    /** Share of a half cycle by which the two may differ. */
    private static final double OF_A_HALF_CYCLE = 1e-9;

    private static final long SEED = 20310131;

    /** The longest runs of doubt that were seen: hunting units, which the swift path leaves alone. */
    private static final double MOST_UNSURE = 0.02;

    @Test
    void heatersFireWhereTheReferencePathSays() {
        compare(SampleDesigns.heater(), 0, 700);
        compare(SampleDesigns.heater(), 0.5, 700);
        compare(SampleDesigns.heater(), 1, 300);
    }

    @Test
    void heatersWithALargeCapacitorFireWhereTheReferencePathSays() {
        Design cabinet = SampleDesigns.heater()
                .withRamp(SampleDesigns.ramp(220e-9, 3900, 25_000))
                .withTrigger(SampleDesigns.unijunctionTrigger(33, 470));
        compare(cabinet, 0, 500);
        compare(cabinet, 0.5, 500);
        compare(cabinet, 1, 500);
    }

    @Test
    void programmableDevicesFireWhereTheReferencePathSays() {
        compare(SampleDesigns.programmableHeater(), 0.5, 500);
    }

    @Test
    void halfWaveStagesFireWhereTheReferencePathSays() {
        compare(SampleDesigns.halfWaveHeater(), 0.5, 500);
    }

    @Test
    void aStarvedEmitterIsAStallOnBothPaths() {
        Design slow = SampleDesigns.heater().withRamp(SampleDesigns.ramp(2.2e-9, 100_000, 4_700_000));
        assertThat(compare(slow, 0, 300)).contains(FiringState.STALLS);
    }

    /**
     * Found among a million: the residual that half cycles tend to lies a millionth of a volt beyond the one from which
     * another pulse fits in before the line's zero, so they never settle, six after six.
     */
    @Test
    void aUnitWhoseResidualIsOnlyAlmostAFixedPointHuntsOnBothPaths() {
        int number = 48_871;
        Design design = SampleDesigns.heater();
        DrawnUnits units = new DrawnUnits(design, SEED);
        for (int i = 0; i < number; i++) {
            units.next();
        }
        double share = design.ramp().pot().orElseThrow().trackShare(number % 11 / 10.0);
        assertThat(compare(design, units, share, 1)).containsExactly(FiringState.HUNTS);
    }

    @Test
    void nothingIsAllocatedForAUnit() {
        SwiftPoint swift = new SwiftPoint(SampleDesigns.heater());
        DrawnUnits units = new DrawnUnits(SampleDesigns.heater(), SEED);
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long thread = Thread.currentThread().getId();
        double kept = solveMany(swift, units, 3000);
        long before = threads.getThreadAllocatedBytes(thread);
        long empty = threads.getThreadAllocatedBytes(thread) - before;
        before = threads.getThreadAllocatedBytes(thread);
        kept += solveMany(swift, units, 3000);
        long allocated = threads.getThreadAllocatedBytes(thread) - before - empty;
        assertThat(kept).isNotNaN();
        assertThat(allocated).as("bytes for 3000 units").isZero();
    }

    private static double solveMany(SwiftPoint swift, DrawnUnits units, int count) {
        double sum = 0;
        for (int i = 0; i < count; i++) {
            UnitValues unit = units.next();
            if (swift.solve(unit, unit.rampOhms(0.5))) {
                sum += swift.watts();
            }
        }
        return sum;
    }

    @Test
    void aDesignThatItIsNotForIsRefused() {
        assertThat(SwiftPoint.suits(SampleDesigns.triacHeater())).isFalse();
        assertThat(SwiftPoint.suits(SampleDesigns.thyristorTapHeater())).isFalse();
        assertThatThrownBy(() -> new SwiftPoint(SampleDesigns.triacHeater()))
                .isInstanceOf(IllegalArgumentException.class);
    }

    /** Compares units at a knob position; says which states were seen. */
    private static EnumSet<FiringState> compare(Design design, double position, int count) {
        double share = design.ramp().pot().orElseThrow().trackShare(position);
        return compare(design, new DrawnUnits(design, SEED), share, count);
    }

    private static EnumSet<FiringState> compare(Design design, DrawnUnits units, double share, int count) {
        SwiftPoint swift = new SwiftPoint(design);
        EnumSet<FiringState> seen = EnumSet.noneOf(FiringState.class);
        int unsure = 0;
        for (int i = 0; i < count; i++) {
            UnitValues unit = units.next();
            if (!swift.solve(unit, unit.rampOhms(share))) {
                unsure++;
                continue;
            }
            Solution reference = Firing.solve(design, units.condition(), swift.network());
            LoadResult load = LoadPower.of(design, units.condition(), reference);
            String which = "seed " + SEED + " unit " + i + " at a track share of " + share;
            seen.add(swift.state());
            assertThat(swift.state()).as(which).isEqualTo(reference.state());
            double expected = reference.shown().firingRad().orElse(Double.NaN);
            if (Double.isNaN(expected)) {
                assertThat(swift.firingRad()).as(which).isNaN();
            } else {
                assertThat(swift.firingRad()).as(which).isCloseTo(expected, within(OF_A_HALF_CYCLE * Math.PI));
            }
            assertThat(swift.watts()).as(which).isCloseTo(load.watts(), within(1e-8 * 1200));
            assertThat(swift.fraction()).as(which).isCloseTo(load.fraction(), within(1e-8));
        }
        assertThat(unsure).as("left to the reference path").isLessThanOrEqualTo((int) (MOST_UNSURE * count));
        return seen;
    }
}
