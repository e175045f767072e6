package clipramp.sizing;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;

/** What sizing can decide, in the order of the signal. */
public enum OpenPart {
    /** The zener that clips the supply. */
    ZENER("clip.zener", "clip"),
    /** The dropping resistor. */
    DROPPER("clip.dropper", "clip"),
    /** The ramp's capacitor C_E. */
    CAPACITOR("ramp.capacitor", "ramp"),
    /** The fixed resistor of R_E. */
    FIXED("ramp.fixed", "ramp"),
    /** The pot's track. */
    TRACK("ramp.pot.track", "ramp"),
    /** The pot's law. */
    LAW("ramp.pot.law", "ramp"),
    /** The resistor across the pot. */
    ACROSS("ramp.pot.shunt", "ramp"),
    /** The trimmer in series with the fixed resistor. */
    TRIM_HIGH("ramp.trim-high", "ramp"),
    /** The trimmer in series with the resistor across the pot. */
    TRIM_LOW("ramp.trim-low", "ramp"),
    /** The unijunction, or the programmable device in its place. */
    TRIGGER_DEVICE("trigger.device", "trigger"),
    /** The resistor from base one, or from the cathode, to common. */
    BASE_ONE("trigger.base-one", "bases"),
    /** The resistor from the supply to base two. */
    BASE_TWO("trigger.base-two", "bases"),
    /** The divider's resistor from the supply to a programmable device's gate. */
    UPPER("trigger.upper", "bases"),
    /** The divider's resistor from that gate to common. */
    LOWER("trigger.lower", "bases"),
    /** The resistor in series with the thyristor's gate. */
    SERIES("gate.series", "gate"),
    /** The resistor from gate to cathode. */
    SHUNT("gate.shunt", "gate"),
    /** The pulse transformer. */
    TRANSFORMER("gate.transformer", "gate"),
    /** The thyristor's type. */
    THYRISTOR("thyristor.device", "thyristor"),
    /** The thyristor's heat sink, by its case-to-ambient resistance. */
    SINK("thyristor.case-to-ambient", "thyristor");

    private final String key;
    private final String group;

    OpenPart(String key, String group) {
        this.key = key;
        this.group = group;
    }

    /** Its key in a design. */
    public String key() {
        return key;
    }

    /** The word that names it together with its neighbours: clip, ramp, trigger, bases, gate, thyristor. */
    String group() {
        return group;
    }

    /** Every word that {@link #named} understands: groups, then keys. */
    public static List<String> words() {
        List<String> words =
                Arrays.stream(values()).map(OpenPart::group).distinct().collect(Collectors.toList());
        Arrays.stream(values()).map(OpenPart::key).forEach(words::add);
        return words;
    }

    /** The parts of a group's word or of a key; empty for any other word. */
    public static Optional<Set<OpenPart>> named(String word) {
        Set<OpenPart> parts = Arrays.stream(values())
                .filter(p -> p.key.equals(word) || p.group.equals(word))
                .collect(Collectors.toCollection(TreeSet::new));
        return parts.isEmpty() ? Optional.empty() : Optional.of(parts);
    }
}
