package clipramp.figures;

import static clipramp.figures.Sheet.Hang.CENTRED;
import static clipramp.figures.Sheet.Hang.LEFT_OF;
import static clipramp.figures.Sheet.Hang.RIGHT_OF;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;

/**
 * Lays a design out on a sheet: line, load and thyristor in a band above; below it, in the order of the signal, clipped
 * supply, ramp, trigger and gate drive.
 */
final class Schematic {
    static final double WIDTH = 68;
    static final double HEIGHT = 39;

    static final double TOP = 4;
    static final double BOTTOM = 14;
    /** The clipped supply's rail, and the firing common. */
    static final double SUPPLY = 19;

    static final double COMMON = 36;
    static final double LIVE_TAP = 5;
    static final double THYRISTOR_X = 64;

    private final Design design;
    private final PartText text;
    private final Sheet sheet = new Sheet();
    private final Symbols symbols = new Symbols(sheet);
    /** Where the load's far end, the thyristor's anode, can be tapped; and the rail before the load. */
    private double anodeTapX;

    private double railTapX;
    private double bottomFromX = 1;

    private Schematic(Design design) {
        this.design = design;
        this.text = new PartText(design);
    }

    static Sheet of(Design design) {
        Schematic schematic = new Schematic(design);
        schematic.power();
        new FeedPart(
                        design,
                        schematic.text,
                        schematic.sheet,
                        schematic.symbols,
                        new FeedPart.Taps(schematic.railTapX, schematic.anodeTapX, schematic.bottomFromX))
                .draw();
        new FiringPart(design, schematic.text, schematic.sheet, schematic.symbols).draw();
        return schematic.sheet;
    }

    private void power() {
        switch (design.stage()) {
            case BRIDGE_DC -> bridgeDc();
            case BRIDGE_AC -> bridgeAc();
            case HALF_WAVE, INVERSE_PARALLEL, TRIAC -> lineSide();
        }
        thyristors();
        potential();
    }

    /** What a hand or a probe may touch: nothing, unless both transformers stand between. */
    private void potential() {
        boolean separated = design.clip().isIsolated() && design.gate().coupling() == GateDrive.Coupling.TRANSFORMER;
        double x = design.stage().bridgeDiodes() > 0 ? 32 : 20;
        double y = 9;
        if (separated) {
            sheet.plain(
                    Net.COMMON, x, y, "Only " + text.name("clip.winding") + " and " + text.name("gate.transformer"));
            sheet.plain(Net.COMMON, x, y + 1.2, "stand between firing circuit and line.");
        } else {
            sheet.plain(Net.COMMON, x, y, "Everything drawn is at line potential.");
        }
    }

    private void terminals(double live, double neutral) {
        sheet.ring(Net.LINE, "line", 1, live);
        sheet.ring(Net.LINE, "line", 1, neutral);
        sheet.label("line", Net.LINE, RIGHT_OF, 0.6, live - 1.9, text.ofLine());
        sheet.note(Net.LINE, RIGHT_OF, 0.6, neutral + 1.5, "N");
    }

    private void lineSide() {
        terminals(TOP, BOTTOM);
        sheet.wire(Net.LINE, 1.3, TOP, 8, TOP);
        load(8, 15, TOP);
        anodeTapX = 17.5;
        railTapX = LIVE_TAP;
        sheet.wire(Net.LOAD, 15, TOP, THYRISTOR_X, TOP);
        sheet.wire(Net.LINE, 1.3, BOTTOM, THYRISTOR_X, BOTTOM);
    }

    private void bridgeDc() {
        terminals(8, 10.5);
        sheet.wire(Net.LINE, 1.3, 8, 8, 8);
        sheet.wire(Net.LINE, 1.3, 10.5, 12, 10.5);
        stageBridge(Net.LINE, 8, 12);
        railTapX = 19.5;
        sheet.wire(Net.LINE, 12, TOP, 21, TOP);
        load(21, 28, TOP);
        anodeTapX = 30.5;
        bottomFromX = 12;
        sheet.wire(Net.LOAD, 28, TOP, THYRISTOR_X, TOP);
        sheet.wire(Net.COMMON, 12, BOTTOM, THYRISTOR_X, BOTTOM);
    }

