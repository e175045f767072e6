package clipramp.circuit;

import java.util.Comparator;
import java.util.List;

/**
 * I_GT and V_GT against junction temperature: log I_GT and V_GT linear in temperature, end slopes extended. With a
 * single point, I_GT doubles and V_GT gains 1 V at -40 °C seen from 25 °C (common practice). Extended into the heat, V_GT
 * never falls under the 0.2 V at which sheets say that no device triggers (V_GD at the highest junction temperature,
 * common practice), nor under a lower V_GT that the sheet itself gives.
 *
 * @param points at least one, in any order; kept in rising temperature
 */
public record TriggerDemand(List<Point> points) {
    private static final double COLD_GAIN_VOLTS = 1;
    private static final double COLD_SPAN_KELVIN = 65;
    private static final double NON_TRIGGER_VOLTS = 0.2;

    /**
     * What triggers at one temperature.
     *
     * @param celsius junction temperature, °C
     * @param amps I_GT, A, above 0
     * @param volts V_GT, V, above 0
     */
    public record Point(double celsius, double amps, double volts) {
        /** @throws IllegalArgumentException outside the stated ranges */
        public Point {
            Require.finite("temperature", celsius);
            Require.positive("trigger current", amps);
            Require.positive("trigger voltage", volts);
        }
    }

    /** @throws IllegalArgumentException without a point */
    public TriggerDemand {
        if (points.isEmpty()) {
            throw new IllegalArgumentException("trigger data need at least one point");
        }
        points = points.stream()
                .sorted(Comparator.comparingDouble(Point::celsius))
                .toList();
    }

    /** I_GT, A, at a junction temperature in °C. */
    public double ampsAt(double celsius) {
        if (points.size() == 1) {
            return TemperatureCurve.fromOne(
                    points.get(0).celsius(), points.get(0).amps(), celsius);
        }
        Point a = points.get(upper(celsius) - 1);
        Point b = points.get(upper(celsius));
        return TemperatureCurve.through(a.celsius(), a.amps(), b.celsius(), b.amps(), celsius);
    }

    /** Index of the point that ends the stretch used at a temperature. */
    private int upper(double celsius) {
        int upper = 1;
        while (upper < points.size() - 1 && points.get(upper).celsius() < celsius) {
            upper++;
        }
        return upper;
    }

    /** V_GT, V, gate to cathode or main terminal one, at a junction temperature in °C. */
    public double voltsAt(double celsius) {
        double floor = points.stream().mapToDouble(Point::volts).reduce(NON_TRIGGER_VOLTS, Math::min);
        return Math.max(floor, extendedVoltsAt(celsius));
    }

    private double extendedVoltsAt(double celsius) {
        if (points.size() == 1) {
            Point only = points.get(0);
            return only.volts() + COLD_GAIN_VOLTS * (only.celsius() - celsius) / COLD_SPAN_KELVIN;
        }
        Point a = points.get(upper(celsius) - 1);
        Point b = points.get(upper(celsius));
        return a.volts() + (b.volts() - a.volts()) * (celsius - a.celsius()) / (b.celsius() - a.celsius());
    }

    /** Whether a temperature lies outside the sheet's points, so that the answer is extended and should say so. */
    public boolean isExtendedAt(double celsius) {
        return celsius < points.get(0).celsius()
                || celsius > points.get(points.size() - 1).celsius();
    }
}
