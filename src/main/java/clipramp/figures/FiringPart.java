package clipramp.figures;

import static clipramp.figures.Schematic.COMMON;
import static clipramp.figures.Schematic.SUPPLY;
import static clipramp.figures.Schematic.THYRISTOR_X;
import static clipramp.figures.Sheet.Hang.CENTRED;
import static clipramp.figures.Sheet.Hang.LEFT_OF;
import static clipramp.figures.Sheet.Hang.RIGHT_OF;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.Trigger;

/** The lower band of the schematic, from the dropper to the gate. */
final class FiringPart {
    /** Where the dropper begins. */
    static final double DROPPER_X = 16;

    private static final double ZENER_X = 22.3;
    private static final double RAMP_X = 32;
    private static final double EMITTER_Y = 28.5;
    private static final double BASE_ONE_Y = 31;
    private static final double GATE_WIRE_X = THYRISTOR_X - 1.5;
    private static final double GATE_TOP_Y = 10.75;

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
        if (design.gate().coupling() == GateDrive.Coupling.DIRECT) {
            directGate();
        } else {
            transformer(design.gate().transformer().orElseThrow());
        }
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
            symbols.resistor("ramp.fixed", Net.RAMP, RAMP_X, SUPPLY, RAMP_X, 23.2);
            symbols.adjustable("ramp.pot.track", Net.RAMP, RAMP_X, 23.2, RAMP_X, EMITTER_Y);
            sheet.beside(
                    "ramp.pot.track", RIGHT_OF, RAMP_X + 1.6, 25.85, text.ofResistor("ramp.pot.track", pot.track()));
            pot.shunt().ifPresent(this::potShunt);
        } else {
            symbols.resistor("ramp.fixed", Net.RAMP, RAMP_X, SUPPLY, RAMP_X, EMITTER_Y);
        }
        double middle = design.ramp().pot().isPresent() ? 21.1 : 23.75;
        sheet.beside(
                "ramp.fixed",
                RIGHT_OF,
                RAMP_X + 1,
                middle,
                text.ofResistor("ramp.fixed", design.ramp().fixed()));
        sheet.joint(Net.RAMP, RAMP_X, EMITTER_Y);
        symbols.capacitor("ramp.capacitor", Net.RAMP, RAMP_X, EMITTER_Y, RAMP_X, COMMON);
        sheet.joint(Net.COMMON, RAMP_X, COMMON);
        sheet.beside(
                "ramp.capacitor",
                RIGHT_OF,
                RAMP_X + 1.6,
                32.25,
                text.ofCapacitor("ramp.capacitor", design.ramp().capacitor()));
        sheet.ring(Net.RAMP, "", 37, EMITTER_Y);
        sheet.note(Net.RAMP, CENTRED, 37, EMITTER_Y + 1.7, "TP2");
    }

    private void potShunt(Part shunt) {
        double x = RAMP_X - 2.6;
        sheet.wire(Net.RAMP, RAMP_X, 23.4, x, 23.4);
        symbols.resistor("ramp.pot.shunt", Net.RAMP, x, 23.4, x, 28.1);
        sheet.wire(Net.RAMP, x, 28.1, RAMP_X, 28.1);
        sheet.joint(Net.RAMP, RAMP_X, 23.4);
        sheet.joint(Net.RAMP, RAMP_X, 28.1);
        sheet.beside("ramp.pot.shunt", LEFT_OF, x - 0.9, 25.75, text.ofResistor("ramp.pot.shunt", shunt));
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

    private void directGate() {
        double node = BASE_ONE_Y + 0.5;
        double gate = 56.3;
        sheet.wire(Net.PULSE, baseX, node, 50, node);
        series(50, node, 55, node);
        sheet.wire(Net.PULSE, 55, node, GATE_WIRE_X, node, GATE_WIRE_X, GATE_TOP_Y);
        sheet.above(
                "gate.series",
                52.5,
                node - 1,
                text.ofResistor("gate.series", design.gate().series()));
        probe(Net.PULSE, 60, node, "TP4");
        design.gate().shunt().ifPresent(shunt -> {
            sheet.joint(Net.PULSE, gate, node);
            symbols.resistor("gate.shunt", Net.PULSE, gate, node, gate, COMMON);
            sheet.joint(Net.COMMON, gate, COMMON);
            sheet.beside("gate.shunt", RIGHT_OF, gate + 0.9, 33.75, text.ofResistor("gate.shunt", shunt));
        });
        sheet.wire(Net.COMMON, baseX, COMMON, THYRISTOR_X, COMMON, THYRISTOR_X, 14);
        sheet.joint(Net.COMMON, THYRISTOR_X, 14);
    }

    /** R_G; a plain wire where it is 0 Ω. */
    private void series(double x1, double y1, double x2, double y2) {
        if (design.gate().series().value() > 0) {
            symbols.resistor("gate.series", Net.PULSE, x1, y1, x2, y2);
        } else {
            sheet.wire(Net.PULSE, x1, y1, x2, y2);
        }
    }

    private void transformer(PulseTransformer transformer) {
        String key = "gate.transformer";
        double node = BASE_ONE_Y + 0.5;
        double primary = 55.2;
        double secondary = 57.7;
        double from = node + 0.4;
        boolean two = transformer.secondaries() == 2;
        sheet.wire(Net.PULSE, baseX, node, primary, node, primary, from);
        symbols.coil(key, Net.PULSE, primary, from, primary, COMMON, true);
        sheet.wire(Net.COMMON, baseX, COMMON, primary, COMMON);
        symbols.core(key, primary + 1.25, two ? 19.5 : from, COMMON - 0.4);
        symbols.phase(key, primary - 0.55, from + 0.3);
        if (transformer.clampDiode()) {
            sheet.joint(Net.PULSE, 53, node);
            sheet.joint(Net.COMMON, 53, COMMON);
            symbols.diode(key, Net.PULSE, 53, COMMON, 53, node);
        }
        secondaryPhase(key, secondary, from);
        symbols.coil(key, Net.PULSE, secondary, from, secondary, COMMON, false);
        if (two) {
            twoGates(key, secondary, from);
        } else {
            oneGate(secondary, from);
        }
        sheet.label(
                key,
                Net.SYMBOL,
                two ? CENTRED : LEFT_OF,
                primary + (two ? 0.6 : 1.9),
                two ? 17.4 : 29.2,
                text.ofTransformer(transformer));
    }

    private void secondaryPhase(String key, double x, double top) {
        boolean positive = design.gate().polarity() == GateDrive.Polarity.POSITIVE;
        symbols.phase(key, x + 0.9, positive ? top + 0.4 : COMMON - 0.4);
    }

    private void oneGate(double secondary, double from) {
        double gateY = 20.5;
        double cathode = THYRISTOR_X;
        sheet.wire(Net.PULSE, secondary, from, secondary, 28);
        series(secondary, 28, secondary, 22.5);
        sheet.wire(Net.PULSE, secondary, 22.5, secondary, 17.5, GATE_WIRE_X, 17.5, GATE_WIRE_X, GATE_TOP_Y);
        sheet.beside(
                "gate.series",
                LEFT_OF,
                secondary - 1,
                25.25,
                text.ofResistor("gate.series", design.gate().series()));
        probe(Net.PULSE, 58.5, 17.5, "TP4");
        sheet.wire(Net.COMMON, secondary, COMMON, cathode, COMMON, cathode, 14);
        sheet.joint(Net.COMMON, cathode, 14);
        design.gate().shunt().ifPresent(shunt -> {
            sheet.joint(Net.PULSE, secondary, gateY);
            symbols.resistor("gate.shunt", Net.PULSE, secondary, gateY, cathode, gateY);
            sheet.joint(Net.COMMON, cathode, gateY);
            sheet.label(
                    "gate.shunt",
                    Net.SYMBOL,
                    CENTRED,
                    (secondary + cathode) / 2,
                    gateY + 2.1,
                    text.ofResistor("gate.shunt", shunt));
        });
    }

    private void twoGates(String key, double secondary, double from) {
        double firstTop = 20;
        double firstBottom = 24.2;
        symbols.coil(key, Net.PULSE, secondary, firstTop, secondary, firstBottom, false);
        secondaryPhaseOfFirst(key, secondary, firstTop, firstBottom);
        gateNetwork(secondary, firstTop, firstBottom, "1", true);
        gateNetwork(secondary, from, COMMON, "2", false);
        probe(Net.PULSE, 65, firstTop, "TP4");
    }

    private void secondaryPhaseOfFirst(String key, double x, double top, double bottom) {
        boolean positive = design.gate().polarity() == GateDrive.Polarity.POSITIVE;
        symbols.phase(key, x + 0.9, positive ? top + 0.4 : bottom - 0.4);
    }

    private void gateNetwork(double x, double top, double bottom, String number, boolean lettered) {
        double shuntX = 62.5;
        series(x, top, shuntX - 1, top);
        sheet.wire(Net.PULSE, shuntX - 1, top, 65, top);
        sheet.wire(Net.COMMON, x, bottom, 65, bottom);
        design.gate().shunt().ifPresent(shunt -> {
            sheet.joint(Net.PULSE, shuntX, top);
            symbols.resistor("gate.shunt", Net.PULSE, shuntX, top, shuntX, bottom);
            sheet.joint(Net.COMMON, shuntX, bottom);
            if (lettered) {
                sheet.label(
                        "gate.shunt", Net.SYMBOL, CENTRED, 61.2, bottom + 1.7, text.ofResistor("gate.shunt", shunt));
            }
        });
        if (lettered) {
            sheet.above(
                    "gate.series",
                    60.2,
                    top - 1,
                    text.ofResistor("gate.series", design.gate().series()));
        }
        sheet.note(Net.PULSE, RIGHT_OF, 65.4, top + 0.35, "G" + number);
        sheet.note(Net.PULSE, RIGHT_OF, 65.4, bottom + 0.35, "K" + number);
    }
}
