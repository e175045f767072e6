package clipramp.spread;

import clipramp.circuit.Design;
import clipramp.circuit.Wanted.Goal;
import clipramp.engine.UnitValues;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.BiConsumer;
import java.util.stream.IntStream;

/** What a trimmer, a tighter part or a selected device would do for the yield against what is wanted. */
final class Remedies {
    private static final int CHUNK = 64;
    private static final int TRIM_STEPS = 4;

    /** A trimmer reaches this far either side of the fixed resistor, as a share of it. */
    private static final double TRIM_REACH = 0.5;

    private final Lot lot;
    private final int units;

    Remedies(Lot lot, int units) {
        this.lot = lot;
        this.units = units;
    }

    List<Remedy> all() {
        Yield before = yieldOf(lot, (solver, unit) -> {});
        List<Remedy> remedies = new ArrayList<>();
        for (int k = 0; k < lot.factors().size(); k++) {
            Factor factor = lot.factors().get(k);
            double below = factor.nominal() - factor.low();
            double above = factor.high() - factor.nominal();
            switch (factor.kind()) {
                case PART ->
                    remedies.add(remedy(
                            before,
                            k,
                            factor.between(factor.nominal() - below / 2, factor.nominal() + above / 2),
                            factor.name() + " of half the tolerance"));
                case DEVICE ->
                    remedies.add(remedy(
                            before,
                            k,
                            factor.between(factor.nominal() - below / 3, factor.nominal() + above / 3),
                            "devices selected to the middle third of the " + factor.name()));
                case SURROUNDINGS -> {}
            }
        }
        trimmer(before, remedies);
        remedies.sort(Comparator.comparingDouble(Remedy::gain).reversed());
        return List.copyOf(remedies);
    }

    private Remedy remedy(Yield before, int index, Factor tighter, String words) {
        Yield after = yieldOf(lot.with(index, tighter), (solver, unit) -> {});
        Remedy.Limits limits = new Remedy.Limits(tighter.low(), tighter.nominal(), tighter.high());
        return new Remedy(tighter.path(), words, after, after.share() - before.share(), Optional.of(limits));
    }

    /** In place of the fixed resistor: every unit is set, at its own line and temperature, to the nominal firing angle. */
    private void trimmer(Yield before, List<Remedy> remedies) {
        Design design = lot.design();
        double fixed = design.ramp().fixed().value();
        design.wanted()
                .highest()
                .map(Goal::position)
                .filter(p -> fixed > 0 && design.ramp().trimmers().isNone())
                .ifPresent(position -> {
                    double share = WantedTest.share(design.ramp(), position);
                    UnitOutcome nominal = new UnitOutcome();
                    lot.solver().solve(lot.blank(), share, nominal);
                    Yield after = yieldOf(lot, (solver, unit) -> trim(solver, unit, share, nominal.latestRad(), fixed));
                    remedies.add(new Remedy(
                            "ramp.fixed",
                            "a trimmer in place of the fixed ramp resistor, set on each unit at the highest setting",
                            after,
                            after.share() - before.share(),
                            Optional.empty()));
                });
    }

    /** The firing instant is nearly proportional to R_E: a few proportional steps end within a hundredth of a degree. */
    private static void trim(UnitSolver solver, UnitValues unit, double share, double wantedRad, double fixed) {
        UnitOutcome there = new UnitOutcome();
        for (int step = 0; step < TRIM_STEPS; step++) {
            double ohms = unit.rampOhms(share);
            solver.solve(unit, share, there);
            double moved = unit.fixedOhms + ohms * (wantedRad / there.latestRad() - 1);
            unit.fixedOhms = Math.max(fixed * (1 - TRIM_REACH), Math.min(fixed * (1 + TRIM_REACH), moved));
        }
    }

    private Yield yieldOf(Lot of, BiConsumer<UnitSolver, UnitValues> adjust) {
        int held = IntStream.range(0, (units + CHUNK - 1) / CHUNK)
                .parallel()
                .map(c -> {
                    UnitSolver solver = of.solver();
                    WantedTest wanted = new WantedTest(of.design());
                    UnitValues unit = of.blank();
                    int holding = 0;
                    for (int i = c * CHUNK; i < Math.min(units, (c + 1) * CHUNK); i++) {
                        of.draw(i, unit);
                        solver.prepare(unit);
                        adjust.accept(solver, unit);
                        holding += wanted.holds(solver, unit) ? 1 : 0;
                    }
                    return holding;
                })
                .sum();
        return Yield.of(held, units);
    }
}
