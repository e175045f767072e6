package clipramp.fit;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.PotLaw;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Trimmers;
import clipramp.circuit.Unijunction;
import clipramp.spread.Factor;
import clipramp.spread.Factors;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;

/** What may differ from the drawing in the unit that was measured: everything that spread draws, and the pot's law. */
final class Unknowns {
    /** How far the track share at half rotation strays, as a share of itself: common practice. */
    private static final double LINEAR_STRAYS = 0.05;

    private static final double LOGARITHMIC_STRAYS = 0.3;
    private static final String PULSE_PATH = "trigger.device.base-one-pulse";
    /** Beyond this a track share at half rotation is no pot's. */
    private static final double LEAST_SHARE = 0.01;

    /** Limits of parts and figures that state none, as shares: common practice. */
    private static final double CAPACITOR = 0.1;

    private static final double TRACK = 0.2;
    private static final double ZENER = 0.05;
    private static final double STANDOFF = 0.15;
    private static final double DROP = 0.2;
    /** The least that a trimmer can be set to, as a share of its mid-track. */
    private static final double LEAST_SETTING = 0.02;

    private final List<Unknown> unknowns = new ArrayList<>();

    private Unknowns() {}

    /** All that the readings might tell, in the order of the signal. */
    static List<Unknown> of(Design design, Readings readings) {
        Unknowns all = new Unknowns();
        if (readings.lines().stream().anyMatch(line -> line.lineVolts().isEmpty())) {
            all.line(design);
        }
        for (Factor factor : Factors.of(design)) {
            // A unit's pulse may be higher than typical; a lot's sheet only says how low it goes.
            boolean pulse = factor.path().equals(PULSE_PATH);
            if (factor.kind() != Factor.Kind.SURROUNDINGS && factor.nominal() > 0 && !pulse) {
                all.factor(factor);
            }
        }
        all.trimmers(design.ramp().trimmers());
        all.unstated(design);
        boolean byKnob = readings.lines().stream().anyMatch(l -> l.setting().kind() == Setting.Kind.KNOB);
        design.ramp().pot().filter(pot -> byKnob).ifPresent(all::law);
        boolean pulses = readings.has(Meter.BASE_ONE_PEAK);
        if (pulses && design.trigger() instanceof UnijunctionTrigger trigger) {
            trigger.device().baseOnePulse().ifPresent(all::pulse);
        }
        return List.copyOf(all.unknowns);
    }

    private void line(Design design) {
        var line = design.line();
        if (line.lowVolts() < line.highVolts()) {
            add(
                    FitResult.LINE_PATH,
                    "line voltage on the day",
                    Unit.VOLT,
                    line.lowVolts(),
                    line.volts(),
                    line.highVolts(),
                    false,
                    Unknown.ODD_DEVICE,
                    (unit, v) -> unit.lineVolts = v);
        }
    }

    private void factor(Factor factor) {
        add(
                factor.path(),
                factor.name(),
                unitOf(factor.path()),
                factor.low(),
                factor.nominal(),
                factor.high(),
                false,
                factor.kind() == Factor.Kind.PART ? Unknown.WRONG_PART : Unknown.ODD_DEVICE,
                (unit, v) -> factor.slot().set(unit.values, v));
    }

    private static Unit unitOf(String path) {
        if (path.equals("ramp.capacitor")) {
            return Unit.FARAD;
        }
        if (path.endsWith("standoff")) {
            return Unit.NUMBER;
        }
        if (path.endsWith("current")) {
            return Unit.AMPERE;
        }
        if (path.endsWith("emitter-drift")) {
            return Unit.VOLT_PER_KELVIN;
        }
        if (path.endsWith("drift")) {
            return Unit.PER_KELVIN;
        }
        return path.endsWith("voltage") || path.endsWith("drop") || path.endsWith("offset") ? Unit.VOLT : Unit.OHM;
    }

    /** Nobody reads how a trimmer is set; the nominal unit has it at mid-track, so that a track of twice the setting says it. */
    private void trimmers(Trimmers trimmers) {
        trimmers.high().ifPresent(t -> trimmer("ramp.trim-high", t, "first", (u, v) -> u.values.highTrimOhms = v / 2));
        trimmers.low().ifPresent(t -> trimmer("ramp.trim-low", t, "second", (u, v) -> u.values.lowTrimOhms = v / 2));
    }

