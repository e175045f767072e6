package clipramp.figures;

import clipramp.circuit.Design;
import clipramp.circuit.Designators;
import clipramp.circuit.Load;
import clipramp.circuit.Part;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.Tolerance;
import clipramp.circuit.Winding;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** What is lettered beside each part of a drawing: its name and value, then tolerance and ratings. */
final class PartText {
    private static final int LONGEST_ID = 12;
    private static final int LONGEST_LINE = 10;

    private final Design design;
    private final Map<String, String> names;

    PartText(Design design) {
        this.design = design;
        this.names = Designators.of(design);
    }

    String name(String key) {
        return names.getOrDefault(key, key);
    }

    Map<String, String> names() {
        return names;
    }

    List<String> ofResistor(String key, Part part) {
        return ofPart(key, part, Unit.OHM);
    }

    List<String> ofCapacitor(String key, Part part) {
        return ofPart(key, part, Unit.FARAD);
    }

    private List<String> ofPart(String key, Part part, Unit unit) {
        List<String> lines = new ArrayList<>();
        lines.add(name(key) + "  " + QuantityText.format(part.value(), unit));
        String tolerance = part.tolerance().isNone() ? "" : tolerance(part.tolerance());
        String ratings = ratings(part);
        if ((tolerance + " " + ratings).length() <= LONGEST_LINE) {
            lines.add((tolerance + " " + ratings).strip());
        } else {
            lines.add(tolerance);
            lines.add(ratings);
        }
        lines.removeIf(String::isEmpty);
        return lines;
    }

    private static String ratings(Part part) {
        List<String> words = new ArrayList<>();
        part.ratedWatts().ifPresent(watts -> words.add(unprefixed(watts) + " W"));
        part.ratedVolts().ifPresent(volts -> words.add(unprefixed(volts) + " V"));
        return String.join(" ", words);
    }

    /** Ratings and drops are spoken of in whole units: a quarter-watt resistor is 0.25 W. */
    private static String unprefixed(double value) {
        return Numerals.plain(value);
    }

    private static String tolerance(Tolerance tolerance) {
        String minus = QuantityText.format(tolerance.minus(), Unit.FRACTION);
        String plus = QuantityText.format(tolerance.plus(), Unit.FRACTION);
        return minus.equals(plus) ? "±" + plus : "−" + minus + " +" + plus;
    }

    /** A device by its profile's id. */
    List<String> ofDevice(String key, String id) {
        return List.of(name(key), id.length() <= LONGEST_ID ? id : id.substring(0, LONGEST_ID - 1) + "…");
    }

    List<String> ofDiodes(String key, double dropVolts) {
        return List.of(name(key), unprefixed(dropVolts) + " V each");
    }

    List<String> ofZener() {
        List<String> lines = new ArrayList<>();
        lines.add(name("clip.zener") + "  "
                + QuantityText.format(design.clip().zener().volts().nominal(), Unit.VOLT));
        lines.add(ofDevice("clip.zener", design.clip().zener().id()).get(1));
        return lines;
    }

    List<String> ofWinding(Winding winding) {
        return List.of(
                name("clip.winding"),
                QuantityText.format(winding.primaryVolts(), Unit.VOLT) + " : "
                        + QuantityText.format(winding.secondaryVolts(), Unit.VOLT),
                winding.lagRad() == 0 ? "" : "lags " + QuantityText.format(winding.lagRad(), Unit.ANGLE));
    }

    List<String> ofTransformer(PulseTransformer transformer) {
        return List.of(
                name("gate.transformer") + "  " + QuantityText.number(transformer.ratio(), 3) + " : 1",
                QuantityText.format(transformer.magnetisingHenries(), Unit.HENRY));
    }

    List<String> ofLine() {
        return List.of(
                "line",
                QuantityText.format(design.line().volts(), Unit.VOLT) + " "
                        + QuantityText.format(design.line().hertz(), Unit.HERTZ));
    }

    List<String> ofLoad() {
        String name = name("load") + "  ";
        Load load = design.load();
        if (load instanceof Load.Filament filament) {
            return List.of(
                    name + QuantityText.format(filament.ratedWatts(), Unit.WATT),
                    "at " + QuantityText.format(filament.ratedVolts(), Unit.VOLT) + ", filament");
        }
        String ohms = QuantityText.format(load.resistanceOhms(), Unit.OHM);
        if (load instanceof Load.Inductive inductive) {
            return List.of(name + ohms, QuantityText.format(inductive.inductanceHenries(), Unit.HENRY));
        }
        double volts = design.line().volts();
        double watts = volts * volts / load.resistanceOhms();
        return List.of(
                name + ohms, QuantityText.format(watts, Unit.WATT) + " at " + QuantityText.format(volts, Unit.VOLT));
    }
}
