package clipramp.cli;

import clipramp.circuit.RefusedCircuit;
import clipramp.files.InvalidInputException;
import clipramp.files.Problem;
import clipramp.fit.UnsettledFitException;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.CancellationException;
import picocli.CommandLine;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.OverwrittenOptionException;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** The one place where failures become words and exit codes. */
final class Failures {
    private static final char UNREADABLE = '\uFFFD';
    private static final List<String> FIRING_CIRCUIT = List.of("clip", "ramp", "trigger", "gate", "thyristor");

    private final Session session;
    private final List<String> words;

    /**
     * @param session where to complain
     * @param words the command line as typed
     */
    Failures(Session session, List<String> words) {
        this.session = session;
        this.words = words;
    }

    /** Runs a task; whatever it throws is told and becomes its exit code. */
    @SuppressWarnings("CatchingUnchecked") // nothing may pass: the code for "our fault" stands behind everything else
    int guard(Callable<Integer> task) {
        try {
            return task.call();
        } catch (InvalidInputException refused) {
            return unusable(refused.problems());
        } catch (ParameterException refused) {
            return unusable(List.of(ofOption(refused)));
        } catch (RefusedCircuit refused) {
            return unusable(List.of(Problems.of("", refused.path(), String.valueOf(refused.getMessage()))));
        } catch (UnsettledFitException refused) {
            return unusable(List.of(Problems.of("", "readings", String.valueOf(refused.getMessage()))));
        } catch (FileFailure failure) {
            return file(String.valueOf(failure.getMessage()));
        } catch (UncheckedIOException | IOException failure) {
            return file("a file cannot be read or written: " + failure.getMessage() + ".");
        } catch (ExceptionInInitializerError failure) {
            return failure.getCause() instanceof UncheckedIOException noRoom
                    ? file(noRoom.getMessage() + ".")
                    : ourFault(failure);
        } catch (InterruptedException | CancellationException stopped) {
            return ExitCode.INTERRUPTED;
        } catch (Exception | StackOverflowError | OutOfMemoryError | AssertionError | LinkageError fault) {
            return ourFault(fault);
        }
    }

    static InvalidInputException unknownCommand(String name, Session session) {
        List<String> known =
                Commands.of(session).stream().map(Commands.Command::name).toList();
        return Problems.unknown("", name, "is no command", known);
    }

    private int unusable(List<Problem> problems) {
        if (words.contains("--json")) {
            session.out().exactly(Problems.json(problems, session.ascii()));
        }
        problems.forEach(problem -> session.err().line(Problems.text(problem)));
        hintAtSizing(problems);
        hintAtLocale();
        return ExitCode.UNUSABLE;
    }

    private int file(String message) {
        session.err().line(Program.NAME + ": " + message);
        hintAtLocale();
        return ExitCode.FILE;
    }

    /** A file that lacks the whole firing circuit is a request, not a design with eight mistakes. */
    private void hintAtSizing(List<Problem> problems) {
        List<String> paths = problems.stream().map(Problem::path).toList();
        if (paths.containsAll(FIRING_CIRCUIT)) {
            session.err()
                    .line("  Nobody need type the firing circuit: clipramp size "
                            + problems.get(0).file()
                            + " makes a design from line, stage, load and wanted.");
        }
    }

    /** Java reads what a plain C locale cannot carry as replacement signs; the reason is then not the user's typing. */
    private void hintAtLocale() {
        if (words.stream().anyMatch(word -> word.indexOf(UNREADABLE) >= 0)) {
            session.err()
                    .line(
                            "  This locale cannot carry every sign. Write ohm, u, deg and +- instead, or set LC_ALL=C.UTF-8.");
        }
    }

    private Problem ofOption(ParameterException refused) {
        CommandLine command = refused.getCommandLine();
        String name = command.getCommandName();
        if (refused instanceof UnmatchedArgumentException unmatched) {
            String word = unmatched.getUnmatched().get(0);
            if (!word.startsWith("-")) {
                return Problems.of(name, word, "\"" + word + "\" is one argument too many. See " + name + " --help.");
            }
            String option = word.split("=", 2)[0];
            List<String> known = command.getCommandSpec().options().stream()
                    .map(o -> o.longestName())
                    .toList();
            return Problems.unknown(name, option, "is no option of " + name, known)
                    .problems()
                    .get(0);
        }
        if (refused instanceof MissingParameterException missing) {
            ArgSpec what = missing.getMissing().get(0);
            String said = what instanceof OptionSpec option ? option.longestName() : what.paramLabel();
            String lacks = words.contains(said) ? " needs a value: " + said + "=" + what.paramLabel() : " is missing";
            return Problems.of(name, said, said + lacks + "." + proposed(what, command) + " See " + name + " --help.");
        }
        if (refused instanceof OverwrittenOptionException twice
                && twice.getOverwritten() instanceof OptionSpec option) {
            return Problems.of(name, option.longestName(), option.longestName() + " is given twice. Give it once.");
        }
        return Problems.of(name, "", refused.getMessage() + ". See " + name + " --help.");
    }

    /** A word that no argument takes may be what the missing option was to be given. */
    private String proposed(ArgSpec missing, CommandLine command) {
        int taken = command.getCommandSpec().positionalParameters().size();
        return words.stream()
                .skip(1)
                .filter(word -> !word.startsWith("-"))
                .skip(taken)
                .findFirst()
                .filter(word -> missing instanceof OptionSpec)
                .map(word -> " Is it " + ((OptionSpec) missing).longestName() + "=" + word + "?")
                .orElse("");
    }

    /** Tells what to send us; the trace goes to a file, never to a user's screen. */
    private int ourFault(Throwable fault) {
        Output err = session.err();
        err.line(Program.NAME + ": the program failed, which is our fault and not yours. No file was changed by it.");
        err.line("  What happened: " + fault.getClass().getSimpleName() + " in " + where(fault) + ".");
        String report = report(fault);
        err.line(
                report.isEmpty()
                        ? "  Please send us these lines, the command and the design."
                        : "  Please send us the design and this report: " + report);
        return ExitCode.OUR_FAULT;
    }

    private static String where(Throwable fault) {
        for (StackTraceElement element : fault.getStackTrace()) {
            if (element.getClassName().startsWith("clipramp.")) {
                return element.getClassName().replace("clipramp.", "") + ", line " + element.getLineNumber();
            }
        }
        return "a library";
    }

    private String report(Throwable fault) {
        StringWriter text = new StringWriter();
        text.append(Program.nameAndVersion())
                .append(", Java ")
                .append(Runtime.version().toString());
        text.append(", ").append(System.getProperty("os.name")).append("\n");
        text.append("clipramp ").append(String.join(" ", words)).append("\n\n");
        fault.printStackTrace(new PrintWriter(text, true));
        try {
            Path file = Files.createTempFile("clipramp-fault-", ".txt");
            Files.writeString(file, text.toString(), StandardCharsets.UTF_8);
            return file.toString();
        } catch (IOException noRoom) {
            return "";
        }
    }
}
