package clipramp.cli;

import clipramp.files.DesignText;
import clipramp.files.LoadedDesign;
import clipramp.files.PartialDesign;
import clipramp.files.ProfileLibrary;
import clipramp.files.SizedText;
import clipramp.files.Source;
import clipramp.sizing.Compensation;
import clipramp.sizing.KnobShape;
import clipramp.sizing.KnobShaping;
import clipramp.sizing.OpenPart;
import clipramp.sizing.Reasons;
import clipramp.sizing.Sizing;
import clipramp.sizing.SizingAnswer;
import clipramp.sizing.SizingRequest;
import clipramp.units.PreferredSeries;
import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** From what is wanted to preferred values. */
@Command(
        name = "size",
        sortOptions = false,
        sortSynopsis = false,
        description = {
            "Chooses every part that FILE does not give, from what it wants of the knob.",
            "Exit code 1 when nothing holds; then the nearest design is shown, and what it cannot meet."
        })
final class SizeCommand implements Callable<Integer> {
    private final Session session;

    @Mixin
    StandardOptions standard = new StandardOptions();

    @Parameters(
            paramLabel = "FILE",
            description =
                    "design file: line, stage, load, wanted, and the parts that are decided; - for standard input")
    String file = "";

    @Option(
            names = "--free",
            paramLabel = "PARTS",
            split = ",",
            order = 5,
            description =
                    "choose these too although FILE gives them: clip, ramp, trigger, bases, gate, thyristor, or keys")
    List<String> free = List.of();

    @Option(
            names = "--keep",
            paramLabel = "PARTS",
            split = ",",
            order = 6,
            description = "leave these as they are, or at the start that they are filled in with")
    List<String> keep = List.of();

    @Option(
            names = "--series",
            paramLabel = "SERIES",
            order = 7,
            description = "preferred values of resistors: E3, E6, E12, E24 (unless said), E48, E96, E192")
    String series = PreferredSeries.E24.name();

    @Option(
            names = "--shape",
            paramLabel = "WHAT",
            order = 8,
            description = "power or light: choose the pot's law and a resistor across it so that this follows the knob")
    @Nullable
    String shape;

    @Option(
            names = "--compensate",
            order = 8,
            description = "choose base two's resistor for the flattest firing angle against temperature, beside what"
                    + " the published rules would leave")
    boolean compensate;

    @Option(
            names = "--with",
            paramLabel = "KEY=VALUE",
            order = 8,
            description = "set a value of the design before sizing; may be repeated")
    List<String> settings = List.of();

    @Mixin
    ProfileOptions profiles = new ProfileOptions();

    @Option(names = "--out", paramLabel = "OUT", order = 10, description = "the design file to write")
    @Nullable
    String out;

    @Option(names = "--replace", order = 11, description = "write over a file that is there")
    boolean replace;

    @Option(names = "--json", order = 12, description = "the answer for machines")
    boolean json;

    SizeCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        if (out != null) {
            Outputs.requirePlace(out, replace);
        }
        boolean shippedOnly = profiles.shippedOnly();
        ProfileLibrary library = Inputs.libraryOf(session, file, shippedOnly);
        PartialDesign partial = PartialDesign.read(source(), named("--free", free), kept(), library);
        SizingRequest request = partial.request(library, series());
        SizingAnswer answer = compensate ? Sizing.proposeCompensated(request) : Sizing.propose(request);
        Optional<KnobShape> shaped = shaped(request, answer);
        if (shaped.isPresent()) {
            answer = Sizing.judge(request, shaped.get().design());
        }
        SizedResult result = new SizedResult(
                answer,
                Reasons.of(request, answer),
                shaped,
                compensate ? Compensation.of(answer.design()) : Optional.empty());
        DesignText text = SizedText.of(partial, answer.design());
        text = shaped.isPresent() ? SizedText.withPot(text, answer.design()) : text;
        if (out != null) {
            Outputs.write(out, text.text(), replace);
        }
        LoadedDesign loaded = loaded(text, library);
        if (json) {
            session.out().exactly(SizeJson.of(loaded, partial, result, text, session.ascii()));
        } else {
            new SizeText(session.out(), loaded, partial, result).print(text, out);
        }
        return answer.holds() ? ExitCode.ANSWERED : ExitCode.FAILS;
    }

    private Set<OpenPart> kept() {
        Set<OpenPart> kept = EnumSet.noneOf(OpenPart.class);
        kept.addAll(named("--keep", keep));
        if (shape != null) {
            // A straight knob wants the law and the resistor across the pot for itself.
            kept.addAll(EnumSet.of(OpenPart.LAW, OpenPart.ACROSS, OpenPart.TRIM_HIGH, OpenPart.TRIM_LOW));
        }
        return kept;
    }

    private Optional<KnobShape> shaped(SizingRequest request, SizingAnswer answer) {
        if (shape == null) {
            return Optional.empty();
        }
        List<String> known = List.of("power", "light");
        KnobShape.What what = KnobShape.What.values()[known.indexOf(Problems.word("--shape", shape, known))];
        return Optional.of(KnobShaping.straightest(request, answer.design(), what));
    }

    private Source source() {
        Source source = Inputs.source(session, file);
        DesignText text = DesignText.of(source);
        for (String setting : settings) {
            int equals = setting.indexOf('=');
            if (equals <= 0 || equals == setting.length() - 1) {
                throw Problems.refused(
                        "--with", "read \"" + setting + "\"; expected key=value, such as ramp.capacitor=220 nF.");
            }
            text = text.withOption(
                    setting.substring(0, equals).strip(),
                    setting.substring(equals + 1).strip());
        }
        return new Source(text.name(), text.text());
    }

    private static LoadedDesign loaded(DesignText text, ProfileLibrary library) {
        if (text.read(library) instanceof DesignText.Reading.Good good) {
            return good.loaded();
        }
        throw new IllegalStateException("a sized design does not read");
    }

    private static Set<OpenPart> named(String option, List<String> words) {
        Set<OpenPart> parts = EnumSet.noneOf(OpenPart.class);
        for (String word : words) {
            parts.addAll(OpenPart.named(word.strip())
                    .orElseThrow(() ->
                            Problems.unknown(option, word.strip(), "is no part that size chooses", OpenPart.words())));
        }
        return parts;
    }

    private PreferredSeries series() {
        List<String> known =
                Arrays.stream(PreferredSeries.values()).map(Enum::name).toList();
        return PreferredSeries.valueOf(Problems.word("--series", series, known));
    }
}
