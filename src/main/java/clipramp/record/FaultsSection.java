package clipramp.record;

import clipramp.circuit.Designators;
import clipramp.faults.Burden;
import clipramp.faults.FaultEffect;
import clipramp.faults.FaultSheet;
import clipramp.faults.Probe;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** The symptom sheet: every single fault, what it does at the load and the test points, and what it burns next. */
final class FaultsSection {
    /** Voltages are shown to this much, V. */
    private static final double SHOWN_VOLTS = 0.01;

    private final Paper paper;
    private final FaultSheet sheet;
    private final Map<String, String> names;
    private final Grid grid;

    private FaultsSection(Paper paper, FaultSheet sheet) {
        this.paper = paper;
        this.sheet = sheet;
        this.names = Designators.of(sheet.design());
        this.grid = new Grid(
                paper.faces(),
                new float[] {4.2f, 2, 1.3f, 0.9f, 1.1f, 1.1f, 1.2f, 1.2f, 1.1f, 1.1f},
                2,
                4,
                5,
                6,
                7,
                8,
                9);
    }

    static void write(Paper paper, RecordContent content) {
        new FaultsSection(paper, content.faults()).write();
    }

    private void write() {
        paper.newPage();
        paper.section("Single faults");
        paper.text(
                "Every part open, shorted, drifted or dead in turn, at nominal line"
                        + (sheet.design().ramp().pot().isPresent() ? ", knob in the middle" : "")
                        + ", before anything else burns. dc is a mean-reading meter, ac true rms with the dc taken off, peak"
                        + " an oscilloscope. Take every point as live at line potential, behind a winding too: isolated"
                        + " instruments only, by whoever local rules let work on it. A reading near zero never means that a wire is dead.");
        List<String> heads = new ArrayList<>(List.of("fault", "load gets", "load", "knob"));
        Probe.TELLING.forEach(p -> heads.add(p.point() + " " + p.meter().word() + ", V"));
        grid.heads(heads.toArray(String[]::new));
        row(sheet.healthy());
        sheet.faults().forEach(this::row);
        paper.add(grid.table());
        sheet.notComputed()
                .forEach(one -> paper.quiet("Not computed: " + one.fault().words() + " (" + one.reason() + ")."));
    }

    private void row(FaultEffect effect) {
        boolean healthy = effect.equals(sheet.healthy());
        List<String> row = new ArrayList<>(List.of(
                effect.fault().words(),
                healthy ? Shown.NOTHING : effect.gets().word(),
                Shown.brief(effect.middle().watts() < 1e-3 ? 0 : effect.middle().watts(), Unit.WATT),
                sheet.design().ramp().pot().isEmpty() ? Shown.NOTHING : effect.knobActs() ? "acts" : "dead"));
        Probe.TELLING.forEach(p -> row.add(volts(p.volts(effect))));
        grid.row(row.toArray(String[]::new));
        if (!effect.over().isEmpty()) {
            grid.across(
                    "burns next: " + effect.over().stream().map(this::said).collect(Collectors.joining("; ")),
                    paper.faces().small());
        }
        effect.remarks().forEach(remark -> grid.across(remark, paper.faces().quiet()));
    }

    /** What an instrument cannot tell from nothing is nothing. */
    private static String volts(double volts) {
        return Shown.number(Math.round(volts / SHOWN_VOLTS) * SHOWN_VOLTS, 3);
    }

    private String said(Burden burden) {
        return burden.said(names.getOrDefault(burden.part(), burden.part()), Shown::brief);
    }
}
