package clipramp.desk.model;

import java.util.concurrent.Executor;
import java.util.function.Consumer;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;

/**
 * Work that is asked for faster than it can be done: one request runs, the newest one waits, those between are
 * dropped. Answers come in the order of their requests.
 *
 * @param <Q> request
 * @param <A> answer
 */
public final class LatestWins<Q, A> {
    private final Function<Q, A> work;
    private final Executor away;
    private final Executor home;
    private final Consumer<A> answered;
    private final Consumer<RuntimeException> failed;
    private @Nullable Q waiting;
    private boolean running;

    /**
     * @param work what is done away from home
     * @param away where it is done
     * @param home the thread that asks and is answered
     * @param answered takes every answer, at home
     * @param failed takes what the work threw, at home
     */
    public LatestWins(
            Function<Q, A> work,
            Executor away,
            Executor home,
            Consumer<A> answered,
            Consumer<RuntimeException> failed) {
        this.work = work;
        this.away = away;
        this.home = home;
        this.answered = answered;
        this.failed = failed;
    }

    /** Asks, from home; an older request that still waits is forgotten. */
    public void ask(Q request) {
        if (running) {
            waiting = request;
        } else {
            start(request);
        }
    }

    /** Whether an answer is still to come. */
    boolean isBusy() {
        return running;
    }

    private void start(Q request) {
        running = true;
        away.execute(() -> {
            try {
                A answer = work.apply(request);
                home.execute(() -> finish(() -> answered.accept(answer)));
            } catch (RuntimeException e) {
                home.execute(() -> finish(() -> failed.accept(e)));
            }
        });
    }

    private void finish(Runnable report) {
        running = false;
        Q next = waiting;
        waiting = null;
        if (next != null) {
            start(next);
        }
        report.run();
    }
}
