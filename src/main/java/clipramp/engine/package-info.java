/** The piecewise-linear mathematics: one piece between two events, exactly; when the next event is. */
@NullMarked
package clipramp.engine;

import org.jspecify.annotations.NullMarked;
