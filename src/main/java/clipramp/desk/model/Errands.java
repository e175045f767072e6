package clipramp.desk.model;

import java.io.IOException;
import java.util.function.Consumer;

/** Reading and writing that nobody waits for: done away from home, one after the other, and what went wrong is told. */
final class Errands {
    private final Workers workers;
    private final Consumer<Trouble> troubles;
    private int running;

    /**
     * @param workers where they are done
     * @param troubles told at home what went wrong
     */
    Errands(Workers workers, Consumer<Trouble> troubles) {
        this.workers = workers;
        this.troubles = troubles;
    }

    /** Something to be brought. */
    interface Fetching<T> {
        T fetch() throws IOException;
    }

    /** Something to be done. */
    interface Doing {
        void run() throws IOException;
    }

    /** Whether one is not yet done. */
    boolean isRunning() {
        return running > 0;
    }

    /**
     * Brings something.
     *
     * @param what headline of the trouble where it fails
     * @param then takes it at home
     */
    <T> void fetch(String what, Fetching<T> task, Consumer<T> then) {
        running++;
        workers.writing().execute(() -> {
            try {
                T brought = task.fetch();
                workers.home().execute(() -> {
                    running--;
                    then.accept(brought);
                });
            } catch (IOException | RuntimeException e) {
                workers.home().execute(() -> {
                    running--;
                    troubles.accept(Trouble.of(what, e));
                });
            }
        });
    }

    /** Does something; {@code then} runs at home once it is done. */
    void run(String what, Doing task, Runnable then) {
        fetch(
                what,
                () -> {
                    task.run();
                    return true;
                },
                done -> then.run());
    }
}
