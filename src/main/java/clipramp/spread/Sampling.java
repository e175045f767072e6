package clipramp.spread;

import clipramp.engine.UnitValues;
import clipramp.firing.FiringState;
import clipramp.runs.Watch;
import java.util.Arrays;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.function.Consumer;
import java.util.stream.IntStream;

/** Draws the units and keeps what each does at each position. Both cores work; a unit is the same whoever draws it. */
final class Sampling {
    /** Units that one core takes at a time. */
    private static final int CHUNK = 128;

    /** Chunks between two looks at the watch. */
    private static final int CHUNKS_A_LOOK = 8;

    private final Lot lot;
    private final double[] shares;
    final double[][] firingRad;
    final double[][] watts;
    final double[][] fraction;
    final FiringState[][] states;
    final boolean[] off;
    private final boolean[] holds;
    private final int[] counts = new int[Histogram.BINS];
    private final int middle;
    private final double position;
    private final Queue<Tools> idle = new ConcurrentLinkedQueue<>();
    private int done;

    Sampling(Lot lot, double[] trackShares, int samples) {
        this.lot = lot;
        shares = trackShares.clone();
        firingRad = new double[shares.length][samples];
        watts = new double[shares.length][samples];
        fraction = new double[shares.length][samples];
        states = new FiringState[shares.length][samples];
        off = new boolean[shares.length * samples];
        holds = new boolean[samples];
        middle = shares.length / 2;
        position = shares.length == 1 ? 0 : (double) middle / (shares.length - 1);
    }

    /**
     * Draws units until all are drawn or the watch cancels.
     *
     * @param watch told of units drawn, after every thousand or so
     * @param drawn told with it how they lie at mid-knob
     */
    void run(Watch watch, Consumer<Histogram> drawn) {
        int samples = holds.length;
        int block = CHUNK * CHUNKS_A_LOOK;
        while (done < samples && !watch.isCancelled()) {
            int from = done;
            int to = Math.min(samples, from + block);
            int chunks = (to - from + CHUNK - 1) / CHUNK;
            IntStream.range(0, chunks)
                    .parallel()
                    .forEach(c -> chunk(from + c * CHUNK, Math.min(to, from + (c + 1) * CHUNK)));
            count(from, to);
            done = to;
            watch.progress(done, samples);
            drawn.accept(
                    new Histogram(position, done, Arrays.stream(counts).boxed().toList()));
        }
    }

    private void count(int from, int to) {
        for (int i = from; i < to; i++) {
            counts[Histogram.bin(fraction[middle][i])]++;
        }
    }

    /** What one thread works with; lent for a chunk and given back, so that drawing a unit allocates nothing. */
    private static final class Tools {
        private final UnitSolver solver;
        private final UnitValues unit;
        private final WantedTest wanted;
        private final UnitOutcome outcome = new UnitOutcome();

        Tools(Lot lot) {
            solver = lot.solver();
            unit = lot.blank();
            wanted = new WantedTest(lot.design());
        }
    }

    private void chunk(int from, int to) {
        Tools lent = idle.poll();
        Tools tools = lent == null ? new Tools(lot) : lent;
        for (int number = from; number < to; number++) {
            draw(tools, number);
        }
        idle.add(tools);
    }

    private void draw(Tools tools, int number) {
        lot.draw(number, tools.unit);
        tools.solver.prepare(tools.unit);
        UnitOutcome outcome = tools.outcome;
        for (int p = 0; p < shares.length; p++) {
            tools.solver.solve(tools.unit, shares[p], outcome);
            firingRad[p][number] = outcome.latestRad();
            off[p * holds.length + number] = Double.isNaN(outcome.firingRad);
            watts[p][number] = outcome.watts;
            fraction[p][number] = outcome.fraction;
            states[p][number] = outcome.state;
        }
        holds[number] = tools.wanted.holds(tools.solver, tools.unit);
    }

    /** Units drawn. */
    int done() {
        return done;
    }

    /** Units that reach what is wanted. */
    int holding() {
        return (int) IntStream.range(0, done).filter(i -> holds[i]).count();
    }

    /** Share of units at a position in a state. */
    double share(int position, FiringState state) {
        long count = IntStream.range(0, done)
                .filter(i -> states[position][i] == state)
                .count();
        return (double) count / done;
    }

    /** Share of units at a position whose thyristor stays off. */
    double misfires(int position) {
        long count = IntStream.range(0, done)
                .filter(i -> off[position * holds.length + i])
                .count();
        return (double) count / done;
    }
}
