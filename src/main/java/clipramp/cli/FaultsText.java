package clipramp.cli;

import clipramp.circuit.Designators;
import clipramp.circuit.TestPoint;
import clipramp.cli.TextTable.Align;
import clipramp.faults.Burden;
import clipramp.faults.Diagnosis;
import clipramp.faults.FaultEffect;
import clipramp.faults.FaultSheet;
import clipramp.faults.Observation;
import clipramp.faults.Observation.Meter;
import clipramp.faults.Probe;
import clipramp.files.LoadedDesign;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** Faults for people: a symptom sheet, what burns next, and the ranking of what was seen. */
final class FaultsText {
    private static final int BEST = 8;
    private final Output out;
    private final LoadedDesign loaded;
    private final FaultSheet sheet;
    private final Map<String, String> names;

    FaultsText(Output out, LoadedDesign loaded, FaultSheet sheet) {
        this.out = out;
        this.loaded = loaded;
        this.sheet = sheet;
        this.names = Designators.of(sheet.design());
    }

    void print(List<Diagnosis.Candidate> ranked, boolean meters) {
        CheckText.heading(out, loaded, sheet.condition());
        out.lines(Paragraph.wrap(FaultSheet.LIVE, ""));
        out.line("");
        if (ranked.isEmpty()) {
            symptoms(meters);
        } else {
            ranking(ranked);
        }
        CheckText.footing(out, loaded, List.of());
    }

    private List<FaultEffect> all() {
        List<FaultEffect> all = new ArrayList<>();
        all.add(sheet.healthy());
        all.addAll(sheet.faults());
        return all;
    }

    private void symptoms(boolean meters) {
        out.line("Symptoms" + (sheet.design().ramp().pot().isPresent() ? ", knob in the middle" : "")
                + "; dc: mean-reading meter, ac: true rms without the dc, peak: oscilloscope");
        out.lines(table(all()).lines());
        out.line("");
        if (meters) {
            out.line("Every test point on every meter");
            out.lines(meters(all()).lines());
            out.line("");
        }
        burning();
        sheet.notComputed()
                .forEach(one -> out.lines(
                        Paragraph.wrap("Not computed: " + one.fault().words() + " (" + one.reason() + ").", "  ")));
    }

    private TextTable table(List<FaultEffect> effects) {
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.LEFT, "fault", "")
                .column(Align.LEFT, "load gets", "")
                .column(Align.RIGHT, "load", "W")
                .column(Align.LEFT, "knob", "");
        Probe.TELLING.forEach(
                p -> table.column(Align.DECIMAL, p.point().name(), p.meter().word() + " V"));
        for (FaultEffect effect : effects) {
            boolean healthy = effect.equals(sheet.healthy());
            List<String> row = new ArrayList<>(List.of(
                    effect.fault().words(),
                    healthy ? "" : effect.gets().word(),
                    Shown.fixed(effect.middle().watts(), effect.middle().watts() < 100 ? 1 : 0),
                    sheet.design().ramp().pot().isEmpty() ? Shown.NONE : effect.knobActs() ? "acts" : "dead"));
            Probe.TELLING.forEach(p -> row.add(Shown.fixed(p.volts(effect), p.decimals())));
            table.row(row);
        }
        return table;
    }

    private TextTable meters(List<FaultEffect> effects) {
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.LEFT, "fault")
                .column(Align.LEFT, "meter")
                .column(Align.DECIMAL, "TP1 V")
                .column(Align.DECIMAL, "TP2 V")
                .column(Align.DECIMAL, "TP3 V")
                .column(Align.DECIMAL, "TP4 V")
                .column(Align.DECIMAL, "TP5 V");
        for (FaultEffect effect : effects) {
            for (Meter meter : Meter.values()) {
                table.row(
                        meter == Meter.DC ? effect.fault().words() : "",
                        meter.word(),
                        volts(effect, TestPoint.TP1, meter, 2),
                        volts(effect, TestPoint.TP2, meter, 2),
                        volts(effect, TestPoint.TP3, meter, 3),
                        volts(effect, TestPoint.TP4, meter, 3),
                        volts(effect, TestPoint.TP5, meter, 1));
            }
        }
        return table;
    }

    private static String volts(FaultEffect effect, TestPoint point, Meter meter, int decimals) {
        return Shown.fixed(effect.volts(point, meter), decimals);
    }

    private void burning() {
        out.line("Over its rating, burns next; and what else to know");
        for (FaultEffect effect : sheet.faults()) {
            if (!effect.over().isEmpty() || !effect.remarks().isEmpty()) {
                out.line("  " + effect.fault().words());
                notes(effect);
            }
        }
        out.line("");
    }

    private void notes(FaultEffect effect) {
        if (!effect.over().isEmpty()) {
            out.lines(Paragraph.wrap(
                    effect.over().stream().map(this::said).collect(Collectors.joining("; ")) + ".", "    ", "      "));
        }
        effect.remarks().forEach(remark -> out.lines(Paragraph.wrap(remark, "    ", "      ")));
    }

    private String said(Burden burden) {
        return burden.said(names.getOrDefault(burden.part(), burden.part()), Shown::amount);
    }

    private void ranking(List<Diagnosis.Candidate> ranked) {
        int observations =
                ranked.get(0).fits().size() + ranked.get(0).contradicts().size();
        out.line("What fits, best first; " + observations + (observations == 1 ? " observation" : " observations"));
        int shown = 0;
        for (Diagnosis.Candidate candidate : ranked) {
            if (candidate.fits().isEmpty() || shown == BEST) {
                break;
            }
            shown++;
            print(candidate, shown);
        }
        if (shown == 0) {
            out.line("  No single fault explains any of them.");
        }
        out.line("");
        out.line("The best of them at the test points"
                + (sheet.design().ramp().pot().isPresent() ? ", mid-knob" : ""));
        List<FaultEffect> best = new ArrayList<>(List.of(sheet.healthy()));
        ranked.stream()
                .limit(shown)
                .map(Diagnosis.Candidate::effect)
                .filter(effect -> !effect.equals(sheet.healthy()))
                .forEach(best::add);
        out.lines(table(best).lines());
        out.line("");
    }

    private void print(Diagnosis.Candidate candidate, int place) {
        String head = "  " + place + ". " + candidate.effect().fault().words() + ": "
                + candidate.fits().size() + " fit";
        out.line(candidate.contradicts().isEmpty() ? head + ", none against it" : head);
        if (!candidate.contradicts().isEmpty()) {
            out.lines(Paragraph.wrap(
                    "against it: "
                            + candidate.contradicts().stream()
                                    .map(one -> one.seen().text() + " (" + one.instead() + ")")
                                    .collect(Collectors.joining("; ")),
                    "     ",
                    "       "));
        }
        if (!candidate.fits().isEmpty() && !candidate.contradicts().isEmpty()) {
            out.lines(Paragraph.wrap(
                    "for it: "
                            + candidate.fits().stream().map(Observation::text).collect(Collectors.joining(", ")),
                    "     ",
                    "       "));
        }
        candidate.effect().over().stream()
                .limit(1)
                .forEach(burden -> out.lines(Paragraph.wrap("burns next: " + said(burden), "     ", "       ")));
    }
}
