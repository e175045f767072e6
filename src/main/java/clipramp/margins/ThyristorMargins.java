package clipramp.margins;

import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice;
import clipramp.gate.LatchingNeed;
import clipramp.power.HoldingGap;
import clipramp.power.ReappliedVoltage;
import clipramp.power.Thermal;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** The thyristor against its ratings: voltage, currents, heat, turn-off (DEVELOPERS.md, Margins). */
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
        List<Margin> margins = new ArrayList<>(sheetRatings());
        margins.add(junction());
        if (recovers()) {
            margins.add(turnOff());
        }
        margins.addAll(new SurgeMargins(bench).all());
        return margins;
    }

    private List<Margin> sheetRatings() {
        List<Margin> margins = new ArrayList<>();
        margins.add(Ceiling.over(
                MarginKind.BLOCKING_VOLTAGE,
                bench.conditions(),
                device.limits().volts(),
                unstated("limits.voltage"),
                this::blockedVolts,
                Say::volts));
        margins.add(Ceiling.over(
                MarginKind.THYRISTOR_RMS,
                bench.conditions(),
                device.limits().rmsAmps(),
                unstated("limits.rms"),
                at -> bench.highestLoad(at).thyristorRmsAmps(),
                Say::amps));
        // A triac has no mean rating: it carries both half cycles, and its sheet rates the rms current alone.
        if (device.kind() == ThyristorDevice.Kind.SCR) {
            margins.add(Ceiling.over(
                    MarginKind.THYRISTOR_MEAN,
                    bench.conditions(),
                    device.limits().meanAmps(),
                    unstated("limits.mean"),
                    at -> bench.highestLoad(at).thyristorMeanAmps(),
                    Say::amps));
        }
        return margins;
    }

    /** A bridge gives the SCR no reverse voltage to recover under; an inductance leaves it little time to do so. */
    private boolean recovers() {
        boolean bridge = design.stage() == Stage.BRIDGE_DC || design.stage() == Stage.BRIDGE_AC;
        boolean scr = device.kind() == ThyristorDevice.Kind.SCR;
        return scr && (bridge || design.load() instanceof Load.Inductive);
    }

    /** The line's crest, or what comes back over the thyristor when an inductive load's current dies. */
    private double blockedVolts(JudgedCondition at) {
        return Math.max(
                design.line().crestVolts(at.condition().lineVolts()),
                InductiveMargins.reapplied(bench, at).stream()
                        .mapToDouble(ReappliedVoltage::peakVolts)
                        .max()
                        .orElse(0));
    }

    private static String unstated(String key) {
        return "the profile states no thyristor.device." + key;
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
            HeatCheck heat = HeatCheck.of(bench);
            return Ceiling.unjudged(
                    kind,
                    "the design states no thyristor.case-to-ambient; needed is " + sink(heat.sinkKelvinPerWatt()));
        }
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            findings.add(junction(at, most.getAsDouble()));
        }
        return Finding.worst(kind, findings);
    }

    private static String sink(OptionalDouble kelvinPerWatt) {
        if (kelvinPerWatt.isEmpty()) {
            return "any sink";
        }
        return kelvinPerWatt.getAsDouble() > 0
                ? Say.thermal(kelvinPerWatt.getAsDouble()) + " or less"
                : "more than any sink can give: a larger thyristor";
    }

    private Finding junction(JudgedCondition at, double most) {
        double inside = device.junctionToCaseKelvinPerWatt().orElseThrow();
        double outside = design.thyristor().caseToAmbientKelvinPerWatt().orElseThrow();
        double air = at.condition().celsius();
        HeatCheck.Loss loss = HeatCheck.worstLoss(bench, at);
        double reached =
                Thermal.junctionCelsius(design.thyristor(), loss.watts(), air).orElseThrow();
        return new Finding(
                at.words(),
                most - air,
                reached - air,
                MarginKind.JUNCTION_TEMPERATURE.sense(),
                Say.watts(loss.watts()) + " (" + loss.where() + ") x (" + Say.thermal(inside) + " + "
                        + Say.thermal(outside) + ") = " + Say.kelvin(reached - air) + " over " + Say.celsius(air) + ": "
                        + Say.celsius(reached) + "; limit " + Say.celsius(most)
                        + (loss.watts() > 0
                                ? ", needs case-to-ambient "
                                        + sink(OptionalDouble.of(
                                                Thermal.largestCaseToAmbient(most, air, loss.watts(), inside)))
                                : ""));
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
            for (double ohms : bench.settingsThatMatter(at.condition())) {
                double gap = HoldingGap.seconds(
                        design, at.condition(), bench.period(at.condition(), ohms), holding.getAsDouble());
                findings.add(new Finding(
                        at.words(), needed.getAsDouble(), gap, kind.sense(), gapText(ohms, gap, needed, holding)));
            }
        }
        return Finding.worst(kind, findings);
    }

    private String gapText(double ohms, double gap, OptionalDouble needed, OptionalDouble holding) {
        String setting = "R_E = " + Say.ohms(ohms) + ": ";
        String asked = "; t_q " + Say.seconds(needed.orElseThrow());
        if (design.stage() != Stage.BRIDGE_DC && design.stage() != Stage.BRIDGE_AC) {
            return setting + "reversed by the line for " + Say.seconds(gap) + " after its current has died" + asked;
        }
        return gap == 0
                ? setting + "the current stays in the SCR through the line's zero: it never turns off" + asked
                : setting + "under I_H " + Say.amps(holding.orElseThrow()) + " for " + Say.seconds(gap)
                        + (design.stage() == Stage.BRIDGE_AC && design.load() instanceof Load.Inductive
                                ? " around the current's zero"
                                : " around the line's zero")
                        + asked;
    }
}
