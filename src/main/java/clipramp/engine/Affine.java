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

    void set(double ofRamp, double ofSource, double offset) {
        ramp = ofRamp;
        flux = 0;
        source = ofSource;
        sourceSlope = 0;
        constant = offset;
    }

    void copy(Affine other) {
        ramp = other.ramp;
        flux = other.flux;
        source = other.source;
        sourceSlope = other.sourceSlope;
        constant = other.constant;
    }

    void zero() {
        set(0, 0, 0);
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
