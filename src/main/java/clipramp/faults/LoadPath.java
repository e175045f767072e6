package clipramp.faults;

/** What a fault does to the path of the load's current, apart from when the thyristor is fired. */
public enum LoadPath {
    /** As designed. */
    INTACT,
    /** The thyristor is a wire both ways. */
    THYRISTOR_SHORTED,
    /** Current can flow in positive half cycles only, or is fired in them only. */
    ONE_HALF,
    /** The load is off its wires. */
    LOAD_OPEN,
    /** A short across the line: the fuse is gone and nothing is supplied any more. */
    LINE_SHORTED
}
