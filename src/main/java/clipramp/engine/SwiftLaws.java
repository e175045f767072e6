package clipramp.engine;

/**
 * The circuit's laws on a sinusoidal supply as flat numbers, one row for each state of trigger device, rectifier, zener
 * and gate junction, worked out when first asked for. For direct coupling.
 *
 * <p>In a state the ramp is V_C = steady + sine s + cosine c + x with s, c the sine and cosine of the supply's angle and
 * x decaying at the state's rate; every event's form is p x + q s + r c + k and rises to zero at its event.
 */
final class SwiftLaws {
    /** Bits of a state's number. */
    static final int GATE = 1;

    static final int CLIPS = 2;
    static final int RECTIFIES = 4;
    static final int ON = 8;
    static final int STATES = 16;

    /** Columns of a row. */
    static final int RATE = 0;

    static final int STEADY = 1;
    static final int SINE = 2;
    static final int COSINE = 3;
    private static final int FIRST_FORM = 4;

    /** Columns of a form from its first on: p, q, r, k and the greatest slope of q s + r c. */
    static final int FORM_COLUMNS = 5;

    /** Offsets of the forms. Firing or valley: */
    static final int DEVICE = FIRST_FORM;

    static final int ZENER = DEVICE + FORM_COLUMNS;
    static final int RECTIFIER = ZENER + FORM_COLUMNS;
    /** Gate junction, device on. */
    static final int JUNCTION = RECTIFIER + FORM_COLUMNS;
    /** Emitter current less peak-point current in a stall, device off: it takes the junction's place. */
    static final int PEAK_CURRENT = JUNCTION;
    /** Trigger current less gate current, device on and junction conducting. */
    static final int TRIGGER = JUNCTION + FORM_COLUMNS;

    private static final int COLUMNS = 32;

    final double[] rows = new double[STATES * COLUMNS];
    private final Network n;
    private final Piece piece = new Piece();
    private final Affine form = new Affine();
    private double omega;
    private double amplitude;
    private double dropVolts;
    private int known;

    SwiftLaws(Network network) {
        n = network;
    }

    /** Forgets every row: the network or the supply is another. */
    void reset(SourceWave wave) {
        omega = wave.rates[0];
        amplitude = wave.amplitudes[0];
        dropVolts = wave.dropVolts;
        known = 0;
    }

    /** Where a state's row begins. */
    int row(int state) {
        if ((known >> state & 1) == 0) {
            work(state);
        }
        return state * COLUMNS;
    }

    private void work(int state) {
        known |= 1 << state;
        int row = state * COLUMNS;
        boolean on = (state & ON) != 0;
        piece.mode = on ? Mode.ON : Mode.OFF;
        piece.rectifies = (state & RECTIFIES) != 0;
        piece.clips = (state & CLIPS) != 0;
        piece.gateConducts = (state & GATE) != 0;
        NodeLaws.shape(n, piece);
        piece.drive(n);
        double rate = piece.rate;
        double force = piece.driveSource * amplitude / (rate * rate + omega * omega);
        rows[row + RATE] = rate;
        rows[row + STEADY] = (piece.driveConstant - piece.driveSource * dropVolts) / rate;
        rows[row + SINE] = force * rate;
        rows[row + COSINE] = -force * omega;
        EventForms.zener(n, piece, form);
        put(row, ZENER);
        EventForms.rectifier(piece, form);
        put(row, RECTIFIER);
        if (on) {
            EventForms.valley(n, piece, form);
            put(row, DEVICE);
            EventForms.gate(n, piece, form);
            put(row, JUNCTION);
            EventForms.gateFallsTo(n, piece, n.triggerAmps, form);
            put(row, TRIGGER);
        } else {
            EventForms.peak(piece, form);
            put(row, DEVICE);
            piece.mode = Mode.STALLED;
            NodeLaws.shape(n, piece);
            EventForms.peakCurrent(n, piece, form);
            put(row, PEAK_CURRENT);
        }
    }

    private void put(int row, int offset) {
        int at = row + offset;
        double sine = form.ramp * rows[row + SINE] + form.source * amplitude;
        double cosine = form.ramp * rows[row + COSINE] + form.sourceSlope * amplitude * omega;
        rows[at] = form.ramp;
        rows[at + 1] = sine;
        rows[at + 2] = cosine;
        rows[at + 3] = form.ramp * rows[row + STEADY] + form.constant - form.source * dropVolts;
        rows[at + 4] = omega * (Math.abs(sine) + Math.abs(cosine));
    }
}
