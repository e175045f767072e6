package clipramp.engine;

/**
 * The circuit between two events: node voltages as linear forms of ramp and source voltage (and of a pulse transformer's
 * magnetising current), and the ramp voltage as one exponential and the source's sinusoids, exactly.
 *
 * <p>Times are seconds since the line zero that begins the half cycle; voltages are against the firing common where no
 * other frame is given; all is exact to rounding (DEVELOPERS.md, Ramp). Mutable, reused for every piece; {@link #copy()}
 * keeps one.
 */
public final class Piece {
    private static final int CREST_BISECTIONS = 60;

    Mode mode = Mode.OFF;
    boolean rectifies;
    boolean clips;
    boolean gateConducts;
    boolean clamps;

    /** V_S, V. */
    final Affine supply = new Affine();
    /** V_B1, V. */
    final Affine baseOne = new Affine();
    /** I_E, A. */
    final Affine emitter = new Affine();
    /** v_GK, V. */
    final Affine gate = new Affine();
    /** V_P, V. */
    final Affine peak = new Affine();
    /** Voltage across the primary, V; with a pulse transformer only. */
    final Affine primary = new Affine();
    /** Current through the clamp diode, A; while it conducts. */
    final Affine clamp = new Affine();

    private boolean coupled;
    private TwoStates states = new TwoStates();
    private final Affine rampDrive = new Affine();
    private final Affine fluxDrive = new Affine();

    /** dV_C/dt = -rate V_C + driveSource e + driveConstant. */
    double rate;

    double driveSource;
    double driveConstant;

    private double startSeconds;
    private double exponential;
    private double steady;
    private SourceWave wave = new SourceWave();
    private double[] sines = new double[1];
    private double[] cosines = new double[1];

    // Where the piece was last looked at.
    double rampVolts;
    double rampSlope;
    double fluxAmps;
    double fluxSlope;
    double sourceVolts;
    double sourceSlope;
    double sourceBend;
    private double decay;

    // The same at the piece's start, where every search begins.
    private double startRamp;
    private double startRampSlope;
    private double startSource;
    private double startSourceSlope;
    private double startSourceBend;

    Piece() {}

    /**
     * Fills in the piece that begins at a time with a ramp voltage and a magnetising current; node equations must be set
     * already.
     */
    void begin(Network n, SourceWave source, double seconds, double startVolts, double startFlux) {
        wave = source;
        startSeconds = seconds;
        coupled = n.transformerCoupled;
        if (coupled) {
            couple(n, source, startVolts, startFlux);
            look(seconds);
            return;
        }
        if (sines.length < source.count) {
            sines = new double[source.count];
            cosines = new double[source.count];
        }
        if (mode == Mode.STALLED) {
            follow(source);
        } else {
            charge(n, source, startVolts);
        }
        look(seconds);
        startRamp = rampVolts;
        startRampSlope = rampSlope;
        startSource = sourceVolts;
        startSourceSlope = sourceSlope;
        startSourceBend = sourceBend;
    }

    /** As a look at the start, without working it out again. */
    void lookAtStart() {
        if (coupled) {
            look(startSeconds);
            return;
        }
        decay = exponential;
        rampVolts = startRamp;
        rampSlope = startRampSlope;
        sourceVolts = startSource;
        sourceSlope = startSourceSlope;
        sourceBend = startSourceBend;
    }

    /**
     * Ramp and magnetising current together: L_m dI_m/dt = V_prim. In a stall the ramp is no state of its own; a silent
     * one that decays like the flux keeps its place.
     */
    private void couple(Network n, SourceWave source, double startVolts, double startFlux) {
        fluxDrive.zero();
        fluxDrive.add(1 / n.magnetisingHenries, primary);
        rampDrive.zero();
        if (mode == Mode.STALLED) {
            rampDrive.ramp = fluxDrive.flux;
        } else {
            rampDrive.add(1 / (n.rampOhms * n.capacitorFarads), supply);
            rampDrive.ramp -= 1 / (n.rampOhms * n.capacitorFarads);
            rampDrive.add(-1 / n.capacitorFarads, emitter);
        }
        states.begin(rampDrive, fluxDrive, source, startSeconds, mode == Mode.STALLED ? 0 : startVolts, startFlux);
        rate = states.fastestRate();
    }

