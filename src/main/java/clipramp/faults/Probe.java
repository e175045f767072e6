package clipramp.faults;

import clipramp.circuit.TestPoint;
import clipramp.faults.Observation.Meter;
import java.util.List;

/**
 * A test point on one meter.
 *
 * @param point where
 * @param meter on what
 * @param decimals how many are worth showing of such volts
 */
public record Probe(TestPoint point, Meter meter, int decimals) {
    /** The readings that part the faults best: what every sheet of faults shows. */
    public static final List<Probe> TELLING = List.of(
            new Probe(TestPoint.TP1, Meter.DC, 1),
            new Probe(TestPoint.TP2, Meter.DC, 1),
            new Probe(TestPoint.TP3, Meter.PEAK, 2),
            new Probe(TestPoint.TP4, Meter.PEAK, 2),
            new Probe(TestPoint.TP5, Meter.DC, 0),
            new Probe(TestPoint.TP5, Meter.AC, 0));

    /** What it shows of a fault at mid-knob, V. */
    public double volts(FaultEffect effect) {
        return effect.volts(point, meter);
    }
}
