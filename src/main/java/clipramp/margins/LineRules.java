package clipramp.margins;

import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.margins.LineCheck.Order;
import clipramp.margins.LineCheck.Rule;
import clipramp.margins.LineCheck.Setting;
import clipramp.margins.LineCheck.Standing;
import clipramp.power.LineCurrent;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/** The rules of IEC 61000-3-2 that a phase control meets, with this design's numbers in. */
final class LineRules {
    private static final String CLAUSE = LineTable.STANDARD + ", control methods (clause 6.1" + LineTable.RECALLED;
    private static final String SCOPE = LineTable.STANDARD + ", limits (clause 7" + LineTable.RECALLED;

    /** Nominal voltages, line to neutral, that the tables are made for. */
    private static final double LEAST_PUBLIC_VOLTS = 220;

    private static final double MOST_PUBLIC_VOLTS = 240;

    private final Design design;
    private final double fullWatts;
    private final List<Setting> settings;
    private final List<Order> orders;
    private final double mostWatts;

    LineRules(Design design, double fullWatts, List<Setting> settings, List<Order> orders) {
        this.design = design;
        this.fullWatts = fullWatts;
        this.settings = settings;
        this.orders = orders;
        this.mostWatts = settings.stream().mapToDouble(Setting::watts).max().orElse(0);
    }

    List<Rule> all() {
        List<Rule> rules = new ArrayList<>();
        double volts = design.line().volts();
        if (volts < LEAST_PUBLIC_VOLTS || volts > MOST_PUBLIC_VOLTS) {
            rules.add(free(
                    "line-voltage",
                    "line voltage",
                    "The tables are made for public supplies of " + Say.volts(LEAST_PUBLIC_VOLTS) + " to "
                            + Say.volts(MOST_PUBLIC_VOLTS) + "; this line has " + Say.volts(volts)
                            + ". What follows is for orientation."));
        }
        if (LineCheck.isAsymmetrical(design)) {
            rules.add(asymmetrical());
        } else if (LineCheck.isHeating(design)) {
            rules.add(heating());
        }
        if (design.load() instanceof Load.Filament) {
            rules.add(dimmer());
            rules.add(luminaire());
        } else {
            rules.add(classA());
        }
        bySize().ifPresent(rules::add);
        return rules;
    }

    private Optional<Rule> bySize() {
        if (fullWatts <= LineCheck.SMALL_WATTS) {
            return Optional.of(free(
                    "small",
                    "small equipment",
                    "Up to " + Say.watts(LineCheck.SMALL_WATTS) + " no class but C has limits; this load takes "
                            + Say.watts(fullWatts) + "."));
        }
        if (fullWatts > LineCheck.LARGE_WATTS) {
            return Optional.of(free(
                    "professional",
                    "professional equipment",
                    "Professional equipment above " + Say.watts(LineCheck.LARGE_WATTS)
                            + " has no limits here; this load takes " + Say.watts(fullWatts)
                            + ". Anything that is not professional has."));
        }
        return Optional.empty();
    }

    private static Rule free(String id, String name, String text) {
        return new Rule(id, name, SCOPE, Standing.NO_LIMITS, OptionalInt.empty(), Double.NaN, Double.NaN, text);
    }

    private Rule asymmetrical() {
        boolean small = mostWatts <= LineCheck.ASYMMETRICAL_WATTS;
        String rule = "Half-wave rectification of the line and asymmetrical control are let through up to "
                + Say.watts(LineCheck.ASYMMETRICAL_WATTS)
                + " and in special cases only; this stage gives its load up to "
                + Say.watts(mostWatts) + (small ? "." : ". It is out before any table is looked at.");
        return new Rule(
                "asymmetrical",
                "asymmetrical control",
                CLAUSE,
                small ? Standing.NO_LIMITS : Standing.RULED_OUT,
                OptionalInt.empty(),
                Double.NaN,
                Double.NaN,
                rule);
    }

