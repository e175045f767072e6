package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.Tolerance;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.engine.NetworkOfDesign;
import clipramp.units.PreferredSeries;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;

/**
 * What has to change around a trigger device of the other kind that takes the place of a design's own: the divider of a
 * programmable one, or base two's resistor of a unijunction; and where that is not enough the ramp, whose resistance has to
 * grow over the smaller valley current while its capacitor shrinks.
 *
 * @param design the design with everything changed
 * @param changed which parts were chosen anew
 */
public record TriggerExchange(Design design, Set<OpenPart> changed) {
    /** Above this gate resistance the valley current is too small for any ramp of these circuits, ohm (common practice). */
    private static final double MOST_GATE_OHMS = 100e3;

    /** Steps from one gate resistance of the tables to the next. */
    private static final int BETWEEN = 3;

    /** How far the divider's resistance may lie from the one aimed at, as a ratio. */
    private static final double GATE_SLACK = 1.35;

    private static final double DIVIDER_TOLERANCE = 0.01;

    /** Keeps the parts as they are. */
    public TriggerExchange {
        changed = Set.copyOf(changed);
    }

    /**
     * Dividers that make a programmable device fire at the same share of the supply as a unijunction in its circuit, one
     * for each gate resistance that the device's tables speak of and some between them.
     *
     * @param own the design with its unijunction
     * @param other the same design with the programmable device and any divider
     * @return one exchange for each gate resistance, rising; dividers of E24, 1 %
     */
    public static List<TriggerExchange> dividers(Design own, Design other) {
        double share = NetworkOfDesign.of(
                        own, own.nominalCondition(), own.ramp().rampOhms(0))
                .peakShare();
        ProgrammableTrigger trigger = (ProgrammableTrigger) other.trigger();
        List<TriggerExchange> all = new ArrayList<>();
        for (double gateOhms : gateOhms(trigger)) {
            Part[] divider = divider(share, gateOhms, own);
            all.add(new TriggerExchange(
                    other.withTrigger(
                            new ProgrammableTrigger(trigger.device(), trigger.baseOne(), divider[0], divider[1])),
                    EnumSet.of(OpenPart.UPPER, OpenPart.LOWER)));
        }
        return all;
    }

    private static List<Double> gateOhms(ProgrammableTrigger trigger) {
        TreeSet<Double> points = new TreeSet<>();
        Stream.of(
                        trigger.device().offsetVolts(),
                        trigger.device().peakCurrentAmps(),
                        trigger.device().valleyCurrentAmps())
                .flatMap(List::stream)
                .map(AtGateResistance::gateOhms)
                .forEach(points::add);
        List<Double> all = new ArrayList<>(points);
        for (double point : points) {
            Double next = points.higher(point);
            for (int i = 1; next != null && i < BETWEEN; i++) {
                all.add(point * Math.pow(next / point, (double) i / BETWEEN));
            }
        }
        double most = Math.max(MOST_GATE_OHMS, points.first());
        return all.stream().filter(ohms -> ohms <= most).sorted().toList();
    }

    /** Upper and lower resistor of E24 whose ratio is nearest, with a gate resistance near the one wanted. */
    static Part[] divider(double share, double gateOhms, Design own) {
        double best = Double.POSITIVE_INFINITY;
        double upper = 0;
        double lower = 0;
        double least = gateOhms / share / GATE_SLACK;
        for (double a = PreferredSeries.E24.atLeast(least);
                a <= least * GATE_SLACK * GATE_SLACK;
                a = PreferredSeries.E24.nextUp(a)) {
            double b = PreferredSeries.E24.nearest(a * share / (1 - share));
            double off = Math.abs(Math.log(b / (a + b) / share));
            // Of two that are as good the one nearer to the gate resistance wanted.
            double worth = off + 1e-3 * Math.abs(Math.log(a * share / gateOhms));
            if (worth < best) {
                best = worth;
                upper = a;
                lower = b;
            }
        }
        double volts = own.clip().zener().volts().highest();
        double amps = volts / (upper + lower);
        return new Part[] {resistor(upper, amps * amps * upper, own), resistor(lower, amps * amps * lower, own)};
    }

    private static Part resistor(double ohms, double watts, Design own) {
        return new Part(
                ohms,
                new Tolerance(DIVIDER_TOLERANCE, DIVIDER_TOLERANCE),
                OptionalDouble.of(Stock.ratedWatts(watts, own.resistorDerating())),
                OptionalDouble.empty());
    }

    /**
     * Base two's resistor for a unijunction in a programmable device's place: the one that keeps its peak point still over
     * temperature.
     *
     * @param other the design with the unijunction and any resistor at base two
     * @return the exchange, its resistor of E12
     */
    public static TriggerExchange baseTwo(Design other) {
        UnijunctionTrigger trigger = (UnijunctionTrigger) other.trigger();
        double ohms = Start.baseTwoOhms(other);
        double volts = other.clip().zener().volts().highest();
        double amps = volts / trigger.device().interbaseOhms().lowest();
        Part part = resistor(PreferredSeries.E12.nearest(ohms), amps * amps * ohms, other);
        return new TriggerExchange(Edit.baseTwo(other, part), EnumSet.of(OpenPart.BASE_TWO));
    }

    /**
     * The ramp, and the divider of a programmable device, chosen anew for what the design wants.
     *
     * @param other the design with the device of the other kind and anything around it
     * @throws RefusedCircuit where its other parts are unsound
     */
    public static TriggerExchange resized(Design other) {
        Set<OpenPart> open = EnumSet.of(OpenPart.CAPACITOR, OpenPart.FIXED);
        if (other.ramp().pot().isPresent()) {
            open.add(OpenPart.TRACK);
        }
        if (other.trigger() instanceof ProgrammableTrigger) {
            open.addAll(EnumSet.of(OpenPart.UPPER, OpenPart.LOWER));
        } else {
            open.add(OpenPart.BASE_TWO);
        }
        Stock decided = new Stock(List.of(), List.of(), List.of());
        SizingAnswer answer = Sizing.propose(new SizingRequest(other, open, decided, PreferredSeries.E24));
        return new TriggerExchange(answer.design(), open);
    }
}
