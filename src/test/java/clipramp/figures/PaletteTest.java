package clipramp.figures;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class PaletteTest {
    static Stream<Palette> palettes() {
        return Stream.of(Palette.PAPER, Palette.INK);
    }

    @ParameterizedTest
    @MethodSource("palettes")
    void everyTextColourReachesFourAndAHalfToOneOnGroundAndWash(Palette p) {
        for (Color text : List.of(p.ink(), p.quiet(), p.line(), p.supply(), p.ramp(), p.pulse(), p.load())) {
            assertThat(wcag(text, p.ground())).as(p.name() + " " + text).isGreaterThanOrEqualTo(4.5);
            assertThat(wcag(text, p.wash()))
                    .as(p.name() + " " + text + " on wash")
                    .isGreaterThanOrEqualTo(4.5);
        }
    }

    @ParameterizedTest
    @MethodSource("palettes")
    void everyAxisReachesThreeToOne(Palette p) {
        assertThat(wcag(p.axis(), p.ground())).isGreaterThanOrEqualTo(3);
    }

    /** Distance as the CIE 1976 u'v' chromaticity; signals lie further apart than just noticeable differences of 0.004. */
    @ParameterizedTest
    @MethodSource("palettes")
    void noTwoSignalsShareAHue(Palette p) {
        List<Color> signals = List.of(p.ink(), p.supply(), p.ramp(), p.pulse(), p.load());
        for (int i = 0; i < signals.size(); i++) {
            for (int j = 0; j < i; j++) {
                double[] a = chromaticity(signals.get(i));
                double[] b = chromaticity(signals.get(j));
                assertThat(Math.hypot(a[0] - b[0], a[1] - b[1]))
                        .as(signals.get(i) + " " + signals.get(j))
                        .isGreaterThan(0.03);
            }
        }
    }

    /** WCAG 2.1 gives black on white as 21:1, and #767676 on white as the lightest grey over 4.5:1 (from memory). */
    @Test
    void contrastAgreesWithKnownPairs() {
        assertThat(Palette.contrast(Color.BLACK, Color.WHITE)).isEqualTo(21.0);
        assertThat(Palette.contrast(new Color(0x767676), Color.WHITE)).isBetween(4.5, 4.6);
        assertThat(Palette.contrast(new Color(0x777777), Color.WHITE)).isLessThan(4.5);
    }

    /** Relative luminance as WCAG 2.1 defines it, written apart from the palette's own. */
    private static double wcag(Color a, Color b) {
        double la = luminance(a);
        double lb = luminance(b);
        return (Math.max(la, lb) + 0.05) / (Math.min(la, lb) + 0.05);
    }

    private static double luminance(Color c) {
        double[] xyz = xyz(c);
        return xyz[1];
    }

    private static double[] xyz(Color c) {
        float[] rgb = c.getRGBColorComponents(null);
        double[] linear = new double[3];
        for (int i = 0; i < 3; i++) {
            linear[i] = rgb[i] <= 0.03928 ? rgb[i] / 12.92 : Math.pow((rgb[i] + 0.055) / 1.055, 2.4);
        }
        // IEC 61966-2-1, sRGB to XYZ.
        return new double[] {
            0.4124 * linear[0] + 0.3576 * linear[1] + 0.1805 * linear[2],
            0.2126 * linear[0] + 0.7152 * linear[1] + 0.0722 * linear[2],
            0.0193 * linear[0] + 0.1192 * linear[1] + 0.9505 * linear[2]
        };
    }

    private static double[] chromaticity(Color c) {
        double[] xyz = xyz(c);
        double sum = xyz[0] + 15 * xyz[1] + 3 * xyz[2];
        return new double[] {4 * xyz[0] / sum, 9 * xyz[1] / sum};
    }
}
