package clipramp.figures;

import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;

/** Writes every figure as a picture into a folder, for a person to look at: {@code Gallery FOLDER}. */
public final class Gallery {
    /** Judged once: these come from the engine. */
    private static final Figure UNDER = new HarmonicsFigure(SampleChecks.lineCurrent(SampleDesigns.halfWaveHeater()));

    private static final Figure OVER =
            new HarmonicsFigure(SampleChecks.lineCurrent(SampleDesigns.heater().withLoad(new Load.Resistor(25))));

    private Gallery() {}

    public static void main(String[] arguments) throws IOException {
        Path folder = Path.of(arguments[0]);
        Files.createDirectories(folder);
        for (Map.Entry<String, Figure> entry : figures().entrySet()) {
            Figure figure = entry.getValue();
            double width = 900;
            double height = width / figure.proportion();
            Files.write(folder.resolve(entry.getKey() + ".png"), Surfaces.toPng(figure, width, height, 1));
            Files.write(
                    folder.resolve(entry.getKey() + "-ink.png"),
                    Pictures.png(Surfaces.toImage(figure, width, height, 1, Style.SCREEN.with(Palette.INK))));
            Files.writeString(folder.resolve(entry.getKey() + ".svg"), Surfaces.toSvg(figure, width, height));
        }
    }

    static Map<String, Figure> figures() {
        Map<String, Figure> figures = new LinkedHashMap<>();
        figures.put("lanes", new LanesFigure(SampleChecks.lanes(SampleDesigns.heater(), 0.5)));
        figures.put(
                "lanes-half-wave",
                new LanesFigure(SampleChecks.lanes(SampleDesigns.halfWaveHeater(), 0.8))
                        .withCrosshair(OptionalDouble.of(1.2)));
        figures.put("lanes-silent", new LanesFigure(SampleChecks.lanes(SampleDesigns.heater(), 0)));
        LanesFigure early = new LanesFigure(SampleChecks.lanes(SampleDesigns.heater(), 1));
        double rad = early.lanes().firingRad().orElseThrow();
        figures.put("lanes-early", early);
        figures.put("lanes-zoom", early.withView(rad - 0.005, rad + 0.015));
        figures.put(
                "circuit-bridge-dc",
                new CircuitFigure(SampleDesigns.heater()).withChosen(java.util.Set.of("ramp.capacitor")));
        figures.put("circuit-half-wave", new CircuitFigure(SampleDesigns.halfWaveHeater()));
        figures.put("circuit-triac", new CircuitFigure(SampleDesigns.triacHeater()));
        figures.put("circuit-inverse", new CircuitFigure(SampleDesigns.inverseParallelHeater()));
        figures.put("circuit-bridge-ac", new CircuitFigure(SampleDesigns.thyristorTapHeater()));
        figures.put("circuit-winding", new CircuitFigure(SampleDesigns.windingHeater(0.1, true)));
        figures.put("circuit-programmable", new CircuitFigure(SampleDesigns.programmableHeater()));
        figures.put(
                "knob",
                new KnobFigure(
                        SampleChecks.check(SampleDesigns.heater(), clipramp.margins.Verdict.HOLDS)
                                .knob(),
                        SampleDesigns.heater().wanted()));
        Lanes lanes = SampleChecks.lanes(SampleDesigns.heater(), 0.5);
        figures.put(
                "gate",
                new GateFigure(
                        SampleDesigns.heater(),
                        lanes.waves().gateAmps(),
                        lanes.waves().gateVolts()));
        figures.put(
                "gate-triac",
                new GateFigure(
                        SampleDesigns.triacHeater(),
                        lanes.waves().gateAmps(),
                        lanes.waves().gateVolts()));
        figures.put("gate-silent", new GateFigure(SampleDesigns.heater(), new double[3], new double[3]));
        figures.put("harmonics", UNDER);
        figures.put("harmonics-over", OVER);
        return figures;
    }
}