    private void bridgeAc() {
        terminals(8, 10.5);
        sheet.wire(Net.LINE, 1.3, 8, 7.5, 8);
        load(7.5, 14.5, 8);
        sheet.wire(Net.LOAD, 14.5, 8, 17, 8);
        sheet.wire(Net.LINE, 1.3, 10.5, 21, 10.5);
        stageBridge(Net.LOAD, 17, 21);
        anodeTapX = 27.5;
        railTapX = LIVE_TAP;
        bottomFromX = 21;
        sheet.wire(Net.LOAD, 21, TOP, THYRISTOR_X, TOP);
        sheet.wire(Net.COMMON, 21, BOTTOM, THYRISTOR_X, BOTTOM);
    }

    private void stageBridge(Net net, double left, double right) {
        String key = "stage-diodes";
        symbols.bridge(key, net, left, right, TOP, BOTTOM, 8, 10.5);
        sheet.label(
                key,
                Net.SYMBOL,
                RIGHT_OF,
                right + 1.2,
                7.2,
                text.ofDiodes(key, design.stageDiodes().dropVolts()));
    }

    private void load(double x1, double x2, double y) {
        Load load = design.load();
        double centre = (x1 + x2) / 2;
        if (load instanceof Load.Filament) {
            symbols.lamp("load", Net.LOAD, x1, y, x2, y);
        } else if (load instanceof Load.Inductive inductive) {
            symbols.resistor("load", Net.LOAD, x1, y, centre, y);
            symbols.coil("load", Net.LOAD, centre, y, x2, y, false);
            inductive.freewheel().ifPresent(diode -> freewheel(x1, x2, y));
        } else {
            symbols.resistor("load", Net.LOAD, x1, y, x2, y);
        }
        sheet.label("load", Net.LOAD, CENTRED, centre, y - 2.7, text.ofLoad());
    }

    /** Lets the load's current go on when the thyristor's ends: cathode at the rail that is positive. */
    private void freewheel(double x1, double x2, double y) {
        sheet.wire(Net.LOAD, x1, y, x1, y + 2.5);
        sheet.wire(Net.LOAD, x2, y, x2, y + 2.5);
        symbols.diode("load", Net.LOAD, x2, y + 2.5, x1, y + 2.5);
        sheet.joint(Net.LOAD, x1, y);
        sheet.joint(Net.LOAD, x2, y);
    }

    private void thyristors() {
        String key = "thyristor.device";
        String id = design.thyristor().device().id();
        sheet.ring(Net.LOAD, "", THYRISTOR_X - 6, TOP);
        sheet.note(Net.LOAD, CENTRED, THYRISTOR_X - 6, TOP - 0.9, "TP5");
        if (design.stage() == Stage.INVERSE_PARALLEL) {
            symbols.thyristor(key, Net.LOAD, 50, TOP, 50, BOTTOM, true);
            symbols.thyristor(key, Net.LOAD, THYRISTOR_X, BOTTOM, THYRISTOR_X, TOP, false);
            sheet.joint(Net.LOAD, 50, TOP);
            sheet.joint(Net.LINE, 50, BOTTOM);
            sheet.label(key, Net.SYMBOL, LEFT_OF, 48.3, 8.2, text.ofDevice(key, id));
            flag(48.5, 10.75, "G1");
            flag(THYRISTOR_X - 1.5, 7.25, "G2");
            sheet.note(Net.PULSE, CENTRED, 50, BOTTOM + 1.5, "K1");
            sheet.note(Net.PULSE, CENTRED, THYRISTOR_X, TOP - 0.9, "K2");
            return;
        }
        if (design.stage() == Stage.TRIAC) {
            symbols.triac(key, Net.LOAD, THYRISTOR_X, TOP, THYRISTOR_X, BOTTOM, true);
        } else {
            symbols.thyristor(key, Net.LOAD, THYRISTOR_X, TOP, THYRISTOR_X, BOTTOM, true);
        }
        sheet.label(key, Net.SYMBOL, LEFT_OF, THYRISTOR_X - 2.2, 8.2, text.ofDevice(key, id));
    }

    /** A wire's end that goes on at the other flag of the same name. */
    private void flag(double x, double y, String name) {
        sheet.wire(Net.PULSE, x, y, x - 0.8, y);
        sheet.note(Net.PULSE, LEFT_OF, x - 1.1, y + 0.35, name);
    }
}
