package clipramp.desk.model;

import clipramp.circuit.Stage;
import clipramp.units.Expected;
import clipramp.units.LenientEntry;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The words of the five questions, and whether their answers can be read. */
public final class NewDesign {
    private static final Pattern LINE = Pattern.compile("line-(\\d+)v-(\\d+)hz(.*)");
    private static final double LOW_VOLTS = 60;
    private static final Expected LOAD = Expected.within(Unit.WATT, 0.01, 1e6);
    private static final Expected SHARE = Expected.within(Unit.FRACTION, 0.001, 0.999);
    private static final Expected AIR = Expected.within(Unit.CELSIUS, -60, 150).allowingBare();

    private NewDesign() {}

    /** A line profile's id in words: "230 V 50 Hz". */
    public static String lineInWords(String id) {
        Matcher line = LINE.matcher(id);
        if (!line.matches()) {
            return id;
        }
        String rest = line.group(3).replace('-', ' ').strip();
        return line.group(1) + " V " + line.group(2) + " Hz" + (rest.isEmpty() ? "" : ", " + rest);
    }

    /** Whether a line takes long to reach the clipping voltage. */
    public static boolean isLowVoltage(String id) {
        Matcher line = LINE.matcher(id);
        return line.matches() && Integer.parseInt(line.group(1)) < LOW_VOLTS;
    }

    /** What a stage is good for, in a sentence. */
    public static String about(Stage stage) {
        return switch (stage) {
            case HALF_WAVE ->
                "One SCR, every second half cycle: half of full power at most, and direct current in the line.";
            case BRIDGE_DC -> "Bridge, then load and one SCR on its dc side: both half cycles alike, few parts.";
            case BRIDGE_AC -> "Load on the ac side, one SCR across the bridge; the firing supply lies across the SCR.";
            case INVERSE_PARALLEL -> "Two SCRs, one each way, on a pulse transformer: for larger loads.";
            case TRIAC -> "One triac on a small winding or a pulse transformer: for loads of a few amperes.";
        };
    }

    /**
     * Answers that were looked at.
     *
     * @param wish the answers as they are to be written, or as typed where one is refused
     * @param refusal the first answer that cannot be read, in words; empty where all can
     */
    public record Checked(Wish wish, Optional<String> refusal) {}

    /**
     * The answers as a design file that leaves the parts open. What stands there of them keeps the order of the signal and
     * is free to be chosen anew.
     *
     * @param wish answers that were read
     */
    public static String request(Wish wish) {
        return """
                # Sized from five answers; every value is yours to change.
                clipramp: 1
                title: <load>, <stage>
                line: <line>
                stage: <stage>
                load: {kind: resistor, rated: <load>}

                clip:
                  diode-drop: 0.7 V

                ramp:
                  capacitor: 220 nF ±5 % 63 V
                  fixed: 3.9 kΩ ±5 % 0.25 W
                  pot: {track: 25 kΩ ±10 % 0.5 W, law: linear, sense: falling}

                trigger:
                  base-one: 33 Ω ±5 % 0.25 W

                gate:
                  polarity: positive

                surroundings: {coldest: <coldest>, hottest: <hottest>}
                wanted: {lowest: <lowest> at 0 %, highest: <highest> at 100 %}
                """.replace("<load>", wish.load())
                .replace("<line>", wish.lineId())
                .replace("<stage>", wish.stage().word())
                .replace("<coldest>", wish.coldest())
                .replace("<hottest>", wish.hottest())
                .replace("<lowest>", wish.lowest())
                .replace("<highest>", wish.highest());
    }

    /** Reads all answers. */
    public static Checked check(Wish wish) {
        try {
            String load = read("load", wish.load(), LOAD);
            String lowest = read("lowest wanted", wish.lowest(), SHARE);
            String highest = read("highest wanted", wish.highest(), SHARE);
            String coldest = read("coldest", wish.coldest(), AIR);
            String hottest = read("hottest", wish.hottest(), AIR);
            Wish read =
                    new Wish(wish.lineId(), load, wish.stage(), lowest, highest, degrees(coldest), degrees(hottest));
            return new Checked(read, Optional.empty());
        } catch (AnswerRefused e) {
            return new Checked(wish, Optional.of(e.words));
        }
    }

    private static String degrees(String air) {
        return air.matches("[+-]?[\\d.]+") ? air + " degC" : air;
    }

    private static String read(String question, String typed, Expected expected) {
        try {
            return LenientEntry.read(typed, expected).text();
        } catch (RefusedQuantityException e) {
            throw new AnswerRefused(question + ": " + e.refusal().message());
        }
    }

    private static final class AnswerRefused extends RuntimeException {
        private static final long serialVersionUID = 1L;
        private final String words;

        AnswerRefused(String words) {
            super(words);
            this.words = words;
        }
    }
}
