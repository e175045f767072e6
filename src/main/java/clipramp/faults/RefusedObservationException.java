package clipramp.faults;

/** An observation that is not understood. */
public final class RefusedObservationException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final String read;

    /**
     * @param read the observation as it stood
     * @param why what is wrong with it, in words
     */
    public RefusedObservationException(String read, String why) {
        super("read \"" + read + "\"; " + why + (why.endsWith(".") || why.endsWith("?") ? "" : ".") + " Expected "
                + ObservationReader.GRAMMAR + ".");
        this.read = read;
    }

    /** The observation as it stood. */
    public String read() {
        return read;
    }
}
