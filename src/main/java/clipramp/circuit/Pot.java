package clipramp.circuit;

import java.util.Optional;

/**
 * The potentiometer, wired as a variable resistor.
 *
 * @param track track resistance, ohm
 * @param endOhms what is left at the low end, ohm
 * @param law track share against rotation
 * @param sense whether the resistance grows or falls clockwise
 * @param shunt resistor across the used section, if there is one
 */
public record Pot(Part track, double endOhms, PotLaw law, Sense sense, Optional<Part> shunt) {
    /** Which way the resistance goes when the knob is turned clockwise. */
    public enum Sense {
        RISING("rising"),
        FALLING("falling");

        private final String word;

        Sense(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }

    public Pot {
        Require.positive("pot track", track.value());
        Require.notNegative("pot end resistance", endOhms);
    }

    /**
     * Share of the track in use.
     *
     * @param position 0 fully anticlockwise .. 1 fully clockwise
     * @return 0..1
     */
    public double trackShare(double position) {
        Require.fraction("knob position", position);
        return law.share(sense == Sense.RISING ? position : 1 - position);
    }

    /** Resistance in ohms at a knob position 0..1, nominal parts. */
    public double ohms(double position) {
        return ohms(
                trackShare(position),
                endOhms,
                track.value(),
                shunt.map(Part::value).orElse(Double.POSITIVE_INFINITY));
    }

    /**
     * Resistance of the used section: end + track x share, with the shunt across it.
     *
     * @param share share of the track, 0..1
     * @param endOhms end resistance, ohm
     * @param trackOhms track, ohm
     * @param shuntOhms shunt, ohm; POSITIVE_INFINITY for none
     * @return ohms
     */
    public static double ohms(double share, double endOhms, double trackOhms, double shuntOhms) {
        double used = endOhms + trackOhms * share;
        return Double.isInfinite(shuntOhms) ? used : used * shuntOhms / (used + shuntOhms);
    }
}