    private Rule heating() {
        String rule = "Symmetrical phase control of a heating element has no limits up to "
                + Say.watts(LineCheck.HEATING_WATTS) + " of full power; this one takes " + Say.watts(fullWatts);
        if (fullWatts <= LineCheck.HEATING_WATTS) {
            return new Rule(
                    "heating-element",
                    "heating elements",
                    CLAUSE,
                    Standing.NO_LIMITS,
                    OptionalInt.empty(),
                    Double.NaN,
                    Double.NaN,
                    rule + ".");
        }
        Order binding = binding();
        boolean over = binding.used() > 1;
        return new Rule(
                "heating-element",
                "heating elements",
                CLAUSE,
                over ? Standing.RULED_OUT : Standing.UNDER,
                OptionalInt.of(binding.order()),
                binding.used(),
                fullWatts / binding.used(),
                rule + ", so every order must stay under the table. " + bindingText(binding)
                        + (over ? " The rule for heating elements forbids this phase control of this heater." : ""));
    }

    private Order binding() {
        return LineCheck.binding(orders);
    }

    private String bindingText(Order binding) {
        if (binding.used() == 0) {
            return "No current flows.";
        }
        return "The " + ordinal(binding.order()) + " harmonic binds first: " + Say.amps(binding.amps()) + " of "
                + Say.amps(binding.limitAmps()) + at(binding.position()) + "; such a load would reach the limit at "
                + Say.watts(fullWatts / binding.used()) + " of full power.";
    }

    private static String at(OptionalDouble position) {
        return position.isPresent() ? " with the knob at " + Say.share(position.getAsDouble()) : "";
    }

    /** Such as 15th. */
    static String ordinal(int order) {
        int unit = order % 10;
        boolean teen = order / 10 % 10 == 1;
        return order + (teen || unit == 0 || unit > 3 ? "th" : unit == 1 ? "st" : unit == 2 ? "nd" : "rd");
    }

    private Rule classA() {
        return classA("class-a", "class A", "");
    }

    private Rule classA(String id, String name, String before) {
        Order binding = binding();
        return new Rule(
                id,
                name,
                LineTable.CLASS_A.source(),
                binding.used() > 1 ? Standing.OVER : Standing.UNDER,
                OptionalInt.of(binding.order()),
                binding.used(),
                fullWatts / binding.used(),
                before + bindingText(binding));
    }

    private Rule dimmer() {
        if (fullWatts <= LineCheck.LARGE_WATTS) {
            return free(
                    "dimmer",
                    "independent dimmer",
                    "An independent dimmer for incandescent lamps has no limits up to "
                            + Say.watts(LineCheck.LARGE_WATTS) + "; these lamps take " + Say.watts(fullWatts) + ".");
        }
        return classA("dimmer", "independent dimmer", "An independent phase-control dimmer is class A. ");
    }

    /** A dimmer inside a lamp is lighting equipment, whose table is in shares of the fundamental. */
    private Rule luminaire() {
        int order = 0;
        double used = 0;
        Setting worst = settings.get(0);
        for (Setting setting : settings) {
            for (int n = 2; n < LineCurrent.HIGHEST_ORDER; n++) {
                double share = usedOfClassC(setting.current(), n);
                if (share > used) {
                    used = share;
                    order = n;
                    worst = setting;
                }
            }
        }
        if (order == 0) {
            return free("luminaire", "dimmer inside a luminaire", "No current flows.");
        }
        double shown = worst.current().shareOf(order);
        return new Rule(
                "luminaire",
                "dimmer inside a luminaire",
                LineTable.CLASS_C.source(),
                used > 1 ? Standing.OVER : Standing.UNDER,
                OptionalInt.of(order),
                used,
                Double.NaN,
                "Lighting equipment above 25 W is class C, in shares of the fundamental. The " + ordinal(order)
                        + " harmonic binds first: " + Say.share(shown) + " of " + Say.share(shown / used)
                        + at(worst.position()) + ". No power changes that.");
    }

    private static double usedOfClassC(LineCurrent current, int order) {
        OptionalDouble limit = LineTable.CLASS_C.limitAmps(order, current.fundamentalAmps(), current.powerFactor());
        return limit.isPresent() && limit.getAsDouble() > 0 ? current.ampsOf(order) / limit.getAsDouble() : 0;
    }
}
