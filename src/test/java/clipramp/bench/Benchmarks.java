package clipramp.bench;

import java.util.Collection;
import java.util.Locale;
import org.openjdk.jmh.profile.GCProfiler;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/** Runs the benchmarks of the swift path and tells their ratios, all from one run. */
public final class Benchmarks {
    private Benchmarks() {}

    public static void main(String[] arguments) throws RunnerException {
        Collection<RunResult> results = new Runner(new OptionsBuilder()
                        .include("clipramp.spread.SpreadBenchmark|clipramp.firing.IntegratorBenchmark")
                        .addProfiler(GCProfiler.class)
                        .build())
                .run();
        double units = score(results, "units");
        System.out.printf(Locale.ROOT, "units a second, one knob position: %.0f%n", units);
        System.out.printf(Locale.ROOT, "11-point maps a second: %.0f%n", score(results, "maps"));
        System.out.printf(Locale.ROOT, "floor over units: %.1f%n", score(results, "floor") / units);
        System.out.printf(
                Locale.ROOT,
                "integrator over swift path: %.0f; over reference path: %.0f%n",
                score(results, "dormandPrince") / score(results, "swiftPath"),
                score(results, "dormandPrince") / score(results, "referencePath"));
    }

    private static double score(Collection<RunResult> results, String name) {
        return results.stream()
                .filter(r -> r.getParams().getBenchmark().endsWith("." + name))
                .findFirst()
                .orElseThrow()
                .getPrimaryResult()
                .getScore();
    }
}
