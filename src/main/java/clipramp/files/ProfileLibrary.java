package clipramp.files;

import clipramp.files.Node.Mapping;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.URISyntaxException;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.CodeSource;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.Stream;
import java.util.zip.ZipFile;

/**
 * Where profiles are found: folders first, in their order, then the program's own. Reading a folder that is not there
 * finds nothing.
 */
public final class ProfileLibrary {
    /** What the program's own profiles are said to come from. */
    public static final String PROGRAM = "program";

    private static final String ROOT = "clipramp/profiles/";
    private static final String ENDING = ".yaml";

    /**
     * A place where a user's own profiles lie.
     *
     * @param folder holds KIND/ID.yaml
     * @param from how answers name it
     */
    record Folder(Path folder, String from) {}

    /**
     * A profile that is there.
     *
     * @param kind kind of device
     * @param id its id
     * @param from where it was found
     * @param source its text; the name is what problems in it carry
     */
    public record Found(String kind, String id, String from, Source source) {}

    /** Names of the program's own profiles; listed only when somebody asks for them, which reading a design does not. */
    private static final class Shipped {
        static final List<String> NAMES = shippedNames();
    }

    private final List<Folder> folders;
    /** The program's own profiles do not change while it runs: each is fetched and parsed once. */
    private final Map<String, Optional<String>> shippedTexts = new ConcurrentHashMap<>();

    private final Map<String, Mapping> shippedTrees = new ConcurrentHashMap<>();

    private ProfileLibrary(List<Folder> folders) {
        this.folders = List.copyOf(folders);
    }

    /** The program's profiles only. */
    public static ProfileLibrary shipped() {
        return new ProfileLibrary(List.of());
    }

    /** Folders in their order, then the program. */
    static ProfileLibrary of(List<Folder> folders) {
        return new ProfileLibrary(folders);
    }

    /**
     * The usual places: {@code profiles} beside the design, the user's folder, the program.
     *
     * @param design the design's file; empty for standard input
     * @param environment environment variables
     * @param home the user's home folder
     * @param windows whether the system keeps user files under APPDATA
     */
    public static ProfileLibrary usual(
            Optional<Path> design, Map<String, String> environment, Path home, boolean windows) {
        List<Folder> folders = new ArrayList<>();
        Path beside = design.map(d -> d.toAbsolutePath().getParent()).orElse(null);
        if (beside != null) {
            folders.add(new Folder(beside.resolve("profiles"), "beside the design"));
        }
        folders.add(new Folder(userFolder(environment, home, windows), "user folder"));
        return new ProfileLibrary(folders);
    }

    /** The folder of a user's own profiles; a relative path in the environment counts as none. */
    static Path userFolder(Map<String, String> environment, Path home, boolean windows) {
        String variable = environment.getOrDefault(windows ? "APPDATA" : "XDG_CONFIG_HOME", "");
        Path base = windows ? home.resolve("AppData").resolve("Roaming") : home.resolve(".config");
        if (!variable.isBlank() && Path.of(variable).isAbsolute()) {
            base = Path.of(variable);
        }
        return base.resolve("clipramp").resolve("profiles");
    }

    /**
     * The first profile of a kind and id, in the order of the places; empty where there is none.
     *
     * @throws UncheckedIOException where a file is there and cannot be read
     * @throws InvalidInputException where it is too large or not UTF-8
     */
    public Optional<Found> find(String kind, String id) {
        return everywhere(kind, id).stream().findFirst();
    }

    /** Every profile of this kind and id, the one that is used first, then those that it hides. */
    List<Found> everywhere(String kind, String id) {
        List<Found> found = new ArrayList<>();
        if (!isId(id)) {
            return found;
        }
        for (Folder folder : folders) {
            Path file = folder.folder().resolve(kind).resolve(id + ENDING);
            if (Files.isRegularFile(file)) {
                try {
                    found.add(new Found(kind, id, folder.from(), Source.of(file)));
                } catch (IOException e) {
                    throw new UncheckedIOException(e);
                }
            }
        }
        shippedTexts
                .computeIfAbsent(kind + "/" + id, n -> shippedText(kind, id))
                .ifPresent(text -> found.add(
                        new Found(kind, id, PROGRAM, new Source("profiles/" + kind + "/" + id + ENDING, text))));
        return found;
    }

