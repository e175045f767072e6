package clipramp.desk.model;

import clipramp.files.DesignText;
import clipramp.files.ReadingsTable;
import clipramp.files.Source;
import clipramp.files.WholeFile;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;

/**
 * The design file on the desk: its text with every step back, and where it is kept. Edits are read away from home, one
 * after the other; what cannot be read changes nothing.
 */
public final class Draft {
    private record Edit(String name, Function<Sheet, DesignText> change, Consumer<Optional<Trouble>> done) {}

    private final Workers workers;
    private final Workshop workshop;
    private final Recovery recovery;
    private final Deque<Edit> edits = new ArrayDeque<>();
    private final List<Runnable> listeners = new ArrayList<>();
    private Optional<History<Sheet>> history = Optional.empty();
    private Optional<Path> file = Optional.empty();
    private String name = "";
    private String saved = "";
    private final Errands errands;
    private boolean editing;

    /**
     * @param workers where work is done
     * @param workshop reads and edits design files
     * @param recovery keeps unsaved work
     * @param troubles takes what went wrong where nobody waits for the answer
     */
    Draft(Workers workers, Workshop workshop, Recovery recovery, Consumer<Trouble> troubles) {
        this.workers = workers;
        this.workshop = workshop;
        this.recovery = recovery;
        this.errands = new Errands(workers, troubles);
    }

    /** What reads and edits its text. */
    public Workshop workshop() {
        return workshop;
    }

    /** Told whenever design, file or saved state changed. */
    public void onChange(Runnable listener) {
        listeners.add(listener);
    }

    /** Whether a design lies on the desk. */
    public boolean isOpen() {
        return history.isPresent();
    }

    /** The design as it stands. */
    public Optional<Sheet> sheet() {
        return history.map(History::now);
    }

    /** Where the design is saved; empty where it never was. */
    public Optional<Path> file() {
        return file;
    }

    /** The file's name, or what the design was made from. */
    public String name() {
        return file.map(f -> String.valueOf(f.getFileName())).orElse(name);
    }

    /** Whether the design differs from what is saved. */
    public boolean isDirty() {
        return sheet().map(s -> !s.text().text().equals(saved)).orElse(false);
    }

    /** Whether something is being read or written. */
    boolean isBusy() {
        return editing || errands.isRunning() || !edits.isEmpty();
    }

    /** Reads a file and puts it on the desk. */
    public void open(Path path) {
        Path absolute = path.toAbsolutePath().normalize();
        errands.fetch(
                "The design cannot be opened",
                () -> {
                    DesignText text = DesignText.of(Source.of(absolute));
                    return workshop.read(text.named(String.valueOf(absolute.getFileName())), Optional.of(absolute));
                },
                sheet -> put(sheet, Optional.of(absolute), "", sheet.text().text()));
    }

    /** Puts a design on the desk that was never saved: an example, a proposal. */
    public void openUnsaved(String title, String text) {
        errands.fetch(
                "The design cannot be opened",
                () -> {
                    Sheet sheet = workshop.read(DesignText.of(new Source(title, text)), Optional.empty());
                    recovery.keep(Optional.empty(), text);
                    return sheet;
                },
                sheet -> put(sheet, Optional.empty(), title, ""));
    }

    /** Puts a design on the desk that a search has found; {@code then} runs once it lies there. */
    public void take(Resized found, Runnable then) {
        Sheet sheet = found.sheet();
        errands.run(
                "The design cannot be taken over",
                () -> recovery.keep(Optional.empty(), sheet.text().text()),
                () -> {
                    put(sheet, Optional.empty(), sheet.text().name(), "");
                    then.run();
                });
    }

    /** Puts work on the desk that a window left behind when its process ended; {@code then} runs once it lies there. */
    public void recover(Recovery.Left left, Runnable then) {
        errands.fetch(
                "The work that was left cannot be read",
                () -> {
                    String title = left.file()
                            .map(f -> String.valueOf(f.getFileName()))
                            .orElse("recovered");
                    Sheet sheet = workshop.read(DesignText.of(new Source(title, left.text())), left.file());
                    recovery.take(left);
                    return sheet;
                },
                sheet -> {
                    put(sheet, left.file(), "recovered", "");
                    then.run();
                });
    }

    private void put(Sheet sheet, Optional<Path> belongs, String title, String savedText) {
        edits.clear();
        history = Optional.of(new History<>(sheet));
        file = belongs;
        name = title;
        saved = savedText;
        errands.run(
                "The unsaved work could not be kept",
                () -> recovery.follow(belongs, sheet.text().text()),
                () -> {});
        changed();
    }

