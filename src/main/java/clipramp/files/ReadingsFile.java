package clipramp.files;

import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.files.CsvRows.Field;
import clipramp.files.ReadingsColumn.Kind;
import clipramp.fit.BenchLine;
import clipramp.fit.BenchLine.LineVolts;
import clipramp.fit.Reading;
import clipramp.fit.Readings;
import clipramp.fit.Setting;
import clipramp.units.QuantityText;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** Reads bench readings: comma-separated, one line a setting, units and accuracies in the heads. */
public final class ReadingsFile {
    private final Source source;
    private final Design design;
    private final Findings findings = new Findings();

    private ReadingsFile(Source source, Design design) {
        this.source = source;
        this.design = design;
    }

    /**
     * The readings of a session.
     *
     * @param source the file's name and text
     * @param design what was measured, which says whether a knob must be told
     * @param celsius ambient temperature of the session, °C
     * @throws InvalidInputException with everything that is wrong, in the order of its lines
     */
    public static Readings read(Source source, Design design, double celsius) {
        return new ReadingsFile(source, design).readings(celsius);
    }

    /** SHA-256 of the readings' text, hexadecimal. */
    public static String digest(Source source) {
        return Digest.of(source.text());
    }

    /** Heads as they are best written, for help. */
    public static List<String> heads() {
        return ReadingsColumn.known();
    }

    private Readings readings(double celsius) {
        List<List<Field>> rows = CsvRows.of(source, findings);
        findings.throwIfAny();
        if (rows.size() < 2) {
            findings.problem(
                    Place.of(source.name(), 1, 1),
                    "",
                    "expected a line of heads, such as \"knob (%),firing angle (deg)\", and lines of readings under it.");
            findings.throwIfAny();
        }
        Map<Integer, ReadingsColumn> columns = columns(rows.get(0));
        findings.throwIfAny();
        List<BenchLine> lines = new ArrayList<>();
        for (List<Field> row : rows.subList(1, rows.size())) {
            line(row, columns, rows.get(0).size()).ifPresent(lines::add);
        }
        findings.throwIfAny();
        return new Readings(source.name(), celsius, lines);
    }

    private Map<Integer, ReadingsColumn> columns(List<Field> heads) {
        Map<Integer, ReadingsColumn> columns = new TreeMap<>();
        Field first = heads.get(0);
        if (heads.size() == 1 && first.text().contains(";")) {
            findings.problem(placeOf(first), "", "fields are parted by commas, not semicolons; numbers have a dot.");
            return columns;
        }
        for (int c = 0; c < heads.size(); c++) {
            Optional<ReadingsColumn> column = column(heads.get(c));
            if (column.isPresent()) {
                columns.put(c, column.get());
            }
        }
        if (!findings.hasProblems()) {
            requireReadingsAndSettings(placeOf(first), columns.values());
        }
        return columns;
    }

    private Optional<ReadingsColumn> column(Field head) {
        if (head.text().isEmpty()) {
            return Optional.empty();
        }
        Optional<ReadingsColumn> column = ReadingsColumn.of(head.text(), placeOf(head), findings);
        if (column.isPresent() && column.get().kind() == Kind.AVERAGE && design.load() instanceof Load.Inductive) {
            findings.problem(
                    placeOf(head),
                    head.text(),
                    "what an average-reading meter shows across an inductive load is not computed. Take true rms or"
                            + " load power, or leave the column out.");
            return Optional.empty();
        }
        return column;
    }

    private void requireReadingsAndSettings(Place place, Collection<ReadingsColumn> columns) {
        if (columns.stream().noneMatch(c -> c.kind().meter.isPresent())) {
            findings.problem(place, "", "no column holds a reading. Known: " + String.join(", ", heads()) + ".");
        } else if (design.ramp().pot().isPresent()
                && columns.stream().noneMatch(c -> c.kind() == Kind.KNOB || c.kind() == Kind.RAMP_OHMS)) {
            findings.problem(
                    place,
                    "",
                    "the design has a knob: add a column \"knob (%)\" or \"ramp resistance (kohm)\" that says where it stood.");
        }
    }

    private Place placeOf(Field field) {
        return Place.of(source.name(), field.line(), field.column());
    }

