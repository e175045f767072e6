import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import java.util.zip.GZIPOutputStream;

/**
 * Packs the application image for Debian and its relatives, where their dpkg-deb is at hand: {@code MakeDeb VERSION FOLDER}. The image
 * goes to /usr/lib/clipramp; menu entry, file type, icons, manual page and completion to where the system looks for them.
 */
public final class MakeDeb {
    private static final String NAME = "clipramp";
    private static final Pattern LIBRARY = Pattern.compile("=> (/\\S+)");
    /** Native code that only the window loads. */
    private static final Pattern WINDOW_ONLY = Pattern.compile("lib(glass|prism|javafx|decora|awt_xawt|jawt|splashscreen|jsound).*");

    private final String version;
    private final Path folder;
    private final Path root;

    private MakeDeb(String[] arguments) {
        version = arguments[0];
        folder = Path.of(arguments[1]);
        root = folder.resolveSibling("image-work").resolve("deb");
    }

    public static void main(String[] arguments) throws IOException, InterruptedException {
        if (!Files.isExecutable(Path.of("/usr/bin/dpkg-deb"))) {
            System.out.println("No .deb: dpkg-deb is not on this machine. The image itself is complete.");
            return;
        }
        new MakeDeb(arguments).make();
    }

    private void make() throws IOException, InterruptedException {
        remove(root);
        Path program = root.resolve("usr/lib").resolve(NAME);
        copyTree(folder.resolve(NAME), program);
        Files.move(program.resolve("share"), root.resolve("usr/share"));
        Files.createDirectories(root.resolve("usr/bin"));
        for (String launcher : List.of(NAME, NAME + "-desk")) {
            Files.createSymbolicLink(root.resolve("usr/bin").resolve(launcher), Path.of("../lib", NAME, "bin", launcher));
        }
        compress(root.resolve("usr/share/man/man1/clipramp.1"));
        Path doc = root.resolve("usr/share/doc").resolve(NAME);
        Files.move(doc.resolve("third-party.txt"), doc.resolve("copyright"));
        long kilobytes = 0;
        try (Stream<Path> all = Files.walk(root)) {
            for (Path each : all.toList()) {
                kilobytes += Files.isRegularFile(each, LinkOption.NOFOLLOW_LINKS) ? Files.size(each) / 1024 + 1 : 1;
            }
        }
        Path control = Files.createDirectories(root.resolve("DEBIAN")).resolve("control");
        Files.writeString(control, control(kilobytes), StandardCharsets.UTF_8);
        Path deb = folder.resolve(NAME + "_" + version + "_" + architecture() + ".deb");
        int code = new ProcessBuilder("dpkg-deb", "--root-owner-group", "-Zxz", "-z2", "--build", root.toString(), deb.toString())
                .redirectErrorStream(true).redirectOutput(folder.resolveSibling("image-work").resolve("deb.log").toFile())
                .start().waitFor();
        if (code != 0) {
            throw new IllegalStateException("dpkg-deb failed, see image-work/deb.log");
        }
        System.out.printf(Locale.ROOT, "Package: %s, %d MB%n", deb, Files.size(deb) / 1_000_000);
    }

    private String control(long kilobytes) throws IOException, InterruptedException {
        List<Path> natives = new ArrayList<>();
        try (Stream<Path> files = Files.walk(root.resolve("usr/lib").resolve(NAME))) {
            files.filter(f -> f.toString().endsWith(".so")).forEach(natives::add);
        }
        var byUse = natives.stream()
                .collect(Collectors.partitioningBy(f -> WINDOW_ONLY.matcher(f.getFileName().toString()).matches()));
        Set<String> always = packagesBehind(byUse.get(false));
        Set<String> forTheWindow = packagesBehind(byUse.get(true));
        forTheWindow.removeAll(always);
        return "Package: clipramp\nVersion: " + version + "\nArchitecture: " + architecture()
                + "\nMaintainer: clipramp <clipramp@localhost>\nSection: electronics\nPriority: optional\nInstalled-Size: " + kilobytes
                + (always.isEmpty() ? "" : "\nDepends: " + String.join(", ", always))
                + (forTheWindow.isEmpty() ? "" : "\nRecommends: " + String.join(", ", forTheWindow))
                + "\nDescription: designer for line-synchronised thyristor firing circuits\n"
                + " Says when a unijunction relaxation oscillator fires, what the load gets and whether the\n"
                + " gate pulse really turns the thyristor on, on the command line (clipramp) and in a window\n"
                + " (clipramp-desk). Brings its own Java runtime.\n";
    }

    /** The packages whose libraries these are linked to, as this system knows them. */
    private static Set<String> packagesBehind(List<Path> natives) throws IOException, InterruptedException {
        Set<String> linked = new TreeSet<>();
        for (String line : said("ldd", natives)) {
            var match = LIBRARY.matcher(line);
            if (match.find() && !match.group(1).contains("/" + NAME + "/")) {
                linked.add(match.group(1));
                linked.add(Path.of(match.group(1)).toRealPath().toString());
            }
        }
        return said("dpkg-query --search", linked).stream()
                .filter(answer -> answer.contains(": /"))
                .map(answer -> answer.substring(0, answer.indexOf(':')))
                .collect(Collectors.toCollection(TreeSet::new));
    }

    private static List<String> said(String tool, Collection<?> about) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>(List.of(tool.split(" ")));
        about.forEach(each -> command.add(each.toString()));
        Process process = new ProcessBuilder(command).redirectError(ProcessBuilder.Redirect.DISCARD).start();
        String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        process.waitFor();
        return out.lines().toList();
    }

    private static String architecture() {
        String java = System.getProperty("os.arch", "");
        return java.equals("aarch64") ? "arm64" : java;
    }

    private static void compress(Path file) throws IOException {
        try (OutputStream out = new GZIPOutputStream(Files.newOutputStream(file.resolveSibling(file.getFileName() + ".gz")))) {
            Files.copy(file, out);
        }
        Files.delete(file);
    }

    /** Everybody may read it all, only its owner write. */
    private static void copyTree(Path from, Path to) throws IOException {
        List<Path> all = new ArrayList<>();
        try (Stream<Path> walked = Files.walk(from)) {
            walked.forEach(all::add);
        }
        for (Path each : all) {
            Path copy = to.resolve(from.relativize(each).toString());
            boolean open = Files.isDirectory(each) || Files.isExecutable(each);
            Files.createDirectories(copy.getParent());
            Files.copy(each, copy, StandardCopyOption.COPY_ATTRIBUTES);
            Files.setPosixFilePermissions(copy, PosixFilePermissions.fromString(open ? "rwxr-xr-x" : "rw-r--r--"));
        }
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
}
