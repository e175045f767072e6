package clipramp.margins;

import clipramp.circuit.Design;
import clipramp.circuit.ThyristorDevice.Limits;
import clipramp.power.Inrush;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/** The first half cycle into a cold load against what the thyristor bears once in a while. */
final class SurgeMargins {
    /** I_TSM is the peak of one half cycle of a 60 Hz sine: its integral of i squared is I²/(4 f). */
    private static final double RATED_HERTZ = 60;

    private final Bench bench;
    private final Design design;
    private final Limits limits;
    private final Map<JudgedCondition, Inrush> inrushes = new HashMap<>();

    SurgeMargins(Bench bench) {
        this.bench = bench;
        this.design = bench.design();
        this.limits = design.thyristor().device().limits();
        for (JudgedCondition at : bench.conditions()) {
            inrushes.put(at, Inrush.worst(design, at.condition()));
        }
    }

    List<Margin> all() {
        return List.of(peak(), energy());
    }

    private Margin peak() {
        MarginKind kind = MarginKind.SURGE_CURRENT;
        if (limits.surgeAmps().isEmpty()) {
            return Ceiling.unjudged(kind, "the profile states no thyristor.device.limits.surge");
        }
        double limit = limits.surgeAmps().getAsDouble();
        return worst(
                kind,
                limit,
                Inrush::peakAmps,
                inrush -> "switched on at the worst angle into " + Say.ohms(inrush.coldOhms()) + ": "
                        + Say.amps(inrush.peakAmps()) + "; I_TSM " + Say.amps(limit));
    }

    private Margin energy() {
        MarginKind kind = MarginKind.SURGE_ENERGY;
        OptionalDouble stated = limits.ampsSquaredSeconds();
        if (stated.isEmpty() && limits.surgeAmps().isEmpty()) {
            return Ceiling.unjudged(kind, "the profile states neither thyristor.device.limits.i2t nor surge");
        }
        double limit = stated.orElseGet(() -> Math.pow(limits.surgeAmps().getAsDouble(), 2) / (4 * RATED_HERTZ));
        return worst(
                kind,
                limit,
                Inrush::ampsSquaredSeconds,
                inrush -> "one half cycle into " + Say.ohms(inrush.coldOhms()) + ": "
                        + Say.ampsSquaredSeconds(inrush.ampsSquaredSeconds()) + "; limit "
                        + Say.ampsSquaredSeconds(limit)
                        + (stated.isPresent() ? "" : ", that of a 60 Hz half cycle of I_TSM"));
    }

    /** The inrush of every condition against one limit. */
    private Margin worst(
            MarginKind kind, double limit, ToDoubleFunction<Inrush> there, Function<Inrush, String> reason) {
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            Inrush inrush = Objects.requireNonNull(inrushes.get(at));
            findings.add(
                    new Finding(at.words(), limit, there.applyAsDouble(inrush), kind.sense(), reason.apply(inrush)));
        }
        return Finding.worst(kind, findings);
    }
}
