package clipramp.fit;

import clipramp.circuit.Design;
import clipramp.files.DesignFiles;
import clipramp.files.Example;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import clipramp.runs.Watch;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;

/**
 * Two hundred synthetic benches: how often an interval covers the truth, and how often a gross error is named. Run by hand;
 * its figures stand in DEVELOPERS.md, and FitCoverageTest runs a small part of it.
 */
public final class FitStudy {
    static final List<Meter> METERS =
            List.of(Meter.FIRING_ANGLE, Meter.LOAD_TRUE_RMS, Meter.BASE_ONE_PEAK, Meter.PEAK_POINT);
    static final int POSITIONS = 6;

    private FitStudy() {}

    static Design design(String example) {
        Example shipped = Example.named(example).orElseThrow();
        return DesignFiles.load(new Source(example, shipped.text()), List.of(), ProfileLibrary.shipped())
                .design();
    }

    /** A gross error as a slip of the hand makes it: a tenth to a half off, either way. */
    static double slip(Random random) {
        double off = 0.1 + 0.4 * random.nextDouble();
        return random.nextBoolean() ? 1 + off : 1 - off;
    }

    public static void main(String[] arguments) {
        Design design = design(arguments.length > 0 ? arguments[0] : "drying-cabinet");
        int benches = arguments.length > 1 ? Integer.parseInt(arguments[1]) : 200;
        Map<String, int[]> covered = new TreeMap<>();
        AtomicInteger named = new AtomicInteger();
        AtomicInteger only = new AtomicInteger();
        AtomicInteger clean = new AtomicInteger();
        long begun = System.nanoTime();
        IntStream.range(0, benches).forEach(seed -> {
            SyntheticBench bench = SyntheticBench.of(design, seed, POSITIONS, METERS);
            FitResult good = Fit.run(design, bench.readings, Watch.NONE);
            clean.addAndGet(good.strangers().isEmpty() ? 1 : 0);
            for (Fitted value : good.values()) {
                double truth = bench.truth(value.path());
                int[] counts = covered.computeIfAbsent(value.path(), path -> new int[4]);
                counts[0] += value.from() <= truth && truth <= value.to() ? 1 : 0;
                counts[1]++;
                counts[2] += value.knowledge() == Fitted.Knowledge.TOLD ? 1 : 0;
                counts[3] += (int) Math.round(1000 * value.kept());
            }
            Random random = new Random(1000003L * (seed + 1));
            int line = random.nextInt(POSITIONS);
            int reading = random.nextInt(METERS.size());
            double slip = slip(random);
            FitResult bad = Fit.run(design, bench.withGrossError(line, reading, slip), Watch.NONE);
            String column = METERS.get(reading).words();
            boolean found = bad.strangers().stream()
                    .anyMatch(s -> s.line() == line + 2 && s.column().equals(column));
            named.addAndGet(found ? 1 : 0);
            only.addAndGet(found && bad.strangers().size() == 1 ? 1 : 0);
            if (!found) {
                System.out.println("missed: bench " + seed + " line " + (line + 2) + " " + column + " x " + slip
                        + ", named " + bad.strangers());
            }
        });
        covered.forEach((path, counts) -> System.out.println(String.format(
                Locale.ROOT,
                "%-40s covered %d of %d, told %d, kept %.3f",
                path,
                counts[0],
                counts[1],
                counts[2],
                counts[3] / 1000.0 / counts[1])));
        System.out.println("gross error named in " + named + " of " + benches + ", alone in " + only
                + "; nothing named on good benches in " + clean + "; " + (System.nanoTime() - begun) / 1000000 + " ms");
    }
}
