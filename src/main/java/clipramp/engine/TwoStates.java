package clipramp.engine;

/**
 * Ramp voltage and magnetising current together, exactly: x' = -A x + b e + c for a two by two A.
 *
 * <p>With m half the trace of A and d² = m² - det A, the homogeneous part is x(t) = p(t) x0 - q(t) (A - m) x0, where p =
 * exp(-m t) cosh(d t) and q = exp(-m t) sinh(d t)/d; for negative d² the same with cos and sin. This form stays good
 * where both eigenvalues meet.
 */
final class TwoStates {
    /** Below this d t, sinh(d t)/d is its own series' first terms. */
    private static final double SERIES = 1e-4;

    /** Decays nearer than this share to each other are not told apart. */
    private static final double APART = 1e-3;

    private SourceWave wave = new SourceWave();
    private double startSeconds;
    private double mean;
    private double spreadSquared;
    private double spread;
    private double slow;
    private boolean meshed;
    private double fast;
    private double a11;
    private double a12;
    private double a21;
    private double a22;
    // Homogeneous part at the start, and (A - m) times it.
    private double ramp0;
    private double flux0;
    private double rampTurned;
    private double fluxTurned;
    private double rampSteady;
    private double fluxSteady;
    private double[] rampSines = new double[1];
    private double[] rampCosines = new double[1];
    private double[] fluxSines = new double[1];
    private double[] fluxCosines = new double[1];

    // Homogeneous part where last looked at.
    private double rampNow;
    private double fluxNow;

    /**
     * Begins a piece.
     *
     * @param rampSlope dV_C/dt as a form of ramp, flux and source
     * @param fluxSlope dI_m/dt as a form of the same
     */
    void begin(
            Affine rampSlope, Affine fluxSlope, SourceWave source, double seconds, double rampVolts, double fluxAmps) {
        wave = source;
        startSeconds = seconds;
        a11 = -rampSlope.ramp;
        a12 = -rampSlope.flux;
        a21 = -fluxSlope.ramp;
        a22 = -fluxSlope.flux;
        double determinant = a11 * a22 - a12 * a21;
        decays(determinant);
        double rampConstant = rampSlope.constant - rampSlope.source * source.dropVolts;
        double fluxConstant = fluxSlope.constant - fluxSlope.source * source.dropVolts;
        rampSteady = (a22 * rampConstant - a12 * fluxConstant) / determinant;
        fluxSteady = (a11 * fluxConstant - a21 * rampConstant) / determinant;
        swings(rampSlope.source, fluxSlope.source, determinant);
        fadeFrom(rampVolts, fluxAmps);
    }

    /** Half the trace, d, and both eigenvalues. */
    private void decays(double determinant) {
        mean = (a11 + a22) / 2;
        // m² - det, written so that nothing cancels where the off-diagonal is small.
        spreadSquared = (a11 - a22) * (a11 - a22) / 4 + a12 * a21;
        spread = Math.sqrt(Math.abs(spreadSquared));
        if (spreadSquared > 0) {
            fast = mean + spread;
            slow = determinant / fast;
        } else {
            fast = mean;
            slow = mean;
        }
        meshed = !(fast - slow > APART * fast);
    }

    /** What both states begin with beyond the particular solution: the part that fades. */
    private void fadeFrom(double rampVolts, double fluxAmps) {
        double rampParticular = rampSteady;
        double fluxParticular = fluxSteady;
        for (int i = 0; i < wave.count; i++) {
            double angle = wave.rates[i] * startSeconds + wave.phases[i];
            double sin = Math.sin(angle);
            double cos = Math.cos(angle);
            rampParticular += rampSines[i] * sin + rampCosines[i] * cos;
            fluxParticular += fluxSines[i] * sin + fluxCosines[i] * cos;
        }
        ramp0 = rampVolts - rampParticular;
        flux0 = fluxAmps - fluxParticular;
        rampTurned = (a11 - mean) * ramp0 + a12 * flux0;
        fluxTurned = a21 * ramp0 + (a22 - mean) * flux0;
    }

    /** Particular solution: (A + j w) X = b E, each sinusoid by Cramer's rule in complex numbers. */
    private void swings(double rampForce, double fluxForce, double determinant) {
        if (rampSines.length < wave.count) {
            rampSines = new double[wave.count];
            rampCosines = new double[wave.count];
            fluxSines = new double[wave.count];
            fluxCosines = new double[wave.count];
        }
        for (int i = 0; i < wave.count; i++) {
            double w = wave.rates[i];
            double amplitude = wave.amplitudes[i];
            double real = determinant - w * w;
            double imaginary = w * (a11 + a22);
            double size = (real * real + imaginary * imaginary) / amplitude;
            double rampReal = a22 * rampForce - a12 * fluxForce;
            double rampImaginary = w * rampForce;
            double fluxReal = a11 * fluxForce - a21 * rampForce;
            double fluxImaginary = w * fluxForce;
            rampSines[i] = (rampReal * real + rampImaginary * imaginary) / size;
            rampCosines[i] = (rampImaginary * real - rampReal * imaginary) / size;
            fluxSines[i] = (fluxReal * real + fluxImaginary * imaginary) / size;
            fluxCosines[i] = (fluxImaginary * real - fluxReal * imaginary) / size;
        }
    }

