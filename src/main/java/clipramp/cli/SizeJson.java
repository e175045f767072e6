package clipramp.cli;

import clipramp.files.DesignText;
import clipramp.files.LoadedDesign;
import clipramp.files.PartialDesign;
import clipramp.files.SizedText;
import clipramp.margins.Margin;
import clipramp.margins.Note;
import clipramp.sizing.Compensation.Choice;
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
                    .putObjects(
                            "parts",
                            result.reasons(),
                            (part, r) -> part.put("key", r.part().key())
                                    .put(
                                            "value",
                                            SizedText.value(r.part(), answer.design())
                                                    .orElse(""))
                                    .put("relation", r.relation())
                                    .put("up", r.up())
                                    .put("down", r.down()))
                    .putObjects(
                            "unitSettings",
                            UnitSetting.of(answer.design()),
                            (setting, at) -> setting.put("key", at.part().key())
                                    .put("knob", at.position())
                                    .put("firingDeg", Math.toDegrees(at.firingRad()))
                                    .put("loadVolts", at.loadVolts())
                                    .put("powerFraction", at.fraction()))
                    .putWords(
                            "cornerFailures",
                            answer.cornerFailures().stream().map(Margin::id).toList())
                    .putObjects("conflicts", answer.conflicts(), SizeJson::conflict)
                    .putObject(
                            "shape",
                            result.shape(),
                            (shape, s) -> shape.put("what", s.what().name().toLowerCase(Locale.ROOT))
                                    .put("largestDeparture", s.largestDeparture())
                                    .put("deadLow", s.deadLow())
                                    .put("deadHigh", s.deadHigh())
                                    .put("steepestPerDegree", s.steepestPerDegree()))
                    .putObject(
                            "compensation",
                            result.compensation(),
                            (c, found) -> c.putObject("flattest", flattest -> choice(flattest, found.flattest()))
                                    .putObjects("rules", found.rules(), SizeJson::choice))
                    .put("design", text.text());
        });
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
