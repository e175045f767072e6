package clipramp.desk.model;

import clipramp.runs.Watch;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.CancellationException;
import java.util.concurrent.Executor;
import java.util.function.Consumer;

/**
 * Long work away from home that tells how far it is and can be cancelled; one at a time. What was cancelled leaves the
 * last answer as it was.
 *
 * @param <Q> request
 * @param <A> answer
 */
public final class LongRun<Q, A> {
    /**
     * What is done.
     *
     * @param <Q> request
     * @param <A> answer
     */
    @FunctionalInterface
    public interface Work<Q, A> {
        /**
         * Does it, away from home.
         *
         * @param request what was asked
         * @param telling told of the steps
         * @throws CancellationException where a watch was told that the run is to end
         */
        A done(Q request, Telling telling);
    }

    /** How the work tells of its steps. */
    @FunctionalInterface
    public interface Telling {
        /**
         * A watch for one part of the work, which ends when the run is cancelled.
         *
         * @param words says how far it is
         */
        Watch of(Words words);
    }

    /** Progress in words. */
    @FunctionalInterface
    public interface Words {
        /** Words for so many steps done, of so many in all. */
        String of(int done, int of);
    }

    /**
     * How far a run is.
     *
     * @param words in words
     * @param share the same as a share, 0..1; empty where nobody knows how much there will be
     */
    public record Progress(String words, OptionalDouble share) {}

    private final class Following {
        private volatile boolean cancelled;

        private Watch watch(Words words) {
            return new Watch() {
                @Override
                public void progress(int done, int of) {
                    OptionalDouble share =
                            of > 0 ? OptionalDouble.of(Math.min(1, (double) done / of)) : OptionalDouble.empty();
                    Progress now = new Progress(words.of(done, of), share);
                    home.execute(() -> {
                        if (running.equals(Optional.of(Following.this))) {
                            progress = Optional.of(now);
                            changed();
                        }
                    });
                }

                @Override
                public boolean isCancelled() {
                    return cancelled;
                }
            };
        }
    }

    private final String what;
    private final Work<Q, A> work;
    private final Executor away;
    private final Executor home;
    private final Consumer<Trouble> troubles;
    private final List<Runnable> listeners = new ArrayList<>();
    private Optional<Following> running = Optional.empty();
    private Optional<Progress> progress = Optional.empty();
    private Optional<A> answer = Optional.empty();
    private Optional<Trouble> trouble = Optional.empty();

    /**
     * @param what what has failed where it fails, such as "No values could be chosen"
     * @param work what is done
     * @param away where it is done
     * @param home the thread that asks and is answered
     */
    LongRun(String what, Work<Q, A> work, Executor away, Executor home) {
        this(what, work, away, home, told -> {});
    }

    /**
     * The same, where failures are told elsewhere too.
     *
     * @param troubles takes, at home, what went wrong
     */
    LongRun(String what, Work<Q, A> work, Executor away, Executor home, Consumer<Trouble> troubles) {
        this.what = what;
        this.work = work;
        this.away = away;
        this.home = home;
        this.troubles = troubles;
    }

    /** Told at home whenever there is more to see. */
    public void onChange(Runnable listener) {
        listeners.add(listener);
    }

    /** For what a run shows besides its progress. */
    void changed() {
        List.copyOf(listeners).forEach(Runnable::run);
    }

    /** Begins; does nothing while a run goes on. */
    public void start(Q request) {
        if (running.isPresent()) {
            return;
        }
        Following following = new Following();
        running = Optional.of(following);
        progress = Optional.empty();
        trouble = Optional.empty();
        changed();
        away.execute(() -> {
            try {
                A done = work.done(request, following::watch);
                home.execute(() -> finish(() -> answer = Optional.of(done)));
            } catch (CancellationException e) {
                home.execute(() -> finish(() -> {}));
            } catch (RuntimeException e) {
                home.execute(() -> finish(() -> failed(Trouble.of(what, e))));
            }
        });
    }

    private void failed(Trouble why) {
        trouble = Optional.of(why);
        troubles.accept(why);
    }

    private void finish(Runnable report) {
        running = Optional.empty();
        report.run();
        changed();
    }

    /** Tells the run that goes on to end; it does as soon as its work asks the watch. */
    public void cancel() {
        running.ifPresent(r -> r.cancelled = true);
        changed();
    }

    /** Forgets the answer. */
    public void clear() {
        answer = Optional.empty();
        trouble = Optional.empty();
        changed();
    }

    /** Whether a run goes on. */
    public boolean isRunning() {
        return running.isPresent();
    }

    /** Whether the run is told to end and has not yet. */
    public boolean isEnding() {
        return running.map(r -> r.cancelled).orElse(false);
    }

    /** How far the run is; empty before its first word. */
    public Optional<Progress> progress() {
        return progress;
    }

    /** The last answer. */
    public Optional<A> answer() {
        return answer;
    }

    /** Why the last run has none. */
    public Optional<Trouble> trouble() {
        return trouble;
    }
}
