package clipramp.fit;

import java.util.OptionalDouble;

/**
 * How well the unit that was found explains its readings.
 *
 * @param readings how many there were
 * @param used how many took part
 * @param squares their squared deviations and the drawing's, summed
 * @param freedom degrees of freedom
 * @param chance how often good readings of a good unit scatter more than that, 0..1
 * @param widened what intervals were widened by because the readings scatter more than their instruments, 1 or more
 * @param directions how many independent combinations of the values the readings tell
 * @param unknowns how many values were fitted
 * @param condition best told combination against the worst told one, in prior deviations; empty where one is not told at all
 */
public record Quality(
        int readings,
        int used,
        double squares,
        int freedom,
        double chance,
        double widened,
        int directions,
        int unknowns,
        OptionalDouble condition) {}
