package clipramp.desk;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.desk.model.ViewCondition;
import clipramp.files.Example;
import clipramp.firing.Firing;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Real windows on the headless platform, used as a person uses them. */
class WindowTest {
    @TempDir
    Path home;

    private static double degrees(Harness window) {
        return Math.toDegrees(
                window.model.bench().reading().orElseThrow().firingRad().orElseThrow());
    }

    @Test
    void draggingTheFiringLineTo90DegreesSolvesTheResistanceThatFiresThere() {
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            Node lanes = window.find("#lanes", Node.class);
            Bounds area = lanes.localToScreen(lanes.getBoundsInLocal());
            FigurePane pane = (FigurePane) lanes;
            var frame = Harness.at(() -> ((clipramp.figures.LanesFigure) pane.figure())
                    .frame(pane.area().getWidth(), pane.area().getHeight(), pane.style()));
            double from = frame.xOf(
                    window.model.bench().reading().orElseThrow().firingRad().orElseThrow());
            double to = frame.xOf(Math.toRadians(90));
            double y = area.getMinY() + area.getHeight() / 2;
            window.robot
                    .moveTo(area.getMinX() + from, y)
                    .press(MouseButton.PRIMARY)
                    .moveTo(area.getMinX() + to, y)
                    .release(MouseButton.PRIMARY);
            window.settle();
            // A pixel is a quarter of a degree, and this design's angle jumps from 89.7 to 90.1 degrees.
            assertThat(degrees(window)).isCloseTo(90, within(0.6));
            double ohms = window.model.bench().reading().orElseThrow().point().rampOhms();
            var design = window.model.draft().sheet().orElseThrow().design();
            // What is read fires there when it is put back into the engine.
            assertThat(Math.toDegrees(Firing.solve(design, design.nominalCondition(), ohms)
                            .shown()
                            .firingRad()
                            .orElseThrow()))
                    .isCloseTo(degrees(window), within(1e-9));
            assertThat(window.find("#resistance", Label.class).getText())
                    .isEqualTo(QuantityText.format(ohms, Unit.OHM));
            assertThat(design.ramp().rampOhms(window.model.bench().position())).isCloseTo(ohms, within(1e-3 * ohms));
        }
    }

    @Test
    void anAngleThatIsTypedIsMetExactlyOrItIsSaidWhyNot() {
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            window.type("#angle", "70");
            assertThat(degrees(window)).isCloseTo(70, within(1e-6));
            window.type("#angle", "90°");
            assertThat(degrees(window)).isCloseTo(90, within(0.5));
            assertThat(window.find("#angle-complaint", Label.class).getText()).contains("exactly 90.0°", "jumps");
            window.type("#angle", "9O");
            assertThat(window.find("#angle-complaint", Label.class).getText()).startsWith("read \"9O\"");
        }
    }

    @Test
    void theFiringLineMovesByOneDegreeAndWithShiftByATenth() {
        try (Harness window = Harness.start(home).example("drying-cabinet").focus("#lanes")) {
            double before = degrees(window);
            window.robot.push(KeyCode.RIGHT);
            window.settle();
            assertThat(degrees(window)).isCloseTo(before + 1, within(1e-6));
            window.robot.push(KeyCode.SHIFT, KeyCode.LEFT);
            window.settle();
            assertThat(degrees(window)).isCloseTo(before + 0.9, within(1e-6));
        }
    }

    @Test
    void theKnobTurnsByKeyboard() {
        try (Harness window = Harness.start(home).example("drying-cabinet").focus("#knob")) {
            double watts =
                    window.model.bench().reading().orElseThrow().point().load().watts();
            window.robot.push(KeyCode.RIGHT).push(KeyCode.PAGE_UP);
            window.settle();
            assertThat(window.model.bench().position()).isCloseTo(0.61, within(1e-9));
            assertThat(window.model
                            .bench()
                            .reading()
                            .orElseThrow()
                            .point()
                            .load()
                            .watts())
                    .isGreaterThan(watts);
            assertThat(window.find("#position", Label.class).getText()).isEqualTo("61.0 %");
            window.robot.push(KeyCode.HOME);
            window.settle();
            assertThat(window.model.bench().position()).isZero();
        }
    }

    @Test
    void aBadValueIsAnsweredWithWhatWasUnderstoodAndChangesNothing() {
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            window.click("#tab-parts");
            String before = window.model.draft().sheet().orElseThrow().text().text();
            window.type("#slot-ramp-capacitor", "104");
            assertThat(window.find("#complaint-ramp-capacitor", Label.class).getText())
                    .contains("104 is 100 nF: write that.");
            assertThat(window.model.draft().sheet().orElseThrow().text().text()).isEqualTo(before);
            window.type("#slot-ramp-capacitor", "1,000 nF");
            assertThat(window.find("#complaint-ramp-capacitor", Label.class).getText())
                    .contains("1.0 or 1000?");
        }
    }

    @Test
    void anEditIsUndoneByNameSavedReopenedAndStepsThroughPreferredValues() throws Exception {
        Path file = home.resolve("mine.yaml");
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            window.click("#tab-parts");
            window.type("#slot-ramp-capacitor", "0,1 µF ±10 % 63 V");
            assertThat(capacitor(window)).isEqualTo(100e-9);
            assertThat(window.find("#slot-ramp-capacitor", TextField.class).getText())
                    .isEqualTo("0.1 µF ±10 % 63 V");
            window.robot.push(KeyCode.UP);
            window.settle();
            assertThat(capacitor(window)).isEqualTo(120e-9);
            assertThat(window.model.draft().undoName()).hasValue("capacitor to 120 nF ±10 % 63 V");

            Harness.at(() -> {
                window.model.draft().undo();
                return null;
            });
            window.settle();
            assertThat(capacitor(window)).isEqualTo(100e-9);
            window.ask.answer = file;
            window.focus("#lanes").robot.push(KeyCode.CONTROL, KeyCode.S);
            window.await(() -> !window.model.draft().isDirty() && !window.model.isBusy());
            assertThat(Files.readString(file, StandardCharsets.UTF_8))
                    .isEqualTo(Example.all().get(0).text().replace("220 nF ±5 % 63 V", "0.1 µF ±10 % 63 V"));
            assertThat(window.find("#saved", Label.class).getText()).isEqualTo("saved");
        }
        try (Harness again = Harness.startWith(home.resolve("again"), file)) {
            assertThat(capacitor(again)).isEqualTo(100e-9);
            assertThat(again.model.draft().isDirty()).isFalse();
        }
    }

    private static double capacitor(Harness window) {
        return window.model
                .draft()
                .sheet()
                .orElseThrow()
                .design()
                .ramp()
                .capacitor()
                .value();
    }

    @Test
    void theConditionIsNamedAndMovesTheFiringAngle() {
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            double nominal = degrees(window);
            Harness.at(() -> {
                window.model.setCondition(ViewCondition.LOW_LINE);
                return null;
            });
            window.settle();
            assertThat(degrees(window)).isNotCloseTo(nominal, within(0.05));
            assertThat(window.find("#condition-note", Label.class).getText())
                    .isEqualTo("low line: Lanes and knob at 207 V, 25 °C; margins on this line, at their worst"
                            + " temperature");
        }
    }

    @Test
    void aMarginOpensToItsFormulaAndLeadsToThePartThatMovesIt() {
        try (Harness window = Harness.start(home).example("cabinet-gone-wrong")) {
            window.press("#margin-dropper-power");
            String shown = Texts.of(window.find("#margins", Node.class));
            assertThat(shown).contains("formula", "source", "what to do", "moved by", "clip.dropper");
            Node link = Texts.link(window.find("#margins", Node.class), "clip.dropper");
            Harness.at(() -> {
                ((ButtonBase) link).fire();
                return null;
            });
            window.settle();
            assertThat(window.find("#slot-clip-dropper", TextField.class).isFocused())
                    .isTrue();
        }
    }

    @Test
    void aClickOnThePulseLooksCloser() {
        try (Harness window = Harness.start(home).example("drying-cabinet").focus("#lanes")) {
            window.robot.push(KeyCode.ENTER);
            FigurePane lanes = (FigurePane) window.find("#lanes", Node.class);
            var figure = Harness.at(() -> (clipramp.figures.LanesFigure) lanes.figure());
            assertThat(Math.toDegrees(figure.toRad() - figure.fromRad())).isBetween(0.05, 5.0);
            window.robot.push(KeyCode.ESCAPE);
            var whole = Harness.at(() -> (clipramp.figures.LanesFigure) lanes.figure());
            assertThat(whole.toRad()).isCloseTo(Math.PI, within(1e-9));
        }
    }

    @Test
    void closingWithUnsavedWorkAsksFirst() {
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            window.focus("#lanes").robot.push(KeyCode.CONTROL, KeyCode.W);
            Node dialog = window.find("#dialog-unsaved", Node.class);
            assertThat(Texts.of(dialog)).contains("differs from what is saved");
            window.robot.clickOn((Node) Texts.button(dialog, "Do not save"));
            window.await(() -> window.closed);
        }
    }

    @Test
    void theFirstStartShowsTheCautions() {
        try (Harness window = Harness.firstStart(home)) {
            Node dialog = window.find("#dialog-cautions", Node.class);
            assertThat(Texts.of(dialog)).contains("The whole firing circuit is live");
        }
    }

    @Test
    void aFileThatCannotBeReadIsExplained() throws Exception {
        Path file = home.resolve("bad.yaml");
        Files.writeString(file, "clipramp: 1\nline: {voltage: 230 A}\n", StandardCharsets.UTF_8);
        try (Harness window = Harness.start(home)) {
            window.ask.answer = file;
            window.click("#start-open");
            Node dialog = window.find("#dialog-trouble", Node.class);
            assertThat(Texts.of(dialog))
                    .contains("bad.yaml:2:", "line.voltage", "230 A")
                    .doesNotContain("Exception");
        }
    }

    @Test
    void fromNewToASavedRecordForAKilowattHeaterTakesFiveActions() throws Exception {
        Path file = home.resolve("heater.pdf");
        try (Harness window = Harness.start(home)) {
            window.ask.answer = file;
            window.click("#start-new"); // 1: New design; 230 V and 1 kW stand there already
            window.click("#new-propose"); // 2: Propose a design
            window.click("#proposal-record"); // 3: Take it over, and its record
            window.settle();
            assertThat(window.find("#verdict", Label.class).getText()).isEqualTo("● holds");
            window.await(() -> !window.find("#record-save", Node.class).isDisabled());
            window.click("#record-save"); // 4: Save the record…; 5: the system's dialog is answered
            window.await(() -> Files.exists(file) && !window.model.isBusy());
            assertThat(window.ask.asked).isEqualTo("write RECORD new-design.pdf");
            assertThat(Files.readString(file, StandardCharsets.ISO_8859_1)).startsWith("%PDF-");
        }
    }

    @Test
    void aProposalIsDrawnWithItsReasonsBeforeItIsTaken() {
        try (Harness window = Harness.start(home)) {
            window.click("#start-new");
            window.click("#new-propose");
            FigurePane drawing = window.find("#proposal-circuit", FigurePane.class);
            assertThat(drawing.figure()).isInstanceOf(clipramp.figures.CircuitFigure.class);
            assertThat(Texts.of(window.find("#sized", Node.class)))
                    .contains("● Holds ", "before the collapse at most", "next up, ", "next down, ");
            assertThat(window.model.draft().isOpen()).isFalse();
            window.click("#proposal-again");
            window.click("#new-enter");
            window.settle();
            assertThat(window.model.draft().name()).isEqualTo("new-design.yaml");
        }
    }

    @Test
    void whatNothingCanReachIsNamedWithTheNearestThatCanBe() {
        try (Harness window = Harness.start(home)) {
            window.click("#start-new");
            TextField highest = window.find("#new-highest", TextField.class);
            Harness.at(() -> {
                highest.setText("99,8 %");
                return null;
            });
            window.click("#new-propose");
            window.find("#sized-conflicts", Node.class);
            assertThat(Texts.of(window.find("#sized", Node.class)))
                    .contains("✕ Nothing holds", "highest wanted setting: ", "The nearest that can be met: ");
        }
    }

    @Test
    void aSearchThatIsCancelledLeavesTheQuestions() {
        try (Harness window = Harness.start(home)) {
            window.click("#start-new");
            window.find("#new-propose", Node.class);
            Harness.at(() -> {
                ((ButtonBase) window.stage.getScene().lookup("#new-propose")).fire();
                ((ButtonBase) window.stage.getScene().lookup("#new-cancel")).fire();
                return null;
            });
            window.await(() -> !window.model.proposing().isRunning());
            assertThat(window.find("#new-propose", Node.class).isDisabled()).isFalse();
            assertThat(window.model.proposing().answer()).isEmpty();
            assertThat(window.model.proposing().trouble()).isEmpty();
        }
    }

    @Test
    void answersThatCannotBeReadAreAskedBack() {
        try (Harness window = Harness.start(home)) {
            window.click("#start-new");
            TextField load = window.find("#new-load", TextField.class);
            Harness.at(() -> {
                load.setText("1 kV");
                return null;
            });
            window.click("#new-propose");
            assertThat(window.find("#new-complaint", Label.class).getText()).startsWith("load: read \"1 kV\"");
            assertThat(window.model.draft().isOpen()).isFalse();
        }
    }

    @Test
    void aCircuitThatThereIsIsEnteredStationByStation() {
        try (Harness window = Harness.start(home)) {
            window.click("#start-new");
            window.click("#new-enter");
            window.settle();
            window.await(() -> window.stage.getScene().lookup("#slot-line-voltage") != null);
            window.click("#station-next");
            window.type("#slot-clip-dropper", "12k 5% 17 W");
            assertThat(window.model
                            .draft()
                            .sheet()
                            .orElseThrow()
                            .design()
                            .clip()
                            .dropper()
                            .value())
                    .isEqualTo(12e3);
        }
    }

    @Test
    void workThatWasLeftIsOfferedAndTakenBack() throws Exception {
        try (Harness window = Harness.start(home)) {
            String text = Example.all().get(0).text().replace("lower heater", "left behind");
            // As a process that is gone would have left it: its id is above any that Linux gives.
            Path unsaved = Files.createDirectories(window.places.state().resolve("unsaved"));
            Files.writeString(unsaved.resolve("99999999-1-1.yaml"), "# unsaved work of: (never saved)\n" + text);
        }
        try (Harness next = Harness.start(home)) {
            next.click(".recover");
            next.settle();
            assertThat(next.find("#title", Label.class).getText()).endsWith("left behind");
            assertThat(next.model.draft().isDirty()).isTrue();
        }
    }

    @Test
    void aFigureIsExportedAndItsNumbersStandInATable() throws Exception {
        Path file = home.resolve("lanes.svg");
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            window.ask.answer = file;
            window.menu("File", "Export", "Lanes as SVG…");
            window.await(() -> Files.exists(file));
            assertThat(Files.readString(file, StandardCharsets.UTF_8)).contains("<svg", "clipped supply");
            window.menu("View", "Numbers as a table", "Power curve");
            Node dialog = window.find("#dialog-numbers", Node.class);
            assertThat(Texts.of(dialog)).contains("firing angle °", "Fully anticlockwise the load gets");
        }
    }
}
