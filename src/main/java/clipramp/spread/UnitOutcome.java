package clipramp.spread;

import clipramp.firing.FiringState;

/** What one unit does at one knob position; a vessel that is filled again and again. */
final class UnitOutcome {
    /** Firing angle, rad; NaN when the thyristor stays off. */
    double firingRad;

    FiringState state = FiringState.SILENT;
    /** Load power, W. */
    double watts;
    /** The same as a share of full power at the same line voltage, 0..1. */
    double fraction;

    /** Firing angle with a thyristor that stays off taken as fired at the half cycle's end, rad. */
    double latestRad() {
        return Double.isNaN(firingRad) ? Math.PI : firingRad;
    }
}
