package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.cli.TextTable.Align;
import clipramp.files.LoadedDesign;
import clipramp.firing.Dissipation;
import clipramp.firing.Pulse;
import clipramp.margins.Check;
import clipramp.margins.Margin;
import clipramp.margins.Note;
import clipramp.margins.Verdict;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** The judgement for people: verdict, margins worst first, knob, pulse, supply, and what it all rests on. */
final class CheckText {
    private static final String BASIS = "Nominal parts, tolerances not included.";

    private final Output out;
    private final LoadedDesign loaded;
    private final Check check;

    CheckText(Output out, LoadedDesign loaded, Check check) {
        this.out = out;
        this.loaded = loaded;
        this.check = check;
    }

    void print() {
        heading(out, loaded, check.condition());
        out.line("");
        verdict();
        out.line("");
        margins();
        out.line("");
        out.line("Knob");
        out.lines(KnobText.lines(check.knob(), out.spelling()));
        out.line("");
        pulse();
        supply();
        check.heat().ifPresent(heat -> LineText.printHeat(out, heat));
        check.lineCurrent().ifPresent(current -> LineText.print(out, current));
        footing(out, loaded, check.notes());
    }

    /** Caution, title and what the figures hold for. */
    static void heading(Output out, LoadedDesign loaded, Condition condition) {
        out.line(BASIS + (Commands.has("spread") ? " See clipramp spread." : ""));
        title(out, loaded);
        out.line("  at " + condition(condition));
    }

    /** Caution, the design's name and what was changed in it. */
    static void title(Output out, LoadedDesign loaded) {
        out.line(Caution.LINE);
        out.line("");
        String title = loaded.design().title();
        out.strongLine(title.isEmpty() ? "Untitled design" : title, "  (" + loaded.name() + ")");
        for (String override : loaded.overrides()) {
            out.line("  with " + override);
        }
    }

    /** Says so where a design that is shown has a margin that fails. */
    static void marked(Output out, Check check) {
        List<String> failing = check.margins().stream()
                .filter(m -> m.verdict() == Verdict.FAILS)
                .map(Margin::name)
                .toList();
        if (!failing.isEmpty()) {
            out.lines(Paragraph.wrap("This design fails: " + String.join(", ", failing) + ". See clipramp check.", ""));
        }
    }

    static String condition(Condition condition) {
        return Shown.amount(condition.lineVolts(), Unit.VOLT) + ", " + Shown.amount(condition.lineHertz(), Unit.HERTZ)
                + ", " + Shown.fixed(condition.celsius(), condition.celsius() == Math.rint(condition.celsius()) ? 0 : 1)
                + " °C";
    }

    private void verdict() {
        List<String> counts = new ArrayList<>();
        for (Verdict verdict : List.of(Verdict.FAILS, Verdict.TIGHT, Verdict.NOT_JUDGED, Verdict.HOLDS)) {
            long count =
                    check.margins().stream().filter(m -> m.verdict() == verdict).count();
            if (count > 0) {
                counts.add(count + " " + said(verdict, count));
            }
        }
        int all = check.margins().size();
        String summary = counts.size() == 1 && check.verdict() == Verdict.HOLDS
                ? ".  All " + all + " margins hold."
                : ".  Of " + all + " margins " + String.join(", ", counts) + ".";
        out.strongLine("Verdict: " + check.verdict().word(), summary);
    }

    private static String said(Verdict verdict, long count) {
        boolean one = count == 1;
        return switch (verdict) {
            case FAILS -> one ? "fails" : "fail";
            case TIGHT -> one ? "is tight" : "are tight";
            case NOT_JUDGED -> one ? "is not judged" : "are not judged";
            case HOLDS -> one ? "holds" : "hold";
        };
    }

