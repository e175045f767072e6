package clipramp.desk.model;

import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.desk.model.Companions.Change;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.List;

/**
 * What must change with the kind of load, and with the stage of an inductive one: an inductance wants a way for its current
 * on the dc side of a bridge, and on the ac side something that slows the voltage which comes back when the current dies.
 */
final class LoadCompanions {
    /** Reactance over resistance of a load that becomes inductive: a small fan's, power factor about 0.95 (our guess). */
    private static final double REACTANCE_SHARE = 0.3;

    private static final int DIGITS = 2;

    private LoadCompanions() {}

    /** Another kind of load of about the same power. */
    static void kind(String word, Design design, List<Change> changes) {
        Load load = design.load();
        double ohms = load.resistanceOhms();
        switch (word) {
            case "inductive" -> {
                changes.add(new Change("load.rated", ""));
                changes.add(new Change("load.exponent", ""));
                changes.add(new Change("load.cold-ratio", ""));
                changes.add(new Change("load.resistance", QuantityText.format(ohms, Unit.OHM)));
                double henries =
                        REACTANCE_SHARE * ohms / (2 * Math.PI * design.line().hertz());
                changes.add(new Change("load.inductance", QuantityText.format(henries, Unit.HENRY, DIGITS)));
                inductive(design.stage(), design, changes);
            }
            case "filament" -> {
                leaveInductive(changes);
                if (load instanceof Load.Resistor || load instanceof Load.Inductive) {
                    rateAtLineVoltage(design, changes);
                }
            }
            default -> {
                leaveInductive(changes);
                changes.add(new Change("load.exponent", ""));
                changes.add(new Change("load.cold-ratio", ""));
            }
        }
    }

    private static void rateAtLineVoltage(Design design, List<Change> changes) {
        double volts = design.line().volts();
        String watts = QuantityText.format(volts * volts / design.load().resistanceOhms(), Unit.WATT, DIGITS);
        changes.add(new Change("load.resistance", ""));
        changes.add(new Change("load.cold-ratio", ""));
        changes.add(new Change("load.rated", watts + " at " + QuantityText.format(volts, Unit.VOLT)));
    }

    private static void leaveInductive(List<Change> changes) {
        changes.add(new Change("load.inductance", ""));
        changes.add(new Change("load.freewheel", ""));
    }

    /** What an inductive load asks of a stage; what it has is kept. */
    static void inductive(Stage stage, Design design, List<Change> changes) {
        boolean has = design.load() instanceof Load.Inductive inductive
                && inductive.freewheel().isPresent();
        if (stage == Stage.BRIDGE_DC && !has) {
            changes.add(new Change("load.freewheel", Extra.FREEWHEEL.mapping()));
        } else if (stage != Stage.BRIDGE_DC && stage != Stage.HALF_WAVE && has) {
            changes.add(new Change("load.freewheel", ""));
        }
        boolean alternating = stage == Stage.BRIDGE_AC || stage == Stage.TRIAC || stage == Stage.INVERSE_PARALLEL;
        if (alternating && design.snubber().isEmpty()) {
            changes.add(new Change("snubber", Extra.SNUBBER.mapping()));
        }
    }
}
