package clipramp.files;

import static clipramp.files.Key.characteristic;
import static clipramp.files.Key.other;
import static clipramp.files.Key.quantity;
import static clipramp.files.Key.word;

import clipramp.files.Key.Kind;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

/** The keys of profiles, by kind; the same keys describe a device in place. */
final class DeviceKeys {
    private DeviceKeys() {}

    static List<Key> all() {
        return Stream.of(
                        winding(),
                        zener(),
                        unijunction(),
                        unijunctionLimits(),
                        programmable(),
                        thyristor("scr"),
                        thyristor("triac"),
                        triacOnly())
                .flatMap(List::stream)
                .toList();
    }

    private static List<Key> winding() {
        return List.of(
                other("winding", Kind.MAPPING).optional().means("Profile of an isolated synchronising winding."),
                quantity("winding.primary", Unit.VOLT, 5, 1000).by("windings").means("Rms voltage of the primary."),
                quantity("winding.secondary", Unit.VOLT, 1, 1000)
                        .by("windings")
                        .means("Open-circuit rms voltage of the secondary with that on the primary."),
                word("winding.phase", "same", "opposite")
                        .orElse("same")
                        .by("windings")
                        .means("Whether the secondary follows the line or is turned over."),
                quantity("winding.lag", Unit.ANGLE, Math.toRadians(-89), Math.toRadians(89))
                        .orElse("0 deg")
                        .by("windings")
                        .means("Angle by which the secondary lags the line."));
    }

    private static List<Key> zener() {
        return List.of(
                other("zener", Kind.MAPPING).optional().means("Profile of a zener."),
                characteristic("zener.voltage", Unit.VOLT, 2, 200).by("zeners").means("Voltage at the test current."),
                quantity("zener.test-current", Unit.AMPERE, 0, 1).by("zeners").means("Test current of the voltage."),
                quantity("zener.slope", Unit.OHM, 0.001, 1e4).by("zeners").means("Differential resistance."),
                quantity("zener.drift", Unit.PER_KELVIN, -0.01, 0.01)
                        .orElse("0 %/K")
                        .by("spread and temperature")
                        .means("Relative drift of the voltage from 25 °C."),
                quantity("zener.power", Unit.WATT, 0.01, 1000)
                        .optional()
                        .by("the zener's margin")
                        .means("Rated dissipation."));
    }

