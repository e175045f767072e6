package clipramp.files;

import static clipramp.files.Key.other;
import static clipramp.files.Key.part;
import static clipramp.files.Key.quantity;
import static clipramp.files.Key.word;

import clipramp.files.Key.Kind;
import clipramp.units.Unit;
import java.util.List;
import java.util.stream.Stream;

/** The keys of a design, in the order in which a design is written. */
final class DesignKeys {
    private static final double TURN = 2 * Math.PI;

    private DesignKeys() {}

    static List<Key> all() {
        return Stream.of(head(), line(), stage(), clip(), ramp(), trigger(), gate(), rest())
                .flatMap(List::stream)
                .toList();
    }

    private static List<Key> head() {
        return List.of(
                Key.make("clipramp", Kind.WHOLE, Unit.NUMBER, 1, 1)
                        .by("every file")
                        .means("Version of the file format; this program reads version 1."),
                other("title", Kind.TEXT).optional().means("What the design is called."),
                other("notes", Kind.TEXT).optional().means("Free text that goes into the record."),
                other("document", Kind.MAPPING).optional().by("record").means("Title block of the record."),
                other("document.number", Kind.TEXT).optional().by("record").means("Drawing or document number."),
                other("document.revision", Kind.TEXT).optional().by("record").means("Revision."),
                other("document.prepared-by", Kind.TEXT).optional().by("record").means("Who prepared the design."),
                other("document.reviewed-by", Kind.TEXT).optional().by("record").means("Who reviewed it."),
                other("document.date", Kind.TEXT).optional().by("record").means("Date, year-month-day."));
    }

    private static List<Key> line() {
        return List.of(
                other("line", Kind.PROFILE).by("every design").means("The alternating line."),
                quantity("line.voltage", Unit.VOLT, 5, 1000)
                        .by("every design")
                        .means("Nominal voltage of the line, rms of its fundamental."),
                quantity("line.frequency", Unit.HERTZ, 10, 1000)
                        .by("every design")
                        .means("Frequency of the line."),
                Key.make("line.low", Kind.LINE_LIMIT, Unit.FRACTION, -0.5, 0)
                        .orElse("-10 %")
                        .by("margins")
                        .means("Lowest line at which the design must work, as a signed share of nominal or in volts."),
                Key.make("line.high", Kind.LINE_LIMIT, Unit.FRACTION, 0, 0.5)
                        .orElse("+10 %")
                        .by("margins")
                        .means("Highest line at which the design must work, as a signed share of nominal or in volts."),
                other("line.recorded", Kind.TEXT)
                        .optional()
                        .by("recorded lines")
                        .means(
                                "CSV file beside the design with a recorded period, time in s and volts; gives the harmonics, and the voltage where line.voltage is left out."),
                other("line.harmonics", Kind.LIST)
                        .optional()
                        .by("distorted lines")
                        .means("Harmonics of the line; none for a pure sine."),
                Key.make("line.harmonics.order", Kind.WHOLE, Unit.NUMBER, 2, 100)
                        .by("distorted lines")
                        .means("Order of a harmonic, 2 or more."),
                quantity("line.harmonics.share", Unit.FRACTION, 0, 1)
                        .by("distorted lines")
                        .means("Amplitude of a harmonic as a share of the fundamental."),
                quantity("line.harmonics.phase", Unit.ANGLE, -TURN, TURN)
                        .orElse("0 deg")
                        .by("distorted lines")
                        .means("Phase of a harmonic at the fundamental's positive-going zero, in its own degrees."));
    }

