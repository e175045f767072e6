package clipramp.cli;

import clipramp.cli.TextTable.Align;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.power.OperatingPoint;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/** The knob table for people: from the shaft to the load, one line a position. */
final class KnobText {
    private KnobText() {}

    static List<String> lines(List<OperatingPoint> points, Spelling spelling) {
        Shown.Scale ramp = Shown.scaleFor(largest(points, OperatingPoint::rampOhms), Unit.OHM);
        Shown.Scale watts = Shown.scaleFor(largest(points, p -> p.load().watts()), Unit.WATT);
        TextTable table = new TextTable(spelling, "  ")
                .column(Align.DECIMAL, "knob", "%")
                .column(Align.DECIMAL, "R_E", ramp.unit())
                .column(Align.DECIMAL, "delay", "ms")
                .column(Align.DECIMAL, "fires", "deg")
                .column(Align.DECIMAL, "conducts", "deg")
                .column(Align.DECIMAL, "load", "V")
                .column(Align.DECIMAL, "load", "A")
                .column(Align.DECIMAL, "load", watts.unit())
                .column(Align.DECIMAL, "share", "%")
                .column(Align.RIGHT, "pulses", "")
                .column(Align.LEFT, "state", "");
        points.forEach(point -> table.row(row(point, ramp, watts)));
        List<String> lines = new ArrayList<>(table.lines());
        lines.addAll(unequalHalves(points));
        return lines;
    }

    private static List<String> row(OperatingPoint point, Shown.Scale ramp, Shown.Scale watts) {
        HalfCycle half = point.solution().shown();
        Optional<Pulse> pulse = half.shownPulse();
        return List.of(
                position(point.position()),
                ramp.of(point.rampOhms()),
                Shown.fixed(1e3 * pulse.map(Pulse::startSeconds).orElse(Double.NaN), 3),
                Shown.degrees(pulse.stream().mapToDouble(Pulse::startRad).findFirst()),
                Shown.fixed(Math.toDegrees(point.load().conductionRad()), 1),
                Shown.fixed(point.load().rmsVolts(), 1),
                Shown.fixed(point.load().rmsAmps(), 2),
                watts.of(point.load().watts()),
                Shown.fixed(100 * point.load().fraction(), 1),
                Integer.toString(half.pulses().size()),
                state(point));
    }

    /** Whole percents where they are whole. */
    static String position(OptionalDouble position) {
        if (position.isEmpty()) {
            return "fixed";
        }
        double percent = 100 * position.getAsDouble();
        return Shown.fixed(percent, Math.abs(percent - Math.rint(percent)) < 1e-9 ? 0 : 1);
    }

    /** The state in words, and whether the thyristor stays on. */
    private static String state(OperatingPoint point) {
        String state = state(point.solution());
        int missed = point.load().missedHalves();
        return missed == 0
                ? state
                : state + ", misses " + missed + " of " + point.load().halfCycles() + " half cycles";
    }

    static String state(Solution solution) {
        String state = solution.state().word();
        Optional<Pulse> pulse = solution.shown().shownPulse();
        if (pulse.isPresent() && !pulse.get().turnsOn()) {
            return state + ", stays off";
        }
        return pulse.isPresent() && !pulse.get().latches() ? state + ", does not latch" : state;
    }

    /** One line for every position whose half cycles differ. */
    private static List<String> unequalHalves(List<OperatingPoint> points) {
        List<String> lines = new ArrayList<>();
        for (OperatingPoint point : points) {
            List<HalfCycle> halves = point.solution().halves();
            if (halves.size() > 1) {
                List<String> angles = halves.stream()
                        .map(h -> Shown.degrees(h.shownPulse().stream()
                                .mapToDouble(Pulse::startRad)
                                .findFirst()))
                        .toList();
                lines.add("  half cycles differ at " + position(point.position()) + " %: "
                        + String.join(" and ", angles) + "°, dc in the line "
                        + Shown.amount(point.load().dcAmps(), Unit.AMPERE));
            }
        }
        return lines;
    }

    private static double largest(List<OperatingPoint> points, ToDoubleFunction<OperatingPoint> figure) {
        return points.stream()
                .mapToDouble(figure)
                .filter(Double::isFinite)
                .max()
                .orElse(0);
    }
}
