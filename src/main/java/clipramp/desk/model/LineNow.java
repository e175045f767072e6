package clipramp.desk.model;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.margins.LineCheck;
import clipramp.power.LineCurrent;
import clipramp.power.LoadPower;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;

/** The line current at the knob's setting, solved only while somebody looks at it. */
public final class LineNow {
    private final Bench bench;
    private final LatestWins<Reading, LineCheck.Setting> solver;
    private final List<Runnable> listeners = new ArrayList<>();
    private Optional<LineCheck.Setting> setting = Optional.empty();
    private boolean watched;

    LineNow(Bench bench, Workers workers, Consumer<Trouble> troubles) {
        this.bench = bench;
        this.solver = new LatestWins<>(
                LineNow::solved,
                workers.turning(),
                workers.home(),
                this::take,
                failure -> troubles.accept(Trouble.of("The line current could not be solved", failure)));
        bench.onReading(this::ask);
    }

    private static LineCheck.Setting solved(Reading reading) {
        Design design = reading.request().design();
        Condition condition = reading.request().condition();
        LineCurrent current = LineCurrent.of(
                design,
                condition,
                LoadPower.period(design, condition, reading.point().solution()));
        return new LineCheck.Setting(
                reading.point().position(),
                reading.point().rampOhms(),
                reading.firingRad(),
                reading.point().load().watts(),
                current);
    }

    private void take(LineCheck.Setting answer) {
        setting = Optional.of(answer);
        listeners.forEach(Runnable::run);
    }

    private void ask() {
        if (watched) {
            bench.reading().ifPresent(solver::ask);
        }
    }

    /** Somebody looks, or no longer does. */
    public void watch(boolean wanted) {
        watched = wanted;
        ask();
    }

    /** Told at home whenever there is another answer. */
    public void onChange(Runnable listener) {
        listeners.add(listener);
    }

    /** The last answer. */
    public Optional<LineCheck.Setting> setting() {
        return setting;
    }

    /** Whether an answer is still to come. */
    boolean isBusy() {
        return solver.isBusy();
    }
}
