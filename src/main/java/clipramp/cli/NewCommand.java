package clipramp.cli;

import clipramp.files.Example;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Writes a commented design to start from. */
@Command(
        name = "new",
        sortOptions = false,
        sortSynopsis = false,
        description = "Writes a commented design to start from.",
        footer = {
            "",
            "Examples: drying-cabinet, shed-heater, upper-heaters, seed-drawer, tray-lamp, tray-lamp-programmable,"
                    + " store-fan, tasting-lamps; and two that fail on purpose: store-fan-narrow-pulse and cabinet-gone-wrong."
        })
final class NewCommand implements Callable<Integer> {
    private final Session session;

    @Mixin
    StandardOptions standard = new StandardOptions();

    @Option(
            names = "--out",
            paramLabel = "FILE",
            required = true,
            order = 10,
            description = "the design file to write; - for standard output")
    String out = "";

    @Option(
            names = "--from",
            paramLabel = "EXAMPLE",
            order = 11,
            description = "drying-cabinet unless said; all of them stand below")
    String from = Example.all().get(0).id();

    @Option(names = "--replace", order = 12, description = "write over a file that is there")
    boolean replace;

    @Option(names = "--json", order = 13, description = "the answer for machines")
    boolean json;

    NewCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        List<String> known = Example.all().stream().map(Example::id).toList();
        Example example = Example.named(Problems.word("--from", from, known)).orElseThrow();
        String text = example.text();
        if (out.equals(Outputs.STANDARD_OUTPUT)) {
            session.out().exactly(text);
            return ExitCode.ANSWERED;
        }
        Outputs.write(out, text, replace);
        if (json) {
            session.out()
                    .exactly(Answer.without("new")
                            .json(
                                    session.ascii(),
                                    body -> body.put("written", out).put("example", example.id())));
        } else {
            session.out().line("Written: " + out + ", from the example " + example.id() + ": " + example.about() + ".");
            session.out().line("Next: clipramp check " + out);
        }
        return ExitCode.ANSWERED;
    }
}