    /** The capacitor held at the peak point: V_C = kappa V_S + V_D. */
    private void follow(SourceWave source) {
        rate = 0;
        exponential = 0;
        double share = peak.source;
        steady = peak.constant - share * source.dropVolts;
        for (int i = 0; i < source.count; i++) {
            sines[i] = share * source.amplitudes[i];
            cosines[i] = 0;
        }
    }

    /** C_E dV_C/dt = (V_S - V_C)/R_E - I_E, solved by its particular solution and one exponential. */
    private void charge(Network n, SourceWave source, double startVolts) {
        drive(n);
        steady = (driveConstant - driveSource * source.dropVolts) / rate;
        double standing = steady;
        for (int i = 0; i < source.count; i++) {
            double w = source.rates[i];
            double force = driveSource * source.amplitudes[i] / (rate * rate + w * w);
            sines[i] = force * rate;
            cosines[i] = -force * w;
            if (force != 0) {
                double angle = w * startSeconds + source.phases[i];
                standing += sines[i] * Math.sin(angle) + cosines[i] * Math.cos(angle);
            }
        }
        exponential = startVolts - standing;
    }

    /** Sets rate, driveSource and driveConstant from the node equations. */
    void drive(Network n) {
        double perFarad = 1 / n.capacitorFarads;
        double perOhm = perFarad / n.rampOhms;
        rate = (1 - supply.ramp) * perOhm + emitter.ramp * perFarad;
        driveSource = supply.source * perOhm - emitter.source * perFarad;
        driveConstant = supply.constant * perOhm - emitter.constant * perFarad;
    }

    /**
     * Works out ramp and source voltage with their slopes at a time; what the piece is asked next then speaks of that time.
     *
     * @param seconds at or after the piece's start and not beyond its end, s
     */
    public void look(double seconds) {
        if (coupled) {
            lookAtBoth(seconds);
            return;
        }
        decay = exponential == 0 ? 0 : exponential * Math.exp(-rate * (seconds - startSeconds));
        double ramp = steady + decay;
        double slope = -rate * decay;
        double source = -wave.dropVolts;
        double sourceRate = 0;
        double bend = 0;
        for (int i = 0; i < wave.count; i++) {
            double w = wave.rates[i];
            double angle = w * seconds + wave.phases[i];
            double sin = Math.sin(angle);
            double cos = Math.cos(angle);
            ramp += sines[i] * sin + cosines[i] * cos;
            slope += w * (sines[i] * cos - cosines[i] * sin);
            source += wave.amplitudes[i] * sin;
            sourceRate += w * wave.amplitudes[i] * cos;
            bend -= w * w * wave.amplitudes[i] * sin;
        }
        rampVolts = ramp;
        rampSlope = slope;
        sourceVolts = source;
        sourceSlope = sourceRate;
        sourceBend = bend;
    }

    private void lookAtBoth(double seconds) {
        double source = -wave.dropVolts;
        double sourceRate = 0;
        double bend = 0;
        for (int i = 0; i < wave.count; i++) {
            double w = wave.rates[i];
            double sin = wave.amplitudes[i] * Math.sin(w * seconds + wave.phases[i]);
            source += sin;
            sourceRate += w * wave.amplitudes[i] * Math.cos(w * seconds + wave.phases[i]);
            bend -= w * w * sin;
        }
        sourceVolts = source;
        sourceSlope = sourceRate;
        sourceBend = bend;
        states.look(this, seconds);
        if (mode == Mode.STALLED) {
            rampVolts = value(peak);
            rampSlope = slope(peak);
        }
    }

