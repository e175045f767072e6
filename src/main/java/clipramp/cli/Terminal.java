package clipramp.cli;

import java.io.BufferedInputStream;
import java.io.Console;
import java.io.FileDescriptor;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.Charset;
import java.nio.charset.IllegalCharsetNameException;
import java.nio.charset.StandardCharsets;
import java.nio.charset.UnsupportedCharsetException;
import java.util.Map;

/**
 * Where a command's words come from and go to.
 *
 * @param in standard input
 * @param out standard output, for answers; its failures are seen, not swallowed
 * @param err standard error, for progress and complaints
 * @param environment environment variables
 * @param interactive whether a person watches a terminal
 * @param charset what that terminal can show
 */
public record Terminal(
        InputStream in,
        OutputStream out,
        OutputStream err,
        Map<String, String> environment,
        boolean interactive,
        Charset charset) {
    private static final String SIGNS = "Ωµ°±αη≥≤×·–…−";

    /** Keeps the environment as it is. */
    public Terminal {
        environment = Map.copyOf(environment);
    }

    /** This process's own streams. A pipe or a file gets UTF-8; a terminal gets what it can show. */
    public static Terminal ofProcess() {
        return new Terminal(
                // Buffered: a bare file stream asks for its position, which a pipe has not.
                new BufferedInputStream(new FileInputStream(FileDescriptor.in)),
                new FileOutputStream(FileDescriptor.out),
                new FileOutputStream(FileDescriptor.err),
                System.getenv(),
                isWatched(),
                nativeCharset());
    }

    /** Since Java 22 a redirected process has a console too, which then says itself that it is no terminal. */
    @SuppressWarnings("SystemConsoleNull") // asks on
    private static boolean isWatched() {
        Console console = System.console();
        if (console == null) {
            return false;
        }
        try {
            return (Boolean) Console.class.getMethod("isTerminal").invoke(console);
        } catch (ReflectiveOperationException before22) {
            return true;
        }
    }

    /** The charset to write in: the terminal's if it has every sign that answers use, else ASCII. */
    Charset writingCharset(boolean asciiAsked) {
        if (asciiAsked) {
            return StandardCharsets.US_ASCII;
        }
        if (!interactive) {
            return StandardCharsets.UTF_8;
        }
        return charset.canEncode() && charset.newEncoder().canEncode(SIGNS) ? charset : StandardCharsets.US_ASCII;
    }

    /** Whether bold type may be used: on a terminal, unless NO_COLOR is set or the terminal is a dumb one. */
    boolean isStyled() {
        return interactive
                && environment.getOrDefault("NO_COLOR", "").isEmpty()
                && !environment.getOrDefault("TERM", "").equals("dumb")
                && environment.containsKey("TERM");
    }

    private static Charset nativeCharset() {
        String name = System.getProperty("sun.stdout.encoding", System.getProperty("native.encoding", "UTF-8"));
        try {
            return Charset.forName(name);
        } catch (IllegalCharsetNameException | UnsupportedCharsetException unknown) {
            return StandardCharsets.US_ASCII;
        }
    }
}
