package clipramp.power;

import clipramp.circuit.Load;

/** A load that cannot be solved yet; the message names the key, what was read and what is expected. */
public final class UnsupportedLoadException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * @param load the load that was asked for
     */
    public UnsupportedLoadException(Load load) {
        super("load.kind: " + load.word() + " cannot be solved yet; write load.kind: resistor");
    }
}
