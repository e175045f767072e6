package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.runs.Watch;
import clipramp.sizing.Search.Judged;

/** Every capacitor, fixed resistor and track of a small grid, each put before the judge: no search, nothing clever. */
final class Exhaustive {
    private static final double LEAST_FARADS = 47e-9;
    private static final double MOST_FARADS = 1.1e-6;

    /** A ramp that misses a wanted setting by a fifth of its resistance cannot hold: not judged. */
    private static final double HOPELESS = 0.2;

    private Exhaustive() {}

    static Judged best(SizingRequest request) {
        Search search = new Search(request, Watch.NONE);
        Judged best = null;
        Design start = Start.of(request);
        double farads = LEAST_FARADS;
        while (farads < MOST_FARADS) {
            Design design = Edit.capacitor(start, start.ramp().capacitor().withValue(farads));
            Reach reach = Reach.of(design);
            for (Design ramp : RampChoice.all(request, design, reach)) {
                if (Timing.lack(ramp, reach) < HOPELESS) {
                    Judged there = search.judge(ramp, reach);
                    best = best == null || Search.ORDER.compare(there, best) < 0 ? there : best;
                }
            }
            farads = request.capacitorSeries().nextUp(farads);
        }
        return best;
    }

    /** What the search finds for the same request. */
    static Judged searched(SizingRequest request) {
        Search search = new Search(request, Watch.NONE);
        return search.polished(search.climb(Start.of(request)));
    }
}
