package clipramp.desk.model;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Load;
import clipramp.circuit.PotLaw;
import clipramp.circuit.Stage;
import clipramp.circuit.Trigger;
import java.util.ArrayList;
import java.util.List;

/** The stations of the signal, in its order, and after them what is asked of the whole. */
public enum PartGroup {
    /** The line. */
    LINE("line") {
        @Override
        List<String> keys(Design design) {
            return List.of("line", "line.voltage", "line.frequency", "line.low", "line.high", "line.recorded");
        }
    },
    /** The clipped supply. */
    CLIP("clip") {
        @Override
        List<String> keys(Design design) {
            return List.of(
                    "clip.tap", "clip.rectifier", "clip.winding", "clip.dropper", "clip.zener", "clip.diode-drop");
        }
    },
    /** The ramp. */
    RAMP("ramp") {
        @Override
        List<String> keys(Design design) {
            List<String> keys = new ArrayList<>(List.of("ramp.capacitor", "ramp.fixed"));
            design.ramp().pot().ifPresent(pot -> {
                keys.addAll(List.of("ramp.pot.track", "ramp.pot.end", "ramp.pot.law"));
                if (pot.law() instanceof PotLaw.Logarithmic || pot.law() instanceof PotLaw.ReverseLogarithmic) {
                    keys.add("ramp.pot.half");
                }
                keys.addAll(List.of("ramp.pot.sense", "ramp.pot.shunt"));
            });
            keys.add("ramp.trim-high");
            if (design.ramp().pot().isPresent()) {
                keys.add("ramp.trim-low");
            }
            return keys;
        }
    },
    /** The trigger device and its resistors. */
    TRIGGER("trigger") {
        @Override
        List<String> keys(Design design) {
            return design.trigger() instanceof Trigger.UnijunctionTrigger
                    ? List.of("trigger.device", "trigger.base-one", "trigger.base-two")
                    : List.of("trigger.device", "trigger.base-one", "trigger.upper", "trigger.lower");
        }
    },
    /** What the pulse passes on its way to the gate. */
    GATE("gate") {
        @Override
        List<String> keys(Design design) {
            List<String> keys = new ArrayList<>(List.of("gate.coupling", "gate.series", "gate.shunt"));
            if (design.gate().coupling() == GateDrive.Coupling.TRANSFORMER) {
                keys.addAll(List.of(
                        "gate.transformer.ratio",
                        "gate.transformer.secondaries",
                        "gate.transformer.magnetising",
                        "gate.transformer.primary-resistance",
                        "gate.transformer.secondary-resistance",
                        "gate.transformer.clamp",
                        "gate.transformer.volt-seconds"));
            }
            keys.addAll(List.of("gate.polarity", "gate.overdrive", "gate.charge-time"));
            return keys;
        }
    },
    /** Stage, thyristor and load. */
    LOAD("load") {
        @Override
        List<String> keys(Design design) {
            List<String> keys = new ArrayList<>(List.of("stage", "thyristor.device", "thyristor.case-to-ambient"));
            keys.addAll(List.of("load.kind", "load.rated", "load.resistance", "load.inductance"));
            if (design.load() instanceof Load.Inductive inductive) {
                if (design.stage() == Stage.BRIDGE_DC || design.stage() == Stage.HALF_WAVE) {
                    keys.add("load.freewheel");
                }
                inductive.freewheel().ifPresent(diode -> keys.add("load.freewheel.drop"));
            } else {
                keys.add("load.cold-ratio");
            }
            if (design.load() instanceof Load.Filament) {
                keys.add("load.exponent");
            }
            keys.add("snubber");
            design.snubber().ifPresent(rc -> keys.addAll(List.of("snubber.resistance", "snubber.capacitance")));
            if (design.stage().bridgeDiodes() > 0) {
                keys.addAll(List.of("stage-diodes.drop", "stage-diodes.slope"));
            }
            return keys;
        }
    },
    /** What is wanted of the knob, and the surroundings. */
    ASKED("asked") {
        @Override
        List<String> keys(Design design) {
            return List.of(
                    "wanted.lowest",
                    "wanted.highest",
                    "surroundings.coldest",
                    "surroundings.hottest",
                    "derating.resistors",
                    "title");
        }
    };

    private final String word;

    PartGroup(String word) {
        this.word = word;
    }

    /** The word on its tab. */
    public String word() {
        return word;
    }

    /** Keys of this station that a design can have, in the order of the signal. */
    abstract List<String> keys(Design design);

    /** The station that a part of the drawing belongs to. */
    public static PartGroup of(String key) {
        String head = key.contains(".") ? key.substring(0, key.indexOf('.')) : key;
        return switch (head) {
            case "line" -> LINE;
            case "clip" -> CLIP;
            case "ramp" -> RAMP;
            case "trigger" -> TRIGGER;
            case "gate" -> GATE;
            case "load", "stage", "stage-diodes", "thyristor", "snubber" -> LOAD;
            default -> ASKED;
        };
    }
}
