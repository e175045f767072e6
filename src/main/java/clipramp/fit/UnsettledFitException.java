package clipramp.fit;

/** The search for the values that fit best did not come to rest: as a rule the readings are of another design. */
public final class UnsettledFitException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    UnsettledFitException(Throwable cause) {
        super(
                "no values were found that fit these readings: the search did not settle. Are they of this design?",
                cause);
    }
}
