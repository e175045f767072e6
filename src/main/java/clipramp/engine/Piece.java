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
    private final Outlook outlook = new Outlook(this);
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
    // Sine and cosine of each of the source's angles where last looked at.
    private double[] sinesNow = new double[1];
    private double[] cosinesNow = new double[1];

    // Where the piece was last looked at.
    double rampVolts;
    double rampSlope;
    double rampBend;
    double fluxAmps;
    double fluxSlope;
    double fluxBend;
    double sourceVolts;
    double sourceSlope;
    double sourceBend;
    double sourceJerk;
    private double decay;

    // The same at the piece's start, where every search begins.
    private double startRamp;
    private double startRampSlope;
    private double startRampBend;
    private double startFlux;
    private double startFluxSlope;
    private double startFluxBend;
    private double startSource;
    private double startSourceSlope;
    private double startSourceBend;
    private double startSourceJerk;

    Piece() {}

    /**
     * Fills in the piece that begins at a time with a ramp voltage and a magnetising current; node equations must be set
     * already.
     */
    void begin(Network n, SourceWave source, double seconds, double startVolts, double startFluxAmps) {
        wave = source;
        startSeconds = seconds;
        coupled = n.transformerCoupled;
        makeRoom(source.count);
        if (coupled) {
            couple(n, source, startVolts, startFluxAmps);
        } else if (mode == Mode.STALLED) {
            follow(source);
        } else {
            charge(n, source, startVolts);
        }
        look(seconds);
        startRamp = rampVolts;
        startRampSlope = rampSlope;
        startRampBend = rampBend;
        startFlux = fluxAmps;
        startFluxSlope = fluxSlope;
        startFluxBend = fluxBend;
        startSource = sourceVolts;
        startSourceSlope = sourceSlope;
        startSourceBend = sourceBend;
        startSourceJerk = sourceJerk;
    }

    /** As a look at the start, without working it out again. */
    void lookAtStart() {
        if (coupled) {
            states.lookAtStart();
        }
        decay = exponential;
        rampVolts = startRamp;
        rampSlope = startRampSlope;
        rampBend = startRampBend;
        fluxAmps = startFlux;
        fluxSlope = startFluxSlope;
        fluxBend = startFluxBend;
        sourceVolts = startSource;
        sourceSlope = startSourceSlope;
        sourceBend = startSourceBend;
        sourceJerk = startSourceJerk;
    }

    /**
     * Ramp and magnetising current together: L_m dI_m/dt = V_prim. In a stall the ramp is no state of its own; a silent
     * one that decays like the flux keeps its place.
     */
    private void couple(Network n, SourceWave source, double startVolts, double startFluxAmps) {
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
        states.begin(rampDrive, fluxDrive, source, startSeconds, mode == Mode.STALLED ? 0 : startVolts, startFluxAmps);
        rate = states.fastestRate();
    }

    private void makeRoom(int count) {
        if (sines.length < count) {
            sines = new double[count];
            cosines = new double[count];
            sinesNow = new double[count];
            cosinesNow = new double[count];
        }
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
        lookAtSource(seconds);
        if (!coupled) {
            lookAtRamp(seconds);
            return;
        }
        states.look(this, seconds, sinesNow, cosinesNow);
        if (mode == Mode.STALLED) {
            rampVolts = value(peak);
            rampSlope = slope(peak);
            rampBend = bend(peak);
        }
    }

    private void lookAtSource(double seconds) {
        double source = -wave.dropVolts;
        double slope = 0;
        double bend = 0;
        double jerk = 0;
        for (int i = 0; i < wave.count; i++) {
            double w = wave.rates[i];
            double angle = w * seconds + wave.phases[i];
            double sin = Math.sin(angle);
            double cos = Math.cos(angle);
            sinesNow[i] = sin;
            cosinesNow[i] = cos;
            double volts = wave.amplitudes[i] * sin;
            double rising = w * wave.amplitudes[i] * cos;
            source += volts;
            slope += rising;
            bend -= w * w * volts;
            jerk -= w * w * rising;
        }
        sourceVolts = source;
        sourceSlope = slope;
        sourceBend = bend;
        sourceJerk = jerk;
    }

    private void lookAtRamp(double seconds) {
        decay = exponential == 0 ? 0 : exponential * Math.exp(-rate * (seconds - startSeconds));
        double ramp = steady + decay;
        double slope = -rate * decay;
        double bend = rate * rate * decay;
        for (int i = 0; i < wave.count; i++) {
            double w = wave.rates[i];
            double swing = sines[i] * sinesNow[i] + cosines[i] * cosinesNow[i];
            ramp += swing;
            slope += w * (sines[i] * cosinesNow[i] - cosines[i] * sinesNow[i]);
            bend -= w * w * swing;
        }
        rampVolts = ramp;
        rampSlope = slope;
        rampBend = bend;
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

    /** Second time derivative of a linear form where the piece was last looked at. */
    double bend(Affine form) {
        return form.ramp * rampBend + form.flux * fluxBend + form.source * sourceBend + form.sourceSlope * sourceJerk;
    }

    /** How a linear form may go on; to be asked after a look. */
    Outlook outlook(Affine form) {
        outlook.of(form);
        return outlook;
    }

    int sinusoids() {
        return wave.count;
    }

    /** Angular frequency of the source's i-th sinusoid, rad/s. */
    double sinusoidRate(int i) {
        return wave.rates[i];
    }

    /** What that sinusoid's sine gives a linear form. */
    double sineOf(Affine form, int i) {
        double swing = coupled ? states.sineOf(form, i) : form.ramp * sines[i];
        return swing + form.source * wave.amplitudes[i];
    }

    /** What its cosine gives. */
    double cosineOf(Affine form, int i) {
        double swing = coupled ? states.cosineOf(form, i) : form.ramp * cosines[i];
        return swing + form.sourceSlope * wave.rates[i] * wave.amplitudes[i];
    }

    /** What the (faster) exponential gives a linear form where the piece was last looked at. */
    double quickPart(Affine form) {
        return coupled ? states.quickPart(form) : form.ramp * decay;
    }

    double quickRate() {
        return rate;
    }

    /** What the slower exponential gives it; 0 without a pulse transformer. */
    double slowPart(Affine form) {
        return coupled ? states.slowPart(form) : 0;
    }

    double slowRate() {
        return coupled ? states.slowestRate() : 0;
    }

    /** Bound of the second derivative that two exponentials give a linear form where they cannot be told apart; else 0. */
    double meshedBend(Affine form) {
        return coupled ? states.meshedBend(form) : 0;
    }

    /** The same of the third derivative. */
    double meshedJerk(Affine form) {
        return coupled ? states.meshedJerk(form) : 0;
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
    double sourceVolts() {
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

    /** i_D through the dropper where last looked at, A; the network is the one that the piece was shaped for. */
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
     * Voltage at base two (a programmable device: at its gate node) where last looked at, V; the network is the one that
     * the piece was shaped for.
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
    boolean isRectifying() {
        return rectifies;
    }

    /** Whether the zener conducts throughout. */
    boolean isClipping() {
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
        other.sinesNow = new double[sines.length];
        other.cosinesNow = new double[sines.length];
        return other;
    }
}
