package clipramp.desk.model;

import clipramp.circuit.Design;
import clipramp.circuit.Designators;
import clipramp.files.Key;
import clipramp.files.KeyCatalogue;
import clipramp.files.LoadedDesign;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A place on the parts strip.
 *
 * @param key design key
 * @param label its short name
 * @param designator its name in the drawing; empty for what is no part
 * @param meaning one sentence
 * @param text what the file says, empty where it says nothing
 * @param standIn what holds where the file says nothing: a default, or a figure of the profile
 * @param choices the words to choose from; empty for a value that is typed
 */
public record PartSlot(
        String key,
        String label,
        String designator,
        String meaning,
        String text,
        String standIn,
        List<String> choices) {
    private static final Map<String, String> LABELS = Map.ofEntries(
            Map.entry("line", "line"),
            Map.entry("line.low", "lowest line"),
            Map.entry("line.high", "highest line"),
            Map.entry("clip.tap", "taken across"),
            Map.entry("clip.diode-drop", "drop of a diode"),
            Map.entry("ramp.fixed", "fixed resistor"),
            Map.entry("ramp.pot.track", "pot track"),
            Map.entry("ramp.pot.end", "pot end"),
            Map.entry("ramp.pot.law", "pot law"),
            Map.entry("ramp.pot.half", "share at half turn"),
            Map.entry("ramp.pot.sense", "R clockwise"),
            Map.entry("ramp.pot.shunt", "across the pot"),
            Map.entry("ramp.trim-high", "trimmer, high end"),
            Map.entry("ramp.trim-low", "trimmer, low end"),
            Map.entry("trigger.upper", "upper resistor"),
            Map.entry("trigger.lower", "lower resistor"),
            Map.entry("gate.series", "series resistor"),
            Map.entry("gate.shunt", "gate to cathode"),
            Map.entry("gate.transformer.ratio", "turns ratio"),
            Map.entry("gate.transformer.magnetising", "magnetising L"),
            Map.entry("gate.transformer.primary-resistance", "primary resistance"),
            Map.entry("gate.transformer.secondary-resistance", "secondary resistance"),
            Map.entry("thyristor.device", "thyristor"),
            Map.entry("thyristor.case-to-ambient", "case to ambient"),
            Map.entry("load.rated", "rated"),
            Map.entry("load.freewheel", "freewheeling diode"),
            Map.entry("load.freewheel.drop", "its drop"),
            Map.entry("load.cold-ratio", "hot over cold R"),
            Map.entry("load.exponent", "power exponent"),
            Map.entry("snubber.resistance", "snubber resistor"),
            Map.entry("snubber.capacitance", "snubber capacitor"),
            Map.entry("stage-diodes.slope", "bridge diode slope"),
            Map.entry("line.recorded", "recorded cycle, file"),
            Map.entry("stage-diodes.drop", "bridge diode drop"),
            Map.entry("wanted.lowest", "lowest wanted"),
            Map.entry("wanted.highest", "highest wanted"),
            Map.entry("derating.resistors", "use of resistors"));

    /** Keeps the choices as they are. */
    public PartSlot {
        choices = List.copyOf(choices);
    }

    /** Whether it is chosen from a list. */
    public boolean isChoice() {
        return !choices.isEmpty();
    }

    /** What is shown: the file's text, or what stands in for it. */
    public String shown() {
        return text.isEmpty() ? standIn : text;
    }

    /**
     * Every place of a station that the design has.
     *
     * @param group the station
     * @param sheet the design as it stands
     * @param workshop knows the profiles to choose from
     * @param file where the design lies, for profiles beside it; empty where it was never saved
     */
    public static List<PartSlot> of(PartGroup group, Sheet sheet, Workshop workshop, Optional<Path> file) {
        List<PartSlot> slots = new ArrayList<>();
        for (String path : group.keys(sheet.design())) {
            Optional<String> text = sheet.text().valueAt(path);
            if (text.isPresent() || !isOneOfTwo(path)) {
                slots.add(slot(
                        path,
                        text.orElse(""),
                        sheet,
                        workshop.profileIds(path, sheet.design().stage(), file)));
            }
        }
        return slots;
    }

    /** Places for given keys, typed and not chosen. */
    public static List<PartSlot> at(List<String> keys, Sheet sheet) {
        return keys.stream()
                .map(key -> slot(key, sheet.text().valueAt(key).orElse(""), sheet, List.of()))
                .toList();
    }

    /** A load is given by its rating or by its resistance: only what the file has is shown. */
    private static boolean isOneOfTwo(String key) {
        return List.of("load.rated", "load.resistance", "load.inductance").contains(key);
    }

    private static PartSlot slot(String path, String text, Sheet sheet, List<String> profiles) {
        Optional<Key> key = KeyCatalogue.standard().find(path);
        Optional<Extra> extra = Extra.at(path);
        if (extra.isPresent()) {
            return fitted(path, extra.get(), text, key);
        }
        List<String> choices = new ArrayList<>(key.map(Key::words).orElse(List.of()));
        if (choices.isEmpty() && !text.startsWith("{")) {
            choices.addAll(profiles);
            if (!choices.isEmpty() && path.equals("clip.winding")) {
                choices.add(0, "none");
            }
            if (!choices.isEmpty() && !text.isEmpty() && !choices.contains(text)) {
                choices.add(0, text);
            }
        }
        return new PartSlot(
                path,
                LABELS.getOrDefault(
                        path, path.substring(path.lastIndexOf('.') + 1).replace('-', ' ')),
                Designators.of(sheet.design()).getOrDefault(path, ""),
                key.map(Key::meaning).orElse(""),
                text,
                text.isEmpty() ? standIn(path, sheet.loaded()) : "",
                choices);
    }

    private static PartSlot fitted(String path, Extra extra, String text, Optional<Key> key) {
        return new PartSlot(
                path,
                LABELS.getOrDefault(path, path),
                "",
                key.map(Key::meaning).orElse(""),
                extra.choiceOf(text),
                "",
                extra.choices());
    }

    private static String standIn(String path, LoadedDesign loaded) {
        Design design = loaded.design();
        return switch (path) {
            case "line.voltage" -> QuantityText.format(design.line().volts(), Unit.VOLT);
            case "line.frequency" -> QuantityText.format(design.line().hertz(), Unit.HERTZ);
            case "line.low" -> QuantityText.format(design.line().lowVolts(), Unit.VOLT);
            case "line.high" -> QuantityText.format(design.line().highVolts(), Unit.VOLT);
            default ->
                loaded.assumed().stream()
                        .filter(assumed -> assumed.path().equals(path))
                        .map(LoadedDesign.Assumed::value)
                        .findFirst()
                        .orElse("none");
        };
    }
}
