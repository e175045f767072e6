package clipramp.power;

/**
 * What a load's current comes to over one half cycle of the line. Integrals run over angle.
 *
 * @param chargeAmpRad integral of i over angle, A rad
 * @param squareAmpRad integral of i squared over angle, A² rad
 * @param peakAmps largest current, A
 * @param fromRad where it begins, from the half cycle's zero, rad
 * @param toRad where it ends, from the same zero, rad
 */
record HalfCycleCurrent(double chargeAmpRad, double squareAmpRad, double peakAmps, double fromRad, double toRad) {
    /** A half cycle whose thyristor stays off. */
    static final HalfCycleCurrent NONE = new HalfCycleCurrent(0, 0, 0, 0, 0);

    /** Angle for which current flows, rad. */
    double conductionRad() {
        return toRad - fromRad;
    }

    boolean flows() {
        return toRad > fromRad;
    }
}
