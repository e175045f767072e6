/**
 * Bench readings to a unit's real parameters: what they tell, how well, what they cannot tell, and which of them does not
 * belong.
 */
@NullMarked
package clipramp.fit;

import org.jspecify.annotations.NullMarked;
