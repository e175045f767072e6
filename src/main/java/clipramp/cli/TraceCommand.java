package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.cli.TextTable.Align;
import clipramp.files.Conditions;
import clipramp.files.LoadedDesign;
import clipramp.firing.Firing;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Waveforms;
import clipramp.margins.Check;
import clipramp.power.KnobMap;
import clipramp.power.OperatingPoint;
import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The half cycle's waveforms at one position of the knob. */
@Command(
        name = "trace",
        sortOptions = false,
        sortSynopsis = false,
        description = {
            "The waveforms of one half cycle (a period for half-wave) in the periodic state: line, clipped supply, ramp,"
                    + " peak point, base one, gate and currents; every event is a sample.",
            "Without --csv, --json or --plot it lists the pulses."
        })
final class TraceCommand extends Analysis {
    private static final int USUAL_SAMPLES = 720;
    private static final int MOST_SAMPLES = 100_000;
    private static final double MID_KNOB = 0.5;

    @Option(
            names = "--knob",
            paramLabel = "POSITION",
            order = 10,
            description = "knob position, such as 50%%; 50%% unless said")
    @Nullable
    String knob;

    @Option(
            names = "--resistance",
            paramLabel = "OHMS",
            order = 11,
            description = "the whole ramp resistance instead, such as 50k")
    @Nullable
    String resistance;

    @Option(
            names = "--angle",
            paramLabel = "DEGREES",
            order = 12,
            description = "whatever fires at this angle instead, such as 90")
    @Nullable
    String angle;

    @Option(
            names = "--samples",
            paramLabel = "N",
            order = 13,
            description = "about how many instants, 2.." + MOST_SAMPLES + "; " + USUAL_SAMPLES + " unless said")
    @Nullable
    String samples;

    @Mixin
    FormOptions form = new FormOptions();

    TraceCommand(Session session) {
        super(session);
    }

    @Override
    public Integer call() {
        form.require();
        if (Stream.of(knob, resistance, angle).filter(Objects::nonNull).count() > 1) {
            throw Problems.refused("--knob", "--knob, --resistance and --angle each say where. Give one of them.");
        }
        int count = samples == null ? USUAL_SAMPLES : Problems.whole("--samples", samples, 2, MOST_SAMPLES);
        LoadedDesign loaded = design.load(session);
        Condition condition = design.condition(loaded.design());
        OperatingPoint point = point(loaded.design(), condition);
        Check check = design.check(loaded);
        form.plot().ifPresent(name -> Outputs.tracePlot(name, loaded.design(), condition, point));
        if (form.json() || form.csv()) {
            Waveforms waveforms = Firing.waveforms(loaded.design(), condition, point.rampOhms(), count);
            session.out()
                    .exactly(
                            form.csv() ? TraceColumn.csv(waveforms) : json(loaded, check, condition, point, waveforms));
            if (form.csv()) {
                CheckText.marked(session.err(), check);
            }
        } else {
            print(loaded, check, condition, point);
        }
        return ExitCode.ANSWERED;
    }

    private OperatingPoint point(Design circuit, Condition condition) {
        if (angle != null) {
            Wants.Answered found = Wants.rampOhmsForAngle("--angle", angle, circuit, condition);
            found.note().ifPresent(note -> session.err().line(note.text()));
            return KnobMap.atRampOhms(circuit, condition, found.rampOhms().get(0));
        }
        if (resistance != null) {
            return KnobMap.atRampOhms(circuit, condition, Conditions.rampOhms(resistance));
        }
        return KnobMap.at(circuit, condition, knob == null ? MID_KNOB : Conditions.knob(knob));
    }

    private String json(
            LoadedDesign loaded, Check check, Condition condition, OperatingPoint point, Waveforms waveforms) {
        return Answer.about("trace", loaded, check.verdict(), check.notes()).json(session.ascii(), json -> {
            Answer.titleAndCondition(json, loaded, condition);
            json.putObject("point", at -> KnobJson.write(at, point))
                    .putObject("waveforms", columns -> TraceColumn.write(columns, waveforms));
        });
    }

    private void print(LoadedDesign loaded, Check check, Condition condition, OperatingPoint point) {
        Output out = session.out();
        CheckText.heading(out, loaded, condition);
        CheckText.marked(out, check);
        out.line("");
        out.lines(KnobText.lines(List.of(point), out.spelling()));
        out.line("");
        HalfCycle half = point.solution().shown();
        if (half.pulses().isEmpty()) {
            out.line("No pulse in this half cycle.");
        } else {
            out.lines(pulses(half, out.spelling()));
        }
        out.line("");
        out.line(form.plot().map(name -> "Plot: " + name).orElse("Waveforms: add --csv, --json or --plot=OUT.svg."));
    }

    private static List<String> pulses(HalfCycle half, Spelling spelling) {
        TextTable table = new TextTable(spelling, "  ")
                .column(Align.RIGHT, "pulse", "")
                .column(Align.DECIMAL, "starts", "deg")
                .column(Align.DECIMAL, "starts", "ms")
                .column(Align.DECIMAL, "lasts", "µs")
                .column(Align.DECIMAL, "peak point", "V")
                .column(Align.DECIMAL, "supply", "V")
                .column(Align.DECIMAL, "gate", "mA")
                .column(Align.DECIMAL, "gate", "V")
                .column(Align.DECIMAL, "base one", "V")
                .column(Align.LEFT, "thyristor", "");
        int number = 0;
        for (Pulse pulse : half.pulses()) {
            number++;
            table.row(
                    Integer.toString(number),
                    Shown.fixed(Math.toDegrees(pulse.startRad()), 1),
                    Shown.fixed(1e3 * pulse.startSeconds(), 3),
                    Shown.fixed(1e6 * (pulse.endSeconds() - pulse.startSeconds()), 1),
                    Shown.fixed(pulse.peakPointVolts(), 2),
                    Shown.fixed(pulse.supplyVolts(), 2),
                    Shown.fixed(1e3 * pulse.peakGateAmps(), 1),
                    Shown.fixed(pulse.peakGateVolts(), 2),
                    Shown.fixed(pulse.peakBaseOneVolts(), 2),
                    effect(half, number - 1));
        }
        return table.lines();
    }

    private static String effect(HalfCycle half, int index) {
        Pulse pulse = half.pulses().get(index);
        String end = pulse.endPulse() ? ", end pulse" : "";
        if (index == half.firingIndex()) {
            return "turns on" + end;
        }
        if (half.firingIndex() >= 0 && index > half.firingIndex()) {
            return "on already" + end;
        }
        return (pulse.turnsOn() ? "does not latch" : "stays off") + end;
    }
}
