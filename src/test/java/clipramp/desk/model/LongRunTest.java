package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.runs.Watch;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;

class LongRunTest {
    private final Bystander stand = new Bystander();
    private final List<String> told = new ArrayList<>();

    private LongRun<Integer, String> run() {
        LongRun<Integer, String> run =
                new LongRun<>("It did not work", LongRunTest::work, stand.away::add, stand.home::add);
        run.onChange(() -> run.progress().map(LongRun.Progress::words).ifPresent(told::add));
        return run;
    }

    private static String work(int steps, LongRun.Telling telling) {
        Watch watch = telling.of((done, of) -> done + " of " + of);
        for (int i = 0; i < steps; i++) {
            if (watch.isCancelled()) {
                throw new CancellationException("asked to");
            }
            watch.progress(i, steps);
        }
        if (steps > 9) {
            throw new IllegalArgumentException("more than nine steps");
        }
        return steps + " steps";
    }

    @Test
    void itTellsItsStepsAndThenItsAnswer() {
        LongRun<Integer, String> run = run();
        run.start(2);
        assertThat(run.isRunning()).isTrue();
        stand.run();
        assertThat(told).contains("0 of 2", "1 of 2");
        assertThat(run.answer()).hasValue("2 steps");
        assertThat(run.isRunning()).isFalse();
    }

    @Test
    void whatIsCancelledLeavesTheLastAnswerAndNoTrouble() {
        LongRun<Integer, String> run = run();
        run.start(2);
        stand.run();
        run.start(3);
        run.cancel();
        assertThat(run.isEnding()).isTrue();
        stand.run();
        assertThat(run.answer()).hasValue("2 steps");
        assertThat(run.trouble()).isEmpty();
        assertThat(run.isRunning()).isFalse();
    }

    @Test
    void aFailureIsToldInWordsUntilTheNextRun() {
        LongRun<Integer, String> run = run();
        run.start(10);
        stand.run();
        assertThat(run.trouble()).hasValue(new Trouble("It did not work", "more than nine steps"));
        run.start(1);
        stand.run();
        assertThat(run.trouble()).isEmpty();
        assertThat(run.answer()).hasValue("1 steps");
    }

    @Test
    void asLongAsOneGoesOnNoOtherBegins() {
        LongRun<Integer, String> run = run();
        run.start(1);
        run.start(5);
        stand.run();
        assertThat(run.answer()).hasValue("1 steps");
    }
}
