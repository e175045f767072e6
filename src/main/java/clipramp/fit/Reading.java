package clipramp.fit;

/**
 * One number that somebody read.
 *
 * @param meter what was read
 * @param value what it showed, SI unit (radians for angles), 0 or more
 * @param accuracy how far it may be off
 * @param column what stood over it, for naming it
 */
public record Reading(Meter meter, double value, Accuracy accuracy, String column) {
    /**
     * Refuses what no instrument shows.
     *
     * @throws IllegalArgumentException for a value under zero, infinite or none
     */
    public Reading {
        if (!(value >= 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(meter.words() + " is read as 0 or more, not " + value);
        }
    }
}