    /** A linear form where the piece was last looked at. */
    double value(Affine form) {
        return form.ramp * rampVolts
                + form.flux * fluxAmps
                + form.source * sourceVolts
                + form.sourceSlope * sourceSlope
                + form.constant;
    }

    /** Time derivative of a linear form where the piece was last looked at. */
    double slope(Affine form) {
        return form.ramp * rampSlope
                + form.flux * fluxSlope
                + form.source * sourceSlope
                + form.sourceSlope * sourceBend;
    }

    /**
     * An upper bound of a linear form's second derivative from where the piece was last looked at to any later time:
     * the sinusoids at full swing, and the exponential only where it bends upwards.
     */
    double bendBound(Affine form) {
        if (coupled) {
            return states.bendBound(form);
        }
        double bound = Math.max(0, form.ramp * decay) * rate * rate;
        for (int i = 0; i < wave.count; i++) {
            double w = wave.rates[i];
            double sin = form.ramp * sines[i] + form.source * wave.amplitudes[i];
            double cos = form.ramp * cosines[i] + form.sourceSlope * w * wave.amplitudes[i];
            bound += w * w * Math.sqrt(sin * sin + cos * cos);
        }
        return bound;
    }

    /**
     * Size of what a linear form is summed from where the piece was last looked at: what its rounding is measured against.
     * A source near zero is the difference of a sine and the rectifier's drops, and rounds like those.
     */
    double magnitude(Affine form) {
        return Math.abs(form.ramp) * (Math.abs(rampVolts) + Math.abs(steady) + Math.abs(decay))
                + Math.abs(form.flux * fluxAmps)
                + Math.abs(form.source) * (Math.abs(sourceVolts) + 2 * Math.abs(wave.dropVolts))
                + Math.abs(form.sourceSlope * sourceSlope)
                + Math.abs(form.constant)
                + form.cancelled;
    }

    /** V_C where last looked at, V. */
    public double rampVolts() {
        return rampVolts;
    }

    /** Magnetising current of the pulse transformer where last looked at, A. */
    public double fluxAmps() {
        return fluxAmps;
    }

    /** Voltage across the pulse transformer's primary where last looked at, V. */
    public double primaryVolts() {
        return value(primary);
    }

    /** Source voltage e, before the dropper, where last looked at, V; negative where the rectifier blocks it. */
    public double sourceVolts() {
        return sourceVolts;
    }

    /** V_S where last looked at, V. */
    public double supplyVolts() {
        return value(supply);
    }

    /** V_P where last looked at, V. */
    public double peakPointVolts() {
        return value(peak);
    }

    /**
     * Time of V_S's greatest value between two times: an end, or where it stops rising in between.
     *
     * @param from in the piece, s
     * @param to in the piece, at or after {@code from}, s
     * @return s
     */
    public double supplyCrestSeconds(double from, double to) {
        return crestSeconds(supply, from, to);
    }

    /** V_B1 where last looked at, V. */
    public double baseOneVolts() {
        return value(baseOne);
    }

    /** v_GK, gate to cathode or main terminal one, where last looked at, V. */
    public double gateVolts() {
        return value(gate);
    }

    /**
     * Time of v_GK's greatest value between two times: an end, or where it stops rising in between.
     *
     * @param from in the piece, s
     * @param to in the piece, at or after {@code from}, s
     * @return s
     */
    public double gateCrestSeconds(double from, double to) {
        return crestSeconds(gate, from, to);
    }

