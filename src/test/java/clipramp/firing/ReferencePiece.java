package clipramp.firing;

import clipramp.firing.ReferenceIntegrator.Emitter;
import java.util.Arrays;
import java.util.function.Consumer;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.events.EventHandler;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.apache.commons.math3.ode.sampling.StepHandler;
import org.apache.commons.math3.ode.sampling.StepInterpolator;

/**
 * The circuit between two events, its branches standing still: the right-hand side and the slacks that the general-purpose
 * integrator watches. State: capacitor voltage, magnetising current, and while a pulse is measured gate energy and charge.
 */
final class ReferencePiece implements FirstOrderDifferentialEquations {
    private static final double RELATIVE = 1e-12;
    private static final double ROOT_SECONDS = 1e-14;
    private static final int VOLTS = 0;
    private static final int MAGNETISING = 1;
    private static final int JOULES = 2;
    private static final int COULOMBS = 3;

    private final ReferenceParameters p;
    private final ReferenceNodes nodes;
    private final Emitter emitter;
    private final DoubleUnaryOperator source;
    private final DoubleUnaryOperator sourceRate;
    private final double halfSeconds;
    private final DormandPrince853Integrator integrator;
    private Runnable ending = () -> {};
    private double seenSeconds = Double.NaN;
    private double seenVolts;
    private double seenMagnetisingAmps;

    ReferencePiece(
            ReferenceParameters p,
            ReferenceNodes nodes,
            Emitter emitter,
            DoubleUnaryOperator source,
            DoubleUnaryOperator sourceRate,
            double halfSeconds) {
        this.p = p;
        this.nodes = nodes;
        this.emitter = emitter;
        this.source = source;
        this.sourceRate = sourceRate;
        this.halfSeconds = halfSeconds;
        double volts = 1 + Math.abs(p.zenerFootVolts);
        double coulombs = p.rampFarads * volts;
        double[] absolute = {1e-13 * volts, 1e-16, 1e-13 * coulombs * volts, 1e-13 * coulombs};
        double[] relative = new double[absolute.length];
        Arrays.fill(relative, RELATIVE);
        integrator = new DormandPrince853Integrator(
                1e-18,
                halfSeconds / 60,
                Arrays.copyOf(absolute, getDimension()),
                Arrays.copyOf(relative, getDimension()));
    }

    @Override
    public int getDimension() {
        return emitter == Emitter.ON ? 4 : 2;
    }

    @Override
    public void computeDerivatives(double t, double[] y, double[] rate) {
        see(t, y);
        rate[MAGNETISING] = nodes.magnetisingRate;
        if (emitter == Emitter.HELD) {
            rate[VOLTS] = nodes.heldRate;
            return;
        }
        rate[VOLTS] = (nodes.rampAmps - nodes.emitterAmps) / p.rampFarads;
        if (emitter == Emitter.ON) {
            rate[JOULES] = nodes.gateVolts * nodes.gateAmps;
            rate[COULOMBS] = nodes.gateAmps;
        }
    }

    /** Solves the nodes; once only where several slacks are asked at one instant. */
    private void see(double t, double[] y) {
        if (t == seenSeconds && y[VOLTS] == seenVolts && y[MAGNETISING] == seenMagnetisingAmps) {
            return;
        }
        seenSeconds = t;
        seenVolts = y[VOLTS];
        seenMagnetisingAmps = y[MAGNETISING];
        double rate = emitter == Emitter.HELD ? sourceRate.applyAsDouble(t) : 0;
        nodes.evaluate(emitter, source.applyAsDouble(t), rate, y[VOLTS], y[MAGNETISING]);
    }

    /** Capacitor voltage of the instant that the nodes were last solved at, V. */
    double seenVolts() {
        return seenVolts;
    }

    /** Magnetising current of the same instant, A. */
    double seenMagnetisingAmps() {
        return seenMagnetisingAmps;
    }

    /** Ends the piece where a slack falls through zero. */
    void watch(DoubleUnaryOperator slack, Runnable then) {
        integrator.addEventHandler(
                new Crossing(slack) {
                    @Override
                    public Action eventOccurred(double t, double[] y, boolean increasing) {
                        if (increasing) {
                            return Action.CONTINUE;
                        }
                        ending = then;
                        return Action.STOP;
                    }
                },
                checkSeconds(),
                ROOT_SECONDS,
                200);
    }

    /** Only notes where the gate current crosses the trigger current. */
    void note(ReferencePulseMeter meter) {
        integrator.addEventHandler(
                new Crossing(t -> nodes.gateAmps - p.triggerAmps) {
                    @Override
                    public Action eventOccurred(double t, double[] y, boolean increasing) {
                        if (increasing) {
                            meter.rise(t);
                        } else {
                            meter.fall(t);
                        }
                        return Action.CONTINUE;
                    }
                },
                checkSeconds(),
                ROOT_SECONDS,
                200);
    }

    private double checkSeconds() {
        if (emitter != Emitter.ON) {
            return halfSeconds / 200;
        }
        // The valley's slack may dip under zero for less than the discharge's time constant, a clamp's for less still.
        double dip = p.rampFarads * (p.hasClamp ? p.slopeOhms / 2 : (p.slopeOhms + p.baseOneOhms) / 5);
        return Math.min(halfSeconds / 1000, dip);
    }

    /** Looks at the solved nodes at five places of every step. */
    void look(Consumer<Double> look) {
        integrator.addStepHandler(new StepHandler() {
            @Override
            public void init(double t0, double[] y0, double t) {}

            @Override
            public void handleStep(StepInterpolator interpolator, boolean isLast) {
                double a = interpolator.getPreviousTime();
                double b = interpolator.getCurrentTime();
                for (int i = 0; i <= 4; i++) {
                    double t = a + (b - a) * i / 4;
                    interpolator.setInterpolatedTime(t);
                    see(t, interpolator.getInterpolatedState());
                    look.accept(t);
                }
            }
        });
    }

    /**
     * Integrates until a watched slack is gone or the half cycle is over.
     *
     * @param now where to begin, s
     * @param state in and out
     * @return where it ended, s
     */
    double run(double now, double[] state) {
        return integrator.integrate(this, now, state, halfSeconds, state);
    }

    /** What the event that ended the piece asks for; nothing at the half cycle's end. */
    Runnable ending() {
        return ending;
    }

    private abstract class Crossing implements EventHandler {
        private final DoubleUnaryOperator slack;

        Crossing(DoubleUnaryOperator slack) {
            this.slack = slack;
        }

        @Override
        public void init(double t0, double[] y0, double t) {}

        @Override
        public double g(double t, double[] y) {
            see(t, y);
            return slack.applyAsDouble(t);
        }

        @Override
        public void resetState(double t, double[] y) {}
    }
}
