package clipramp.figures;

import java.awt.Color;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;

/**
 * One theme's colours. A colour is a signal's, never decoration: the Okabe-Ito hues (Okabe and Ito, Color Universal
 * Design, 2008), darkened on paper or lightened on ink until text in them reads.
 *
 * @param name paper or ink
 * @param ground what everything is drawn on
 * @param ink text, axes, the line voltage, the firing line
 * @param quiet secondary text
 * @param axis frames and axes
 * @param hairline grid lines, which carry no meaning of their own
 * @param wash fill behind what is chosen, and of bands
 * @param line line voltage
 * @param supply clipped supply
 * @param ramp ramp, and dashed its peak point
 * @param pulse gate pulse
 * @param load load voltage and power
 */
public record Palette(
        String name,
        Color ground,
        Color ink,
        Color quiet,
        Color axis,
        Color hairline,
        Color wash,
        Color line,
        Color supply,
        Color ramp,
        Color pulse,
        Color load) {
    /** WCAG 2.1, success criterion 1.4.3: text against its ground. */
    public static final double TEXT_CONTRAST = 4.5;
    /** WCAG 2.1, success criterion 1.4.11: lines that carry meaning. */
    public static final double LINE_CONTRAST = 3;

    private static final Color BLUE = new Color(0x0072B2);
    private static final Color VERMILION = new Color(0xD55E00);
    private static final Color REDDISH_PURPLE = new Color(0xCC79A7);
    private static final Color BLUISH_GREEN = new Color(0x009E73);
    /** A little over the demand, so that rounding in a colour's bytes cannot undercut it. */
    private static final double RESERVE = 1.04;

    /** Warm near-white ground, near-black ink. */
    public static final Palette PAPER = on("paper", new Color(0xFCFAF5), new Color(0x1D1B18));
    /** The reverse, not pure black. */
    public static final Palette INK = on("ink", new Color(0x191A1D), new Color(0xECE8DF));

    private static Palette on(String name, Color ground, Color ink) {
        return new Palette(
                name,
                ground,
                ink,
                readable(mixed(ground, ink, 0.6), ground, ink, TEXT_CONTRAST),
                readable(mixed(ground, ink, 0.4), ground, ink, LINE_CONTRAST),
                mixed(ground, ink, 0.14),
                mixed(ground, ink, 0.09),
                ink,
                readable(BLUE, ground, ink, TEXT_CONTRAST),
                readable(VERMILION, ground, ink, TEXT_CONTRAST),
                readable(REDDISH_PURPLE, ground, ink, TEXT_CONTRAST),
                readable(BLUISH_GREEN, ground, ink, TEXT_CONTRAST));
    }

    /** The hue, moved towards the ink by as little as it takes to reach a contrast against ground and wash alike. */
    private static Color readable(Color hue, Color ground, Color ink, double contrast) {
        Color wash = mixed(ground, ink, 0.09);
        Color pole = luminance(ink) > luminance(ground) ? Color.WHITE : Color.BLACK;
        for (int percent = 0; percent < 100; percent++) {
            Color moved = mixed(hue, pole, percent / 100.0);
            if (contrast(moved, ground) >= contrast * RESERVE && contrast(moved, wash) >= contrast) {
                return moved;
            }
        }
        return pole;
    }

    /** A colour {@code share} of the way from one to the other, 0..1, in sRGB bytes. */
    static Color mixed(Color from, Color to, double share) {
        return new Color(
                between(from.getRed(), to.getRed(), share),
                between(from.getGreen(), to.getGreen(), share),
                between(from.getBlue(), to.getBlue(), share));
    }

    private static int between(int from, int to, double share) {
        return (int) Math.round(from + (to - from) * share);
    }

    /** Every colour by its name as #rrggbb, for a style sheet. */
    public Map<String, String> webColours() {
        Map<String, String> colours = new LinkedHashMap<>();
        colours.put("ground", web(ground));
        colours.put("ink", web(ink));
        colours.put("quiet", web(quiet));
        colours.put("axis", web(axis));
        colours.put("hairline", web(hairline));
        colours.put("wash", web(wash));
        colours.put("line", web(line));
        colours.put("supply", web(supply));
        colours.put("ramp", web(ramp));
        colours.put("pulse", web(pulse));
        colours.put("load", web(load));
        return colours;
    }

    private static String web(Color colour) {
        return String.format(Locale.ROOT, "#%06x", colour.getRGB() & 0xFFFFFF);
    }

    /** Contrast ratio of two colours, 1..21 (WCAG 2.1, definition of contrast ratio). */
    static double contrast(Color a, Color b) {
        double bright = Math.max(luminance(a), luminance(b));
        double dark = Math.min(luminance(a), luminance(b));
        return (bright + 0.05) / (dark + 0.05);
    }

    private static double luminance(Color color) {
        return 0.2126 * linear(color.getRed()) + 0.7152 * linear(color.getGreen()) + 0.0722 * linear(color.getBlue());
    }

    private static double linear(int eightBits) {
        double share = eightBits / 255.0;
        return share <= 0.04045 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4);
    }
}
