package clipramp.spread;

import clipramp.circuit.Design;
import clipramp.circuit.SampleDesigns;
import clipramp.engine.UnitValues;
import clipramp.power.SwiftPoint;
import java.lang.management.ManagementFactory;
import java.util.Locale;
import java.util.function.LongToDoubleFunction;

/**
 * What {@link SpreadBenchmark} measures, as the least processor time of some runs on one thread: for a machine that has
 * other things to do. Arguments: units to a run, runs.
 */
public final class UnitTime {
    private static final int POSITIONS = 11;

    private final Design design = SampleDesigns.heater();
    private final Lot lot = new Lot(design, Factors.of(design), DrawLaw.NORMAL, 1);
    private final UnitValues unit = lot.blank();
    private final SwiftPoint swift = new SwiftPoint(design);
    private double kept;

    private UnitTime() {}

    public static void main(String[] arguments) {
        int units = Integer.parseInt(arguments[0]);
        int runs = Integer.parseInt(arguments[1]);
        UnitTime time = new UnitTime();
        double floor = time.least(units, runs, time::floor);
        double unit = time.least(units, runs, time::unit);
        double map = time.least(Math.max(1, units / POSITIONS), runs, time::map);
        System.out.printf(
                Locale.ROOT,
                "floor %.3f us, unit %.3f us (%.1f times the floor), map %.1f us (%g)%n",
                floor,
                unit,
                unit / floor,
                map,
                time.kept);
    }

    private double least(int units, int runs, LongToDoubleFunction work) {
        var threads = ManagementFactory.getThreadMXBean();
        long least = Long.MAX_VALUE;
        for (int run = 0; run < runs; run++) {
            long before = threads.getCurrentThreadCpuTime();
            for (int i = 0; i < units; i++) {
                kept += work.applyAsDouble((long) run * units + i);
            }
            least = Math.min(least, threads.getCurrentThreadCpuTime() - before);
        }
        return least * 1e-3 / units;
    }

    private double floor(long number) {
        lot.draw(number, unit);
        return Math.exp(-unit.standoff) + Math.log(unit.capacitorFarads);
    }

    private double unit(long number) {
        lot.draw(number, unit);
        swift.solve(unit, unit.rampOhms(0.5));
        return swift.watts();
    }

    private double map(long number) {
        lot.draw(number, unit);
        double sum = 0;
        for (int i = 0; i < POSITIONS; i++) {
            swift.solve(unit, unit.rampOhms(i / (POSITIONS - 1.0)));
            sum += swift.watts();
        }
        return sum;
    }
}
