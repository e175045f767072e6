package clipramp.cli;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.function.Function;

/**
 * Every command by name. Only the one that is asked for is built, which keeps the start quick; a new command is one more
 * line here.
 */
final class Commands {
    /**
     * @param name what is typed
     * @param arguments what follows the name, for the overview
     * @param does one line for the overview
     * @param build builds the command for a session; the object carries the option annotations
     */
    record Command(String name, String arguments, String does, Function<Session, Callable<Integer>> build) {}

    private static final List<Command> ALL = List.of(
            new Command("check", "FILE", "solve and judge: margins, knob table, pulse, supply", CheckCommand::new),
            new Command("map", "FILE", "knob position to firing angle, load volts and watts", MapCommand::new),
            new Command("trace", "FILE", "the half cycle's waveforms at one knob position", TraceCommand::new),
            new Command("fit", "FILE READINGS.csv", "bench readings to the unit's real parts", FitCommand::new),
            new Command(
                    "spread", "FILE", "tolerances and temperature: yield, worst case, remedies", SpreadCommand::new),
            new Command(
                    "faults", "FILE", "single faults: load, test points, what burns; --seen ranks", FaultsCommand::new),
            new Command("record", "FILE --out=OUT.pdf", "the design record as PDF", RecordCommand::new),
            new Command("size", "FILE", "from what is wanted to preferred values", SizeCommand::new),
            new Command("new", "--out=FILE", "a commented design to start from", NewCommand::new),
            new Command("parts", "[ID]", "the profiles; one of them with its sources", PartsCommand::new),
            new Command("explain", "KEY", "what a design key or a margin means", ExplainCommand::new),
            new Command("desk", "[FILE]", "the window", DeskCommand::new),
            new Command("completion", "SHELL", "what bash or zsh needs to complete all this", CompletionCommand::new),
            new Command("manual", "", "the manual page, for man -l -", ManualCommand::new));

    private Commands() {}

    /** The commands that this start of the program has; the window only where there is one. */
    static List<Command> of(Session session) {
        return ALL.stream()
                .filter(c -> !c.name().equals("desk") || session.launcher().isPresent())
                .toList();
    }

    static Optional<Command> named(String name, Session session) {
        return of(session).stream().filter(c -> c.name().equals(name)).findFirst();
    }

    static boolean has(String name) {
        return ALL.stream().anyMatch(c -> c.name().equals(name));
    }
}
