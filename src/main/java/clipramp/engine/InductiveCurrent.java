package clipramp.engine;

/**
 * Current of a resistance and an inductance behind a conducting thyristor, exactly: L di/dt = s v(t) - D - R i, where s is
 * the direction of conduction and D the fixed drops of the path (a freewheeling diode: s = 0 and its own drop).
 *
 * <p>R i obeys the same first-order law as a capacitor charged through a resistor with R C = L/R, so a {@link Piece}
 * solves it and {@link FirstCrossing} finds its end, both to rounding (DEVELOPERS.md, Loads with memory). Mutable; angles
 * are of the line, from the positive-going zero of its fundamental.
 */
public final class InductiveCurrent {
    private final LineWave line;
    private final double loopOhms;
    private final Network lag = new Network();
    private final Piece piece = new Piece();
    private final Affine falls = new Affine();
    private double fromRad;

    /**
     * A loop at rest.
     *
     * @param line the line
     * @param loopOhms everything resistive in the loop, ohm, above 0
     * @param henries inductance, H, above 0
     */
    public InductiveCurrent(LineWave line, double loopOhms, double henries) {
        this.line = line;
        this.loopOhms = loopOhms;
        lag.rampOhms = henries / loopOhms;
        lag.capacitorFarads = 1;
        falls.set(-1, 0, 0);
        piece.supply.set(0, 1, 0);
    }

    /**
     * Begins to conduct.
     *
     * @param startRad line angle, rad
     * @param direction +1 or -1 with or against the line's sign; 0 for a freewheeling path that the line does not drive
     * @param dropVolts fixed drops of the path, V
     * @param startAmps current then, A, 0 or more
     */
    public void begin(double startRad, int direction, double dropVolts, double startAmps) {
        fromRad = startRad;
        SourceWave driving = new SourceWave();
        if (direction == 0) {
            driving.setConstant(-dropVolts, Double.POSITIVE_INFINITY);
        } else {
            driving.set(line, startRad, direction, dropVolts, Double.POSITIVE_INFINITY);
        }
        piece.begin(lag, driving, 0, startAmps * loopOhms, 0);
    }

    /**
     * Current at an angle.
     *
     * @param rad line angle at or after the start and not beyond the extinction, rad
     * @return A, 0 or more, in the direction of conduction
     */
    public double ampsAt(double rad) {
        piece.look((rad - fromRad) / line.omega());
        return piece.rampVolts / loopOhms;
    }

    /**
     * Angle at which the current has fallen to zero.
     *
     * @param limitRad line angle at which the search ends, rad
     * @return rad; POSITIVE_INFINITY if it flows on beyond the limit; the start itself if nothing drives it
     */
    public double extinctionRad(double limitRad) {
        double seconds = FirstCrossing.after(piece, falls, 0, (limitRad - fromRad) / line.omega());
        return fromRad + seconds * line.omega();
    }

    /** Line angle from which it conducts, rad. */
    public double startRad() {
        return fromRad;
    }
}
