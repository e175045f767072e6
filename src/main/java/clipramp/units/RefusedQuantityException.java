package clipramp.units;

/** A text that is no quantity, or not the quantity that was asked for. */
public final class RefusedQuantityException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient Refusal refusal;

    /** With the refusal's own message. */
    public RefusedQuantityException(Refusal refusal) {
        super(refusal.message());
        this.refusal = refusal;
    }

    /** What was read, what was expected, and what to write instead. */
    public Refusal refusal() {
        return refusal;
    }
}
