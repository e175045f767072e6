package clipramp.cli;

import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.files.DesignFiles;
import clipramp.files.InvalidInputException;
import clipramp.files.LoadedDesign;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import clipramp.margins.Margin;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Every trigger device and every thyristor of the profiles put in a design's place, one at a time, and judged: what to do
 * when the original part is no longer made.
 */
final class Substitutes {
    /**
     * @param key design key that was replaced, such as trigger.device
     * @param id the profile put there
     * @param original whether it is the design's own
     * @param check the judgement; empty where it cannot be used
     * @param refusal why it cannot be used; empty where it can
     */
    record Substitute(String key, String id, boolean original, Optional<Check> check, String refusal) {
        /** The margin that decides: the worst. */
        Optional<Margin> deciding() {
            return check.map(c -> c.margins().get(0));
        }
    }

    private Substitutes() {}

    static List<Substitute> of(LoadedDesign loaded, Source source, ProfileLibrary library) {
        List<Substitute> all = new ArrayList<>();
        String trigger = loaded.design().trigger().deviceId();
        // The other kind of trigger device needs other resistors around it: that is another design.
        String kind =
                loaded.design().trigger() instanceof ProgrammableTrigger ? "programmable-unijunction" : "unijunction";
        library.ids(kind).forEach(id -> all.add(tried(loaded, source, library, "trigger.device", id, trigger)));
        var thyristor = loaded.design().thyristor().device();
        String switching = thyristor.kind() == Kind.TRIAC ? "triac" : "scr";
        library.ids(switching)
                .forEach(id -> all.add(tried(loaded, source, library, "thyristor.device", id, thyristor.id())));
        all.sort(Comparator.comparing(Substitute::key)
                .reversed()
                .thenComparing(
                        s -> s.check().map(Check::verdict).map(Enum::ordinal).orElse(Integer.MAX_VALUE)));
        return all;
    }

    private static Substitute tried(
            LoadedDesign loaded, Source source, ProfileLibrary library, String key, String id, String original) {
        List<String> overrides = new ArrayList<>(loaded.overrides());
        overrides.add(key + "=" + id);
        boolean own = id.equals(original);
        try {
            LoadedDesign changed = DesignFiles.load(source, overrides, library);
            Check check = Judge.check(changed.design(), OptionalDouble.empty(), OptionalDouble.empty());
            return new Substitute(key, id, own, Optional.of(check), "");
        } catch (InvalidInputException refused) {
            return new Substitute(
                    key, id, own, Optional.empty(), refused.problems().get(0).message());
        } catch (RefusedCircuit refused) {
            return new Substitute(key, id, own, Optional.empty(), String.valueOf(refused.getMessage()));
        }
    }
}
