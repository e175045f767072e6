package clipramp.figures;

import static clipramp.figures.Schematic.COMMON;
import static clipramp.figures.Schematic.SUPPLY;
import static clipramp.figures.Sheet.Hang.CENTRED;
import static clipramp.figures.Sheet.Hang.LEFT_OF;
import static clipramp.figures.Sheet.Hang.RIGHT_OF;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.Ramp;
import clipramp.circuit.Trigger;
import clipramp.figures.Sheet.Hang;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.List;
import java.util.Optional;

/** The lower band of the schematic, from the dropper to the gate. */
final class FiringPart {
    /** Where the dropper begins. */
    static final double DROPPER_X = 16;

    private static final double ZENER_X = 22.3;
    private static final double RAMP_X = 32;
    private static final double EMITTER_Y = 28.5;
    static final double BASE_ONE_Y = 31;

    private final Design design;
    private final PartText text;
    private final Sheet sheet;
    private final Symbols symbols;
    /** The column of base two and base one, or of anode and cathode. */
    private final double baseX;

    FiringPart(Design design, PartText text, Sheet sheet, Symbols symbols) {
        this.design = design;
        this.text = text;
        this.sheet = sheet;
        this.symbols = symbols;
        this.baseX = design.trigger() instanceof Trigger.ProgrammableTrigger ? 42 : 44;
    }

    void draw() {
        supply();
        ramp();
        if (design.trigger() instanceof Trigger.UnijunctionTrigger unijunction) {
            unijunction(unijunction);
        } else if (design.trigger() instanceof Trigger.ProgrammableTrigger programmable) {
            programmable(programmable);
        }
        baseOne();
        new GatePart(design, text, sheet, symbols, baseX).draw();
    }

    private void probe(Net net, double x, double y, String name) {
        sheet.ring(net, "", x, y);
        sheet.note(net, CENTRED, x, y - 0.9, name);
    }

    private void supply() {
        symbols.resistor("clip.dropper", Net.SUPPLY, DROPPER_X, SUPPLY, 20.5, SUPPLY);
        sheet.label(
                "clip.dropper",
                Net.SYMBOL,
                CENTRED,
                18.4,
                SUPPLY + 2,
                text.ofResistor("clip.dropper", design.clip().dropper()));
        sheet.wire(Net.SUPPLY, 20.5, SUPPLY, baseX, SUPPLY);
        probe(Net.SUPPLY, 26.5, SUPPLY, "TP1");
        symbols.zener("clip.zener", Net.SUPPLY, ZENER_X, COMMON, ZENER_X, SUPPLY);
        sheet.beside("clip.zener", RIGHT_OF, ZENER_X + 1.2, 30.3, text.ofZener());
        sheet.joint(Net.SUPPLY, ZENER_X, SUPPLY);
        sheet.joint(Net.COMMON, ZENER_X, COMMON);
        sheet.ring(Net.COMMON, "", 20, COMMON);
        sheet.note(Net.COMMON, CENTRED, 20, COMMON + 1.7, "TP0");
        sheet.wire(Net.COMMON, hasLeftReturn() ? DROPPER_X : 20, COMMON, baseX, COMMON);
    }

    /** Whether the common comes from the supply's side; else it hangs on the thyristor's cathode alone. */
    private boolean hasLeftReturn() {
        return design.gate().coupling() == GateDrive.Coupling.TRANSFORMER
                || design.clip().isIsolated()
                || !(design.isSuppliedByStageBridge()
                        || design.clip().rectifier().diodesInPath() == 1);
    }

