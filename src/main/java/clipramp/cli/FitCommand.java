package clipramp.cli;

import clipramp.circuit.Design;
import clipramp.files.AsBuilt;
import clipramp.files.DesignText;
import clipramp.files.LoadedDesign;
import clipramp.files.ReadingsFile;
import clipramp.files.Source;
import clipramp.fit.Fit;
import clipramp.fit.FitResult;
import clipramp.fit.FitWords;
import clipramp.fit.Readings;
import clipramp.record.PageSize;
import clipramp.record.RecordContent;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Bench readings of one unit to what its parts really are. */
@Command(
        name = "fit",
        sortOptions = false,
        sortSynopsis = false,
        description = {
            "Bench readings of one unit to its real parts: what the readings tell and how well, what they cannot tell, and"
                    + " which of them does not belong.",
            "Exit code 1 when the readings tell nothing."
        },
        footer = {
            "",
            "READINGS.csv has one line of heads and one line a setting. Heads: knob (%%), ramp resistance (kohm), line voltage"
                    + " (V), firing angle (deg), delay (ms), load voltage (V true-rms), load voltage (V average-reading), load"
                    + " power (W), base-one peak (V), supply voltage (V), peak-point voltage (V), note.",
            "An accuracy may follow a head: firing angle (deg) +-1, load power (W) +-2 %%. It is what 19 readings in 20 keep"
                    + " within. A line that begins with # is a remark; an empty field was not read."
        })
final class FitCommand implements Callable<Integer> {
    private final Session session;

    @Mixin
    DesignOptions design = new DesignOptions();

    @Parameters(index = "1", paramLabel = "READINGS.csv", description = "what was read; - for standard input")
    String readings = "";

    @Mixin
    StandardOptions standard = new StandardOptions();

    @Option(
            names = "--out",
            paramLabel = "FILE",
            order = 10,
            description = "write the as-built design here, the design's comments kept")
    @Nullable
    String out;

    @Option(names = "--replace", order = 11, description = "write over a file that is there")
    boolean replace;

    @Option(
            names = "--record",
            paramLabel = "OUT.pdf",
            order = 12,
            description = "also write the design record with a page about this unit")
    @Nullable
    String record;

    @Option(names = "--json", order = 30, description = "the answer for machines")
    boolean json;

    FitCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        refuse();
        Source text = Inputs.source(session, design.file);
        LoadedDesign loaded = design.load(session, text);
        Design circuit = loaded.design();
        Source bench = Inputs.source(session, readings);
        FitResult result = fitted(circuit, read(bench, circuit));
        List<String> notes = new ArrayList<>(FitWords.notes(result));
        Optional<DesignText> built =
                Optional.ofNullable(out).map(name -> AsBuilt.of(DesignText.of(text), circuit, result));
        built.ifPresent(b -> notes.addAll(b.notes()));
        writeFiles(loaded, result, built);
        if (json) {
            session.out().exactly(FitJson.of(loaded, result, notes, ReadingsFile.digest(bench), out, session.ascii()));
        } else if (built.isPresent() && Outputs.STANDARD_OUTPUT.equals(out)) {
            session.out().exactly(built.get().text());
        } else {
            new FitText(session.out(), loaded, result, notes).print();
            sayWhatWasWritten();
        }
        return result.isTelling() ? ExitCode.ANSWERED : ExitCode.FAILS;
    }

    private Readings read(Source bench, Design circuit) {
        Readings read = ReadingsFile.read(bench, circuit, celsius());
        OptionalDouble volts = design.lineVolts(circuit);
        return volts.isPresent() ? read.onLine(volts.getAsDouble()) : read;
    }

    private void writeFiles(LoadedDesign loaded, FitResult result, Optional<DesignText> built) {
        if (out != null && built.isPresent() && !out.equals(Outputs.STANDARD_OUTPUT)) {
            Outputs.write(out, built.get().text(), replace);
        }
        if (record != null) {
            RecordContent content =
                    RecordContent.of(loaded, design.check(loaded), design.library(session), Program.version());
            Outputs.record(record, content.withFit(result), PageSize.A4);
        }
    }

    private void sayWhatWasWritten() {
        if (out != null) {
            session.out().line("");
            session.out().line("Written: " + out + ", the design as built.");
            session.out().line("Next: clipramp check " + out);
        }
        session.out().written("Record", Optional.ofNullable(record));
    }

    private FitResult fitted(Design circuit, Readings read) {
        try (FitWatch watch = new FitWatch(session)) {
            return Fit.run(circuit, read, watch);
        }
    }

    private double celsius() {
        return design.celsius().orElse(25);
    }

    /** Refuses what contradicts itself, and files that could not be written, before the long work. */
    private void refuse() {
        if (readings.equals(Inputs.STANDARD_INPUT) && design.file.equals(Inputs.STANDARD_INPUT)) {
            throw Problems.refused("fit", "only one of design and readings can come from standard input.");
        }
        if (out != null && !design.overrides.isEmpty()) {
            throw Problems.refused(
                    "--out", "--with and --out do not go together: write what --with says into the design first.");
        }
        if (json && Outputs.STANDARD_OUTPUT.equals(out)) {
            throw Problems.refused("--out", "--json and --out=- cannot both go to standard output. Choose one.");
        }
        if (out != null && !out.equals(Outputs.STANDARD_OUTPUT)) {
            Outputs.requirePlace(out, replace);
        }
        if (record != null) {
            Outputs.requireRecord(record);
        }
    }
}