    private void changed() {
        listeners.forEach(Runnable::run);
    }

    /**
     * Changes the value at a key.
     *
     * @param key design key
     * @param label what the step is called by
     * @param value value as it is to be written
     * @param done told at home what was wrong with it, or nothing
     */
    public void set(String key, String label, String value, Consumer<Optional<Trouble>> done) {
        edit(label + " to " + value, sheet -> sheet.text().withValue(key, value), done);
    }

    /**
     * Chooses a word at a key, with whatever else must change for the circuit to stay sound.
     *
     * @param key design key
     * @param word the choice
     * @param done told at home what was wrong with it, or nothing
     */
    public void choose(String key, String word, Consumer<Optional<Trouble>> done) {
        edit(
                key + " to " + word,
                sheet -> Companions.chosen(sheet, key, word, workshop.isProgrammable(word, file)),
                done);
    }

    /**
     * Changes the text by one step that can be taken back.
     *
     * @param stepName what the step is called by
     * @param change makes the new text, away from home
     * @param done told at home what was wrong with it, or nothing
     */
    public void edit(String stepName, Function<Sheet, DesignText> change, Consumer<Optional<Trouble>> done) {
        edits.add(new Edit(stepName, change, done));
        nextEdit();
    }

    private void nextEdit() {
        if (editing || edits.isEmpty() || history.isEmpty()) {
            return;
        }
        Edit edit = edits.remove();
        Sheet before = history.get().now();
        Optional<Path> belongs = file;
        editing = true;
        workers.writing().execute(() -> {
            try {
                DesignText text = edit.change().apply(before);
                boolean same = text.text().equals(before.text().text());
                Sheet after = same ? before : workshop.read(text, belongs);
                if (!same) {
                    recovery.keep(belongs, text.text());
                }
                workers.home().execute(() -> accept(edit, before, after));
            } catch (IOException | RuntimeException e) {
                workers.home().execute(() -> refuse(edit, e));
            }
        });
    }

    private void accept(Edit edit, Sheet before, Sheet after) {
        editing = false;
        if (!after.equals(before)) {
            history.ifPresent(h -> h.step(edit.name(), after));
            changed();
        }
        edit.done().accept(Optional.empty());
        nextEdit();
    }

    private void refuse(Edit edit, Exception failure) {
        editing = false;
        edit.done().accept(Optional.of(Trouble.of("This was not taken", failure)));
        nextEdit();
    }

    /** What undo would take back; empty where there is nothing. */
    public Optional<String> undoName() {
        return history.flatMap(History::undoName);
    }

    /** What redo would do again; empty where there is nothing. */
    public Optional<String> redoName() {
        return history.flatMap(History::redoName);
    }

    /** Takes the last step back, if there is one. */
    public void undo() {
        step(History::undo);
    }

    /** Does the step again that was taken back last, if there is one. */
    public void redo() {
        step(History::redo);
    }

    private void step(Consumer<History<Sheet>> move) {
        history.ifPresent(h -> {
            move.accept(h);
            String text = h.now().text().text();
            Optional<Path> belongs = file;
            errands.run("The unsaved work could not be kept", () -> recovery.keep(belongs, text), () -> {});
            changed();
        });
    }

    /** Saves the design, whole or not at all, and works on under that file's name; {@code then} runs once it is saved. */
    public void save(Path target, Runnable then) {
        Path absolute = target.toAbsolutePath().normalize();
        sheet().ifPresent(sheet -> errands.run(
                "The design cannot be saved",
                () -> {
                    WholeFile.write(absolute, sheet.text().text(), true);
                    recovery.forgetDesign();
                    recovery.follow(Optional.of(absolute), sheet.text().text());
                },
                () -> {
                    file = Optional.of(absolute);
                    saved = sheet.text().text();
                    changed();
                    then.run();
                }));
    }

    /**
     * Keeps readings that were typed against a sudden end.
     *
     * @param typed the readings; empty once they are saved or given up
     * @param then runs once they are kept
     */
    public void keepReadings(Optional<ReadingsTable> typed, Runnable then) {
        errands.run("The readings could not be kept", () -> recovery.keepReadings(typed), then);
    }

    /** Gives unsaved changes of the design up; {@code then} runs once nothing is kept of them. */
    public void abandon(Runnable then) {
        errands.run("The unsaved work could not be forgotten", recovery::forgetDesign, then);
    }
}