    private void trimmer(String path, Part track, String which, Unknown.Slot slot) {
        double value = track.value();
        add(
                path,
                "twice the setting of the " + which + " trimmer",
                Unit.OHM,
                LEAST_SETTING * value,
                value,
                2 * track.highest(),
                false,
                Unknown.WRONG_PART,
                slot);
    }

    /** What a fit is asked for first, where the design gives it no limits. */
    private void unstated(Design design) {
        part(
                "ramp.capacitor",
                "ramp capacitor",
                design.ramp().capacitor(),
                CAPACITOR,
                (u, v) -> u.values.capacitorFarads = v);
        design.ramp()
                .pot()
                .ifPresent(
                        p -> part("ramp.pot.track", "pot track", p.track(), TRACK, (u, v) -> u.values.trackOhms = v));
        sheet(
                "clip.zener.voltage",
                "zener voltage",
                design.clip().zener().volts(),
                ZENER,
                (u, v) -> u.values.zenerVolts = v);
        if (design.trigger() instanceof UnijunctionTrigger trigger) {
            Unijunction device = trigger.device();
            String key = "trigger.device.";
            sheet(key + "standoff", "standoff ratio", device.standoff(), STANDOFF, (u, v) -> u.values.standoff = v);
            sheet(
                    key + "emitter-drop",
                    "emitter diode drop",
                    device.emitterDropVolts(),
                    DROP,
                    (u, v) -> u.values.emitterDropVolts = v);
        }
    }

    private void part(String path, String name, Part part, double share, Unknown.Slot slot) {
        own(path, name, part.value(), share, Unknown.WRONG_PART, slot);
    }

    private void sheet(String path, String name, Characteristic figure, double share, Unknown.Slot slot) {
        own(path, name, figure.nominal(), share, Unknown.ODD_DEVICE, slot);
    }

    private void own(String path, String name, double nominal, double share, double farthest, Unknown.Slot slot) {
        if (nominal > 0 && unknowns.stream().noneMatch(unknown -> unknown.path().equals(path))) {
            add(path, name, unitOf(path), nominal * (1 - share), nominal, nominal * (1 + share), true, farthest, slot);
        }
    }

    /** One number for every law but a table: the track share at half rotation; 50 % is a linear pot. */
    private void law(Pot pot) {
        double half;
        double strays = LOGARITHMIC_STRAYS;
        if (pot.law() instanceof PotLaw.Logarithmic law) {
            half = law.half();
        } else if (pot.law() instanceof PotLaw.ReverseLogarithmic law) {
            half = 1 - law.half();
            strays *= law.half() / half;
        } else if (pot.law() instanceof PotLaw.Linear) {
            half = 0.5;
            strays = LINEAR_STRAYS;
        } else {
            return;
        }
        add(
                FitResult.LAW_PATH,
                "track share at half rotation",
                Unit.FRACTION,
                half * (1 - strays),
                half,
                half * (1 + strays),
                true,
                Unknown.ODD_DEVICE,
                (unit, v) -> unit.halfShare = Math.min(1 - LEAST_SHARE, Math.max(LEAST_SHARE, v)));
    }

    /** The sheet's least pulse lies as far under the typical one as the greatest may lie over it (assumption). */
    private void pulse(Unijunction.BaseOnePulse pulse) {
        double typical = pulse.nominalVolts();
        double least = pulse.minVolts().orElse(typical);
        double reach = least < typical ? typical - least : typical / 4;
        add(
                PULSE_PATH,
                "base-one pulse V_OB1",
                Unit.VOLT,
                typical - reach,
                typical,
                typical + reach,
                true,
                Unknown.ODD_DEVICE,
                (unit, v) -> unit.values.baseOnePulseVolts = v);
    }

    private void add(
            String path,
            String name,
            Unit unit,
            double low,
            double nominal,
            double high,
            boolean assumed,
            double farthest,
            Unknown.Slot slot) {
        unknowns.add(new Unknown(path, name, unit, low, nominal, high, assumed, farthest, slot));
    }
}
