package clipramp.cli;

import clipramp.files.DesignText;
import clipramp.files.LoadedDesign;
import clipramp.files.PartialDesign;
import clipramp.files.SizedText;
import clipramp.margins.Margin;
import clipramp.margins.Note;
import clipramp.sizing.Reason;
import clipramp.sizing.SizingAnswer;
import clipramp.sizing.SizingAnswer.Conflict;
import java.util.ArrayList;
import java.util.List;

/** What size found, for machines. */
final class SizeJson {
    private SizeJson() {}

    static String of(
            LoadedDesign loaded,
            PartialDesign partial,
            SizingAnswer answer,
            List<Reason> reasons,
            DesignText text,
            boolean ascii) {
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
                            reasons,
                            (part, r) -> part.put("key", r.part().key())
                                    .put(
                                            "value",
                                            SizedText.value(r.part(), answer.design())
                                                    .orElse(""))
                                    .put("relation", r.relation())
                                    .put("up", r.up())
                                    .put("down", r.down()))
                    .putWords(
                            "cornerFailures",
                            answer.cornerFailures().stream().map(Margin::id).toList())
                    .putObjects("conflicts", answer.conflicts(), SizeJson::conflict)
                    .put("design", text.text());
        });
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
