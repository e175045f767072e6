package clipramp.spread;

/**
 * Uniform numbers by counting: unit and factor number are mixed into one number, so that a unit is the same whichever
 * thread draws it. The mixing is the 64-bit finaliser of Java's own splittable generator, twice.
 */
final class Chance {
    private static final long GOLDEN = 0x9e3779b97f4a7c15L;
    private static final double UNIT = 0x1.0p-53;

    private Chance() {}

    /**
     * @param seed the run's seed
     * @param unit number of the unit
     * @param factor number of the factor
     * @return 0 or more, less than 1
     */
    static double of(long seed, long unit, int factor) {
        long mixed = mix(mix(seed + unit * GOLDEN) + (factor + 1) * GOLDEN);
        return (mixed >>> 11) * UNIT;
    }

    private static long mix(long z) {
        long a = (z ^ (z >>> 30)) * 0xbf58476d1ce4e5b9L;
        long b = (a ^ (a >>> 27)) * 0x94d049bb133111ebL;
        return b ^ (b >>> 31);
    }
}
