package clipramp.cli;

import clipramp.cli.Substitutes.Substitute;
import clipramp.cli.TextTable.Align;
import clipramp.files.DesignFiles;
import clipramp.files.LoadedDesign;
import clipramp.files.Profile;
import clipramp.files.ProfileLibrary;
import clipramp.files.ProfileLibrary.Found;
import clipramp.files.Source;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Lists the profiles, or shows one with its sources. */
@Command(
        name = "parts",
        sortOptions = false,
        sortSynopsis = false,
        description = {
            "Lists the profiles; with an ID, shows that one with the source of every figure.",
            "With --for, puts every trigger device and thyristor in the design's place and judges each; a trigger device"
                    + " of the other kind comes with the divider, or the base-two resistor, that it wants."
        })
final class PartsCommand implements Callable<Integer> {
    private final Session session;

    @Mixin
    StandardOptions standard = new StandardOptions();

    @Mixin
    ProfileOptions profiles = new ProfileOptions();

    @Option(names = "--json", order = 11, description = "the answer for machines")
    boolean json;

    @Option(
            names = "--for",
            paramLabel = "FILE",
            order = 8,
            description = "judge what could stand in this design's place for its trigger device and thyristor")
    @Nullable
    String design;

    @Parameters(paramLabel = "ID", arity = "0..1", description = "a profile's id, such as 2n2646")
    @Nullable
    String id;

    PartsCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        boolean shippedOnly = profiles.shippedOnly();
        if (design != null) {
            substitutes(design, shippedOnly);
            return ExitCode.ANSWERED;
        }
        ProfileLibrary library = Inputs.library(session, Optional.empty(), shippedOnly);
        List<Found> found = id == null ? library.all() : library.named(id);
        if (id != null && found.isEmpty()) {
            throw Problems.unknown(
                    "parts",
                    id,
                    "is no profile",
                    library.all().stream().map(Found::id).toList());
        }
        if (json) {
            session.out().exactly(json(found));
        } else if (id == null) {
            list(found);
        } else {
            found.forEach(this::show);
        }
        return ExitCode.ANSWERED;
    }

    private void substitutes(String file, boolean shippedOnly) {
        ProfileLibrary library = Inputs.libraryOf(session, file, shippedOnly);
        Source source = Inputs.source(session, file);
        LoadedDesign loaded = DesignFiles.load(source, List.of(), library);
        List<Substitute> found = Substitutes.of(loaded, source, library);
        if (json) {
            session.out().exactly(SubstitutesText.json(loaded, found, session.ascii()));
        } else {
            SubstitutesText.print(session.out(), loaded, found);
        }
    }

    private void list(List<Found> found) {
        TextTable table = new TextTable(session.out().spelling(), "")
                .column(Align.LEFT, "id")
                .column(Align.LEFT, "kind")
                .column(Align.LEFT, "from");
        found.forEach(f -> table.row(f.id(), f.kind(), f.from()));
        session.out().lines(table.lines());
        session.out().line("");
        session.out().line("One of them with its sources: clipramp parts ID");
    }

    private void show(Found found) {
        Output out = session.out();
        Profile profile = Profile.read(found);
        String like = profile.like().isEmpty() ? "" : ", like " + profile.like();
        out.strongLine(profile.id(), "  " + profile.kind() + ", from " + profile.from() + like);
        TextTable table =
                new TextTable(out.spelling(), "  ").column(Align.LEFT, "").column(Align.LEFT, "");
        profile.figures().forEach(figure -> table.row(figure.key(), figure.text()));
        out.lines(table.lines());
        out.line("Sources");
        profile.figures().stream()
                .collect(Collectors.groupingBy(
                        Profile.Figure::source,
                        LinkedHashMap::new,
                        Collectors.mapping(Profile.Figure::key, Collectors.joining(", "))))
                .forEach((source, keys) -> out.lines(Paragraph.wrap(keys + ": " + source, "  ", "    ")));
    }

    private String json(List<Found> found) {
        return Answer.without("parts")
                .json(
                        session.ascii(),
                        body -> body.putObjects("parts", found, (part, f) -> {
                            part.put("id", f.id()).put("kind", f.kind()).put("from", f.from());
                            if (id != null) {
                                writeFigures(part, Profile.read(f));
                            }
                        }));
    }

    private static void writeFigures(Json part, Profile profile) {
        part.put("digest", profile.digest())
                .put("like", profile.like())
                .putObjects(
                        "figures",
                        profile.figures(),
                        (json, figure) -> json.put("key", figure.key())
                                .put("value", figure.text())
                                .put("source", figure.source()));
    }
}
