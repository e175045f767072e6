package clipramp.files;

import java.util.Arrays;
import java.util.List;

/** The places in a design where a profile's id may stand for a device. */
enum DevicePlace {
    LINE("line", "line"),
    WINDING("clip.winding", "winding"),
    ZENER("clip.zener", "zener"),
    TRIGGER("trigger.device", "unijunction", "programmable-unijunction"),
    THYRISTOR("thyristor.device", "scr", "triac");

    private final String path;
    private final List<String> kinds;

    DevicePlace(String path, String... kinds) {
        this.path = path;
        this.kinds = List.of(kinds);
    }

    String path() {
        return path;
    }

    List<String> kinds() {
        return kinds;
    }

    static List<String> allKinds() {
        return Arrays.stream(values()).flatMap(p -> p.kinds.stream()).toList();
    }

    /** Kinds whose keys are catalogued under the kind's own name and not as keys of a design. */
    static boolean isKind(String name) {
        return !name.equals("line") && allKinds().contains(name);
    }
}
