package clipramp.faults;

/** An observation that is not understood. */
public final class RefusedObservationException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * Says what was read, what is wrong with it, and the whole grammar.
     *
     * @param read the observation as it stood
     * @param why what is wrong with it, in words
     */
    RefusedObservationException(String read, String why) {
        super("read \"" + read + "\"; " + why + (why.endsWith(".") || why.endsWith("?") ? "" : ".") + " Expected "
                + ObservationReader.GRAMMAR + ".");
    }
}
