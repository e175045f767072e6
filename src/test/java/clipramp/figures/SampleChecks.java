package clipramp.figures;

import clipramp.circuit.Design;
import clipramp.firing.Dissipation;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.firing.Waveforms;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import clipramp.margins.LineCheck;
import clipramp.margins.Margin;
import clipramp.margins.MarginKind;
import clipramp.margins.Note;
import clipramp.margins.Verdict;
import clipramp.power.LoadResult;
import clipramp.power.OperatingPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Results that look like a solved design's, made from the textbook form of the ramp: what figures and record show is
 * tested without the engine. Nothing here is a check of the circuit.
 */
public final class SampleChecks {
    private static final double STANDOFF = 0.655;
    private static final double CLIPPED = 20;

    private SampleChecks() {}

    /** A judged design with the verdict of its worst margin. */
    public static Check check(Design design, Verdict worst) {
        List<OperatingPoint> knob = new ArrayList<>();
        for (int i = 0; i <= 10; i++) {
            knob.add(point(design, i / 10.0));
        }
        Pulse pulse = knob.get(5).solution().shown().pulses().get(0);
        return new Check(
                design,
                design.nominalCondition(),
                knob,
                Optional.of(new Check.PulseSummary(OptionalDouble.of(0.5), pulse, 5.1e-5, 0.127)),
                dissipation(),
                OptionalDouble.of(Math.toRadians(4.1)),
                margins(worst),
                worst,
                List.of(
                        new Note(
                                "self-heating",
                                "Self-heating of the trigger device is left out (model); it would be about 10 K."),
                        new Note("valley", "The valley voltage is on no data sheet; 2 V is common practice.")),
                Optional.empty(),
                Optional.empty());
    }

    /** The line current of a design as the judge tells it. */
    public static LineCheck lineCurrent(Design design) {
        return Judge.check(design, OptionalDouble.empty(), OptionalDouble.empty())
                .lineCurrent()
                .orElseThrow();
    }

    public static OperatingPoint point(Design design, double position) {
        double rampOhms = design.ramp().rampOhms(position);
        double rad = firingRad(design, rampOhms);
        boolean fires = rad < Math.PI;
        double fraction = fires ? 1 - rad / Math.PI + Math.sin(2 * rad) / (2 * Math.PI) : 0;
        double ohms = design.load().resistanceOhms();
        double volts = design.line().volts() * Math.sqrt(fraction);
        Pulse pulse = pulse(rad, design.line().hertz());
        HalfCycle half = new HalfCycle(
                true,
                0.5 / design.line().hertz(),
                0.52,
                0.52,
                OptionalDouble.of(Math.toRadians(4.1)),
                Math.toRadians(175),
                false,
                false,
                fires ? List.of(pulse) : List.of(),
                fires ? 0 : -1);
        Solution solution = new Solution(design.nominalCondition(), rampOhms, Solution.Settling.STEADY, List.of(half));
        LoadResult load = new LoadResult(
                volts * volts / ohms,
                fraction,
                volts,
                volts / ohms,
                volts / ohms * 0.8,
                design.line().volts() * Math.sqrt(2) / ohms,
                0,
                1.2,
                1.6,
                Math.sqrt(fraction),
                fires ? Math.PI - rad : 0,
                volts / ohms * 0.4,
                volts / ohms * 0.7,
                4.2,
                List.of(volts * volts / ohms),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                0,
                2,
                true,
                OptionalDouble.empty());
        return new OperatingPoint(OptionalDouble.of(position), solution, load);
    }

    /** RC ln(1/(1-eta)) as an angle. */
    public static double firingRad(Design design, double rampOhms) {
        double seconds = rampOhms * design.ramp().capacitor().value() * Math.log(1 / (1 - STANDOFF));
        return 2 * Math.PI * design.line().hertz() * seconds;
    }

    private static Pulse pulse(double rad, double hertz) {
        double seconds = rad / (2 * Math.PI * hertz);
        return new Pulse(
                rad,
                seconds,
                seconds + 25e-6,
                19.9,
                13.4,
                false,
                false,
                0.147,
                2.17,
                0.319,
                5.2,
                14e-6,
                1.6e-6,
                2.1e-6,
                8.5e-6,
                true,
                0.9,
                true);
    }

    private static Dissipation dissipation() {
        return new Dissipation(
                4.57, 324, 0.21, 0.03, 0.004, 0.003, 0, 0.002, 0.031, 0.012, 0.41, 6.8, 19.6, 13.4, 1.1e-4, 0, 2e-6);
    }

