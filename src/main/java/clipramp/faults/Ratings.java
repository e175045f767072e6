package clipramp.faults;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import clipramp.firing.Dissipation;
import clipramp.power.LoadResult;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What parts bear against their whole rating: no derating of resistors, for the question is what burns, not what lasts. A
 * rating that is not stated is NaN.
 */
public final class Ratings {
    /** Below this share of the track next to none of it is in use. */
    private static final double LEAST_TRACK = 0.02;

    private final Design design;
    private final Condition condition;
    private final List<Burden> burdens = new ArrayList<>();

    private Ratings(Design design, Condition condition) {
        this.design = design;
        this.condition = condition;
    }

    /**
     * Firing circuit and gate.
     *
     * @param design whose ratings count
     * @param condition whose temperature derates the trigger device
     * @param bears what its parts bear
     * @param leakShare share of the computed ramp voltage that is really there; 1 in a sound circuit
     * @param position of the knob, 0..1; empty for a fixed ramp
     * @param rampOhms R_E there, ohm
     */
    public static List<Burden> ofFiringCircuit(
            Design design,
            Condition condition,
            Dissipation bears,
            double leakShare,
            OptionalDouble position,
            double rampOhms) {
        Ratings all = new Ratings(design, condition);
        all.supplyAndRamp(bears, leakShare, position, rampOhms);
        all.trigger(bears);
        all.gate(bears);
        return all.burdens;
    }

    /** The thyristor's currents, of which the result's count. */
    public static List<Burden> ofThyristor(Design design, LoadResult load) {
        ThyristorDevice.Limits limits = design.thyristor().device().limits();
        return List.of(
                burden("thyristor.device", "mean current", Unit.AMPERE, load.thyristorMeanAmps(), limits.meanAmps()),
                burden("thyristor.device", "rms current", Unit.AMPERE, load.thyristorRmsAmps(), limits.rmsAmps()));
    }

    private static Burden burden(String part, String what, Unit unit, double borne, OptionalDouble rating) {
        return new Burden(part, what, unit, borne, rating.orElse(Double.NaN));
    }

    private void add(String part, String what, Unit unit, double borne, OptionalDouble rating) {
        if (!Double.isNaN(borne)) {
            burdens.add(burden(part, what, unit, borne, rating));
        }
    }

    private void power(String key, Part part, double watts) {
        add(key, "power", Unit.WATT, watts, part.ratedWatts());
    }

    private void supplyAndRamp(Dissipation bears, double leakShare, OptionalDouble position, double rampOhms) {
        Part dropper = design.clip().dropper();
        power("clip.dropper", dropper, bears.dropperWatts());
        add("clip.dropper", "peak voltage", Unit.VOLT, bears.dropperPeakVolts(), dropper.ratedVolts());
        add(
                "clip.zener",
                "power",
                Unit.WATT,
                bears.zenerWatts(),
                design.clip().zener().ratedWatts());
        add(
                "ramp.capacitor",
                "peak voltage",
                Unit.VOLT,
                leakShare * bears.capacitorVolts(),
                design.ramp().capacitor().ratedVolts());
        double squareAmps = bears.rampWatts() / rampOhms;
        Part fixed = design.ramp().fixed();
        power("ramp.fixed", fixed, Math.min(bears.rampWatts(), squareAmps * fixed.value()));
        design.ramp().pot().ifPresent(pot -> pot(pot, position, bears.rampWatts(), squareAmps));
    }

    /** A track's rating holds for the whole of it: a part of it bears the current that the whole would. */
    private void pot(Pot pot, OptionalDouble position, double rampWatts, double squareAmps) {
        double share = pot.trackShare(position.orElse(0));
        if (share > LEAST_TRACK) {
            power(
                    "ramp.pot.track",
                    pot.track(),
                    Math.min(rampWatts / share, squareAmps * pot.track().value()));
        }
    }

    private OptionalDouble derated(OptionalDouble watts, OptionalDouble derating) {
        double warmth = Math.max(0, condition.celsius() - Condition.SHEET_CELSIUS);
        return watts.isEmpty()
                ? watts
                : OptionalDouble.of(Math.max(0, watts.getAsDouble() - derating.orElse(0) * warmth));
    }

    private void trigger(Dissipation bears) {
        String key = "trigger.device";
        power("trigger.base-one", design.trigger().baseOne(), bears.baseOneWatts());
        if (design.trigger() instanceof Trigger.UnijunctionTrigger trigger) {
            Unijunction.Limits limits = trigger.device().limits();
            power("trigger.base-two", trigger.baseTwo(), bears.baseTwoWatts());
            add(key, "power", Unit.WATT, bears.deviceWatts(), derated(limits.watts(), limits.deratingWattsPerKelvin()));
            add(key, "interbase voltage", Unit.VOLT, bears.interbaseVolts(), limits.interbaseVolts());
            add(key, "emitter reverse voltage", Unit.VOLT, bears.emitterReverseVolts(), limits.emitterReverseVolts());
            add(key, "emitter rms current", Unit.AMPERE, bears.emitterRmsAmps(), limits.emitterRmsAmps());
            add(key, "emitter peak current", Unit.AMPERE, bears.emitterPeakAmps(), limits.emitterPeakAmps());
        } else if (design.trigger() instanceof Trigger.ProgrammableTrigger trigger) {
            ProgrammableUnijunction.Limits limits = trigger.device().limits();
            power("trigger.upper", trigger.upper(), bears.baseTwoWatts());
            power("trigger.lower", trigger.lower(), bears.lowerWatts());
            add(key, "power", Unit.WATT, bears.deviceWatts(), derated(limits.watts(), limits.deratingWattsPerKelvin()));
            add(key, "anode voltage", Unit.VOLT, bears.capacitorVolts(), limits.anodeVolts());
            add(key, "anode peak current", Unit.AMPERE, bears.emitterPeakAmps(), limits.peakAmps());
        }
    }

    private void gate(Dissipation bears) {
        power("gate.series", design.gate().series(), bears.gateSeriesWatts());
        design.gate().shunt().ifPresent(shunt -> power("gate.shunt", shunt, bears.gateShuntWatts()));
        add(
                "thyristor.device",
                "mean gate power",
                Unit.WATT,
                bears.gateWatts(),
                design.thyristor().device().gate().limits().meanWatts());
    }
}
