package clipramp.files;

import clipramp.circuit.Line.Harmonic;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.interpolation.SplineInterpolator;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.transform.DftNormalization;
import org.apache.commons.math3.transform.FastFourierTransformer;
import org.apache.commons.math3.transform.TransformType;

/**
 * A recorded line cycle, time in seconds and volts, reduced to a fundamental and harmonics: one period from the first
 * sample on, drawn through by a cubic spline, sampled evenly and transformed. Kept are orders to 40 of a thousandth of the
 * fundamental or more; what was left out is said.
 *
 * @param rmsVolts rms of the fundamental, V
 * @param harmonics what is kept, phases at the fundamental's positive-going zero
 * @param leftOut what was left out, as a sentence
 */
record RecordedLine(double rmsVolts, List<Harmonic> harmonics, String leftOut) {
    private static final int POINTS = 4096;
    private static final int HIGHEST_ORDER = 40;
    private static final int SAMPLES_PER_ORDER = 5;
    private static final int LEAST_SAMPLES = 40;
    private static final double LEAST_SHARE = 1e-3;

    /** Times beyond this, from the recorder's start on, leave too few digits within one period. */
    private static final double MOST_SECONDS = 1000;

    private static final double MOST_VOLTS = 100_000;

    /**
     * @param text lines of time and volts, with or without a heading; comma, semicolon or tab between
     * @param hertz the line's frequency, Hz
     * @throws IllegalArgumentException with what is wrong with the recording
     */
    static RecordedLine of(String text, double hertz) {
        List<double[]> samples = samples(text);
        double period = 1 / hertz;
        double from = samples.get(0)[0];
        List<double[]> cycle =
                samples.stream().filter(s -> s[0] < from + period * (1 - 1e-9)).toList();
        double step = (cycle.get(cycle.size() - 1)[0] - from) / Math.max(1, cycle.size() - 1);
        if (cycle.size() < LEAST_SAMPLES || from + period - cycle.get(cycle.size() - 1)[0] > 2.5 * step) {
            throw new IllegalArgumentException("holds " + cycle.size() + " samples of the first "
                    + QuantityText.format(period, Unit.SECOND, 4)
                    + "; needed is one whole period of line.frequency with "
                    + LEAST_SAMPLES + " samples or more, evenly spread");
        }
        return reduced(evenly(cycle, from, period), cycle.size());
    }

    private static List<double[]> samples(String text) {
        List<double[]> samples = new ArrayList<>();
        List<String> lines = text.lines()
                .map(String::strip)
                .filter(l -> !l.isEmpty() && !l.startsWith("#"))
                .toList();
        for (int i = 0; i < lines.size(); i++) {
            String[] fields = lines.get(i).split("[,;\t]", -1);
            try {
                double[] sample = {
                    number(fields[0], MOST_SECONDS, "seconds", i + 1), number(fields[1], MOST_VOLTS, "volts", i + 1)
                };
                if (!samples.isEmpty() && !(sample[0] > samples.get(samples.size() - 1)[0])) {
                    throw new IllegalArgumentException("row " + (i + 1) + ": time does not grow");
                }
                samples.add(sample);
            } catch (NumberFormatException | ArrayIndexOutOfBoundsException e) {
                if (i > 0) {
                    throw new IllegalArgumentException(
                            "row " + (i + 1) + ": read \"" + lines.get(i) + "\"; expected time in s and volts", e);
                }
            }
        }
        if (samples.isEmpty()) {
            throw new IllegalArgumentException("holds no sample; expected rows of time in s and volts");
        }
        return samples;
    }

    private static double number(String field, double most, String of, int row) {
        double value = Double.parseDouble(field.strip());
        if (!(Math.abs(value) <= most)) {
            throw new IllegalArgumentException("row " + row + ": read " + field.strip() + " " + of + "; expected "
                    + QuantityText.number(-most, 6) + ".." + QuantityText.number(most, 6));
        }
        return value;
    }

    /** The cycle with its beginning repeated at its end and a little of its end before its beginning. */
    private static double[] evenly(List<double[]> cycle, double from, double period) {
        int around = Math.min(8, cycle.size());
        List<double[]> wrapped = new ArrayList<>();
        for (double[] s : cycle.subList(cycle.size() - around, cycle.size())) {
            wrapped.add(new double[] {s[0] - period, s[1]});
        }
        wrapped.addAll(cycle);
        for (double[] s : cycle.subList(0, around)) {
            wrapped.add(new double[] {s[0] + period, s[1]});
        }
        UnivariateFunction spline = new SplineInterpolator()
                .interpolate(
                        wrapped.stream().mapToDouble(s -> s[0]).toArray(),
                        wrapped.stream().mapToDouble(s -> s[1]).toArray());
        double[] even = new double[POINTS];
        Arrays.setAll(even, i -> spline.value(from + period * i / POINTS));
        return even;
    }

    private static RecordedLine reduced(double[] even, int sampleCount) {
        Complex[] spectrum =
                new FastFourierTransformer(DftNormalization.STANDARD).transform(even, TransformType.FORWARD);
        double amplitude = 2 * spectrum[1].abs() / POINTS;
        if (!(amplitude > 0)) {
            throw new IllegalArgumentException("holds no fundamental of line.frequency");
        }
        // v = sum of |c| cos(k x + arg) = sum of |c| sin(k x + arg + 90 degrees), x from the first sample.
        double shift = spectrum[1].getArgument() + Math.PI / 2;
        int highest = Math.min(HIGHEST_ORDER, sampleCount / SAMPLES_PER_ORDER);
        List<Harmonic> kept = new ArrayList<>();
        double rest = Arrays.stream(even).map(v -> v * v).sum() / POINTS - amplitude * amplitude / 2;
        for (int order = 2; order <= highest; order++) {
            double share = 2 * spectrum[order].abs() / POINTS / amplitude;
            if (share >= LEAST_SHARE && share <= 1) {
                double phase = spectrum[order].getArgument() + Math.PI / 2 - order * shift;
                kept.add(new Harmonic(order, share, Math.IEEEremainder(phase, 2 * Math.PI)));
                rest -= share * share * amplitude * amplitude / 2;
            }
        }
        double direct = spectrum[0].getReal() / POINTS;
        String leftOut = "The recorded line is kept as its fundamental and " + kept.size() + " harmonics to order "
                + highest
                + "; left out: "
                + QuantityText.format(Math.sqrt(Math.max(0, rest)) / (amplitude / Math.sqrt(2)), Unit.FRACTION, 3)
                + " of the fundamental, of it a direct voltage of " + QuantityText.format(direct, Unit.VOLT, 3) + ".";
        return new RecordedLine(amplitude / Math.sqrt(2), kept, leftOut);
    }
}
