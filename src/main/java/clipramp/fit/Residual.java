package clipramp.fit;

import clipramp.units.Unit;

/**
 * What was read beside what the fitted unit shows.
 *
 * @param line line in the readings, from 1
 * @param column what stood over it
 * @param what what was read or set
 * @param unit its unit
 * @param read as read, SI (radians for angles)
 * @param shown what the fitted unit shows, SI; for a setting or a line voltage what it must have been
 * @param deviations how far apart they are, in standard deviations that instruments and fit leave their difference,
 *     not widened by how far the readings scatter
 * @param belongs whether it took part in the fit
 */
public record Residual(
        int line,
        String column,
        String what,
        Unit unit,
        double read,
        double shown,
        double deviations,
        boolean belongs) {}