    private static List<Key> stage() {
        return List.of(
                word("stage", "half-wave", "bridge-dc", "bridge-ac", "inverse-parallel", "triac")
                        .by("every design")
                        .means("How thyristors, bridge and load are put together."),
                other("stage-diodes", Kind.MAPPING)
                        .optional()
                        .by("bridge stages")
                        .means("One diode of the stage's bridge."),
                quantity("stage-diodes.drop", Unit.VOLT, 0, 5)
                        .orElse("clip.diode-drop")
                        .by("bridge stages")
                        .means("Forward drop of one diode in the load's path."),
                quantity("stage-diodes.slope", Unit.OHM, 0, 10)
                        .orElse("0 ohm")
                        .by("bridge stages")
                        .means("Forward slope resistance of one diode in the load's path."),
                other("load", Kind.MAPPING).by("every design").means("What the power goes to."),
                word("load.kind", "resistor", "inductive", "filament")
                        .by("every design")
                        .means("Kind of load."),
                Key.make("load.rated", Kind.POWER_AT_VOLTAGE, Unit.WATT, 0.01, 1e6)
                        .by("resistors (or load.resistance) and filaments")
                        .means("Rated power, at a voltage; without \"at\" it is the line's."),
                quantity("load.resistance", Unit.OHM, 0.01, 1e6)
                        .by("inductive loads, and resistors without load.rated")
                        .means("Resistance of the load, hot."),
                quantity("load.inductance", Unit.HENRY, 1e-6, 100)
                        .by("inductive loads")
                        .means("Inductance in series with the load's resistance."),
                other("load.freewheel", Kind.MAPPING)
                        .optional()
                        .by("inductive loads of bridge-dc")
                        .means("Freewheeling diode across the load; none where there is none."),
                quantity("load.freewheel.drop", Unit.VOLT, 0, 5)
                        .orElse("clip.diode-drop")
                        .by("freewheeling diodes")
                        .means("Forward drop of the freewheeling diode."),
                quantity("load.freewheel.slope", Unit.OHM, 0, 10)
                        .orElse("0 ohm")
                        .by("freewheeling diodes")
                        .means("Slope resistance of the freewheeling diode."),
                quantity("load.exponent", Unit.NUMBER, 1, 2)
                        .orElse("1.55")
                        .by("filaments")
                        .means("How a filament's power grows with its voltage: 1.55 for tungsten, 2 for a resistor."),
                quantity("load.cold-ratio", Unit.NUMBER, 1, 30)
                        .orElse("15")
                        .by("filaments; 1 for resistors")
                        .means("Hot over cold resistance, which sets the inrush of a load that was off for long."));
    }

    private static List<Key> clip() {
        return List.of(
                other("clip", Kind.MAPPING).by("every design").means("The clipped supply."),
                word("clip.tap", "line", "thyristor")
                        .orElse("line")
                        .by("every design")
                        .means("What the supply's rectifier is across."),
                word("clip.rectifier", "bridge", "diode")
                        .orElse("bridge; diode for stage half-wave")
                        .by("every design")
                        .means("Rectifier of the firing supply: four diodes, or one."),
                quantity("clip.diode-drop", Unit.VOLT, 0, 5)
                        .orElse("0.7 V")
                        .by("every design")
                        .means("Forward drop of one rectifier diode."),
                part("clip.dropper", Unit.OHM, 100, 1e6)
                        .by("every design")
                        .means("The dropping resistor between rectifier and zener."),
                other("clip.zener", Kind.PROFILE).by("every design").means("The clipping zener."),
                other("clip.winding", Kind.PROFILE)
                        .optional()
                        .by("isolated firing supplies")
                        .means(
                                "Isolated synchronising winding that feeds the firing supply; none where there is none."));
    }

