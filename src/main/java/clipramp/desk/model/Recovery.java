package clipramp.desk.model;

import clipramp.files.InvalidInputException;
import clipramp.files.ReadingsTable;
import clipramp.files.Source;
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
 * Unsaved work on disk: the design, and bench readings that were typed. Every window keeps one file, written anew at every
 * edit and removed when the work is saved or given up; what is left of a window whose process is gone can be recovered.
 *
 * <p>The file's first line names the design file that it belongs to; the readings follow, each of their lines as a remark;
 * then the design's text. It is written beside and renamed, so that a kill at any moment leaves the last whole one.
 */
public final class Recovery {
    private static final String FOLDER = "unsaved";
    private static final String SUFFIX = ".yaml";
    private static final String HEAD = "# unsaved work of: ";
    private static final String UNTITLED = "(never saved)";
    private static final String READING = "# unsaved reading: ";

    private final Path folder;
    private final Path own;
    private Optional<Path> file = Optional.empty();
    private String text = "";
    private boolean dirty;
    private Optional<ReadingsTable> readings = Optional.empty();

    /**
     * What one window keeps.
     *
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
     * @param readings bench readings that were typed and not saved; empty where there were none
     */
    public record Left(Path kept, Optional<Path> file, String text, Optional<ReadingsTable> readings) {}

    /**
     * Keeps the design as it stands.
     *
     * @param belongs its file; empty where it was never saved
     * @param design its text
     * @throws IOException where it cannot be written
     */
    synchronized void keep(Optional<Path> belongs, String design) throws IOException {
        file = belongs;
        text = design;
        dirty = true;
        write();
    }

    /**
     * Says which design lies on the desk, as its file has it: readings are kept with it.
     *
     * @param belongs its file; empty where it was never saved
     * @param design its text
     * @throws IOException where readings are kept and cannot be written
     */
    synchronized void follow(Optional<Path> belongs, String design) throws IOException {
        file = belongs;
        text = design;
        write();
    }

    /**
     * Keeps readings beside the design on the desk, which need not be unsaved itself.
     *
     * @param typed the readings; empty once they are saved, given up, or none
     * @throws IOException where they cannot be written
     */
    synchronized void keepReadings(Optional<ReadingsTable> typed) throws IOException {
        readings = typed;
        write();
    }

    /**
     * Makes work that was left behind this window's own.
     *
     * @throws IOException where it cannot be written
     */
    synchronized void take(Left left) throws IOException {
        readings = left.readings();
        keep(left.file(), left.text());
        forget(left);
    }

    /**
     * Forgets the design: it is saved, or given up. Readings stay.
     *
     * @throws IOException where the file cannot be changed
     */
    synchronized void forgetDesign() throws IOException {
        dirty = false;
        write();
    }

    private void write() throws IOException {
        if (!dirty && readings.isEmpty()) {
            Files.deleteIfExists(own);
            return;
        }
        StringBuilder whole = new StringBuilder(HEAD);
        whole.append(file.map(Path::toString).orElse(UNTITLED)).append('\n');
        readings.ifPresent(table -> table.csv()
                .lines()
                .forEach(line -> whole.append(READING).append(line).append('\n')));
        Files.createDirectories(folder);
        Path beside = own.resolveSibling(own.getFileName() + ".part");
        Files.writeString(beside, whole.append(text), StandardCharsets.UTF_8);
        Files.move(beside, own, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
    }

    /**
     * Forgets work that was left behind.
     *
     * @throws IOException where the file cannot be removed
     */
    public void forget(Left left) throws IOException {
        Files.deleteIfExists(left.kept());
    }

    /**
     * What windows of dead processes left behind, newest first.
     *
     * @throws IOException where the folder cannot be read
     */
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
            StringBuilder csv = new StringBuilder();
            int at = end + 1;
            while (whole.startsWith(READING, at)) {
                int lineEnd = whole.indexOf('\n', at);
                csv.append(whole, at + READING.length(), lineEnd + 1);
                at = lineEnd + 1;
            }
            Optional<ReadingsTable> read = csv.isEmpty()
                    ? Optional.empty()
                    : Optional.of(ReadingsTable.of(new Source(file.toString(), csv.toString())));
            return Optional.of(new Left(file, belongs, whole.substring(at), read));
        } catch (IOException | IllegalArgumentException | InvalidInputException e) {
            return Optional.empty();
        }
    }
}
