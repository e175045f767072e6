package clipramp.record;

import clipramp.figures.Palette;
import java.awt.Color;

/** The paper theme on the printer's own paper: no ground is printed. Every contrast only grows by it. */
final class PrintPalette {
    static final Palette WHITE = onWhite(Palette.PAPER);

    private PrintPalette() {}

    private static Palette onWhite(Palette paper) {
        return new Palette(
                "print",
                Color.WHITE,
                paper.ink(),
                paper.quiet(),
                paper.axis(),
                paper.hairline(),
                paper.wash(),
                paper.line(),
                paper.supply(),
                paper.ramp(),
                paper.pulse(),
                paper.load());
    }
}