    private static List<Key> ramp() {
        return List.of(
                other("ramp", Kind.MAPPING).by("every design").means("The ramp that sets the firing angle."),
                part("ramp.capacitor", Unit.FARAD, 1e-10, 1e-4)
                        .by("every design")
                        .means("The ramp's capacitor C_E."),
                part("ramp.fixed", Unit.OHM, 0, 1e8)
                        .by("every design")
                        .means("The fixed part of the ramp's resistance R_E; above zero without a pot."),
                other("ramp.pot", Kind.MAPPING)
                        .optional()
                        .by("designs with a knob")
                        .means("The potentiometer, wired as a variable resistor; none for a fixed ramp."),
                part("ramp.pot.track", Unit.OHM, 10, 1e8)
                        .by("designs with a knob")
                        .means("Track resistance of the pot."),
                part("ramp.pot.end", Unit.OHM, 0, 1e5)
                        .orElse("0 ohm")
                        .by("designs with a knob")
                        .means("Resistance that is left at the pot's low end."),
                word("ramp.pot.law", "linear", "log", "reverse-log", "table")
                        .orElse("linear")
                        .by("designs with a knob")
                        .means("Track share against rotation."),
                quantity("ramp.pot.half", Unit.FRACTION, 0.01, 0.49)
                        .orElse("15 %")
                        .by("logarithmic pots")
                        .means("Track share of a logarithmic pot at half rotation."),
                other("ramp.pot.points", Kind.LIST)
                        .by("pots with law table")
                        .means("Measured pairs of rotation and track share, [[0 %, 0 %], ..., [100 %, 100 %]]."),
                word("ramp.pot.sense", "rising", "falling")
                        .orElse("rising")
                        .by("designs with a knob")
                        .means("rising: R_E grows clockwise and power falls; falling: the other way."),
                part("ramp.pot.shunt", Unit.OHM, 10, 1e9)
                        .optional()
                        .by("pots with a resistor across")
                        .means("Resistor across the used section of the pot; none where there is none."),
                part("ramp.trim-high", Unit.OHM, 10, 1e8)
                        .optional()
                        .by("ramps that are set on every unit")
                        .means(
                                "Trimmer in series with the fixed resistor, set on every unit at the highest wanted setting; the nominal unit has it at mid-track."),
                part("ramp.trim-low", Unit.OHM, 10, 1e9)
                        .optional()
                        .by("ramps that are set on every unit")
                        .means(
                                "Trimmer across the pot, in series with ramp.pot.shunt, set on every unit at the lowest wanted setting; the nominal unit has it at mid-track."));
    }

    private static List<Key> trigger() {
        return List.of(
                other("trigger", Kind.MAPPING).by("every design").means("The trigger device and its resistors."),
                other("trigger.device", Kind.PROFILE)
                        .by("every design")
                        .means("The unijunction, or programmable unijunction."),
                part("trigger.base-one", Unit.OHM, 1, 1e6)
                        .by("every design")
                        .means("Resistor from base one (or the cathode) to the firing common."),
                part("trigger.base-two", Unit.OHM, 0, 1e5)
                        .by("unijunctions")
                        .means("Resistor from base two to the clipped supply."),
                part("trigger.upper", Unit.OHM, 10, 1e8)
                        .by("programmable unijunctions")
                        .means("Upper divider resistor, from the clipped supply to the gate."),
                part("trigger.lower", Unit.OHM, 10, 1e8)
                        .by("programmable unijunctions")
                        .means("Lower divider resistor, from the gate to common."));
    }