    private static List<Key> unijunction() {
        return List.of(
                other("unijunction", Kind.MAPPING)
                        .optional()
                        .means("Profile of a unijunction transistor, figures at 25 °C."),
                characteristic("unijunction.standoff", Unit.FRACTION, 0.2, 0.98)
                        .by("unijunctions")
                        .means("Intrinsic standoff ratio, eta."),
                characteristic("unijunction.interbase", Unit.OHM, 100, 1e6)
                        .by("unijunctions")
                        .means("Resistance between the bases with the emitter open, R_BB."),
                characteristic("unijunction.interbase-drift", Unit.PER_KELVIN, -0.05, 0.05)
                        .orElse("0.5 %/K")
                        .by("temperature")
                        .means("Relative drift of R_BB; sheets give 0.1 to 0.9 %/K."),
                characteristic("unijunction.emitter-drop", Unit.VOLT, 0, 2)
                        .orElse("0.5 V")
                        .by("unijunctions")
                        .means("Drop of the emitter's diode at the peak point, V_D."),
                characteristic("unijunction.emitter-drift", Unit.VOLT_PER_KELVIN, -0.02, 0.02)
                        .orElse("-2.5 mV/K")
                        .by("temperature")
                        .means("Drift of V_D."),
                characteristic("unijunction.peak-current", Unit.AMPERE, 1e-12, 0.01)
                        .by("unijunctions")
                        .means("Peak-point current I_P: the least emitter current that fires."),
                other("unijunction.valley", Kind.MAPPING).by("unijunctions").means("The valley point."),
                characteristic("unijunction.valley.current", Unit.AMPERE, 1e-6, 1)
                        .by("unijunctions")
                        .means("Valley current I_V: conduction ends under it."),
                characteristic("unijunction.valley.voltage", Unit.VOLT, 0.1, 20)
                        .by("unijunctions")
                        .means("Emitter to base-one voltage at the valley, V_V."),
                quantity("unijunction.valley.at", Unit.VOLT, 0.5, 100)
                        .by("unijunctions")
                        .means("Interbase voltage that both valley figures hold at."),
                other("unijunction.saturation", Kind.MAPPING)
                        .by("unijunctions")
                        .means("A point of the saturated emitter line."),
                characteristic("unijunction.saturation.voltage", Unit.VOLT, 0.1, 50)
                        .by("unijunctions")
                        .means("Emitter to base-one voltage with the emitter conducting hard."),
                quantity("unijunction.saturation.current", Unit.AMPERE, 1e-4, 10)
                        .by("unijunctions")
                        .means("Emitter current of that point."),
                quantity("unijunction.saturation.at", Unit.VOLT, 0.5, 100)
                        .orElse("valley.at")
                        .by("unijunctions")
                        .means("Interbase voltage of that point."),
                other("unijunction.modulated", Kind.MAPPING)
                        .optional()
                        .by("unijunctions")
                        .means("Interbase current with the emitter conducting."),
                characteristic("unijunction.modulated.current", Unit.AMPERE, 1e-5, 1)
                        .by("unijunctions")
                        .means("Modulated interbase current."),
                quantity("unijunction.modulated.at", Unit.VOLT, 0.5, 100)
                        .by("unijunctions")
                        .means("Interbase voltage of that current."),
                other("unijunction.base-one-pulse", Kind.MAPPING)
                        .optional()
                        .by("unijunctions")
                        .means(
                                "Base-one pulse V_OB1 with the circuit that it is measured in; it calibrates the emitter line."),
                quantity("unijunction.base-one-pulse.min", Unit.VOLT, 0.1, 50)
                        .optional()
                        .means("Least pulse of any device."),
                quantity("unijunction.base-one-pulse.typ", Unit.VOLT, 0.1, 50)
                        .optional()
                        .means("Typical pulse."),
                quantity("unijunction.base-one-pulse.supply", Unit.VOLT, 1, 100).means("Supply of the test circuit."),
                quantity("unijunction.base-one-pulse.capacitor", Unit.FARAD, 1e-10, 1e-4)
                        .means("Capacitor of the test circuit."),
                quantity("unijunction.base-one-pulse.base-one", Unit.OHM, 0.1, 1e4)
                        .means("Base-one resistor of the test circuit."));
    }

    private static List<Key> unijunctionLimits() {
        String limits = "unijunction.limits";
        return List.of(
                other(limits, Kind.MAPPING).optional().by("ratings").means("Absolute ratings."),
                limit(limits, "interbase", Unit.VOLT, 1, 1000, "Largest voltage between the bases."),
                limit(limits, "emitter-peak", Unit.AMPERE, 1e-3, 100, "Peak emitter current."),
                limit(limits, "emitter-rms", Unit.AMPERE, 1e-4, 10, "Rms emitter current."),
                limit(limits, "emitter-reverse", Unit.VOLT, 1, 1000, "Reverse emitter voltage."),
                other(limits + ".capacitor", Kind.MAPPING)
                        .optional()
                        .by("ratings")
                        .means("Largest capacitor that the peak emitter current holds for."),
                quantity(limits + ".capacitor.capacitance", Unit.FARAD, 1e-10, 1e-2)
                        .means("Its capacitance."),
                quantity(limits + ".capacitor.voltage", Unit.VOLT, 1, 1000).means("The voltage on it."),
                limit(limits, "power", Unit.WATT, 1e-3, 100, "Dissipation at 25 °C."),
                limit(limits, "derating", Unit.WATT_PER_KELVIN, 1e-6, 1, "What the dissipation loses above 25 °C."));
    }

    private static Key limit(String limits, String name, Unit unit, double low, double high, String meaning) {
        return quantity(limits + "." + name, unit, low, high)
                .optional()
                .by("ratings")
                .means(meaning);
    }

