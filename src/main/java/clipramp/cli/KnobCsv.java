package clipramp.cli;

import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.power.OperatingPoint;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** The knob map as comma-separated values, every unit in the header. */
final class KnobCsv {
    private KnobCsv() {}

    static String of(List<OperatingPoint> points) {
        Csv csv = new Csv()
                .words(List.of(
                        "knob (%)",
                        "ramp resistance (ohm)",
                        "delay (s)",
                        "firing angle (deg)",
                        "conduction angle (deg)",
                        "load voltage (V rms)",
                        "load current (A rms)",
                        "load power (W)",
                        "share of full power (%)",
                        "pulses per half cycle",
                        "state",
                        "latches",
                        "end pulse (deg)",
                        "current from (deg)",
                        "current until (deg)",
                        "missed half cycles",
                        "direct current (A)",
                        "light (% of rated)"));
        points.forEach(point -> csv.words(row(point)));
        return csv.text();
    }

    private static List<String> row(OperatingPoint point) {
        HalfCycle half = point.solution().shown();
        Optional<Pulse> pulse = half.shownPulse();
        return List.of(
                Csv.number(100 * point.position().orElse(Double.NaN)),
                Csv.number(point.rampOhms()),
                figure(pulse, Pulse::startSeconds),
                figure(pulse, p -> Math.toDegrees(p.startRad())),
                Csv.number(Math.toDegrees(point.load().conductionRad())),
                Csv.number(point.load().rmsVolts()),
                Csv.number(point.load().rmsAmps()),
                Csv.number(point.load().watts()),
                Csv.number(100 * point.load().fraction()),
                Csv.number(half.pulses().size()),
                point.solution().state().word(),
                pulse.map(Pulse::latches).orElse(false) ? "yes" : "no",
                figure(half.endPulse(), p -> Math.toDegrees(p.startRad())),
                Csv.number(Math.toDegrees(point.load().firedRad().orElse(Double.NaN))),
                Csv.number(Math.toDegrees(point.load().extinctionRad().orElse(Double.NaN))),
                Csv.number(point.load().missedHalves()),
                Csv.number(point.load().dcAmps()),
                Csv.number(100 * point.load().lightShare().orElse(Double.NaN)));
    }

    private static String figure(Optional<Pulse> pulse, ToDoubleFunction<Pulse> figure) {
        return pulse.map(p -> Csv.number(figure.applyAsDouble(p))).orElse("");
    }
}