    private static List<Key> gate() {
        return List.of(
                other("gate", Kind.MAPPING).by("every design").means("How the pulse reaches the gate."),
                word("gate.coupling", "direct", "transformer")
                        .by("every design")
                        .means("How base one and the gate are joined."),
                part("gate.series", Unit.OHM, 0, 1e5)
                        .orElse("0 ohm")
                        .by("every design")
                        .means("Resistor to the gate."),
                part("gate.shunt", Unit.OHM, 1, 1e6)
                        .optional()
                        .by("sensitive gates")
                        .means("Resistor from gate to cathode; none where there is none."),
                quantity("gate.overdrive", Unit.NUMBER, 1, 100)
                        .orElse("3")
                        .by("margins")
                        .means(
                                "How many times the trigger current the pulse is asked to give; 3 to 5 is common practice."),
                quantity("gate.charge-time", Unit.SECOND, 0, 0.01)
                        .orElse("20 us")
                        .by("margins")
                        .means("Gate charge asked of a pulse, as the trigger current times this time."),
                word("gate.polarity", "positive", "negative")
                        .orElse("positive")
                        .by("triacs")
                        .means("Sign of the gate pulse."),
                other("gate.transformer", Kind.MAPPING)
                        .by("coupling transformer")
                        .means("The pulse transformer."),
                Key.make("gate.transformer.ratio", Kind.RATIO, Unit.NUMBER, 0.05, 50)
                        .orElse("1")
                        .by("coupling transformer")
                        .means("Primary over secondary turns."),
                Key.make("gate.transformer.secondaries", Kind.WHOLE, Unit.NUMBER, 1, 2)
                        .orElse("1")
                        .by("coupling transformer; 2 for inverse-parallel")
                        .means("Number of secondaries."),
                quantity("gate.transformer.magnetising", Unit.HENRY, 1e-6, 100)
                        .by("coupling transformer")
                        .means("Magnetising inductance at the primary."),
                quantity("gate.transformer.primary-resistance", Unit.OHM, 0, 1e3)
                        .orElse("0 ohm")
                        .by("coupling transformer")
                        .means("Resistance of the primary."),
                quantity("gate.transformer.secondary-resistance", Unit.OHM, 0, 1e3)
                        .orElse("0 ohm")
                        .by("coupling transformer")
                        .means("Resistance of one secondary."),
                word("gate.transformer.clamp", "none", "diode")
                        .orElse("none")
                        .by("coupling transformer")
                        .means("Diode across the primary that catches its swing after the pulse."),
                quantity("gate.transformer.volt-seconds", Unit.VOLT_SECOND, 1e-7, 1)
                        .optional()
                        .by("the transformer's margin")
                        .means("Rated volt-seconds at the primary."));
    }

    private static List<Key> rest() {
        return List.of(
                other("thyristor", Kind.MAPPING).by("every design").means("The power switch as mounted."),
                other("thyristor.device", Kind.PROFILE)
                        .by("every design")
                        .means("The SCR or triac; inverse-parallel takes two alike."),
                quantity("thyristor.case-to-ambient", Unit.KELVIN_PER_WATT, 0.01, 1000)
                        .optional()
                        .by("junction temperature")
                        .means("Thermal resistance from case to ambient, sink included."),
                other("snubber", Kind.MAPPING)
                        .optional()
                        .by("inductive loads")
                        .means("Resistor and capacitor in series across the thyristor; none where there are none."),
                quantity("snubber.resistance", Unit.OHM, 0.1, 1e5)
                        .by("snubbers")
                        .means("The snubber's resistor."),
                quantity("snubber.capacitance", Unit.FARAD, 1e-11, 1e-4)
                        .by("snubbers")
                        .means("The snubber's capacitor."),
                other("surroundings", Kind.MAPPING).optional().by("margins").means("Ambient temperatures."),
                quantity("surroundings.coldest", Unit.CELSIUS, -60, 100)
                        .orElse("0 degC")
                        .by("margins")
                        .means("Lowest ambient temperature at which the design must work."),
                quantity("surroundings.hottest", Unit.CELSIUS, -20, 150)
                        .orElse("40 degC")
                        .by("margins")
                        .means("Highest ambient temperature at which the design must work."),
                other("wanted", Kind.MAPPING).optional().by("margins and size").means("What the knob is to reach."),
                other("wanted.lowest", Kind.GOAL)
                        .optional()
                        .by("margins and size")
                        .means("The load gets this or less, at a knob position; percent is of full-wave full power."),
                other("wanted.highest", Kind.GOAL)
                        .optional()
                        .by("margins and size")
                        .means("The load gets this or more, at a knob position; percent is of full-wave full power."),
                other("derating", Kind.MAPPING)
                        .optional()
                        .by("margins")
                        .means("How much of its rating a part may use."),
                quantity("derating.resistors", Unit.FRACTION, 0.01, 1)
                        .orElse("50 %")
                        .by("margins")
                        .means("Share of its rated power that a resistor may use; half is common practice."),
                other("designators", Kind.MAPPING)
                        .optional()
                        .by("drawing and record")
                        .means("Your drawing's own names by key, such as ramp.capacitor: C3."));
    }
}
