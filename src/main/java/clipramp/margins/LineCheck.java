package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.power.LineCurrent;
import clipramp.power.LoadPower;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * The line current beside the tables that others will hold it against. Guidance for a designer and no verdict: it says
 * what was computed against which table, and leaves the rest to a test house and to local rules.
 *
 * @param settings the line current at every setting of the knob, usual condition
 * @param worst index of the one that uses most of the class A table; the one with the largest current where none flows
 * @param orders every order at the setting where it is largest
 * @param rules what the standard says of this kind of load and control
 * @param fullWatts power of the load with the thyristor always on, without drops, W
 */
public record LineCheck(List<Setting> settings, int worst, List<Order> orders, List<Rule> rules, double fullWatts) {
    /** Full power up to which a class other than C has no limits, W. */
    static final double SMALL_WATTS = 75;

    /** Full power up to which symmetrical control of a heating element has no limits, W. */
    static final double HEATING_WATTS = 200;

    /** Power up to which asymmetrical control is let through, W. */
    static final double ASYMMETRICAL_WATTS = 100;

    /** Full power up to which an independent dimmer for lamps, or from which professional equipment, is free, W. */
    static final double LARGE_WATTS = 1000;

    /**
     * One setting of the knob and what the line sees there.
     *
     * @param position knob, 0..1; empty for a fixed ramp
     * @param rampOhms R_E, ohm
     * @param firedRad where the current begins, from the zero of its half cycle, rad; empty where none flows
     * @param watts load power, W
     * @param current the line current
     */
    public record Setting(
            OptionalDouble position, double rampOhms, OptionalDouble firedRad, double watts, LineCurrent current) {}

    /**
     * One order of the current at the setting where it is largest.
     *
     * @param order 2 to 40
     * @param amps largest rms of any setting, A
     * @param position knob where that is, 0..1; empty for a fixed ramp
     * @param limitAmps class A, A
     */
    public record Order(int order, double amps, OptionalDouble position, double limitAmps) {
        /** Share of the limit that is used, 0 or more. */
        public double used() {
            return amps / limitAmps;
        }
    }

    /** How what was computed stands to a rule. */
    public enum Standing {
        /** The rule names none for such a case. */
        NO_LIMITS("no limits"),
        /** Every order stays under its limit. */
        UNDER("under the limits"),
        /** An order exceeds its limit. */
        OVER("over the limits"),
        /** The rule does not allow this kind of control here. */
        RULED_OUT("ruled out");

        private final String word;

        Standing(String word) {
            this.word = word;
        }

        /** The words that answers give. */
        public String word() {
            return word;
        }
    }

    /**
     * One rule and how this design stands to it.
     *
     * @param id such as heating-element
     * @param name in words
     * @param source standard, clause or table, and how it is known
     * @param standing in a word
     * @param order the order that binds first; empty where the rule looks at no order
     * @param used share of that order's limit that is used; NaN without an order
     * @param bindsAtWatts full power of such a load at which that order would reach its limit, other things equal, W; NaN
     *     without an order, and for tables in shares of the fundamental, which no power changes
     * @param text the rule with the numbers in
     */
    public record Rule(
            String id,
            String name,
            String source,
            Standing standing,
            OptionalInt order,
            double used,
            double bindsAtWatts,
            String text) {}

    /** Keeps copies of the lists. */
    public LineCheck {
        settings = List.copyOf(settings);
        orders = List.copyOf(orders);
        rules = List.copyOf(rules);
    }

    /** The setting that uses most of the class A table. */
    public Setting worstSetting() {
        return settings.get(worst);
    }

    /** The order that uses most of its class A limit at any setting: the one that binds first. */
    public Order binding() {
        return binding(orders);
    }

    static Order binding(List<Order> orders) {
        return orders.stream().max(Comparator.comparingDouble(Order::used)).orElseThrow();
    }

    /** Full power of such a load at which the binding order would reach its limit, W; infinite where no current flows. */
    public double bindsAtWatts() {
        return fullWatts / binding().used();
    }

    /**
     * The line current of several settings beside the tables.
     *
     * @param design stage and load
     * @param condition line voltage
     * @param settings at least one
     */
    static LineCheck of(Design design, Condition condition, List<Setting> settings) {
        List<Order> orders = new ArrayList<>();
        for (int order = 2; order <= LineCurrent.HIGHEST_ORDER; order++) {
            orders.add(largest(order, settings));
        }
        int worst = 0;
        for (int i = 1; i < settings.size(); i++) {
            if (mostUsed(settings.get(i).current())
                    > mostUsed(settings.get(worst).current())) {
                worst = i;
            }
        }
        double full = LoadPower.fullWatts(design, condition);
        return new LineCheck(settings, worst, orders, new LineRules(design, full, settings, orders).all(), full);
    }

    private static Order largest(int order, List<Setting> settings) {
        Setting most = settings.get(0);
        for (Setting setting : settings) {
            if (setting.current().ampsOf(order) > most.current().ampsOf(order)) {
                most = setting;
            }
        }
        double limit = LineTable.CLASS_A.limitAmps(order, 0, 0).orElseThrow();
        return new Order(order, most.current().ampsOf(order), most.position(), limit);
    }

    /** Share of the class A table that the worst order of a current uses. */
    static double mostUsed(LineCurrent current) {
        double most = 0;
        for (int order = 2; order <= LineCurrent.HIGHEST_ORDER; order++) {
            double limit = LineTable.CLASS_A.limitAmps(order, 0, 0).orElseThrow();
            most = Math.max(most, current.ampsOf(order) / limit);
        }
        return most;
    }

    /** The line current at every setting of the knob. */
    static LineCheck of(Bench bench, Condition condition) {
        Design design = bench.design();
        List<Double> ohms = bench.settings();
        List<Setting> settings = new ArrayList<>();
        for (int i = 0; i < ohms.size(); i++) {
            double rampOhms = ohms.get(i);
            settings.add(new Setting(
                    bench.positionOf(i),
                    rampOhms,
                    bench.load(condition, rampOhms).firedRad(),
                    bench.load(condition, rampOhms).watts(),
                    LineCurrent.of(design, condition, bench.period(condition, rampOhms))));
        }
        return of(design, condition, settings);
    }

    /** Whether one polarity alone is used by design. */
    static boolean isAsymmetrical(Design design) {
        return design.stage() == Stage.HALF_WAVE;
    }

    /** A resistor is taken for a heating element. */
    static boolean isHeating(Design design) {
        return design.load() instanceof Load.Resistor;
    }
}
