package clipramp.power;

/**
 * What a load's current comes to over one half cycle of the line. Integrals run over angle.
 *
 * @param chargeAmpRad integral of i over angle, A rad
 * @param squareAmpRad integral of i squared over angle, A² rad
 * @param peakAmps largest current, A
 * @param conductionRad angle for which current flows, rad
 */
record HalfCycleCurrent(double chargeAmpRad, double squareAmpRad, double peakAmps, double conductionRad) {
    /** A half cycle whose thyristor stays off. */
    static final HalfCycleCurrent NONE = new HalfCycleCurrent(0, 0, 0, 0);
}
