package clipramp;

import clipramp.cli.Cli;
import clipramp.cli.Terminal;
import clipramp.desk.Desk;
import java.util.Locale;
import java.util.Optional;

/** The one way in: command line and window meet only here. */
public final class Main {
    private Main() {}

    public static void main(String[] arguments) {
        // The PDF library writes its table of contents of objects in the digits of the default locale, and no reader
        // understands Arabic or Bengali ones there.
        Locale.setDefault(Locale.Category.FORMAT, Locale.ROOT);
        System.exit(Cli.run(arguments, Terminal.ofProcess(), Optional.of(file -> Desk.open(file))));
    }
}
