/**
 * What the window shows and does, without a graphics toolkit: every class here is tested by plain JUnit. Everything is
 * confined to one thread, the window's, but for the work that {@link clipramp.desk.model.LatestWins} sends away.
 */
@NullMarked
package clipramp.desk.model;

import org.jspecify.annotations.NullMarked;
