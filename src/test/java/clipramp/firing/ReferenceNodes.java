package clipramp.firing;

/**
 * The circuit's node equations as they stand in model.md sections 2 to 6, solved by elimination with every diode-like
 * branch taken as conducting or not; {@link #search} tries every such combination against the branches' own laws.
 */
final class ReferenceNodes {
    private final ReferenceParameters p;
    private final double[][] a = new double[3][4];
    private final double[] x = new double[3];

    boolean rectifier;
    boolean zener;
    boolean junction;

    double supplyVolts;
    double baseOneVolts;
    double gateVolts;
    double gateAmps;
    double emitterAmps;
    double peakVolts;
    double rampAmps;
    double heldRate;
    double rectifierSlack;
    double zenerSlack;
    double junctionSlack;
    double valleySlack;

    ReferenceNodes(ReferenceParameters p) {
        this.p = p;
    }

    /** Emitter blocking: unknowns V_S and I_B2. */
    void off(double e, double capacitorVolts) {
        clear();
        supplyRow(e, capacitorVolts, 1 / p.rampOhms);
        a[0][1] -= 1;
        barRow();
        solve(2);
        finishOff(e);
        rampAmps = (supplyVolts - capacitorVolts) / p.rampOhms;
    }

    /** Capacitor held at the peak point: V_C is kappa V_S + V_D, written out as what the bar's taps say. */
    void held(double e, double eRate) {
        heldBar(eRate, 0, 0);
        heldRate = x[1] * (p.quiescentBaseOneOhms + p.standoff * p.interbaseOhms);
        heldBar(e, 1, 1);
        finishOff(e);
        rampAmps = (supplyVolts - peakVolts) / p.rampOhms;
        emitterAmps = rampAmps - p.rampFarads * heldRate;
    }

    /** V_S and I_B2 while held; with both offsets at 0 the linear response to e alone, which gives the rates. */
    private void heldBar(double e, double zenerOffset, double dropOffset) {
        clear();
        if (rectifier) {
            a[0][0] -= 1 / p.dropperOhms;
            a[0][3] -= e / p.dropperOhms;
        }
        if (zener) {
            a[0][0] -= 1 / p.zenerSlopeOhms;
            a[0][3] -= zenerOffset * p.zenerFootVolts / p.zenerSlopeOhms;
        }
        a[0][0] -= 1 / p.rampOhms;
        a[0][1] += (p.quiescentBaseOneOhms + p.standoff * p.interbaseOhms) / p.rampOhms - 1;
        a[0][3] -= dropOffset * p.emitterDropVolts / p.rampOhms;
        barRow();
        solve(2);
    }

    /** Emitter conducting: unknowns V_S, V_B1 and the current through R_G. */
    void on(double e, double capacitorVolts) {
        clear();
        double baseTwo = 1 / (p.baseTwoOhms + p.onBaseTwoOhms);
        double emitter = 1 / p.slopeOhms;
        supplyRow(e, capacitorVolts, 1 / p.rampOhms);
        a[0][0] -= baseTwo;
        a[0][1] += baseTwo;
        a[1][0] = baseTwo - p.intercept * emitter;
        a[1][1] = -emitter - baseTwo - 1 / p.baseOneOhms;
        a[1][2] = -1;
        a[1][3] = -(capacitorVolts - p.emitterDropVolts) * emitter;
        double gate = p.shuntSiemens + (junction ? 1 / p.gateSlopeOhms : 0);
        a[2][1] = -gate;
        a[2][2] = 1 + gate * p.seriesOhms;
        a[2][3] = junction ? -p.kneeVolts / p.gateSlopeOhms : 0;
        solve(3);
        supplyVolts = x[0];
        baseOneVolts = x[1];
        gateVolts = x[1] - x[2] * p.seriesOhms;
        gateAmps = junction ? (gateVolts - p.kneeVolts) / p.gateSlopeOhms : 0;
        emitterAmps = (capacitorVolts - baseOneVolts - p.emitterDropVolts - p.intercept * supplyVolts) / p.slopeOhms;
        rampAmps = (supplyVolts - capacitorVolts) / p.rampOhms;
        slacks(e);
        junctionSlack = junction ? gateVolts - p.kneeVolts : p.kneeVolts - gateVolts;
        valleySlack = emitterAmps - p.valleySiemens * supplyVolts;
    }

    /** Solves with the combination of branches that obeys every branch's law. */
    void search(ReferenceIntegrator.Emitter emitter, double e, double eRate, double capacitorVolts) {
        double best = Double.NEGATIVE_INFINITY;
        int chosen = -1;
        int combinations = emitter == ReferenceIntegrator.Emitter.ON ? 8 : 4;
        for (int c = 0; c < combinations; c++) {
            set(c);
            evaluate(emitter, e, eRate, capacitorVolts);
            double worst = Math.min(rectifierSlack, zenerSlack);
            if (combinations == 8) {
                worst = Math.min(worst, junctionSlack);
            }
            if (worst > best) {
                best = worst;
                chosen = c;
            }
        }
        if (best < -1e-9) {
            throw new IllegalStateException("no combination of branches obeys every law: " + best);
        }
        set(chosen);
        evaluate(emitter, e, eRate, capacitorVolts);
    }

    void evaluate(ReferenceIntegrator.Emitter emitter, double e, double eRate, double capacitorVolts) {
        switch (emitter) {
            case OFF -> off(e, capacitorVolts);
            case HELD -> held(e, eRate);
            case ON -> on(e, capacitorVolts);
        }
    }

    int branches() {
        return (rectifier ? 1 : 0) | (zener ? 2 : 0) | (junction ? 4 : 0);
    }

    void set(int branches) {
        rectifier = (branches & 1) != 0;
        zener = (branches & 2) != 0;
        junction = (branches & 4) != 0;
    }

    private void supplyRow(double e, double capacitorVolts, double ramp) {
        if (rectifier) {
            a[0][0] -= 1 / p.dropperOhms;
            a[0][3] -= e / p.dropperOhms;
        }
        if (zener) {
            a[0][0] -= 1 / p.zenerSlopeOhms;
            a[0][3] -= p.zenerFootVolts / p.zenerSlopeOhms;
        }
        a[0][0] -= ramp;
        a[0][3] -= capacitorVolts * ramp;
    }

    private void barRow() {
        a[1][0] = 1;
        a[1][1] = -(p.baseTwoOhms + p.interbaseOhms + p.quiescentBaseOneOhms);
    }

    private void finishOff(double e) {
        supplyVolts = x[0];
        baseOneVolts = x[1] * p.quiescentBaseOneOhms;
        double baseTwoVolts = supplyVolts - x[1] * p.baseTwoOhms;
        peakVolts = baseOneVolts + p.standoff * (baseTwoVolts - baseOneVolts) + p.emitterDropVolts;
        gateVolts = p.shuntSiemens == 0 ? baseOneVolts : baseOneVolts / (1 + p.seriesOhms * p.shuntSiemens);
        gateAmps = 0;
        emitterAmps = 0;
        slacks(e);
    }

    private void slacks(double e) {
        rectifierSlack = rectifier ? e - supplyVolts : supplyVolts - e;
        zenerSlack = zener ? supplyVolts - p.zenerFootVolts : p.zenerFootVolts - supplyVolts;
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
    private void solve(int n) {
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
