package clipramp.desk.model;

import clipramp.circuit.Designators;
import clipramp.circuit.TestPoint;
import clipramp.faults.Burden;
import clipramp.faults.Diagnosis;
import clipramp.faults.FaultEffect;
import clipramp.faults.FaultSheet;
import clipramp.faults.LoadAt;
import clipramp.faults.Observation;
import clipramp.faults.Observation.Meter;
import clipramp.faults.Probe;
import clipramp.figures.NumberTable;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** A sheet of faults as the window shows it: a row a fault, and everything about one of them. */
public final class FaultWords {
    /** Heads of the table; the second stands only where something was seen. */
    public static final List<String> HEADS = Stream.concat(
                    Stream.of("fault", "fits", "load gets", "load W", "knob"),
                    Probe.TELLING.stream().map(p -> p.point() + " " + p.meter().word() + " V"))
            .toList();

    /** In which column of the table the fits stand, counted from 0. */
    public static final int FITS = 1;

    /** From which column of the table the test points stand, counted from 0. */
    public static final int POINTS_FROM = 5;

    private static final String NOTHING = "–";
    private static final double LEAST_WATTS = 1e-3;
    private static final double WHOLE_FROM = 100;

    private final FaultSheet sheet;
    private final Map<String, String> names;

    /** The words of one sheet. */
    public FaultWords(FaultSheet sheet) {
        this.sheet = sheet;
        this.names = Designators.of(sheet.design());
    }

    /** Every candidate in the order of the signal, the sound circuit first; or, where something was seen, best first. */
    public List<Diagnosis.Candidate> candidates(List<Observation> seen) {
        if (!seen.isEmpty()) {
            return Diagnosis.rank(sheet, seen);
        }
        List<Diagnosis.Candidate> all = new ArrayList<>();
        all.add(new Diagnosis.Candidate(sheet.healthy(), List.of(), List.of(), 0));
        sheet.faults().forEach(effect -> all.add(new Diagnosis.Candidate(effect, List.of(), List.of(), 0)));
        return all;
    }

    /** The table of the candidates. */
    public NumberTable table(List<Diagnosis.Candidate> candidates) {
        return new NumberTable(HEADS, candidates.stream().map(this::row).toList());
    }

    private List<String> row(Diagnosis.Candidate candidate) {
        FaultEffect effect = candidate.effect();
        int seen = candidate.fits().size() + candidate.contradicts().size();
        List<String> row = new ArrayList<>(List.of(
                effect.fault().words(),
                seen == 0 ? NOTHING : candidate.fits().size() + " of " + seen,
                effect.equals(sheet.healthy()) ? NOTHING : effect.gets().word(),
                watts(effect.middle().watts()),
                sheet.design().ramp().pot().isEmpty() ? NOTHING : effect.knobActs() ? "acts" : "dead"));
        Probe.TELLING.forEach(p -> row.add(QuantityText.fixed(p.volts(effect), p.decimals())));
        return row;
    }

    private static String watts(double watts) {
        return QuantityText.fixed(watts < LEAST_WATTS ? 0 : watts, watts < WHOLE_FROM ? 1 : 0);
    }

    private static String volts(FaultEffect effect, TestPoint point, Meter meter, int decimals) {
        return QuantityText.fixed(effect.volts(point, meter), decimals);
    }

    /** The load at each knob position: position, watts, share of full power, direct current. */
    public static NumberTable load(FaultEffect effect) {
        List<List<String>> rows = new ArrayList<>();
        for (LoadAt at : effect.knob()) {
            rows.add(List.of(
                    at.position().isPresent() ? Figures.percent(at.position().getAsDouble()) : "fixed",
                    watts(at.watts()) + " W",
                    Figures.percent(at.fraction()),
                    at.firingRad().isPresent() ? Figures.degrees(at.firingRad().getAsDouble()) : NOTHING));
        }
        return new NumberTable(List.of("knob", "load", "of full", "fires at"), rows);
    }

    /** Every test point on every meter. */
    public static NumberTable meters(FaultEffect effect) {
        List<List<String>> rows = new ArrayList<>();
        for (TestPoint point : TestPoint.values()) {
            if (point != TestPoint.TP0) {
                rows.add(List.of(
                        point.name(),
                        volts(effect, point, Meter.DC, 2),
                        volts(effect, point, Meter.AC, 2),
                        volts(effect, point, Meter.PEAK, 2)));
            }
        }
        return new NumberTable(List.of("test point", "dc V", "ac V", "peak V"), rows);
    }

    /** What is over its rating, worst first, a sentence each. */
    public List<String> burns(FaultEffect effect) {
        return effect.over().stream().map(this::said).toList();
    }

    private String said(Burden burden) {
        return burden.said(
                        names.getOrDefault(burden.part(), burden.part()),
                        (value, unit) -> QuantityText.format(value, unit, 3))
                + ".";
    }

    /** What speaks for a candidate and what against it; empty where nothing was seen. */
    public static List<String> reasons(Diagnosis.Candidate candidate) {
        List<String> reasons = new ArrayList<>();
        if (!candidate.fits().isEmpty()) {
            reasons.add("For it: "
                    + candidate.fits().stream().map(FaultWords::seen).collect(Collectors.joining(", ")) + ".");
        }
        if (!candidate.contradicts().isEmpty()) {
            reasons.add("Against it: "
                    + candidate.contradicts().stream()
                            .map(one -> seen(one.seen()) + " (it would be " + one.instead() + ")")
                            .collect(Collectors.joining("; "))
                    + ".");
        }
        return reasons;
    }

    /** An observation as it is said rather than typed: "load none", "TP1 = 0 V". */
    private static String seen(Observation one) {
        return one.text().replace(":", " ").replaceFirst(" ?= ?", " = ");
    }

    /** Where and how the figures hold. */
    public String heading() {
        return "At " + QuantityText.format(sheet.condition().lineVolts(), Unit.VOLT) + ", "
                + QuantityText.format(sheet.condition().celsius(), Unit.CELSIUS)
                + (sheet.design().ramp().pot().isPresent() ? ", knob in the middle" : "")
                + ", before anything else burns. dc is a mean-reading meter, ac true rms with the dc taken off, peak an"
                + " oscilloscope.";
    }

    /** Faults without figures, with the reason. */
    public List<String> notComputed() {
        return sheet.notComputed().stream()
                .map(one -> "Not computed: " + one.fault().words() + " (" + one.reason() + ").")
                .toList();
    }

    /** Names of the parts that can be found burnt. */
    public List<String> parts() {
        return List.copyOf(names.values());
    }
}
