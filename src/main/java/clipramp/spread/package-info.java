/**
 * The next thousand units: tolerances, temperature and line drawn together; yield, worst case, what matters most and what
 * would help.
 */
@NullMarked
package clipramp.spread;

import org.jspecify.annotations.NullMarked;
