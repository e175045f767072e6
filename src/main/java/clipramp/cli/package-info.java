/** Words in, answers out: the command line. */
@NullMarked
package clipramp.cli;

import org.jspecify.annotations.NullMarked;
