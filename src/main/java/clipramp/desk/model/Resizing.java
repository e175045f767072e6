package clipramp.desk.model;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.desk.model.LongRun.Telling;
import clipramp.files.DesignText;
import clipramp.files.InvalidInputException;
import clipramp.files.PartialDesign;
import clipramp.files.ProfileLibrary;
import clipramp.files.SizedText;
import clipramp.files.Source;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import clipramp.runs.Watch;
import clipramp.sizing.Compensation;
import clipramp.sizing.KnobShape;
import clipramp.sizing.KnobShaping;
import clipramp.sizing.OpenPart;
import clipramp.sizing.Reason;
import clipramp.sizing.Reasons;
import clipramp.sizing.Sizing;
import clipramp.sizing.SizingAnswer;
import clipramp.sizing.SizingRequest;
import clipramp.units.PreferredSeries;
import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/** From what is wanted to a design: the search for values, the straight knob, the steady angle. */
public final class Resizing {
    /** What is looked for. */
    public enum Goal {
        /** Values that hold and reach what is wanted. */
        PARTS,
        /** A knob that power follows in a straight line. */
        STRAIGHT_POWER,
        /** A knob that light follows in a straight line. */
        STRAIGHT_LIGHT,
        /** A firing angle that temperature moves least. */
        STEADY
    }

    /**
     * What is looked for, and among what.
     *
     * @param source the design, or as much of it as there is
     * @param file where it lies, for profiles beside it
     * @param before the design as it stands; empty for a new one
     * @param goal what is looked for
     * @param free parts that may be chosen; all others stay
     * @param series preferred values of resistors
     */
    public record Asked(
            Source source,
            Optional<Path> file,
            Optional<Sheet> before,
            Goal goal,
            Set<OpenPart> free,
            PreferredSeries series) {
        /** A new design: every part is free. */
        public static Asked fresh(String text) {
            return new Asked(
                    new Source(NEW_NAME, text),
                    Optional.empty(),
                    Optional.empty(),
                    Goal.PARTS,
                    EnumSet.allOf(OpenPart.class),
                    PreferredSeries.E24);
        }

        /** The design as it stands, some of its parts free. */
        public static Asked of(
                Sheet sheet, Optional<Path> file, Goal goal, Set<OpenPart> free, PreferredSeries series) {
            Source source = new Source(sheet.text().name(), sheet.text().text());
            return new Asked(source, file, Optional.of(sheet), goal, free, series);
        }
    }

    /** What a design is called that was never saved. */
    public static final String NEW_NAME = "new-design.yaml";

    private final Workshop workshop;

    /**
     * @param workshop where profiles are found
     */
    Resizing(Workshop workshop) {
        this.workshop = workshop;
    }

    /**
     * Searches; seconds.
     *
     * @throws InvalidInputException where the design does not read
     * @throws IllegalArgumentException where there is nothing to look for, in words
     */
    Resized of(Asked asked, Telling telling) {
        ProfileLibrary library = workshop.library(asked.file());
        Set<OpenPart> kept = EnumSet.allOf(OpenPart.class);
        kept.removeAll(asked.free());
        PartialDesign partial = PartialDesign.read(asked.source(), asked.free(), kept, library);
        SizingRequest request = partial.request(library, asked.series());
        return switch (asked.goal()) {
            case PARTS -> parts(asked, partial, request, telling);
            case STRAIGHT_POWER -> straight(asked, partial, request, KnobShape.What.POWER, telling);
            case STRAIGHT_LIGHT -> straight(asked, partial, request, KnobShape.What.LIGHT, telling);
            case STEADY -> steady(asked, partial, request, telling);
        };
    }

    private Resized parts(Asked asked, PartialDesign partial, SizingRequest request, Telling telling) {
        if (partial.open().isEmpty()) {
            throw new IllegalArgumentException(
                    "No part is free, so there is nothing to choose. Tick those that may change.");
        }
        SizingAnswer answer = Sizing.propose(request, telling.of(Resizing::candidates));
        return finished(asked, partial, request, answer, telling);
    }

