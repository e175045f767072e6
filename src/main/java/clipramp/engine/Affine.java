package clipramp.engine;

/**
 * A voltage or current as a linear form of what moves within a piece: ramp voltage, magnetising current of a pulse
 * transformer, source voltage and (in a stall only) the source's slope.
 */
final class Affine {
    double ramp;
    double flux;
    double source;
    double sourceSlope;
    double constant;
    /** Size of what has cancelled in the constant, which rounds like that. */
    double cancelled;

    void set(double ofRamp, double ofSource, double offset) {
        ramp = ofRamp;
        flux = 0;
        source = ofSource;
        sourceSlope = 0;
        constant = offset;
        cancelled = 0;
    }

    void copy(Affine other) {
        ramp = other.ramp;
        flux = other.flux;
        source = other.source;
        sourceSlope = other.sourceSlope;
        constant = other.constant;
        cancelled = other.cancelled;
    }

    void zero() {
        set(0, 0, 0);
    }

    /** Takes a level off, which may leave next to nothing of the constant. */
    void below(double level) {
        constant -= level;
        cancelled = Math.abs(level);
    }

    /** Adds a multiple of another form. */
    void add(double factor, Affine other) {
        ramp += factor * other.ramp;
        flux += factor * other.flux;
        source += factor * other.source;
        sourceSlope += factor * other.sourceSlope;
        constant += factor * other.constant;
    }

    void negate() {
        ramp = -ramp;
        flux = -flux;
        source = -source;
        sourceSlope = -sourceSlope;
        constant = -constant;
    }

    double at(double rampVolts, double fluxAmps, double sourceVolts) {
        return ramp * rampVolts + flux * fluxAmps + source * sourceVolts + constant;
    }
}
