package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.power.LoadPower;
import clipramp.power.Thermal;
import java.util.OptionalDouble;

/**
 * The thyristor's heat at its worst: over the knob's settings, and at full conduction, which a fault of the firing circuit
 * can bring at any setting.
 *
 * @param watts largest on-state loss of one thyristor in any judged condition, W
 * @param where at which setting
 * @param condition in which condition
 * @param fullConductionWatts on-state loss with the thyristor fired at every zero, high line, W
 * @param junctionCelsius highest junction temperature of any judged condition, °C; empty where a datum is missing
 * @param sinkKelvinPerWatt largest thermal resistance from case to ambient that keeps every judged condition at the
 *     junction's limit, K/W (0 or less: none is good enough); empty where a datum is missing or there is no loss
 */
public record HeatCheck(
        double watts,
        String where,
        String condition,
        double fullConductionWatts,
        OptionalDouble junctionCelsius,
        OptionalDouble sinkKelvinPerWatt) {

    /**
     * An on-state loss and the setting that it comes at.
     *
     * @param watts loss of one thyristor, W
     * @param where the setting in words
     */
    record Loss(double watts, String where) {}

    /** The heat over all judged conditions. */
    static HeatCheck of(Bench bench) {
        Design design = bench.design();
        Loss worst = new Loss(-1, "");
        String condition = "";
        double full = 0;
        OptionalDouble junction = OptionalDouble.empty();
        OptionalDouble sink = OptionalDouble.empty();
        for (JudgedCondition at : bench.conditions()) {
            Loss loss = worstLoss(bench, at);
            full = Math.max(full, fullConductionWatts(design, at.condition()));
            if (loss.watts() > worst.watts()) {
                worst = loss;
                condition = at.words();
            }
            OptionalDouble reached = Thermal.junctionCelsius(
                    design.thyristor(), loss.watts(), at.condition().celsius());
            if (reached.isPresent()) {
                junction =
                        OptionalDouble.of(Math.max(reached.getAsDouble(), junction.orElse(Double.NEGATIVE_INFINITY)));
            }
            OptionalDouble needed = sinkNeeded(design, at.condition(), loss.watts());
            if (needed.isPresent()) {
                sink = OptionalDouble.of(Math.min(needed.getAsDouble(), sink.orElse(Double.POSITIVE_INFINITY)));
            }
        }
        return new HeatCheck(worst.watts(), worst.where(), condition, full, junction, sink);
    }

    private static OptionalDouble sinkNeeded(Design design, Condition condition, double watts) {
        OptionalDouble most = design.thyristor().device().limits().junctionCelsius();
        OptionalDouble inside = design.thyristor().device().junctionToCaseKelvinPerWatt();
        return most.isEmpty() || inside.isEmpty() || watts <= 0
                ? OptionalDouble.empty()
                : OptionalDouble.of(Thermal.largestCaseToAmbient(
                        most.getAsDouble(), condition.celsius(), watts, inside.getAsDouble()));
    }

    private static double fullConductionWatts(Design design, Condition condition) {
        return LoadPower.atFiringAngle(design, condition, 0).thyristorWatts();
    }

    /** The largest loss over the settings that matter and full conduction. */
    static Loss worstLoss(Bench bench, JudgedCondition at) {
        Loss worst = new Loss(fullConductionWatts(bench.design(), at.condition()), "full conduction");
        for (double ohms : bench.settingsThatMatter(at.condition())) {
            double watts = bench.load(at.condition(), ohms).thyristorWatts();
            if (watts > worst.watts()) {
                worst = new Loss(watts, "R_E = " + Say.ohms(ohms));
            }
        }
        return worst;
    }
}
