package clipramp.cli;

import clipramp.files.LoadedDesign;
import clipramp.margins.Note;
import clipramp.margins.Verdict;
import clipramp.spread.DrawLaw;
import clipramp.spread.Spread;
import clipramp.spread.SpreadOptions;
import clipramp.spread.SpreadResult;
import clipramp.spread.SpreadWords;
import clipramp.spread.Yield;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Tolerances and temperature: what the next thousand units do. */
@Command(
        name = "spread",
        sortOptions = false,
        sortSynopsis = false,
        description = {
            "Draws units within every tolerance, data-sheet limit, line and temperature of the design: firing angle and"
                    + " power by knob position, yield, worst case, what matters most and what would help.",
            "Exit code 1 when a drawn unit misses what is wanted or fails a margin."
        })
final class SpreadCommand extends Analysis {

    @Option(
            names = "--samples",
            paramLabel = "N",
            order = 10,
            description = "how many units to draw; " + SpreadOptions.USUAL_SAMPLES + " unless said")
    @Nullable
    String samples;

    @Option(
            names = "--seed",
            paramLabel = "N",
            order = 11,
            description = "which units; the same seed gives the same answer; 1 unless said")
    @Nullable
    String seed;

    @Option(
            names = "--law",
            paramLabel = "LAW",
            order = 12,
            description = "how parts lie within their tolerance: normal (cut at it), uniform or triangular")
    @Nullable
    String law;

    @Option(
            names = "--judged",
            paramLabel = "N",
            order = 13,
            description =
                    "how many of the units are judged by every margin; " + SpreadOptions.USUAL_JUDGED + " unless said")
    @Nullable
    String judged;

    @Mixin
    FormOptions form = new FormOptions();

    SpreadCommand(Session session) {
        super(session);
    }

    @Override
    public Integer call() {
        form.require();
        SpreadOptions options = options();
        LoadedDesign loaded = design.load(session);
        SpreadWatch watch = new SpreadWatch(session);
        try {
            SpreadResult result = Spread.run(design.held(loaded.design()), options, watch);
            watch.clear();
            if (result.units() > 0) {
                form.plot().ifPresent(name -> Outputs.spreadPlot(name, result));
            }
            answer(loaded, result);
            session.out().flush();
            return result.isComplete() ? code(result) : ExitCode.INTERRUPTED;
        } finally {
            watch.close();
        }
    }

    private SpreadOptions options() {
        SpreadOptions usual = SpreadOptions.DEFAULT;
        List<String> laws = Arrays.stream(DrawLaw.values()).map(DrawLaw::word).toList();
        return new SpreadOptions(
                samples == null ? usual.samples() : Problems.whole("--samples", samples, 1, SpreadOptions.MOST_SAMPLES),
                seed == null ? usual.seed() : Problems.whole("--seed", seed, 0, SpreadOptions.HIGHEST_SEED),
                law == null ? usual.law() : DrawLaw.values()[laws.indexOf(Problems.word("--law", law, laws))],
                judged == null ? usual.judged() : Problems.whole("--judged", judged, 0, SpreadOptions.MOST_SAMPLES));
    }

    private void answer(LoadedDesign loaded, SpreadResult result) {
        List<Note> notes = notes(result);
        if (form.json()) {
            session.out().exactly(SpreadJson.of(loaded, result, verdict(result), notes, session.ascii()));
        } else if (form.csv()) {
            session.out().exactly(SpreadCsv.of(result));
            notes.forEach(note -> session.err().line(note.text()));
        } else {
            new SpreadText(session.out(), loaded, result, notes).print();
        }
    }

    private static List<Note> notes(SpreadResult result) {
        List<Note> notes = new ArrayList<>();
        if (!result.isComplete()) {
            notes.add(new Note(
                    "interrupted",
                    "Interrupted: " + result.units() + " of " + result.options().samples()
                            + " units were drawn; the answer is of those."));
        }
        notes.add(new Note("laws", SpreadWords.laws(result.options().law())));
        return notes;
    }

    /** The worst that was seen of a drawn unit. */
    private static Verdict verdict(SpreadResult result) {
        return everyUnit(result.wanted()) && everyUnit(result.margins()) ? Verdict.HOLDS : Verdict.FAILS;
    }

    private static boolean everyUnit(Optional<Yield> yield) {
        return yield.map(y -> y.held() == y.of()).orElse(true);
    }

    private static int code(SpreadResult result) {
        return verdict(result) == Verdict.FAILS ? ExitCode.FAILS : ExitCode.ANSWERED;
    }
}
