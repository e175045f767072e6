package clipramp.faults;

import clipramp.circuit.Design;
import clipramp.circuit.Designators;
import clipramp.circuit.TestPoint;
import clipramp.faults.Observation.Meter;
import clipramp.units.Expected;
import clipramp.units.QuantityReader;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;

/** Observations as people write them: {@code load:full,TP1=20V,TP5.ac=120V,blown:RD}. */
public final class ObservationReader {
    /** The whole grammar, for help and refusals. */
    public static final String GRAMMAR =
            "load:none|half|less|same|more|full, knob:acts|dead, TP1=20V (dc), TP2.peak=13V,"
                    + " TP5.ac=110V, blown:PART, fuse:blown|whole; several with commas between";

    private static final double MOST_VOLTS = 1e4;

    /** What stands behind a decimal comma, in a list that commas part. */
    private static final String REST_OF_DECIMAL = "\\d+\\s*[a-zA-Z]*";

    private static final Map<String, Set<LoadGets>> LOAD_WORDS = Map.of(
            "none", Set.of(LoadGets.NOTHING),
            "half", Set.of(LoadGets.HALF),
            "less", Set.of(LoadGets.LESS, LoadGets.HALF),
            "same", Set.of(LoadGets.AS_BEFORE),
            "more", Set.of(LoadGets.MORE, LoadGets.FULL),
            "full", Set.of(LoadGets.FULL));

    private final Map<String, String> names;

    /**
     * A reader for one design.
     *
     * @param design whose parts may be named, by designator or by key
     */
    public ObservationReader(Design design) {
        names = Designators.of(design);
    }

    /**
     * The observations that a text means, in its order.
     *
     * @param text observations with commas between
     * @throws RefusedObservationException naming the one that is not understood, and what would be
     */
    public List<Observation> read(String text) {
        List<Observation> all = new ArrayList<>();
        for (String one : text.split(",", -1)) {
            if (one.isBlank()) {
                throw refused(text, "an observation is missing beside a comma");
            }
            if (one.matches(REST_OF_DECIMAL) && !all.isEmpty()) {
                String half = all.get(all.size() - 1).text();
                throw refused(half + "," + one, "decimals take a dot: " + half + "." + one + "?");
            }
            all.add(one(one.strip()));
        }
        return all;
    }

    private Observation one(String text) {
        int colon = text.indexOf(':');
        int equals = text.indexOf('=');
        if (equals > 0) {
            return volts(
                    text,
                    text.substring(0, equals).strip(),
                    text.substring(equals + 1).strip());
        }
        if (colon < 0) {
            throw refused(text, "there is neither a colon nor an equals sign in it");
        }
        String what = text.substring(0, colon).strip().toLowerCase(Locale.ROOT);
        String said = text.substring(colon + 1).strip();
        return switch (what) {
            case "load" -> new Observation.Load(text, loadWord(text, said));
            case "knob" -> new Observation.Knob(text, either(text, said, "acts", "dead"));
            case "fuse" -> new Observation.Fuse(text, either(text, said, "blown", "whole"));
            case "blown" -> new Observation.Burnt(text, part(text, said));
            default -> throw refused(text, "\"" + what + "\" is nothing that can be seen here");
        };
    }

    private static Set<LoadGets> loadWord(String text, String said) {
        return Optional.ofNullable(LOAD_WORDS.get(said.toLowerCase(Locale.ROOT)))
                .orElseThrow(() -> refused(text, "a load gets none, half, less, same, more or full"));
    }

    private static boolean either(String text, String said, String yes, String no) {
        String word = said.toLowerCase(Locale.ROOT);
        if (!word.equals(yes) && !word.equals(no)) {
            throw refused(text, "write " + yes + " or " + no);
        }
        return word.equals(yes);
    }

    private String part(String text, String said) {
        return names.entrySet().stream()
                .filter(name ->
                        name.getKey().equalsIgnoreCase(said) || name.getValue().equalsIgnoreCase(said))
                .map(Map.Entry::getKey)
                .findFirst()
                .orElseThrow(() -> refused(
                        text,
                        "this design has no part \"" + said + "\"; it has "
                                + names.values().stream().collect(Collectors.joining(", "))));
    }

    private static Observation volts(String text, String place, String value) {
        String[] parts = place.split("\\.", -1);
        String wanted = parts[0].toUpperCase(Locale.ROOT);
        TestPoint point = Arrays.stream(TestPoint.values())
                .filter(named -> named != TestPoint.TP0 && named.name().equals(wanted))
                .findFirst()
                .orElseThrow(() -> refused(text, "the test points are TP1 to TP5, against TP0 or as the drawing says"));
        Meter meter = parts.length == 1
                ? Meter.DC
                : Arrays.stream(Meter.values())
                        .filter(named -> parts.length == 2 && named.word().equalsIgnoreCase(parts[1]))
                        .findFirst()
                        .orElseThrow(() -> refused(text, "the meters are dc, ac and peak, such as " + wanted + ".ac"));
        try {
            double volts = QuantityReader.read(value, Expected.within(Unit.VOLT, -MOST_VOLTS, MOST_VOLTS))
                    .value();
            return new Observation.Volts(text, point, meter, volts);
        } catch (RefusedQuantityException refusal) {
            throw refused(text, String.valueOf(refusal.getMessage()));
        }
    }

    private static RefusedObservationException refused(String text, String why) {
        return new RefusedObservationException(text, why);
    }
}