    private void ramp() {
        sheet.joint(Net.SUPPLY, RAMP_X, SUPPLY);
        if (design.ramp().pot().isPresent()) {
            Pot pot = design.ramp().pot().get();
            fixed(23.2);
            symbols.adjustable("ramp.pot.track", Net.RAMP, RAMP_X, 23.2, RAMP_X, EMITTER_Y);
            sheet.beside(
                    "ramp.pot.track", RIGHT_OF, RAMP_X + 1.6, 25.85, text.ofResistor("ramp.pot.track", pot.track()));
            if (Double.isFinite(design.ramp().acrossOhms())) {
                potShunt(pot.shunt());
            }
        } else {
            fixed(EMITTER_Y);
        }
        double middle = design.ramp().pot().isPresent() ? 21.1 : 23.75;
        double aside = design.ramp().trimmers().high().isPresent() ? 1.5 : 1;
        named(
                RIGHT_OF,
                RAMP_X + aside,
                middle,
                "ramp.fixed",
                Optional.of(design.ramp().fixed()),
                "ramp.trim-high");
        capacitor();
    }

    private void capacitor() {
        sheet.joint(Net.RAMP, RAMP_X, EMITTER_Y);
        symbols.capacitor("ramp.capacitor", Net.RAMP, RAMP_X, EMITTER_Y, RAMP_X, COMMON);
        sheet.joint(Net.COMMON, RAMP_X, COMMON);
        // Beside a programmable device the cathode resistor's label needs the room at the right.
        boolean programmable = design.trigger() instanceof Trigger.ProgrammableTrigger;
        sheet.beside(
                "ramp.capacitor",
                programmable ? LEFT_OF : RIGHT_OF,
                RAMP_X + (programmable ? -1.6 : 1.6),
                programmable ? 33.5 : 32.25,
                text.ofCapacitor("ramp.capacitor", design.ramp().capacitor()));
        sheet.ring(Net.RAMP, "", 37, EMITTER_Y);
        sheet.note(Net.RAMP, CENTRED, 37, EMITTER_Y + 1.7, "TP2");
    }

    private void fixed(double toY) {
        if (design.ramp().trimmers().high().isPresent()) {
            symbols.preset("ramp.fixed", Net.RAMP, RAMP_X, SUPPLY, RAMP_X, toY);
        } else {
            symbols.resistor("ramp.fixed", Net.RAMP, RAMP_X, SUPPLY, RAMP_X, toY);
        }
    }

    /** A trimmer and the resistor in series with it share one symbol and are told one under the other. */
    private void named(Hang hang, double x, double y, String key, Optional<Part> part, String trimmerKey) {
        Ramp ramp = design.ramp();
        Optional<Part> trimmer = trimmerKey.equals("ramp.trim-high")
                ? ramp.trimmers().high()
                : ramp.trimmers().low();
        if (trimmer.isEmpty()) {
            part.ifPresent(p -> sheet.beside(key, hang, x, y, text.ofResistor(key, p)));
        } else {
            boolean broken = hang == LEFT_OF;
            double apart = part.isEmpty() ? 0 : broken ? 1.35 : 0.8;
            part.ifPresent(p -> sheet.beside(key, hang, x, y - apart, brief(key, p, broken)));
            sheet.beside(trimmerKey, hang, x, y + apart, brief(trimmerKey, trimmer.get(), broken));
        }
    }

    /** Name and value; broken in two where the zener beside leaves no room for both in one line. */
    private List<String> brief(String key, Part part, boolean broken) {
        String value = QuantityText.format(part.value(), Unit.OHM);
        return broken ? List.of(text.name(key), value) : List.of(text.name(key) + "  " + value);
    }

    private void potShunt(Optional<Part> shunt) {
        Optional<Part> trimmer = design.ramp().trimmers().low();
        double x = RAMP_X - 2.6;
        sheet.wire(Net.RAMP, RAMP_X, 23.4, x, 23.4);
        if (trimmer.isPresent()) {
            symbols.preset("ramp.pot.shunt", Net.RAMP, x, 23.4, x, 28.1);
        } else {
            symbols.resistor("ramp.pot.shunt", Net.RAMP, x, 23.4, x, 28.1);
        }
        sheet.wire(Net.RAMP, x, 28.1, RAMP_X, 28.1);
        sheet.joint(Net.RAMP, RAMP_X, 23.4);
        sheet.joint(Net.RAMP, RAMP_X, 28.1);
        named(LEFT_OF, x - (trimmer.isPresent() ? 1.5 : 0.9), 25.75, "ramp.pot.shunt", shunt, "ramp.trim-low");
    }

