package clipramp;

import clipramp.cli.Cli;
import clipramp.cli.Terminal;
import clipramp.desk.Desk;
import java.util.Optional;

/** The one way in: command line and window meet only here. */
public final class Main {
    private Main() {}

    public static void main(String[] arguments) {
        System.exit(Cli.run(arguments, Terminal.ofProcess(), Optional.of(file -> Desk.open(file))));
    }
}
