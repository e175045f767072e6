import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.jar.JarEntry;
import java.util.jar.JarFile;
import java.util.jar.JarOutputStream;
import java.util.spi.ToolProvider;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import java.util.zip.ZipFile;

/**
 * Makes the self-contained application image: a Java runtime of just the modules that are needed, JavaFX and the program with its
 * libraries linked into it, two launchers, and an archive of classes made ready. Run by the Maven profile "image" on the run-time
 * class path: {@code MakeImage VERSION PROJECT_JAR CLASS_LIST FOLDER}.
 *
 * <p>The program is linked in, as one module, because an archive of classes from a class path holds only while the image stays where
 * it was made (Java 17); one of linked classes goes wherever the image goes.
 */
public final class MakeImage {
    private static final String NAME = "clipramp";
    private static final String OS = System.getProperty("os.name", "").toLowerCase(Locale.ROOT);
    private static final boolean WINDOWS = OS.contains("windows");
    private static final boolean MAC = OS.contains("mac");
    /** What the libraries need of the Java runtime, by jdeps. */
    private static final String NEEDED = "java.desktop,java.logging,java.xml,jdk.unsupported,javafx.controls";
    /** An answer is short: the small collector starts sooner, and a missing archive is no news for a user. */
    private static final String JAVA_OPTIONS = "-XX:+UseSerialGC -Xshare:auto -Xlog:disable -Xlog:all=error:stderr";

    private final String version;
    private final Path projectJar;
    private final Path classList;
    private final Path folder;
    private final Path work;

    private MakeImage(String[] arguments) {
        version = arguments[0];
        projectJar = Path.of(arguments[1]);
        classList = Path.of(arguments[2]);
        folder = Path.of(arguments[3]);
        work = folder.resolveSibling("image-work");
    }

    public static void main(String[] arguments) throws IOException, InterruptedException {
        new MakeImage(arguments).make();
    }

    private void make() throws IOException, InterruptedException {
        remove(folder);
        fresh(work);
        List<Path> javafx = new ArrayList<>();
        List<Path> libraries = new ArrayList<>(List.of(projectJar));
        for (String entry : System.getProperty("java.class.path").split(File.pathSeparator)) {
            Path jar = Path.of(entry);
            if (entry.endsWith(".jar")) {
                (jar.getFileName().toString().startsWith("javafx-") ? javafx : libraries).add(jar);
            }
        }
        requireLicences(libraries, javafx);
        javafx.removeIf(jar -> !isModule(jar));
        Path runtime = runtime(module(libraries, javafx), javafx);
        Path icons = icons();
        launchers(runtime, icons);
        archive(javafx);
        say(work.resolve("parts.txt"), "parts");
        if (!WINDOWS && !MAC) {
            share(icons);
        }
        System.out.printf(Locale.ROOT, "Image: %s, %d MB%n", image(), megabytes(image()));
    }

    /** Program and libraries as one module; what a library has for this version of Java comes first. */
    private Path module(List<Path> libraries, List<Path> javafx) throws IOException {
        Path module = work.resolve(NAME + ".jar");
        Set<String> taken = new HashSet<>();
        try (JarOutputStream out = new JarOutputStream(Files.newOutputStream(module))) {
            for (Path library : libraries) {
                try (JarFile jar = new JarFile(library.toFile(), false, ZipFile.OPEN_READ, JarFile.runtimeVersion())) {
                    for (JarEntry entry : jar.versionedStream().filter(MakeImage::isContent).toList()) {
                        if (taken.add(entry.getName())) {
                            out.putNextEntry(new JarEntry(entry.getName()));
                            try (InputStream in = jar.getInputStream(entry)) {
                                in.transferTo(out);
                            }
                        }
                    }
                }
            }
        }
        Path source = work.resolve("module-info.java");
        Files.writeString(source, "open module clipramp { requires " + NEEDED.replace(",", "; requires ") + "; }");
        run("javac", "--module-path", path(javafx), "-d", work.toString(), source.toString());
        run("jar", "--update", "--file", module.toString(), "--module-version", version, "--main-class", "clipramp.Main",
                "-C", work.toString(), "module-info.class");
        return module;
    }

    private static boolean isContent(JarEntry entry) {
        return !entry.isDirectory()
                && !entry.getName().matches("module-info\\.class|META-INF/(MANIFEST\\.MF|[^/]*\\.(SF|DSA|RSA)|maven/.*|LICEN.*|NOTICE.*)");
    }

    private Path image() {
        return folder.resolve(MAC ? NAME + ".app" : NAME);
    }

