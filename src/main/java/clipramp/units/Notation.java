package clipramp.units;

import java.util.Map;

/** How signs outside ASCII are written. */
public enum Notation {
    /** Ω µ ° ± as they are. */
    UNICODE,
    /** ohm, u, deg, +- for terminals that cannot show them. */
    ASCII;

    private static final Map<String, String> SPELLINGS = Map.ofEntries(
            Map.entry("Ω", "ohm"),
            Map.entry("\u2126", "ohm"),
            Map.entry("µ", "u"),
            Map.entry("\u03bc", "u"),
            Map.entry("±", "+-"),
            Map.entry("²", "2"),
            Map.entry("³", "3"),
            Map.entry("·", "*"),
            Map.entry("×", "x"),
            Map.entry("≤", "<="),
            Map.entry("≥", ">="),
            Map.entry("√", "sqrt"),
            Map.entry("∥", "||"),
            Map.entry("∠", "angle "),
            Map.entry("–", "-"),
            Map.entry("—", "-"),
            Map.entry("\u2212", "-"),
            Map.entry("→", "->"),
            Map.entry("…", "..."),
            Map.entry("“", "\""),
            Map.entry("”", "\""),
            Map.entry("’", "'"),
            Map.entry("\u00a0", " "),
            Map.entry("\u2009", " "),
            Map.entry("\u202f", " "),
            Map.entry("η", "eta"),
            Map.entry("α", "alpha"),
            Map.entry("β", "beta"),
            Map.entry("θ", "theta"),
            Map.entry("ω", "omega"),
            Map.entry("κ", "kappa"),
            Map.entry("φ", "phi"),
            Map.entry("π", "pi"),
            Map.entry("λ", "lambda"),
            Map.entry("∞", "infinity"));

    /** A whole text in this notation; {@link #ASCII} leaves nothing above U+007E but what it has no spelling for. */
    public String apply(String text) {
        if (this == UNICODE) {
            return text;
        }
        String spelt =
                text.replace("°C", "degC").replaceAll("(?<=\\d)°", " deg").replace("°", "deg");
        StringBuilder out = new StringBuilder(spelt.length());
        spelt.codePoints().forEach(c -> {
            String sign = Character.toString(c);
            out.append(SPELLINGS.getOrDefault(sign, sign));
        });
        return out.toString();
    }
}
