package clipramp.engine;

/** A source behind 1 kilohm onto 1 uF, a millisecond's time constant; V_S is the source itself. */
final class Lag {
    private Lag() {}

    static Network network() {
        Network n = new Network();
        n.rampOhms = 1e3;
        n.capacitorFarads = 1e-6;
        return n;
    }

    /** A piece of it from a time and a ramp voltage on. */
    static Piece behind(SourceWave source, double fromSeconds, double startVolts) {
        return begin(network(), source, fromSeconds, startVolts);
    }

    /** The same with another resistor and capacitor. */
    static Piece begin(Network n, SourceWave source, double fromSeconds, double startVolts) {
        Piece piece = new Piece();
        piece.supply.set(0, 1, 0);
        piece.begin(n, source, fromSeconds, startVolts, 0);
        return piece;
    }

    /** The same behind a constant volt. */
    static Piece charging(double fromSeconds, double startVolts) {
        SourceWave volt = new SourceWave();
        volt.setConstant(1, 1);
        return behind(volt, fromSeconds, startVolts);
    }
}
