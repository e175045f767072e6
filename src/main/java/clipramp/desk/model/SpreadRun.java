package clipramp.desk.model;

import clipramp.files.LoadedDesign;
import clipramp.runs.Watch;
import clipramp.spread.Histogram;
import clipramp.spread.Spread;
import clipramp.spread.SpreadOptions;
import clipramp.spread.SpreadResult;
import clipramp.spread.SpreadWords;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Executor;
import java.util.function.Consumer;

/** Draws many units of the design on the desk, tells how far it is, and can be cancelled: then the finished part counts. */
public final class SpreadRun {
    /**
     * What came of a run.
     *
     * @param loaded the design as read when the run began
     * @param spread what its units do
     */
    public record Answer(LoadedDesign loaded, SpreadResult spread) {}

    private record Asked(LoadedDesign loaded, SpreadOptions options) {}

    private final Executor home;
    private final LongRun<Asked, Answer> run;
    private Optional<Histogram> histogram = Optional.empty();
    private Optional<LongRun.Progress> beginning = Optional.empty();

    /**
     * @param workers where work is done
     * @param troubles takes what went wrong
     */
    SpreadRun(Workers workers, Consumer<Trouble> troubles) {
        home = workers.home();
        run = new LongRun<>(
                "The units of this design could not be drawn", this::draw, workers.drawing(), home, troubles);
    }

    private Answer draw(Asked asked, LongRun.Telling telling) {
        long began = System.nanoTime();
        Watch watch = telling.of((done, of) -> words(done, of, (System.nanoTime() - began) * 1e-9));
        SpreadResult spread = Spread.run(
                asked.loaded().design(),
                asked.options(),
                watch,
                midKnob -> home.execute(() -> {
                    histogram = Optional.of(midKnob);
                    run.changed();
                }));
        return new Answer(asked.loaded(), spread);
    }

    private static String words(int done, int of, double seconds) {
        return done < of
                ? SpreadWords.progress(done, of, seconds)
                : "All " + of + " units are drawn; judging, and weighing what matters…";
    }

    /** Told at home whenever there is more to see. */
    public void onChange(Runnable listener) {
        run.onChange(listener);
    }

    /** Begins to draw; does nothing while a run goes on. */
    public void start(LoadedDesign loaded, SpreadOptions options) {
        if (!run.isRunning()) {
            histogram = Optional.empty();
            beginning =
                    Optional.of(new LongRun.Progress("Drawing " + options.samples() + " units…", OptionalDouble.of(0)));
            run.start(new Asked(loaded, options));
        }
    }

    /** Ends the run that goes on; what was drawn until then is told. */
    public void cancel() {
        run.cancel();
    }

    /** Whether units are being drawn. */
    public boolean isRunning() {
        return run.isRunning();
    }

    /** Whether the run is told to end and has not yet. */
    public boolean isEnding() {
        return run.isEnding();
    }

    /** How far it is; empty before the first run. */
    public Optional<LongRun.Progress> progress() {
        return run.progress().or(() -> beginning);
    }

    /** How the units lie at mid-knob, as far as they are drawn. */
    public Optional<Histogram> histogram() {
        return histogram;
    }

    /** The last answer. */
    public Optional<Answer> answer() {
        return run.answer();
    }

    /** The answer, if it is of this very design. */
    public Optional<SpreadResult> of(LoadedDesign loaded) {
        return run.answer()
                .filter(a -> a.loaded().equals(loaded) && a.spread().units() > 0)
                .map(Answer::spread);
    }
}
