package clipramp.engine;

/** What the trigger device does. */
public enum Mode {
    /** Emitter blocking: the ramp charges. */
    OFF,
    /** Emitter conducting: the capacitor discharges into base one. */
    ON,
    /** Held at the peak point for want of peak-point current. */
    STALLED
}
