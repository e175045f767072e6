package clipramp.faults;

import clipramp.circuit.TestPoint;
import clipramp.faults.Observation.Meter;
import java.util.List;
import java.util.Map;

/**
 * What follows from a fault before anything else burns.
 *
 * @param fault the fault
 * @param gets what the load gets at mid-knob
 * @param knob the load with the knob at 0, middle and 1; one entry for a fixed ramp
 * @param knobActs whether the knob still moves the load's power
 * @param readings what the test points show at mid-knob, TP1 to TP5
 * @param over ratings that are exceeded at some knob position and were not before, worst first: what burns next
 * @param remarks what else to know
 */
public record FaultEffect(
        Fault fault,
        LoadGets gets,
        List<LoadAt> knob,
        boolean knobActs,
        Map<TestPoint, Reading> readings,
        List<Burden> over,
        List<String> remarks) {
    /** Keeps copies of the collections. */
    public FaultEffect {
        knob = List.copyOf(knob);
        readings = Map.copyOf(readings);
        over = List.copyOf(over);
        remarks = List.copyOf(remarks);
    }

    /** What a meter shows at a test point at mid-knob, V against what the point is read against; 0 without a reading. */
    public double volts(TestPoint point, Meter meter) {
        return meter.of(readings.getOrDefault(point, Reading.ZERO));
    }

    /** The load at mid-knob. */
    public LoadAt middle() {
        return knob.get(knob.size() / 2);
    }
}
