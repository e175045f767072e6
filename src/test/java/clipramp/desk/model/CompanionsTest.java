package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Stage;
import clipramp.circuit.Trigger;
import clipramp.files.Example;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CompanionsTest {
    @TempDir
    Path folder;

    private final Bystander bystander = new Bystander();

    private Draft draft(String example) {
        Draft draft = bystander.model(folder).draft();
        String text = Example.all().stream()
                .filter(e -> e.id().equals(example))
                .findFirst()
                .orElseThrow()
                .text();
        draft.openUnsaved("x.yaml", text);
        bystander.run();
        return draft;
    }

    private Optional<Trouble> choose(Draft draft, String key, String word) {
        List<Trouble> answer = new ArrayList<>();
        draft.choose(key, word, trouble -> trouble.ifPresent(answer::add));
        bystander.run();
        return answer.stream().findFirst();
    }

    /** The reader refuses unsound combinations (DEVELOPERS.md, The circuit laws), so that every answer here is sound. */
    @Test
    void everyStageIsReachedFromEveryOtherInOneStep() {
        for (Stage from : Stage.values()) {
            for (Stage to : Stage.values()) {
                Draft draft = draft("drying-cabinet");
                assertThat(choose(draft, "stage", from.word())).as(from.word()).isEmpty();
                assertThat(choose(draft, "stage", to.word()))
                        .as(from + " to " + to)
                        .isEmpty();
                assertThat(draft.sheet().orElseThrow().design().stage()).isEqualTo(to);
                if (from != to) {
                    draft.undo();
                    assertThat(draft.sheet().orElseThrow().design().stage()).isEqualTo(from);
                }
            }
        }
    }

    @Test
    void anotherKindOfTriggerBringsItsOwnResistors() {
        Draft draft = draft("drying-cabinet");
        assertThat(choose(draft, "trigger.device", "2n6027")).isEmpty();
        assertThat(draft.sheet().orElseThrow().design().trigger()).isInstanceOf(Trigger.ProgrammableTrigger.class);
        assertThat(choose(draft, "trigger.device", "2n2646")).isEmpty();
        assertThat(draft.sheet().orElseThrow().design().trigger()).isInstanceOf(Trigger.UnijunctionTrigger.class);
    }

    @Test
    void couplingByTransformerBringsOneAndLeavesWithIt() {
        Draft draft = draft("drying-cabinet");
        assertThat(choose(draft, "gate.coupling", "transformer")).isEmpty();
        assertThat(draft.sheet().orElseThrow().design().gate().transformer()).isPresent();
        assertThat(choose(draft, "gate.coupling", "direct")).isEmpty();
        assertThat(draft.sheet().orElseThrow().design().gate().transformer()).isEmpty();
    }
}