    /**
     * Works out both states with their slopes and bends and puts them into the piece.
     *
     * @param seconds the time
     * @param sines sine of each of the source's angles then
     * @param cosines their cosines
     */
    void look(Piece piece, double seconds, double[] sines, double[] cosines) {
        fade(seconds - startSeconds);
        double ramp = rampNow + rampSteady;
        double flux = fluxNow + fluxSteady;
        double rampSlope = -a11 * rampNow - a12 * fluxNow;
        double fluxSlope = -a21 * rampNow - a22 * fluxNow;
        double rampBend = -a11 * rampSlope - a12 * fluxSlope;
        double fluxBend = -a21 * rampSlope - a22 * fluxSlope;
        for (int i = 0; i < wave.count; i++) {
            double w = wave.rates[i];
            double sin = sines[i];
            double cos = cosines[i];
            double rampSwing = rampSines[i] * sin + rampCosines[i] * cos;
            double fluxSwing = fluxSines[i] * sin + fluxCosines[i] * cos;
            ramp += rampSwing;
            flux += fluxSwing;
            rampBend -= w * w * rampSwing;
            fluxBend -= w * w * fluxSwing;
            rampSlope += w * (rampSines[i] * cos - rampCosines[i] * sin);
            fluxSlope += w * (fluxSines[i] * cos - fluxCosines[i] * sin);
        }
        piece.rampVolts = ramp;
        piece.rampSlope = rampSlope;
        piece.rampBend = rampBend;
        piece.fluxAmps = flux;
        piece.fluxSlope = fluxSlope;
        piece.fluxBend = fluxBend;
    }

    /** The homogeneous part so long after the start. */
    private void fade(double time) {
        double even;
        double odd;
        if (spread * time < SERIES) {
            double decay = Math.exp(-mean * time);
            double square = spreadSquared * time * time;
            even = decay * (1 + square / 2);
            odd = decay * time * (1 + square / 6);
        } else if (spreadSquared > 0) {
            double first = Math.exp(-slow * time);
            double second = Math.exp(-fast * time);
            even = (first + second) / 2;
            odd = (first - second) / (2 * spread);
        } else {
            double decay = Math.exp(-mean * time);
            even = decay * Math.cos(spread * time);
            odd = decay * Math.sin(spread * time) / spread;
        }
        rampNow = even * ramp0 - odd * rampTurned;
        fluxNow = even * flux0 - odd * fluxTurned;
    }

    /** What the i-th sinusoid's sine gives a form by way of both states. */
    double sineOf(Affine form, int i) {
        return form.ramp * rampSines[i] + form.flux * fluxSines[i];
    }

    /** What its cosine gives. */
    double cosineOf(Affine form, int i) {
        return form.ramp * rampCosines[i] + form.flux * fluxCosines[i];
    }

    /** As a look at the start, without working it out again. */
    void lookAtStart() {
        rampNow = ramp0;
        fluxNow = flux0;
    }

    /** What the faster exponential gives a form where last looked at; 0 where both are meshed. */
    double quickPart(Affine form) {
        if (meshed) {
            return 0;
        }
        double rampQuick = (a11 - slow) * rampNow + a12 * fluxNow;
        double fluxQuick = a21 * rampNow + (a22 - slow) * fluxNow;
        return (form.ramp * rampQuick + form.flux * fluxQuick) / (fast - slow);
    }

    /** What the slower one gives it. */
    double slowPart(Affine form) {
        return meshed ? 0 : form.ramp * rampNow + form.flux * fluxNow - quickPart(form);
    }

    /** Bound of a form's second derivative from where last looked at to any later time where both exponentials are meshed. */
    double meshedBend(Affine form) {
        if (!meshed) {
            return 0;
        }
        double first = a11 * rampNow + a12 * fluxNow;
        double second = a21 * rampNow + a22 * fluxNow;
        return fadingBound(form, a11 * first + a12 * second, a21 * first + a22 * second);
    }

    /** The same for its third derivative. */
    double meshedJerk(Affine form) {
        if (!meshed) {
            return 0;
        }
        double first = a11 * rampNow + a12 * fluxNow;
        double second = a21 * rampNow + a22 * fluxNow;
        double third = a11 * first + a12 * second;
        double fourth = a21 * first + a22 * second;
        return fadingBound(form, a11 * third + a12 * fourth, a21 * third + a22 * fourth);
    }

    /**
     * How great a form of states that fade by the same law may become: f.y, and f.(A - m)y, which q multiplies; q never
     * exceeds one over the fastest decay.
     */
    private double fadingBound(Affine form, double rampPart, double fluxPart) {
        double now = form.ramp * rampPart + form.flux * fluxPart;
        double turned = form.ramp * ((a11 - mean) * rampPart + a12 * fluxPart)
                + form.flux * (a21 * rampPart + (a22 - mean) * fluxPart);
        return Math.abs(now) + Math.abs(turned) / fast;
    }

    /** Slowest decay, 1/s. */
    double slowestRate() {
        return slow;
    }

    /** Fastest decay, 1/s. */
    double fastestRate() {
        return fast;
    }

    TwoStates copy() {
        TwoStates other = new TwoStates();
        other.wave = wave;
        other.startSeconds = startSeconds;
        other.mean = mean;
        other.spreadSquared = spreadSquared;
        other.spread = spread;
        other.slow = slow;
        other.meshed = meshed;
        other.fast = fast;
        other.a11 = a11;
        other.a12 = a12;
        other.a21 = a21;
        other.a22 = a22;
        other.ramp0 = ramp0;
        other.flux0 = flux0;
        other.rampTurned = rampTurned;
        other.fluxTurned = fluxTurned;
        other.rampSteady = rampSteady;
        other.fluxSteady = fluxSteady;
        other.rampSines = rampSines.clone();
        other.rampCosines = rampCosines.clone();
        other.fluxSines = fluxSines.clone();
        other.fluxCosines = fluxCosines.clone();
        return other;
    }
}
