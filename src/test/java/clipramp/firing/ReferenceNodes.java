package clipramp.firing;

import clipramp.firing.ReferenceIntegrator.Emitter;

/**
 * The circuit's node equations as they stand in DEVELOPERS.md, The circuit laws,, solved by elimination with every diode-like
 * branch taken as conducting or not; {@link #search} tries every such combination against the branches' own laws.
 *
 * <p>Unknowns: V_S, V_B1 (a programmable device's cathode) and the current into the gate network. A pulse transformer
 * stands between base one and that network with its magnetising current as given; direct coupling is one of ratio 1
 * without resistance or magnetising current.
 */
final class ReferenceNodes {
    private static final int RECTIFIER = 1;
    private static final int ZENER = 2;
    private static final int JUNCTION = 4;
    private static final int CLAMP = 8;

    private final ReferenceParameters p;
    private final double[][] a = new double[3][4];
    private final double[] x = new double[3];

    boolean rectifier;
    boolean zener;
    boolean junction;
    boolean clamp;

    double supplyVolts;
    double baseOneVolts;
    double gateVolts;
    double gateAmps;
    double emitterAmps;
    double peakVolts;
    double rampAmps;
    double heldRate;
    double magnetisingRate;
    double rectifierSlack;
    double zenerSlack;
    double junctionSlack;
    double clampSlack;
    double valleySlack;

    ReferenceNodes(ReferenceParameters p) {
        this.p = p;
    }

    void evaluate(Emitter emitter, double e, double eRate, double capacitorVolts, double magnetisingAmps) {
        switch (emitter) {
            case OFF -> {
                blocking(e, 1, magnetisingAmps, capacitorVolts, false);
                blockingAnswers(e, magnetisingAmps);
                rampAmps = (supplyVolts - capacitorVolts) / p.rampOhms;
                emitterAmps = 0;
            }
            case HELD -> held(e, eRate, magnetisingAmps);
            case ON -> on(e, capacitorVolts, magnetisingAmps);
        }
    }

    /** Solves with the combination of branches that obeys every branch's law. */
    void search(Emitter emitter, double e, double eRate, double capacitorVolts, double magnetisingAmps) {
        double best = Double.NEGATIVE_INFINITY;
        int chosen = -1;
        int allowed = RECTIFIER | ZENER | (emitter == Emitter.ON ? JUNCTION : 0) | (p.hasClamp ? CLAMP : 0);
        for (int c = 0; c < 16; c++) {
            if ((c & ~allowed) != 0) {
                continue;
            }
            set(c);
            evaluate(emitter, e, eRate, capacitorVolts, magnetisingAmps);
            double worst = Math.min(Math.min(rectifierSlack, zenerSlack), Math.min(junctionSlack, clampSlack));
            if (worst > best) {
                best = worst;
                chosen = c;
            }
        }
        if (best < -1e-9) {
            throw new IllegalStateException("no combination of branches obeys every law: " + best);
        }
        set(chosen);
        evaluate(emitter, e, eRate, capacitorVolts, magnetisingAmps);
    }

    int branches() {
        return (rectifier ? RECTIFIER : 0) | (zener ? ZENER : 0) | (junction ? JUNCTION : 0) | (clamp ? CLAMP : 0);
    }

    void set(int branches) {
        rectifier = (branches & RECTIFIER) != 0;
        zener = (branches & ZENER) != 0;
        junction = (branches & JUNCTION) != 0;
        clamp = (branches & CLAMP) != 0;
    }

    /** Capacitor held at the peak point; the rates follow from the same equations with every constant left out. */
    private void held(double e, double eRate, double magnetisingAmps) {
        blocking(e, 1, magnetisingAmps, 0, true);
        blockingAnswers(e, magnetisingAmps);
        double amps = (supplyVolts - peakVolts) / p.rampOhms;
        blocking(eRate, 0, magnetisingRate, 0, true);
        heldRate = peakOf(x[0], x[1]);
        rampAmps = amps;
        emitterAmps = amps - p.rampFarads * heldRate;
    }

