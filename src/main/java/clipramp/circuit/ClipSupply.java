package clipramp.circuit;

import java.util.Optional;

/**
 * The supply that falls to zero with the line: rectifier, dropping resistor, zener, and no filter capacitor.
 *
 * @param tap what the rectifier is across
 * @param rectifier bridge or single diode
 * @param diodeDropVolts forward drop V_F of one rectifier diode, V, 0 or more
 * @param dropper the dropping resistor R_D, ohm, above 0
 * @param zener the clipping zener
 * @param winding isolated synchronising winding, if the supply has one; never across the thyristor
 */
public record ClipSupply(
        Tap tap, Rectifier rectifier, double diodeDropVolts, Part dropper, Zener zener, Optional<Winding> winding) {
    /** What the rectifier is across. */
    public enum Tap {
        /** The line itself, or the winding that stands for it. */
        LINE("line"),
        /** The thyristor: the supply is gone from the pulse that turns it on until the line's next zero. */
        THYRISTOR("thyristor");

        private final String word;

        Tap(String word) {
            this.word = word;
        }

        /** The word that stands in a design file. */
        public String word() {
            return word;
        }
    }

    /** How the firing supply is rectified. */
    public enum Rectifier {
        /** Four diodes: every half cycle feeds the supply. */
        BRIDGE("bridge", 2),
        /** One diode: every second half cycle does. */
        DIODE("diode", 1);

        private final String word;
        private final int diodesInPath;

        Rectifier(String word, int diodesInPath) {
            this.word = word;
            this.diodesInPath = diodesInPath;
        }

        /** The word that stands in a design file. */
        public String word() {
            return word;
        }

        /** How many diodes in series the supply's current passes. */
        public int diodesInPath() {
            return diodesInPath;
        }
    }

    /** @throws IllegalArgumentException outside the stated ranges, or with a winding across the thyristor */
    public ClipSupply {
        Require.notNegative("rectifier diode drop", diodeDropVolts);
        Require.positive("dropping resistor", dropper.value());
        if (winding.isPresent() && tap == Tap.THYRISTOR) {
            throw new IllegalArgumentException("a synchronising winding excludes tap thyristor");
        }
    }

    /** What all rectifier diodes take that the supply's current passes: n V_F, V. */
    public double rectifierVolts() {
        return rectifier.diodesInPath() * diodeDropVolts;
    }

    /** Secondary over primary voltage of the winding; 1 without one. */
    public double windingRatio() {
        return winding.map(Winding::ratio).orElse(1.0);
    }

    /** Angle by which the supply lags the load's line, rad; 0 without a winding. */
    public double lagRad() {
        return winding.map(Winding::lagRad).orElse(0.0);
    }

    /** Whether a winding turns the supply over against the load's line. */
    public boolean isTurnedOver() {
        return winding.map(Winding::opposite).orElse(false);
    }

    /** Whether the firing circuit is separated from the line by a winding. */
    public boolean isIsolated() {
        return winding.isPresent();
    }
}
