package clipramp.engine;

/**
 * A voltage or current as a linear form of what moves within a piece: ramp voltage, source voltage and (in a stall
 * only) the source's slope.
 */
final class Affine {
    double ramp;
    double source;
    double sourceSlope;
    double constant;

    void set(double ofRamp, double ofSource, double offset) {
        ramp = ofRamp;
        source = ofSource;
        sourceSlope = 0;
        constant = offset;
    }

    void copy(Affine other) {
        ramp = other.ramp;
        source = other.source;
        sourceSlope = other.sourceSlope;
        constant = other.constant;
    }

    double at(double rampVolts, double sourceVolts) {
        return ramp * rampVolts + source * sourceVolts + constant;
    }
}