    /**
     * Emitter blocking.
     *
     * @param constants 1, or 0 for the response to e and the magnetising current alone
     * @param heldAtPeak whether the capacitor is at the peak point, whatever that comes to
     */
    private void blocking(
            double e, double constants, double magnetisingAmps, double capacitorVolts, boolean heldAtPeak) {
        clear();
        supplyRow(e, constants);
        double ramp = 1 / p.rampOhms;
        a[0][0] -= ramp;
        if (heldAtPeak) {
            // V_P = share of V_S + share of V_B1 + V_D
            a[0][0] += ramp * peakOf(1, 0);
            a[0][1] += ramp * peakOf(0, 1);
            a[0][3] -= ramp * constants * p.emitterDropVolts;
        } else {
            a[0][3] -= ramp * capacitorVolts;
        }
        double bar = p.programmable ? 0 : 1 / (p.baseTwoOhms + p.interbaseOhms);
        a[0][0] -= p.programmable ? 1 / (p.upperOhms + p.lowerOhms) : bar;
        a[0][1] += bar;
        a[1][0] = bar;
        a[1][1] = -bar - 1 / p.baseOneOhms;
        coupling(magnetisingAmps, false, constants);
        solve();
    }

    /** Peak point without V_D, from V_S and V_B1: what the base bar's tap (or the divider's) stands at. */
    private double peakOf(double supply, double baseOne) {
        if (p.programmable) {
            return supply * p.lowerOhms / (p.upperOhms + p.lowerOhms);
        }
        double amps = (supply - baseOne) / (p.baseTwoOhms + p.interbaseOhms);
        double baseTwo = supply - amps * p.baseTwoOhms;
        return baseOne + p.standoff * (baseTwo - baseOne);
    }

    private void blockingAnswers(double e, double magnetisingAmps) {
        answers(e, magnetisingAmps, false);
        peakVolts = peakOf(supplyVolts, baseOneVolts) + p.emitterDropVolts;
    }

    /** Emitter conducting. */
    private void on(double e, double capacitorVolts, double magnetisingAmps) {
        clear();
        supplyRow(e, 1);
        double ramp = 1 / p.rampOhms;
        a[0][0] -= ramp;
        a[0][3] -= ramp * capacitorVolts;
        // A programmable device's gate stands at its anode-less drop above the cathode.
        double drop = p.programmable ? p.emitterOnVolts : 0;
        double bar = p.programmable ? 1 / p.upperOhms : 1 / (p.baseTwoOhms + p.onBaseTwoOhms);
        double lower = p.programmable ? 1 / p.lowerOhms : 0;
        double emitter = 1 / p.slopeOhms;
        a[0][0] -= bar;
        a[0][1] += bar;
        a[0][3] -= bar * drop;
        a[1][0] = bar - p.intercept * emitter;
        a[1][1] = -emitter - bar - lower - 1 / p.baseOneOhms;
        a[1][3] = -(capacitorVolts - p.emitterOnVolts) * emitter + (bar + lower) * drop;
        coupling(magnetisingAmps, junction, 1);
        solve();
        answers(e, magnetisingAmps, junction);
        emitterAmps = (capacitorVolts - baseOneVolts - p.emitterOnVolts - p.intercept * supplyVolts) / p.slopeOhms;
        rampAmps = (supplyVolts - capacitorVolts) / p.rampOhms;
        junctionSlack = junction ? gateVolts - p.kneeVolts : p.kneeVolts - gateVolts;
        valleySlack = emitterAmps - p.valleySiemens * supplyVolts;
        if (p.hasClamp) {
            double into = emitterAmps + bar * (supplyVolts - baseOneVolts - drop) - lower * (baseOneVolts + drop);
            clampSlack = clampSlack(magnetisingAmps + x[2] * p.secondaries / p.ratio, into);
        }
    }

