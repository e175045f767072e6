package clipramp.figures;

import static clipramp.figures.Sheet.Hang.CENTRED;
import static clipramp.figures.Sheet.Hang.LEFT_OF;
import static clipramp.figures.Sheet.Hang.RIGHT_OF;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.Winding;

/**
 * Lays a design out on a sheet: line, load and thyristor in a band above; below it, in the order of the signal, clipped
 * supply, ramp, trigger and gate drive.
 */
final class Schematic {
    static final double WIDTH = 68;
    static final double HEIGHT = 39;

    private static final double TOP = 4;
    private static final double BOTTOM = 14;
    /** The row between both bands, where a tap turns. */
    private static final double TURN = 16.5;
    /** The clipped supply's rail, and the firing common. */
    static final double SUPPLY = 19;

    static final double COMMON = 36;
    private static final double LIVE_TAP = 5;
    private static final double NEUTRAL_TAP = 2.5;
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
        schematic.feed();
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
        bridge("stage-diodes", Net.LINE, 8, 12, TOP, BOTTOM, 8, 10.5);
        sheet.label(
                "stage-diodes",
                Net.SYMBOL,
                RIGHT_OF,
                13.2,
                7.2,
                text.ofDiodes("stage-diodes", design.stageDiodes().dropVolts()));
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
        bridge("stage-diodes", Net.LOAD, 17, 21, TOP, BOTTOM, 8, 10.5);
        sheet.label(
                "stage-diodes",
                Net.SYMBOL,
                RIGHT_OF,
                22.2,
                7.2,
                text.ofDiodes("stage-diodes", design.stageDiodes().dropVolts()));
        anodeTapX = 27.5;
        railTapX = LIVE_TAP;
        bottomFromX = 21;
        sheet.wire(Net.LOAD, 21, TOP, THYRISTOR_X, TOP);
        sheet.wire(Net.COMMON, 21, BOTTOM, THYRISTOR_X, BOTTOM);
    }

    /** Four diodes on two legs; the ac wires arrive at the given heights, the second crossing the first leg. */
    private void bridge(
            String key, Net net, double left, double right, double top, double bottom, double acOne, double acTwo) {
        for (double x : new double[] {left, right}) {
            symbols.diode(key, net, x, acOne, x, top);
            symbols.diode(key, net, x, bottom, x, acTwo);
            sheet.wire(net, x, acOne, x, acTwo);
        }
        sheet.wire(net, left, top, right, top);
        sheet.wire(net, left, bottom, right, bottom);
        sheet.joint(net, left, acOne);
        sheet.joint(net, right, acTwo);
        sheet.joint(net, right, top);
        sheet.joint(net, right, bottom);
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

    /** From the tap to the dropper's left end at {@code FiringPart.DROPPER_X}. */
    private void feed() {
        ClipSupply clip = design.clip();
        if (clip.winding().isPresent()) {
            winding(clip.winding().get());
        } else if (design.isSuppliedByStageBridge() || clip.rectifier() == ClipSupply.Rectifier.DIODE) {
            singleFeed();
        } else {
            tapDown(clip.tap() == ClipSupply.Tap.LINE ? LIVE_TAP : anodeTapX, LIVE_TAP, 27);
            neutralDown(30);
            sheet.wire(Net.LINE, LIVE_TAP, 27, 8, 27);
            sheet.wire(Net.LINE, NEUTRAL_TAP, 30, 12, 30);
            ownBridge(8, 12, 27, 30);
        }
    }

    private void ownBridge(double left, double right, double acOne, double acTwo) {
        String key = "clip.rectifier";
        bridge(key, Net.LINE, left, right, SUPPLY, COMMON, acOne, acTwo);
        sheet.label(
                key,
                Net.SYMBOL,
                RIGHT_OF,
                right + 1,
                27.6,
                text.ofDiodes(key, design.clip().diodeDropVolts()));
        sheet.wire(Net.LINE, right, SUPPLY, FiringPart.DROPPER_X, SUPPLY);
        sheet.wire(Net.COMMON, right, COMMON, FiringPart.DROPPER_X, COMMON);
    }

    /** One wire from the stage, with the supply's own diode in it where it has one. */
    private void singleFeed() {
        boolean fromLine = design.clip().tap() == ClipSupply.Tap.LINE;
        double from = fromLine ? railTapX : anodeTapX;
        boolean diode = design.clip().rectifier() == ClipSupply.Rectifier.DIODE;
        double down = diode ? 8 : 14;
        tapDown(from, down, SUPPLY);
        if (diode) {
            symbols.diode("clip.rectifier", Net.LINE, down, SUPPLY, FiringPart.DROPPER_X, SUPPLY);
            sheet.label(
                    "clip.rectifier",
                    Net.SYMBOL,
                    CENTRED,
                    (down + FiringPart.DROPPER_X) / 2,
                    SUPPLY + 2,
                    text.ofDiodes("clip.rectifier", design.clip().diodeDropVolts()));
        } else {
            sheet.wire(Net.LINE, down, SUPPLY, FiringPart.DROPPER_X, SUPPLY);
        }
        if (design.gate().coupling() == GateDrive.Coupling.TRANSFORMER) {
            double start = Math.max(NEUTRAL_TAP, bottomFromX);
            double back = Math.min(start, diode ? 6 : 12);
            double turn = TURN - 1.2;
            sheet.joint(Net.COMMON, start, BOTTOM);
            sheet.wire(Net.COMMON, start, BOTTOM, start, turn, back, turn, back, COMMON, FiringPart.DROPPER_X, COMMON);
        }
    }

    /** Down from the upper band at {@code from}, over to {@code to}, and down to a height. */
    private void tapDown(double from, double to, double y) {
        boolean bridged = design.stage().bridgeDiodes() > 0;
        boolean beforeBridge = bridged && from == LIVE_TAP;
        double start = beforeBridge ? 8 : TOP;
        sheet.joint(from == anodeTapX ? Net.LOAD : Net.LINE, from, start);
        if (from == to) {
            sheet.wire(Net.LINE, from, start, from, y);
        } else {
            sheet.wire(Net.LINE, from, start, from, TURN, to, TURN, to, y);
        }
    }

    private void neutralDown(double y) {
        double start = design.stage().bridgeDiodes() > 0 ? 10.5 : BOTTOM;
        sheet.joint(Net.LINE, NEUTRAL_TAP, start);
        sheet.wire(Net.LINE, NEUTRAL_TAP, start, NEUTRAL_TAP, y);
    }

    private void winding(Winding winding) {
        String key = "clip.winding";
        tapDown(LIVE_TAP, LIVE_TAP, 25);
        neutralDown(30);
        sheet.wire(Net.LINE, NEUTRAL_TAP, 30, LIVE_TAP, 30);
        symbols.coil(key, Net.LINE, LIVE_TAP, 25, LIVE_TAP, 30, true);
        symbols.core(key, 6.1, 25.6, 29.4);
        symbols.coil(key, Net.LINE, 7.2, 25, 7.2, 30, false);
        symbols.phase(key, 4.2, 26);
        symbols.phase(key, 8, winding.opposite() ? 29 : 26);
        sheet.label(
                key,
                Net.SYMBOL,
                CENTRED,
                6.1,
                32,
                text.ofWinding(winding).stream().filter(line -> !line.isEmpty()).toList());
        if (design.clip().rectifier() == ClipSupply.Rectifier.BRIDGE) {
            sheet.wire(Net.LINE, 7.2, 25, 10.5, 25);
            sheet.wire(Net.LINE, 7.2, 30, 14, 30);
            ownBridge(10.5, 14, 25, 30);
        } else {
            sheet.wire(Net.LINE, 7.2, 25, 7.2, SUPPLY, 9.5, SUPPLY);
            symbols.diode("clip.rectifier", Net.LINE, 9.5, SUPPLY, FiringPart.DROPPER_X, SUPPLY);
            sheet.label(
                    "clip.rectifier",
                    Net.SYMBOL,
                    CENTRED,
                    12,
                    SUPPLY + 2,
                    text.ofDiodes("clip.rectifier", design.clip().diodeDropVolts()));
            sheet.wire(Net.COMMON, 7.2, 30, 10, 30, 10, COMMON, FiringPart.DROPPER_X, COMMON);
        }
    }
}
