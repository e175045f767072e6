package clipramp.cli;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;

/** The command line: finds the command, runs it, and turns whatever happens into words and an exit code. */
public final class Cli {
    private static final String ASCII_OPTION = "--ascii";

    private Cli() {}

    /**
     * Runs one command.
     *
     * @param arguments as typed
     * @param terminal where words come from and go to
     * @param launcher opens the window, where there is one
     * @return the exit code: 0 answered, 1 a margin fails, 2 input or options cannot be used, 3 our own fault, 4 a file cannot
     *  be read or written, 130 interrupted
     */
    public static int run(String[] arguments, Terminal terminal, Optional<Launcher> launcher) {
        List<String> words = List.of(arguments);
        boolean ascii = words.contains(ASCII_OPTION);
        var charset = terminal.writingCharset(ascii);
        Output out = new Output(terminal.out(), charset, terminal.isStyled());
        Output err = new Output(terminal.err(), charset, false);
        Session session = new Session(terminal, out, err, ascii, launcher);
        Failures failures = new Failures(session, words);
        int code = failures.guard(() -> dispatch(session, words));
        int flushed = failures.guard(() -> {
            out.flush();
            return ExitCode.ANSWERED;
        });
        err.flush();
        return flushed == ExitCode.ANSWERED ? code : flushed;
    }

    private static int dispatch(Session session, List<String> words) throws Exception {
        List<String> meant = words.stream().filter(w -> !w.equals(ASCII_OPTION)).toList();
        if (meant.isEmpty()) {
            Overview.nextSteps(session);
            return ExitCode.ANSWERED;
        }
        String first = meant.get(0);
        if (first.equals("--help") || (first.equals("help") && meant.size() == 1)) {
            Overview.print(session);
            return ExitCode.ANSWERED;
        }
        if (first.equals("--version")) {
            session.out().line(Program.nameAndVersion());
            return ExitCode.ANSWERED;
        }
        boolean helpAsked = first.equals("help");
        String name = helpAsked ? meant.get(1) : first;
        Commands.Command command =
                Commands.named(name, session).orElseThrow(() -> Failures.unknownCommand(name, session));
        List<String> rest = helpAsked ? List.of("--help") : meant.subList(1, meant.size());
        return run(command, session, rest);
    }

    private static int run(Commands.Command command, Session session, List<String> arguments) throws Exception {
        Callable<Integer> task = command.build().apply(session);
        CommandLine parser = new CommandLine(task)
                .setCommandName(Program.NAME + " " + command.name())
                .setOut(session.out().asPrintWriter())
                .setErr(session.err().asPrintWriter())
                .setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF))
                .setExpandAtFiles(false)
                .setUsageHelpWidth(Paragraph.WIDTH);
        parser.parseArgs(arguments.toArray(new String[0]));
        if (parser.isUsageHelpRequested()) {
            parser.usage(parser.getOut());
            return ExitCode.ANSWERED;
        }
        if (parser.isVersionHelpRequested()) {
            session.out().line(Program.nameAndVersion());
            return ExitCode.ANSWERED;
        }
        return task.call();
    }
}
