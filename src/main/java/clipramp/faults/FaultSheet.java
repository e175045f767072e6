package clipramp.faults;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import java.util.List;

/**
 * Every single fault of a design and what follows from it.
 *
 * @param design the design
 * @param condition line and temperature
 * @param healthy the circuit without a fault
 * @param faults in the order of the signal
 * @param notComputed faults whose circuit the laws refuse, with the reason
 */
public record FaultSheet(
        Design design,
        Condition condition,
        FaultEffect healthy,
        List<FaultEffect> faults,
        List<NotComputed> notComputed) {
    /** What stands over every sheet. */
    public static final String LIVE =
            "Take every point of the firing circuit as live at line potential, behind a winding too: its common is joined to"
                    + " the thyristor. Whoever has to measure a live circuit uses isolated instruments and the practice that"
                    + " local rules ask for; a reading near zero never means that a wire is dead.";

    /**
     * A fault without figures.
     *
     * @param fault the fault
     * @param reason why there is no figure
     */
    public record NotComputed(Fault fault, String reason) {}

    /** Keeps copies of the lists. */
    public FaultSheet {
        faults = List.copyOf(faults);
        notComputed = List.copyOf(notComputed);
    }
}
