package clipramp.cli;

import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.power.LoadResult;
import clipramp.power.OperatingPoint;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** A row of the knob table for machines: volts, amperes, watts, seconds and degrees. */
final class KnobJson {
    private KnobJson() {}

    static void write(Json json, OperatingPoint point) {
        Solution solution = point.solution();
        HalfCycle shown = solution.shown();
        Optional<Pulse> pulse = shown.shownPulse();
        LoadResult load = point.load();
        json.put("position", point.position())
                .put("rampOhms", point.rampOhms())
                .put("firingDeg", degrees(pulse, Pulse::startRad))
                .put("delaySeconds", figure(pulse, Pulse::startSeconds))
                .put("conductionDeg", Math.toDegrees(load.conductionRad()))
                .put("loadVolts", load.rmsVolts())
                .put("loadAmps", load.rmsAmps())
                .put("loadWatts", load.watts())
                .put("powerFraction", load.fraction())
                .put("pulsesPerHalfCycle", shown.pulses().size())
                .put("state", solution.state().word())
                .put("latches", pulse.isPresent() && pulse.get().latches())
                .put("endPulseDeg", degrees(shown.endPulse(), Pulse::startRad));
        writeFirstPulse(json, shown);
        json.put("dcAmps", load.dcAmps())
                .put("currentFromDeg", Math.toDegrees(load.firedRad().orElse(Double.NaN)))
                .put("currentUntilDeg", Math.toDegrees(load.extinctionRad().orElse(Double.NaN)))
                .put("missedHalfCycles", load.missedHalves())
                .put("ofHalfCycles", load.halfCycles())
                .put("powerFactor", load.powerFactor())
                .put("lightShare", load.lightShare());
        writeHalves(json, solution, load);
    }

    private static void writeHalves(Json json, Solution solution, LoadResult load) {
        int[] next = {0};
        json.putObjects("halves", solution.halves(), (half, h) -> {
            int index = next[0]++;
            double watts = index < load.halfWatts().size() ? load.halfWatts().get(index) : Double.NaN;
            half.put("positive", h.positive())
                    .put("firingDeg", degrees(h.shownPulse(), Pulse::startRad))
                    .put("loadWatts", watts)
                    .put("stalled", h.stalled())
                    .put("endPulse", h.endPulse().isPresent())
                    .put("pulses", h.pulses().size());
            writeFirstPulse(half, h);
            Optional<Pulse> first = h.pulses().stream().findFirst();
            half.put("peakGateAmps", figure(first, Pulse::peakGateAmps))
                    .put("peakGateVolts", figure(first, Pulse::peakGateVolts))
                    .put("peakBaseOneVolts", figure(first, Pulse::peakBaseOneVolts))
                    .put("gateJoules", figure(first, Pulse::gateJoules))
                    .put("gateCoulombs", figure(first, Pulse::gateCoulombs));
        });
    }

    /** The residual voltage of the half cycle, with peak point and supply at its first pulse. */
    private static void writeFirstPulse(Json json, HalfCycle half) {
        Optional<Pulse> first = half.pulses().stream().findFirst();
        json.put("residualVolts", residualVolts(half))
                .put("peakPointVolts", figure(first, Pulse::peakPointVolts))
                .put("supplyVolts", figure(first, Pulse::supplyVolts));
    }

    /** What is left on the ramp capacitor at the line zero from which this half cycle's ramp starts, V. */
    static double residualVolts(HalfCycle half) {
        return half.startVolts();
    }

    private static double degrees(Optional<Pulse> pulse, ToDoubleFunction<Pulse> angleRad) {
        return Math.toDegrees(figure(pulse, angleRad));
    }

    private static double figure(Optional<Pulse> pulse, ToDoubleFunction<Pulse> figure) {
        return pulse.isPresent() ? figure.applyAsDouble(pulse.get()) : Double.NaN;
    }
}
