/** A half cycle, its periodic state, the knob, waveforms. */
@NullMarked
package clipramp.firing;

import org.jspecify.annotations.NullMarked;
