/**
 * The circuit drawing and the plots, drawn once onto a {@link java.awt.Graphics2D} for screen, PDF, SVG and PNG.
 *
 * <p>A figure only shows results that it was given; it computes none. Lengths are in user units of the surface, which
 * are points in a PDF and pixels at 100 % on a screen; angles are in radians and become degrees where they are lettered.
 */
@NullMarked
package clipramp.figures;

import org.jspecify.annotations.NullMarked;
