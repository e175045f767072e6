package clipramp.faults;

import clipramp.circuit.Design;
import clipramp.engine.Network;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;

/**
 * One part that has failed in one way. What follows from it is computed by changing the circuit's numbers and solving it
 * again (DEVELOPERS.md, Single faults).
 *
 * @param id stable word for machines, such as zener-open
 * @param part design key of the part, such as clip.zener; empty for the healthy circuit
 * @param how what the part does
 * @param words such as "zener DZ open"
 * @param remark what else to know: how the fault was put into numbers, what it leaves open; may be empty
 * @param path what becomes of the load's path
 * @param leakOhms resistance across the ramp capacitor, ohm, above 0; POSITIVE_INFINITY for none
 * @param wiring changes how the circuit is put together
 * @param change changes the numbers of the network, which hold R_E of one knob position already, and derives it anew
 */
public record Fault(
        String id,
        String part,
        How how,
        String words,
        String remark,
        LoadPath path,
        double leakOhms,
        UnaryOperator<Design> wiring,
        Consumer<Network> change) {
    /** The healthy circuit. */
    static final Fault NONE = new Fault(
            "none",
            "",
            How.SOUND,
            "no fault",
            "",
            LoadPath.INTACT,
            Double.POSITIVE_INFINITY,
            UnaryOperator.identity(),
            n -> {});

    /** A fault of one part that changes some numbers only. */
    static Fault of(String id, String part, How how, String words, Consumer<Network> change) {
        return new Fault(
                id, part, how, words, "", LoadPath.INTACT, Double.POSITIVE_INFINITY, UnaryOperator.identity(), change);
    }

    /** The same with another remark. */
    Fault saying(String newRemark) {
        return new Fault(id, part, how, words, newRemark, path, leakOhms, wiring, change);
    }

    /** The same with something else become of the load's path. */
    Fault along(LoadPath newPath) {
        return new Fault(id, part, how, words, remark, newPath, leakOhms, wiring, change);
    }

    /** The same with the circuit put together in another way. */
    Fault wired(UnaryOperator<Design> newWiring) {
        return new Fault(id, part, how, words, remark, path, leakOhms, newWiring, change);
    }

    /** The same with so many ohms across the ramp capacitor. */
    Fault leaking(double newLeakOhms) {
        return new Fault(id, part, how, words, remark, path, newLeakOhms, wiring, change);
    }

    /**
     * Share of the voltage behind R_E that a leaky capacitor can reach: R_leak/(R_E + R_leak); 1 without a leak.
     *
     * @param rampOhms R_E, ohm
     */
    double leakShare(double rampOhms) {
        return Double.isInfinite(leakOhms) ? 1 : leakOhms / (rampOhms + leakOhms);
    }
}
