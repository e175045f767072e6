package clipramp.files;

import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.circuit.Wanted;
import clipramp.circuit.Wanted.Goal;
import clipramp.files.DesignText.Reading;
import clipramp.sizing.OpenPart;
import clipramp.sizing.SizingRequest;
import clipramp.units.PreferredSeries;
import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/**
 * A design file that may lack parts, which are then open to be chosen. What is missing is filled in with a start that is
 * sound for the stage, so that the usual reader reads it; what somebody wrote is refused as always, at its own place.
 *
 * @param text the text with every missing part filled in
 * @param loaded the same, read
 * @param open keys that were missing, or freed
 * @param notes what was taken for granted
 */
public record PartialDesign(DesignText text, LoadedDesign loaded, Set<OpenPart> open, List<String> notes) {
    /** Under this a supply across the thyristor drives no gate (found by sizing 24 V requests). */
    private static final double LOW_LINE_VOLTS = 60;

    private static final String RESISTOR = "1 kΩ ±5 % 0.25 W";

    /** Puts the open parts in the order of the signal. */
    public PartialDesign {
        open = Collections.unmodifiableSet(new TreeSet<>(open));
        notes = List.copyOf(notes);
    }

    /**
     * Reads a request.
     *
     * @param source the file's name and text
     * @param free parts to choose although the file has them
     * @param keep parts that stay as they are filled in
     * @param library where profiles are found
     * @throws InvalidInputException with everything that is wrong but for missing parts
     */
    public static PartialDesign read(Source source, Set<OpenPart> free, Set<OpenPart> keep, ProfileLibrary library) {
        return new Filling(DesignText.of(source), library).read(free, keep);
    }

    /**
     * The request that it makes.
     *
     * @param library whose devices may be chosen
     * @param series preferred values
     */
    public SizingRequest request(ProfileLibrary library, PreferredSeries series) {
        return new SizingRequest(loaded.design(), open, new StockReader(text, library).read(open), series);
    }

    /** Fills a text in, key by key. */
    private static final class Filling {
        private final DesignText asWritten;
        private final ProfileLibrary library;
        private final Set<String> filled = new HashSet<>();
        private final Set<OpenPart> open = EnumSet.noneOf(OpenPart.class);
        private final List<String> notes = new ArrayList<>();
        private DesignText text;

        Filling(DesignText asWritten, ProfileLibrary library) {
            this.asWritten = asWritten;
            this.library = library;
            this.text = asWritten;
        }

        PartialDesign read(Set<OpenPart> free, Set<OpenPart> keep) {
            lowLine();
            clip();
            ramp();
            trigger();
            gate();
            thyristor();
            wanted();
            requireRest();
            LoadedDesign loaded = loaded();
            oneSided(loaded.design().wanted());
            boolean risesClockwise = isHighestFirst(loaded.design());
            if (risesClockwise && filled.contains("ramp.pot.sense")) {
                text = text.withValue("ramp.pot.sense", "rising");
                loaded = loaded();
            }
            open.addAll(free);
            open.removeAll(keep);
            open.removeIf(part -> text.valueAt(part.key()).isEmpty() && !isOptional(part));
            return new PartialDesign(text, loaded, open, notes);
        }

        private static boolean isOptional(OpenPart part) {
            return switch (part) {
                case SERIES, SHUNT, SINK, ACROSS, TRIM_HIGH, TRIM_LOW -> true;
                default -> false;
            };
        }

        private Optional<String> value(String key) {
            return text.valueAt(key).filter(v -> !v.isBlank());
        }

        private boolean fill(String key, String value) {
            if (value(key).isPresent()) {
                return false;
            }
            for (String path = key; !path.isEmpty(); path = parent(path)) {
                if (text.valueAt(path).isEmpty()) {
                    filled.add(path);
                }
            }
            text = text.withValue(key, value);
            return true;
        }

        private static String parent(String path) {
            return path.contains(".") ? path.substring(0, path.lastIndexOf('.')) : "";
        }

        private boolean fill(OpenPart part, String value) {
            boolean missing = fill(part.key(), value);
            if (missing) {
                open.add(part);
            }
            return missing;
        }

        /** A part that most designs do without; "none" keeps it out. */
        private void mayBeAdded(OpenPart part) {
            if (value(part.key()).isEmpty()) {
                open.add(part);
            }
        }

        private boolean isStage(Stage stage) {
            return value("stage").equals(Optional.of(stage.word()));
        }

        private boolean isIsolated() {
            return value("clip.winding").filter(w -> !w.equals("none")).isPresent();
        }

        /** Across the thyristor the supply is gone with the pulse's first instant, and a low one leaves the gate too little. */
        private void lowLine() {
            boolean stated =
                    value("clip.tap").isPresent() || value("gate.coupling").isPresent();
            if (!isStage(Stage.BRIDGE_AC) || isIsolated() || stated) {
                return;
            }
            new Filling(asWritten.withValue("clip.tap", "line").withValue("gate.coupling", "transformer"), library)
                    .lineVolts()
                    .filter(volts -> volts < LOW_LINE_VOLTS)
                    .ifPresent(volts -> {
                        fill("gate.coupling", "transformer");
                        notes.add("gate.coupling is not stated; taken as transformer, with the supply across the line:"
                                + " across the thyristor a line this low leaves the gate too little.");
                    });
        }

