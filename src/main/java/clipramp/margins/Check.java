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
 * @param condition the condition of knob table, pulse and supply
 * @param knob eleven rows, knob 0 to 1; one for a fixed ramp
 * @param pulse the firing pulse at mid-knob
 * @param dissipation what the firing circuit's parts bear at mid-knob
 * @param clipFromRad angle from which the supply is clipped at mid-knob, rad
 * @param margins every margin, worst first
 * @param verdict the worst of them
 * @param notes what else to know: assumptions of the model that matter here, data that were extended
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
     * @param atKnob knob position of the pulse, 0..1; empty for a fixed ramp
     * @param pulse the pulse
     * @param meanGateWatts gate energy times pulses a second, W
     * @param quiescentGateVolts gate voltage between pulses at its highest, V
     */
    public record PulseSummary(OptionalDouble atKnob, Pulse pulse, double meanGateWatts, double quiescentGateVolts) {}

    public Check {
        knob = List.copyOf(knob);
        margins = List.copyOf(margins);
        notes = List.copyOf(notes);
    }
}
