package clipramp.margins;

import clipramp.circuit.Design;
import java.util.OptionalDouble;

/** Solves a design and judges it. */
public final class Judge {
    private Judge() {}

    /**
     * @param design the design
     * @param pinnedLineVolts judge at this line voltage only, V; empty for low, nominal and high
     * @param pinnedCelsius judge at this temperature only, °C; empty for coldest, 25 °C and hottest
     */
    public static Check check(Design design, OptionalDouble pinnedLineVolts, OptionalDouble pinnedCelsius) {
        throw new UnsupportedOperationException();
    }
}
