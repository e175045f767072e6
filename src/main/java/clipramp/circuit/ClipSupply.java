package clipramp.circuit;

import java.util.Optional;

/**
 * The supply that falls to zero with the line: rectifier, dropping resistor, zener, and no filter capacitor.
 *
 * @param tap what the rectifier is across
 * @param rectifier bridge or single diode
 * @param diodeDropVolts drop of one rectifier diode, V
 * @param dropper the dropping resistor R_D, ohm
 * @param zener the clipping zener
 * @param winding isolated synchronising winding, if the supply has one
 */
public record ClipSupply(
        Tap tap, Rectifier rectifier, double diodeDropVolts, Part dropper, Zener zener, Optional<Winding> winding) {
    /** What the rectifier is across. */
    public enum Tap {
        LINE("line"),
        THYRISTOR("thyristor");

        private final String word;

        Tap(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }

    /** How the firing supply is rectified. */
    public enum Rectifier {
        BRIDGE("bridge", 2),
        DIODE("diode", 1);

        private final String word;
        private final int diodesInPath;

        Rectifier(String word, int diodesInPath) {
            this.word = word;
            this.diodesInPath = diodesInPath;
        }

        public String word() {
            return word;
        }

        /** Diodes that the supply's current passes. */
        public int diodesInPath() {
            return diodesInPath;
        }
    }

    public ClipSupply {
        Require.notNegative("rectifier diode drop", diodeDropVolts);
        Require.positive("dropping resistor", dropper.value());
        if (winding.isPresent() && tap == Tap.THYRISTOR) {
            throw new IllegalArgumentException("a synchronising winding excludes tap thyristor");
        }
    }

    /** Whether the firing circuit is separated from the line by a winding. */
    public boolean isIsolated() {
        return winding.isPresent();
    }
}
