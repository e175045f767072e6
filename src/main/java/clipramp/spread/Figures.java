package clipramp.spread;

import java.util.Arrays;

/** A row of numbers by its content: what was worked out for it once is found again. */
final class Figures {
    private final double[] values;
    private final int hash;

    /** @param values copied */
    Figures(double[] values) {
        this.values = values.clone();
        hash = Arrays.hashCode(this.values);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Figures figures && Arrays.equals(values, figures.values);
    }

    @Override
    public int hashCode() {
        return hash;
    }
}
