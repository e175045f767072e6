package clipramp.files;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.units.Unit;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** What stands at the keys of a design that differ from unit to unit, and how it is written back. */
final class DesignFigures {
    private static final MathContext FIGURES = new MathContext(5, RoundingMode.HALF_UP);

    private DesignFigures() {}

    /** The part at a key; empty where none is. */
    static Optional<Part> part(Design design, String path) {
        Map<String, Optional<Part>> parts = new HashMap<>();
        parts.put("clip.dropper", Optional.of(design.clip().dropper()));
        parts.put("ramp.capacitor", Optional.of(design.ramp().capacitor()));
        parts.put("ramp.fixed", Optional.of(design.ramp().fixed()));
        parts.put("ramp.pot.track", design.ramp().pot().map(pot -> pot.track()));
        parts.put("ramp.pot.shunt", design.ramp().pot().flatMap(pot -> pot.shunt()));
        parts.put("ramp.trim-high", design.ramp().trimmers().high());
        parts.put("ramp.trim-low", design.ramp().trimmers().low());
        parts.put("trigger.base-one", Optional.of(design.trigger().baseOne()));
        if (design.trigger() instanceof UnijunctionTrigger trigger) {
            parts.put("trigger.base-two", Optional.of(trigger.baseTwo()));
        } else if (design.trigger() instanceof ProgrammableTrigger trigger) {
            parts.put("trigger.upper", Optional.of(trigger.upper()));
            parts.put("trigger.lower", Optional.of(trigger.lower()));
        }
        parts.put("gate.series", Optional.of(design.gate().series()));
        parts.put("gate.shunt", design.gate().shunt());
        return parts.getOrDefault(path, Optional.empty());
    }

    /** Whether a device's figure is a table over the resistance at its gate. */
    static boolean isTable(Design design, String path) {
        return design.trigger() instanceof ProgrammableTrigger
                && List.of("trigger.device.offset", "trigger.device.peak-current", "trigger.device.valley-current")
                        .contains(path);
    }

    /** Such a table, with the one entry at this design's own divider. */
    static String table(Design design, Characteristic figure, Unit unit) {
        ProgrammableTrigger trigger = (ProgrammableTrigger) design.trigger();
        double upper = trigger.upper().value();
        double lower = trigger.lower().value();
        return FlowText.list(List.of(new FlowText()
                .quantity("gate-resistance", rounded(upper * lower / (upper + lower)), Unit.OHM)
                .characteristic("value", figure, unit)
                .text()));
    }

    /** Five figures are more than any of these is known to. */
    static double rounded(double value) {
        return new BigDecimal(value).round(FIGURES).doubleValue();
    }
}
