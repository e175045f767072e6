package clipramp.cli;

import clipramp.circuit.Design;
import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.files.DesignFiles;
import clipramp.files.InvalidInputException;
import clipramp.files.LoadedDesign;
import clipramp.files.ProfileLibrary;
import clipramp.files.SizedText;
import clipramp.files.Source;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import clipramp.sizing.TriggerExchange;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Every trigger device and every thyristor of the profiles put in a design's place, one at a time, and judged: what to do
 * when the original part is no longer made. A trigger device of the other kind brings its own resistors.
 */
final class Substitutes {
    private static final String TRIGGER = "trigger.device";

    private static final Comparator<Substitute> BETTER =
            Comparator.comparingInt(Substitute::rank).thenComparingDouble(Substitutes::shortfall);

    /**
     * @param key design key that was replaced, such as trigger.device
     * @param id the profile put there
     * @param original whether it is the design's own
     * @param changes what else had to change, as given with {@code --with}; empty where nothing had
     * @param check the judgement; empty where it cannot be used
     * @param refusal why it cannot be used; empty where it can
     */
    record Substitute(
            String key, String id, boolean original, List<String> changes, Optional<Check> check, String refusal) {
        Substitute {
            changes = List.copyOf(changes);
        }

        /** The margin that decides: the worst. */
        Optional<Margin> deciding() {
            return check.map(c -> c.margins().get(0));
        }

        private int rank() {
            return check.map(Check::verdict).map(Enum::ordinal).orElse(Integer.MAX_VALUE);
        }
    }

    private final LoadedDesign loaded;
    private final Source source;
    private final ProfileLibrary library;

    private Substitutes(LoadedDesign loaded, Source source, ProfileLibrary library) {
        this.loaded = loaded;
        this.source = source;
        this.library = library;
    }

    static List<Substitute> of(LoadedDesign loaded, Source source, ProfileLibrary library) {
        return new Substitutes(loaded, source, library).all();
    }

    private List<Substitute> all() {
        Design own = loaded.design();
        boolean programmable = own.trigger() instanceof ProgrammableTrigger;
        List<Substitute> all = new ArrayList<>();
        for (String id : library.ids(programmable ? "programmable-unijunction" : "unijunction")) {
            all.add(tried(TRIGGER, id, id.equals(own.trigger().deviceId()), List.of()));
        }
        for (String id : library.ids(programmable ? "unijunction" : "programmable-unijunction")) {
            all.add(otherKind(id, programmable));
        }
        var thyristor = own.thyristor().device();
        for (String id : library.ids(thyristor.kind() == Kind.TRIAC ? "triac" : "scr")) {
            all.add(tried("thyristor.device", id, id.equals(thyristor.id()), List.of()));
        }
        all.sort(Comparator.comparing(Substitute::key).reversed().thenComparingInt(Substitute::rank));
        return all;
    }

    private Substitute tried(String key, String id, boolean own, List<String> changes) {
        List<String> overrides = new ArrayList<>(changes);
        overrides.add(0, key + "=" + id);
        try {
            Check check = Judge.check(changed(overrides), OptionalDouble.empty(), OptionalDouble.empty());
            return new Substitute(key, id, own, changes, Optional.of(check), "");
        } catch (InvalidInputException refused) {
            return refused(key, id, own, refused.problems().get(0).message());
        } catch (RefusedCircuit refused) {
            return refused(key, id, own, String.valueOf(refused.getMessage()));
        }
    }

    private static Substitute refused(String key, String id, boolean own, String why) {
        return new Substitute(key, id, own, List.of(), Optional.empty(), why);
    }

    private Design changed(List<String> more) {
        List<String> overrides = new ArrayList<>(loaded.overrides());
        overrides.addAll(more);
        return DesignFiles.load(source, overrides, library).design();
    }

    /** A device of the other kind with its own resistors; where that fails, with the ramp chosen anew too. */
    private Substitute otherKind(String id, boolean toUnijunction) {
        List<String> without =
                toUnijunction ? List.of("trigger.upper=none", "trigger.lower=none") : List.of("trigger.base-two=none");
        List<String> rough = new ArrayList<>(without);
        rough.add(0, TRIGGER + "=" + id);
        rough.addAll(
                toUnijunction
                        ? List.of("trigger.base-two=470 ohm")
                        : List.of("trigger.upper=10 kohm", "trigger.lower=10 kohm"));
        try {
            Design other = changed(rough);
            List<TriggerExchange> exchanges = toUnijunction
                    ? List.of(TriggerExchange.baseTwo(other))
                    : TriggerExchange.dividers(loaded.design(), other);
            Substitute alike = exchanges.stream()
                    .map(exchange -> tried(TRIGGER, id, false, overrides(without, exchange)))
                    .min(BETTER)
                    .orElseThrow();
            if (alike.check().map(Check::verdict).filter(Verdict.FAILS::equals).isEmpty()) {
                return alike;
            }
            Substitute resized = tried(TRIGGER, id, false, overrides(without, TriggerExchange.resized(other)));
            return BETTER.compare(resized, alike) < 0 ? resized : alike;
        } catch (InvalidInputException refused) {
            return refused(TRIGGER, id, false, refused.problems().get(0).message());
        } catch (RefusedCircuit refused) {
            return refused(TRIGGER, id, false, String.valueOf(refused.getMessage()));
        }
    }

    private static List<String> overrides(List<String> without, TriggerExchange exchange) {
        List<String> overrides = new ArrayList<>(without);
        exchange.changed().stream()
                .sorted()
                .forEach(part -> SizedText.value(part, exchange.design())
                        .ifPresent(value -> overrides.add(part.key() + "=" + value)));
        return overrides;
    }

    /** How many margins fail, and then how badly the worst does: less is better. */
    private static double shortfall(Substitute substitute) {
        return substitute
                .check()
                .map(check -> {
                    long failing = check.margins().stream()
                            .filter(margin -> margin.verdict() == check.verdict())
                            .count();
                    return failing
                            - Math.min(0.99, check.margins().get(0).ratio().orElse(0) / 100);
                })
                .orElse(Double.MAX_VALUE);
    }
}
