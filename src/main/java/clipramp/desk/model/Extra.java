package clipramp.desk.model;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** A group of parts that a circuit has or has not: chosen as a whole, then edited part by part. */
enum Extra {
    /** Values of a small snubber, typical of the class. */
    SNUBBER("snubber", "resistor and capacitor", "{resistance: 100 ohm, capacitance: 100 nF}"),
    /** Common practice: a silicon diode. */
    FREEWHEEL("load.freewheel", "diode", "{drop: 0.9 V}");

    static final String NONE = "none";

    private final String key;
    private final String word;
    private final String mapping;

    Extra(String key, String word, String mapping) {
        this.key = key;
        this.word = word;
        this.mapping = mapping;
    }

    static Optional<Extra> at(String key) {
        return Arrays.stream(values()).filter(f -> f.key.equals(key)).findFirst();
    }

    /** What it is chosen by. */
    List<String> choices() {
        return List.of(NONE, word);
    }

    /** The choice that a file's text stands for. */
    String choiceOf(String text) {
        return text.isEmpty() || text.equals(NONE) ? NONE : word;
    }

    /** What stands in the file once it is fitted. */
    String mapping() {
        return mapping;
    }

    /** What is written for a choice: nothing where there is none. */
    String written(String choice) {
        return choice.equals(NONE) ? "" : mapping;
    }
}
