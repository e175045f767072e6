package clipramp.circuit;

import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Programmable unijunction transistor, data-sheet figures at 25 °C; three of them depend on the divider's resistance.
 *
 * @param id profile or in-place name
 * @param offsetVolts V_T, peak-point voltage above the divider's, against gate resistance, V; at least one row
 * @param forwardVolts V_F at the forward current, V, above 0
 * @param forwardAmps current of V_F, A, above 0
 * @param peakCurrentAmps I_P against gate resistance, A; at least one row
 * @param valleyCurrentAmps I_V against gate resistance at a supply of 10 V, A; at least one row
 * @param limits absolute ratings
 */
public record ProgrammableUnijunction(
        String id,
        List<AtGateResistance> offsetVolts,
        Characteristic forwardVolts,
        double forwardAmps,
        List<AtGateResistance> peakCurrentAmps,
        List<AtGateResistance> valleyCurrentAmps,
        Limits limits) {

    /**
     * One row of a table against gate resistance.
     *
     * @param gateOhms parallel of both divider resistors, ohm, above 0
     * @param value what is tabulated, in the table's unit
     */
    public record AtGateResistance(double gateOhms, Characteristic value) {
        /** @throws IllegalArgumentException where the gate resistance is not above zero */
        public AtGateResistance {
            Require.positive("gate resistance", gateOhms);
        }
    }

    /**
     * Absolute ratings, each where the sheet states it.
     *
     * @param anodeVolts either way between anode and cathode, V
     * @param gateReverseVolts gate below anode, V
     * @param meanAmps dc anode current, A
     * @param peakAmps peak anode current, A
     * @param peakSeconds pulse length of the peak current, s
     * @param watts dissipation at 25 °C, W
     * @param deratingWattsPerKelvin what the dissipation loses above 25 °C, W/K
     * @param dischargeJoules energy that a capacitor may give it, J
     */
    public record Limits(
            OptionalDouble anodeVolts,
            OptionalDouble gateReverseVolts,
            OptionalDouble meanAmps,
            OptionalDouble peakAmps,
            OptionalDouble peakSeconds,
            OptionalDouble watts,
            OptionalDouble deratingWattsPerKelvin,
            OptionalDouble dischargeJoules) {}

    /** @throws IllegalArgumentException outside the stated ranges, or where a table is empty */
    public ProgrammableUnijunction {
        offsetVolts = sorted(offsetVolts);
        peakCurrentAmps = sorted(peakCurrentAmps);
        valleyCurrentAmps = sorted(valleyCurrentAmps);
        Require.positive("forward voltage", forwardVolts.nominal());
        Require.positive("forward current", forwardAmps);
    }

    private static List<AtGateResistance> sorted(List<AtGateResistance> table) {
        if (table.isEmpty()) {
            throw new IllegalArgumentException("a table against gate resistance needs at least one row");
        }
        return table.stream()
                .sorted(Comparator.comparingDouble(AtGateResistance::gateOhms))
                .toList();
    }
}
