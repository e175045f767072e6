package clipramp.cli;

import clipramp.files.LoadedDesign;
import clipramp.margins.Check;
import clipramp.record.PageSize;
import clipramp.spread.Spread;
import clipramp.spread.SpreadOptions;
import clipramp.spread.SpreadResult;
import java.util.Optional;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Writes the design record. */
@Command(
        name = "record",
        sortOptions = false,
        sortSynopsis = false,
        description = "Writes the design record as PDF. A failing design gets its record too, marked.")
final class RecordCommand extends Analysis {
    @Option(
            names = "--out",
            paramLabel = "OUT.pdf",
            required = true,
            order = 10,
            description = "the PDF to write; an older one is replaced")
    String out = "";

    @Option(names = "--paper", paramLabel = "SIZE", order = 11, description = "a4 or letter; a4 unless said")
    String paper = "a4";

    @Option(
            names = "--spread",
            order = 12,
            description = "with a page on what " + SpreadOptions.USUAL_SAMPLES + " units do within their tolerances")
    boolean spread;

    @Option(names = "--json", order = 13, description = "the answer for machines")
    boolean json;

    RecordCommand(Session session) {
        super(session);
    }

    private Optional<SpreadResult> drawn(LoadedDesign loaded) {
        if (!spread) {
            return Optional.empty();
        }
        try (SpreadWatch watch = new SpreadWatch(session)) {
            SpreadResult result = Spread.run(loaded.design(), SpreadOptions.DEFAULT, watch);
            watch.clear();
            return Optional.of(result);
        }
    }

    @Override
    public Integer call() {
        Outputs.requireRecord(out);
        PageSize size = Outputs.paper(paper);
        LoadedDesign loaded = design.load(session);
        Check check = design.check(loaded);
        Outputs.record(out, loaded, check, design.library(session), size, drawn(loaded));
        if (json) {
            session.out()
                    .exactly(Answer.about("record", loaded, check.verdict(), check.notes())
                            .json(session.ascii(), body -> {
                                Answer.titleAndCondition(body, loaded, check.condition());
                                body.put("record", out).put("paper", paper);
                            }));
        } else {
            session.out().line("Record: " + out);
            CheckText.marked(session.out(), check);
        }
        return ExitCode.ANSWERED;
    }
}
