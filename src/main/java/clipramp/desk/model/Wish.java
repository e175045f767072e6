package clipramp.desk.model;

import clipramp.circuit.Stage;

/**
 * The five answers that a new design starts from.
 *
 * @param lineId profile id of the line
 * @param load rated power as typed, such as 1 kW
 * @param stage how thyristors, bridge and load are put together
 * @param lowest lowest wanted share of full power, as typed
 * @param highest highest wanted share of full power, as typed
 * @param coldest lowest ambient temperature, as typed
 * @param hottest highest ambient temperature, as typed
 */
public record Wish(
        String lineId, String load, Stage stage, String lowest, String highest, String coldest, String hottest) {
    /** What the questions are answered with until the user answers otherwise. */
    public static final Wish USUAL =
            new Wish("line-230v-50hz", "1 kW", Stage.BRIDGE_DC, "10 %", "90 %", "0 degC", "50 degC");

    /** The lowest share of full power that a design on a line is asked for until the user asks otherwise. */
    public static String usualLowest(Stage stage, boolean lowVoltage) {
        if (stage == Stage.HALF_WAVE) {
            return lowVoltage ? "12 %" : "5 %";
        }
        return lowVoltage ? "25 %" : USUAL.lowest();
    }

    /**
     * The highest. A half-wave stage gives half of full power at most, and a low line takes long to reach the clipping
     * voltage, so that the earliest firing comes late.
     */
    public static String usualHighest(Stage stage, boolean lowVoltage) {
        if (stage == Stage.HALF_WAVE) {
            return lowVoltage ? "35 %" : "43 %";
        }
        return lowVoltage ? "65 %" : USUAL.highest();
    }
}
