package clipramp.firing;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Condition;
import clipramp.firing.RandomCircuits.Drawn;
import clipramp.firing.ReferenceHalf.Event;
import clipramp.firing.ReferenceHalf.Periodic;
import clipramp.firing.ReferenceHalf.Settling;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.DoubleStream;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestReporter;

/**
 * The engine against a general-purpose adaptive integrator of the same laws, on circuits drawn over the whole range
 * (DEVELOPERS.md, The circuit laws): every event time to 1e-6 of a half cycle, pulse energy to 1e-6 relative.
 */
class AgainstIntegratorTest {
    private static final int CIRCUITS = 300;
    private static final int COUPLED = 150;

    private static final int IDEAL = 12;
    /** Among so many none hunts: these do. */
    private static final long[] HUNTING = {1283, 1639, 1772, 3508, 3648, 3700};

    private static final double TIME_SHARE = 1e-6;
    private static final double ENERGY_SHARE = 1e-6;
    /** A circuit whose events come and go under this relative change stands on an edge that no solver can decide. */
    private static final double EDGE = 1e-9;

    private static final Comparator<Pulse> IN_TIME =
            Comparator.comparingDouble(Pulse::startSeconds).thenComparingDouble(Pulse::endSeconds);

    /** Worst that was seen, and the circuit that showed it. */
    private static final class Worst {
        private double value;
        private String where = "nowhere";

        void see(double seen, Drawn drawn) {
            if (!(seen <= value)) {
                value = seen;
                where = drawn.toString();
            }
        }

        @Override
        public String toString() {
            return String.format(Locale.ROOT, "%.2e at %s", value, where);
        }
    }

    private final Worst time = new Worst();
    private final Worst energy = new Worst();
    private final Worst eventTime = new Worst();

    @Test
    void everyEventAndEveryPulseAgreesWithTheIntegrator(TestReporter reporter) {
        judge(
                LongStream.concat(LongStream.range(0, CIRCUITS), LongStream.of(HUNTING))
                        .mapToObj(RandomCircuits::draw)
                        .toList(),
                reporter);
    }

    @Test
    void programmableDevicesAndPulseTransformersAgreeToo(TestReporter reporter) {
        judge(LongStream.range(0, COUPLED).mapToObj(RandomCircuits::drawCoupled).toList(), reporter);
    }

    @Test
    void windingsWithoutResistanceAgreeToo(TestReporter reporter) {
        List<Drawn> ideal = LongStream.range(0, IDEAL)
                .mapToObj(RandomCircuits::drawCoupled)
                .filter(drawn -> drawn.design().gate().transformer().isPresent())
                .map(RandomCircuits::withIdealWindings)
                .toList();
        judge(ideal, reporter);
    }

    private void judge(List<Drawn> circuits, TestReporter reporter) {
        List<String> failures = new ArrayList<>();
        List<String> onTheEdge = new ArrayList<>();
        for (Drawn drawn : circuits) {
            List<String> complaints = compare(drawn);
            if (!complaints.isEmpty()) {
                (isOnTheEdge(drawn) ? onTheEdge : failures).add(drawn + ": " + complaints);
            }
        }
        reporter.publishEntry("worst pulse time, of a half cycle", time.toString());
        reporter.publishEntry("worst event time, of a half cycle", eventTime.toString());
        reporter.publishEntry("worst pulse energy, relative", energy.toString());
        reporter.publishEntry("on the edge of an event", onTheEdge.toString());
        assertThat(failures).isEmpty();
        assertThat(onTheEdge).hasSizeLessThanOrEqualTo(circuits.size() / 50);
    }

    private List<String> compare(Drawn drawn) {
        List<String> complaints = new ArrayList<>();
        Periodic reference = ReferenceIntegrator.solve(drawn.design(), drawn.condition(), drawn.rampOhms());
        Solution solution;
        try {
            solution = Firing.solve(drawn.design(), drawn.condition(), drawn.rampOhms());
        } catch (ArithmeticException | IllegalStateException e) {
            return List.of("not solved: " + e.getMessage());
        }
        String settling = solution.settling().name();
        if (!settling.equals(reference.settling().name())) {
            return List.of("settles " + settling + ", integrator " + reference.settling());
        }
        if (reference.settling() == Settling.NEVER) {
            return List.of();
        }
        if (solution.halves().size() != reference.halves().size()) {
            return List.of("half cycles: " + solution.halves().size() + ", integrator "
                    + reference.halves().size());
        }
        comparePulses(drawn, solution, reference, complaints);
        compareHalves(solution, reference, drawn, complaints);
        compareEvents(drawn, reference, complaints);
        return complaints;
    }

