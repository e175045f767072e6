/** The pulse, and what the thyristor asks of it. */
@NullMarked
package clipramp.gate;

import org.jspecify.annotations.NullMarked;
