/** Stage and load: watts, currents, heat. */
@NullMarked
package clipramp.power;

import org.jspecify.annotations.NullMarked;
