package clipramp.cli;

import java.util.List;
import java.util.Locale;
import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/**
 * The manual page, written from the commands' own descriptions in the man macros that every roff knows (man(7)): TH, SH,
 * SS, TP, PP and B.
 */
final class ManualPage {
    private final StringBuilder page = new StringBuilder();
    private final Spelling spelling;

    private ManualPage(Spelling spelling) {
        this.spelling = spelling;
    }

    /**
     * @param root the program with its commands
     * @param spelling how signs such as Ω are written
     */
    static String of(CommandLine root, Spelling spelling) {
        ManualPage manual = new ManualPage(spelling);
        manual.head();
        root.getSubcommands().values().forEach(command -> manual.command(command.getCommandSpec()));
        manual.rest();
        return manual.page.toString();
    }

    private void head() {
        macro("TH", Program.NAME.toUpperCase(Locale.ROOT), "1", "", Program.nameAndVersion());
        macro("SH", "NAME");
        text(Program.NAME + " - designs and checks line-synchronised thyristor firing circuits");
        macro("SH", "SYNOPSIS");
        text(Program.NAME + " COMMAND [OPTIONS]");
        macro("SH", "DESCRIPTION");
        text("Reads a design file, solves when the circuit fires at every knob position, and judges whether the gate"
                + " pulse turns the thyristor on, whether it latches, and what every part bears. FILE may be - for"
                + " standard input. Answers go to standard output, complaints to standard error.");
        macro("PP");
        text(Caution.LINE);
        macro("SH", "COMMANDS");
    }

    private void command(CommandSpec spec) {
        StringBuilder usage = new StringBuilder(spec.name());
        spec.positionalParameters()
                .forEach(place -> usage.append(' ')
                        .append(place.required() ? place.paramLabel() : "[" + place.paramLabel() + "]"));
        macro("SS", usage.toString());
        text(String.join(" ", unescaped(spec.usageMessage().description())));
        spec.positionalParameters().forEach(this::place);
        spec.options().stream().filter(option -> !isEverywhere(option)).forEach(this::option);
        List<String> footer = unescaped(spec.usageMessage().footer());
        if (!footer.isEmpty()) {
            macro("PP");
            text(String.join(" ", footer).strip());
        }
    }

    private void place(PositionalParamSpec place) {
        macro("TP");
        macro("B", place.paramLabel());
        text(String.join(" ", unescaped(place.description())));
    }

    private void option(OptionSpec option) {
        macro("TP");
        macro("B", option.longestName() + (option.arity().max() > 0 ? "=" + option.paramLabel() : ""));
        text(String.join(" ", unescaped(option.description())));
    }

    private static boolean isEverywhere(OptionSpec option) {
        return List.of("--help", "--version", "--ascii").contains(option.longestName());
    }

    private void rest() {
        macro("SS", "Every command");
        for (String[] option : new String[][] {
            {"--ascii", "ohm, u, deg instead of signs"},
            {"--help", "the command's options"},
            {"--version", "the program's version"}
        }) {
            macro("TP");
            macro("B", option[0]);
            text(option[1]);
        }
        macro("SH", "EXIT STATUS");
        text(ExitCode.IN_WORDS);
        macro("SH", "ENVIRONMENT");
        text(
                "NO_COLOR: no bold type. XDG_CONFIG_HOME: the folder clipramp/profiles in it holds your own device profiles.");
        macro("SH", "SEE ALSO");
        text("clipramp explain safety prints the cautions, clipramp explain licences the licences.");
    }

    /** The command-line library's descriptions are format strings, in which a percent sign is written twice. */
    private static List<String> unescaped(String... lines) {
        return List.of(lines).stream()
                .map(line -> line.replace("%%", "%").replace("%n", " "))
                .toList();
    }

    private void macro(String name, String... arguments) {
        page.append('.').append(name);
        for (String argument : arguments) {
            page.append(" \"").append(escaped(argument).replace("\"", "\\(dq")).append('"');
        }
        page.append('\n');
    }

    private void text(String words) {
        String line = escaped(words);
        // A line that begins with a dot or an apostrophe would be taken for a macro.
        page.append(line.startsWith(".") || line.startsWith("'") ? "\\&" : "")
                .append(line)
                .append('\n');
    }

    private String escaped(String words) {
        return spelling.of(words).replace("\\", "\\e").replace("-", "\\-");
    }
}
