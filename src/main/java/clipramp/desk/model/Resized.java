package clipramp.desk.model;

import clipramp.files.DesignText;
import clipramp.margins.Check;
import clipramp.sizing.Compensation;
import clipramp.sizing.KnobShape;
import clipramp.sizing.OpenPart;
import clipramp.sizing.Reason;
import clipramp.sizing.SizingAnswer;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What a search came to.
 *
 * @param asked what was looked for
 * @param sheet the design that was found, as it would be written
 * @param before the judgement on the design as it stands; empty for a new one
 * @param sizing what the design keeps
 * @param reasons why each chosen part is what it is; empty where no part was searched for
 * @param notes what was taken for granted
 * @param knobs the knob before and after, where it was to be straight
 * @param steadied base two's resistor against temperature, where the angle was to be steady
 */
public record Resized(
        Resizing.Asked asked,
        Sheet sheet,
        Optional<Check> before,
        SizingAnswer sizing,
        List<Reason> reasons,
        List<String> notes,
        Optional<Knobs> knobs,
        Optional<Steadied> steadied) {
    /**
     * A knob before and after.
     *
     * @param before the knob as it stands
     * @param after the straightest that was found
     */
    public record Knobs(KnobShape before, KnobShape after) {}

    /**
     * Base two's resistor before and after.
     *
     * @param found the flattest resistor, and what the published rules leave
     * @param nowOhms base two's resistor as it stands, ohm
     * @param nowDriftRad how far the firing angle moves with it, rad
     * @param chosenOhms preferred value next to the flattest, ohm
     * @param chosenDriftRad how far it moves with that, rad
     */
    public record Steadied(
            Compensation found, double nowOhms, double nowDriftRad, double chosenOhms, double chosenDriftRad) {}

    /**
     * A value that is chosen anew.
     *
     * @param slot its place in the design that was found
     * @param before what stands in the file now, or what holds where it says nothing
     * @param after what would stand there
     */
    public record Change(PartSlot slot, String before, String after) {
        /** Whether anything else would stand there. */
        public boolean differs() {
            return !before.equals(after);
        }
    }

    /** Keeps the lists as they are. */
    public Resized {
        reasons = List.copyOf(reasons);
        notes = List.copyOf(notes);
    }

    /** Every part that might change, in the order of the signal. */
    public List<Change> changes() {
        List<String> keys = new ArrayList<>();
        for (OpenPart part : OpenPart.values()) {
            if (asked.free().contains(part)) {
                keys.add(part.key());
            }
        }
        if (knobs.isPresent()) {
            keys.addAll(List.of("ramp.pot.law", "ramp.pot.half", "ramp.pot.end", "ramp.pot.shunt"));
        }
        if (steadied.isPresent() && !keys.contains(OpenPart.BASE_TWO.key())) {
            keys.add(OpenPart.BASE_TWO.key());
        }
        DesignText text = sheet.text();
        return PartSlot.at(keys, sheet).stream()
                .map(slot -> new Change(
                        slot, standing(slot.key()), text.valueAt(slot.key()).orElse("")))
                .filter(change -> !change.before().isEmpty() || !change.after().isEmpty())
                .toList();
    }

    private String standing(String key) {
        return asked.before()
                .map(s -> PartSlot.at(List.of(key), s).get(0))
                .filter(slot -> !slot.text().isEmpty() || !slot.standIn().equals("none"))
                .map(PartSlot::shown)
                .orElse("");
    }

    /** How many values would change. */
    public int changed() {
        return (int) changes().stream().filter(Change::differs).count();
    }

    /** Why a part is what it is, where that was found out. */
    public Optional<Reason> reason(String key) {
        return reasons.stream().filter(r -> r.part().key().equals(key)).findFirst();
    }

    /** Whether it is about the design as it stands now. */
    public boolean isOf(Sheet now) {
        return asked.before()
                .map(s -> s.text().text().equals(now.text().text()))
                .orElse(false);
    }
}
