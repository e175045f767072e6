package clipramp.figures;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Path2D;
import java.awt.geom.RoundRectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGraphics2D;
import org.w3c.dom.Document;

/**
 * Draws the program's icon: a clipped half sine, the ramp under it, and from the firing instant on what the load gets.
 * Writes it in every size and as SVG into a folder: {@code DrawIcon src/main/resources/clipramp/desk}.
 */
public final class DrawIcon {
    private static final int[] SIZES = {16, 32, 64, 128, 256};
    /** The grid that everything is laid out on. */
    private static final double GRID = 64;

    private static final double LEFT = 7;
    private static final double RIGHT = 57;
    private static final double ZERO = 51;
    private static final double CREST = 40;
    private static final double CLIP = 25;
    private static final double FIRED = 34;

    private DrawIcon() {}

    public static void main(String[] arguments) throws IOException, ParserConfigurationException {
        Path folder = Path.of(arguments[0]);
        for (int size : SIZES) {
            BufferedImage image = new BufferedImage(size, size, BufferedImage.TYPE_INT_ARGB);
            Graphics2D g = image.createGraphics();
            g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
            g.scale(size / GRID, size / GRID);
            draw(g, size < 48);
            g.dispose();
            ImageIO.write(image, "png", folder.resolve("icon-" + size + ".png").toFile());
        }
        Document document = DocumentBuilderFactory.newInstance()
                .newDocumentBuilder()
                .getDOMImplementation()
                .createDocument(SVGGraphics2D.SVG_NAMESPACE_URI, "svg", null);
        SVGGraphics2D svg = new SVGGraphics2D(document);
        svg.setSVGCanvasSize(new Dimension((int) GRID, (int) GRID));
        draw(svg, false);
        try (Writer out = Files.newBufferedWriter(folder.resolve("icon.svg"), StandardCharsets.UTF_8)) {
            svg.stream(out, true);
        }
    }

    /** Small, it keeps to the three strokes that can still be told apart. */
    private static void draw(Graphics2D g, boolean small) {
        Palette palette = Palette.PAPER;
        g.setColor(palette.ground());
        g.fill(new RoundRectangle2D.Double(1, 1, GRID - 2, GRID - 2, 12, 12));
        g.setColor(palette.axis());
        g.setStroke(new BasicStroke(1));
        g.draw(new RoundRectangle2D.Double(1, 1, GRID - 2, GRID - 2, 12, 12));

        Path2D load = new Path2D.Double();
        load.moveTo(FIRED, ZERO);
        wave(load, FIRED, RIGHT, CREST, false);
        load.closePath();
        g.setColor(palette.load());
        g.fill(load);

        double heavy = small ? 6 : 4;
        stroke(g, palette.supply(), heavy, clippedSine());
        Path2D ramp = new Path2D.Double();
        ramp.moveTo(LEFT + 2, ZERO);
        ramp.quadTo(FIRED - 14, ZERO - 16, FIRED, ZERO - 21);
        if (!small) {
            stroke(g, palette.ramp(), heavy, ramp);
        }
        Path2D fired = new Path2D.Double();
        fired.moveTo(FIRED, ZERO);
        fired.lineTo(FIRED, ZERO - CREST);
        stroke(g, palette.pulse(), heavy, fired);
        Path2D zero = new Path2D.Double();
        zero.moveTo(LEFT - 1, ZERO + 1);
        zero.lineTo(RIGHT + 1, ZERO + 1);
        stroke(g, palette.ink(), small ? 4 : 2.5, zero);
    }

    private static Path2D clippedSine() {
        Path2D path = new Path2D.Double();
        path.moveTo(LEFT, ZERO);
        wave(path, LEFT, RIGHT, CLIP + 8, true);
        return path;
    }

    private static void wave(Path2D path, double from, double to, double crest, boolean clipped) {
        for (double x = from; x <= to + 1e-9; x += 0.5) {
            double sine = Math.sin(Math.PI * (x - LEFT) / (RIGHT - LEFT));
            path.lineTo(x, ZERO - (clipped ? Math.min(CLIP, 2.2 * crest * sine) : crest * sine));
        }
    }

    private static void stroke(Graphics2D g, Color color, double width, Path2D path) {
        g.setColor(color);
        g.setStroke(new BasicStroke((float) width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
        g.draw(path);
    }
}
