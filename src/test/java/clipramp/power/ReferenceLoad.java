package clipramp.power;

import clipramp.circuit.Line;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.events.EventHandler;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;

/**
 * An inductive load integrated by a general-purpose adaptive integrator, half cycle by half cycle until the transient is
 * over: written from the circuit, not from the program. The gate is held from the firing angle to the half cycle's end.
 */
final class ReferenceLoad {
    /** What it was measured to be over the last period; every angle at which the current ended in it. */
    record Measured(List<Double> extinctionsRad, double meanSquareAmps, double meanAmps) {}

    final Line line;
    final double lineVolts;
    final boolean fullWave;
    final boolean rectified;
    final double ohms;
    final double reactance;
    final double dropVolts;
    final double dropOhms;
    /** Negative for none. */
    final double diodeVolts;

    ReferenceLoad(
            Line line,
            double lineVolts,
            boolean fullWave,
            boolean rectified,
            double ohms,
            double reactance,
            double dropVolts,
            double dropOhms,
            double diodeVolts) {
        this.line = line;
        this.lineVolts = lineVolts;
        this.fullWave = fullWave;
        this.rectified = rectified;
        this.ohms = ohms;
        this.reactance = reactance;
        this.dropVolts = dropVolts;
        this.dropOhms = dropOhms;
        this.diodeVolts = diodeVolts;
    }

    private double theta;
    private double amps;
    private double square;
    private double charge;
    private final List<Double> extinctions = new ArrayList<>();

    Measured settled(double firingRad, int periods) {
        theta = 0;
        amps = 0;
        for (int period = 0; period < periods; period++) {
            square = 0;
            charge = 0;
            extinctions.clear();
            half(2 * Math.PI * period, firingRad, period);
            half(2 * Math.PI * period + Math.PI, firingRad, period);
        }
        return new Measured(List.copyOf(extinctions), square / (2 * Math.PI), charge / (2 * Math.PI));
    }

    private int direction;
    private int polarity;

    /** One half cycle: what still flows, then what the gate starts. */
    private void half(double zero, double firingRad, int period) {
        double end = zero + Math.PI;
        polarity = Math.round((zero - 2 * Math.PI * period) / Math.PI) == 0 ? 1 : -1;
        while (theta < end - 1e-12) {
            if (direction != 0) {
                carry(end, zero, period);
                continue;
            }
            double from = Math.max(theta, zero + firingRad);
            if (from >= end) {
                circulate(end);
                return;
            }
            circulate(from);
            double forward = forwardFrom(from, end);
            circulate(Math.min(forward, end));
            if (forward < end) {
                direction = polarity;
            }
        }
    }

    /** First angle on a fine grid, bisected, at which the thyristor would carry current. */
    private double forwardFrom(double from, double end) {
        double step = 1e-3;
        double before = from;
        if (offered(from) > 0) {
            return from;
        }
        for (double at = from + step; ; at += step) {
            double to = Math.min(at, end);
            if (offered(to) > 0) {
                double low = before;
                double high = to;
                for (int i = 0; i < 60; i++) {
                    double middle = (low + high) / 2;
                    if (offered(middle) > 0) {
                        high = middle;
                    } else {
                        low = middle;
                    }
                }
                return high;
            }
            if (to >= end) {
                return Double.POSITIVE_INFINITY;
            }
            before = to;
        }
    }

    /** What the thyristor's path offers the load above the diode's, with the diode's current decayed to an angle, V. */
    private double offered(double at) {
        if (!fullWave && polarity < 0) {
            return -1;
        }
        double forward = polarity * line.voltsAt(lineVolts, at) - dropVolts;
        if (diodeVolts < 0 || amps == 0) {
            return forward;
        }
        double there = decayed(at);
        return there > 0 ? forward - dropOhms * there + diodeVolts : forward;
    }

    private double decayed(double at) {
        double limit = diodeVolts / ohms;
        return Math.max(0, (amps + limit) * Math.exp(-(at - theta) * ohms / reactance) - limit);
    }

    /** The diode's current is a plain exponential; its integrals are those of any handbook. */
    private void circulate(double to) {
        if (to <= theta) {
            return;
        }
        if (amps > 0 && diodeVolts >= 0) {
            double tau = reactance / ohms;
            double limit = diodeVolts / ohms;
            double dies = limit == 0 ? Double.POSITIVE_INFINITY : theta + tau * Math.log((amps + limit) / limit);
            double length = Math.min(to, dies) - theta;
            double a = amps + limit;
            double one = -Math.expm1(-length / tau);
            double two = -Math.expm1(-2 * length / tau);
            square += a * a * tau / 2 * two - 2 * a * limit * tau * one + limit * limit * length;
            charge += a * tau * one - limit * length;
            if (dies <= to) {
                noteExtinction(dies);
                amps = 0;
            } else {
                amps = decayed(to);
            }
        }
        theta = to;
    }

    private void noteExtinction(double at) {
        extinctions.add(at);
    }

    private void carry(double end, double zero, int period) {
        int d = direction;
        boolean[] stopped = {false};
        boolean[] handed = {false};
        DormandPrince853Integrator integrator = new DormandPrince853Integrator(1e-12, 0.05, 1e-12, 1e-12);
        FirstOrderDifferentialEquations law = new FirstOrderDifferentialEquations() {
            @Override
            public int getDimension() {
                return 3;
            }

            @Override
            public void computeDerivatives(double t, double[] y, double[] dy) {
                dy[0] = (d * line.voltsAt(lineVolts, t) - dropVolts - (dropOhms + ohms) * y[0]) / reactance;
                dy[1] = y[0] * y[0];
                dy[2] = y[0];
            }
        };
        integrator.addEventHandler(
                falling((t, i) -> t > theta + 1e-9 || i > 1e-9 ? i : 1e-9, stopped), 0.01, 1e-12, 200);
        if (diodeVolts >= 0) {
            integrator.addEventHandler(
                    falling((t, i) -> d * line.voltsAt(lineVolts, t) - dropVolts - dropOhms * i + diodeVolts, handed),
                    0.01,
                    1e-12,
                    200);
        }
        double[] y = {amps, square, charge};
        theta = integrator.integrate(law, theta, y, end, y);
        amps = Math.max(0, y[0]);
        square = y[1];
        charge = y[2];
        if (stopped[0]) {
            noteExtinction(theta);
            amps = 0;
            direction = 0;
        } else if (handed[0]) {
            direction = 0;
        }
    }

    private interface Gap {
        double at(double t, double amps);
    }

    private static EventHandler falling(Gap gap, boolean[] hit) {
        return new EventHandler() {
            @Override
            public void init(double t0, double[] y0, double t) {}

            @Override
            public double g(double t, double[] y) {
                return gap.at(t, y[0]);
            }

            @Override
            public Action eventOccurred(double t, double[] y, boolean increasing) {
                if (increasing) {
                    return Action.CONTINUE;
                }
                hit[0] = true;
                return Action.STOP;
            }

            @Override
            public void resetState(double t, double[] y) {}
        };
    }
}
