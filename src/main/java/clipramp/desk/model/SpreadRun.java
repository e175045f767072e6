package clipramp.desk.model;

import clipramp.files.LoadedDesign;
import clipramp.spread.Histogram;
import clipramp.spread.Spread;
import clipramp.spread.SpreadOptions;
import clipramp.spread.SpreadResult;
import clipramp.spread.Watch;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;

/** Draws many units of the design on the desk, tells how far it is, and can be cancelled: then the finished part counts. */
public final class SpreadRun {
    /**
     * @param done units drawn
     * @param of units asked for
     * @param unitsPerSecond how fast
     */
    public record Progress(int done, int of, double unitsPerSecond) {
        /** How long the rest will take, s. */
        public double secondsLeft() {
            return (of - done) / unitsPerSecond;
        }

        /** The same in words. */
        public String words() {
            if (done == 0) {
                return "Drawing " + of + " units…";
            }
            if (done >= of) {
                return "All " + of + " units are drawn; judging, and weighing what matters…";
            }
            return String.format(
                    Locale.ROOT,
                    "%d of %d units, %.0f a second, %.0f s left",
                    done,
                    of,
                    unitsPerSecond,
                    Math.ceil(secondsLeft()));
        }
    }

    /**
     * @param loaded the design as read when the run began
     * @param spread what its units do
     */
    public record Answer(LoadedDesign loaded, SpreadResult spread) {}

    /** A run, as the thread that draws sees it. */
    private final class Following implements Watch {
        private final long began = System.nanoTime();
        private volatile boolean cancelled;

        @Override
        public void progress(int done, int of) {
            double seconds = Math.max(1e-9, (System.nanoTime() - began) * 1e-9);
            Progress now = new Progress(done, of, done / seconds);
            workers.home().execute(() -> {
                progress = Optional.of(now);
                changed();
            });
        }

        @Override
        public void drawn(Histogram midKnob) {
            workers.home().execute(() -> {
                histogram = Optional.of(midKnob);
                changed();
            });
        }

        @Override
        public boolean isCancelled() {
            return cancelled;
        }
    }

    private final Workers workers;
    private final Consumer<Trouble> troubles;
    private final List<Runnable> listeners = new ArrayList<>();
    private Optional<Following> running = Optional.empty();
    private Optional<Progress> progress = Optional.empty();
    private Optional<Histogram> histogram = Optional.empty();
    private Optional<Answer> answer = Optional.empty();

    /**
     * @param workers where work is done
     * @param troubles takes what went wrong
     */
    public SpreadRun(Workers workers, Consumer<Trouble> troubles) {
        this.workers = workers;
        this.troubles = troubles;
    }

    /** Told at home whenever there is more to see. */
    public void onChange(Runnable listener) {
        listeners.add(listener);
    }

    private void changed() {
        listeners.forEach(Runnable::run);
    }

    /** Begins to draw; does nothing while a run goes on. */
    public void start(LoadedDesign loaded, SpreadOptions options) {
        if (running.isPresent()) {
            return;
        }
        Following following = new Following();
        running = Optional.of(following);
        progress = Optional.of(new Progress(0, options.samples(), 1));
        histogram = Optional.empty();
        changed();
        workers.drawing().execute(() -> {
            try {
                SpreadResult spread = Spread.run(loaded.design(), options, following);
                workers.home().execute(() -> finish(() -> answer = Optional.of(new Answer(loaded, spread))));
            } catch (RuntimeException e) {
                workers.home()
                        .execute(() -> finish(
                                () -> troubles.accept(Trouble.of("The units of this design could not be drawn", e))));
            }
        });
    }

    private void finish(Runnable report) {
        running = Optional.empty();
        report.run();
        changed();
    }

    /** Ends the run that goes on; what was drawn until then is told. */
    public void cancel() {
        running.ifPresent(r -> r.cancelled = true);
        changed();
    }

    public boolean isRunning() {
        return running.isPresent();
    }

    /** Whether the run is told to end and has not yet. */
    public boolean isEnding() {
        return running.map(Following::isCancelled).orElse(false);
    }

    public Optional<Progress> progress() {
        return progress;
    }

    /** How the units lie at mid-knob, as far as they are drawn. */
    public Optional<Histogram> histogram() {
        return histogram;
    }

    public Optional<Answer> answer() {
        return answer;
    }

    /** The answer, if it is of this very design. */
    public Optional<SpreadResult> of(LoadedDesign loaded) {
        return answer.filter(a -> a.loaded().equals(loaded) && a.spread().units() > 0)
                .map(Answer::spread);
    }
}
