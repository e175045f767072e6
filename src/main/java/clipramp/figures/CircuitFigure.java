package clipramp.figures;

import clipramp.circuit.Design;
import clipramp.circuit.TestPoint;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.AffineTransform;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

/** The circuit as drawn, with every part's value and the test points. */
public final class CircuitFigure implements Figure {
    private static final double WIRE = 0.11;
    private static final double SYMBOL = 0.16;
    private static final double MARGIN = 0.45;

    private final Design design;
    private final Set<String> chosen;
    private final Sheet sheet;
    private final Map<String, String> names;

    /** The circuit of a sound design, nothing highlighted. */
    public CircuitFigure(Design design) {
        this(design, Set.of(), Schematic.of(design));
    }

    private CircuitFigure(Design design, Set<String> chosen, Sheet sheet) {
        this.design = design;
        this.chosen = Set.copyOf(chosen);
        this.sheet = sheet;
        this.names = new PartText(design).names();
    }

    /** The same drawing with some parts highlighted, by their design keys; a key that is not drawn does nothing. */
    public CircuitFigure withChosen(Set<String> keys) {
        return new CircuitFigure(design, keys, sheet);
    }

    @Override
    public String title() {
        return "Circuit";
    }

    @Override
    public String sentence() {
        return "Circuit of a " + design.stage().word() + " stage with "
                + design.gate().coupling().word()
                + " gate drive: "
                + sheet.boxes().keySet().stream()
                        .map(key -> names.getOrDefault(key, key) + " (" + key + ")")
                        .collect(Collectors.joining(", "))
                + ".";
    }

    @Override
    public NumberTable numbers() {
        List<List<String>> rows = new ArrayList<>();
        for (String key : sheet.boxes().keySet()) {
            String value = sheet.labels().stream()
                    .filter(label -> label.key().equals(key))
                    .map(Sheet.Label::text)
                    .collect(Collectors.joining(" "));
            rows.add(List.of(names.getOrDefault(key, key), key, value));
        }
        for (TestPoint point : TestPoint.values()) {
            rows.add(List.of(point.name(), "", point.place()));
        }
        return new NumberTable(List.of("part", "key", "value"), rows);
    }

    @Override
    public double proportion() {
        return Schematic.WIDTH / Schematic.HEIGHT;
    }

    /** Where the parts lie when the figure is drawn at a size in user units; a smaller box stands before a larger one around it. */
    public List<PartBox> parts(double width, double height) {
        AffineTransform at = placement(width, height);
        return sheet.boxes().entrySet().stream()
                .map(entry -> new PartBox(
                        entry.getKey(),
                        names.getOrDefault(entry.getKey(), entry.getKey()),
                        at.createTransformedShape(margined(entry.getValue())).getBounds2D()))
                .sorted((a, b) -> Double.compare(area(a.box()), area(b.box())))
                .toList();
    }

    private static double area(Rectangle2D box) {
        return box.getWidth() * box.getHeight();
    }

    private static Rectangle2D margined(Rectangle2D box) {
        return new Rectangle2D.Double(
                box.getX() - MARGIN, box.getY() - MARGIN, box.getWidth() + 2 * MARGIN, box.getHeight() + 2 * MARGIN);
    }

    private static AffineTransform placement(double width, double height) {
        double scale = Math.min(width / Schematic.WIDTH, height / Schematic.HEIGHT);
        AffineTransform at = AffineTransform.getTranslateInstance(
                (width - scale * Schematic.WIDTH) / 2, (height - scale * Schematic.HEIGHT) / 2);
        at.scale(scale, scale);
        return at;
    }

    /** What is drawn, in modules, for tests. */
    Sheet sheet() {
        return sheet;
    }

    @Override
    public void draw(Graphics2D g, double width, double height, Style style) {
        Palette palette = style.palette();
        Pen pen = new Pen(g, style);
        pen.fill(palette.ground(), new Rectangle2D.Double(0, 0, width, height));
        AffineTransform at = placement(width, height);
        washChosen(pen, style, at);
        for (Sheet.Ink ink : sheet.inks()) {
            draw(ink, pen, style, at);
        }
        for (Sheet.Label label : sheet.labels()) {
            double size = Sheet.TEXT * at.getScaleX();
            double x = at.getTranslateX() + label.x() * at.getScaleX();
            double y = at.getTranslateY() + label.y() * at.getScaleY();
            pen.left(
                    label.text(),
                    label.bold() ? Lettering.bold(size) : Lettering.regular(size),
                    label.net().colour(palette),
                    x,
                    y);
        }
    }

    private void washChosen(Pen pen, Style style, AffineTransform at) {
        for (String key : chosen) {
            Rectangle2D box = sheet.boxes().get(key);
            if (box != null) {
                Rectangle2D area = at.createTransformedShape(margined(box)).getBounds2D();
                double round = at.getScaleX();
                RoundRectangle2D patch = new RoundRectangle2D.Double(
                        area.getX(), area.getY(), area.getWidth(), area.getHeight(), round, round);
                pen.fill(style.palette().wash(), patch);
                pen.stroke(style.palette().ink(), weight(style, 0.1, at), patch);
            }
        }
    }

    private void draw(Sheet.Ink ink, Pen pen, Style style, AffineTransform at) {
        Palette palette = style.palette();
        Color colour = ink.net().colour(palette);
        Shape shape = at.createTransformedShape(ink.shape());
        if (ink.filled()) {
            pen.fill(colour, shape);
            return;
        }
        if ((!ink.key().isEmpty() && ink.net() == Net.LINE) || isRing(ink)) {
            pen.fill(palette.ground(), shape);
        }
        pen.stroke(colour, weight(style, ink.net() == Net.SYMBOL ? SYMBOL : WIRE, at), shape);
    }

    /** A stroke as wide as so many of the sheet's units. */
    private static Stroke weight(Style style, double units, AffineTransform at) {
        return style.solid(units * (at.getScaleX() / style.zoom()));
    }

    private static boolean isRing(Sheet.Ink ink) {
        return ink.shape() instanceof Ellipse2D && ink.net() != Net.SYMBOL;
    }
}
