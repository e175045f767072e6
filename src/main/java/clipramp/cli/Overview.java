package clipramp.cli;

import clipramp.cli.TextTable.Align;

/** What there is to do: the overview of all commands, and the first steps for somebody who typed none. */
final class Overview {
    private Overview() {}

    /** No arguments: three next steps. */
    static void nextSteps(Session session) {
        Output out = session.out();
        out.line(Program.nameAndVersion() + " designs and checks line-synchronised thyristor firing circuits.");
        out.line(Caution.LINE);
        out.line("");
        out.line("Three next steps:");
        out.lines(new TextTable(out.spelling(), "  ")
                .column(Align.LEFT, "")
                .column(Align.LEFT, "")
                .row("clipramp new --out=my.yaml", "a commented design to start from")
                .row("clipramp check my.yaml", "does it fire, what does the load get, what fails")
                .row(
                        session.launcher().isPresent()
                                ? "clipramp desk my.yaml"
                                : "clipramp record my.yaml --out=my.pdf",
                        session.launcher().isPresent() ? "the same with a knob to turn" : "the design record as PDF")
                .lines());
        out.line("");
        out.line("All commands: clipramp --help");
    }

    static void print(Session session) {
        Output out = session.out();
        out.line("Usage: clipramp COMMAND [OPTIONS]");
        out.line("");
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.LEFT, "")
                .column(Align.LEFT, "")
                .column(Align.LEFT, "");
        Commands.of(session).forEach(c -> table.row(c.name(), c.arguments(), c.does()));
        out.lines(table.lines());
        out.line("");
        out.line("  clipramp COMMAND --help    every option of a command");
        out.line("  clipramp --version         the program's version");
        out.line("");
        out.lines(Paragraph.wrap(
                "FILE may be - for standard input. Answers go to standard output, complaints to standard error. Every"
                        + " command takes --ascii (ohm, u, deg instead of signs).",
                ""));
        out.lines(Paragraph.wrap("Exit codes: " + ExitCode.IN_WORDS, ""));
        out.line("");
        out.line(Caution.LINE);
    }
}
