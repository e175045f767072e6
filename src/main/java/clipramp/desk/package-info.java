/**
 * The window. Views are thin: they show what {@link clipramp.desk.model} holds and tell it what was done; nothing here
 * computes.
 */
@NullMarked
package clipramp.desk;

import org.jspecify.annotations.NullMarked;
