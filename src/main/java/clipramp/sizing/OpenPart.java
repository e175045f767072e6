package clipramp.sizing;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;

/** What sizing can decide, in the order of the signal. */
public enum OpenPart {
    ZENER("clip.zener", "clip"),
    DROPPER("clip.dropper", "clip"),
    CAPACITOR("ramp.capacitor", "ramp"),
    FIXED("ramp.fixed", "ramp"),
    TRACK("ramp.pot.track", "ramp"),
    LAW("ramp.pot.law", "ramp"),
    ACROSS("ramp.pot.shunt", "ramp"),
    TRIM_HIGH("ramp.trim-high", "ramp"),
    TRIM_LOW("ramp.trim-low", "ramp"),
    TRIGGER_DEVICE("trigger.device", "trigger"),
    BASE_ONE("trigger.base-one", "bases"),
    BASE_TWO("trigger.base-two", "bases"),
    UPPER("trigger.upper", "bases"),
    LOWER("trigger.lower", "bases"),
    SERIES("gate.series", "gate"),
    SHUNT("gate.shunt", "gate"),
    TRANSFORMER("gate.transformer", "gate"),
    THYRISTOR("thyristor.device", "thyristor"),
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
    public String group() {
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
                .collect(Collectors.toCollection(java.util.TreeSet::new));
        return parts.isEmpty() ? Optional.empty() : Optional.of(parts);
    }
}
