package clipramp.cli;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.Optional;

/**
 * One run of the command line inside this process.
 *
 * @param code exit code
 * @param out standard output
 * @param err standard error
 */
record CliRun(int code, String out, String err) {
    /** Runs with no input, as into a pipe. */
    static CliRun of(String... arguments) {
        return withInput("", arguments);
    }

    /** Runs with a text on standard input. */
    static CliRun withInput(String input, String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Terminal terminal = new Terminal(
                new ByteArrayInputStream(input.getBytes(StandardCharsets.UTF_8)),
                out,
                err,
                Map.of(),
                false,
                StandardCharsets.UTF_8);
        int code = Cli.run(arguments, terminal, Optional.empty());
        return new CliRun(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }
}
