package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.firing.Dissipation;
import clipramp.firing.Pulse;
import clipramp.power.OperatingPoint;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A design solved and judged: the one result that command line, window and record all read.
 *
 * @param design the design
 * @param condition the usual condition, which knob table, pulse, dissipation and clip are those of
 * @param knob eleven rows, knob 0 to 1; one for a fixed ramp
 * @param pulse the firing pulse at mid-knob, else the first one; empty where there is none
 * @param dissipation what the firing circuit's parts bear at mid-knob
 * @param clipFromRad angle from which the supply is clipped at mid-knob, counted as firing angles are, rad; empty if it
 *     never is
 * @param margins every margin, worst first
 * @param verdict the worst of them
 * @param notes what else to know: what the laws leave out that matters here, data that were extended
 * @param lineCurrent the line current beside the tables for it, usual condition; always there from the judge
 * @param heat the thyristor's heat at its worst; always there from the judge
 */
public record Check(
        Design design,
        Condition condition,
        List<OperatingPoint> knob,
        Optional<PulseSummary> pulse,
        Dissipation dissipation,
        OptionalDouble clipFromRad,
        List<Margin> margins,
        Verdict verdict,
        List<Note> notes,
        Optional<LineCheck> lineCurrent,
        Optional<HeatCheck> heat) {
    /**
     * The pulse and what goes with it.
     *
     * @param atKnob knob position of the pulse, 0..1; empty for a fixed ramp
     * @param pulse the pulse
     * @param meanGateWatts gate energy times pulses a second, W
     * @param quiescentGateVolts gate to cathode or main terminal one between pulses at its highest, V
     */
    public record PulseSummary(OptionalDouble atKnob, Pulse pulse, double meanGateWatts, double quiescentGateVolts) {}

    /** Keeps copies of the lists. */
    public Check {
        knob = List.copyOf(knob);
        margins = List.copyOf(margins);
        notes = List.copyOf(notes);
    }
}
