package clipramp.circuit;

import java.util.Comparator;
import java.util.List;

/**
 * A current that depends on junction temperature, given at one or more points: trigger, latching or holding current.
 *
 * <p>Between points the logarithm of the current is linear in temperature; outside them the end slope goes on. A single
 * point doubles at -40 °C seen from 25 °C (common practice, as most SCR sheets show).
 *
 * @param points at least one, in any order; kept in rising temperature
 */
public record TemperatureCurve(List<Point> points) {
    /** Growth from 25 °C down to -40 °C where a sheet gives one point only: common practice. */
    private static final double COLD_GROWTH = 2;

    private static final double COLD_SPAN_KELVIN = 65;

    /**
     * The current at one temperature.
     *
     * @param celsius junction temperature, °C
     * @param amps A, above 0
     */
    public record Point(double celsius, double amps) {
        /** @throws IllegalArgumentException outside the stated ranges */
        public Point {
            Require.finite("temperature", celsius);
            Require.positive("current", amps);
        }
    }

    /** @throws IllegalArgumentException without a point */
    public TemperatureCurve {
        if (points.isEmpty()) {
            throw new IllegalArgumentException("a current against temperature needs at least one point");
        }
        points = points.stream()
                .sorted(Comparator.comparingDouble(Point::celsius))
                .toList();
    }

    /** A curve of one point: a current above zero, A, at 25 °C. */
    public static TemperatureCurve at25(double amps) {
        return new TemperatureCurve(List.of(new Point(Condition.SHEET_CELSIUS, amps)));
    }

    /** Current, A, at a junction temperature in °C. */
    public double ampsAt(double celsius) {
        if (points.size() == 1) {
            return fromOne(points.get(0).celsius(), points.get(0).amps(), celsius);
        }
        int upper = 1;
        while (upper < points.size() - 1 && points.get(upper).celsius() < celsius) {
            upper++;
        }
        Point a = points.get(upper - 1);
        Point b = points.get(upper);
        return through(a.celsius(), a.amps(), b.celsius(), b.amps(), celsius);
    }

    /** A current known at one temperature, at another: it doubles over 65 K towards the cold. */
    static double fromOne(double knownCelsius, double amps, double celsius) {
        return amps * Math.pow(COLD_GROWTH, (knownCelsius - celsius) / COLD_SPAN_KELVIN);
    }

    /** A current known at two temperatures, at another: its logarithm is linear in temperature. */
    static double through(
            double firstCelsius, double firstAmps, double secondCelsius, double secondAmps, double celsius) {
        double share = (celsius - firstCelsius) / (secondCelsius - firstCelsius);
        return firstAmps * Math.pow(secondAmps / firstAmps, share);
    }

    /** Whether a temperature lies outside the sheet's points, so that the answer is extended and should say so. */
    public boolean isExtendedAt(double celsius) {
        return celsius < points.get(0).celsius()
                || celsius > points.get(points.size() - 1).celsius();
    }
}