    /** No library goes out without its licence being named. */
    private void requireLicences(List<Path> libraries, List<Path> javafx) throws IOException {
        String named;
        try (JarFile program = new JarFile(projectJar.toFile());
                InputStream in = program.getInputStream(program.getJarEntry("clipramp/licences/third-party.md"))) {
            named = new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
        Set<String> unnamed = Stream.concat(libraries.stream().skip(1), javafx.stream())
                .map(jar -> jar.getFileName().toString().replaceAll("-\\d.*", ""))
                .filter(library -> !named.contains(library))
                .collect(Collectors.toCollection(TreeSet::new));
        if (!unnamed.isEmpty()) {
            throw new IllegalStateException("third-party.md names no licence for " + unnamed);
        }
    }

    /** The Java runtime, with JavaFX's native libraries as files, so that no start has to unpack them. */
    private Path runtime(Path module, List<Path> javafx) throws IOException {
        Path runtime = work.resolve("runtime");
        remove(runtime);
        run("jlink", "--module-path", path(javafx) + File.pathSeparator + module, "--add-modules", NAME, "--output",
                runtime.toString(), "--compress=2",
                "--no-header-files", "--no-man-pages",
                "--exclude-resources=regex:/javafx\\..*\\.(so|dll|dylib)");
        Path natives = runtime.resolve(WINDOWS ? "bin" : "lib");
        for (Path jar : javafx) {
            try (JarFile file = new JarFile(jar.toFile())) {
                for (var entry : file.stream().filter(e -> e.getName().matches("[^/]+\\.(so|dll|dylib)")).toList()) {
                    try (InputStream in = file.getInputStream(entry)) {
                        Files.copy(in, natives.resolve(entry.getName()), StandardCopyOption.REPLACE_EXISTING);
                    }
                }
            }
        }
        return runtime;
    }

    private static String path(List<Path> jars) {
        return jars.stream().map(Path::toString).collect(Collectors.joining(File.pathSeparator));
    }

    private static boolean isModule(Path jar) {
        try (JarFile file = new JarFile(jar.toFile())) {
            return file.getEntry("module-info.class") != null;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private void launchers(Path runtime, Path icons) throws IOException {
        String icon = icons.resolve(WINDOWS ? NAME + ".ico" : MAC ? NAME + ".icns" : NAME + ".png").toString();
        Path desk = work.resolve("desk.properties");
        Files.writeString(desk, "module=clipramp/clipramp.Window\nwin-console=false\nicon=" + icon.replace('\\', '/') + "\n");
        List<String> arguments = new ArrayList<>(List.of("--type", "app-image", "--name", NAME, "--app-version", version,
                "--description", "Designer for line-synchronised thyristor firing circuits",
                "--module", "clipramp/clipramp.Main", "--runtime-image", runtime.toString(),
                "--dest", folder.toString(), "--icon", icon, "--add-launcher", NAME + "-desk=" + desk,
                "--java-options", "-XX:SharedArchiveFile=$APPDIR/" + NAME + ".jsa"));
        for (String option : JAVA_OPTIONS.split(" ")) {
            arguments.addAll(List.of("--java-options", option));
        }
        if (WINDOWS) {
            arguments.add("--win-console");
        }
        run("jpackage", arguments.toArray(String[]::new));
    }

    /**
     * Classes made ready (class-data sharing): those that a rehearsal of the program loaded, all of its own, and the windowing of this
     * system, which a rehearsal without a screen cannot load.
     */
    private void archive(List<Path> javafx) throws IOException, InterruptedException {
        Path app = app();
        Set<String> classes = new LinkedHashSet<>();
        if (Files.exists(classList)) {
            classes.addAll(Files.readAllLines(classList, StandardCharsets.UTF_8));
        }
        for (Path jar : Stream.concat(Stream.of(projectJar), javafx.stream()).toList()) {
            try (JarFile file = new JarFile(jar.toFile())) {
                file.stream()
                        .map(JarEntry::getName)
                        .filter(name -> name.matches("(clipramp|com/sun/(glass/ui/(gtk|win|mac)|prism/(es2|sw|d3d)))/.*\\.class"))
                        .forEach(name -> classes.add(name.substring(0, name.length() - ".class".length())));
            }
        }
        Path list = work.resolve("classes.txt");
        Files.write(list, classes, StandardCharsets.UTF_8);
        Path java = image().resolve(MAC ? "Contents/runtime/Contents/Home" : WINDOWS ? "runtime" : "lib/runtime")
                .resolve("bin").resolve(WINDOWS ? "java.exe" : "java");
        Process dump = new ProcessBuilder(java.toString(), "-Xshare:dump", "-XX:SharedClassListFile=" + list,
                "-XX:SharedArchiveFile=" + app.resolve(NAME + ".jsa"), "-Xlog:disable", "-Xlog:all=error:stderr", "-m", "clipramp/clipramp.Main")
                .redirectErrorStream(true).redirectOutput(work.resolve("archive.log").toFile()).start();
        if (dump.waitFor() != 0) {
            System.out.println("No class archive (see " + work.resolve("archive.log") + "): the image works, but starts slower.");
        }
    }

    private Path app() {
        return image().resolve(MAC ? "Contents/app" : WINDOWS ? "app" : "lib/app");
    }

    /** What a system keeps outside the program's own folder: manual page, completion, menu entry, file type, icons, licences. */
    private void share(Path icons) throws IOException, InterruptedException {
        Path share = image().resolve("share");
        say(share.resolve("man/man1/clipramp.1"), "manual");
        say(share.resolve("bash-completion/completions/clipramp"), "completion", "bash");
        say(share.resolve("zsh/vendor-completions/_clipramp"), "completion", "zsh");
        say(share.resolve("doc/clipramp/third-party.txt"), "explain", "licences");
        for (String id : List.of("Apache-2.0", "LGPL-2.1", "MPL-2.0", "BSD-3-Clause", "GPL-2.0-CE", "DejaVu", "notices")) {
            say(share.resolve("doc/clipramp/licences/" + id + ".txt"), "explain", id);
        }
        copy(Path.of("src/packaging/clipramp.desktop"), share.resolve("applications/clipramp.desktop"));
        copy(Path.of("src/packaging/clipramp.xml"), share.resolve("mime/packages/clipramp.xml"));
        for (String size : List.of("16", "32", "64", "128", "256")) {
            copy(icons.resolve("icon-" + size + ".png"), share.resolve("icons/hicolor/" + size + "x" + size + "/apps/clipramp.png"));
        }
        copy(icons.resolve("icon.svg"), share.resolve("icons/hicolor/scalable/apps/clipramp.svg"));
        documents(share.resolve("doc/clipramp"));
    }

    /** What the README names by its place in the sources lies beside it here too, so that its commands find it. */
    private static void documents(Path into) throws IOException {
        List<Path> all = new ArrayList<>();
        for (String each : List.of("README.md", "SAFETY.md", "CHANGES.md", "DEVELOPERS.md", "LICENSE", "examples", "profiles", "src/docs")) {
            try (Stream<Path> found = Files.walk(Path.of(each))) {
                found.filter(Files::isRegularFile).forEach(all::add);
            }
        }
        for (Path each : all) {
            copy(each, into.resolve(each));
        }
    }

    /** What the packaged program itself says; so no image is made whose program does not start. */
    private void say(Path into, String... words) throws IOException, InterruptedException {
        Files.createDirectories(into.getParent());
        List<String> command = new ArrayList<>(List.of(image()
                .resolve(MAC ? "Contents/MacOS" : WINDOWS ? "" : "bin")
                .resolve(WINDOWS ? NAME + ".exe" : NAME).toAbsolutePath().toString()));
        command.addAll(List.of(words));
        Process process = new ProcessBuilder(command).redirectOutput(into.toFile()).redirectError(ProcessBuilder.Redirect.INHERIT).start();
        if (process.waitFor() != 0) {
            throw new IllegalStateException("the packaged program does not answer " + command);
        }
    }

    private static void copy(Path from, Path to) throws IOException {
        Files.createDirectories(to.getParent());
        Files.copy(from, to, StandardCopyOption.REPLACE_EXISTING);
    }

    /** The icon in every form that a system asks for; .ico and .icns are a few bytes around a PNG. */
    private Path icons() throws IOException {
        Path icons = fresh(work.resolve("icons"));
        try (Stream<Path> drawn = Files.list(Path.of("src/main/resources/clipramp/desk"))) {
            for (Path icon : drawn.filter(file -> file.getFileName().toString().startsWith("icon")).toList()) {
                copy(icon, icons.resolve(icon.getFileName()));
            }
        }
        byte[] png = Files.readAllBytes(icons.resolve("icon-256.png"));
        Files.write(icons.resolve(NAME + ".png"), png);
        ByteBuffer ico = ByteBuffer.allocate(22 + png.length).order(ByteOrder.LITTLE_ENDIAN);
        ico.putShort((short) 0).putShort((short) 1).putShort((short) 1).putInt(0).putShort((short) 1).putShort((short) 32);
        ico.putInt(png.length).putInt(22).put(png);
        Files.write(icons.resolve(NAME + ".ico"), ico.array());
        ByteBuffer icns = ByteBuffer.allocate(16 + png.length);
        icns.put("icns".getBytes(StandardCharsets.US_ASCII)).putInt(16 + png.length);
        icns.put("ic08".getBytes(StandardCharsets.US_ASCII)).putInt(8 + png.length).put(png);
        Files.write(icons.resolve(NAME + ".icns"), icns.array());
        return icons;
    }

    private static void run(String tool, String... arguments) {
        ByteArrayOutputStream said = new ByteArrayOutputStream();
        java.io.PrintStream out = new java.io.PrintStream(said, true, StandardCharsets.UTF_8);
        int code = ToolProvider.findFirst(tool)
                .orElseThrow(() -> new IllegalStateException("this Java has no " + tool + "; a full JDK is needed"))
                .run(out, out, arguments);
        if (code != 0) {
            throw new IllegalStateException(tool + " failed: " + said.toString(StandardCharsets.UTF_8));
        }
    }

    private static Path fresh(Path directory) throws IOException {
        remove(directory);
        return Files.createDirectories(directory);
    }

    private static void remove(Path what) throws IOException {
        if (Files.exists(what)) {
            try (Stream<Path> all = Files.walk(what)) {
                for (Path each : all.sorted(Comparator.reverseOrder()).toList()) {
                    Files.delete(each);
                }
            }
        }
    }

    private static long megabytes(Path what) throws IOException {
        try (Stream<Path> all = Files.walk(what)) {
            return all.filter(Files::isRegularFile).mapToLong(file -> file.toFile().length()).sum() / 1_000_000;
        }
    }
}
