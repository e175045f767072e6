package clipramp.figures;

import static clipramp.figures.FiringPart.BASE_ONE_Y;
import static clipramp.figures.Schematic.COMMON;
import static clipramp.figures.Schematic.THYRISTOR_X;
import static clipramp.figures.Sheet.Hang.CENTRED;
import static clipramp.figures.Sheet.Hang.LEFT_OF;
import static clipramp.figures.Sheet.Hang.RIGHT_OF;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.PulseTransformer;

/** The right end of the schematic's lower band: from base one to the gate, directly or through a pulse transformer. */
final class GatePart {
    private static final double GATE_WIRE_X = THYRISTOR_X - 1.5;
    private static final double GATE_TOP_Y = 10.75;

    private final Design design;
    private final PartText text;
    private final Sheet sheet;
    private final Symbols symbols;
    private final double baseX;

    /** @param baseX column of base one */
    GatePart(Design design, PartText text, Sheet sheet, Symbols symbols, double baseX) {
        this.design = design;
        this.text = text;
        this.sheet = sheet;
        this.symbols = symbols;
        this.baseX = baseX;
    }

    void draw() {
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
