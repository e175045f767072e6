package clipramp.engine;

/**
 * The voltage behind the dropping resistor through one half cycle, rectifier drops taken off: e(t) = sum of amplitude_k
 * sin(k w t + phase_k) - drop, t from the half cycle's line zero. Mutable: one instance serves every half cycle.
 */
public final class SourceWave {
    int count;
    double[] rates = new double[1];
    double[] amplitudes = new double[1];
    double[] phases = new double[1];
    double dropVolts;
    double seconds;

    /** Length of the half cycle, s, from its line zero. */
    public double seconds() {
        return seconds;
    }

    /**
     * Sets the half cycle that begins at one of the line's zeros.
     *
     * @param line the line, before the winding, V
     * @param startRad the line angle of the zero, rad
     * @param scale winding ratio, its sign turned for a bridge in the negative half or a turned-over winding
     * @param drop rectifier drops, V
     * @param lengthSeconds length of the half cycle, s
     */
    public void set(LineWave line, double startRad, double scale, double drop, double lengthSeconds) {
        count = line.count();
        if (rates.length < count) {
            rates = new double[count];
            amplitudes = new double[count];
            phases = new double[count];
        }
        for (int i = 0; i < count; i++) {
            rates[i] = line.order(i) * line.omega();
            amplitudes[i] = scale * line.amplitude(i);
            phases[i] = line.order(i) * startRad + line.phase(i);
        }
        dropVolts = drop;
        seconds = lengthSeconds;
    }

    /**
     * Sets a pure sine that rises from zero, the commonest half cycle.
     *
     * @param omega angular frequency, rad/s
     * @param amplitude crest behind the winding, V
     * @param drop rectifier drops, V
     * @param lengthSeconds length of the half cycle, s
     */
    public void setSine(double omega, double amplitude, double drop, double lengthSeconds) {
        count = 1;
        rates[0] = omega;
        amplitudes[0] = amplitude;
        phases[0] = 0;
        dropVolts = drop;
        seconds = lengthSeconds;
    }

    /**
     * Sets a constant voltage: the drop across a conducting thyristor.
     *
     * @param volts what stands behind the rectifier's drops, V
     * @param lengthSeconds length of the half cycle, s
     */
    public void setConstant(double volts, double lengthSeconds) {
        count = 0;
        dropVolts = -volts;
        seconds = lengthSeconds;
    }

    double at(double time) {
        double sum = -dropVolts;
        for (int i = 0; i < count; i++) {
            sum += amplitudes[i] * Math.sin(rates[i] * time + phases[i]);
        }
        return sum;
    }

    double slopeAt(double time) {
        double sum = 0;
        for (int i = 0; i < count; i++) {
            sum += amplitudes[i] * rates[i] * Math.cos(rates[i] * time + phases[i]);
        }
        return sum;
    }
}
