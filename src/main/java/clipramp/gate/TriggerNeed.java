package clipramp.gate;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.circuit.ThyristorDevice.Quadrant;
import clipramp.circuit.TriggerDemand;
import clipramp.engine.NetworkOfDesign;
import java.util.List;
import java.util.Objects;

/**
 * What the least willing thyristor of its type asks of a pulse at one junction temperature (DEVELOPERS.md, Margins). A
 * triac's is that of the worse of the two quadrants that the pulse's polarity uses.
 *
 * @param celsius junction temperature, °C
 * @param amps I_GT, A
 * @param volts V_GT, gate to cathode or main terminal one, V
 * @param extended whether the temperature lies outside the sheet's points
 * @param used quadrants that the pulse uses; empty for an SCR
 * @param missing those of them that the sheet does not specify
 */
public record TriggerNeed(
        double celsius, double amps, double volts, boolean extended, List<Quadrant> used, List<Quadrant> missing) {
    /** Keeps copies of the lists. */
    public TriggerNeed {
        used = List.copyOf(used);
        missing = List.copyOf(missing);
    }

    /** The need of a design's thyristor at a junction temperature in °C. */
    public static TriggerNeed of(Design design, double celsius) {
        ThyristorDevice device = design.thyristor().device();
        Polarity polarity = design.gate().polarity();
        TriggerDemand demand = NetworkOfDesign.triggerDemand(device, polarity, celsius);
        List<Quadrant> used = device.kind() == Kind.TRIAC ? ThyristorDevice.quadrantsOf(polarity) : List.of();
        List<Quadrant> missing = used.stream()
                .filter(q -> !device.gate().quadrants().containsKey(q))
                .toList();
        return new TriggerNeed(
                celsius,
                demand.ampsAt(celsius),
                highestVolts(device, used, demand, celsius),
                demand.isExtendedAt(celsius),
                used,
                missing);
    }

    private static double highestVolts(
            ThyristorDevice device, List<Quadrant> used, TriggerDemand demand, double celsius) {
        return used.stream()
                .map(q -> device.gate().quadrants().get(q))
                .filter(Objects::nonNull)
                .mapToDouble(specified -> specified.voltsAt(celsius))
                .max()
                .orElse(demand.voltsAt(celsius));
    }
}
