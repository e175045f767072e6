package clipramp.margins;

import clipramp.circuit.PulseTransformer;
import clipramp.firing.TransformerDuty;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** The pulse transformer: volt-seconds, reset of its core, and the reverse gate voltage that the reset brings. */
final class TransformerMargins {
    private final Bench bench;

    TransformerMargins(Bench bench) {
        this.bench = bench;
    }

    List<Margin> all() {
        return bench.design().gate().transformer().map(this::of).orElse(List.of());
    }

    private List<Margin> of(PulseTransformer transformer) {
        List<Margin> margins = new ArrayList<>();
        margins.add(Ceiling.over(
                MarginKind.TRANSFORMER_VOLT_SECONDS,
                bench.conditions(),
                transformer.voltSeconds(),
                "the design states no gate.transformer.volt-seconds",
                at -> hardest(at, TransformerDuty::voltSeconds),
                Say::voltSeconds));
        margins.add(Ceiling.over(
                MarginKind.GATE_REVERSE_VOLTAGE,
                bench.conditions(),
                bench.design().thyristor().device().gate().limits().reverseVolts(),
                "the profile states no thyristor.device.gate.limits.reverse",
                at -> hardest(at, TransformerDuty::reverseGateVolts),
                Say::volts));
        margins.add(core(transformer));
        return margins;
    }

    private double hardest(JudgedCondition at, ToDoubleFunction<TransformerDuty> figure) {
        return Math.max(
                figure.applyAsDouble(bench.transformerDuty(at.condition(), bench.leastOhms())),
                figure.applyAsDouble(bench.transformerDuty(at.condition(), bench.mostOhms())));
    }

    private Margin core(PulseTransformer transformer) {
        MarginKind kind = MarginKind.TRANSFORMER_CORE;
        if (transformer.voltSeconds().isEmpty()) {
            return Ceiling.unjudged(kind, "the design states no gate.transformer.volt-seconds");
        }
        double rating = transformer.voltSeconds().getAsDouble();
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            double peak = hardest(at, TransformerDuty::magnetisingPeakAmps);
            double left = Math.max(0, hardest(at, TransformerDuty::leftAmps));
            double flux = transformer.magnetisingHenries() * peak;
            findings.add(new Finding(
                    at.words(),
                    rating,
                    flux,
                    kind.sense(),
                    Say.henries(transformer.magnetisingHenries()) + " x " + Say.amps(peak) + " = "
                            + Say.voltSeconds(flux) + " (of which " + Say.amps(left)
                            + " at most were left by the pulse before); rating " + Say.voltSeconds(rating)));
        }
        return Finding.worst(kind, findings);
    }
}