    private static String candidates(int done, int of) {
        return done + (done == 1 ? " design" : " designs") + " judged, " + of + " at most";
    }

    private Resized finished(
            Asked asked, PartialDesign partial, SizingRequest request, SizingAnswer answer, Telling telling) {
        List<Reason> reasons = Reasons.of(
                request, answer, telling.of((done, of) -> "Trying the neighbours of part " + (done + 1) + " of " + of));
        return new Resized(
                asked,
                read(written(asked, partial, answer.design()), asked),
                judged(asked),
                answer,
                reasons,
                partial.notes(),
                Optional.empty(),
                Optional.empty());
    }

    /** The design's text; a part that comes out as it was keeps its author's spelling. */
    private static DesignText written(Asked asked, PartialDesign partial, Design design) {
        Set<OpenPart> moved = EnumSet.noneOf(OpenPart.class);
        for (OpenPart part : partial.open()) {
            Optional<String> before = asked.before().flatMap(sheet -> SizedText.value(part, sheet.design()));
            if (!before.equals(SizedText.value(part, design))) {
                moved.add(part);
            }
        }
        DesignText text = SizedText.of(partial.text(), moved, design);
        for (OpenPart part : moved) {
            if (SizedText.value(part, design).isEmpty()
                    && text.valueAt(part.key()).isPresent()) {
                text = text.without(part.key());
            }
        }
        return text;
    }

    private Sheet read(DesignText text, Asked asked) {
        return workshop.read(text, asked.file());
    }

    private static Optional<Check> judged(Asked asked) {
        return asked.before().map(sheet -> Judge.check(sheet.design(), OptionalDouble.empty(), OptionalDouble.empty()));
    }

    private Resized straight(
            Asked asked, PartialDesign partial, SizingRequest request, KnobShape.What what, Telling telling) {
        Design now = partial.loaded().design();
        if (now.ramp().pot().isEmpty()) {
            throw new IllegalArgumentException("The ramp is fixed (ramp.pot: none), so there is no knob to shape.");
        }
        KnobShape before = KnobShape.of(now, what);
        KnobShape after = KnobShaping.straightest(
                request, now, what, telling.of((done, of) -> done + " of " + of + " knobs drawn"));
        SizingAnswer answer = Sizing.judge(request, after.design());
        DesignText text = SizedText.withPot(written(asked, partial, answer.design()), answer.design());
        return new Resized(
                asked,
                read(text, asked),
                judged(asked),
                answer,
                List.of(),
                partial.notes(),
                Optional.of(new Resized.Knobs(before, after)),
                Optional.empty());
    }

    private Resized steady(Asked asked, PartialDesign partial, SizingRequest request, Telling telling) {
        Design now = partial.loaded().design();
        if (!(now.trigger() instanceof UnijunctionTrigger trigger)) {
            throw new IllegalArgumentException(
                    "A programmable device has no base two, so there is no such resistor to choose.");
        }
        Watch watch = telling.of((done, of) -> "Solving the firing angle from the coldest to the hottest");
        watch.progress(0, 0);
        Compensation found = Compensation.of(now).orElseThrow();
        double ohms = asked.series().nearest(found.flattest().ohms());
        Part part = trigger.baseTwo();
        Part chosen = new Part(ohms, part.tolerance(), part.ratedWatts(), part.ratedVolts());
        Design design = now.withTrigger(new UnijunctionTrigger(trigger.device(), trigger.baseOne(), chosen));
        SizingAnswer answer = Sizing.judge(request, design);
        return new Resized(
                asked,
                read(SizedText.of(partial.text(), EnumSet.of(OpenPart.BASE_TWO), answer.design()), asked),
                judged(asked),
                answer,
                List.of(),
                partial.notes(),
                Optional.empty(),
                Optional.of(new Resized.Steadied(
                        found,
                        part.value(),
                        Compensation.driftRad(now),
                        ohms,
                        Compensation.driftRad(answer.design()))));
    }
}