    private static List<Key> programmable() {
        String kind = "programmable-unijunction";
        String limits = kind + ".limits";
        List<Key> keys = new ArrayList<>();
        keys.add(
                other(kind, Kind.MAPPING).optional().means("Profile of a programmable unijunction, figures at 25 °C."));
        table(
                keys,
                kind + ".offset",
                Unit.VOLT,
                -1,
                5,
                "Peak point above the divider's voltage, against gate resistance.");
        keys.add(other(kind + ".forward", Kind.MAPPING).means("A point of the conducting device."));
        keys.add(characteristic(kind + ".forward.voltage", Unit.VOLT, 0.61, 10).means("Anode to cathode voltage."));
        keys.add(quantity(kind + ".forward.current", Unit.AMPERE, 1e-4, 10).means("Anode current of that voltage."));
        table(keys, kind + ".peak-current", Unit.AMPERE, 1e-12, 0.01, "Peak-point current, against gate resistance.");
        table(keys, kind + ".valley-current", Unit.AMPERE, 1e-9, 1, "Valley current, against gate resistance.");
        keys.add(other(limits, Kind.MAPPING).optional().by("ratings").means("Absolute ratings."));
        keys.add(limit(limits, "anode", Unit.VOLT, 1, 1000, "Anode to cathode voltage, either way."));
        keys.add(limit(limits, "gate-reverse", Unit.VOLT, 0.5, 1000, "Reverse voltage of the gate."));
        keys.add(limit(limits, "mean", Unit.AMPERE, 1e-3, 100, "Direct anode current."));
        keys.add(limit(limits, "peak", Unit.AMPERE, 1e-3, 100, "Peak anode current."));
        keys.add(limit(limits, "peak-for", Unit.SECOND, 1e-8, 1, "Pulse length that the peak current holds for."));
        keys.add(limit(limits, "power", Unit.WATT, 1e-3, 100, "Dissipation at 25 °C."));
        keys.add(limit(limits, "derating", Unit.WATT_PER_KELVIN, 1e-6, 1, "What the dissipation loses above 25 °C."));
        keys.add(limit(limits, "discharge-energy", Unit.JOULE, 1e-9, 1, "Energy that a capacitor may give it."));
        return keys;
    }

    private static void table(List<Key> keys, String path, Unit unit, double low, double high, String meaning) {
        keys.add(other(path, Kind.LIST).by("programmable unijunctions").means(meaning));
        keys.add(quantity(path + ".gate-resistance", Unit.OHM, 1, 1e9)
                .by("programmable unijunctions")
                .means("Parallel of both divider resistors that a row holds at."));
        keys.add(characteristic(path + ".value", unit, low, high)
                .by("programmable unijunctions")
                .means("The figure there."));
    }

    private static List<Key> thyristor(String kind) {
        String gate = kind + ".gate";
        String limits = kind + ".limits";
        List<Key> keys = new ArrayList<>();
        keys.add(other(kind, Kind.MAPPING)
                .optional()
                .means(kind.equals("scr") ? "Profile of an SCR." : "Profile of a triac."));
        keys.add(other(gate, Kind.MAPPING).by("every thyristor").means("Gate data."));
        keys.add(quantity(gate + ".knee", Unit.VOLT, 0, 5)
                .by("every thyristor")
                .means("Knee of the typical gate junction."));
        keys.add(quantity(gate + ".slope", Unit.OHM, 0.01, 1e5)
                .by("every thyristor")
                .means("Slope resistance of the typical gate junction."));
        points(
                keys,
                gate + ".trigger",
                "Largest trigger current and voltage of any device, against junction temperature.");
        keys.add(other(gate + ".non-trigger", Kind.MAPPING)
                .optional()
                .by("the standing gate voltage")
                .means("Gate voltage that fires no device, V_GD."));
        keys.add(quantity(gate + ".non-trigger.voltage", Unit.VOLT, 1e-3, 5).means("The voltage."));
        keys.add(quantity(gate + ".non-trigger.at", Unit.CELSIUS, -60, 300)
                .means("Junction temperature that it holds at."));
        keys.add(quantity(gate + ".turn-on", Unit.SECOND, 1e-10, 0.01)
                .optional()
                .by("the pulse length's margin")
                .means("Gate-controlled turn-on time t_gt."));
        keys.add(other(gate + ".limits", Kind.MAPPING).optional().by("ratings").means("Ratings of the gate."));
        keys.add(limit(gate + ".limits", "current", Unit.AMPERE, 1e-3, 100, "Peak gate current I_GM."));
        keys.add(limit(gate + ".limits", "voltage", Unit.VOLT, 0.1, 1000, "Peak forward gate voltage V_GM."));
        keys.add(limit(gate + ".limits", "reverse", Unit.VOLT, 0.1, 1000, "Peak reverse gate voltage V_RGM."));
        keys.add(limit(gate + ".limits", "peak-power", Unit.WATT, 1e-3, 1000, "Peak gate power P_GM."));
        keys.add(limit(gate + ".limits", "peak-power-for", Unit.SECOND, 1e-8, 1, "Pulse length that P_GM holds for."));
        keys.add(limit(gate + ".limits", "mean-power", Unit.WATT, 1e-4, 100, "Mean gate power P_G(AV)."));
        curve(keys, kind + ".latching", "Latching current I_L, at 25 °C or against junction temperature.");
        curve(keys, kind + ".holding", "Holding current I_H, at 25 °C or against junction temperature.");
        keys.add(quantity(kind + ".turn-off", Unit.SECOND, 1e-8, 1)
                .optional()
                .by("bridge stages and inductive loads")
                .means("Turn-off time t_q."));
        keys.add(other(kind + ".on-state", Kind.MAPPING)
                .by("every thyristor")
                .means("On-state voltage as threshold and slope."));
        keys.add(quantity(kind + ".on-state.threshold", Unit.VOLT, 0, 10).means("Threshold voltage V_T0."));
        keys.add(quantity(kind + ".on-state.slope", Unit.OHM, 0, 100).means("Slope resistance r_T."));
        keys.add(other(limits, Kind.MAPPING).optional().by("ratings").means("Absolute ratings."));
        keys.add(limit(limits, "voltage", Unit.VOLT, 5, 1e5, "Repetitive peak off-state and reverse voltage."));
        keys.add(limit(limits, "rms", Unit.AMPERE, 1e-3, 1e5, "Rms on-state current."));
        keys.add(limit(limits, "mean", Unit.AMPERE, 1e-3, 1e5, "Mean on-state current."));
        keys.add(limit(limits, "surge", Unit.AMPERE, 1e-2, 1e6, "Surge current of one half cycle."));
        keys.add(limit(limits, "i2t", Unit.AMPERE_SQUARED_SECOND, 1e-6, 1e9, "I²t for fusing."));
        keys.add(limit(limits, "junction", Unit.CELSIUS, 25, 400, "Highest junction temperature."));
        keys.add(limit(
                limits,
                "dv-dt",
                Unit.VOLT_PER_SECOND,
                1e3,
                1e12,
                "Rate of rise of the off-state voltage that does not turn it on."));
        keys.add(limit(
                limits,
                "di-dt",
                Unit.AMPERE_PER_SECOND,
                1e3,
                1e12,
                "Rate of rise of the current that it bears as it turns on."));
        keys.add(quantity(kind + ".junction-to-case", Unit.KELVIN_PER_WATT, 1e-4, 1000)
                .optional()
                .by("junction temperature")
                .means("Thermal resistance from junction to case."));
        return keys;
    }

