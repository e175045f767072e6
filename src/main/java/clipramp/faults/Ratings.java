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
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What parts bear against their whole rating: no derating, for the question is what burns, not what lasts. A part whose
 * rating is not stated is not listed.
 */
final class Ratings {
    private static final double SHEET_CELSIUS = 25;

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
     * @param bears what the firing circuit's parts bear
     * @param leakShare share of the computed ramp voltage that is really there
     * @param load the load's current and the thyristor's
     */
    static List<Burden> of(
            Design design,
            Condition condition,
            Dissipation bears,
            double leakShare,
            LoadAt at,
            double thyristorRmsAmps,
            double thyristorMeanAmps) {
        Ratings all = new Ratings(design, condition);
        all.supplyAndRamp(bears, leakShare, at);
        all.trigger(bears);
        all.gate(bears);
        ThyristorDevice.Limits limits = design.thyristor().device().limits();
        all.add("thyristor.device", "rms current", Unit.AMPERE, thyristorRmsAmps, limits.rmsAmps());
        all.add("thyristor.device", "mean current", Unit.AMPERE, thyristorMeanAmps, limits.meanAmps());
        return all.burdens;
    }

    private void add(String part, String what, Unit unit, double borne, OptionalDouble rating) {
        if (rating.isPresent() && !Double.isNaN(borne)) {
            burdens.add(new Burden(part, what, unit, borne, rating.getAsDouble()));
        }
    }

    private void power(String key, Part part, double watts) {
        add(key, "power", Unit.WATT, watts, part.ratedWatts());
    }

    private void supplyAndRamp(Dissipation bears, double leakShare, LoadAt at) {
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
        double squareAmps = bears.rampWatts() / at.rampOhms();
        Part fixed = design.ramp().fixed();
        power("ramp.fixed", fixed, Math.min(bears.rampWatts(), squareAmps * fixed.value()));
        design.ramp().pot().ifPresent(pot -> pot(pot, at, bears.rampWatts(), squareAmps));
    }

    /** A track's rating holds for the whole of it: a part of it bears the current that the whole would. */
    private void pot(Pot pot, LoadAt at, double rampWatts, double squareAmps) {
        double share = pot.trackShare(at.position().orElse(0));
        if (share > LEAST_TRACK) {
            power(
                    "ramp.pot.track",
                    pot.track(),
                    Math.min(rampWatts / share, squareAmps * pot.track().value()));
        }
    }

    private OptionalDouble derated(OptionalDouble watts, OptionalDouble derating) {
        double warmth = Math.max(0, condition.celsius() - SHEET_CELSIUS);
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
