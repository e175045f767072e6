package clipramp.files;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.Document;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.Ramp;
import clipramp.circuit.Snubber;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.Thyristor;
import clipramp.circuit.Trigger;
import clipramp.circuit.Wanted.Goal;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.math.BigDecimal;
import java.util.Optional;
import java.util.TreeMap;

/**
 * Writes a design that was made in memory: every key in the order of the format, devices with all their figures in place.
 * What is written reads back as an equal design, which is how reading is tested.
 */
final class DesignWriter {
    private final StringBuilder out = new StringBuilder();
    private final Design design;

    private DesignWriter(Design design) {
        this.design = design;
    }

    static String write(Design design) {
        return new DesignWriter(design).all();
    }

    private String all() {
        line("clipramp", String.valueOf(Version.CURRENT));
        text("title", design.title());
        text("notes", design.notes());
        document(design.document());
        line("line", lineText(design.line()));
        line("stage", design.stage().word());
        line("stage-diodes", diodes(design.stageDiodes()));
        line("load", load(design.load()));
        clip(design.clip());
        ramp(design.ramp());
        trigger(design.trigger());
        line("gate", gate(design.gate()));
        thyristor(design.thyristor());
        design.snubber().ifPresent(this::snubber);
        line(
                "surroundings",
                new FlowText()
                        .raw("coldest", celsius(design.surroundings().coldestCelsius()))
                        .raw("hottest", celsius(design.surroundings().hottestCelsius()))
                        .text());
        wanted();
        line(
                "derating",
                new FlowText()
                        .quantity("resistors", design.resistorDerating(), Unit.FRACTION)
                        .text());
        designators();
        return out.toString();
    }

    private void thyristor(Thyristor thyristor) {
        out.append("thyristor:\n");
        block("  ", "device", DeviceText.thyristor(thyristor.device()));
        thyristor
                .caseToAmbientKelvinPerWatt()
                .ifPresent(k -> line("  case-to-ambient", QuantityText.exact(k, Unit.KELVIN_PER_WATT)));
    }

    private void snubber(Snubber snubber) {
        line(
                "snubber",
                new FlowText()
                        .quantity("resistance", snubber.resistanceOhms(), Unit.OHM)
                        .quantity("capacitance", snubber.capacitanceFarads(), Unit.FARAD)
                        .text());
    }

    static String celsius(double value) {
        return QuantityText.exact(value, Unit.CELSIUS).replace("°C", "degC");
    }

    private void line(String key, String value) {
        out.append(key).append(": ").append(value).append('\n');
    }

    private void text(String key, String value) {
        if (!value.isEmpty()) {
            line(key, YamlText.scalar(value, false));
        }
    }

    private void block(String indent, String key, FlowText mapping) {
        out.append(indent).append(key).append(":\n");
        mapping.entries().forEach(e -> out.append(indent).append("  ").append(e).append('\n'));
    }

    private void document(Document document) {
        if (document.equals(Document.EMPTY)) {
            return;
        }
        line(
                "document",
                new FlowText()
                        .word("number", document.number())
                        .word("revision", document.revision())
                        .word("prepared-by", document.preparedBy())
                        .word("reviewed-by", document.reviewedBy())
                        .word("date", document.date())
                        .text());
    }

    private static String lineText(Line line) {
        FlowText text = new FlowText()
                .quantity("voltage", line.volts(), Unit.VOLT)
                .quantity("frequency", line.hertz(), Unit.HERTZ)
                .raw("low", limit(line.lowVolts(), line.volts()))
                .raw("high", limit(line.highVolts(), line.volts()));
        if (!line.harmonics().isEmpty()) {
            text.raw(
                    "harmonics",
                    FlowText.list(line.harmonics().stream()
                            .map(h -> new FlowText()
                                    .raw("order", String.valueOf(h.order()))
                                    .quantity("share", h.share(), Unit.FRACTION)
                                    .quantity("phase", h.phaseRad(), Unit.ANGLE)
                                    .text())
                            .toList()));
        }
        return text.text();
    }

    /** A limit as a signed percentage where that says exactly the same, else in volts. */
    private static String limit(double volts, double nominal) {
        double percent = Math.rint((volts / nominal - 1) * 1e4) / 1e2;
        String text = QuantityText.number(percent, 6);
        double share = new BigDecimal(text).scaleByPowerOfTen(-2).doubleValue();
        return nominal + nominal * share == volts
                ? (percent > 0 ? "+" : "") + text + " %"
                : QuantityText.exact(volts, Unit.VOLT);
    }

    private static String diodes(StageDiodes diodes) {
        return new FlowText()
                .quantity("drop", diodes.dropVolts(), Unit.VOLT)
                .quantity("slope", diodes.slopeOhms(), Unit.OHM)
                .text();
    }