    private static void points(List<Key> keys, String path, String meaning) {
        keys.add(other(path, Kind.LIST).by("every thyristor").means(meaning));
        keys.add(quantity(path + ".at", Unit.CELSIUS, -70, 300)
                .orElse("25 degC")
                .means("Junction temperature of a point."));
        keys.add(quantity(path + ".current", Unit.AMPERE, 1e-7, 10).means("Trigger current I_GT there."));
        keys.add(quantity(path + ".voltage", Unit.VOLT, 0.05, 20).means("Trigger voltage V_GT there."));
    }

    private static void curve(List<Key> keys, String path, String meaning) {
        keys.add(Key.make(path, Kind.CURVE, Unit.AMPERE, 1e-8, 1e3)
                .optional()
                .by("latching margins")
                .means(meaning));
        keys.add(quantity(path + ".at", Unit.CELSIUS, -70, 300).means("Junction temperature of a point."));
        keys.add(quantity(path + ".current", Unit.AMPERE, 1e-8, 1e3).means("The current there."));
    }

    private static List<Key> triacOnly() {
        List<Key> keys = new ArrayList<>();
        String quadrants = "triac.gate.quadrants";
        keys.add(other(quadrants, Kind.MAPPING)
                .optional()
                .by("triacs")
                .means("Trigger points by quadrant: I+ I- III- III+."));
        for (String quadrant : List.of("I+", "I-", "III-", "III+")) {
            points(keys, quadrants + "." + quadrant, "Trigger points of quadrant " + quadrant + ".");
        }
        keys.add(other("triac.commutating", Kind.MAPPING)
                .optional()
                .by("triacs with inductance")
                .means("Rate of rise that a triac bears after it stops conducting."));
        keys.add(quantity("triac.commutating.dv-dt", Unit.VOLT_PER_SECOND, 1e3, 1e12)
                .means("The rate of rise."));
        keys.add(quantity("triac.commutating.at", Unit.CELSIUS, -60, 300)
                .means("Junction temperature that it holds at."));
        return keys;
    }
}
