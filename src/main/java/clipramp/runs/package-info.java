/** Long work, watched: how far it is, and whether it is to end. */
@NullMarked
package clipramp.runs;

import org.jspecify.annotations.NullMarked;
