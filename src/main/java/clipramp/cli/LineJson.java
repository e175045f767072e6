package clipramp.cli;

import clipramp.margins.HeatCheck;
import clipramp.margins.LineCheck;
import clipramp.power.LineCurrent;
import java.util.OptionalInt;

/** Line current and heat for machines: amperes rms, degrees, shares, watts. */
final class LineJson {
    private LineJson() {}

    static void write(Json json, LineCheck check) {
        LineCheck.Setting worst = check.worstSetting();
        LineCurrent current = worst.current();
        json.put("atKnob", worst.position())
                .put("rampOhms", worst.rampOhms())
                .put("firedDeg", Math.toDegrees(worst.firedRad().orElse(Double.NaN)))
                .put("loadWatts", worst.watts())
                .put("fundamentalAmps", current.fundamentalAmps())
                .put("rmsAmps", current.rmsAmps())
                .put("dcAmps", current.dcAmps())
                .put("lineWatts", current.lineWatts())
                .put("distortion", current.distortion())
                .put("displacementFactor", current.displacementFactor())
                .put("powerFactor", current.powerFactor())
                .putObjects(
                        "harmonics",
                        current.harmonics(),
                        (row, harmonic) -> row.put("order", harmonic.order())
                                .put("amps", harmonic.amps())
                                .put("share", current.shareOf(harmonic.order()))
                                .put("phaseDeg", Math.toDegrees(harmonic.phaseRad())))
                .putObjects(
                        "largest",
                        check.orders(),
                        (row, order) -> row.put("order", order.order())
                                .put("amps", order.amps())
                                .put("atKnob", order.position())
                                .put("classAAmps", order.limitAmps()))
                .putObjects("rules", check.rules(), LineJson::rule)
                .putObjects("knob", check.settings(), LineJson::setting);
    }

    private static void rule(Json json, LineCheck.Rule rule) {
        json.put("id", rule.id())
                .put("name", rule.name())
                .put("source", rule.source())
                .put("standing", rule.standing().word())
                .put("order", whole(rule.order()))
                .put("used", rule.used())
                .put("bindsAtWatts", rule.bindsAtWatts())
                .put("text", rule.text());
    }

    private static double whole(OptionalInt value) {
        return value.isPresent() ? value.getAsInt() : Double.NaN;
    }

    private static void setting(Json json, LineCheck.Setting setting) {
        LineCurrent current = setting.current();
        json.put("position", setting.position())
                .put("fundamentalAmps", current.fundamentalAmps())
                .put("rmsAmps", current.rmsAmps())
                .put("dcAmps", current.dcAmps())
                .put("distortion", current.distortion())
                .put("displacementFactor", current.displacementFactor())
                .put("powerFactor", current.powerFactor());
    }

    static void writeHeat(Json json, HeatCheck heat) {
        json.put("thyristorWatts", heat.watts())
                .put("at", heat.where())
                .put("condition", heat.condition())
                .put("fullConductionWatts", heat.fullConductionWatts())
                .put("junctionCelsius", heat.junctionCelsius())
                .put("sinkKelvinPerWatt", heat.sinkKelvinPerWatt());
    }
}
