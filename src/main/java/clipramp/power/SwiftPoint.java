package clipramp.power;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.engine.LoadCurrent;
import clipramp.engine.Network;
import clipramp.engine.SourceWave;
import clipramp.engine.UnitValues;
import clipramp.firing.FiringState;
import clipramp.firing.SwiftFiring;

/**
 * Firing angle and load power of one unit after another of a design, at speed: {@link KnobMap} and {@link LoadPower} for
 * statistics. Allocates nothing once made; not for two threads at once. It agrees with them within a billionth of a half
 * cycle (DEVELOPERS.md, Many units at once).
 */
public final class SwiftPoint {
    private final Network network = new Network();
    private final SwiftFiring firing = new SwiftFiring(network);
    private final SourceWave wave = new SourceWave();
    private final boolean bothHalves;
    private final double halvesASupplyCycle;
    private final double windingRatio;
    private final double supplyDropVolts;
    private final double loadDropVolts;
    private final double pathOhms;
    private final double loadOhms;

    private double watts;
    private double fraction;

    /**
     * For units of one design.
     *
     * @param design one that {@link #suits} is true for
     * @throws IllegalArgumentException for another
     */
    public SwiftPoint(Design design) {
        if (!suits(design)) {
            throw new IllegalArgumentException("this design is not for the swift path");
        }
        ClipSupply clip = design.clip();
        bothHalves = design.stage().isFullWave();
        halvesASupplyCycle = clip.rectifier() == ClipSupply.Rectifier.BRIDGE ? 1 : 2;
        windingRatio = clip.windingRatio();
        supplyDropVolts = clip.rectifierVolts();
        LoadCurrent path = new LoadCurrent(design, design.nominalCondition());
        loadDropVolts = path.dropVolts();
        loadOhms = design.load().resistanceOhms();
        pathOhms = path.loopOhms();
    }

    /**
     * Whether a design's units can be solved here: a sinusoidal line, a supply across it that keeps time with it, direct
     * coupling, a resistor as load.
     */
    public static boolean suits(Design design) {
        ClipSupply clip = design.clip();
        boolean fedWithTheLoad = clip.rectifier() == ClipSupply.Rectifier.BRIDGE
                || (design.stage() == Stage.HALF_WAVE && !clip.isTurnedOver());
        return design.line().harmonics().isEmpty()
                && clip.tap() == ClipSupply.Tap.LINE
                && clip.lagRad() == 0
                && fedWithTheLoad
                && design.gate().coupling() == GateDrive.Coupling.DIRECT
                && design.load() instanceof Load.Resistor;
    }

    /**
     * Solves a unit.
     *
     * @param unit its parts, line and temperature
     * @param rampOhms its R_E, ohm, above 0
     * @return false where the swift path is not sure of itself; {@link clipramp.firing.Firing} is, with {@link #network()}
     */
    public boolean solve(UnitValues unit, double rampOhms) {
        unit.fill(network, rampOhms);
        double omega = 2 * Math.PI * unit.lineHertz;
        double crest = Math.sqrt(2) * unit.lineVolts;
        wave.setSine(omega, crest * windingRatio, supplyDropVolts, halvesASupplyCycle * Math.PI / omega);
        firing.load(crest, loadDropVolts, pathOhms, bothHalves);
        if (!firing.solve(wave, omega)) {
            return false;
        }
        double square = 0;
        for (int half = 0; half < firing.shown(); half++) {
            double fired = firing.firingRad(half);
            square += Double.isNaN(fired) ? 0 : ResistorCurrent.sineSquare(crest, loadDropVolts, fired);
        }
        double span = firing.shown() * (bothHalves ? Math.PI : 2 * Math.PI);
        watts = square / span / (pathOhms * pathOhms) * loadOhms;
        fraction = watts * loadOhms / (unit.lineVolts * unit.lineVolts);
        return true;
    }

    /** The unit's network as last filled. */
    public Network network() {
        return network;
    }

    /** Firing angle from the line's zero, rad (the positive one's where the unit hunts); NaN where the thyristor stays off. */
    public double firingRad() {
        return firing.firingRad();
    }

    /** What the unit's R_E comes to in one word. */
    public FiringState state() {
        return firing.state();
    }

    /** Load power, W. */
    public double watts() {
        return watts;
    }

    /** Load power as a share of full power at the unit's own line voltage. */
    public double fraction() {
        return fraction;
    }
}