    /** Pulse by pulse in the order of time: with a lagging winding the engine sorts them by the load's half cycles. */
    private void comparePulses(Drawn drawn, Solution solution, Periodic reference, List<String> complaints) {
        List<Pulse> found = solution.halves().stream()
                .flatMap(half -> half.pulses().stream())
                .sorted(IN_TIME)
                .toList();
        List<Pulse> expected = reference.halves().stream()
                .flatMap(half -> half.pulses().stream())
                .sorted(IN_TIME)
                .toList();
        if (found.size() != expected.size()) {
            complaints.add("pulses: " + found.size() + ", integrator " + expected.size());
            return;
        }
        double seconds = reference.halves().get(0).seconds();
        double largest = expected.stream().mapToDouble(Pulse::gateJoules).max().orElse(0);
        double given =
                expected.stream().mapToDouble(Pulse::capacitorJoules).max().orElse(0);
        for (int i = 0; i < found.size(); i++) {
            Pulse is = found.get(i);
            Pulse should = expected.get(i);
            double apart = Math.max(
                            Math.abs(is.startSeconds() - should.startSeconds()),
                            Math.max(
                                    Math.abs(is.endSeconds() - should.endSeconds()),
                                    Math.abs(is.aboveTriggerSeconds() - should.aboveTriggerSeconds())))
                    / seconds;
            time.see(apart, drawn);
            double joules = relative(is.gateJoules(), should.gateJoules(), 1e-9 * largest);
            joules = Math.max(joules, relative(is.capacitorJoules(), should.capacitorJoules(), 1e-6 * given));
            energy.see(joules, drawn);
            if (!(apart <= TIME_SHARE) || !(joules <= ENERGY_SHARE) || !sameVoltages(is, should)) {
                complaints.add("pulse " + i + difference(is, should));
            }
        }
    }

    private static boolean sameVoltages(Pulse is, Pulse should) {
        return Math.abs(is.supplyVolts() - should.supplyVolts()) < 1e-5
                && Math.abs(is.peakPointVolts() - should.peakPointVolts()) < 1e-5
                && relative(is.gateCoulombs(), should.gateCoulombs(), 1e-15) < 1e-6
                && relative(is.peakGateAmps(), should.peakGateAmps(), 1e-9) < 1e-4
                && relative(is.peakBaseOneVolts(), should.peakBaseOneVolts(), 1e-6) < 1e-4;
    }

    /** Every component that is not the same, the engine's first. */
    private static String difference(Pulse is, Pulse should) {
        StringBuilder text = new StringBuilder();
        try {
            for (RecordComponent component : Pulse.class.getRecordComponents()) {
                Object a = component.getAccessor().invoke(is);
                Object b = component.getAccessor().invoke(should);
                if (!a.equals(b)
                        && !(a instanceof Double x
                                && b instanceof Double y
                                && Math.abs(x - y) <= 1e-8 * Math.max(Math.abs(x), Math.abs(y)))) {
                    text.append(", ")
                            .append(component.getName())
                            .append(' ')
                            .append(a)
                            .append(" / ")
                            .append(b);
                }
            }
        } catch (ReflectiveOperationException e) {
            throw new AssertionError(e);
        }
        return text.toString();
    }

    private static double relative(double is, double should, double floor) {
        return Math.abs(is - should) / Math.max(Math.abs(should), floor + 1e-30);
    }

