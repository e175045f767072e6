package clipramp.cli;

import clipramp.firing.Waveforms;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;

/** The waveforms of a trace: key for machines, heading with unit, and where the samples are. */
enum TraceColumn {
    ANGLE("angleDeg", "angle (deg)", w -> degrees(w.angleRad())),
    TIME("seconds", "time (s)", Waveforms::seconds),
    LINE("lineVolts", "line (V)", Waveforms::lineVolts),
    SUPPLY("supplyVolts", "clipped supply (V)", Waveforms::supplyVolts),
    RAMP("rampVolts", "ramp (V)", Waveforms::rampVolts),
    PEAK_POINT("peakPointVolts", "peak point (V)", Waveforms::peakPointVolts),
    BASE_ONE("baseOneVolts", "base one (V)", Waveforms::baseOneVolts),
    GATE_VOLTS("gateVolts", "gate (V)", Waveforms::gateVolts),
    GATE_AMPS("gateAmps", "gate (A)", Waveforms::gateAmps),
    EMITTER("emitterAmps", "emitter (A)", Waveforms::emitterAmps),
    DROPPER("dropperAmps", "dropper (A)", Waveforms::dropperAmps),
    ZENER("zenerAmps", "zener (A)", Waveforms::zenerAmps);

    private final String key;
    private final String heading;
    private final Function<Waveforms, double[]> samples;

    TraceColumn(String key, String heading, Function<Waveforms, double[]> samples) {
        this.key = key;
        this.heading = heading;
        this.samples = samples;
    }

    /** All waveforms as comma-separated values, one instant a line. */
    static String csv(Waveforms waveforms) {
        List<double[]> columns = new ArrayList<>();
        Csv csv = new Csv();
        csv.words(Arrays.stream(values()).map(column -> column.heading).toList());
        for (TraceColumn column : values()) {
            columns.add(column.samples.apply(waveforms));
        }
        for (int i = 0; i < columns.get(0).length; i++) {
            int instant = i;
            csv.words(columns.stream().map(c -> Csv.number(c[instant])).toList());
        }
        return csv.text();
    }

    /** All waveforms as arrays of one length. */
    static void write(Json json, Waveforms waveforms) {
        for (TraceColumn column : values()) {
            json.putNumbers(column.key, column.samples.apply(waveforms));
        }
    }

    private static double[] degrees(double[] rad) {
        return Arrays.stream(rad).map(Math::toDegrees).toArray();
    }
}
