package clipramp.spread;

import clipramp.circuit.Design;
import clipramp.engine.UnitValues;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A lot of units drawn alike: who number so-and-so is depends on nothing but the seed. */
record Lot(Design design, List<Factor> factors, DrawLaw law, long seed, Optional<TrimmerGoals> trimmers) {
    Lot(Design design, List<Factor> factors, DrawLaw law, long seed) {
        this(design, factors, law, seed, TrimmerGoals.of(design));
    }

    /** One that solves its units, for one thread; what they are set to is known to all of them. */
    UnitSolver solver() {
        return new UnitSolver(design, trimmers);
    }

    /** Fills in unit number so-and-so. */
    void draw(long number, UnitValues unit) {
        for (int k = 0; k < factors.size(); k++) {
            Factor factor = factors.get(k);
            factor.slot().set(unit, factor.value(Chance.of(seed, number, k), law));
        }
    }

    /** The same lot with one factor held between other limits. */
    Lot with(int index, Factor changed) {
        List<Factor> others = new ArrayList<>(factors);
        others.set(index, changed);
        return new Lot(design, List.copyOf(others), law, seed, trimmers);
    }

    /** The nominal unit, as near to 25 °C as the surroundings ever are. */
    UnitValues blank() {
        UnitValues unit = UnitValues.nominal(design);
        unit.celsius = Math.min(
                design.surroundings().hottestCelsius(),
                Math.max(design.surroundings().coldestCelsius(), unit.celsius));
        return unit;
    }
}
