package clipramp.figures;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.Designators;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Load;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.Ramp;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.Tolerance;
import clipramp.circuit.Trigger;
import clipramp.circuit.Trimmers;
import clipramp.circuit.Winding;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class CircuitFigureTest {
    /** Every stage with either rectifier, tap, winding, coupling, trigger and load, sound or not: each must be drawable. */
    static Stream<Arguments> everyDesign() {
        return designs().entrySet().stream().map(e -> Arguments.of(e.getKey(), e.getValue()));
    }

    static Map<String, Design> designs() {
        Map<String, Design> designs = new LinkedHashMap<>();
        List<Load> loads = List.of(
                SampleDesigns.heater().load(),
                new Load.Inductive(40, 0.12, Optional.of(new StageDiodes(0.9, 0))),
                new Load.Filament(300, 120, 1.55, 15));
        int turn = 0;
        for (Stage stage : Stage.values()) {
            for (ClipSupply supply : supplies()) {
                for (GateDrive gate : gates(stage)) {
                    Load load = loads.get(turn % loads.size());
                    Design trigger = turn % 2 == 0 ? SampleDesigns.heater() : SampleDesigns.programmableHeater();
                    Ramp ramp = turn % 5 == 4
                            ? fixedRamp()
                            : turn % 5 == 3 ? shuntedRamp() : turn % 5 == 2 ? trimmedRamp() : trigger.ramp();
                    String name = stage.word() + " " + supply.tap().word() + " "
                            + supply.rectifier().word() + " " + (supply.isIsolated() ? "winding " : "")
                            + gate.coupling().word() + " " + trigger.trigger().deviceId() + " " + load.word() + " "
                            + turn;
                    designs.put(
                            name,
                            trigger.withStage(stage)
                                    .withClip(supply)
                                    .withGate(gate)
                                    .withLoad(load)
                                    .withRamp(ramp));
                    turn++;
                }
            }
        }
        return designs;
    }

    private static List<ClipSupply> supplies() {
        List<ClipSupply> supplies = new ArrayList<>();
        Part dropper = SampleDesigns.part(10_000, 0.05, 20);
        for (ClipSupply.Rectifier rectifier : ClipSupply.Rectifier.values()) {
            for (ClipSupply.Tap tap : ClipSupply.Tap.values()) {
                supplies.add(SampleDesigns.clip(tap, rectifier, dropper, Optional.empty()));
            }
            supplies.add(SampleDesigns.clip(
                    ClipSupply.Tap.LINE, rectifier, dropper, Optional.of(new Winding(230, 24, true, 0.1))));
        }
        return supplies;
    }

    private static List<GateDrive> gates(Stage stage) {
        GateDrive direct = SampleDesigns.directGate(1_000);
        GateDrive series = new GateDrive(
                GateDrive.Coupling.DIRECT,
                SampleDesigns.part(33, 0.05, 0.25),
                direct.shunt(),
                3,
                20e-6,
                GateDrive.Polarity.POSITIVE,
                Optional.empty());
        return List.of(direct, series, SampleDesigns.transformerGate(stage == Stage.INVERSE_PARALLEL ? 2 : 1));
    }

    /** As many digits and ratings as a builder may write. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("everyDesign")
    void longerValuesStillKeepApart(String name, Design design) {
        Part small = SampleDesigns.part(47, 0.05, 0.25);
        Ramp ramp = design.ramp();
        Part capacitor = new Part(
                470e-9, new Tolerance(0.1, 0.1), java.util.OptionalDouble.empty(), java.util.OptionalDouble.of(63));
        Design longer = design.withRamp(
                        new Ramp(capacitor, SampleDesigns.part(2_700, 0.01, 0.25), ramp.pot(), ramp.trimmers()))
                .withTrigger(
                        design.trigger() instanceof Trigger.ProgrammableTrigger p
                                ? new Trigger.ProgrammableTrigger(
                                        p.device(),
                                        small,
                                        SampleDesigns.part(150_000, 0.01, 0.25),
                                        SampleDesigns.part(270_000, 0.01, 0.25))
                                : SampleDesigns.unijunctionTrigger(100, 1_500));
        everyLabelLiesInsideTheSheetAndOverNoOther(name, longer);
        noWireRunsThroughALabel(name, longer);
    }

    private static Ramp fixedRamp() {
        return new Ramp(SampleDesigns.part(100e-9, 0.1, 0.1), SampleDesigns.part(33_000, 0.05, 0.25), Optional.empty());
    }

    private static Ramp trimmedRamp() {
        Ramp ramp = shuntedRamp();
        return new Ramp(
                ramp.capacitor(),
                ramp.fixed(),
                ramp.pot(),
                new Trimmers(
                        Optional.of(SampleDesigns.part(5_000, 0.2, 0.5)),
                        Optional.of(SampleDesigns.part(470_000, 0.2, 0.5))));
    }

    private static Ramp shuntedRamp() {
        Ramp ramp = SampleDesigns.heater().ramp();
        Pot pot = ramp.pot().orElseThrow();
        return new Ramp(
                ramp.capacitor(),
                ramp.fixed(),
                Optional.of(new Pot(
                        pot.track(),
                        pot.endOhms(),
                        pot.law(),
                        pot.sense(),
                        Optional.of(SampleDesigns.part(220_000, 0.05, 0.25)))));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyDesign")
    void everyLabelLiesInsideTheSheetAndOverNoOther(String name, Design design) {
        List<Sheet.Label> labels = new CircuitFigure(design).sheet().labels();
        Rectangle2D sheet = new Rectangle2D.Double(0, 0, Schematic.WIDTH, Schematic.HEIGHT);
        for (int i = 0; i < labels.size(); i++) {
            Rectangle2D box = labels.get(i).box();
            assertThat(sheet.contains(box)).as(labels.get(i).text() + " " + box).isTrue();
            for (int j = 0; j < i; j++) {
                assertThat(box.intersects(labels.get(j).box()))
                        .as(
                                "'%s' over '%s'",
                                labels.get(i).text(), labels.get(j).text())
                        .isFalse();
            }
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyDesign")
    void noWireRunsThroughALabel(String name, Design design) {
        Sheet sheet = new CircuitFigure(design).sheet();
        for (Sheet.Label label : sheet.labels()) {
            Rectangle2D box = label.box();
            Rectangle2D core = new Rectangle2D.Double(
                    box.getX() + 0.05, box.getY() + 0.15, box.getWidth() - 0.1, box.getHeight() - 0.35);
            for (Sheet.Ink ink : sheet.inks()) {
                assertThat(Outlines.cross(ink.shape(), core))
                        .as(
                                "%s at %s is crossed by a line within %s",
                                label.text(), core, ink.shape().getBounds2D())
                        .isFalse();
            }
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyDesign")
    void everyPartOfTheDesignCanBePointedAt(String name, Design design) {
        CircuitFigure figure = new CircuitFigure(design);
        Set<String> wanted = Designators.of(design).keySet();
        List<PartBox> parts = figure.parts(900, 600);
        assertThat(parts.stream().map(PartBox::key)).containsAll(wanted).contains("line");
        for (PartBox part : parts) {
            assertThat(part.box().getWidth()).isGreaterThan(8);
            assertThat(part.box().getHeight()).isGreaterThan(8);
        }
    }
}
