package clipramp.faults;

/**
 * What three instruments show at one test point. All of them isolated instruments: the circuit is live.
 *
 * @param dcVolts mean, which a meter on dc shows, V
 * @param acVolts true rms with the mean taken off, which a true-rms meter on ac shows, V
 * @param peakVolts value of largest magnitude, which an oscilloscope shows, V
 */
public record Reading(double dcVolts, double acVolts, double peakVolts) {
    /** Nothing on any instrument. */
    static final Reading ZERO = new Reading(0, 0, 0);

    /** The same of a voltage of which only a share is there. */
    Reading times(double share) {
        return new Reading(share * dcVolts, share * acVolts, share * peakVolts);
    }
}
