/** The design record as a PDF. */
@NullMarked
package clipramp.record;

import org.jspecify.annotations.NullMarked;
