package clipramp.fit;

import clipramp.circuit.Design;
import java.util.Locale;
import java.util.Map;

/** Writes the readings that come with the examples: made up by the engine for a unit that was drawn, with noise. */
public final class ExampleReadings {
    private static final long SEED = 14;
    private static final Map<Meter, String> HEADS = Map.of(
            Meter.FIRING_ANGLE, "firing angle (deg) +-2 %",
            Meter.LOAD_TRUE_RMS, "load voltage (V true-rms) +-2 %",
            Meter.BASE_ONE_PEAK, "base-one peak (V) +-2 %",
            Meter.PEAK_POINT, "peak-point voltage (V) +-2 %");

    private ExampleReadings() {}

    public static void main(String[] arguments) {
        Design design = FitStudy.design("drying-cabinet");
        SyntheticBench bench = SyntheticBench.of(design, SEED, FitStudy.POSITIONS, FitStudy.METERS);
        System.out.print(
                "# Readings of one drying cabinet's lower heater. Nobody took them: the program's own engine made"
                        + " them up for a unit\r\n# drawn within its tolerances, and put 1 % of noise on them, 0.5 % on the knob."
                        + " They show what fit does, not how true it is.\r\n");
        System.out.print("knob (%) +-1,line voltage (V) +-2 %");
        FitStudy.METERS.forEach(meter -> System.out.print("," + HEADS.get(meter)));
        System.out.print("\r\n");
        for (BenchLine line : bench.readings.lines()) {
            System.out.print(text(100 * line.setting().value(), 1));
            System.out.print("," + text(line.lineVolts().orElseThrow().volts(), 1));
            for (Reading reading : line.readings()) {
                boolean angle = reading.meter() == Meter.FIRING_ANGLE;
                System.out.print("," + text(angle ? Math.toDegrees(reading.value()) : reading.value(), angle ? 1 : 2));
            }
            System.out.print("\r\n");
        }
        System.out.println();
        for (int k = 0; k < bench.truth.length; k++) {
            System.err.println(bench.unknowns.get(k).path() + " " + bench.truth[k]);
        }
    }

    private static String text(double value, int decimals) {
        return String.format(Locale.ROOT, "%." + decimals + "f", value);
    }
}
