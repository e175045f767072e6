package clipramp.faults;

import clipramp.circuit.TestPoint;
import java.util.Set;

/** Something that was seen on a circuit that does not work, with the knob in the middle unless it says otherwise. */
public sealed interface Observation {
    /** As it was said, such as load:full. */
    String text();

    /**
     * What the load gets.
     *
     * @param text as it was said
     * @param gets any of these
     */
    record Load(String text, Set<LoadGets> gets) implements Observation {
        /** Keeps a copy of the set. */
        public Load {
            gets = Set.copyOf(gets);
        }
    }

    /**
     * Whether the knob moves the load's power.
     *
     * @param text as it was said
     * @param acts whether it does
     */
    record Knob(String text, boolean acts) implements Observation {}

    /** Which instrument. */
    enum Meter {
        /** A meter on dc: the mean. */
        DC("dc"),
        /** A true-rms meter on ac: the mean taken off. */
        AC("ac"),
        /** An oscilloscope: the value of largest magnitude. */
        PEAK("peak");

        private final String word;

        Meter(String word) {
            this.word = word;
        }

        /** The word that observations are written with. */
        public String word() {
            return word;
        }

        /** What it shows of a reading, V. */
        double of(Reading reading) {
            return switch (this) {
                case DC -> reading.dcVolts();
                case AC -> reading.acVolts();
                case PEAK -> reading.peakVolts();
            };
        }
    }

    /**
     * A voltage at a test point.
     *
     * @param text as it was said
     * @param point where
     * @param meter with what
     * @param volts what it showed, V against what the point is read against
     */
    record Volts(String text, TestPoint point, Meter meter, double volts) implements Observation {}

    /**
     * A part that was found burnt.
     *
     * @param text as it was said
     * @param part its design key
     */
    record Burnt(String text, String part) implements Observation {}

    /**
     * The line's fuse.
     *
     * @param text as it was said
     * @param blown whether it has opened
     */
    record Fuse(String text, boolean blown) implements Observation {}
}
