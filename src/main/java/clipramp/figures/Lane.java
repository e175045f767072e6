package clipramp.figures;

/** The five lanes of a half cycle, from the line to the load. */
public enum Lane {
    /** The line's voltage. */
    LINE("line", "V", 0.85),
    /** The clipped supply, to the firing common. */
    SUPPLY("clipped supply", "V", 0.85),
    /** The ramp and its peak point, to the firing common. */
    RAMP("ramp", "V", 1.5),
    /** The gate's current. */
    PULSE("gate pulse", "mA", 0.85),
    /** The voltage across the load. */
    LOAD("load", "V", 0.95);

    private final String title;
    private final String unit;
    private final double weight;

    Lane(String title, String unit, double weight) {
        this.title = title;
        this.unit = unit;
        this.weight = weight;
    }

    /** Its name as lettered. */
    String title() {
        return title;
    }

    /** The unit that its scale is lettered in. */
    String unit() {
        return unit;
    }

    /** Its share of the height, against the other lanes'. */
    double weight() {
        return weight;
    }

    /** From SI to the lettered unit. */
    double toUnit() {
        return this == PULSE ? 1000 : 1;
    }
}