    /** Every verdict once and a long formula, worst first, none worse than asked. */
    public static List<Margin> margins(Verdict worst) {
        List<Margin> margins = new ArrayList<>();
        double[] ratios = {0.72, 1.08, 1.63, 2.4, 3.2, 11};
        for (double ratio : ratios) {
            Verdict verdict = ratio < 1 ? Verdict.FAILS : ratio < 1.2 ? Verdict.TIGHT : Verdict.HOLDS;
            if (verdict.compareTo(worst) <= 0) {
                margins.add(margin(ratio, verdict));
            }
        }
        margins.add(new Margin(
                MarginKind.values()[0],
                Double.NaN,
                Double.NaN,
                "A",
                Margin.Sense.AT_LEAST,
                OptionalDouble.empty(),
                1,
                "",
                Verdict.NOT_JUDGED,
                "the profile gives no latching current",
                "profile scr-16a",
                "add latching to the profile",
                List.of("thyristor.device")));
        return margins;
    }

    private static Margin margin(double ratio, Verdict verdict) {
        return new Margin(
                MarginKind.values()[0],
                0.09,
                0.09 * ratio,
                "A",
                Margin.Sense.AT_LEAST,
                OptionalDouble.of(ratio),
                1.2,
                "low line, 0 °C",
                verdict,
                "i_G = (V_P − V_D − ξ V_S)/(r_on + R1 ∥ (R_G + r_G)) = (13.4 V − 0.47 V − 1.1 V)/(38 Ω + 8.2 Ω) ≥ 3 × I_GT(0 °C)"
                        + " = 3 × 30 mA with the typical gate held at V_GT, α = 72.4°, η = 0.655, t = 20 µs",
                "model section 7; data sheet of the thyristor; overdrive 3 is common practice",
                "a larger ramp.capacitor, a smaller trigger.base-one or a trigger with a larger V_OB1 raises it",
                List.of("ramp.capacitor", "trigger.base-one"));
    }

    /** Lanes of a full-wave circuit at a knob position, or of a half-wave one over the period. */
    public static Lanes lanes(Design design, double position) {
        double rampOhms = design.ramp().rampOhms(position);
        double firing = firingRad(design, rampOhms);
        boolean fullWave = design.stage().isFullWave();
        double span = fullWave ? Math.PI : 2 * Math.PI;
        int n = 2401;
        double[][] w = new double[12][n];
        double crest = design.line().volts() * Math.sqrt(2);
        double omega = 2 * Math.PI * design.line().hertz();
        double tau = rampOhms * design.ramp().capacitor().value();
        double ramp = 0.5;
        double sincePulse = 1;
        for (int i = 0; i < n; i++) {
            double rad = span * i / (n - 1);
            double line = crest * Math.sin(rad);
            double supply = Math.min(CLIPPED, Math.max(0, fullWave ? Math.abs(line) : line) * 0.4);
            double peak = STANDOFF * supply + 0.47;
            double step = span / (n - 1) / omega;
            sincePulse += step;
            ramp += (supply - ramp) * (1 - Math.exp(-step / tau));
            if (ramp >= peak) {
                ramp = supply > 5 ? 2 : peak;
                sincePulse = supply > 5 ? 0 : 1;
            }
            w[0][i] = rad;
            w[1][i] = rad / omega;
            w[2][i] = line;
            w[3][i] = supply;
            w[4][i] = ramp;
            w[5][i] = peak;
            w[8][i] = sincePulse < 30e-6 ? 0.147 * Math.exp(-sincePulse / 8e-6) : 0;
            w[7][i] = w[8][i] > 0 ? 0.7 + 10 * w[8][i] : 0;
        }
        Waveforms waves = new Waveforms(w[0], w[1], w[2], w[3], w[4], w[5], w[6], w[7], w[8], w[9], w[10], w[11]);
        double end = Math.PI;
        double[] loadRad = firing < end ? angles(firing, end, span) : new double[] {0, span};
        double[] loadVolts = new double[loadRad.length];
        for (int i = 0; i < loadRad.length; i++) {
            boolean on = loadRad.length > 2 && i >= 2 && loadRad[i] <= end;
            loadVolts[i] = on ? crest * Math.sin(loadRad[i]) - 2.8 : 0;
        }
        return new Lanes(
                waves,
                loadRad,
                loadVolts,
                firing < Math.PI ? OptionalDouble.of(firing) : OptionalDouble.empty(),
                design.line().hertz());
    }

    private static double[] angles(double firing, double end, double span) {
        int n = 200;
        double[] rad = new double[n + 4];
        rad[1] = firing;
        for (int i = 0; i < n; i++) {
            rad[i + 2] = firing + (end - 0.01 - firing) * i / (n - 1);
        }
        rad[n + 2] = end + 1e-9;
        rad[n + 3] = Math.max(span, end + 1e-9);
        return rad;
    }
}