    private double crestSeconds(Affine form, double from, double to) {
        look(from);
        double atFrom = value(form);
        boolean rises = slope(form) > 0;
        look(to);
        boolean falls = slope(form) < 0;
        if (!rises || !falls) {
            return value(form) > atFrom ? to : from;
        }
        double low = from;
        double high = to;
        for (int i = 0; i < CREST_BISECTIONS; i++) {
            double middle = (low + high) / 2;
            look(middle);
            if (slope(form) > 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /** i_D through the dropping resistor where last looked at, A; the network is the one that the piece was shaped for. */
    public double dropperAmps(Network n) {
        return rectifies ? (sourceVolts - value(supply)) / n.dropperOhms : 0;
    }

    /** i_Z where last looked at, A; the network is the one that the piece was shaped for. */
    public double zenerAmps(Network n) {
        return clips ? (value(supply) - n.zenerKneeVolts) / n.zenerSlopeOhms : 0;
    }

    /** Emitter current where last looked at, A. */
    public double emitterAmps() {
        return value(emitter);
    }

    /** Current into the gate junction where last looked at, A; the network is the one that the piece was shaped for. */
    public double gateAmps(Network n) {
        return gateConducts ? (value(gate) - n.gateKneeVolts) / n.gateSlopeOhms : 0;
    }

    /**
     * Current from the supply towards base two (a programmable device: through its upper resistor) where last looked at, A;
     * the network is the one that the piece was shaped for.
     */
    public double baseTwoAmps(Network n) {
        if (mode == Mode.ON) {
            return n.baseTwoOnSiemens * (value(supply) - value(baseOne) - n.gateDropVolts);
        }
        return n.barSiemens * (value(supply) - value(baseOne)) + n.dividerSiemens * value(supply);
    }

    /**
     * Voltage at base two (a programmable device: at its gate node) where last looked at, V; the network is the one that the
     * piece was shaped for.
     */
    public double baseTwoVolts(Network n) {
        if (n.programmable) {
            return mode == Mode.ON ? value(baseOne) + n.gateDropVolts : value(peak) - n.emitterDropVolts;
        }
        return value(supply) - n.baseTwoOhms * baseTwoAmps(n);
    }

    /**
     * First time at which the gate current crosses a level.
     *
     * @param n the network that the piece was shaped for
     * @param amps the level, A, above zero
     * @param rising whether it must rise to the level or fall to it
     * @param from start of the search, s
     * @param limit end of the search, s
     * @return s; POSITIVE_INFINITY for none
     */
    public double gateReaches(Network n, double amps, boolean rising, double from, double limit) {
        if (!gateConducts) {
            return Double.POSITIVE_INFINITY;
        }
        Affine form = new Affine();
        double sign = rising ? 1 : -1;
        double level = n.gateKneeVolts + amps * n.gateSlopeOhms;
        form.add(sign, gate);
        form.below(sign * level);
        return FirstCrossing.after(this, form, from, limit);
    }

    /** Decay rate of the piece's (faster) exponential, 1/s. */
    double ratePerSecond() {
        return rate;
    }

    /** Time at which the piece begins, s. */
    double startSeconds() {
        return startSeconds;
    }

    /** What the trigger device does throughout. */
    public Mode mode() {
        return mode;
    }

    /** Whether the rectifier feeds the supply throughout. */
    public boolean isRectifying() {
        return rectifies;
    }

    /** Whether the zener conducts throughout. */
    public boolean isClipping() {
        return clips;
    }

    /** Fastest angular frequency of the source, rad/s; 0 for a constant one. */
    double fastestRate() {
        double fastest = 0;
        for (int i = 0; i < wave.count; i++) {
            fastest = Math.max(fastest, wave.rates[i]);
        }
        return fastest;
    }

    /** A copy that stays as it is for as long as the source wave does. */
    public Piece copy() {
        Piece other = new Piece();
        other.mode = mode;
        other.rectifies = rectifies;
        other.clips = clips;
        other.gateConducts = gateConducts;
        other.clamps = clamps;
        other.coupled = coupled;
        other.states = coupled ? states.copy() : states;
        other.supply.copy(supply);
        other.baseOne.copy(baseOne);
        other.emitter.copy(emitter);
        other.gate.copy(gate);
        other.peak.copy(peak);
        other.primary.copy(primary);
        other.clamp.copy(clamp);
        other.rate = rate;
        other.startSeconds = startSeconds;
        other.exponential = exponential;
        other.steady = steady;
        other.wave = wave;
        other.sines = sines.clone();
        other.cosines = cosines.clone();
        return other;
    }
}