    private static String load(Load load) {
        FlowText text = new FlowText().raw("kind", load.word());
        if (load instanceof Load.Filament filament) {
            text.raw(
                    "rated",
                    QuantityText.exact(filament.ratedWatts(), Unit.WATT)
                            + " at "
                            + QuantityText.exact(filament.ratedVolts(), Unit.VOLT));
            text.quantity("exponent", filament.exponent(), Unit.NUMBER);
            text.quantity("cold-ratio", filament.coldRatio(), Unit.NUMBER);
        } else {
            text.quantity("resistance", load.resistanceOhms(), Unit.OHM);
        }
        if (load instanceof Load.Resistor resistor && resistor.coldRatio() != 1) {
            text.quantity("cold-ratio", resistor.coldRatio(), Unit.NUMBER);
        }
        if (load instanceof Load.Inductive inductive) {
            text.quantity("inductance", inductive.inductanceHenries(), Unit.HENRY);
            text.raw(
                    "freewheel", inductive.freewheel().map(DesignWriter::diodes).orElse("none"));
        }
        return text.text();
    }

    private void clip(ClipSupply clip) {
        FlowText text = new FlowText()
                .raw("tap", clip.tap().word())
                .raw("rectifier", clip.rectifier().word())
                .quantity("diode-drop", clip.diodeDropVolts(), Unit.VOLT)
                .part("dropper", clip.dropper(), Unit.OHM)
                .raw("zener", DeviceText.zener(clip.zener()).text());
        text.raw(
                "winding", clip.winding().map(w -> DeviceText.winding(w).text()).orElse("none"));
        block("", "clip", text);
    }

    private void ramp(Ramp ramp) {
        block(
                "",
                "ramp",
                new FlowText()
                        .part("capacitor", ramp.capacitor(), Unit.FARAD)
                        .part("fixed", ramp.fixed(), Unit.OHM)
                        .raw("pot", ramp.pot().map(SizedText::pot).orElse("none"))
                        .part("trim-high", ramp.trimmers().high(), Unit.OHM)
                        .part("trim-low", ramp.trimmers().low(), Unit.OHM));
    }

    private void trigger(Trigger trigger) {
        out.append("trigger:\n");
        if (trigger instanceof Trigger.UnijunctionTrigger u) {
            block("  ", "device", DeviceText.unijunction(u.device()));
            line("  base-one", FlowText.partText(u.baseOne(), Unit.OHM));
            line("  base-two", FlowText.partText(u.baseTwo(), Unit.OHM));
        } else if (trigger instanceof Trigger.ProgrammableTrigger p) {
            block("  ", "device", DeviceText.programmable(p.device()));
            line("  base-one", FlowText.partText(p.baseOne(), Unit.OHM));
            line("  upper", FlowText.partText(p.upper(), Unit.OHM));
            line("  lower", FlowText.partText(p.lower(), Unit.OHM));
        }
    }

    private static String gate(GateDrive gate) {
        FlowText text = new FlowText()
                .raw("coupling", gate.coupling().word())
                .part("series", gate.series(), Unit.OHM)
                .part("shunt", gate.shunt(), Unit.OHM)
                .quantity("overdrive", gate.overdrive(), Unit.NUMBER)
                .quantity("charge-time", gate.chargeSeconds(), Unit.SECOND)
                .raw("polarity", gate.polarity().word());
        gate.transformer().ifPresent(t -> text.raw("transformer", SizedText.transformer(t)));
        return text.text();
    }

    private void wanted() {
        FlowText text = new FlowText();
        goal(text, "lowest", design.wanted().lowest());
        goal(text, "highest", design.wanted().highest());
        if (!text.entries().isEmpty()) {
            line("wanted", text.text());
        }
    }

    private static void goal(FlowText text, String key, Optional<Goal> goal) {
        goal.ifPresent(g -> {
            Unit unit = switch (g.measure()) {
                case FRACTION -> Unit.FRACTION;
                case WATTS -> Unit.WATT;
                case VOLTS -> Unit.VOLT;
                case ANGLE -> Unit.ANGLE;
            };
            String from = QuantityText.exact(g.from(), unit);
            String band = g.isBand() ? from + ".." + QuantityText.exact(g.to(), unit) : from;
            text.raw(key, band + " at " + QuantityText.exact(g.position(), Unit.FRACTION));
        });
    }

    private void designators() {
        if (!design.designators().isEmpty()) {
            FlowText text = new FlowText();
            new TreeMap<>(design.designators()).forEach(text::word);
            line("designators", text.text());
        }
    }
}
