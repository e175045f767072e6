/** Quantities in and out: the one grammar of files, options and the window; engineering formatting; preferred series. */
@NullMarked
package clipramp.units;

import org.jspecify.annotations.NullMarked;
