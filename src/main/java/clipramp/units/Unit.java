package clipramp.units;

import java.util.List;
import java.util.Optional;

/** Every unit that a design file, an option or an answer uses, with its spellings. */
public enum Unit {
    OHM("Ω", "a resistance", "10 kΩ", true, "Ω", "ohm"),
    FARAD("F", "a capacitance", "100 nF", true, "F"),
    HENRY("H", "an inductance", "2 mH", true, "H"),
    VOLT("V", "a voltage", "230 V", true, "V"),
    AMPERE("A", "a current", "30 mA", true, "A"),
    WATT("W", "a power", "1.2 kW", true, "W"),
    HERTZ("Hz", "a frequency", "50 Hz", true, "Hz"),
    SECOND("s", "a time", "20 µs", true, "s"),
    JOULE("J", "an energy", "250 µJ", true, "J"),
    COULOMB("C", "a charge", "2 µC", true, "C"),
    VOLT_SECOND("Vs", "volt-seconds", "250 µVs", true, "Vs", "V·s"),
    AMPERE_SQUARED_SECOND("A²s", "a current squared times time", "40 A²s", true, "A²s", "A2s", "A^2s"),
    VOLT_PER_SECOND("V/s", "a rate of rise", "5 V/µs", true, "V/s"),
    AMPERE_PER_SECOND("A/s", "a rate of rise", "50 A/µs", true, "A/s"),
    VOLT_PER_KELVIN("V/K", "a drift", "-2.5 mV/K", true, "V/K", "V/degC", "V/°C"),
    WATT_PER_KELVIN("W/K", "a derating", "3 mW/K", true, "W/K", "W/degC", "W/°C"),
    KELVIN_PER_WATT("K/W", "a thermal resistance", "4 K/W", true, "K/W", "degC/W", "°C/W"),
    PER_KELVIN("%/K", "a relative drift", "0.4 %/K", false, "%/K", "%/degC", "%/°C"),
    KELVIN("K", "a temperature difference", "10 K", false, "K"),
    CELSIUS("°C", "a temperature", "25 degC", false, "°C", "degC"),
    /** Inside in radians, outside in degrees. */
    ANGLE("°", "an angle", "90 deg", false, "°", "deg"),
    /** Inside 0..1, outside in percent or bare. */
    FRACTION("%", "a share", "5 %", false, "%"),
    NUMBER("", "a plain number", "3", false);

    private final String symbol;
    private final String noun;
    private final String example;
    private final boolean prefixed;
    private final List<String> spellings;

    Unit(String symbol, String noun, String example, boolean prefixed, String... spellings) {
        this.symbol = symbol;
        this.noun = noun;
        this.example = example;
        this.prefixed = prefixed;
        this.spellings = List.of(spellings);
    }

    /** How answers write it. */
    public String symbol() {
        return symbol;
    }

    /** What it measures, with its article: "a resistance". */
    public String noun() {
        return noun;
    }

    /** A well-written example: "10 kΩ". */
    public String example() {
        return example;
    }

    /** Whether k, m, µ and their like go before it. */
    public boolean isPrefixed() {
        return prefixed;
    }

    /** Whether a value without a unit is refused: 90 may be degrees or radians, 25 may be °C or K. */
    boolean needsUnit() {
        return this == ANGLE || this == CELSIUS;
    }

    List<String> spellings() {
        return spellings;
    }

    /**
     * @param prefix prefix as meant
     * @param spelling unit as written, empty where only a prefix was
     * @param exponent power of ten of both together
     */
    record Match(Prefix prefix, String spelling, int exponent) {}

    /**
     * What a written unit stands for: prefix k and exponent 3 for "kΩ" in ohms, exponent -2 for "%".
     *
     * @param written prefix and unit, prefix alone, or unit alone, with µ and Ω already in one spelling
     * @return empty where this unit is not written so
     */
    Optional<Match> match(String written) {
        if (this == VOLT_PER_SECOND || this == AMPERE_PER_SECOND) {
            int slash = written.indexOf('/');
            if (slash > 0
                    && written.endsWith("s")
                    && written.substring(0, slash).endsWith(symbol.substring(0, 1))) {
                Optional<Prefix> under = Prefix.of(written.substring(slash + 1, written.length() - 1), this);
                Optional<Prefix> over = Prefix.of(written.substring(0, slash - 1), this);
                return under.isPresent() && over.isPresent()
                        ? Optional.of(new Match(
                                over.get(),
                                written.substring(slash - 1),
                                over.get().exponent() - under.get().exponent()))
                        : Optional.empty();
            }
        }
        if (this == PER_KELVIN) {
            return switch (written) {
                case "%/K", "%/degC", "%/°C" -> Optional.of(new Match(Prefix.NONE, written, -2));
                case "ppm/K", "ppm/degC", "ppm/°C" -> Optional.of(new Match(Prefix.NONE, written, -6));
                case "/K", "1/K", "/degC", "/°C" -> Optional.of(new Match(Prefix.NONE, written, 0));
                default -> Optional.empty();
            };
        }
        return prefixedMatch(written);
    }

    private Optional<Match> prefixedMatch(String written) {
        int scale = this == FRACTION ? -2 : 0;
        for (String spelling : spellings) {
            if (written.equals(spelling)) {
                return Optional.of(new Match(Prefix.NONE, spelling, scale));
            }
            if (prefixed && written.endsWith(spelling)) {
                Optional<Prefix> prefix = Prefix.of(written.substring(0, written.length() - spelling.length()), this);
                if (prefix.isPresent()) {
                    return prefix.map(p -> new Match(p, spelling, p.exponent()));
                }
            }
        }
        return prefixed ? Prefix.of(written, this).map(p -> new Match(p, "", p.exponent())) : Optional.empty();
    }
}
