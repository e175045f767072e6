package clipramp.margins;

import java.util.OptionalDouble;

/** A table of IEC 61000-3-2: the largest rms current of an order that equipment of a class may draw. */
enum LineTable {
    /** Amperes, whatever the equipment's power: class A, 230 V. */
    CLASS_A(LineTable.STANDARD + ", class A (clause 7.1, table 1" + LineTable.RECALLED) {
        @Override
        OptionalDouble limitAmps(int order, double fundamentalAmps, double powerFactor) {
            return OptionalDouble.of(order % 2 == 0 ? even(order) : odd(order));
        }

        private static double odd(int order) {
            return switch (order) {
                case 3 -> 2.30;
                case 5 -> 1.14;
                case 7 -> 0.77;
                case 9 -> 0.40;
                case 11 -> 0.33;
                case 13 -> 0.21;
                default -> 0.15 * 15 / order;
            };
        }

        private static double even(int order) {
            return switch (order) {
                case 2 -> 1.08;
                case 4 -> 0.43;
                case 6 -> 0.30;
                default -> 0.23 * 8 / order;
            };
        }
    },
    /** Shares of the fundamental: lighting equipment above 25 W, as up to edition 4. */
    CLASS_C(LineTable.STANDARD + ", class C (clause 7.3, table 2" + LineTable.RECALLED) {
        @Override
        OptionalDouble limitAmps(int order, double fundamentalAmps, double powerFactor) {
            return switch (order) {
                case 2 -> OptionalDouble.of(0.02 * fundamentalAmps);
                case 3 -> OptionalDouble.of(0.30 * powerFactor * fundamentalAmps);
                case 5 -> OptionalDouble.of(0.10 * fundamentalAmps);
                case 7 -> OptionalDouble.of(0.07 * fundamentalAmps);
                case 9 -> OptionalDouble.of(0.05 * fundamentalAmps);
                default ->
                    order % 2 == 0 || order > 39 ? OptionalDouble.empty() : OptionalDouble.of(0.03 * fundamentalAmps);
            };
        }
    };

    /** The standard as far as its limits were read. */
    static final String STANDARD = "IEC 61000-3-2 to edition 4";

    /** Ends a reference: the figures were read in print, clauses and tables are numbered from memory. */
    static final String RECALLED = "; numbers of clauses and tables from memory)";

    private final String source;

    LineTable(String source) {
        this.source = source;
    }

    /** Standard and table, and how they are known. */
    String source() {
        return source;
    }

    /**
     * The limit of one order.
     *
     * @param order 2 to 40
     * @param fundamentalAmps rms of the fundamental, A; class A does not ask
     * @param powerFactor true power factor, 0..1; class A does not ask
     * @return A rms; empty where the table has no limit for the order
     */
    abstract OptionalDouble limitAmps(int order, double fundamentalAmps, double powerFactor);
}
