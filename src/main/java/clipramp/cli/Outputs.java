package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.figures.Figure;
import clipramp.figures.HarmonicsFigure;
import clipramp.figures.KnobFigure;
import clipramp.figures.Lanes;
import clipramp.figures.LanesFigure;
import clipramp.figures.SpreadFigure;
import clipramp.figures.Surfaces;
import clipramp.files.LoadedDesign;
import clipramp.files.ProfileLibrary;
import clipramp.files.WholeFile;
import clipramp.firing.Firing;
import clipramp.margins.Check;
import clipramp.margins.LineCheck;
import clipramp.power.LoadWave;
import clipramp.power.OperatingPoint;
import clipramp.record.DesignRecord;
import clipramp.record.PageSize;
import clipramp.record.RecordContent;
import clipramp.spread.SpreadResult;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Files that commands write, whole or not at all. */
final class Outputs {
    /** What stands for standard output in place of a file's name. */
    static final String STANDARD_OUTPUT = "-";

    private static final double PLOT_WIDTH = 960;
    private static final double PNG_SCALE = 2;

    private static final int PLOT_SAMPLES = 1440;

    private Outputs() {}

    /** The paper of a word; refused where there is none. */
    static PageSize paper(String word) {
        List<String> known = Arrays.stream(PageSize.values()).map(Outputs::word).toList();
        return PageSize.values()[known.indexOf(Problems.word("--paper", word, known))];
    }

    private static String word(PageSize size) {
        return size.word().toLowerCase(Locale.ROOT);
    }

    /**
     * Refuses, before the work is done, a record that could not be written. One replaces an older one; a slip of the name must
     * not replace a design or its readings.
     */
    static void requireRecord(String name) {
        if (name.toLowerCase(Locale.ROOT).matches(".*\\.(ya?ml|csv|json|svg|png)")) {
            throw Problems.refused(
                    name, "the record is a PDF; expected a file name that ends in .pdf. Nothing was written.");
        }
        requirePlace(name, true);
    }

    /** Refuses, before the work is done, a plot that could not be drawn. */
    static void requirePlot(String name) {
        if (!isSvg(name) && !name.toLowerCase(Locale.ROOT).endsWith(".png")) {
            throw Problems.refused("--plot", "read \"" + name + "\"; expected a file name that ends in .svg or .png.");
        }
        requirePlace(name, true);
    }

    /** Refuses, before the work is done, a file that could not be written: its folder is not there, or it is and must stay. */
    static void requirePlace(String name, boolean replace) {
        Path file = Inputs.path(name);
        Path folder = file.toAbsolutePath().getParent();
        if (Files.isDirectory(file) || (folder != null && !Files.isDirectory(folder))) {
            throw FileFailure.writing(name, new NoSuchFileException(name));
        }
        if (!replace && Files.isRegularFile(file)) {
            throw FileFailure.exists(name);
        }
    }

    private static boolean isSvg(String name) {
        return name.toLowerCase(Locale.ROOT).endsWith(".svg");
    }

    /**
     * Writes the design record; an older one is replaced.
     *
     * @param library where the design's profiles were found, for their sources
     * @param spread what many units do, if they were drawn
     */
    static void record(
            String name,
            LoadedDesign loaded,
            Check check,
            ProfileLibrary library,
            PageSize size,
            Optional<SpreadResult> spread) {
        record(name, RecordContent.of(loaded, check, library, Program.version()).withSpread(spread), size);
    }

    /** Writes a record whose content is there already. */
    static void record(String name, RecordContent content, PageSize size) {
        requireRecord(name);
        withoutDisplay();
        write(name, out -> DesignRecord.write(content, out, size), true);
    }

    /** Draws the power of many units against the knob. */
    static void spreadPlot(String name, SpreadResult spread) {
        draw(name, new SpreadFigure(spread));
    }

    /** Draws the line current's orders beside the table for them. */
    static void linePlot(String name, LineCheck lineCurrent) {
        draw(name, new HarmonicsFigure(lineCurrent));
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
        byte[] picture = isSvg(name)
                ? Surfaces.toSvg(figure, PLOT_WIDTH, height).getBytes(StandardCharsets.UTF_8)
                : Surfaces.toPng(figure, PLOT_WIDTH, height, PNG_SCALE);
        write(name, out -> out.write(picture), true);
    }

    /** Drawing into a file needs no screen, and must not fail where one is named but not there. */
    private static void withoutDisplay() {
        System.setProperty("java.awt.headless", "true");
    }

    /** Writes a design's text, whole or not at all. */
    static void write(String name, String text, boolean replace) {
        write(name, out -> out.write(text.getBytes(StandardCharsets.UTF_8)), replace);
    }

    /** Writes a file whole or not at all. */
    static void write(String name, WholeFile.Content content, boolean replace) {
        try {
            WholeFile.write(Inputs.path(name), content, replace);
        } catch (FileAlreadyExistsException there) {
            throw FileFailure.exists(name);
        } catch (IOException failure) {
            throw FileFailure.writing(name, failure);
        }
    }
}
