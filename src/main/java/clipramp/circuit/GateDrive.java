package clipramp.circuit;

import java.util.Optional;

/**
 * How the pulse reaches the gate, and what is asked of it.
 *
 * @param coupling direct or by a pulse transformer
 * @param series R_G, base one (or secondary) to gate, ohm, 0 or more
 * @param shunt R_GK, gate to cathode, ohm, if there is one
 * @param overdrive how many times the trigger current is wanted, 1 or more
 * @param chargeSeconds gate charge wanted, as trigger current times this time, s, 0 or more
 * @param polarity sign of the pulse at the gate
 * @param transformer the pulse transformer, with transformer coupling only
 */
public record GateDrive(
        Coupling coupling,
        Part series,
        Optional<Part> shunt,
        double overdrive,
        double chargeSeconds,
        Polarity polarity,
        Optional<PulseTransformer> transformer) {
    /** How base one and gate are joined. */
    public enum Coupling {
        /** By R_G alone. */
        DIRECT("direct"),
        /** By a pulse transformer, and R_G behind each secondary. */
        TRANSFORMER("transformer");

        private final String word;

        Coupling(String word) {
            this.word = word;
        }

        /** The word that stands in a design file. */
        public String word() {
            return word;
        }
    }

    /** Sign of the gate pulse against the cathode or main terminal one. */
    public enum Polarity {
        /** Into the gate. */
        POSITIVE("positive"),
        /** Out of the gate, which a triac takes. */
        NEGATIVE("negative");

        private final String word;

        Polarity(String word) {
            this.word = word;
        }

        /** The word that stands in a design file. */
        public String word() {
            return word;
        }
    }

    /** @throws IllegalArgumentException outside the stated ranges, or where coupling and transformer do not agree */
    public GateDrive {
        if (!(overdrive >= 1)) {
            throw new IllegalArgumentException("gate overdrive must be 1 or more, is " + overdrive);
        }
        Require.notNegative("gate charge time", chargeSeconds);
        if (transformer.isPresent() != (coupling == Coupling.TRANSFORMER)) {
            throw new IllegalArgumentException("a pulse transformer goes with transformer coupling, and only with it");
        }
    }
}
