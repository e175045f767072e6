package clipramp.record;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.Designators;
import clipramp.circuit.Load;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.TestPoint;
import clipramp.circuit.Trigger;
import clipramp.figures.CircuitFigure;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** The circuit as drawn, and what it is made of. */
final class PartsSection {
    private final Paper paper;
    private final Design design;
    private final Map<String, String> names;

    PartsSection(Paper paper, Design design) {
        this.paper = paper;
        this.design = design;
        this.names = Designators.of(design);
    }

    void circuit() {
        paper.section("Circuit");
        CircuitFigure figure = new CircuitFigure(design);
        paper.text("Stage " + design.stage().word() + ", " + supplyInWords() + ", gate drive "
                + design.gate().coupling().word() + ".");
        paper.figure(figure, paper.width() / (float) figure.proportion());
        if (!design.notes().isBlank()) {
            paper.small("Notes: " + design.notes().strip());
        }
        paper.heading("Test points");
        Grid grid = new Grid(paper.faces(), new float[] {1, 9});
        for (TestPoint point : TestPoint.values()) {
            grid.row(point.name(), point.place());
        }
        paper.add(grid.table());
    }

    private String supplyInWords() {
        String through = " through a " + design.clip().rectifier().word();
        return design.clip().isIsolated()
                ? "supply from a synchronising winding" + through
                : "supply tapped from the " + design.clip().tap().word() + through;
    }

    void parts() {
        paper.section("Parts");
        Grid grid = new Grid(paper.faces(), new float[] {0.9f, 2.6f, 2.2f, 1.4f, 1.8f, 2});
        grid.heads("name", "part", "value or type", "tolerance", "rating", "design key");
        load(grid);
        supply(grid);
        ramp(grid);
        trigger(grid);
        gate(grid);
        row(
                grid,
                "thyristor.device",
                design.thyristor().device().kind().word(),
                design.thyristor().device().id(),
                "",
                sink());
        paper.add(grid.table());
    }

    private String sink() {
        return design.thyristor().caseToAmbientKelvinPerWatt().isPresent()
                ? "case to ambient "
                        + Shown.quantity(design.thyristor().caseToAmbientKelvinPerWatt(), Unit.KELVIN_PER_WATT)
                : "";
    }

    private void row(Grid grid, String key, String what, String value, String tolerance, String rating) {
        grid.row(names.getOrDefault(key, ""), what, value, tolerance, rating, key);
    }

    private void part(Grid grid, String key, String what, Part part, Unit unit) {
        List<String> ratings = new ArrayList<>();
        part.ratedWatts().ifPresent(watts -> ratings.add(QuantityText.number(watts, 4) + " W"));
        part.ratedVolts().ifPresent(volts -> ratings.add(QuantityText.number(volts, 4) + " V"));
        row(grid, key, what, Shown.quantity(part.value(), unit), tolerance(part), String.join(", ", ratings));
    }

    private static String tolerance(Part part) {
        if (part.tolerance().isNone()) {
            return "";
        }
        String plus = Shown.quantity(part.tolerance().plus(), Unit.FRACTION);
        String minus = Shown.quantity(part.tolerance().minus(), Unit.FRACTION);
        return plus.equals(minus) ? "±" + plus : "−" + minus + " +" + plus;
    }

    private static String band(Characteristic characteristic, Unit unit) {
        return Shown.quantity(characteristic.lowest(), unit) + " to " + Shown.quantity(characteristic.highest(), unit);
    }

    private void load(Grid grid) {
        Load load = design.load();
        String value = Shown.quantity(load.resistanceOhms(), Unit.OHM);
        if (load instanceof Load.Inductive inductive) {
            value += ", " + Shown.quantity(inductive.inductanceHenries(), Unit.HENRY);
        }
        if (load instanceof Load.Filament filament) {
            value = Shown.quantity(filament.ratedWatts(), Unit.WATT) + " at "
                    + Shown.quantity(filament.ratedVolts(), Unit.VOLT);
        }
        row(grid, "load", load.word() + " load", value, "", "");
        if (design.stage().bridgeDiodes() > 0) {
            String shared = design.isSuppliedByStageBridge() ? "bridge diodes, load and supply" : "bridge diodes, load";
            row(
                    grid,
                    "stage-diodes",
                    shared,
                    QuantityText.number(design.stageDiodes().dropVolts(), 3) + " V",
                    "",
                    "");
        }
    }

