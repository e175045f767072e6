package clipramp.cli;

import clipramp.files.LoadedDesign;
import clipramp.firing.Dissipation;
import clipramp.firing.Pulse;
import clipramp.margins.Check;
import clipramp.margins.Margin;

/** The judgement for machines. */
final class CheckJson {
    private CheckJson() {}

    static String of(LoadedDesign loaded, Check check, boolean ascii) {
        return Answer.about("check", loaded, check.verdict(), check.notes()).json(ascii, json -> {
            Answer.titleAndCondition(json, loaded, check.condition());
            json.putObjects("knob", check.knob(), KnobJson::write)
                    .putObject("pulse", check.pulse(), CheckJson::writePulse)
                    .putObject("supply", supply -> writeSupply(supply, check))
                    .putObjects("margins", check.margins(), CheckJson::writeMargin)
                    .putObject("lineCurrent", check.lineCurrent(), LineJson::write)
                    .putObject("heat", check.heat(), LineJson::writeHeat);
        });
    }

    private static void writePulse(Json json, Check.PulseSummary summary) {
        Pulse pulse = summary.pulse();
        json.put("atKnob", summary.atKnob())
                .put("peakGateAmps", pulse.peakGateAmps())
                .put("peakGateVolts", pulse.peakGateVolts())
                .put("peakGateWatts", pulse.peakGateWatts())
                .put("peakBaseOneVolts", pulse.peakBaseOneVolts())
                .put("gateJoules", pulse.gateJoules())
                .put("gateCoulombs", pulse.gateCoulombs())
                .put("capacitorJoules", pulse.capacitorJoules())
                .put("aboveTriggerSeconds", pulse.aboveTriggerSeconds())
                .put("meanGateWatts", summary.meanGateWatts())
                .put("quiescentGateVolts", summary.quiescentGateVolts());
    }

    private static void writeSupply(Json json, Check check) {
        Dissipation bears = check.dissipation();
        json.put("dropperWatts", bears.dropperWatts())
                .put("zenerWatts", bears.zenerWatts())
                .put("clipFromDeg", Math.toDegrees(check.clipFromRad().orElse(Double.NaN)))
                .put("dropperPeakVolts", bears.dropperPeakVolts())
                .put("zenerPeakAmps", bears.zenerPeakAmps())
                .put("deviceWatts", bears.deviceWatts())
                .put("emitterRmsAmps", bears.emitterRmsAmps())
                .put("emitterPeakAmps", bears.emitterPeakAmps());
    }

    private static void writeMargin(Json json, Margin margin) {
        json.put("id", margin.id())
                .put("name", margin.name())
                .put("demand", margin.demand())
                .put("offered", margin.offered())
                .put("unit", margin.unit())
                .put("sense", margin.sense().word())
                .put("ratio", margin.ratio())
                .put("holdsFrom", margin.holdsFrom())
                .put("condition", margin.condition())
                .put("verdict", margin.verdict().word())
                .put("formula", margin.formula())
                .put("source", margin.source())
                .put("remedy", margin.remedy())
                .putWords("parts", margin.parts());
    }
}
