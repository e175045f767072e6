package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import java.util.TreeSet;

/** How many different resistors a design needs: fewer are fewer drawers to fill. */
final class DistinctValues {
    private DistinctValues() {}

    static int of(Design design) {
        TreeSet<Double> values = new TreeSet<>();
        values.add(design.clip().dropper().value());
        values.add(design.ramp().fixed().value());
        values.add(design.trigger().baseOne().value());
        if (design.trigger() instanceof UnijunctionTrigger u) {
            values.add(u.baseTwo().value());
        } else if (design.trigger() instanceof ProgrammableTrigger p) {
            values.add(p.upper().value());
            values.add(p.lower().value());
        }
        values.add(design.gate().series().value());
        design.gate().shunt().map(Part::value).ifPresent(values::add);
        values.remove(0.0);
        return values.size();
    }
}
