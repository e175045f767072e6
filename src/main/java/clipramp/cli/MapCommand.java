package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.files.LoadedDesign;
import clipramp.margins.Check;
import clipramp.margins.Note;
import clipramp.margins.Verdict;
import clipramp.power.KnobMap;
import clipramp.power.OperatingPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The knob from the shaft to the load, or backwards from what the load is to get. */
@Command(
        name = "map",
        sortOptions = false,
        sortSynopsis = false,
        description = {
            "Knob position to ramp resistance, delay, firing angle, conduction angle, load volts, watts and share of"
                    + " full power; or backwards, which resistance and position give an angle, a power or a voltage."
        })
final class MapCommand extends Analysis {
    private static final int USUAL_POSITIONS = 11;
    private static final int MOST_POSITIONS = 1001;

    @Option(
            names = "--positions",
            paramLabel = "N",
            order = 10,
            description = "how many knob positions, 2.." + MOST_POSITIONS + "; " + USUAL_POSITIONS + " unless said")
    @Nullable
    String positions;

    @Option(
            names = "--for-angle",
            paramLabel = "DEGREES",
            order = 11,
            description = "only the one resistance that fires here, such as 90")
    @Nullable
    String forAngle;

    @Option(
            names = "--for-power",
            paramLabel = "POWER",
            order = 12,
            description = "only the one that gives this load power, such as 500W or 40%% of full power")
    @Nullable
    String forPower;

    @Option(
            names = "--for-volts",
            paramLabel = "VOLTS",
            order = 13,
            description = "only the one that gives this load voltage, rms")
    @Nullable
    String forVolts;

    @Mixin
    FormOptions form = new FormOptions();

    MapCommand(Session session) {
        super(session);
    }

    @Override
    public Integer call() {
        form.require();
        int count = positions == null ? USUAL_POSITIONS : Problems.whole("--positions", positions, 2, MOST_POSITIONS);
        if (Stream.of(forAngle, forPower, forVolts).filter(Objects::nonNull).count() > 1) {
            throw Problems.refused(
                    "map", "--for-angle, --for-power and --for-volts are one question each. Ask one at a time.");
        }
        LoadedDesign loaded = design.load(session);
        Design circuit = loaded.design();
        Condition condition = design.condition(circuit);
        Optional<Wants.Answered> backwards = backwards(circuit, condition);
        List<OperatingPoint> points = backwards
                .map(found -> found.rampOhms().stream()
                        .map(ohms -> KnobMap.atRampOhms(circuit, condition, ohms))
                        .toList())
                .orElseGet(() -> KnobMap.of(circuit, condition, count));
        Check check = design.check(loaded);
        form.plot().ifPresent(name -> Outputs.mapPlot(name, circuit, points));
        List<Note> notes = new ArrayList<>();
        backwards.flatMap(Wants.Answered::note).ifPresent(notes::add);
        if (form.json()) {
            notes.addAll(check.notes());
            session.out().exactly(json(loaded, condition, points, check.verdict(), notes));
        } else if (form.csv()) {
            session.out().exactly(KnobCsv.of(points));
            CheckText.marked(session.err(), check);
            notes.forEach(note -> session.err().line(note.text()));
        } else {
            print(loaded, condition, points, check, notes);
        }
        return ExitCode.ANSWERED;
    }

    private Optional<Wants.Answered> backwards(Design circuit, Condition condition) {
        if (forAngle != null) {
            return Optional.of(Wants.rampOhmsForAngle("--for-angle", forAngle, circuit, condition));
        }
        if (forPower != null) {
            return Optional.of(Wants.rampOhmsForPower("--for-power", forPower, circuit, condition));
        }
        return forVolts == null
                ? Optional.empty()
                : Optional.of(Wants.rampOhmsForVolts("--for-volts", forVolts, circuit, condition));
    }

    private String json(
            LoadedDesign loaded, Condition condition, List<OperatingPoint> points, Verdict verdict, List<Note> notes) {
        return Answer.about("map", loaded, verdict, notes).json(session.ascii(), json -> {
            Answer.titleAndCondition(json, loaded, condition);
            json.putObjects("knob", points, KnobJson::write);
        });
    }

    private void print(
            LoadedDesign loaded, Condition condition, List<OperatingPoint> points, Check check, List<Note> notes) {
        Output out = session.out();
        CheckText.heading(out, loaded, condition);
        CheckText.marked(out, check);
        out.line("");
        out.lines(KnobText.lines(points, out.spelling()));
        notes.forEach(note -> {
            out.line("");
            out.lines(Paragraph.wrap(note.text(), ""));
        });
        out.written("Plot", form.plot());
    }
}
