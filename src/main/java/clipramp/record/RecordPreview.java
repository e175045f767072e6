package clipramp.record;

import java.awt.image.BufferedImage;
import java.io.IOException;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.rendering.ImageType;
import org.apache.pdfbox.rendering.PDFRenderer;

/** The pages of a written record as pictures, so that what is looked at is what is saved. */
public final class RecordPreview {
    private RecordPreview() {}

    /**
     * One page.
     *
     * @param number counted from 1
     * @param count how many there are
     * @param width in pixels
     * @param height in pixels
     * @param argb pixels row by row, 0xAARRGGBB, as many as width times height; not copied
     */
    public record Page(int number, int count, int width, int height, int[] argb) {}

    /** Takes the pages as they are drawn. */
    @FunctionalInterface
    public interface Pages {
        /** Takes a page, and says whether more are wanted. */
        boolean take(Page page);
    }

    /**
     * Draws every page in turn.
     *
     * @param pdf a record's bytes
     * @param pixelsPerPoint scale, above 0; 1 is 72 pixels an inch
     * @param pages takes them
     * @throws IOException where the bytes are no PDF
     */
    public static void draw(byte[] pdf, double pixelsPerPoint, Pages pages) throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            PDFRenderer renderer = new PDFRenderer(document);
            int count = document.getNumberOfPages();
            for (int i = 0; i < count; i++) {
                BufferedImage image = renderer.renderImage(i, (float) pixelsPerPoint, ImageType.RGB);
                int width = image.getWidth();
                int height = image.getHeight();
                int[] argb = image.getRGB(0, 0, width, height, null, 0, width);
                if (!pages.take(new Page(i + 1, count, width, height, argb))) {
                    return;
                }
            }
        }
    }
}
