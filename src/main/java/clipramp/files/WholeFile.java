package clipramp.files;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;

/**
 * Writes a file whole or not at all: into a temporary file beside it, then renamed. Whoever reads the file sees the old
 * content or the new, never half of it.
 */
public final class WholeFile {
    private static final int MOST_TEMPORARY_NAMES = 1000;

    private WholeFile() {}

    /** What is to be in the file. */
    @FunctionalInterface
    public interface Content {
        /**
         * Writes all of it.
         *
         * @throws IOException where that fails; the file then stays as it was
         */
        void writeTo(OutputStream out) throws IOException;
    }

    /**
     * Writes a text as UTF-8.
     *
     * @param file where to; a link is followed, a device or pipe is written to directly
     * @param text what is to be in the file
     * @param replace whether a file that is there may be replaced
     * @throws FileAlreadyExistsException where it is there and may not be
     * @throws IOException where it cannot be written; what was there stays
     */
    public static void write(Path file, String text, boolean replace) throws IOException {
        write(file, out -> out.write(text.getBytes(StandardCharsets.UTF_8)), replace);
    }

    /**
     * Writes bytes.
     *
     * @param file where to; a link is followed, a device or pipe is written to directly
     * @param content writes the bytes; when it throws, the file stays as it was
     * @param replace whether a file that is there may be replaced
     * @throws FileAlreadyExistsException where it is there and may not be
     * @throws IOException where it cannot be written; what was there stays
     */
    public static void write(Path file, Content content, boolean replace) throws IOException {
        Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
        if (Files.exists(target) && !Files.isRegularFile(target) && !Files.isDirectory(target)) {
            try (OutputStream out = Files.newOutputStream(target, StandardOpenOption.WRITE)) {
                content.writeTo(out);
            }
            return;
        }
        if (!replace && Files.exists(target, LinkOption.NOFOLLOW_LINKS)) {
            throw new FileAlreadyExistsException(file.toString());
        }
        Path temporary = fresh(target);
        try {
            try (OutputStream out = Files.newOutputStream(temporary, StandardOpenOption.WRITE)) {
                content.writeTo(out);
            }
            keepPermissions(target, temporary);
            rename(temporary, target);
        } finally {
            Files.deleteIfExists(temporary);
        }
    }

    private static Path fresh(Path target) throws IOException {
        for (int i = 0; i < MOST_TEMPORARY_NAMES; i++) {
            Path name = target.resolveSibling("." + target.getFileName() + ".part" + i);
            try {
                return Files.createFile(name);
            } catch (FileAlreadyExistsException taken) {
                // Somebody else writes the same file, or once crashed doing so: the next name may be free.
            }
        }
        throw new IOException("no free temporary name beside " + target);
    }

    private static void keepPermissions(Path target, Path temporary) throws IOException {
        PosixFileAttributeView from = Files.getFileAttributeView(target, PosixFileAttributeView.class);
        PosixFileAttributeView to = Files.getFileAttributeView(temporary, PosixFileAttributeView.class);
        if (Files.exists(target) && from != null && to != null) {
            to.setPermissions(from.readAttributes().permissions());
        }
    }

    private static void rename(Path temporary, Path target) throws IOException {
        try {
            Files.move(temporary, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(temporary, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }
}
