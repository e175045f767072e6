package clipramp.circuit;

/**
 * Where a probe is put: the same names in the drawing, in the record and in fault tables. The words of each say which node
 * it is and against what it is read.
 */
public enum TestPoint {
    TP0("firing common, the reference of TP1 to TP3"),
    TP1("clipped supply"),
    TP2("ramp, at the trigger device's emitter or anode"),
    TP3("base one, or the programmable device's cathode"),
    TP4("gate, against the thyristor's cathode or main terminal one"),
    TP5("thyristor's anode or main terminal two, against its cathode or main terminal one");

    private final String place;

    TestPoint(String place) {
        this.place = place;
    }

    /** Which node it is and against what it is read, in words. */
    public String place() {
        return place;
    }
}
