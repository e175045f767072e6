package clipramp.fit;

/**
 * What may be wrong: a reading, a setting or a line voltage.
 *
 * @param line index of its bench line
 * @param reading index within the line; -1 for a setting, -2 for the line's voltage
 */
record Observed(int line, int reading) {
    static final int SETTING = -1;
    static final int LINE_VOLTS = -2;

    boolean isReading() {
        return reading >= 0;
    }
}
