package clipramp.cli;

import clipramp.files.LoadedDesign;
import clipramp.margins.Note;
import clipramp.margins.Verdict;
import clipramp.spread.Factor;
import clipramp.spread.Influence;
import clipramp.spread.PositionSpread;
import clipramp.spread.PositionSpread.Extremes;
import clipramp.spread.Remedy;
import clipramp.spread.SpreadResult;
import clipramp.spread.Yield;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;

/** A spread for machines: SI units, angles in degrees, shares 0..1. */
final class SpreadJson {
    private SpreadJson() {}

    static String of(LoadedDesign loaded, SpreadResult result, Verdict verdict, List<Note> notes, boolean ascii) {
        return Answer.about("spread", loaded, verdict, notes).json(ascii, json -> {
            json.put("title", loaded.design().title())
                    .put("samples", result.options().samples())
                    .put("units", result.units())
                    .put("seed", (double) result.options().seed())
                    .put("law", result.options().law().word());
            yieldOf(json, "wantedYield", result.wanted());
            yieldOf(json, "marginYield", result.margins());
            json.putObjects(
                    "marginFailures",
                    result.failures().entrySet(),
                    (o, entry) -> o.put("id", entry.getKey()).put("share", entry.getValue()));
            json.putObjects("knob", result.positions(), SpreadJson::position);
            json.putObjects("factors", result.factors(), SpreadJson::factor);
            json.putObjects("influences", result.influences(), SpreadJson::influence);
            json.putObjects("remedies", result.remedies(), SpreadJson::remedy);
        });
    }

    private static void factor(Json json, Factor factor) {
        json.put("path", factor.path())
                .put("name", factor.name())
                .put("low", factor.low())
                .put("nominal", factor.nominal())
                .put("high", factor.high());
    }

    private static void influence(Json json, Influence influence) {
        json.put("path", influence.path())
                .put("name", influence.name())
                .put("firstOrder", influence.firstOrder())
                .put("total", influence.total())
                .put("fractionLow", influence.fractionLow())
                .put("fractionHigh", influence.fractionHigh())
                .put("firingLowDeg", Math.toDegrees(influence.firingLowRad()))
                .put("firingHighDeg", Math.toDegrees(influence.firingHighRad()));
    }

    private static void remedy(Json json, Remedy remedy) {
        json.put("path", remedy.path())
                .put("change", remedy.change())
                .put("yield", remedy.yield().share())
                .put("gain", remedy.gain());
    }

    private static void yieldOf(Json json, String key, Optional<Yield> yield) {
        if (yield.isEmpty()) {
            json.putNull(key);
            return;
        }
        Yield y = yield.get();
        json.putObject(
                key,
                o -> o.put("held", y.held())
                        .put("of", y.of())
                        .put("share", y.share())
                        .put("low95", y.low())
                        .put("high95", y.high()));
    }

    private static void position(Json o, PositionSpread p) {
        o.put("position", p.position());
        percentiles(o, "firingDeg", p.firingRad(), Math::toDegrees);
        percentiles(o, "loadWatts", p.watts(), w -> w);
        percentiles(o, "powerFraction", p.fraction(), f -> f);
        o.put("stalls", p.stalls())
                .put("latchedOn", p.latchedOn())
                .put("endPulse", p.endPulse())
                .put("misfires", p.misfires())
                .put("hunts", p.hunts());
        extremes(o, "worstFiringDeg", p.worstFiring(), Math::toDegrees);
        extremes(o, "worstPowerFraction", p.worstFraction(), f -> f);
    }

    private static void percentiles(Json json, String key, List<Double> values, DoubleUnaryOperator shown) {
        json.putObject(key, o -> {
            for (int i = 0; i < values.size(); i++) {
                String name = "p" + SpreadResult.PERCENTAGES.get(i).intValue();
                o.put(name, shown.applyAsDouble(values.get(i)));
            }
        });
    }

    private static void extremes(Json json, String key, Extremes extremes, DoubleUnaryOperator shown) {
        json.putObject(
                key,
                o -> o.put("nominal", shown.applyAsDouble(extremes.nominal()))
                        .put("least", shown.applyAsDouble(extremes.least()))
                        .put("greatest", shown.applyAsDouble(extremes.greatest()))
                        .put("rssLeast", shown.applyAsDouble(extremes.rssLeast()))
                        .put("rssGreatest", shown.applyAsDouble(extremes.rssGreatest())));
    }
}
