package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import clipramp.units.PreferredSeries;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;

/** The next values of one part. */
final class Moves {
    private static final double LEAST_SERIES = 10;
    private static final int MOST_DEVICES = 4;

    private Moves() {}

    /** The designs with one part a step away, in either direction; wider steps for parts that decide over much. */
    static List<Design> of(SizingRequest request, Design design, OpenPart part) {
        return switch (part) {
            case ZENER -> zeners(request, design);
            case TRIGGER_DEVICE -> devices(request, design);
            case THYRISTOR -> thyristors(request, design);
            case SHUNT -> shunts(request, design);
            case TRANSFORMER -> transformers(design);
            case SINK -> List.of();
            default -> stepped(request, design, part);
        };
    }

    private static List<Design> stepped(SizingRequest request, Design design, OpenPart part) {
        List<Design> all = new ArrayList<>();
        for (int step : List.of(1, -1)) {
            next(request, design, part, step).ifPresent(all::add);
        }
        return all;
    }

    /**
     * The design with one part that many values away; empty where the part has no such neighbour.
     *
     * @param step 1 for the next value up, -1 for the next one down
     */
    static Optional<Design> next(SizingRequest request, Design design, OpenPart part, int step) {
        PreferredSeries series = request.series();
        UnaryOperator<Part> moved = p -> p.withValue(series.step(p.value(), step));
        return switch (part) {
            case ZENER -> zener(request, design, step);
            case DROPPER ->
                Optional.of(Edit.dropper(design, moved.apply(design.clip().dropper())));
            case CAPACITOR -> {
                Part c = design.ramp().capacitor();
                yield Optional.of(Edit.capacitor(
                        design, c.withValue(request.capacitorSeries().step(c.value(), step))));
            }
            case FIXED ->
                design.ramp().fixed().value() > 0
                        ? Optional.of(
                                Edit.fixed(design, moved.apply(design.ramp().fixed())))
                        : Optional.empty();
            case TRACK -> track(design, step);
            case BASE_ONE ->
                Optional.of(Edit.baseOne(design, moved.apply(design.trigger().baseOne())));
            case BASE_TWO ->
                design.trigger() instanceof UnijunctionTrigger u && u.baseTwo().value() > 0
                        ? Optional.of(Edit.baseTwo(design, moved.apply(u.baseTwo())))
                        : Optional.empty();
            case UPPER ->
                design.trigger() instanceof ProgrammableTrigger p
                        ? Optional.of(Edit.divider(design, moved.apply(p.upper()), p.lower()))
                        : Optional.empty();
            case LOWER ->
                design.trigger() instanceof ProgrammableTrigger p
                        ? Optional.of(Edit.divider(design, p.upper(), moved.apply(p.lower())))
                        : Optional.empty();
            case SERIES -> series(request, design, step);
            case SHUNT -> design.gate().shunt().map(p -> Edit.shunt(design, Optional.of(moved.apply(p))));
            default -> Optional.empty();
        };
    }

    private static Optional<Design> series(SizingRequest request, Design design, int step) {
        Part part = design.gate().series();
        if (part.value() == 0) {
            return step > 0
                    ? Optional.of(Edit.series(design, Start.resistor(request, LEAST_SERIES)))
                    : Optional.empty();
        }
        double value = request.series().step(part.value(), step);
        return Optional.of(Edit.series(design, value < LEAST_SERIES * (1 - 1e-9) ? Part.of(0) : part.withValue(value)));
    }

    private static Optional<Design> track(Design design, int step) {
        Optional<Pot> pot = design.ramp().pot();
        if (pot.isEmpty()) {
            return Optional.empty();
        }
        Part track = pot.get().track();
        List<Double> sold = step > 0
                ? Stock.tracks(track.value() * 1.0001, track.value() * 11)
                : Stock.tracks(track.value() / 11, track.value() * 0.9999);
        return sold.isEmpty()
                ? Optional.empty()
                : Optional.of(Edit.track(design, track.withValue(sold.get(step > 0 ? 0 : sold.size() - 1))));
    }

    private static Optional<Design> zener(SizingRequest request, Design design, int step) {
        double volts = design.clip().zener().volts().nominal();
        List<Zener> zeners = request.stock().zeners().stream()
                .filter(z -> step > 0 ? z.volts().nominal() > volts : z.volts().nominal() < volts)
                .toList();
        return zeners.isEmpty()
                ? Optional.empty()
                : Optional.of(Edit.zener(design, zeners.get(step > 0 ? 0 : zeners.size() - 1)));
    }

    private static List<Design> zeners(SizingRequest request, Design design) {
        List<Design> all = new ArrayList<>();
        for (int step : List.of(1, -1)) {
            zener(request, design, step).ifPresent(d -> {
                // Another zener with the crest current as it was.
                if (request.isOpen(OpenPart.DROPPER)) {
                    double scale = over(d) / over(design);
                    Part dropper = design.clip().dropper();
                    double ohms = request.series().nearest(Math.max(100, dropper.value() * scale));
                    all.add(Edit.dropper(d, dropper.withValue(ohms)));
                } else {
                    all.add(d);
                }
            });
        }
        return all;
    }

    private static double over(Design design) {
        return Math.max(
                1, Start.crestVolts(design) - design.clip().zener().volts().nominal());
    }

    private static List<Design> devices(SizingRequest request, Design design) {
        return Start.devices(request).stream()
                .filter(d -> !d.id().equals(design.trigger().deviceId()))
                .map((Unijunction d) -> Edit.device(design, d))
                .toList();
    }

    private static List<Design> thyristors(SizingRequest request, Design design) {
        String now = design.thyristor().device().id();
        return Start.thyristors(request, design).stream()
                .filter(d -> !d.id().equals(now))
                .limit(MOST_DEVICES)
                .map((ThyristorDevice d) -> Edit.thyristor(design, d))
                .toList();
    }

    private static List<Design> shunts(SizingRequest request, Design design) {
        List<Design> all = new ArrayList<>(stepped(request, design, OpenPart.SHUNT));
        if (design.gate().shunt().isEmpty()) {
            all.add(Edit.shunt(design, Optional.of(Start.resistor(request, 1000))));
        }
        return all;
    }

    private static List<Design> transformers(Design design) {
        PulseTransformer now = design.gate().transformer().orElseThrow();
        List<Design> all = new ArrayList<>();
        for (double ratio : List.of(1.0, 2.0)) {
            for (double henries : List.of(2e-3, 5e-3)) {
                for (double voltSeconds : List.of(250e-6, 500e-6)) {
                    PulseTransformer other = new PulseTransformer(
                            ratio,
                            now.secondaries(),
                            henries,
                            now.primaryOhms(),
                            now.secondaryOhms(),
                            true,
                            OptionalDouble.of(voltSeconds));
                    if (!other.equals(now)) {
                        all.add(Edit.transformer(design, other));
                    }
                }
            }
        }
        return all;
    }
}
