package clipramp.margins;

import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice;
import clipramp.firing.Pulse;
import clipramp.gate.LatchingNeed;
import clipramp.power.HoldingGap;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import clipramp.power.Thermal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** The thyristor against its ratings: voltage, currents, heat, turn-off (model.md sections 8 and 10). */
final class ThyristorMargins {
    private final Bench bench;
    private final Design design;
    private final ThyristorDevice device;

    ThyristorMargins(Bench bench) {
        this.bench = bench;
        this.design = bench.design();
        this.device = design.thyristor().device();
    }

    List<Margin> all() {
        List<Margin> margins = new ArrayList<>();
        margins.add(Ceiling.over(
                MarginKind.BLOCKING_VOLTAGE,
                bench.conditions(),
                device.limits().volts(),
                unstated("limits.voltage"),
                at -> design.line().crestVolts(at.condition().lineVolts()),
                Say::volts));
        margins.add(Ceiling.over(
                MarginKind.THYRISTOR_RMS,
                bench.conditions(),
                device.limits().rmsAmps(),
                unstated("limits.rms"),
                at -> load(at).thyristorRmsAmps(),
                Say::amps));
        // A triac has no mean rating: it carries both half cycles, and its sheet rates the rms current alone.
        if (device.kind() == ThyristorDevice.Kind.SCR) {
            margins.add(Ceiling.over(
                    MarginKind.THYRISTOR_MEAN,
                    bench.conditions(),
                    device.limits().meanAmps(),
                    unstated("limits.mean"),
                    at -> load(at).thyristorMeanAmps(),
                    Say::amps));
        }
        margins.add(junction());
        if (design.stage() == Stage.BRIDGE_DC) {
            margins.add(turnOff());
        }
        return margins;
    }

    private static String unstated(String key) {
        return "the profile states no thyristor.device." + key;
    }

    /**
     * The load at its highest setting. Where the nominal thyristor is not turned on there, another one of its type may
     * be: then every half cycle counts as fired by the first pulse.
     */
    private LoadResult load(JudgedCondition at) {
        LoadResult load = bench.load(at.condition(), bench.leastOhms());
        Optional<Pulse> first = Bench.firstPulse(
                bench.solution(at.condition(), bench.leastOhms()).shown());
        return load.watts() > 0 || first.isEmpty()
                ? load
                : LoadPower.atFiringAngle(design, at.condition(), first.get().startRad());
    }

    private Margin junction() {
        MarginKind kind = MarginKind.JUNCTION_TEMPERATURE;
        OptionalDouble most = device.limits().junctionCelsius();
        if (most.isEmpty()) {
            return Ceiling.unjudged(kind, unstated("limits.junction"));
        }
        if (device.junctionToCaseKelvinPerWatt().isEmpty()) {
            return Ceiling.unjudged(kind, unstated("junction-to-case"));
        }
        if (design.thyristor().caseToAmbientKelvinPerWatt().isEmpty()) {
            return Ceiling.unjudged(kind, "the design states no thyristor.case-to-ambient");
        }
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            findings.add(junction(at, most.getAsDouble()));
        }
        return Finding.worst(kind, findings);
    }

    private Finding junction(JudgedCondition at, double most) {
        double inside = device.junctionToCaseKelvinPerWatt().orElseThrow();
        double outside = design.thyristor().caseToAmbientKelvinPerWatt().orElseThrow();
        double air = at.condition().celsius();
        double watts = load(at).thyristorWatts();
        double reached = Thermal.junctionCelsius(design.thyristor(), watts, air).orElseThrow();
        double sink = Thermal.largestCaseToAmbient(most, air, watts, inside);
        return new Finding(
                at.words(),
                most - air,
                reached - air,
                MarginKind.JUNCTION_TEMPERATURE.sense(),
                Say.watts(watts) + " x (" + Say.thermal(inside) + " + " + Say.thermal(outside) + ") = "
                        + Say.kelvin(reached - air) + " over " + Say.celsius(air) + ": " + Say.celsius(reached)
                        + "; limit " + Say.celsius(most)
                        + (watts > 0 && sink > 0 ? ", reached with case-to-ambient " + Say.thermal(sink) : ""));
    }

    private Margin turnOff() {
        MarginKind kind = MarginKind.TURN_OFF_TIME;
        OptionalDouble needed = device.turnOffSeconds();
        if (needed.isEmpty()) {
            return Ceiling.unjudged(kind, unstated("turn-off"));
        }
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            // The gate circuit's bleed would lengthen the gap: left out, on the safe side.
            OptionalDouble holding =
                    LatchingNeed.sheetHoldingAmps(design, at.condition().celsius());
            if (holding.isEmpty()) {
                return Ceiling.unjudged(kind, unstated("holding"));
            }
            double gap = HoldingGap.seconds(design, at.condition(), holding.getAsDouble());
            findings.add(new Finding(
                    at.words(),
                    needed.getAsDouble(),
                    gap,
                    kind.sense(),
                    "under I_H " + Say.amps(holding.getAsDouble()) + " for " + Say.seconds(gap)
                            + " around the line's zero; t_q " + Say.seconds(needed.getAsDouble())));
        }
        return Finding.worst(kind, findings);
    }
}
