package clipramp.circuit;

import java.util.Optional;

/**
 * The potentiometer, wired as a variable resistor.
 *
 * @param track track resistance, ohm, above 0
 * @param endOhms what is left at the low end, ohm, 0 or more
 * @param law track share against rotation
 * @param sense whether the resistance grows or falls clockwise
 * @param shunt resistor across the used section, if there is one
 */
public record Pot(Part track, double endOhms, PotLaw law, Sense sense, Optional<Part> shunt) {
    /** Which way the resistance goes when the knob is turned clockwise. */
    public enum Sense {
        /** Clockwise is more ohms, so later firing. */
        RISING("rising"),
        /** Clockwise is fewer ohms, so more power. */
        FALLING("falling");

        private final String word;

        Sense(String word) {
            this.word = word;
        }

        /** The word that stands in a design file. */
        public String word() {
            return word;
        }
    }

    /** @throws IllegalArgumentException outside the stated ranges */
    public Pot {
        Require.positive("pot track", track.value());
        Require.notNegative("pot end resistance", endOhms);
    }

    /**
     * Share of the track in use.
     *
     * @param position 0 fully anticlockwise .. 1 fully clockwise
     * @return 0..1
     * @throws IllegalArgumentException where the position lies outside 0..1
     */
    public double trackShare(double position) {
        Require.fraction("knob position", position);
        return law.share(sense == Sense.RISING ? position : 1 - position);
    }

    /**
     * Resistance of the used section: end + track x share, with the shunt across it.
     *
     * @param share share of the track, 0..1
     * @param endOhms end resistance, ohm
     * @param trackOhms track, ohm
     * @param shuntOhms shunt, ohm; POSITIVE_INFINITY for none
     * @return ohm
     */
    public static double ohms(double share, double endOhms, double trackOhms, double shuntOhms) {
        double used = endOhms + trackOhms * share;
        // Nothing across nothing is nothing: a trimmer alone may be turned to zero.
        return used == 0 || Double.isInfinite(shuntOhms) ? used : used * shuntOhms / (used + shuntOhms);
    }
}