    /** Those that do not hold, what to do about them, then those that hold; in the same columns. */
    private void margins() {
        List<Margin> open = check.margins().stream()
                .filter(m -> m.verdict() != Verdict.HOLDS)
                .toList();
        List<Margin> holding = check.margins().stream()
                .filter(m -> m.verdict() == Verdict.HOLDS)
                .toList();
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.LEFT, "Margins, worst first")
                .column(Align.RIGHT, "asked")
                .column(Align.RIGHT, "there is")
                .column(Align.DECIMAL, "ratio")
                .column(Align.LEFT, "verdict")
                .column(Align.LEFT, "worst at");
        open.forEach(margin -> table.row(row(margin)));
        holding.forEach(margin -> table.row(row(margin)));
        List<String> lines = table.lines();
        int holdsFrom = 1 + open.size();
        out.lines(lines.subList(0, holdsFrom));
        if (!open.isEmpty()) {
            remedies(open);
            out.line("");
            out.line("Margins that hold, closest first");
        }
        out.lines(lines.subList(holdsFrom, lines.size()));
    }

    private static List<String> row(Margin margin) {
        String sign = margin.sense() == Margin.Sense.AT_LEAST ? "≥ " : "≤ ";
        double ratio = margin.ratio().orElse(Double.NaN);
        return List.of(
                margin.name(),
                Double.isFinite(margin.demand()) ? sign + Shown.amount(margin.demand(), margin.unit()) : Shown.NONE,
                Shown.amount(margin.offered(), margin.unit()),
                ratio >= 100 ? ">99" : Shown.fixed(ratio, 2),
                margin.verdict().word(),
                margin.condition().replace("nominal line", "nominal"));
    }

    /** The numbers behind every margin that does not hold, and what to do about it. */
    private void remedies(List<Margin> open) {
        out.line("");
        out.line("What to do");
        for (Margin margin : open) {
            out.line("  " + margin.name() + " " + said(margin.verdict(), 1));
            if (margin.verdict() == Verdict.NOT_JUDGED) {
                out.lines(Paragraph.wrap(margin.formula().replaceFirst("^not judged: ", ""), "    "));
            } else {
                out.lines(Paragraph.wrap(margin.formula(), "    "));
                out.lines(Paragraph.wrap(margin.remedy(), "    "));
            }
        }
        out.line("  More on any of them: clipramp explain MARGIN, such as clipramp explain "
                + open.get(0).id());
    }

    private void pulse() {
        if (check.pulse().isEmpty()) {
            out.line("Pulse: none at mid-knob.");
            out.line("");
            return;
        }
        Check.PulseSummary summary = check.pulse().get();
        Pulse pulse = summary.pulse();
        out.line(
                summary.atKnob().isPresent() ? "Pulse at knob " + KnobText.position(summary.atKnob()) + " %" : "Pulse");
        out.lines(new Facts(out.spelling())
                .amount("gate current, peak", pulse.peakGateAmps(), Unit.AMPERE)
                .amount("gate charge", pulse.gateCoulombs(), Unit.COULOMB)
                .amount("gate voltage, peak", pulse.peakGateVolts(), Unit.VOLT)
                .amount("gate energy", pulse.gateJoules(), Unit.JOULE)
                .amount("gate power, peak", pulse.peakGateWatts(), Unit.WATT)
                .amount("gate power, mean", summary.meanGateWatts(), Unit.WATT)
                .amount("base one, peak", pulse.peakBaseOneVolts(), Unit.VOLT)
                .amount("from the capacitor", pulse.capacitorJoules(), Unit.JOULE)
                .amount("above trigger current", pulse.aboveTriggerSeconds(), Unit.SECOND)
                .amount("standing gate voltage", summary.quiescentGateVolts(), Unit.VOLT)
                .lines());
        out.line("");
    }

    private void supply() {
        Dissipation bears = check.dissipation();
        out.line("Supply and trigger device" + (check.design().ramp().pot().isPresent() ? " at mid-knob" : ""));
        out.lines(new Facts(out.spelling())
                .fact("clipped from", Shown.degrees(check.clipFromRad()) + "°")
                .amount("dropper", bears.dropperWatts(), Unit.WATT)
                .amount("zener", bears.zenerWatts(), Unit.WATT)
                .amount("zener current, peak", bears.zenerPeakAmps(), Unit.AMPERE)
                .amount("trigger device", bears.deviceWatts(), Unit.WATT)
                .amount("emitter current, peak", bears.emitterPeakAmps(), Unit.AMPERE)
                .lines());
        out.line("");
    }

    /** What was assumed, which profiles were used, what else to know. */
    static void footing(Output out, LoadedDesign loaded, List<Note> notes) {
        if (!loaded.assumed().isEmpty()) {
            out.lines(Paragraph.wrap(
                    "Assumed: "
                            + loaded.assumed().stream()
                                    .map(a -> a.path() + " " + a.value())
                                    .collect(Collectors.joining("; "))
                            + ".",
                    "",
                    "  "));
        }
        if (!loaded.profiles().isEmpty()) {
            out.lines(Paragraph.wrap(
                    "Profiles: "
                            + loaded.profiles().stream()
                                    .map(p -> p.id() + " (" + p.kind() + ", " + p.from()
                                            + (p.hides().isEmpty() ? "" : ", hides " + p.hides()) + ")")
                                    .collect(Collectors.joining("; "))
                            + ".",
                    "",
                    "  "));
        }
        List<String> all = Stream.concat(loaded.notes().stream(), notes.stream().map(Note::text))
                .toList();
        if (!all.isEmpty()) {
            out.line("Notes:");
            all.forEach(note -> out.lines(Paragraph.wrap(note, "  ", "    ")));
        }
    }
}
