package clipramp.cli;

import clipramp.cli.TextTable.Align;
import clipramp.files.Key;
import clipramp.files.KeyCatalogue;
import clipramp.files.Licences;
import clipramp.files.Nearest;
import clipramp.margins.MarginKind;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Tells what a design key or a margin means. */
@Command(
        name = "explain",
        sortOptions = false,
        sortSynopsis = false,
        description = {
            "Tells what a design key (ramp.capacitor, standoff) or a margin (gate-peak-current) means.",
            "explain safety prints the cautions, explain licences who made what under which licence."
        })
final class ExplainCommand implements Callable<Integer> {
    private static final String SAFETY = "safety";
    private static final String LICENCES = "licences";
    private static final int SUGGESTIONS = 3;

    private final Session session;

    @Mixin
    StandardOptions standard = new StandardOptions();

    @Option(names = "--json", order = 10, description = "the answer for machines")
    boolean json;

    @Parameters(paramLabel = "KEY", description = "a design key, a margin, safety or licences")
    String words = "";

    ExplainCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        if (words.equals(SAFETY)) {
            if (json) {
                session.out()
                        .exactly(Answer.without("explain").json(session.ascii(), j -> j.put("safety", Caution.text())));
            } else {
                session.out().lines(Caution.lines());
            }
            return ExitCode.ANSWERED;
        }
        if (words.equals(LICENCES) || Licences.ids().contains(words)) {
            licences();
            return ExitCode.ANSWERED;
        }
        Optional<MarginKind> margin = MarginKind.byId(words);
        List<Key> keys = KeyCatalogue.standard().meant(words);
        if (margin.isEmpty() && keys.isEmpty()) {
            throw unknown();
        }
        if (json) {
            session.out().exactly(json(margin, keys));
        } else {
            print(margin, keys);
        }
        return ExitCode.ANSWERED;
    }

    /** Who is licensed how, or one full text. */
    private void licences() {
        String text = words.equals(LICENCES) ? Licences.overview() : Licences.text(words);
        if (json) {
            session.out().exactly(Answer.without("explain").json(session.ascii(), j -> j.put("licences", text)));
        } else if (words.equals(LICENCES)) {
            session.out().lines(Caution.lines(text.replace("`", "")));
            session.out()
                    .lines(Paragraph.wrap(
                            "Full texts: clipramp explain " + String.join(", ", Licences.ids()) + ".", ""));
        } else {
            session.out().exactly(text);
        }
    }

    /** Everything that can be explained by name. */
    static List<String> known() {
        return Stream.of(
                        KeyCatalogue.standard().all().stream().map(Key::path),
                        Arrays.stream(MarginKind.values()).map(MarginKind::id),
                        Stream.of(SAFETY, LICENCES),
                        Licences.ids().stream())
                .flatMap(names -> names)
                .toList();
    }

    private RuntimeException unknown() {
        List<String> near = Nearest.several(words, known(), SUGGESTIONS);
        return Problems.unknown("explain", words, "is neither a key nor a margin", near);
    }

    private void print(Optional<MarginKind> margin, List<Key> keys) {
        Output out = session.out();
        List<List<String>> parts = new ArrayList<>();
        margin.ifPresent(kind -> parts.add(MarginText.explained(kind, out.spelling())));
        keys.forEach(key -> parts.add(explained(key, out.spelling())));
        for (int i = 0; i < parts.size(); i++) {
            if (i > 0) {
                out.line("");
            }
            out.lines(parts.get(i));
        }
    }

    private static List<String> explained(Key key, Spelling spelling) {
        List<String> lines = new ArrayList<>();
        lines.add(key.path());
        lines.addAll(Paragraph.wrap(key.meaning(), "  "));
        TextTable table = new TextTable(spelling, "  ").column(Align.LEFT, "").column(Align.LEFT, "");
        table.row("takes", key.kind().inWords());
        if (!key.range().equals(key.kind().inWords())) {
            table.row("range", key.range());
        }
        if (!key.unitSymbol().isEmpty()) {
            table.row("unit", key.unitSymbol());
        }
        table.row("default", key.standardInWords());
        if (!key.neededBy().isEmpty()) {
            table.row("needed by", key.neededBy());
        }
        lines.addAll(table.lines());
        return lines;
    }

    private String json(Optional<MarginKind> margin, List<Key> keys) {
        return Answer.without("explain")
                .json(
                        session.ascii(),
                        body -> body.putObjects(
                                        "keys",
                                        keys,
                                        (j, key) -> j.put("path", key.path())
                                                .put("takes", key.kind().inWords())
                                                .put("unit", key.unitSymbol())
                                                .put("range", key.range())
                                                .put("default", key.standardInWords())
                                                .put("neededBy", key.neededBy())
                                                .put("meaning", key.meaning()))
                                .putObjects("margins", margin.stream().toList(), MarginText::write));
    }
}
