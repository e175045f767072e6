package clipramp.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The grammar of quantities, line by line of the contract; prefixes after the SI brochure, codes after IEC 60062. */
class QuantityReaderTest {
    private static final Expected RESISTOR = Expected.part(Unit.OHM, 0, 1e9);
    private static final Expected CAPACITOR = Expected.part(Unit.FARAD, 1e-12, 1e-3);

    private static Quantity read(String text, Expected expected) {
        return QuantityReader.read(text, expected);
    }

    private static void assertRefused(String text, Expected expected, String... parts) {
        assertThatThrownBy(() -> read(text, expected))
                .isInstanceOf(RefusedQuantityException.class)
                .hasMessageContaining("read \"" + text.strip() + "\"")
                .satisfies(
                        e -> assertThat(parts).allSatisfy(part -> assertThat(e).hasMessageContaining(part)));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "4700;4700",
                "4.7 k;4700",
                "4.7k;4700",
                "4.7 K;4700",
                "4.7 kΩ;4700",
                "4.7 KΩ;4700",
                "4.7kohm;4700",
                "10 m;0.01",
                "10 mohm;0.01",
                "10 Mohm;1e7",
                "+1.5e3 ohm;1500",
                "1E3;1000",
                "0.5 G;5e8",
                "0 ohm;0",
                "4k7;4700",
                "4K7;4700",
                "4k7 Ω;4700",
                "4k7Ω;4700",
                "R47;0.47",
                "4R7;4.7",
                "470R;470",
                "4M7;4.7e6",
                "1G0;1e9",
            })
    void readsResistances(String text, double ohms) {
        assertThat(read(text, RESISTOR).value()).isEqualTo(ohms);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "100 nF;1e-7",
                "100n;1e-7",
                "2n2;2.2e-9",
                "4u7;4.7e-6",
                "4µ7;4.7e-6",
                "n47;4.7e-10",
                "1e-7;1e-7",
                "1e-7 F;1e-7",
                "0.1 uF;1e-7",
                "0.1 µF;1e-7",
                "0.1 μF;1e-7",
                "33p;3.3e-11"
            })
    void readsCapacitances(String text, double farads) {
        assertThat(read(text, CAPACITOR).value()).isEqualTo(farads);
    }

    @ParameterizedTest
    @ValueSource(strings = {"10\u00a0kΩ", "10\u2009k\u03a9", "10\u202fk\u2126", "10 kΩ", " 10 kohm "})
    void takesEverySpaceAndOhmSign(String text) {
        assertThat(read(text, RESISTOR).value()).isEqualTo(1e4);
    }

    @Test
    void takesTheTypographicMinus() {
        assertThat(read("\u221240 °C", Expected.any(Unit.CELSIUS)).value()).isEqualTo(-40);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "VOLT_PER_KELVIN;-2.5 mV/K;-0.0025",
                "VOLT_PER_KELVIN;-2.5 mV/degC;-0.0025",
                "PER_KELVIN;0.4 %/K;0.004",
                "PER_KELVIN;0.4 %/degC;0.004",
                "PER_KELVIN;0.004;0.004",
                "VOLT_SECOND;250 uVs;2.5e-4",
                "VOLT_PER_SECOND;5 V/us;5e6",
                "VOLT_PER_SECOND;5 V/µs;5e6",
                "VOLT_PER_SECOND;1 kV/ms;1e6",
                "AMPERE_SQUARED_SECOND;40 A²s;40",
                "AMPERE_SQUARED_SECOND;40 A2s;40",
                "KELVIN_PER_WATT;4 K/W;4",
                "KELVIN_PER_WATT;4 degC/W;4",
                "WATT_PER_KELVIN;3 mW/K;0.003",
                "WATT_PER_KELVIN;3 mW/degC;0.003",
                "KELVIN;10 K;10",
                "CELSIUS;0 degC;0",
                "CELSIUS;50 °C;50",
                "FRACTION;4 %;0.04",
                "FRACTION;0.04;0.04",
                "FRACTION;15%;0.15",
                "HERTZ;50 Hz;50",
                "WATT;1.2 kW;1200",
                "JOULE;250 µJ;2.5e-4",
                "HENRY;2m2;2.2e-3",
                "NUMBER;3;3",
            })
    void readsEveryUnit(Unit unit, String text, double value) {
        assertThat(read(text, Expected.any(unit)).value()).isEqualTo(value);
    }

    @Test
    void readsAnglesInDegreesAndRadians() {
        assertThat(read("90 deg", Expected.any(Unit.ANGLE)).value()).isEqualTo(Math.PI / 2);
        assertThat(read("90°", Expected.any(Unit.ANGLE)).value()).isEqualTo(Math.PI / 2);
        assertThat(read("1.5 rad", Expected.any(Unit.ANGLE)).value()).isEqualTo(1.5);
        assertThat(read("90", Expected.any(Unit.ANGLE).allowingBare()).value()).isEqualTo(Math.PI / 2);
    }

    @Test
    void refusesAnglesAndTemperaturesWithoutUnitInFiles() {
        assertRefused("90", Expected.any(Unit.ANGLE), "with its unit", "90 deg?");
        assertRefused("25", Expected.any(Unit.CELSIUS), "with its unit", "25 degC?");
    }

    @Test
    void tellsTemperaturesFromDifferences() {
        assertRefused("25 K", Expected.any(Unit.CELSIUS), "K is for differences", "25 degC?");
        assertRefused("10 degC", Expected.any(Unit.KELVIN), "10 K?");
        assertRefused("50 degF", Expected.any(Unit.CELSIUS), "°C", "10 degC?");
    }

    @Test
    void refusesWhatIsOutsideTheWindowWithBothReadings() {
        Expected dropper = Expected.part(Unit.OHM, 100, 1e6);
        assertThatThrownBy(() -> read("10 mohm", dropper))
                .hasMessage("read \"10 mohm\" (0.010 Ω); expected 100 Ω..1 MΩ. 10 Mohm or 10 kohm?");
        assertThatThrownBy(() -> read("10 MΩ", dropper))
                .hasMessage("read \"10 MΩ\"; expected 100 Ω..1 MΩ. 10 mΩ or 10 kΩ?");
        assertRefused("47", CAPACITOR, "(47 F)", "47 pF, 47 nF or 47 uF?");
        assertRefused("5", dropper, "(5 Ω)", "5 kohm?");
    }

    @Test
    void refusesABareNumberAsAShareAboveOne() {
        assertThatThrownBy(() -> read("4", Expected.within(Unit.FRACTION, 0, 1)))
                .hasMessage("read \"4\" (400 %); expected 0 %..100 %. 4 %?");
    }

    @Test
    void kIsKelvinOutsideResistances() {
        assertRefused("10 K", Expected.any(Unit.VOLT), "K is kelvin here", "10 kV?");
        assertRefused("1 KV", Expected.any(Unit.VOLT), "1 kV?");
        assertThat(read("10 K", RESISTOR).value()).isEqualTo(10_000);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "1 meg;1 Mohm?",
                "1MEG;1 Mohm?",
                "2.2Meg;2.2 Mohm?",
                "10 KOHM;10 kohm?",
                "10 Ohm;10 ohm?",
                "10 ohms;10 ohm?"
            })
    void refusesCaseBlindSuffixes(String text, String suggestion) {
        assertRefused(text, RESISTOR, suggestion);
    }

    @Test
    void suggestsTheRightCaseForCapacitors() {
        assertRefused("100 NF", CAPACITOR, "100 nF?");
        assertRefused("100 UF", CAPACITOR, "100 uF");
    }

    @Test
    void refusesMarkingsWithTheirMeaning() {
        assertThatThrownBy(() -> read("104", CAPACITOR)).hasMessageContaining("104 is 100 nF: write that.");
        assertThatThrownBy(() -> read("473K", CAPACITOR)).hasMessageContaining("473K is 47 nF ±10 %: write that.");
        assertThatThrownBy(() -> read("229", CAPACITOR)).hasMessageContaining("229 is 2.2 pF: write that.");
        assertThat(read("104", RESISTOR).value()).isEqualTo(104);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "10 kΩ ±5 %;0.05;0.05",
                "10 kΩ ± 5%;0.05;0.05",
                "10 kΩ +-5%;0.05;0.05",
                "10 kΩ+-5%;0.05;0.05",
                "10 kΩ -10 % +20 %;0.1;0.2",
                "10 kΩ +20 % -10 %;0.1;0.2",
                "10 kΩ -10%;0.1;0",
                "10 kΩ 5%;0.05;0.05",
                "10k 5 %;0.05;0.05",
                "10000 5%;0.05;0.05",
                "10 kΩ ±500 Ω;0.05;0.05",
                "10 kΩ ±0.5 k;0.05;0.05",
                "10 kΩ -1 kΩ +2 kΩ;0.1;0.2",
                "4k7J;0.05;0.05",
                "4k7F;0.01;0.01",
                "470RK;0.1;0.1",
                "R47M;0.2;0.2",
                "4k7 ±2 %;0.02;0.02",
            })
    void readsTolerances(String text, double minus, double plus) {
        Quantity quantity = read(text, RESISTOR);
        assertThat(quantity.minus()).isEqualTo(minus);
        assertThat(quantity.plus()).isEqualTo(plus);
    }

    @Test
    void aToleranceLetterCountsOnlyGluedToACode() {
        assertThat(read("2n2K", CAPACITOR).minus()).isEqualTo(0.1);
        assertRefused("2n2F", CAPACITOR, "farad or 1 %", "2.2 nF ±1 %");
        assertRefused("100nJ", CAPACITOR);
        assertRefused("4k7 J", RESISTOR);
        assertRefused("4k7Q", RESISTOR, "tolerance letter");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"10 kΩ ±5 % 12 W 350 V", "10 kΩ ±5 % 350 V 12 W", "10k 12W 0.35kV ±5%", "10 kΩ 5% 350V 12W"})
    void readsRatingsInAnyOrder(String text) {
        Quantity quantity = read(text, RESISTOR);
        assertThat(quantity.ratedWatts()).isEqualTo(OptionalDouble.of(12));
        assertThat(quantity.ratedVolts()).isEqualTo(OptionalDouble.of(350));
        assertThat(quantity.plus()).isEqualTo(0.05);
    }

    @Test
    void refusesWhatStandsTwice() {
        assertRefused("10 kΩ 12 W 5 W", RESISTOR, "twice");
        assertRefused("10 kΩ ±5 % 2 %", RESISTOR, "twice");
        assertRefused("4k7J ±5 %", RESISTOR, "twice");
    }

    @Test
    void refusesTolerancesAndRatingsWhereThereAreNone() {
        assertRefused("230 V ±10 %", Expected.any(Unit.VOLT), "without a tolerance");
        assertRefused("230 V 5 W", Expected.any(Unit.VOLT), "Nothing comes after the value");
        assertRefused("10 kΩ ±5", RESISTOR, "±5 %?");
        assertRefused("10 kΩ ±5 V", RESISTOR, "in % or Ω");
        assertRefused("10 kΩ -100 %", RESISTOR, "under 100 %");
        assertRefused("10 kΩ 3 s", RESISTOR, "ratings in W and V", "\"3 s\" is none");
        assertRefused("0 Ω ±1 Ω", RESISTOR, "zero");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "NaN",
                "nan",
                "Inf",
                "-inf",
                ".inf",
                "Infinity",
                "0x10",
                "0o7",
                "0b1",
                "1_000",
                "",
                "  ",
                "k",
                "ten",
                "--5",
                "+-5",
                "5.",
                "1.2.3",
                "1e",
                "1e9999",
                "1e999",
                "10 000",
                "10'000",
                "4k7k",
                "5 V",
                "5 V/K",
                "1;2",
                "5..6",
                "~",
                "null",
                "yes",
                "10 kΩ/",
                "1/2",
                "²",
                "１０"
            })
    void refusesWhatIsNoResistance(String text) {
        assertThatThrownBy(() -> read(text, RESISTOR))
                .isInstanceOf(RefusedQuantityException.class)
                .hasMessageStartingWith("read \"");
    }

    @Test
    void refusesGroupingAndCommas() {
        assertRefused("10 000", RESISTOR, "not grouped", "10000?");
        assertRefused("1_000", RESISTOR, "underscore", "1000?");
        assertRefused("4,7 k", RESISTOR, "dot", "4.7 k?");
        assertRefused("1,000", RESISTOR, "1.0 or 1000?");
        assertRefused("1,250 k", RESISTOR, "1.25 or 1250?");
    }

    @Test
    void namesTheUnitThatWasMistaken() {
        assertRefused("5 V", RESISTOR, "a voltage");
        assertRefused("20 mA", Expected.any(Unit.VOLT), "a current", "230 V");
    }

    @Test
    void codesAreForPartsOnly() {
        assertRefused("5k1", Expected.any(Unit.VOLT), "5.1 kV?");
        assertRefused("4R7", CAPACITOR, "4.7 F?");
    }

    @Test
    void choosesAmongUnits() {
        List<Expected> choices = List.of(Expected.within(Unit.FRACTION, 0, 1), Expected.any(Unit.WATT));
        assertThat(QuantityReader.readOneOf("5 %", choices).unit()).isEqualTo(Unit.FRACTION);
        assertThat(QuantityReader.readOneOf("60 W", choices).unit()).isEqualTo(Unit.WATT);
        assertThatThrownBy(() -> QuantityReader.readOneOf("5 A", choices)).hasMessageContaining("a current");
    }

    @Test
    void readsBands() {
        List<Expected> choices = List.of(Expected.within(Unit.FRACTION, 0, 1), Expected.any(Unit.WATT));
        Band band = Band.read("2 %..5 %", choices);
        assertThat(band.low().value()).isEqualTo(0.02);
        assertThat(band.high().value()).isEqualTo(0.05);
        assertThat(Band.read("5 %", choices).high().value()).isEqualTo(0.05);
        assertThatThrownBy(() -> Band.read("5 %..2 %", choices)).hasMessageContaining("2 %..5 %?");
        assertThatThrownBy(() -> Band.read("2 %..5 W", choices)).hasMessageContaining("one unit");
        assertRefused("2 %..5 %", Expected.any(Unit.FRACTION), "band has no place");
    }

    @Test
    void theWindowTakesOneDecimalCommaAndEchoesADot() {
        LenientEntry entry = LenientEntry.read("4,7 k", RESISTOR);
        assertThat(entry.quantity().value()).isEqualTo(4700);
        assertThat(entry.text()).isEqualTo("4.7 k");
        assertThat(LenientEntry.read("0,100 uF", CAPACITOR).quantity().value()).isEqualTo(1e-7);
        assertThatThrownBy(() -> LenientEntry.read("1,000 k", RESISTOR)).hasMessageContaining("1.0 or 1000?");
        assertThatThrownBy(() -> LenientEntry.read("1,2,3", RESISTOR)).isInstanceOf(RefusedQuantityException.class);
        assertThatThrownBy(() -> LenientEntry.read("1.000,5", RESISTOR)).isInstanceOf(RefusedQuantityException.class);
    }
}
