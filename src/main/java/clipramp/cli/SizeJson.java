package clipramp.cli;

import clipramp.circuit.Design;
import clipramp.files.DesignText;
import clipramp.files.LoadedDesign;
import clipramp.files.PartialDesign;
import clipramp.files.SizedText;
import clipramp.margins.Margin;
import clipramp.margins.Note;
import clipramp.sizing.Compensation;
import clipramp.sizing.Compensation.Choice;
import clipramp.sizing.KnobShape;
import clipramp.sizing.Reason;
import clipramp.sizing.SizingAnswer;
import clipramp.sizing.SizingAnswer.Conflict;
import clipramp.sizing.UnitSetting;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** What size found, for machines. */
final class SizeJson {
    private SizeJson() {}

    static String of(LoadedDesign loaded, PartialDesign partial, SizedResult result, DesignText text, boolean ascii) {
        SizingAnswer answer = result.answer();
        List<Note> notes = new ArrayList<>();
        partial.notes().forEach(n -> notes.add(new Note("wanted", n)));
        notes.addAll(answer.check().notes());
        return Answer.about("size", loaded, answer.check().verdict(), notes).json(ascii, json -> {
            Answer.titleAndCondition(json, loaded, answer.check().condition());
            json.put("outcome", answer.outcome().word())
                    .put("yield", answer.yield())
                    .put("deadTravel", answer.deadTravel())
                    .put("heatWatts", answer.watts())
                    .put("candidates", answer.candidates())
                    .putObjects("parts", result.reasons(), (part, reason) -> part(part, reason, answer.design()))
                    .putObjects("unitSettings", UnitSetting.of(answer.design()), SizeJson::unitSetting)
                    .putWords(
                            "cornerFailures",
                            answer.cornerFailures().stream().map(Margin::id).toList())
                    .putObjects("conflicts", answer.conflicts(), SizeJson::conflict)
                    .putObject("shape", result.shape(), SizeJson::shape)
                    .putObject("compensation", result.compensation(), SizeJson::compensation)
                    .put("design", text.text());
        });
    }

    private static void part(Json json, Reason reason, Design design) {
        json.put("key", reason.part().key())
                .put("value", SizedText.value(reason.part(), design).orElse(""))
                .put("relation", reason.relation())
                .put("up", reason.up())
                .put("down", reason.down());
    }

    private static void unitSetting(Json json, UnitSetting at) {
        json.put("key", at.part().key())
                .put("knob", at.position())
                .put("firingDeg", Math.toDegrees(at.firingRad()))
                .put("loadVolts", at.loadVolts())
                .put("powerFraction", at.fraction());
    }

    private static void shape(Json json, KnobShape shape) {
        json.put("what", shape.what().name().toLowerCase(Locale.ROOT))
                .put("largestDeparture", shape.largestDeparture())
                .put("deadLow", shape.deadLow())
                .put("deadHigh", shape.deadHigh())
                .put("steepestPerDegree", shape.steepestPerDegree());
    }

    private static void compensation(Json json, Compensation found) {
        json.putObject("flattest", flattest -> choice(flattest, found.flattest()))
                .putObjects("rules", found.rules(), SizeJson::choice);
    }

    private static void choice(Json json, Choice choice) {
        json.put("rule", choice.rule()).put("ohms", choice.ohms()).put("driftDeg", Math.toDegrees(choice.driftRad()));
    }

    private static void conflict(Json json, Conflict conflict) {
        Margin margin = conflict.margin();
        json.put("id", margin.id())
                .put("name", margin.name())
                .put("demand", margin.demand())
                .put("offered", margin.offered())
                .put("unit", margin.unit())
                .put("condition", margin.condition())
                .putWords("with", conflict.with())
                .put("nearest", conflict.nearest());
    }
}
