package clipramp.figures;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.StringReader;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilder;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

class SurfacesTest {
    static Stream<Arguments> everyFigure() {
        return Gallery.figures().entrySet().stream().map(e -> Arguments.of(e.getKey(), e.getValue()));
    }

    private static Document parsed(String svg) throws Exception {
        DocumentBuilder builder = DocumentBuilderFactory.newInstance().newDocumentBuilder();
        builder.setEntityResolver((id, system) -> new InputSource(new StringReader("")));
        return builder.parse(new InputSource(new StringReader(svg)));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyFigure")
    void svgIsWellFormedWithRealTextTitleAndDescription(String name, Figure figure) throws Exception {
        String svg = Surfaces.toSvg(figure, 800, 800 / figure.proportion());
        Document document = parsed(svg);
        assertThat(document.getDocumentElement().getTagName()).isEqualTo("svg");
        assertThat(document.getElementsByTagName("title").item(0).getTextContent())
                .isEqualTo(figure.title());
        assertThat(document.getElementsByTagName("desc").item(0).getTextContent())
                .isEqualTo(figure.sentence());
        NodeList texts = document.getElementsByTagName("text");
        assertThat(texts.getLength()).isGreaterThan(8);
        assertThat(document.getElementsByTagName("image").getLength()).isZero();
        assertThat(svg).contains("DejaVu Sans");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyFigure")
    void alikeInputGivesAlikeSvg(String name, Figure figure) {
        assertThat(Surfaces.toSvg(figure, 700, 500)).isEqualTo(Surfaces.toSvg(figure, 700, 500));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyFigure")
    void pngShowsSomethingAndHasTheSizeAsked(String name, Figure figure) throws IOException {
        byte[] png = Surfaces.toPng(figure, 600, 400, 1.5);
        BufferedImage image = ImageIO.read(new ByteArrayInputStream(png));
        assertThat(image.getWidth()).isEqualTo(900);
        assertThat(image.getHeight()).isEqualTo(600);
        Set<Integer> colours = new HashSet<>();
        int drawn = 0;
        int ground = Palette.PAPER.ground().getRGB();
        for (int y = 0; y < 600; y++) {
            for (int x = 0; x < 900; x++) {
                colours.add(image.getRGB(x, y));
                drawn += image.getRGB(x, y) == ground ? 0 : 1;
            }
        }
        assertThat(colours.size()).isGreaterThan(20);
        assertThat(drawn).isBetween(3_000, 500_000);
    }

    /** Nothing is cut off: the outermost frame of pixels shows the ground alone. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("everyFigure")
    void nothingRunsOverTheEdge(String name, Figure figure) {
        for (Palette palette : new Palette[] {Palette.PAPER, Palette.INK}) {
            Color ground = palette.ground();
            int height = (int) (900 / figure.proportion());
            BufferedImage image = Surfaces.toImage(figure, 900, height, 1, Style.SCREEN.with(palette));
            for (int x = 0; x < 900; x++) {
                assertThat(new Color(image.getRGB(x, 0))).as("top " + x).isEqualTo(ground);
                assertThat(new Color(image.getRGB(x, height - 1)))
                        .as("bottom " + x)
                        .isEqualTo(ground);
            }
            for (int y = 0; y < height; y++) {
                assertThat(new Color(image.getRGB(0, y))).as("left " + y).isEqualTo(ground);
                assertThat(new Color(image.getRGB(899, y))).as("right " + y).isEqualTo(ground);
            }
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyFigure")
    void everyFigureHasATableAndASentence(String name, Figure figure) {
        assertThat(figure.numbers().rows()).isNotEmpty();
        assertThat(figure.sentence()).endsWith(".").doesNotContain("NaN").hasSizeGreaterThan(30);
        assertThat(figure.numbers().rows().toString()).doesNotContain("NaN");
    }

    @Test
    void anImpossibleSizeIsRefused() {
        Figure figure = Gallery.figures().get("knob");
        assertThatThrownBy(() -> Surfaces.toPng(figure, 0, 100, 1)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Surfaces.toPng(figure, 1e6, 1e6, 1)).hasMessageContaining("cannot be made");
    }

    @Test
    void anAnglePointedAtIsTheAngleDrawnThere() {
        LanesFigure figure = (LanesFigure) Gallery.figures().get("lanes");
        LanesFrame frame = figure.frame(900, 600, Style.SCREEN);
        for (double degrees : new double[] {0, 12.5, 90, 179.9}) {
            double rad = Math.toRadians(degrees);
            assertThat(frame.radAt(frame.xOf(rad))).isCloseTo(rad, within(1e-12));
        }
        assertThat(frame.radAt(-50)).isZero();
        for (Lane lane : Lane.values()) {
            assertThat(frame.laneAt(frame.plot(lane).getCenterY())).contains(lane);
        }
    }

    @Test
    void aKnobPositionPointedAtIsThePositionDrawnThere() {
        KnobFigure figure = (KnobFigure) Gallery.figures().get("knob");
        var area = figure.plotArea(800, 400, Style.SCREEN);
        assertThat(figure.positionAt(area.getCenterX(), 800, 400, Style.SCREEN)).hasValue(0.5);
        assertThat(figure.positionAt(area.getMinX() - 1, 800, 400, Style.SCREEN))
                .isEmpty();
        assertThat(figure.positionAt(area.getMaxX(), 800, 400, Style.SCREEN)).hasValue(1);
    }

    @Test
    void angleTicksAreThoseOfTheTrade() {
        assertThat(Ticks.angleStep(180, 40)).isEqualTo(15);
        assertThat(Ticks.angleStep(180, 8)).isEqualTo(30);
        assertThat(Ticks.angleStep(360, 9)).isEqualTo(45);
        assertThat(Ticks.angleStep(20, 8)).isEqualTo(5);
        assertThat(Ticks.angleStep(0.3, 6)).isCloseTo(0.05, within(1e-12));
        assertThat(Ticks.between(0, 180, 45)).containsExactly(0.0, 45.0, 90.0, 135.0, 180.0);
    }

    @Test
    void theFiguresOfOneDesignAreAllDifferent() {
        Map<String, Figure> figures = Gallery.figures();
        assertThat(figures.values().stream().map(figure -> Surfaces.toSvg(figure, 500, 400)))
                .doesNotHaveDuplicates();
    }
}
