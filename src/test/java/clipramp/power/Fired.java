package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.Thyristor;
import clipramp.circuit.ThyristorDevice;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.firing.Solution.Settling;
import java.util.List;
import java.util.OptionalDouble;

/** Solutions made by hand: a stated firing angle instead of a solved one, and textbook stages without drops. */
final class Fired {
    private Fired() {}

    static Solution at(Condition condition, double firingRad) {
        return new Solution(condition, 1e4, Settling.STEADY, List.of(half(condition, true, firingRad, true)));
    }

    static Solution silent(Condition condition) {
        return new Solution(condition, 1e4, Settling.STEADY, List.of(half(condition, true, 1, false)));
    }

    static Solution unlike(Condition condition, double firstRad, double secondRad) {
        return new Solution(
                condition,
                1e4,
                Settling.HUNTS,
                List.of(half(condition, true, firstRad, true), half(condition, false, secondRad, true)));
    }

    static HalfCycle half(Condition condition, boolean positive, double firingRad, boolean latches) {
        return half(condition, positive, firingRad, firingRad, latches);
    }

    /** A half cycle with one pulse, made at one angle of the supply and acting at another of the load. */
    static HalfCycle half(Condition condition, boolean positive, double madeRad, double actsRad, boolean latches) {
        double seconds = madeRad / condition.omega();
        Pulse pulse = new Pulse(
                actsRad,
                seconds,
                seconds + 20e-6,
                20,
                13,
                false,
                false,
                0.1,
                2,
                0.2,
                4,
                10e-6,
                1e-6,
                2e-6,
                5e-6,
                latches,
                1,
                latches);
        return new HalfCycle(
                positive,
                condition.halfCycleSeconds(),
                0.5,
                0.5,
                OptionalDouble.of(0.1),
                3.05,
                false,
                false,
                List.of(pulse),
                latches ? 0 : -1);
    }

    /** The first pulse of a half cycle, but so weak that it never reaches the trigger current. */
    static Pulse weak(HalfCycle half) {
        Pulse p = half.pulses().get(0);
        return new Pulse(
                p.startRad(),
                p.startSeconds(),
                p.endSeconds(),
                p.supplyVolts(),
                p.peakPointVolts(),
                false,
                false,
                1e-3,
                0.5,
                0,
                1,
                0,
                0,
                0,
                0,
                false,
                0,
                false);
    }

    /** A textbook stage: a resistor and a thyristor without drops, no bridge diodes' drops either. */
    static Design textbook(Stage stage, double loadOhms) {
        Design heater = SampleDesigns.heater();
        ThyristorDevice device = heater.thyristor().device();
        ThyristorDevice ideal = new ThyristorDevice(
                device.kind(),
                device.id(),
                device.gate(),
                device.latching(),
                device.holding(),
                device.turnOffSeconds(),
                device.commutating(),
                new ThyristorDevice.OnState(0, 0),
                device.limits(),
                device.junctionToCaseKelvinPerWatt());
        GateDrive gate =
                stage == Stage.INVERSE_PARALLEL ? SampleDesigns.transformerGate(2) : SampleDesigns.directGate(1000);
        return heater.withStage(stage)
                .withStageDiodes(new StageDiodes(0, 0))
                .withGate(gate)
                .withThyristor(new Thyristor(ideal, OptionalDouble.of(4)))
                .withLoad(new Load.Resistor(loadOhms));
    }
}
