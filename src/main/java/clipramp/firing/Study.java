package clipramp.firing;

import java.util.Optional;

/**
 * A periodic state with everything that follows from it.
 *
 * @param solution the periodic state
 * @param dissipation what the parts bear
 * @param transformerDuty what the pulse transformer bears; empty with direct coupling
 */
public record Study(Solution solution, Dissipation dissipation, Optional<TransformerDuty> transformerDuty) {}
