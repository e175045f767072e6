package clipramp.circuit;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Programmable unijunction transistor, data-sheet figures at 25 °C; three of them depend on the divider's resistance.
 *
 * @param id profile or in-place name
 * @param offsetVolts V_T, peak-point voltage above the divider's, against gate resistance, V
 * @param forwardVolts V_F at the forward current, V
 * @param forwardAmps current of V_F, A
 * @param peakCurrentAmps I_P against gate resistance, A
 * @param valleyCurrentAmps I_V against gate resistance at 10 V, A
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
     * @param gateOhms parallel of both divider resistors, ohm
     * @param value what is tabulated
     */
    public record AtGateResistance(double gateOhms, Characteristic value) {
        public AtGateResistance {
            Require.positive("gate resistance", gateOhms);
        }
    }

    /**
     * @param anodeVolts either way between anode and cathode, V
     * @param gateReverseVolts V
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
                .sorted(java.util.Comparator.comparingDouble(AtGateResistance::gateOhms))
                .toList();
    }
}
