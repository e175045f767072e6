package clipramp.figures;

import static clipramp.figures.FiringPart.DROPPER_X;
import static clipramp.figures.Schematic.BOTTOM;
import static clipramp.figures.Schematic.COMMON;
import static clipramp.figures.Schematic.LIVE_TAP;
import static clipramp.figures.Schematic.SUPPLY;
import static clipramp.figures.Schematic.TOP;
import static clipramp.figures.Sheet.Hang.CENTRED;
import static clipramp.figures.Sheet.Hang.RIGHT_OF;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Winding;

/** What leads from the power band down to the dropper: taps, winding, the supply's own rectifier. */
final class FeedPart {
    private static final double NEUTRAL_TAP = 2.5;

    /** The row between both bands, where a tap turns. */
    private static final double TURN = 16.5;

    private final Design design;
    private final PartText text;
    private final Sheet sheet;
    private final Symbols symbols;
    private final Taps taps;

    /**
     * Columns of the power band in the sheet's units.
     *
     * @param railTapX where the rail before the load can be tapped
     * @param anodeTapX where the load's far end, the thyristor's anode, can be tapped
     * @param bottomFromX where the lower wire of the band begins
     */
    record Taps(double railTapX, double anodeTapX, double bottomFromX) {}

    FeedPart(Design design, PartText text, Sheet sheet, Symbols symbols, Taps taps) {
        this.design = design;
        this.text = text;
        this.sheet = sheet;
        this.symbols = symbols;
        this.taps = taps;
    }

    /** From the tap to the dropper's left end at {@code DROPPER_X}. */
    void draw() {
        ClipSupply clip = design.clip();
        if (clip.winding().isPresent()) {
            winding(clip.winding().get());
        } else if (design.isSuppliedByStageBridge() || clip.rectifier() == ClipSupply.Rectifier.DIODE) {
            singleFeed();
        } else {
            tapDown(clip.tap() == ClipSupply.Tap.LINE ? LIVE_TAP : taps.anodeTapX(), LIVE_TAP, 27);
            neutralDown(30);
            sheet.wire(Net.LINE, LIVE_TAP, 27, 8, 27);
            sheet.wire(Net.LINE, NEUTRAL_TAP, 30, 12, 30);
            ownBridge(8, 12, 27, 30);
        }
    }

    private void ownBridge(double left, double right, double acOne, double acTwo) {
        String key = "clip.rectifier";
        symbols.bridge(key, Net.LINE, left, right, SUPPLY, COMMON, acOne, acTwo);
        sheet.label(
                key,
                Net.SYMBOL,
                RIGHT_OF,
                right + 1,
                27.6,
                text.ofDiodes(key, design.clip().diodeDropVolts()));
        sheet.wire(Net.LINE, right, SUPPLY, DROPPER_X, SUPPLY);
        sheet.wire(Net.COMMON, right, COMMON, DROPPER_X, COMMON);
    }

    private void ownDiode(double from, double labelX) {
        String key = "clip.rectifier";
        symbols.diode(key, Net.LINE, from, SUPPLY, DROPPER_X, SUPPLY);
        sheet.label(
                key,
                Net.SYMBOL,
                CENTRED,
                labelX,
                SUPPLY + 2,
                text.ofDiodes(key, design.clip().diodeDropVolts()));
    }

    /** One wire from the stage, with the supply's own diode in it where it has one. */
    private void singleFeed() {
        boolean fromLine = design.clip().tap() == ClipSupply.Tap.LINE;
        double from = fromLine ? taps.railTapX() : taps.anodeTapX();
        boolean diode = design.clip().rectifier() == ClipSupply.Rectifier.DIODE;
        double down = diode ? 8 : 14;
        tapDown(from, down, SUPPLY);
        if (diode) {
            ownDiode(down, (down + DROPPER_X) / 2);
        } else {
            sheet.wire(Net.LINE, down, SUPPLY, DROPPER_X, SUPPLY);
        }
        if (design.gate().coupling() == GateDrive.Coupling.TRANSFORMER) {
            double start = Math.max(NEUTRAL_TAP, taps.bottomFromX());
            double back = Math.min(start, diode ? 6 : 12);
            double turn = TURN - 1.2;
            sheet.joint(Net.COMMON, start, BOTTOM);
            sheet.wire(Net.COMMON, start, BOTTOM, start, turn, back, turn, back, COMMON, DROPPER_X, COMMON);
        }
    }

    /** Down from the upper band at {@code from}, over to {@code to}, and down to a height. */
    private void tapDown(double from, double to, double y) {
        boolean bridged = design.stage().bridgeDiodes() > 0;
        boolean beforeBridge = bridged && from == LIVE_TAP;
        double start = beforeBridge ? 8 : TOP;
        sheet.joint(from == taps.anodeTapX() ? Net.LOAD : Net.LINE, from, start);
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
            ownDiode(9.5, 12);
            sheet.wire(Net.COMMON, 7.2, 30, 10, 30, 10, COMMON, DROPPER_X, COMMON);
        }
    }
}
