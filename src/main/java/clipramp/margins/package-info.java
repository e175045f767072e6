/** Demand against offer: verdicts with reason and source. */
@NullMarked
package clipramp.margins;

import org.jspecify.annotations.NullMarked;