    /** A profile's tree; empty where it cannot be read, which is then among the findings. */
    Optional<Mapping> tree(Found found, Findings findings) {
        String name = found.kind() + "/" + found.id();
        boolean own = found.from().equals(PROGRAM);
        Mapping known = own ? shippedTrees.get(name) : null;
        if (known != null) {
            return Optional.of(known);
        }
        int before = findings.count();
        Optional<Mapping> tree = YamlTree.read(found.source(), findings);
        tree.ifPresent(t -> Version.check(t, findings));
        if (own && findings.count() == before) {
            tree.ifPresent(t -> shippedTrees.put(name, t));
        }
        return tree;
    }

    /**
     * Ids of a kind in every place, sorted.
     *
     * @throws UncheckedIOException where a folder is there and cannot be read
     */
    public List<String> ids(String kind) {
        Stream<String> own =
                Shipped.NAMES.stream().filter(n -> n.startsWith(kind + "/")).map(n -> n.substring(kind.length() + 1));
        Stream<String> others = folders.stream().flatMap(f -> idsIn(f.folder().resolve(kind)).stream());
        return Stream.concat(own, others).distinct().sorted().toList();
    }

    /**
     * Every profile that can be used, kind by kind.
     *
     * @throws UncheckedIOException where a folder or file is there and cannot be read
     * @throws InvalidInputException where a file is too large or not UTF-8
     */
    public List<Found> all() {
        return DevicePlace.allKinds().stream()
                .flatMap(kind -> ids(kind).stream().flatMap(id -> find(kind, id).stream()))
                .toList();
    }

    /** Profiles of an id, whatever their kind; throws as {@link #find}. */
    public List<Found> named(String id) {
        return DevicePlace.allKinds().stream()
                .flatMap(kind -> find(kind, id).stream())
                .toList();
    }

    static boolean isId(String text) {
        return text.matches("[a-z0-9-]{1,64}");
    }

    private static List<String> idsIn(Path folder) {
        if (!Files.isDirectory(folder)) {
            return List.of();
        }
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(f -> f.getFileName().toString())
                    .filter(n -> n.endsWith(ENDING))
                    .map(n -> n.substring(0, n.length() - ENDING.length()))
                    .filter(ProfileLibrary::isId)
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Optional<String> shippedText(String kind, String id) {
        try (InputStream in =
                ProfileLibrary.class.getClassLoader().getResourceAsStream(ROOT + kind + "/" + id + ENDING)) {
            return in == null ? Optional.empty() : Optional.of(new String(in.readAllBytes(), StandardCharsets.UTF_8));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /**
     * Class path resources cannot be listed, so the place that this class came from is walked: a folder, a jar, or the Java
     * runtime itself, into which an application image has linked the program.
     */
    private static List<String> shippedNames() {
        try {
            Module module = ProfileLibrary.class.getModule();
            if (module.isNamed()) {
                FileSystem runtime = FileSystems.getFileSystem(URI.create("jrt:/"));
                return namesInFolder(runtime.getPath("modules", module.getName(), ROOT));
            }
            URL folder = ProfileLibrary.class.getClassLoader().getResource(ROOT);
            if (folder != null && folder.getProtocol().equals("file")) {
                return namesInFolder(Path.of(folder.toURI()));
            }
            CodeSource code = ProfileLibrary.class.getProtectionDomain().getCodeSource();
            if (code == null) {
                return List.of();
            }
            URI place = code.getLocation().toURI();
            return Files.isRegularFile(Path.of(place)) ? namesInJar(Path.of(place)) : List.of();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (URISyntaxException e) {
            throw new IllegalStateException("the program's own place has no path", e);
        }
    }

    private static List<String> namesInFolder(Path root) throws IOException {
        try (Stream<Path> files = Files.walk(root, 2)) {
            return names(files.map(f -> root.relativize(f).toString().replace('\\', '/')));
        }
    }

    private static List<String> namesInJar(Path jar) throws IOException {
        try (ZipFile zip = new ZipFile(jar.toFile(), StandardCharsets.UTF_8)) {
            return names(zip.stream()
                    .map(e -> e.getName())
                    .filter(n -> n.startsWith(ROOT))
                    .map(n -> n.substring(ROOT.length())));
        }
    }

    private static List<String> names(Stream<String> files) {
        return files.filter(n -> n.endsWith(ENDING) && n.indexOf('/') > 0)
                .map(n -> n.substring(0, n.length() - ENDING.length()))
                .sorted()
                .toList();
    }
}