    /** What a half cycle says as a whole, where supply and load count the same half cycles. */
    private void compareHalves(Solution solution, Periodic reference, Drawn drawn, List<String> complaints) {
        boolean lags = drawn.design().clip().winding().map(w -> w.lagRad() != 0).orElse(false);
        for (ReferenceHalf should : reference.halves()) {
            HalfCycle is = solution.halves().stream()
                    .filter(half -> reference.halves().size() == 1
                            || reference.settling() == Settling.HUNTS
                            || half.positive() == should.positive())
                    .min(Comparator.comparingDouble(half -> Math.abs(half.startVolts() - should.startVolts())))
                    .orElseThrow();
            if (!(Math.abs(is.startVolts() - should.startVolts()) < 1e-6)
                    || !(Math.abs(is.endVolts() - should.endVolts()) < 1e-6)) {
                complaints.add("capacitor from " + is.startVolts() + " to " + is.endVolts() + ", integrator "
                        + should.startVolts() + " to " + should.endVolts());
            }
            if (is.stalled() != should.stalled()) {
                complaints.add("stalled " + is.stalled());
            }
            boolean sameSign =
                    reference.halves().size() > 1 || drawn.design().stage().isFullWave();
            if (!lags && sameSign && is.firingIndex() != should.firingIndex()) {
                complaints.add("fires with pulse " + is.firingIndex() + ", integrator " + should.firingIndex());
            }
            if (!lags && is.pulses().size() == should.pulses().size()) {
                for (int i = 0; i < is.pulses().size(); i++) {
                    compareFlags(is.pulses().get(i), should.pulses().get(i), sameSign, complaints);
                }
            }
        }
    }

    private static void compareFlags(Pulse is, Pulse should, boolean sameSign, List<String> complaints) {
        boolean turns = !sameSign || is.turnsOn() == should.turnsOn() && is.latches() == should.latches();
        double angle = Math.IEEEremainder(is.startRad() - should.startRad(), Math.PI);
        if (!turns
                || is.endPulse() != should.endPulse()
                || is.afterStall() != should.afterStall()
                || !(Math.abs(angle) < Math.PI * TIME_SHARE)) {
            complaints.add("flags or angle" + difference(is, should));
        }
    }

    /** Every event is a sample of the waveforms: rectifier, zener, gate junction, fire, valley, stall, release. */
    private void compareEvents(Drawn drawn, Periodic reference, List<String> complaints) {
        Waveforms waves = Firing.waveforms(drawn.design(), drawn.condition(), drawn.rampOhms(), 2);
        ReferenceHalf half = reference.halves().stream()
                .min(Comparator.comparingDouble(
                        h -> Math.abs(h.startVolts() - waves.rampVolts()[0]) + (h.positive() ? 0 : 1e-12)))
                .orElseThrow();
        for (Event event : half.events()) {
            double apart = DoubleStream.of(waves.seconds())
                            .map(t -> Math.abs(t - event.seconds()))
                            .min()
                            .orElse(Double.POSITIVE_INFINITY)
                    / half.seconds();
            eventTime.see(apart, drawn);
            if (!(apart <= TIME_SHARE)) {
                complaints.add(event + " is " + apart + " of a half cycle from the next event of the engine");
            }
        }
    }

    /** Whether the integrator itself sees events come or go, or leap, when one number moves in its ninth decimal. */
    private static boolean isOnTheEdge(Drawn drawn) {
        Condition c = drawn.condition();
        Periodic here = ReferenceIntegrator.solve(drawn.design(), c, drawn.rampOhms());
        for (double factor : new double[] {1 - EDGE, 1 + EDGE}) {
            Condition line = new Condition(c.lineVolts() * factor, c.lineHertz(), c.celsius());
            if (differ(here, ReferenceIntegrator.solve(drawn.design(), c, drawn.rampOhms() * factor))
                    || differ(here, ReferenceIntegrator.solve(drawn.design(), line, drawn.rampOhms()))) {
                return true;
            }
        }
        return false;
    }

    private static boolean differ(Periodic one, Periodic other) {
        if (one.settling() != other.settling()
                || one.halves().size() != other.halves().size()) {
            return true;
        }
        for (int h = 0; h < one.halves().size(); h++) {
            ReferenceHalf a = one.halves().get(h);
            ReferenceHalf b = other.halves().get(h);
            if (!a.shape().equals(b.shape())) {
                return true;
            }
            for (int i = 0; i < a.events().size(); i++) {
                if (Math.abs(a.events().get(i).seconds() - b.events().get(i).seconds()) > TIME_SHARE * a.seconds()) {
                    return true;
                }
            }
        }
        return false;
    }
}
