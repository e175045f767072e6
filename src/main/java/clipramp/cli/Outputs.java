package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.figures.Figure;
import clipramp.figures.KnobFigure;
import clipramp.figures.Lanes;
import clipramp.figures.LanesFigure;
import clipramp.figures.Surfaces;
import clipramp.files.WholeFile;
import clipramp.firing.Firing;
import clipramp.power.LoadWave;
import clipramp.power.OperatingPoint;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileAlreadyExistsException;
import java.util.List;
import java.util.Locale;

/** Files that commands write, whole or not at all. */
final class Outputs {
    private static final double PLOT_WIDTH = 960;
    private static final double PNG_SCALE = 2;

    private static final int PLOT_SAMPLES = 1440;

    private Outputs() {}

    static void requirePlotName(String name) {
        if (!isSvg(name) && !name.toLowerCase(Locale.ROOT).endsWith(".png")) {
            throw Problems.refused("--plot", "read \"" + name + "\"; expected a file name that ends in .svg or .png.");
        }
    }

    private static boolean isSvg(String name) {
        return name.toLowerCase(Locale.ROOT).endsWith(".svg");
    }

    /** Draws the power against the knob. */
    static void mapPlot(String name, Design design, List<OperatingPoint> points) {
        draw(name, new KnobFigure(points, design.wanted()));
    }

    /** Draws the lanes of one half cycle. */
    static void tracePlot(String name, Design design, Condition condition, OperatingPoint point) {
        LoadWave load = LoadWave.of(design, condition, point.solution());
        Lanes lanes = new Lanes(
                Firing.waveforms(design, condition, point.rampOhms(), PLOT_SAMPLES),
                load.rad(),
                load.volts(),
                point.solution().shown().firingRad(),
                condition.lineHertz());
        draw(name, new LanesFigure(lanes));
    }

    private static void draw(String name, Figure figure) {
        withoutDisplay();
        double height = PLOT_WIDTH / figure.proportion();
        write(
                name,
                isSvg(name)
                        ? Surfaces.toSvg(figure, PLOT_WIDTH, height).getBytes(StandardCharsets.UTF_8)
                        : Surfaces.toPng(figure, PLOT_WIDTH, height, PNG_SCALE),
                true);
    }

    /** Drawing into a file needs no screen, and must not fail where one is named but not there. */
    private static void withoutDisplay() {
        System.setProperty("java.awt.headless", "true");
    }

    static void write(String name, byte[] content, boolean replace) {
        try {
            WholeFile.write(Inputs.path(name), out -> out.write(content), replace);
        } catch (FileAlreadyExistsException there) {
            throw FileFailure.exists(name);
        } catch (IOException failure) {
            throw FileFailure.writing(name, failure);
        }
    }
}
