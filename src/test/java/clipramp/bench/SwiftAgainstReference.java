package clipramp.bench;

import clipramp.circuit.Design;
import clipramp.circuit.SampleDesigns;
import clipramp.engine.UnitValues;
import clipramp.firing.Firing;
import clipramp.firing.Solution;
import clipramp.power.DrawnUnits;
import clipramp.power.SwiftPoint;
import java.util.Locale;

/**
 * The swift path against the reference path over as many units as asked for, at knob positions 0, 0.1 .. 1 in turn: the
 * greatest difference, and how many differ in more than figures. Arguments: units, seed.
 */
public final class SwiftAgainstReference {
    private int unsure;
    private int otherState;
    private int otherFiring;
    private int apart;
    private double greatest;

    private SwiftAgainstReference() {}

    public static void main(String[] arguments) {
        int units = Integer.parseInt(arguments[0]);
        long seed = Long.parseLong(arguments[1]);
        SwiftAgainstReference run = new SwiftAgainstReference();
        run.compare(SampleDesigns.heater(), units / 2, seed);
        run.compare(
                SampleDesigns.heater()
                        .withRamp(SampleDesigns.ramp(220e-9, 3900, 25_000))
                        .withTrigger(SampleDesigns.unijunctionTrigger(33, 470)),
                units - units / 2,
                seed);
        System.out.printf(
                Locale.ROOT,
                "%d units: greatest difference %.2e of a half cycle; over 1e-9: %d; one fires and the other not: %d;"
                        + " other state: %d; left to the reference path: %d%n",
                units,
                run.greatest,
                run.apart,
                run.otherFiring,
                run.otherState,
                run.unsure);
    }

    private void compare(Design design, int count, long seed) {
        SwiftPoint swift = new SwiftPoint(design);
        DrawnUnits units = new DrawnUnits(design, seed);
        for (int i = 0; i < count; i++) {
            UnitValues unit = units.next();
            double share = design.ramp().pot().orElseThrow().trackShare(i % 11 / 10.0);
            if (!swift.solve(unit, unit.rampOhms(share))) {
                unsure++;
                continue;
            }
            Solution reference = Firing.solve(design, units.condition(), swift.network());
            if (reference.state() != swift.state()) {
                otherState++;
                tell("state", design, i, swift, reference);
            }
            double expected = reference.shown().firingRad().orElse(Double.NaN);
            if (Double.isNaN(expected) != Double.isNaN(swift.firingRad())) {
                otherFiring++;
                tell("firing", design, i, swift, reference);
            } else if (!Double.isNaN(expected)) {
                double difference = Math.abs(expected - swift.firingRad()) / Math.PI;
                greatest = Math.max(greatest, difference);
                if (difference > 1e-9) {
                    apart++;
                    tell("apart", design, i, swift, reference);
                }
            }
        }
    }

    private static void tell(String what, Design design, int unit, SwiftPoint swift, Solution reference) {
        System.out.printf(
                Locale.ROOT,
                "%s: C_E %.3g F unit %d: swift %s %.12f, reference %s %.12f%n",
                what,
                design.ramp().capacitor().value(),
                unit,
                swift.state(),
                swift.firingRad(),
                reference.state(),
                reference.shown().firingRad().orElse(Double.NaN));
    }
}
