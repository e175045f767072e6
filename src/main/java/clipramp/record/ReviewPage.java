package clipramp.record;

import clipramp.circuit.Document;
import clipramp.figures.KnobFigure;
import clipramp.files.LoadedDesign;
import clipramp.margins.Check;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import clipramp.power.OperatingPoint;
import clipramp.units.Unit;
import com.lowagie.text.Element;
import com.lowagie.text.Font;
import com.lowagie.text.Paragraph;
import com.lowagie.text.Phrase;
import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.PdfPCell;
import com.lowagie.text.pdf.PdfPTable;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** Page one: what a reviewer must know before turning it. */
final class ReviewPage {
    private static final int WORST = 5;
    private static final float LINE = Faces.SMALL * 1.35f;
    private static final float LOWEST_FIGURE = 130;
    private static final int MOST_LISTED = 8;
    private static final int MOST_OVERRIDES = 4;
    private static final int LONGEST_ITEM = 70;
    private static final int LONGEST_TITLE = 160;

    private final Paper paper;
    private final Faces faces;
    private final RecordContent content;
    private final Check check;

    ReviewPage(Paper paper, RecordContent content) {
        this.paper = paper;
        this.faces = paper.faces();
        this.content = content;
        this.check = content.check();
    }

    void write() {
        paper.section("Review");
        caution();
        document();
        verdicts();
        worst();
        List<String[]> taken = taken();
        firing(paper.room() - heightOf(taken));
        taken.forEach(this::write);
        paper.quiet(
                "Everything here is computed from the inputs named above, for this design as drawn. It is no statement"
                        + " of compliance with any standard, and no substitute for measurement, local codes and licensed work.");
    }

    private void caution() {
        PdfPTable box = new PdfPTable(1);
        box.setWidthPercentage(100);
        Phrase phrase = new Phrase(LINE, "", faces.small());
        phrase.add(new Phrase("Mains voltage kills.  ", faces.smallBold()));
        phrase.add(new Phrase(
                "Every part of such a circuit can be at line potential, the knob's terminals too. Local codes decide what"
                        + " may be built; licensed people work on it. Read the next page before building or measuring.",
                faces.small()));
        PdfPCell cell = new PdfPCell(phrase);
        cell.setBorder(Rectangle.BOX);
        cell.setBorderWidth(1.2f);
        cell.setBorderColor(faces.small().getColor());
        cell.setPadding(6);
        box.addCell(cell);
        box.setSpacingAfter(6);
        paper.add(box);
    }

    private void document() {
        LoadedDesign loaded = content.loaded();
        Document block = check.design().document();
        Grid grid = new Grid(faces, new float[] {1.1f, 3.2f, 1.1f, 2.6f});
        pair(grid, "design", or(cut(check.design().title()), loaded.name()), "number", block.number());
        pair(grid, "file", cut(loaded.name()), "revision", block.revision());
        pair(grid, "input digest", loaded.inputDigest(), "date", block.date());
        pair(grid, "program", "clipramp " + content.programVersion(), "prepared by", block.preparedBy());
        pair(
                grid,
                "overrides",
                or(listed(loaded.overrides(), ", ", MOST_OVERRIDES), "none"),
                "reviewed by",
                block.reviewedBy());
        paper.add(grid.table());
    }

    private void pair(Grid grid, String name, String value, String otherName, String otherValue) {
        grid.add(name, faces.quiet(), 0);
        grid.add(or(value, Shown.NOTHING), faces.small(), 1);
        grid.add(otherName, faces.quiet(), 2);
        grid.add(or(otherValue, Shown.NOTHING), faces.small(), 3);
    }

    private static String cut(String text) {
        return text.length() > LONGEST_TITLE ? text.substring(0, LONGEST_TITLE - 1) + "…" : text;
    }

    private static String or(String text, String otherwise) {
        return text.isBlank() ? otherwise : text;
    }

    private void verdicts() {
        List<String> counts = new ArrayList<>();
        for (Verdict verdict : List.of(Verdict.FAILS, Verdict.TIGHT, Verdict.NOT_JUDGED, Verdict.HOLDS)) {
            long count = check.margins().stream()
                    .filter(margin -> margin.verdict() == verdict)
                    .count();
            counts.add(Shown.word(verdict) + " " + count);
        }
        boolean fails = check.verdict() == Verdict.FAILS;
        Font font = fails ? faces.marked(Faces.TEXT) : faces.textBold();
        paper.paragraph(
                (fails ? "This design fails. " : "") + check.margins().size() + " margins: "
                        + String.join(", ", counts),
                font,
                3,
                0);
        paper.paragraph(
                "Nominal parts, each margin at its worst among the line's and the surroundings' extremes.",
                faces.quiet(),
                1,
                0);
    }

    private void worst() {
        Grid grid = new Grid(faces, new float[] {2.9f, 2.3f, 1.4f, 1.4f, 0.9f, 1.6f, 1.1f}, 2, 3, 4);
        grid.heads("worst margins", "worst at", "asked", "there is", "ratio", "tick: asked", "verdict");
        for (Margin margin :
                check.margins().subList(0, Math.min(WORST, check.margins().size()))) {
            grid.add(margin.name(), faces.small(), 0);
            grid.add(margin.condition(), faces.small(), 1);
            grid.add(Shown.asked(margin), faces.small(), 2);
            grid.add(Shown.of(margin.offered(), margin), faces.small(), 3);
            grid.add(Shown.ratio(margin), faces.small(), 4);
            grid.add(new RatioBar(margin), 14);
            grid.add(Shown.word(margin.verdict()), faces.smallBold(), 6);
        }
        paper.add(grid.table());
    }

