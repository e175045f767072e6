package clipramp.desk.model;

import clipramp.circuit.Stage;
import clipramp.files.DesignText;
import clipramp.files.InvalidInputException;
import clipramp.files.LoadedDesign;
import clipramp.files.Problem;
import clipramp.files.ProfileLibrary;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;

/** Reads design texts with the profiles that go with them. */
public final class Workshop {
    private final Function<Optional<Path>, ProfileLibrary> libraries;

    /**
     * @param libraries the profiles that a design file sees; empty for a design that was never saved
     */
    public Workshop(Function<Optional<Path>, ProfileLibrary> libraries) {
        this.libraries = libraries;
    }

    /**
     * Reads a text.
     *
     * @param text the text
     * @param file where it lies, for profiles beside it; empty for a design that was never saved
     * @throws InvalidInputException with everything that is wrong with it
     */
    Sheet read(DesignText text, Optional<Path> file) {
        // Under its whole path, for a recorded line is looked for beside it; people read the name.
        String place = file.map(Path::toString).orElse(text.name());
        DesignText.Reading reading = text.named(place).read(libraries.apply(file));
        if (reading instanceof DesignText.Reading.Good good) {
            return new Sheet(text, named(good.loaded(), text.name()));
        }
        throw new InvalidInputException(((DesignText.Reading.Bad) reading)
                .problems().stream().map(p -> named(p, place, text.name())).toList());
    }

    private static LoadedDesign named(LoadedDesign loaded, String name) {
        return new LoadedDesign(
                loaded.design(),
                name,
                loaded.assumed(),
                loaded.profiles(),
                loaded.notes(),
                loaded.overrides(),
                loaded.inputDigest());
    }

    private static Problem named(Problem problem, String place, String name) {
        return new Problem(
                problem.file().equals(place) ? name : problem.file(),
                problem.line(),
                problem.column(),
                problem.path(),
                problem.read(),
                problem.expected(),
                problem.nearest(),
                problem.message());
    }

    /**
     * Ids of the profiles that may stand at a key of a design; empty where none may.
     *
     * @param key design key, such as clip.zener
     * @param stage the design's, which says what kind of thyristor it takes
     * @param file where the design lies, for profiles beside it; empty where it was never saved
     */
    List<String> profileIds(String key, Stage stage, Optional<Path> file) {
        ProfileLibrary library = libraries.apply(file);
        return kinds(key, stage).flatMap(kind -> library.ids(kind).stream()).toList();
    }

    private static Stream<String> kinds(String key, Stage stage) {
        return switch (key) {
            case "line" -> Stream.of("line");
            case "clip.winding" -> Stream.of("winding");
            case "clip.zener" -> Stream.of("zener");
            case "trigger.device" -> Stream.of("unijunction", "programmable-unijunction");
            case "thyristor.device" -> Stream.of(stage == Stage.TRIAC ? "triac" : "scr");
            default -> Stream.empty();
        };
    }

    /** Lines that a new design can hang on, the usual ones first. */
    public List<String> lineIds() {
        return libraries.apply(Optional.empty()).ids("line").stream()
                .sorted(Comparator.comparing((String id) -> !id.equals(Wish.USUAL.lineId())))
                .toList();
    }

    /** The profiles that a design file sees. */
    ProfileLibrary library(Optional<Path> file) {
        return libraries.apply(file);
    }

    /** Whether an id names a programmable unijunction transistor. */
    boolean isProgrammable(String id, Optional<Path> file) {
        return libraries.apply(file).ids("programmable-unijunction").contains(id);
    }
}
