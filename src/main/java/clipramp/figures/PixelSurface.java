package clipramp.figures;

import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.awt.image.DataBufferInt;

/** Pixels that figures are drawn into by whatever thread owns them, for a window to show. Drawn over again and again. */
public final class PixelSurface {
    private final BufferedImage image;

    /**
     * An empty surface.
     *
     * @param columns pixels across, 1 or more
     * @param rows pixels down, 1 or more
     */
    public PixelSurface(int columns, int rows) {
        image = new BufferedImage(columns, rows, BufferedImage.TYPE_INT_ARGB_PRE);
    }

    /** Pixels across. */
    public int columns() {
        return image.getWidth();
    }

    /** Pixels down. */
    public int rows() {
        return image.getHeight();
    }

    /**
     * Draws a figure over all of it.
     *
     * @param figure what is drawn
     * @param scale pixels per user unit, above 0
     * @param style colours and sizes
     */
    public void draw(Figure figure, double scale, Style style) {
        Graphics2D g = image.createGraphics();
        g.setColor(style.palette().ground());
        g.fillRect(0, 0, columns(), rows());
        g.scale(scale, scale);
        Surfaces.draw(figure, g, columns() / scale, rows() / scale, style);
        g.dispose();
    }

    /** The pixels themselves, row by row, alpha, red, green, blue with the colours multiplied by alpha; not a copy. */
    public int[] argb() {
        return ((DataBufferInt) image.getRaster().getDataBuffer()).getData();
    }
}
