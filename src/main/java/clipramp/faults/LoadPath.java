package clipramp.faults;

/** What a fault does to the path of the load's current, apart from when the thyristor is fired. */
public enum LoadPath {
    /** As designed. */
    INTACT,
    /** The thyristor is a wire both ways. */
    THYRISTOR_SHORTED,
    /** Current can flow in positive half cycles only, or is fired in them only. */
    ONE_HALF,
    /** The same, and the synchronising winding is shorted in the others. */
    WINDING_SHORTED,
    /** Negative half cycles flow past the thyristor, whole. */
    OTHER_HALF_FREE,
    /** The load is a wire: the first pulse that turns the thyristor on puts it across the line. */
    LOAD_SHORTED,
    /** The load is off its wires. */
    LOAD_OPEN,
    /** A short across the line: the fuse is gone and nothing is supplied any more. */
    LINE_SHORTED
}
