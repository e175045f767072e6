package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.margins.Check;
import clipramp.margins.Margin;
import java.util.List;

/**
 * What a request comes to.
 *
 * @param design the best design found
 * @param check it, judged with nominal parts
 * @param outcome what it keeps
 * @param cornerFailures margins that fail for the fastest or the slowest unit, the fastest's first; empty where none does,
 *  and where nominal parts fail already
 * @param yield estimated share of units that reach what is wanted, 0..1
 * @param deadTravel share of the rotation past the wanted settings, 0..1
 * @param watts heat of the firing circuit at mid-knob, W
 * @param conflicts what cannot be met with what; empty where nothing fails
 * @param candidates how many designs were judged
 */
public record SizingAnswer(
        Design design,
        Check check,
        Outcome outcome,
        List<Margin> cornerFailures,
        double yield,
        double deadTravel,
        double watts,
        List<Conflict> conflicts,
        int candidates) {
    /** How much of what is asked a design keeps. */
    public enum Outcome {
        /** No margin fails, neither with nominal parts nor for the fastest and the slowest unit. */
        WORST_CASE("worst-case"),
        /** No margin fails with nominal parts; some units miss. */
        NOMINAL("nominal"),
        /** Some margin fails with nominal parts. */
        NOTHING("nothing");

        private final String word;

        Outcome(String word) {
            this.word = word;
        }

        /** The word that stands for it in an answer for machines. */
        public String word() {
            return word;
        }
    }

    /**
     * A demand that is not met.
     *
     * @param margin it, as it stands in the design
     * @param with names of the margins that fail where this one is met; empty where nothing that was tried meets it
     * @param nearest the nearest demand that can be met, a sentence
     */
    public record Conflict(Margin margin, List<String> with, String nearest) {
        /** Keeps the margins as they are. */
        public Conflict {
            with = List.copyOf(with);
        }
    }

    /** Keeps the lists as they are. */
    public SizingAnswer {
        cornerFailures = List.copyOf(cornerFailures);
        conflicts = List.copyOf(conflicts);
    }

    /** Whether no margin fails with nominal parts. */
    public boolean holds() {
        return outcome != Outcome.NOTHING;
    }
}
