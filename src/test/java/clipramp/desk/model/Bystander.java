package clipramp.desk.model;

import clipramp.files.ProfileLibrary;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.concurrent.Executor;

/** Stands in for the window's thread and its workers: work waits until it is let run, all on the test's own thread. */
final class Bystander {
    final Deque<Runnable> away = new ArrayDeque<>();
    final Deque<Runnable> home = new ArrayDeque<>();
    final List<Trouble> troubles = new ArrayList<>();
    final Workers workers;

    Bystander() {
        Executor working = away::add;
        workers = new Workers(home::add, working, working, working, working, working);
    }

    static Workshop workshop() {
        return new Workshop(file -> ProfileLibrary.shipped());
    }

    DeskModel model(Path state) {
        Recovery recovery = new Recovery(new Places(state, state), ProcessHandle.current(), 1);
        return new DeskModel(workers, workshop(), recovery, troubles::add);
    }

    /** A draft by itself: edits are read, nothing is solved. */
    Draft draft(Path state) {
        Recovery recovery = new Recovery(new Places(state, state), ProcessHandle.current(), 1);
        return new Draft(workers, workshop(), recovery, troubles::add);
    }

    /** Runs everything that waits, and what that asks for. */
    void run() {
        while (!away.isEmpty() || !home.isEmpty()) {
            Runnable next = home.isEmpty() ? away.remove() : home.remove();
            next.run();
        }
    }
}
