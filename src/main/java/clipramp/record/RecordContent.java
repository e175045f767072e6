package clipramp.record;

import clipramp.figures.Lanes;
import clipramp.files.LoadedDesign;
import clipramp.files.Profile;
import clipramp.margins.Check;
import java.util.List;

/**
 * Everything that a record prints, solved and judged beforehand.
 *
 * @param loaded the design as read
 * @param check the design solved and judged
 * @param profiles the profiles that were used, with the source of every figure
 * @param lanes the half cycle at mid-knob, or of the fixed ramp
 * @param commissioning what to measure, with what is expected
 * @param programVersion version of this program
 */
public record RecordContent(
        LoadedDesign loaded,
        Check check,
        List<Profile> profiles,
        Lanes lanes,
        List<Expectation> commissioning,
        String programVersion) {
    public RecordContent {
        profiles = List.copyOf(profiles);
        commissioning = List.copyOf(commissioning);
    }
}
