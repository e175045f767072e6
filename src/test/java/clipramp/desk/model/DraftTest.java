package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.files.Example;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class DraftTest {
    private static final String TEXT = Example.all().get(0).text();

    @TempDir
    Path folder;

    private final Bystander bystander = new Bystander();
    private DeskModel model;
    private Draft draft;

    @BeforeEach
    void open() throws IOException {
        Path file = folder.resolve("mine.yaml");
        Files.writeString(file, TEXT, StandardCharsets.UTF_8);
        model = bystander.model(folder);
        draft = model.draft();
        draft.open(file);
        bystander.run();
    }

    private List<Trouble> set(String key, String value) {
        List<Trouble> answers = new ArrayList<>();
        draft.set(key, key, value, trouble -> trouble.ifPresent(answers::add));
        bystander.run();
        return answers;
    }

    private String text() {
        return draft.sheet().orElseThrow().text().text();
    }

    @Test
    void anEditChangesItsValueAndNothingElseInTheFile() {
        assertThat(set("ramp.fixed", "4.7 kΩ ±5 % 0.25 W")).isEmpty();
        assertThat(text()).isEqualTo(TEXT.replace("fixed: 3.9 kΩ", "fixed: 4.7 kΩ"));
        assertThat(draft.isDirty()).isTrue();
        draft.undo();
        bystander.run();
        assertThat(text()).isEqualTo(TEXT);
        assertThat(draft.isDirty()).isFalse();
        draft.redo();
        assertThat(text()).contains("fixed: 4.7 kΩ");
    }

    @Test
    void anEditThatCannotBeReadChangesNothingAndIsExplained() {
        List<Trouble> answers = set("clip.tap", "sideways");
        assertThat(answers).hasSize(1);
        assertThat(answers.get(0).text()).contains("clip.tap", "sideways", "line | thyristor");
        assertThat(text()).isEqualTo(TEXT);
        assertThat(draft.undoName()).isEmpty();
    }

    @Test
    void editsAskedForAtOnceAreAllMadeOneAfterTheOther() {
        for (int i = 1; i <= 20; i++) {
            draft.set("title", "title", "number " + i, trouble -> {});
        }
        bystander.run();
        assertThat(draft.sheet().orElseThrow().design().title()).isEqualTo("number 20");
        assertThat(draft.undoName()).hasValue("title to number 20");
        draft.undo();
        assertThat(draft.sheet().orElseThrow().design().title()).isEqualTo("number 19");
    }

    @Test
    void savingWritesTheTextAndForgetsTheUnsavedWork() throws IOException {
        set("ramp.fixed", "4.7 kΩ ±5 % 0.25 W");
        assertThat(left()).hasSize(1);
        draft.save(folder.resolve("mine.yaml"), () -> {});
        bystander.run();
        assertThat(Files.readString(folder.resolve("mine.yaml"), StandardCharsets.UTF_8))
                .isEqualTo(text());
        assertThat(draft.isDirty()).isFalse();
        assertThat(left()).isEmpty();
    }

    private List<Path> left() throws IOException {
        try (var files = Files.list(folder.resolve("unsaved"))) {
            return files.toList();
        }
    }

    @Test
    void aPlaceThatCannotBeWrittenIsExplainedAndTheWorkStaysUnsaved() {
        set("ramp.fixed", "4.7 kΩ ±5 % 0.25 W");
        draft.save(folder.resolve("nowhere").resolve("mine.yaml"), () -> {});
        bystander.run();
        assertThat(bystander.troubles).hasSize(1);
        assertThat(bystander.troubles.get(0).headline()).isEqualTo("The design cannot be saved");
        assertThat(draft.isDirty()).isTrue();
    }

    @Test
    void whatIsSolvedAndJudgedFollowsTheDesign() {
        double before = model.bench().reading().orElseThrow().firingRad().orElseThrow();
        set("ramp.capacitor", "270 nF ±10 % 63 V");
        double after = model.bench().reading().orElseThrow().firingRad().orElseThrow();
        assertThat(after).isGreaterThan(before);
        assertThat(model.judgement().orElseThrow().loaded().design())
                .isEqualTo(draft.sheet().orElseThrow().design());
        assertThat(model.bench().curve().orElseThrow().points()).hasSize(101);
    }

    @Test
    void aTurnThatNobodySeesIsNotSolved() {
        for (int i = 0; i <= 200; i++) {
            model.bench().turnTo(i / 200.0);
        }
        assertThat(bystander.away).hasSize(1);
        bystander.run();
        assertThat(model.bench().reading().orElseThrow().point().position()).hasValue(1.0);
    }

    @Test
    void anAngleThatNothingFiresAtIsRefusedAndTheKnobStaysWhereItWas() {
        double before = model.bench().position();
        model.bench().fireAt(Math.toRadians(0.5));
        bystander.run();
        assertThat(bystander.troubles).hasSize(1);
        assertThat(bystander.troubles.get(0).text()).contains("0.5°");
        assertThat(model.bench().position()).isEqualTo(before);
    }

    @Test
    void aFileThatIsNotThereIsExplained() {
        draft.open(folder.resolve("none.yaml"));
        bystander.run();
        assertThat(bystander.troubles).hasSize(1);
        assertThat(bystander.troubles.get(0).text()).contains("There is no file", "none.yaml");
        assertThat(text()).isEqualTo(TEXT);
    }
}
