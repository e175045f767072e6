package clipramp.cli;

import java.io.IOException;
import java.io.PrintStream;
import java.lang.management.ManagementFactory;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Puts absurd but legal designs through every analysis of the command line: {@code FILE DRAWS SEED EVERY}; check judges each
 * draw, the other commands answer every so many-th. What is our fault, what prints a figure that is none, and what takes more
 * than {@value #LONG_SECONDS} s of processor time is printed with the changes that did it.
 */
final class AbsurdStudy {
    private static final PrintStream OUT = new PrintStream(System.out, true, StandardCharsets.UTF_8);
    private static final double LONG_SECONDS = 5;
    private static final int FIRST_DEAR = 1;

    /** The commands, each with what it takes behind the design. */
    private static final List<List<String>> COMMANDS = List.of(
            List.of("check", "--json"),
            List.of("map", "--json"),
            List.of("trace", "--json", "--samples=50"),
            List.of("spread", "--json", "--samples=3", "--judged=1"),
            List.of("faults", "--json"),
            List.of("record"));

    private AbsurdStudy() {}

    public static void main(String[] arguments) throws IOException {
        Path example = Path.of(arguments[0]);
        int draws = Integer.parseInt(arguments[1]);
        AbsurdDraws drawn = new AbsurdDraws(example, Long.parseLong(arguments[2]));
        int rarely = Integer.parseInt(arguments[3]);
        Path record = Files.createTempFile("absurd", ".pdf");
        double[] total = new double[COMMANDS.size()];
        double[] longest = new double[COMMANDS.size()];
        int[] runs = new int[COMMANDS.size()];
        int refused = 0;
        int bad = 0;
        while (runs[0] - refused < draws) {
            List<String> changes = drawn.next();
            for (int i = 0; i < COMMANDS.size(); i++) {
                if (i >= FIRST_DEAR && (runs[0] - refused) % rarely != 0) {
                    break;
                }
                List<String> words = words(COMMANDS.get(i), example, changes);
                if (words.get(0).equals("record")) {
                    words.add("--out=" + record);
                }
                double from = processorSeconds();
                CliRun run = CliRun.of(words.toArray(String[]::new));
                double seconds = processorSeconds() - from;
                runs[i]++;
                total[i] += seconds;
                longest[i] = Math.max(longest[i], seconds);
                String fault = fault(run);
                if (!fault.isEmpty() || seconds > LONG_SECONDS) {
                    bad++;
                    OUT.printf(Locale.ROOT, "%s %.1f s: %s%n", fault, seconds, words);
                }
                if (run.code() == ExitCode.UNUSABLE) {
                    refused += i == 0 ? 1 : 0;
                    break;
                }
            }
        }
        Files.deleteIfExists(record);
        OUT.printf(
                Locale.ROOT,
                "%s: %d draws answered, %d refused by the laws, %d runs bad or long%n",
                example,
                runs[0] - refused,
                refused,
                bad);
        for (int i = 0; i < COMMANDS.size(); i++) {
            OUT.printf(
                    Locale.ROOT,
                    "  %-8s %5d runs, %.3f s each, longest %.1f s%n",
                    COMMANDS.get(i).get(0),
                    runs[i],
                    total[i] / Math.max(1, runs[i]),
                    longest[i]);
        }
    }

    private static double processorSeconds() {
        return ((com.sun.management.OperatingSystemMXBean) ManagementFactory.getOperatingSystemMXBean())
                        .getProcessCpuTime()
                * 1e-9;
    }

    /** A command line: the command on an example with its changes. */
    static List<String> words(List<String> command, Path example, List<String> changes) {
        List<String> words = new ArrayList<>(command);
        words.add(1, example.toString());
        words.addAll(changes);
        return words;
    }

    /** What is wrong with a run; empty for nothing. */
    static String fault(CliRun run) {
        String said = run.out() + run.err();
        if (run.code() > ExitCode.UNUSABLE) {
            return "exit " + run.code() + " " + run.err().replace("\n", " ");
        }
        int waves = said.indexOf("\"waveforms\"");
        if (waves >= 0 && said.indexOf("null", waves) >= 0) {
            return "no number in the waveforms";
        }
        for (String word : List.of("Exception", "NaN", "Infinity", "∞")) {
            if (said.contains(word)) {
                return word;
            }
        }
        return "";
    }
}
