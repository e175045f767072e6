package clipramp.desk.model;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Unsaved work on disk. Every window keeps one file, written anew at every edit and removed when the work is saved or
 * given up; what is left of a window whose process is gone can be recovered.
 *
 * <p>The file's first line names the design file that it belongs to, then the design's text follows. It is written
 * beside and renamed, so that a kill at any moment leaves the last whole one.
 */
public final class Recovery {
    private static final String FOLDER = "unsaved";
    private static final String SUFFIX = ".yaml";
    private static final String HEAD = "# unsaved work of: ";
    private static final String UNTITLED = "(never saved)";

    private final Path folder;
    private final Path own;

    /**
     * @param places where the state lies
     * @param process this process
     * @param window number of the window in it
     */
    public Recovery(Places places, ProcessHandle process, int window) {
        this.folder = places.state().resolve(FOLDER);
        this.own = folder.resolve(process.pid() + "-" + started(process) + "-" + window + SUFFIX);
    }

    /** Start of a process, ms: ids come round again, ids with their start do not. */
    private static long started(ProcessHandle process) {
        return process.info().startInstant().map(Instant::toEpochMilli).orElse(0L);
    }

    /**
     * Work that was left behind.
     *
     * @param kept where it lies
     * @param file the design file that it belongs to; empty for a design that was never saved
     * @param text the design's text
     */
    public record Left(Path kept, Optional<Path> file, String text) {}

    /** Keeps the work as it stands. */
    void keep(Optional<Path> file, String text) throws IOException {
        Files.createDirectories(folder);
        Path beside = own.resolveSibling(own.getFileName() + ".part");
        String head = HEAD + file.map(Path::toString).orElse(UNTITLED) + "\n";
        Files.writeString(beside, head + text, StandardCharsets.UTF_8);
        Files.move(beside, own, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
    }

    /** Forgets this window's work: it is saved, or given up. */
    void forget() throws IOException {
        Files.deleteIfExists(own);
    }

    /** Forgets work that was left behind. */
    public void forget(Left left) throws IOException {
        Files.deleteIfExists(left.kept());
    }

    /** What windows of dead processes left behind, newest first. */
    public List<Left> leftBehind() throws IOException {
        if (!Files.isDirectory(folder)) {
            return List.of();
        }
        List<Path> files = new ArrayList<>();
        try (DirectoryStream<Path> all = Files.newDirectoryStream(folder, "*" + SUFFIX)) {
            for (Path file : all) {
                if (!isAlive(file)) {
                    files.add(file);
                }
            }
        }
        files.sort(Comparator.comparing(Recovery::modified).reversed());
        List<Left> left = new ArrayList<>();
        for (Path file : files) {
            read(file).ifPresent(left::add);
        }
        return left;
    }

    private static long modified(Path file) {
        try {
            return Files.getLastModifiedTime(file).toMillis();
        } catch (IOException e) {
            return 0;
        }
    }

    private boolean isAlive(Path file) {
        if (file.equals(own)) {
            return true;
        }
        String[] owner = file.getFileName().toString().split("-", -1);
        try {
            return ProcessHandle.of(Long.parseLong(owner[0]))
                    .filter(ProcessHandle::isAlive)
                    .filter(process -> started(process) == Long.parseLong(owner[1]))
                    .isPresent();
        } catch (NumberFormatException | ArrayIndexOutOfBoundsException e) {
            return false;
        }
    }

    private static Optional<Left> read(Path file) {
        try {
            String whole = Files.readString(file, StandardCharsets.UTF_8);
            int end = whole.indexOf('\n');
            if (!whole.startsWith(HEAD) || end < 0) {
                return Optional.empty();
            }
            String name = whole.substring(HEAD.length(), end);
            Optional<Path> belongs = name.equals(UNTITLED) ? Optional.empty() : Optional.of(Path.of(name));
            return Optional.of(new Left(file, belongs, whole.substring(end + 1)));
        } catch (IOException | IllegalArgumentException e) {
            return Optional.empty();
        }
    }
}
