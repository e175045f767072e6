package clipramp.desk.model;

import clipramp.files.LoadedDesign;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;

/** One design on the desk and what it comes to: the draft, the bench that it lies on, and its margins. */
public final class DeskModel {
    private record Asked(LoadedDesign loaded, ViewCondition condition) {}

    /**
     * Margins as they were last judged.
     *
     * @param loaded the design as read
     * @param condition what they were judged at
     * @param check the result
     */
    public record Judgement(LoadedDesign loaded, ViewCondition condition, Check check) {}

    private final Draft draft;
    private final Bench bench;
    private final SpreadRun spread;
    private final LongRun<Resizing.Asked, Resized> proposing;
    private final LongRun<Resizing.Asked, Resized> resizing;
    private final LongRun<Fitting.Asked, Fitting.Answer> fitting;
    private final LineNow line;
    private final LongRun<FaultRun.Asked, FaultRun.Answer> faults;
    private final LatestWins<Asked, Judgement> judge;
    private final List<Runnable> judgementListeners = new ArrayList<>();
    private final List<Runnable> conditionListeners = new ArrayList<>();
    private ViewCondition condition = ViewCondition.WORST;
    private Optional<LoadedDesign> solved = Optional.empty();
    private Optional<Judgement> judgement = Optional.empty();

    /**
     * An empty desk.
     *
     * @param workers where work is done
     * @param workshop reads and edits design files
     * @param recovery keeps unsaved work
     * @param troubles takes what went wrong where nobody waits for the answer
     */
    public DeskModel(Workers workers, Workshop workshop, Recovery recovery, Consumer<Trouble> troubles) {
        this.draft = new Draft(workers, workshop, recovery, troubles);
        this.bench = new Bench(
                workers.turning(),
                workers.judging(),
                workers.home(),
                failure -> troubles.accept(Trouble.of("The circuit could not be solved so", failure)));
        this.spread = new SpreadRun(workers, troubles);
        Resizing search = new Resizing(workshop);
        this.proposing =
                new LongRun<>("No design could be made of this", search::of, workers.searching(), workers.home());
        this.resizing = new LongRun<>("No values could be chosen", search::of, workers.searching(), workers.home());
        this.fitting = new LongRun<>(
                "The readings could not be fitted", new Fitting(workshop)::of, workers.searching(), workers.home());
        this.faults = FaultRun.on(workers);
        this.line = new LineNow(bench, workers, troubles);
        this.judge = new LatestWins<>(
                DeskModel::judged,
                workers.judging(),
                workers.home(),
                this::take,
                failure -> troubles.accept(Trouble.of("The margins could not be judged", failure)));
        draft.onChange(this::follow);
    }

    private static Judgement judged(Asked asked) {
        Check check = Judge.check(
                asked.loaded().design(),
                asked.condition().pinnedLineVolts(asked.loaded().design()),
                asked.condition().pinnedCelsius(asked.loaded().design()));
        return new Judgement(asked.loaded(), asked.condition(), check);
    }

    private void take(Judgement answer) {
        judgement = Optional.of(answer);
        judgementListeners.forEach(Runnable::run);
    }

    /** The design file on the desk. */
    public Draft draft() {
        return draft;
    }

    /** Draws many units. */
    public SpreadRun spread() {
        return spread;
    }

    /** The search for a new design. */
    public LongRun<Resizing.Asked, Resized> proposing() {
        return proposing;
    }

    /** The search for values of the design on the desk. */
    public LongRun<Resizing.Asked, Resized> resizing() {
        return resizing;
    }

    /** The fit of one unit to its readings. */
    public LongRun<Fitting.Asked, Fitting.Answer> fitting() {
        return fitting;
    }

    /** Works single faults out. */
    public LongRun<FaultRun.Asked, FaultRun.Answer> faults() {
        return faults;
    }

    /** The line current at the knob's setting. */
    public LineNow line() {
        return line;
    }

    /** Where the design is solved and its knob turned. */
    public Bench bench() {
        return bench;
    }

    /** Told whenever margins were judged. */
    public void onJudgement(Runnable listener) {
        judgementListeners.add(listener);
    }

    /** Told whenever another condition was chosen. */
    public void onCondition(Runnable listener) {
        conditionListeners.add(listener);
    }

    /** The margins as they were judged last; empty before the first design. */
    public Optional<Judgement> judgement() {
        return judgement;
    }

    /** Whether something is being read, solved or judged. */
    public boolean isBusy() {
        return draft.isBusy() || judge.isBusy() || bench.isBusy() || proposing.isRunning() || line.isBusy();
    }

    /** What lanes, knob and margins are shown at. */
    public ViewCondition condition() {
        return condition;
    }

    /** Shows lanes, knob and margins at another condition. */
    public void setCondition(ViewCondition other) {
        condition = other;
        draft.sheet().ifPresent(this::solve);
        conditionListeners.forEach(Runnable::run);
    }

    private void follow() {
        draft.sheet().filter(s -> !solved.equals(Optional.of(s.loaded()))).ifPresent(this::solve);
    }

    private void solve(Sheet sheet) {
        solved = Optional.of(sheet.loaded());
        bench.put(sheet.design(), condition.solvedAt(sheet.design()));
        judge.ask(new Asked(sheet.loaded(), condition));
    }
}
