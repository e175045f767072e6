package clipramp.desk.model;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;

/**
 * Steps that can be taken back and taken again, each with a name.
 *
 * @param <T> what is stepped through; never changes itself
 */
final class History<T> {
    /** Designs are a few kilobytes; this many are no burden. */
    private static final int MOST = 500;

    private record Step<T>(String name, T state) {}

    private final Deque<Step<T>> before = new ArrayDeque<>();
    private final Deque<Step<T>> after = new ArrayDeque<>();
    private T now;

    History(T start) {
        this.now = start;
    }

    T now() {
        return now;
    }

    /** Goes on to another state; what was taken back before can no longer be taken again. */
    void step(String name, T next) {
        before.push(new Step<>(name, now));
        if (before.size() > MOST) {
            before.removeLast();
        }
        after.clear();
        now = next;
    }

    /** What undo would take back, such as "ramp capacitor to 100 nF". */
    Optional<String> undoName() {
        return Optional.ofNullable(before.peek()).map(Step::name);
    }

    Optional<String> redoName() {
        return Optional.ofNullable(after.peek()).map(Step::name);
    }

    void undo() {
        if (!before.isEmpty()) {
            Step<T> step = before.pop();
            after.push(new Step<>(step.name(), now));
            now = step.state();
        }
    }

    void redo() {
        if (!after.isEmpty()) {
            Step<T> step = after.pop();
            before.push(new Step<>(step.name(), now));
            now = step.state();
        }
    }
}
