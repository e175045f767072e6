package clipramp.cli;

import clipramp.files.DesignFiles;
import clipramp.files.InvalidInputException;
import clipramp.files.Key;
import clipramp.files.Key.Kind;
import clipramp.files.KeyCatalogue;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.Stream;

/**
 * Draws designs that are legal and absurd: an example with a handful of its values put at an edge of what their keys take,
 * each of which the reader accepts beside the others.
 */
final class AbsurdDraws {
    private static final ProfileLibrary SHIPPED = ProfileLibrary.shipped();
    private static final int MOST_CHANGES = 12;

    /** Where a device's own keys are reached from a design. */
    private static final Map<String, String> PLACES = Map.of(
            "winding", "clip.winding",
            "zener", "clip.zener",
            "unijunction", "trigger.device",
            "programmable-unijunction", "trigger.device",
            "scr", "thyristor.device",
            "triac", "thyristor.device");

    /** What the catalogue has no edges for. */
    private static final List<String> OTHERS = List.of(
            "line.low=-50 %",
            "line.low=0 %",
            "line.high=0 %",
            "line.high=+50 %",
            "load.rated=10 mW at 5 V",
            "load.rated=10 mW",
            "load.rated=1 MW",
            "load.rated=1 MW at 1 kV",
            "ramp.pot=none",
            "clip.winding=none",
            "snubber=none",
            "gate.shunt=none",
            "ramp.pot.points=[[0 %, 0 %], [1 %, 99 %], [100 %, 100 %]]",
            "line.harmonics=[{order: 2, share: 100 %}]",
            "line.harmonics=[{order: 3, share: 30 %, phase: 180 deg}]",
            "line.harmonics=[{order: 100, share: 0.9 %}]",
            "wanted.lowest=0 % at 100 %",
            "wanted.lowest=180 deg at 50 %",
            "wanted.highest=0 deg at 0 %",
            "wanted.highest=1000 V at 100 %");

    private final List<String> candidates = candidates();
    private final Source example;
    private final Random random;

    AbsurdDraws(Path file, long seed) throws IOException {
        example = Source.of(file);
        random = new Random(seed);
    }

    /** The next legal set of changes, as options. */
    List<String> next() {
        int wanted = 1 + random.nextInt(MOST_CHANGES);
        List<String> changes = new ArrayList<>();
        while (changes.size() < wanted) {
            List<String> more = new ArrayList<>(changes);
            more.add(candidates.get(random.nextInt(candidates.size())));
            if (isRead(more)) {
                changes = more;
            }
        }
        return changes.stream().map(change -> "--with=" + change).toList();
    }

    private boolean isRead(List<String> changes) {
        try {
            DesignFiles.load(example, changes, SHIPPED);
            return true;
        } catch (InvalidInputException refused) {
            return false;
        }
    }

    private static List<String> candidates() {
        List<String> all = new ArrayList<>(OTHERS);
        for (Key key : KeyCatalogue.standard().all()) {
            edges(key).forEach(edge -> all.add(pathInDesign(key) + "=" + edge));
        }
        return all;
    }

    private static Stream<String> edges(Key key) {
        return switch (key.kind()) {
            case WORD -> key.words().stream();
            case QUANTITY, PART, CHARACTERISTIC, CURVE, RATIO, WHOLE ->
                Stream.of(key.range().split("\\.\\."));
            default -> Stream.of();
        };
    }

    /** The key's path with a device's place in front, the first item of every list on the way. */
    private static String pathInDesign(Key key) {
        StringBuilder path = new StringBuilder();
        String sofar = "";
        for (String name : key.path().split("\\.")) {
            boolean first = sofar.isEmpty();
            String around = sofar;
            sofar = first ? name : sofar + "." + name;
            if (first) {
                path.append(PLACES.getOrDefault(name, name));
            } else {
                boolean list = KeyCatalogue.standard()
                        .find(around)
                        .filter(k -> k.kind() == Kind.LIST || k.kind() == Kind.CURVE)
                        .isPresent();
                path.append(list ? "[0]." : ".").append(name);
            }
        }
        return path.toString();
    }
}
