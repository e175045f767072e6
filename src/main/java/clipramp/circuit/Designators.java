package clipramp.circuit;

import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;

/** Every part's name in the drawing by its design key: the design's own names first, else letters as the formulas have. */
public final class Designators {
    private Designators() {}

    /** Names of all parts that a design has, in the order of the signal. */
    public static Map<String, String> of(Design design) {
        Map<String, String> names = usual(design);
        Set<String> taken = new HashSet<>(design.designators().values());
        names.replaceAll((key, name) -> {
            String own = design.designators().get(key);
            return own == null ? free(name, taken) : own;
        });
        return names;
    }

    private static Map<String, String> usual(Design design) {
        Map<String, String> names = new LinkedHashMap<>();
        names.put("load", "RL");
        supply(design, names);
        ramp(design.ramp(), names);
        trigger(design.trigger(), names);
        names.put("gate.series", "RG");
        design.gate().shunt().ifPresent(shunt -> names.put("gate.shunt", "RGK"));
        design.gate().transformer().ifPresent(transformer -> names.put("gate.transformer", "T1"));
        names.put("thyristor.device", design.stage() == Stage.INVERSE_PARALLEL ? "V1, V2" : "V1");
        return names;
    }

    private static void supply(Design design, Map<String, String> names) {
        boolean shared = design.isSuppliedByStageBridge();
        if (design.stage().bridgeDiodes() > 0) {
            names.put("stage-diodes", shared ? "D1–D4" : "D5–D8");
        }
        if (design.clip().winding().isPresent()) {
            names.put("clip.winding", "T2");
        }
        if (!shared) {
            names.put("clip.rectifier", design.clip().rectifier() == ClipSupply.Rectifier.BRIDGE ? "D1–D4" : "D1");
        }
        names.put("clip.dropper", "RD");
        names.put("clip.zener", "DZ");
    }

    private static void ramp(Ramp ramp, Map<String, String> names) {
        names.put("ramp.fixed", "RF");
        ramp.pot().ifPresent(pot -> {
            names.put("ramp.pot.track", "RP");
            pot.shunt().ifPresent(shunt -> names.put("ramp.pot.shunt", "RS"));
        });
        ramp.trimmers().high().ifPresent(trimmer -> names.put("ramp.trim-high", "RV1"));
        ramp.trimmers().low().ifPresent(trimmer -> names.put("ramp.trim-low", "RV2"));
        names.put("ramp.capacitor", "CE");
    }

    private static void trigger(Trigger trigger, Map<String, String> names) {
        names.put("trigger.device", "Q1");
        if (trigger instanceof Trigger.UnijunctionTrigger) {
            names.put("trigger.base-two", "R2");
        } else {
            names.put("trigger.upper", "RA");
            names.put("trigger.lower", "RB");
        }
        names.put("trigger.base-one", "R1");
    }

    /** The usual name, or where the design has given that to another part, its letter with the first free number from 10. */
    private static String free(String usual, Set<String> taken) {
        String name = usual;
        for (int number = 10; !taken.add(name); number++) {
            name = usual.charAt(0) + String.valueOf(number);
        }
        return name;
    }
}
