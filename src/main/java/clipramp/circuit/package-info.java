/**
 * What is built: immutable records of line, clipped supply, ramp, trigger device, gate drive, thyristor, stage and load.
 *
 * <p>Everything is in SI units and radians, temperatures excepted: those are in degrees Celsius and say so in their
 * names. A record is valid from its constructor on: what lies outside the range that a parameter states is answered by an
 * {@link IllegalArgumentException} that names the thing, its value and its limit. Whatever a person may have mistyped was
 * refused before, with its line and column, by the file reader.
 */
@NullMarked
package clipramp.circuit;

import org.jspecify.annotations.NullMarked;