    private void supplyRow(double e, double constants) {
        if (rectifier) {
            a[0][0] -= 1 / p.dropperOhms;
            a[0][3] -= e / p.dropperOhms;
        }
        if (zener) {
            a[0][0] -= 1 / p.zenerSlopeOhms;
            a[0][3] -= constants * p.zenerFootVolts / p.zenerSlopeOhms;
        }
    }

    /** What base one gives to the primary, and the gate network's own law. */
    private void coupling(double magnetisingAmps, boolean conducts, double constants) {
        a[1][2] = -p.secondaries / p.ratio;
        a[1][3] += magnetisingAmps;
        double gate = p.shuntSiemens + (conducts ? 1 / p.gateSlopeOhms : 0);
        // v_GK = V_B1/n - I_m R_p/n - I_sec (secondaries R_p/n^2 + R_s + R_G)
        a[2][1] = -gate / p.ratio;
        a[2][2] = 1 + gate * inSeries();
        a[2][3] = -gate * magnetisingAmps * p.primaryOhms / p.ratio
                - (conducts ? constants * p.kneeVolts / p.gateSlopeOhms : 0);
        if (clamp) {
            a[1][0] = 0;
            a[1][1] = 1;
            a[1][2] = 0;
            a[1][3] = -constants * p.clampVolts;
        }
    }

    private double inSeries() {
        return p.secondaries * p.primaryOhms / (p.ratio * p.ratio) + p.secondaryOhms + p.seriesOhms;
    }

    private void answers(double e, double magnetisingAmps, boolean conducts) {
        supplyVolts = x[0];
        baseOneVolts = x[1];
        double primaryAmps = magnetisingAmps + x[2] * p.secondaries / p.ratio;
        gateVolts = (baseOneVolts - magnetisingAmps * p.primaryOhms) / p.ratio - x[2] * inSeries();
        gateAmps = conducts ? (gateVolts - p.kneeVolts) / p.gateSlopeOhms : 0;
        magnetisingRate =
                p.magnetisingHenries == 0 ? 0 : (baseOneVolts - p.primaryOhms * primaryAmps) / p.magnetisingHenries;
        rectifierSlack = rectifier ? e - supplyVolts : supplyVolts - e;
        zenerSlack = zener ? supplyVolts - p.zenerFootVolts : p.zenerFootVolts - supplyVolts;
        junctionSlack = Double.POSITIVE_INFINITY;
        clampSlack = Double.POSITIVE_INFINITY;
        if (p.hasClamp) {
            double bar = p.programmable ? 0 : (supplyVolts - baseOneVolts) / (p.baseTwoOhms + p.interbaseOhms);
            clampSlack = clampSlack(primaryAmps, bar);
        }
    }

    /** Forward current of the clamp diode times R1, or what base one still lacks to it. */
    private double clampSlack(double primaryAmps, double intoBaseOneAmps) {
        return clamp ? p.baseOneOhms * (primaryAmps - intoBaseOneAmps) + baseOneVolts : baseOneVolts + p.clampVolts;
    }

    private void clear() {
        for (double[] row : a) {
            row[0] = 0;
            row[1] = 0;
            row[2] = 0;
            row[3] = 0;
        }
    }

    /** Elimination with row pivoting; the right-hand side is the fourth column. */
    private void solve() {
        int n = 3;
        for (int column = 0; column < n; column++) {
            int pivot = column;
            for (int row = column + 1; row < n; row++) {
                if (Math.abs(a[row][column]) > Math.abs(a[pivot][column])) {
                    pivot = row;
                }
            }
            double[] swap = a[column];
            a[column] = a[pivot];
            a[pivot] = swap;
            for (int row = column + 1; row < n; row++) {
                double factor = a[row][column] / a[column][column];
                for (int k = column; k < n; k++) {
                    a[row][k] -= factor * a[column][k];
                }
                a[row][3] -= factor * a[column][3];
            }
        }
        for (int row = n - 1; row >= 0; row--) {
            double sum = a[row][3];
            for (int k = row + 1; k < n; k++) {
                sum -= a[row][k] * x[k];
            }
            x[row] = sum / a[row][row];
        }
    }
}