    private Optional<BenchLine> line(List<Field> row, Map<Integer, ReadingsColumn> columns, int heads) {
        if (row.size() > heads) {
            Field extra = row.get(heads);
            findings.problem(placeOf(extra), "", "this line has " + row.size() + " fields under " + heads + " heads.");
            return Optional.empty();
        }
        int before = findings.count();
        Row read = new Row();
        for (int c = 0; c < row.size(); c++) {
            ReadingsColumn column = columns.get(c);
            Field field = row.get(c);
            if (column == null || column.kind() == Kind.NOTE || field.text().isEmpty()) {
                continue;
            }
            double value = value(field, column);
            if (!Double.isNaN(value)) {
                read.take(column, value);
            }
        }
        return findings.count() > before ? Optional.empty() : read.bench(row.get(0));
    }

    /** What a line of the file has given so far. */
    private final class Row {
        private Optional<Setting> knob = Optional.empty();
        private Optional<Setting> resistance = Optional.empty();
        private Optional<LineVolts> volts = Optional.empty();
        private final List<Reading> readings = new ArrayList<>();

        void take(ReadingsColumn column, double value) {
            switch (column.kind()) {
                case KNOB -> knob = Optional.of(setting(Setting.Kind.KNOB, column, value));
                case RAMP_OHMS -> resistance = Optional.of(setting(Setting.Kind.RAMP_OHMS, column, value));
                case LINE -> volts = Optional.of(new LineVolts(value, column.accuracy(), column.head()));
                default ->
                    readings.add(
                            new Reading(column.kind().meter.orElseThrow(), value, column.accuracy(), column.head()));
            }
        }

        private static Setting setting(Setting.Kind kind, ReadingsColumn column, double value) {
            return new Setting(kind, value, column.accuracy(), column.head());
        }

        Optional<BenchLine> bench(Field first) {
            // An ohmmeter's figure at a knob position tells the track; alone it is where the knob stood.
            if (knob.isPresent() && resistance.isPresent()) {
                Setting measured = resistance.get();
                readings.add(new Reading(
                        Kind.RAMP_OHMS.meter.orElseThrow(), measured.value(), measured.accuracy(), measured.column()));
            }
            boolean hasKnob = design.ramp().pot().isPresent();
            Optional<Setting> setting = knob.or(() -> resistance);
            if (knob.isPresent() && !hasKnob) {
                return refused(first, "a knob position stands here, and the design has no knob (ramp.pot: none).");
            }
            if (readings.isEmpty()) {
                return refused(first, "nothing was read on this line. Fill it in or take it out.");
            }
            if (setting.isEmpty() && hasKnob) {
                return refused(
                        first, "where did the knob stand? Give its position or the ramp resistance on this line.");
            }
            return Optional.of(new BenchLine(first.line(), setting.orElseGet(Setting::fixed), volts, readings));
        }

        private Optional<BenchLine> refused(Field first, String sentence) {
            findings.problem(placeOf(first), "", sentence);
            return Optional.empty();
        }
    }

    /** NaN where it is refused. */
    private double value(Field field, ReadingsColumn column) {
        String text = field.text().replace('\u2212', '-');
        String expected = "a number, " + window(column);
        if (!text.matches("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d{1,3})?")) {
            String hint = text.matches("[+-]?\\d+,\\d+") ? " Write a dot: " + text.replace(',', '.') + "." : "";
            refuse(field, column, expected, hint);
            return Double.NaN;
        }
        double value = Double.parseDouble(text) * column.scale();
        if (!(value >= column.kind().low * (1 - 1e-12) && value <= column.kind().high * (1 + 1e-12))) {
            refuse(field, column, expected, "");
            return Double.NaN;
        }
        return Math.min(value, column.kind().high);
    }

    private void refuse(Field field, ReadingsColumn column, String expected, String hint) {
        findings.problem(
                placeOf(field),
                column.head(),
                field.text(),
                expected,
                "read \"" + field.text() + "\"; expected " + expected + "." + hint);
    }

    private static String window(ReadingsColumn column) {
        Kind kind = column.kind();
        double low = kind.low / column.scale();
        double high = kind.high / column.scale();
        return QuantityText.number(low, 4) + ".." + QuantityText.number(high, 4);
    }
}
