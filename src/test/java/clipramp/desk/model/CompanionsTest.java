package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.Trigger;
import clipramp.files.Example;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CompanionsTest {
    @TempDir
    Path folder;

    private final Bystander bystander = new Bystander();

    private Draft draft(String example) {
        Draft draft = bystander.draft(folder);
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

    /** Every kind of load is sound behind every stage, and the choice before comes back with one step. */
    @Test
    void everyKindOfLoadIsReachedBehindEveryStage() {
        for (Stage stage : Stage.values()) {
            for (String from : List.of("resistor", "inductive", "filament")) {
                for (String to : List.of("resistor", "inductive", "filament")) {
                    Draft draft = draft("drying-cabinet");
                    assertThat(choose(draft, "stage", stage.word())).isEmpty();
                    assertThat(choose(draft, "load.kind", from))
                            .as(stage + " " + from)
                            .isEmpty();
                    double ohms = draft.sheet().orElseThrow().design().load().resistanceOhms();
                    assertThat(choose(draft, "load.kind", to))
                            .as(stage + " " + from + " to " + to)
                            .isEmpty();
                    Load load = draft.sheet().orElseThrow().design().load();
                    assertThat(load.word()).isEqualTo(to);
                    assertThat(load.resistanceOhms()).isCloseTo(ohms, withinPercentage(2));
                }
            }
        }
    }

    @Test
    void anInductiveLoadKeepsWhatItNeedsFromStageToStage() {
        for (Stage from : Stage.values()) {
            for (Stage to : Stage.values()) {
                Draft draft = draft("drying-cabinet");
                assertThat(choose(draft, "load.kind", "inductive")).isEmpty();
                assertThat(choose(draft, "stage", from.word())).as(from.word()).isEmpty();
                assertThat(choose(draft, "stage", to.word()))
                        .as(from + " to " + to)
                        .isEmpty();
            }
        }
    }

    @Test
    void aSnubberIsFittedAsAWholeAndThenEditedPartByPart() {
        Draft draft = draft("drying-cabinet");
        assertThat(choose(draft, "snubber", "resistor and capacitor")).isEmpty();
        assertThat(set(draft, "snubber.capacitance", "47 nF")).isEmpty();
        assertThat(draft.sheet().orElseThrow().design().snubber().orElseThrow().capacitanceFarads())
                .isEqualTo(47e-9);
        assertThat(choose(draft, "snubber", "none")).isEmpty();
        assertThat(draft.sheet().orElseThrow().design().snubber()).isEmpty();
    }

    /** 230 V with a fifth of 4 % (invented), written as any instrument would. */
    @Test
    void aRecordedLineIsFoundBesideTheDesignAndShownOnlyOnceItReads() throws IOException {
        Path file = folder.resolve("x.yaml");
        Files.writeString(
                file,
                Example.all().stream()
                        .filter(e -> e.id().equals("drying-cabinet"))
                        .findFirst()
                        .orElseThrow()
                        .text());
        StringBuilder cycle = new StringBuilder("s,V\n");
        for (int i = 0; i < 400; i++) {
            double rad = 2 * Math.PI * i / 400;
            double volts = 325 * (Math.sin(rad) + 0.04 * Math.sin(5 * rad));
            cycle.append(String.format(Locale.ROOT, "%.7f,%.4f%n", 0.02 * i / 400, volts));
        }
        Files.writeString(folder.resolve("line.csv"), cycle.toString());
        Draft draft = bystander.draft(folder);
        draft.open(file);
        bystander.run();
        assertThat(set(draft, "line.recorded", "gone.csv").orElseThrow().text())
                .contains("gone.csv", "beside the design")
                .doesNotContain(folder.toString());
        assertThat(set(draft, "line.recorded", "line.csv")).isEmpty();
        assertThat(draft.sheet().orElseThrow().design().line().harmonics())
                .hasSize(1)
                .first()
                .satisfies(h -> {
                    assertThat(h.order()).isEqualTo(5);
                    assertThat(h.share()).isCloseTo(0.04, within(1e-4));
                });
        assertThat(draft.sheet().orElseThrow().loaded().name()).isEqualTo("x.yaml");
    }

    private Optional<Trouble> set(Draft draft, String key, String value) {
        List<Trouble> answer = new ArrayList<>();
        draft.set(key, key, value, trouble -> trouble.ifPresent(answer::add));
        bystander.run();
        return answer.stream().findFirst();
    }

    /** Every place of every station, as it would be shown, can be read aloud; what the file has is not left out. */
    @Test
    void theStripHasAPlaceForEveryFigureOfEveryExample() {
        for (Example example : Example.all()) {
            Draft draft = draft(example.id());
            Sheet sheet = draft.sheet().orElseThrow();
            List<String> keys = Arrays.stream(PartGroup.values())
                    .flatMap(group -> group.keys(sheet.design()).stream())
                    .toList();
            assertThat(keys).doesNotHaveDuplicates();
            for (String key : List.of(
                    "load.inductance",
                    "load.cold-ratio",
                    "load.exponent",
                    "snubber.resistance",
                    "gate.transformer.ratio",
                    "trigger.upper")) {
                if (sheet.text().valueAt(key).isPresent()) {
                    assertThat(keys).as(example.id()).contains(key);
                }
            }
        }
    }
}
