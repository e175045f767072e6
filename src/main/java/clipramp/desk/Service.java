package clipramp.desk;

import clipramp.desk.model.Trouble;
import clipramp.desk.model.Workers;
import java.io.IOException;

/**
 * What every action needs of the window that it serves.
 *
 * @param window the window
 * @param asks how it asks for files
 * @param workers where work is done
 */
record Service(DeskWindow window, FileAsk asks, Workers workers) {
    /** Something that reads or writes. */
    interface Task {
        void run() throws IOException;
    }

    Dialogs dialogs() {
        return new Dialogs(window.stage(), window.theme());
    }

    /** Shows a failure. */
    void show(Trouble trouble) {
        dialogs().trouble(trouble);
    }

    /**
     * Does something where files are written, then something at home; what goes wrong is shown.
     *
     * @param what what could not be done, should it fail
     */
    void away(String what, Task task, Runnable then) {
        workers.writing().execute(() -> {
            try {
                task.run();
                workers.home().execute(then);
            } catch (IOException | RuntimeException e) {
                workers.home().execute(() -> show(Trouble.of(what, e)));
            }
        });
    }
}
