package clipramp.desk.model;

/** Where the ramp's resistance is set, as it was last asked for. */
sealed interface Setting {
    /**
     * By the shaft.
     *
     * @param position knob position, 0 fully anticlockwise .. 1 fully clockwise
     */
    record AtKnob(double position) implements Setting {}

    /**
     * By a resistance that the knob does not reach.
     *
     * @param ohms whole R_E, ohm
     */
    record AtResistance(double ohms) implements Setting {}

    /**
     * By the firing angle that it shall give.
     *
     * @param rad firing angle, rad
     */
    record AtAngle(double rad) implements Setting {}
}
