package clipramp.figures;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.w3c.dom.Document;
import org.w3c.dom.Element;

/** What figures are drawn onto. Pictures for export are always on paper, whatever the window's theme. */
public final class Surfaces {
    private static final String SVG_NAMESPACE = "http://www.w3.org/2000/svg";
    private static final int MAX_PIXELS = 64_000_000;

    private Surfaces() {}

    /** Draws a figure onto any surface in a size in user units, smoothly where the surface can be told so. */
    public static void draw(Figure figure, Graphics2D g, double width, double height, Style style) {
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        g.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
        figure.draw(g, width, height, style);
    }

    /**
     * The figure as an SVG document, in UTF-8, with real text, title and description; alike for alike input.
     *
     * @param figure what is drawn
     * @param width in px, above 0
     * @param height in px, above 0
     * @throws IllegalArgumentException for a size that is not above 0
     */
    public static String toSvg(Figure figure, double width, double height) {
        requireSize(width, height);
        try {
            Document document = documentFactory()
                    .newDocumentBuilder()
                    .getDOMImplementation()
                    .createDocument(SVG_NAMESPACE, "svg", null);
            SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
            context.setComment("clipramp");
            context.setEmbeddedFontsOn(false);
            SVGGraphics2D g = new SVGGraphics2D(context, false);
            g.setSVGCanvasSize(new Dimension((int) Math.ceil(width), (int) Math.ceil(height)));
            draw(figure, g, width, height, Style.SCREEN);
            StringWriter out = new StringWriter();
            g.stream(labelled(g, figure, width, height), out, true, false);
            return out.toString()
                    .replace("'" + Lettering.FAMILY + "'", "'" + Lettering.FAMILY + "', sans-serif")
                    .replace("'Dialog'", "sans-serif");
        } catch (ParserConfigurationException e) {
            throw new IllegalStateException("this Java has no XML", e);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static DocumentBuilderFactory documentFactory() {
        DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
        factory.setNamespaceAware(true);
        return factory;
    }

    private static Element labelled(SVGGraphics2D g, Figure figure, double width, double height) {
        Element root = g.getRoot();
        root.setAttributeNS(null, "viewBox", "0 0 " + Numerals.plain(width) + " " + Numerals.plain(height));
        root.setAttributeNS(null, "role", "img");
        Document document = root.getOwnerDocument();
        Element title = document.createElementNS(SVG_NAMESPACE, "title");
        title.appendChild(document.createTextNode(figure.title()));
        Element description = document.createElementNS(SVG_NAMESPACE, "desc");
        description.appendChild(document.createTextNode(figure.sentence()));
        root.insertBefore(description, root.getFirstChild());
        root.insertBefore(title, description);
        return root;
    }

    /**
     * The figure as a PNG file.
     *
     * @param figure what is drawn
     * @param width in px at scale 1, above 0
     * @param height in px at scale 1, above 0
     * @param scale pixels per px, above 0; 2 for a sharp print
     * @throws IllegalArgumentException for a size that is not above 0, or of more than 64 million pixels
     */
    public static byte[] toPng(Figure figure, double width, double height, double scale) {
        return png(toImage(figure, width, height, scale, Style.SCREEN));
    }

    /** The figure as a picture in memory, in any style; sizes and refusals as for {@link #toPng}. */
    static BufferedImage toImage(Figure figure, double width, double height, double scale, Style style) {
        requireSize(width, height);
        double columns = Math.ceil(width * scale);
        double rows = Math.ceil(height * scale);
        if (!(columns >= 1 && rows >= 1 && columns * rows <= MAX_PIXELS)) {
            throw new IllegalArgumentException("a picture of " + columns + " x " + rows + " pixels cannot be made");
        }
        BufferedImage image = new BufferedImage((int) columns, (int) rows, BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        g.setColor(style.palette().ground());
        g.fillRect(0, 0, image.getWidth(), image.getHeight());
        g.scale(scale, scale);
        draw(figure, g, width, height, style);
        g.dispose();
        return image;
    }

    private static byte[] png(BufferedImage image) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try {
            if (!ImageIO.write(image, "png", out)) {
                throw new IllegalStateException("this Java writes no PNG");
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return out.toByteArray();
    }

    private static void requireSize(double width, double height) {
        if (!(width > 0 && height > 0)) {
            throw new IllegalArgumentException("a picture of " + width + " x " + height + " cannot be made");
        }
    }
}
