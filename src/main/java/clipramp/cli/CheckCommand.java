package clipramp.cli;

import clipramp.files.LoadedDesign;
import clipramp.margins.Check;
import clipramp.margins.Verdict;
import clipramp.record.PageSize;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Solves a design and judges it. */
@Command(
        name = "check",
        sortOptions = false,
        sortSynopsis = false,
        description = {
            "Solves a design and judges it: margins worst first, knob table, pulse and supply.",
            "Exit code 1 when a margin fails; with --strict also when one is tight or not judged."
        })
final class CheckCommand extends Analysis {
    @Option(names = "--json", order = 10, description = "the answer for machines")
    boolean json;

    @Option(names = "--strict", order = 11, description = "tight and not judged count as failing")
    boolean strict;

    @Option(names = "--record", paramLabel = "OUT.pdf", order = 12, description = "also write the design record as PDF")
    @Nullable
    String record;

    @Option(
            names = "--plot",
            paramLabel = "OUT",
            order = 13,
            description = "also draw the line current's harmonics into OUT.svg or OUT.png")
    @Nullable
    String plot;

    CheckCommand(Session session) {
        super(session);
    }

    @Override
    public Integer call() {
        if (plot != null) {
            Outputs.requirePlot(plot);
        }
        if (record != null) {
            Outputs.requireRecord(record);
        }
        LoadedDesign loaded = design.load(session);
        Check check = design.check(loaded);
        if (json) {
            session.out().exactly(CheckJson.of(loaded, check, session.ascii()));
        } else {
            new CheckText(session.out(), loaded, check).print();
        }
        if (record != null) {
            Outputs.record(record, loaded, check, design.library(session), PageSize.A4, Optional.empty());
        }
        Optional.ofNullable(plot)
                .ifPresent(name -> Outputs.linePlot(name, check.lineCurrent().orElseThrow()));
        if (!json) {
            session.out().written("Record", Optional.ofNullable(record));
            session.out().written("Plot", Optional.ofNullable(plot));
        }
        return code(check);
    }

    private int code(Check check) {
        boolean open = check.verdict() != Verdict.HOLDS
                || check.margins().stream().anyMatch(m -> m.verdict() != Verdict.HOLDS);
        return check.verdict() == Verdict.FAILS || (strict && open) ? ExitCode.FAILS : ExitCode.ANSWERED;
    }
}