    /** Firing in words at the left, the knob's curve at the right, as high as the page has room for. */
    private void firing(float room) {
        PdfPTable two = new PdfPTable(new float[] {1, 1.35f});
        two.setWidthPercentage(100);
        two.setSpacingBefore(2);
        two.setSpacingAfter(4);
        PdfPCell left = plain();
        left.addElement(summary().table());
        two.addCell(left);
        float width = paper.width() * 1.35f / 2.35f - 10;
        PdfPCell right = plain();
        right.setPaddingLeft(10);
        float height = Math.max(LOWEST_FIGURE, Math.min(width / 1.1f, room));
        right.addElement(
                paper.picture(new KnobFigure(check.knob(), check.design().wanted()), width, height));
        two.addCell(right);
        paper.add(two);
    }

    private static PdfPCell plain() {
        PdfPCell cell = new PdfPCell();
        cell.setBorder(Rectangle.NO_BORDER);
        cell.setPadding(0);
        cell.setVerticalAlignment(Element.ALIGN_TOP);
        return cell;
    }

    private Grid summary() {
        Grid grid = new Grid(faces, new float[] {2.1f, 1.5f}, 1);
        grid.heads("firing at nominal line, " + Shown.brief(check.condition().celsius(), Unit.CELSIUS), "");
        OperatingPoint first = check.knob().get(0);
        OperatingPoint last = check.knob().get(check.knob().size() - 1);
        if (check.knob().size() == 1) {
            end(grid, "fixed ramp", first);
        } else {
            end(grid, "knob 0 %", first);
            end(grid, "knob 100 %", last);
        }
        grid.row("clipped from", Shown.degrees(check.clipFromRad().orElse(Double.NaN)));
        check.pulse().ifPresent(pulse -> {
            grid.row("gate pulse, peak", Shown.brief(pulse.pulse().peakGateAmps(), Unit.AMPERE));
            grid.row("above trigger current for", Shown.brief(pulse.pulse().aboveTriggerSeconds(), Unit.SECOND));
            grid.row("standing gate voltage", Shown.brief(pulse.quiescentGateVolts(), Unit.VOLT));
        });
        grid.row("dropper", Shown.brief(check.dissipation().dropperWatts(), Unit.WATT));
        return grid;
    }

    private static void end(Grid grid, String name, OperatingPoint point) {
        OptionalDouble firing = point.solution().shown().firingRad();
        grid.row(
                name + (firing.isPresent() ? ", fires at" : ""),
                firing.isPresent()
                        ? Shown.degrees(firing.getAsDouble())
                        : point.solution().state().word());
        grid.row(
                "      power",
                Shown.brief(point.load().watts(), Unit.WATT) + " = "
                        + Shown.brief(point.load().fraction(), Unit.FRACTION));
    }

    /** What the reviewer must know that no number shows: name, then what is listed under it. */
    private List<String[]> taken() {
        LoadedDesign loaded = content.loaded();
        List<String[]> taken = new ArrayList<>();
        taken.add(line(
                "Assumed: ",
                loaded.assumed().stream().map(a -> a.path() + " " + a.value()).toList()));
        taken.add(line(
                "Not judged: ",
                check.margins().stream()
                        .filter(margin -> margin.verdict() == Verdict.NOT_JUDGED)
                        .map(Margin::name)
                        .toList()));
        taken.add(line(
                "Local profiles that hide others: ",
                loaded.profiles().stream()
                        .filter(profile -> !profile.hides().isEmpty())
                        .map(profile -> profile.kind() + " " + profile.id() + " (" + profile.from() + ")")
                        .toList()));
        return taken;
    }

    private static String[] line(String name, List<String> items) {
        return new String[] {name, or(listed(items, "; ", MOST_LISTED), "none")};
    }

    /** As many as fit, each cut to what fits; the sources list them all. */
    private static String listed(List<String> items, String between, int most) {
        String listed = items.stream()
                .limit(most)
                .map(item -> item.length() > LONGEST_ITEM ? item.substring(0, LONGEST_ITEM - 1) + "…" : item)
                .collect(Collectors.joining(between));
        int more = items.size() - most;
        return more > 0 ? listed + between + "and " + more + " more, see the sources" : listed;
    }

    private void write(String[] line) {
        Phrase phrase = new Phrase(LINE, "", faces.small());
        phrase.add(new Phrase(line[0], faces.smallBold()));
        phrase.add(new Phrase(faces.printable(line[1]), faces.small()));
        Paragraph paragraph = new Paragraph(phrase);
        paragraph.setLeading(LINE);
        paragraph.setSpacingAfter(2);
        paper.add(paragraph);
    }

    /** Height in points that the lines under the figure need, statement included; words break early, so a line more. */
    private float heightOf(List<String[]> lines) {
        float height = 5 * LINE;
        for (String[] line : lines) {
            float width = faces.regular().getWidthPoint(line[0] + line[1], Faces.SMALL);
            height += LINE * (1 + (float) Math.ceil(1.05f * width / paper.width())) + 2;
        }
        return height;
    }
}
