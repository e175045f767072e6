package clipramp.circuit;

import java.util.List;

/** Share of a pot's track against the share of its rotation, both 0..1, rising. */
public sealed interface PotLaw {
    /**
     * Track share at a rotation; it never falls.
     *
     * @param rotation share of the full rotation, 0..1, from the end without resistance
     * @return 0..1
     */
    double share(double rotation);

    /** The word that stands in a design file. */
    String word();

    /** Track share equals rotation. */
    record Linear() implements PotLaw {
        @Override
        public double share(double rotation) {
            return rotation;
        }

        @Override
        public String word() {
            return "linear";
        }
    }

    /**
     * (b^x - 1)/(b - 1) with b = (1/m - 1)^2, x the rotation: the exponential that passes through m at half rotation.
     *
     * @param half m, track share at half rotation, above 0, below 0.5
     */
    record Logarithmic(double half) implements PotLaw {
        /** @throws IllegalArgumentException where the share at half rotation lies outside 0..0.5 */
        public Logarithmic {
            requireHalf(half);
        }

        @Override
        public double share(double rotation) {
            double base = Math.pow(1 / half - 1, 2);
            return (Math.pow(base, rotation) - 1) / (base - 1);
        }

        @Override
        public String word() {
            return "log";
        }
    }

    /**
     * The logarithmic law turned end for end.
     *
     * @param half track share that the plain logarithmic law has at half rotation, above 0, below 0.5
     */
    record ReverseLogarithmic(double half) implements PotLaw {
        /** @throws IllegalArgumentException where the share at half rotation lies outside 0..0.5 */
        public ReverseLogarithmic {
            requireHalf(half);
        }

        @Override
        public double share(double rotation) {
            return 1 - new Logarithmic(half).share(1 - rotation);
        }

        @Override
        public String word() {
            return "reverse-log";
        }
    }

    /**
     * Straight lines between measured points.
     *
     * @param points from rotation 0 to rotation 1, neither coordinate ever falling
     */
    record Table(List<Point> points) implements PotLaw {
        /**
         * One measured point.
         *
         * @param rotation share of the full rotation, 0..1
         * @param share share of the track, 0..1
         */
        public record Point(double rotation, double share) {
            /** @throws IllegalArgumentException outside the stated ranges */
            public Point {
                Require.fraction("rotation", rotation);
                Require.fraction("track share", share);
            }
        }

        /**
         * @throws IllegalArgumentException where the points do not run from rotation 0 to 1, or a coordinate falls
         */
        public Table {
            points = List.copyOf(points);
            if (points.size() < 2
                    || points.get(0).rotation() != 0
                    || points.get(points.size() - 1).rotation() != 1) {
                throw new IllegalArgumentException("a pot table runs from rotation 0 to rotation 1");
            }
            for (int i = 1; i < points.size(); i++) {
                if (points.get(i).rotation() <= points.get(i - 1).rotation()
                        || points.get(i).share() < points.get(i - 1).share()) {
                    throw new IllegalArgumentException("a pot table's rotations rise and its shares never fall");
                }
            }
        }

        @Override
        public double share(double rotation) {
            int upper = 1;
            while (points.get(upper).rotation() < rotation) {
                upper++;
            }
            Point a = points.get(upper - 1);
            Point b = points.get(upper);
            return a.share() + (b.share() - a.share()) * (rotation - a.rotation()) / (b.rotation() - a.rotation());
        }

        @Override
        public String word() {
            return "table";
        }
    }

    private static void requireHalf(double half) {
        if (!(half > 0 && half < 0.5)) {
            throw new IllegalArgumentException(
                    "a logarithmic pot's share at half rotation lies between 0 and 0.5, is " + half);
        }
    }
}
