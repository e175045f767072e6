package clipramp.desk;

import clipramp.desk.model.Draft;
import clipramp.desk.model.RecordMaker;
import clipramp.desk.model.Recovery;
import clipramp.desk.model.Trouble;
import clipramp.files.WholeFile;
import java.io.IOException;
import java.nio.file.Path;
import java.util.function.Consumer;

/** Opens, saves and closes designs; unsaved work is asked about first. */
final class FileActions {
    private final Service service;
    private final Draft draft;
    private final Recovery recovery;
    private final Late<RecordMaker> maker;

    FileActions(Service service, Draft draft, Recovery recovery, Late<RecordMaker> maker) {
        this.service = service;
        this.draft = draft;
        this.recovery = recovery;
        this.maker = maker;
    }

    /**
     * Asks for a file and opens it.
     *
     * @param readings takes a file of readings, which is no design
     */
    void open(Consumer<Path> readings) {
        whenSaved(() -> service.asks().toOpen(FileAsk.Kind.DESIGN).ifPresent(file -> {
            if (ReadingsActions.isReadings(file)) {
                readings.accept(file);
            } else {
                draft.open(file);
            }
        }));
    }

    void recover(Recovery.Left work) {
        whenSaved(() -> draft.recover(work, () -> work.readings().ifPresent(service.window()::takeBack)));
    }

    void forget(Recovery.Left work) {
        service.away("The unsaved work could not be forgotten", () -> recovery.forget(work), this::offerRecovery);
    }

    /** Looks for work that was left behind, and offers it. */
    void offerRecovery() {
        service.workers().writing().execute(() -> {
            try {
                var works = recovery.leftBehind();
                service.workers().home().execute(() -> service.window().offer(works));
            } catch (IOException e) {
                Trouble trouble = Trouble.of("Unsaved work could not be looked for", e);
                service.workers().home().execute(() -> service.show(trouble));
            }
        });
    }

    void save() {
        saveThen(() -> {});
    }

    private void saveThen(Runnable then) {
        draft.file().ifPresentOrElse(file -> draft.save(file, then), () -> saveAsThen(then));
    }

    void saveAs() {
        saveAsThen(() -> {});
    }

    private void saveAsThen(Runnable then) {
        service.asks()
                .toWrite(FileAsk.Kind.DESIGN, draft.name(), draft.file())
                .ifPresent(file -> draft.save(file, then));
    }

    /** Goes on at once, or after the user has decided about unsaved work. */
    void whenSaved(Runnable then) {
        if (!draft.isDirty()) {
            then.run();
            return;
        }
        service.dialogs().unsaved(draft.name(), answer -> {
            if (answer == Dialogs.SAVE) {
                saveThen(then);
            } else if (answer == Dialogs.DISCARD) {
                draft.abandon(then);
            }
        });
    }

    void saveRecord() {
        maker.get().pdf().ifPresent(pdf -> {
            String name = draft.name().replaceFirst("\\.ya?ml$", "") + ".pdf";
            service.asks()
                    .toWrite(FileAsk.Kind.RECORD, name, draft.file())
                    .ifPresent(file -> service.away(
                            "The record cannot be saved",
                            () -> WholeFile.write(file, out -> out.write(pdf), true),
                            () -> service.window().say("Saved " + file.getFileName())));
        });
    }
}
