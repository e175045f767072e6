package clipramp.circuit;

/** A circuit that is well formed but that the laws refuse, with the key to blame and what to do. */
public final class RefusedCircuit extends RuntimeException {
    private static final long serialVersionUID = 1;

    private final String path;

    /**
     * @param path design key to blame, such as line.harmonics
     * @param message what is wrong, with its value and limit, and what to do
     */
    public RefusedCircuit(String path, String message) {
        super(message);
        this.path = path;
    }

    /** Design key to blame. */
    public String path() {
        return path;
    }
}