    private void unijunction(Trigger.UnijunctionTrigger trigger) {
        String key = "trigger.device";
        double bar = baseX - 1;
        sheet.wire(Net.RAMP, RAMP_X, EMITTER_Y, bar - 2, EMITTER_Y);
        symbols.unijunction(key, bar, EMITTER_Y + 0.75);
        symbols.resistor("trigger.base-two", Net.SUPPLY, baseX, SUPPLY, baseX, 23.5);
        sheet.wire(Net.SUPPLY, baseX, 23.5, baseX, EMITTER_Y - 1.25);
        sheet.wire(Net.PULSE, baseX, EMITTER_Y + 2.5, baseX, BASE_ONE_Y + 0.5);
        sheet.beside(
                "trigger.base-two", RIGHT_OF, baseX + 1, 21.25, text.ofResistor("trigger.base-two", trigger.baseTwo()));
        sheet.label(key, Net.SYMBOL, RIGHT_OF, baseX + 1.5, 26.4, text.ofDevice(key, trigger.deviceId()));
    }

    private void programmable(Trigger.ProgrammableTrigger trigger) {
        String key = "trigger.device";
        double x = baseX;
        double divider = x + 3.5;
        sheet.wire(Net.RAMP, RAMP_X, EMITTER_Y, 39.4, EMITTER_Y, 39.4, 26, x, 26);
        symbols.programmable(key, Net.RAMP, Net.PULSE, x, 26, EMITTER_Y, BASE_ONE_Y + 0.5);
        sheet.wire(Net.SUPPLY, x, SUPPLY, divider, SUPPLY);
        sheet.wire(Net.SUPPLY, x + 1.5, EMITTER_Y - 0.2, divider, EMITTER_Y - 0.2);
        symbols.resistor("trigger.upper", Net.SUPPLY, divider, SUPPLY, divider, 24);
        sheet.wire(Net.SUPPLY, divider, 24, divider, 29.5);
        sheet.joint(Net.SUPPLY, divider, EMITTER_Y - 0.2);
        symbols.resistor("trigger.lower", Net.SUPPLY, divider, 31.2, divider, COMMON);
        sheet.wire(Net.SUPPLY, divider, 29.5, divider, 31.2);
        sheet.beside("trigger.upper", RIGHT_OF, divider + 1, 21.5, text.ofResistor("trigger.upper", trigger.upper()));
        sheet.beside("trigger.lower", RIGHT_OF, divider + 1, 33.6, text.ofResistor("trigger.lower", trigger.lower()));
        sheet.wire(Net.COMMON, x, COMMON, divider, COMMON);
        sheet.joint(Net.COMMON, divider, COMMON);
        sheet.label(key, Net.SYMBOL, CENTRED, x, 21.6, text.ofDevice(key, trigger.deviceId()));
    }

    private void baseOne() {
        double node = BASE_ONE_Y + 0.5;
        sheet.joint(Net.PULSE, baseX, node);
        symbols.resistor("trigger.base-one", Net.PULSE, baseX, node, baseX, COMMON);
        sheet.joint(Net.COMMON, baseX, COMMON);
        boolean programmable = design.trigger() instanceof Trigger.ProgrammableTrigger;
        sheet.beside(
                "trigger.base-one",
                programmable ? LEFT_OF : RIGHT_OF,
                programmable ? baseX - 1 : baseX + 1,
                programmable ? 34.35 : 33.75,
                text.ofResistor("trigger.base-one", design.trigger().baseOne()));
        if (programmable) {
            sheet.ring(Net.PULSE, "", baseX + 1.8, node);
            sheet.note(Net.PULSE, CENTRED, baseX + 1.8, node + 1.7, "TP3");
        } else {
            probe(Net.PULSE, baseX + 3, node, "TP3");
        }
    }
}
