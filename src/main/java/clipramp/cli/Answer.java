package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.files.LoadedDesign;
import clipramp.margins.Note;
import clipramp.margins.Verdict;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;

/**
 * What stands in every answer for machines, whatever the command: format, program, digest of the input, verdict, notes,
 * what was assumed and the profiles in use.
 *
 * @param name the command that answers
 * @param loaded the design that was read; empty where none was asked for
 * @param verdict the judgement, where there is one
 * @param notes what else to know
 */
record Answer(String name, Optional<LoadedDesign> loaded, Optional<Verdict> verdict, List<Note> notes) {
    /** Version of every answer's format; within it keys are only added. */
    static final int VERSION = 1;

    Answer {
        notes = List.copyOf(notes);
    }

    /** An answer that no design stands behind. */
    static Answer without(String name) {
        return new Answer(name, Optional.empty(), Optional.empty(), List.of());
    }

    /** An answer about a design: the reader's notes first, then the judge's. */
    static Answer about(String name, LoadedDesign loaded, Verdict verdict, List<Note> notes) {
        List<Note> all = new ArrayList<>(readerNotes(loaded));
        all.addAll(notes);
        return new Answer(name, Optional.of(loaded), Optional.of(verdict), all);
    }

    /** What the reader of the design has to tell. */
    static List<Note> readerNotes(LoadedDesign loaded) {
        return loaded.notes().stream().map(text -> new Note("input", text)).toList();
    }

    /** The whole answer as text. */
    String json(boolean ascii, Consumer<Json> body) {
        return Json.object(ascii, json -> {
            head(json);
            body.accept(json);
        });
    }

    private void head(Json json) {
        json.putObject("format", format -> format.put("name", name).put("version", VERSION))
                .put("program", Program.nameAndVersion())
                .put("inputDigest", loaded.map(LoadedDesign::inputDigest).orElse(null))
                .put("verdict", verdict.map(Verdict::word).orElse(null))
                .putObjects("notes", notes, (note, n) -> note.put("id", n.id()).put("text", n.text()))
                .putObjects(
                        "assumed",
                        loaded.map(LoadedDesign::assumed).orElse(List.of()),
                        (assumed, a) -> assumed.put("path", a.path()).put("value", a.value()))
                .putObjects(
                        "profiles",
                        loaded.map(LoadedDesign::profiles).orElse(List.of()),
                        (profile, p) -> profile.put("id", p.id())
                                .put("kind", p.kind())
                                .put("from", p.from())
                                .put("digest", p.digest())
                                .put("hides", p.hides()))
                .putWords("overrides", loaded.map(LoadedDesign::overrides).orElse(List.of()));
    }

    /** Members that name the design and what it was solved at. */
    static void titleAndCondition(Json json, LoadedDesign loaded, Condition condition) {
        json.put("title", loaded.design().title())
                .putObject(
                        "condition",
                        at -> at.put("lineVolts", condition.lineVolts())
                                .put("lineHertz", condition.lineHertz())
                                .put("celsius", condition.celsius()));
    }
}
