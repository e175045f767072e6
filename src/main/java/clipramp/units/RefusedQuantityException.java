package clipramp.units;

/** A text that is no quantity, or not the quantity that was asked for. */
public final class RefusedQuantityException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient Refusal refusal;

    public RefusedQuantityException(Refusal refusal) {
        super(refusal.message());
        this.refusal = refusal;
    }

    public Refusal refusal() {
        return refusal;
    }
}
