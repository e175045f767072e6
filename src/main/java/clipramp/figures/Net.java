package clipramp.figures;

import java.awt.Color;

/** Which signal a wire carries; its colour follows. */
enum Net {
    LINE,
    SUPPLY,
    RAMP,
    PULSE,
    LOAD,
    COMMON,
    SYMBOL;

    Color colour(Palette palette) {
        return switch (this) {
            case LINE, COMMON, SYMBOL -> palette.ink();
            case SUPPLY -> palette.supply();
            case RAMP -> palette.ramp();
            case PULSE -> palette.pulse();
            case LOAD -> palette.load();
        };
    }
}
