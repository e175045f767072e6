package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class LatestWinsTest {
    private final Bystander bystander = new Bystander();
    private final List<String> answers = new ArrayList<>();
    private final List<RuntimeException> failures = new ArrayList<>();
    private final LatestWins<Integer, String> doubling = new LatestWins<>(
            LatestWinsTest::work, bystander.workers.turning(), bystander.workers.home(), answers::add, failures::add);

    private static String work(int request) {
        if (request < 0) {
            throw new IllegalArgumentException("negative");
        }
        return "done " + request;
    }

    @Test
    void requestsBetweenTheRunningAndTheNewestAreDropped() {
        for (int i = 1; i <= 500; i++) {
            doubling.ask(i);
        }
        bystander.run();
        assertThat(answers).containsExactly("done 1", "done 500");
        assertThat(doubling.isBusy()).isFalse();
    }

    @Test
    void aFailureIsReportedAndTheNextRequestStillRuns() {
        doubling.ask(-1);
        doubling.ask(2);
        bystander.run();
        assertThat(failures).hasSize(1);
        assertThat(answers).containsExactly("done 2");
    }

    @Test
    void nothingIsAnsweredBeforeTheWorkIsDone() {
        doubling.ask(1);
        assertThat(answers).isEmpty();
        assertThat(doubling.isBusy()).isTrue();
    }
}