        /** Nominal line voltage; empty where the text has other problems, which are told later. */
        private Optional<Double> lineVolts() {
            clip();
            ramp();
            trigger();
            gate();
            thyristor();
            return text.read(library) instanceof Reading.Good good
                    ? Optional.of(good.loaded().design().line().volts())
                    : Optional.empty();
        }

        private void clip() {
            boolean transformer = value("gate.coupling").equals(Optional.of("transformer"));
            boolean acrossThyristor = isStage(Stage.BRIDGE_AC) && !isIsolated() && !transformer;
            fill("clip.tap", acrossThyristor ? "thyristor" : "line");
            fill(OpenPart.DROPPER, "10 kΩ ±5 % 12 W 500 V");
            fill(OpenPart.ZENER, library.ids("zener").stream().findFirst().orElse("none"));
        }

        private void ramp() {
            fill(OpenPart.CAPACITOR, "220 nF ±5 % 63 V");
            fill(OpenPart.FIXED, RESISTOR);
            if (!value("ramp.pot").equals(Optional.of("none"))) {
                boolean whole = value("ramp.pot").isEmpty();
                if (fill(OpenPart.TRACK, "25 kΩ ±10 % 0.5 W")) {
                    fill(OpenPart.LAW, "linear");
                }
                mayBeAdded(OpenPart.ACROSS);
                mayBeAdded(OpenPart.TRIM_HIGH);
                mayBeAdded(OpenPart.TRIM_LOW);
                if (whole) {
                    fill("ramp.pot.sense", "falling");
                }
            }
        }

        private void trigger() {
            boolean divider =
                    value("trigger.upper").isPresent() || value("trigger.lower").isPresent();
            fill(OpenPart.TRIGGER_DEVICE, first(divider ? "programmable-unijunction" : "unijunction"));
            boolean programmable = divider
                    || value("trigger.device")
                            .filter(id ->
                                    library.find("programmable-unijunction", id).isPresent())
                            .isPresent();
            fill(OpenPart.BASE_ONE, "33 Ω ±5 % 0.25 W");
            if (programmable) {
                fill(OpenPart.UPPER, RESISTOR);
                fill(OpenPart.LOWER, "1.5 kΩ ±5 % 0.25 W");
            } else {
                fill(OpenPart.BASE_TWO, "470 Ω ±5 % 0.25 W");
            }
        }

        private String first(String kind) {
            return library.ids(kind).stream().findFirst().orElse("none");
        }

        private void gate() {
            boolean twin = isStage(Stage.INVERSE_PARALLEL);
            boolean transformer = twin || (isStage(Stage.TRIAC) && !isIsolated());
            fill("gate.coupling", transformer ? "transformer" : "direct");
            if (value("gate.coupling").equals(Optional.of("transformer"))) {
                fill(
                        OpenPart.TRANSFORMER,
                        "{ratio: 1, secondaries: " + (twin ? 2 : 1)
                                + ", magnetising: 2 mH, primary-resistance: 0.5 ohm, secondary-resistance: 0.5 ohm,"
                                + " clamp: diode, volt-seconds: 250 uVs}");
            }
            fill(OpenPart.SERIES, "0 Ω");
            fill(OpenPart.SHUNT, RESISTOR);
        }

        private void thyristor() {
            fill(OpenPart.THYRISTOR, first(isStage(Stage.TRIAC) ? "triac" : "scr"));
            fill(OpenPart.SINK, "4 K/W");
        }

        private void wanted() {
            boolean half = isStage(Stage.HALF_WAVE);
            want("wanted.lowest", "5 % at 0 %");
            want("wanted.highest", half ? "45 % at 100 %" : "95 % at 100 %");
        }

        /** Said, for a wish without a band leaves open how far past it is still good. */
        private void oneSided(Wanted wanted) {
            boolean low = wanted.lowest().filter(g -> !g.isBand()).isPresent();
            boolean high = wanted.highest().filter(g -> !g.isBand()).isPresent();
            if (low || high) {
                String which = low && high ? "lowest and highest state" : low ? "lowest states" : "highest states";
                notes.add("wanted." + which + " no band: anything at or past it counts as reached"
                        + " (a band such as 2 %..5 % bounds both sides).");
            }
        }

        private void want(String key, String usual) {
            if (fill(key, usual)) {
                notes.add(key + " is not stated; taken as " + usual + ".");
            }
        }

        /** Problems of what somebody wrote, at their own lines; what was filled in was missing there and no more. */
        private void requireRest() {
            if (asWritten.read(library) instanceof Reading.Bad bad) {
                List<Problem> rest = bad.problems().stream()
                        .filter(p -> !filled.contains(p.path()))
                        .toList();
                if (!rest.isEmpty()) {
                    throw new InvalidInputException(rest);
                }
            }
        }

        private LoadedDesign loaded() {
            Reading reading = text.read(library);
            if (reading instanceof Reading.Good good) {
                return good.loaded();
            }
            throw new InvalidInputException(((Reading.Bad) reading).problems());
        }

        private static boolean isHighestFirst(Design design) {
            Wanted wanted = design.wanted();
            double low = wanted.lowest().map(Goal::position).orElse(0.0);
            double high = wanted.highest().map(Goal::position).orElse(1.0);
            return high < low;
        }
    }
}
