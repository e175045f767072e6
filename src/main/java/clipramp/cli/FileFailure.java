package clipramp.cli;

import clipramp.files.Example;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.DirectoryStream;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** A file that cannot be read or written, with the reason in words and what to do. */
final class FileFailure extends RuntimeException {
    private static final long serialVersionUID = 1L;
    private static final int MOST_SUGGESTED = 5;

    private FileFailure(String message, Exception cause) {
        super(message, cause);
    }

    /**
     * @param name the file as typed
     * @param cause why it cannot be read
     */
    static FileFailure reading(String name, IOException cause) {
        String suggestion = cause instanceof NoSuchFileException ? example(name) + neighbours(name) : "";
        return new FileFailure(name + " cannot be read: " + reason(cause, Path.of(name)) + "." + suggestion, cause);
    }

    /**
     * @param name the file as typed
     * @param cause why it cannot be written
     */
    static FileFailure writing(String name, IOException cause) {
        return new FileFailure(
                name + " cannot be written: " + reason(cause, Path.of(name)) + ". Nothing was changed.", cause);
    }

    /** Standard output that takes no more, such as a file on a full disk. */
    static FileFailure answering(IOException cause) {
        return new FileFailure("the answer cannot be written: " + cause.getMessage() + ".", cause);
    }

    /** A name that this system cannot have. */
    static FileFailure naming(String name, InvalidPathException cause) {
        return new FileFailure("\"" + name + "\" is no file name here: " + cause.getReason() + ".", cause);
    }

    /** An output that exists already and was not offered for replacement. */
    static FileFailure exists(String name) {
        return new FileFailure(
                name + " exists already. Name another file, or add --replace to write over it.",
                new FileAlreadyExistsException(name));
    }

    private static String reason(IOException cause, Path file) {
        if (Files.isDirectory(file)) {
            return "it is a folder";
        }
        Path folder = file.toAbsolutePath().getParent();
        if (cause instanceof NoSuchFileException) {
            return folder != null && !Files.isDirectory(folder)
                    ? "there is no folder " + folder
                    : "there is no such file";
        }
        if (cause instanceof AccessDeniedException) {
            return "access is denied";
        }
        if (cause instanceof NotDirectoryException) {
            return "its folder is a file";
        }
        String said = cause.getMessage();
        return said == null ? cause.getClass().getSimpleName() : said;
    }

    /** An example of the program's own, asked for where the examples are not. */
    private static String example(String name) {
        String file = String.valueOf(Path.of(name).getFileName());
        String id = file.endsWith(".yaml") ? file.substring(0, file.length() - ".yaml".length()) : file;
        return Example.named(id).isEmpty()
                ? ""
                : " The program has that example with it: clipramp new --from=" + id + " --out=" + id + ".yaml.";
    }

    /** Designs in the same folder, for somebody who mistyped a name. */
    private static String neighbours(String name) {
        Path folder = Path.of(name).toAbsolutePath().getParent();
        List<String> found = new ArrayList<>();
        if (folder != null && Files.isDirectory(folder)) {
            try (DirectoryStream<Path> designs = Files.newDirectoryStream(folder, "*.yaml")) {
                designs.forEach(design -> found.add(String.valueOf(design.getFileName())));
            } catch (IOException unreadable) {
                return "";
            }
        }
        found.removeIf(n -> !StandardCharsets.UTF_8.newEncoder().canEncode(n));
        found.sort(null);
        return found.isEmpty()
                ? ""
                : " Designs there: "
                        + String.join(", ", found.subList(0, Math.min(MOST_SUGGESTED, found.size())))
                        + (found.size() > MOST_SUGGESTED ? " and " + (found.size() - MOST_SUGGESTED) + " more." : ".");
    }
}