    private void supply(Grid grid) {
        design.clip()
                .winding()
                .ifPresent(winding -> row(
                        grid,
                        "clip.winding",
                        "synchronising winding" + (winding.opposite() ? ", turned over" : ""),
                        Shown.quantity(winding.primaryVolts(), Unit.VOLT) + " : "
                                + Shown.quantity(winding.secondaryVolts(), Unit.VOLT),
                        "",
                        winding.lagRad() == 0 ? "" : "lags " + Shown.quantity(winding.lagRad(), Unit.ANGLE)));
        if (!design.isSuppliedByStageBridge()) {
            String drop = QuantityText.number(design.clip().diodeDropVolts(), 3) + " V";
            row(
                    grid,
                    "clip.rectifier",
                    "rectifier, " + design.clip().rectifier().word(),
                    drop,
                    "",
                    "");
        }
        part(grid, "clip.dropper", "dropping resistor R_D", design.clip().dropper(), Unit.OHM);
        row(
                grid,
                "clip.zener",
                "clipping zener",
                design.clip().zener().id(),
                band(design.clip().zener().volts(), Unit.VOLT),
                Shown.quantity(design.clip().zener().ratedWatts(), Unit.WATT));
    }

    private void ramp(Grid grid) {
        part(grid, "ramp.capacitor", "ramp capacitor C_E", design.ramp().capacitor(), Unit.FARAD);
        part(grid, "ramp.fixed", "fixed ramp resistor", design.ramp().fixed(), Unit.OHM);
        design.ramp().pot().ifPresent(pot -> {
            part(grid, "ramp.pot.track", pot(pot), pot.track(), Unit.OHM);
            pot.shunt().ifPresent(shunt -> part(grid, "ramp.pot.shunt", "resistor across the pot", shunt, Unit.OHM));
        });
        design.ramp()
                .trimmers()
                .high()
                .ifPresent(trimmer -> part(
                        grid,
                        "ramp.trim-high",
                        "trimmer in series with it, set at the highest setting",
                        trimmer,
                        Unit.OHM));
        design.ramp()
                .trimmers()
                .low()
                .ifPresent(trimmer -> part(
                        grid, "ramp.trim-low", "trimmer across the pot, set at the lowest setting", trimmer, Unit.OHM));
    }

    private static String pot(Pot pot) {
        return "knob, " + pot.law().word() + ", " + pot.sense().word() + " clockwise";
    }

    private void trigger(Grid grid) {
        Trigger trigger = design.trigger();
        if (trigger instanceof Trigger.UnijunctionTrigger unijunction) {
            String standoff =
                    "η " + Shown.number(unijunction.device().standoff().lowest(), 3) + " to "
                            + Shown.number(unijunction.device().standoff().highest(), 3);
            row(grid, "trigger.device", "unijunction transistor", trigger.deviceId(), standoff, "");
            part(grid, "trigger.base-two", "base-two resistor R2", unijunction.baseTwo(), Unit.OHM);
            part(grid, "trigger.base-one", "base-one resistor R1", trigger.baseOne(), Unit.OHM);
        } else if (trigger instanceof Trigger.ProgrammableTrigger programmable) {
            row(grid, "trigger.device", "programmable unijunction", trigger.deviceId(), "", "");
            part(grid, "trigger.upper", "upper divider resistor R_A", programmable.upper(), Unit.OHM);
            part(grid, "trigger.lower", "lower divider resistor R_B", programmable.lower(), Unit.OHM);
            part(grid, "trigger.base-one", "cathode resistor R1", trigger.baseOne(), Unit.OHM);
        }
    }

    private void gate(Grid grid) {
        design.gate().transformer().ifPresent(transformer -> transformer(grid, transformer));
        part(grid, "gate.series", "gate series resistor R_G", design.gate().series(), Unit.OHM);
        design.gate().shunt().ifPresent(shunt -> part(grid, "gate.shunt", "gate shunt R_GK", shunt, Unit.OHM));
    }

    private void transformer(Grid grid, PulseTransformer transformer) {
        String value = QuantityText.number(transformer.ratio(), 3) + " : 1, "
                + Shown.quantity(transformer.magnetisingHenries(), Unit.HENRY);
        row(
                grid,
                "gate.transformer",
                "pulse transformer, " + (transformer.secondaries() == 2 ? "two secondaries" : "one secondary")
                        + (transformer.clampDiode() ? ", clamp diode" : ""),
                value,
                "",
                Shown.quantity(transformer.voltSeconds(), Unit.VOLT_SECOND));
    }
}
