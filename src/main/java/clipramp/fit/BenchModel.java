package clipramp.fit;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Pot;
import clipramp.circuit.RefusedCircuit;
import clipramp.engine.Network;
import clipramp.firing.Firing;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import java.util.List;
import java.util.Optional;

/** What the instruments would show of a supposed unit. One thread at a time. */
final class BenchModel {
    /** An average-reading instrument is marked in rms of a sine: pi / (2 sqrt 2) times the mean of its magnitude. */
    static final double AVERAGE_TO_SINE_RMS = Math.PI / (2 * Math.sqrt(2));

    private final Design design;
    private final Network network = new Network();

    BenchModel(Design design) {
        this.design = design;
    }

    /**
     * @param unit the supposed unit
     * @param line what was set there, and which instruments
     * @param settingOff how far the setting was off, in its own standard deviations
     * @param lineOff how far the line voltage was off, in its own standard deviations
     * @return one value for each reading of the line, in its order, SI
     */
    double[] shown(TriedUnit unit, BenchLine line, double settingOff, double lineOff) {
        List<Reading> readings = line.readings();
        double[] shown = new double[readings.size()];
        double volts = line.lineVolts()
                .map(v -> v.volts() + lineOff * v.accuracy().deviation(v.volts()))
                .orElse(unit.lineVolts);
        double ohms = rampOhms(unit, line.setting(), settingOff);
        Condition condition = new Condition(volts, design.line().hertz(), unit.values.celsius);
        Optional<Solution> solution = solved(unit, condition, ohms, line);
        boolean load = readings.stream().anyMatch(reading -> isOfLoad(reading.meter()));
        Optional<LoadResult> result = solution.filter(s -> load).map(s -> LoadPower.of(design, condition, s));
        Optional<Pulse> pulse = solution.flatMap(s -> s.shown().shownPulse());
        for (int i = 0; i < shown.length; i++) {
            shown[i] = shown(readings.get(i).meter(), ohms, condition, pulse, result);
        }
        return shown;
    }

    /** A unit whose figures contradict themselves shows nothing, as a silent one. */
    private Optional<Solution> solved(TriedUnit unit, Condition condition, double ohms, BenchLine line) {
        if (line.readings().stream().allMatch(reading -> reading.meter() == Meter.RAMP_OHMS)) {
            return Optional.empty();
        }
        try {
            unit.values.fill(network, ohms);
            return Optional.of(Firing.solve(design, condition, network));
        } catch (RefusedCircuit contradiction) {
            return Optional.empty();
        }
    }

    private static boolean isOfLoad(Meter meter) {
        return meter == Meter.LOAD_TRUE_RMS || meter == Meter.LOAD_AVERAGE_READING || meter == Meter.LOAD_WATTS;
    }

    /** A pulse that does not come is one at the end of the half cycle, so that a trial without it can be improved on. */
    private double shown(
            Meter meter, double ohms, Condition condition, Optional<Pulse> pulse, Optional<LoadResult> load) {
        return switch (meter) {
            case FIRING_ANGLE -> pulse.map(Pulse::startRad).orElse(Math.PI);
            case DELAY -> pulse.map(Pulse::startSeconds).orElse(condition.halfCycleSeconds());
            case LOAD_TRUE_RMS -> load.map(LoadResult::rmsVolts).orElse(0.0);
            case LOAD_AVERAGE_READING -> load.map(BenchModel::averageReading).orElse(0.0);
            case LOAD_WATTS -> load.map(LoadResult::watts).orElse(0.0);
            case BASE_ONE_PEAK -> pulse.map(Pulse::peakBaseOneVolts).orElse(0.0);
            case SUPPLY -> pulse.map(Pulse::supplyVolts).orElse(0.0);
            case PEAK_POINT -> pulse.map(Pulse::peakPointVolts).orElse(0.0);
            case RAMP_OHMS -> ohms;
        };
    }

    /** Voltage follows current in a resistor, and in a filament within a half cycle, so both have one form factor. */
    private static double averageReading(LoadResult load) {
        return load.rmsVolts() == 0 ? 0 : AVERAGE_TO_SINE_RMS * load.rmsVolts() / load.formFactor();
    }

    private double rampOhms(TriedUnit unit, Setting setting, double off) {
        double moved = setting.value() + off * setting.accuracy().deviation(setting.value());
        return switch (setting.kind()) {
            case FIXED -> unit.values.rampOhms(0);
            case RAMP_OHMS -> Math.max(setting.value() / 10, moved);
            case KNOB -> unit.values.rampOhms(trackShare(unit, moved));
        };
    }

    private double trackShare(TriedUnit unit, double position) {
        Pot pot = design.ramp().pot().orElseThrow();
        double within = Math.min(1, Math.max(0, position));
        if (Double.isNaN(unit.halfShare)) {
            return pot.trackShare(within);
        }
        double turned = pot.sense() == Pot.Sense.RISING ? within : 1 - within;
        return FitResult.lawOf(unit.halfShare).share(turned);
    }
}
