package clipramp;

import clipramp.cli.Cli;
import clipramp.cli.Terminal;
import java.util.Optional;

/** The one way in. */
public final class Main {
    private Main() {}

    public static void main(String[] arguments) {
        System.exit(Cli.run(arguments, Terminal.ofProcess(), Optional.empty()));
    }
}
