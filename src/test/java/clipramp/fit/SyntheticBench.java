package clipramp.fit;

import clipramp.circuit.Design;
import clipramp.fit.BenchLine.LineVolts;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;

/**
 * A unit drawn from its tolerances and read by instruments with noise. The engine makes the readings, so a fit to them says
 * how well the estimation works and nothing about how true the engine is to a real circuit.
 */
final class SyntheticBench {
    /** Standard deviation of the noise, as a share of the reading. */
    static final double NOISE = 0.01;

    private static final Accuracy STATED = Accuracy.share(NOISE * Accuracy.SIGMAS);
    private static final double KNOB_NOISE = 0.005;

    final List<Unknown> unknowns;
    final double[] truth;
    final Readings readings;

    private SyntheticBench(List<Unknown> unknowns, double[] truth, Readings readings) {
        this.unknowns = unknowns;
        this.truth = truth;
        this.readings = readings;
    }

    /**
     * @param positions how many knob positions, from 5 % to 95 %
     * @param meters what is read at each
     */
    static SyntheticBench of(Design design, long seed, int positions, List<Meter> meters) {
        Random random = new Random(seed);
        Readings wanted = plan(positions, meters);
        List<Unknown> unknowns = Unknowns.of(design, wanted);
        double[] truth = new double[unknowns.size()];
        TriedUnit unit = new TriedUnit(design, 25);
        for (int k = 0; k < truth.length; k++) {
            Unknown unknown = unknowns.get(k);
            // Uniform between the limits: no kinder to a prior that is normal than a normal would be.
            truth[k] = unknown.low() + random.nextDouble() * (unknown.high() - unknown.low());
            unknown.slot().set(unit, truth[k]);
        }
        BenchModel model = new BenchModel(design);
        List<BenchLine> lines = new ArrayList<>();
        for (BenchLine line : wanted.lines()) {
            double[] shown = model.shown(unit, trueLine(line, unit), 0, 0);
            List<Reading> read = new ArrayList<>();
            for (int r = 0; r < shown.length; r++) {
                Meter meter = line.readings().get(r).meter();
                read.add(new Reading(meter, shown[r] * (1 + NOISE * random.nextGaussian()), STATED, meter.words()));
            }
            double dial = Math.max(0, Math.min(1, line.setting().value() + KNOB_NOISE * random.nextGaussian()));
            Setting setting =
                    new Setting(Setting.Kind.KNOB, dial, Accuracy.amount(KNOB_NOISE * Accuracy.SIGMAS), "knob (%)");
            double volts = design.line().volts() * (1 + NOISE * random.nextGaussian());
            lines.add(new BenchLine(
                    line.line(), setting, Optional.of(new LineVolts(volts, STATED, "line voltage (V)")), read));
        }
        return new SyntheticBench(unknowns, truth, new Readings("made up", 25, lines));
    }

    private static BenchLine trueLine(BenchLine line, TriedUnit unit) {
        return new BenchLine(
                line.line(),
                line.setting(),
                Optional.of(new LineVolts(unit.lineVolts, STATED, "line voltage (V)")),
                line.readings());
    }

    private static Readings plan(int positions, List<Meter> meters) {
        List<BenchLine> lines = new ArrayList<>();
        for (int p = 0; p < positions; p++) {
            Setting setting =
                    new Setting(Setting.Kind.KNOB, 0.05 + 0.9 * p / (positions - 1), Setting.USUAL_KNOB, "knob (%)");
            List<Reading> read = meters.stream()
                    .map(meter -> new Reading(meter, 1, STATED, meter.words()))
                    .toList();
            lines.add(new BenchLine(p + 2, setting, Optional.of(new LineVolts(230, STATED, "line voltage (V)")), read));
        }
        return new Readings("plan", 25, lines);
    }

    /** The same readings with one of them off by a factor. */
    Readings withGrossError(int line, int reading, double factor) {
        List<BenchLine> lines = new ArrayList<>(readings.lines());
        BenchLine hit = lines.get(line);
        List<Reading> read = new ArrayList<>(hit.readings());
        Reading good = read.get(reading);
        read.set(reading, new Reading(good.meter(), good.value() * factor, good.accuracy(), good.column()));
        lines.set(line, new BenchLine(hit.line(), hit.setting(), hit.lineVolts(), read));
        return new Readings(readings.name(), readings.celsius(), lines);
    }

    double truth(String path) {
        for (int k = 0; k < truth.length; k++) {
            if (unknowns.get(k).path().equals(path)) {
                return truth[k];
            }
        }
        throw new IllegalArgumentException(path);
    }
}
