package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.junit.jupiter.api.Test;

class HistoryTest {
    @Test
    void undoAndRedoNameWhatTheyTakeBack() {
        History<String> history = new History<>("a");
        history.step("to b", "b");
        history.step("to c", "c");
        assertThat(history.undoName()).hasValue("to c");
        history.undo();
        assertThat(history.now()).isEqualTo("b");
        assertThat(history.undoName()).hasValue("to b");
        assertThat(history.redoName()).hasValue("to c");
        history.redo();
        assertThat(history.now()).isEqualTo("c");
        assertThat(history.redoName()).isEmpty();
    }

    @Test
    void aStepAfterUndoForgetsWhatWasTakenBack() {
        History<String> history = new History<>("a");
        history.step("to b", "b");
        history.undo();
        history.step("to c", "c");
        history.redo();
        assertThat(history.now()).isEqualTo("c");
    }

    @Test
    void asManyUndosAsStepsComeBackToTheStart() {
        long seed = 7;
        Random random = new Random(seed);
        for (int round = 0; round < 50; round++) {
            History<Integer> history = new History<>(0);
            int steps = 1 + random.nextInt(100);
            for (int i = 1; i <= steps; i++) {
                history.step("to " + i, i);
            }
            for (int i = 0; i < steps; i++) {
                history.undo();
            }
            assertThat(history.now()).as("seed %d", seed).isZero();
            assertThat(history.undoName()).isEmpty();
        }
    }
}
