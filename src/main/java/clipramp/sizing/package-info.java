/** From what is wanted to preferred values. */
@NullMarked
package clipramp.sizing;

import org.jspecify.annotations.NullMarked;
