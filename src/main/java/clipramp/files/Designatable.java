package clipramp.files;

import java.util.List;

/** Keys of the parts that a drawing names. */
final class Designatable {
    static final List<String> PATHS = List.of(
            "load",
            "load.freewheel",
            "stage-diodes",
            "clip.rectifier",
            "clip.dropper",
            "clip.zener",
            "clip.winding",
            "ramp.capacitor",
            "ramp.fixed",
            "ramp.pot",
            "ramp.pot.track",
            "ramp.pot.shunt",
            "ramp.trim-high",
            "ramp.trim-low",
            "trigger.device",
            "trigger.base-one",
            "trigger.base-two",
            "trigger.upper",
            "trigger.lower",
            "gate.series",
            "gate.shunt",
            "gate.transformer",
            "thyristor.device");

    private Designatable() {}
}
