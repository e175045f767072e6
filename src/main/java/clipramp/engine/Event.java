package clipramp.engine;

/** What ends a piece. */
public enum Event {
    /** The rectifier starts or stops feeding the supply. */
    RECTIFIER,
    /** The zener starts or stops conducting. */
    ZENER,
    /** The gate junction starts or stops conducting. */
    GATE,
    /** The diode across the primary starts or stops conducting. */
    CLAMP,
    /** The ramp has reached the peak point and the device fires, at once or out of a stall. */
    FIRES,
    /** The ramp has reached the peak point and the emitter gets too little current. */
    STALLS,
    /** The stall ends unfired: the peak point rises faster than the ramp. */
    UNSTALLS,
    /** The emitter current has fallen to the valley current: the device blocks again. */
    VALLEY,
    /** The half cycle, or the time that was asked for, is over. */
    END
}
