package clipramp.fit;

import clipramp.units.Unit;

/** What can be read on a bench, with the accuracy that is taken where none is said (common practice for each). */
public enum Meter {
    /** Angle of the first pulse that fires the thyristor, on a scope's graticule. */
    FIRING_ANGLE("firing angle", Unit.ANGLE, Accuracy.amount(Math.toRadians(1))),
    /** From the supply's zero to that pulse. */
    DELAY("delay", Unit.SECOND, new Accuracy(0.01, 20e-6)),
    /** Across the load, an instrument that reads the root of the mean square of any waveform. */
    LOAD_TRUE_RMS("load voltage, true rms", Unit.VOLT, new Accuracy(0.01, 0.2)),
    /** Across the load, an instrument that shows 1.1107 times the mean of the rectified wave. */
    LOAD_AVERAGE_READING("load voltage, average-reading", Unit.VOLT, new Accuracy(0.015, 0.2)),
    /** Real power that the load takes, by a wattmeter. */
    LOAD_WATTS("load power", Unit.WATT, new Accuracy(0.02, 0.5)),
    /** Highest voltage at base one (cathode of a programmable device) to common. */
    BASE_ONE_PEAK("base-one peak", Unit.VOLT, new Accuracy(0.03, 0.05)),
    /** The clipped supply just before the pulse, to common. */
    SUPPLY("supply voltage", Unit.VOLT, Accuracy.share(0.02)),
    /** The emitter just before the pulse, to common. */
    PEAK_POINT("peak-point voltage", Unit.VOLT, Accuracy.share(0.02)),
    /** R_E at a knob position, the supply off, with an ohmmeter. */
    RAMP_OHMS("ramp resistance", Unit.OHM, new Accuracy(0.005, 1));

    private final String words;
    private final Unit unit;
    private final Accuracy usual;

    Meter(String words, Unit unit, Accuracy usual) {
        this.words = words;
        this.unit = unit;
        this.usual = usual;
    }

    /** What is read, in words. */
    String words() {
        return words;
    }

    /** SI unit of the reading; radians for angles. */
    public Unit unit() {
        return unit;
    }

    /** The accuracy that is taken where none is said. */
    public Accuracy usual() {
        return usual;
    }
}
