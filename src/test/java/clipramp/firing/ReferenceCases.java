package clipramp.firing;

import clipramp.circuit.Characteristic;
import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.Document;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.PotLaw;
import clipramp.circuit.Ramp;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.Surroundings;
import clipramp.circuit.TemperatureCurve;
import clipramp.circuit.Thyristor;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger;
import clipramp.circuit.TriggerDemand;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Wanted;
import clipramp.circuit.Zener;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.dataformat.yaml.YAMLFactory;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The solved circuits of reference-cases.json: brute-force adaptive integration (relative tolerance 1e-11) of the laws
 * in DEVELOPERS.md by a program apart from this one, all rows without a stall checked by a second. Good to 1e-6 degrees,
 * 1e-6 V, 1e-5 relative in energy and charge; peaks to 1e-3.
 *
 * <p>The designs are decoded here by hand, so that these checks of the engine do not lean on the file reader.
 */
final class ReferenceCases {
    private static final Map<String, Double> PREFIX = Map.of("n", 1e-9, "u", 1e-6, "m", 1e-3, "k", 1e3);

    private ReferenceCases() {}

    /** One circuit at one knob position. */
    record Row(String name, Design design, double rampOhms, boolean hunts, List<JsonNode> halves) {
        @Override
        public String toString() {
            return name + " at " + rampOhms + " ohm";
        }
    }

    static List<Row> rows() {
        List<Row> rows = new ArrayList<>();
        try (InputStream in = ReferenceCases.class.getResourceAsStream("reference-cases.json")) {
            ObjectMapper yaml = new ObjectMapper(new YAMLFactory());
            for (JsonNode one : new ObjectMapper().readTree(in)) {
                Design design = design(yaml.readTree(one.get("design").asText()));
                for (JsonNode row : one.get("rows")) {
                    List<JsonNode> halves = new ArrayList<>();
                    row.get("halves").forEach(halves::add);
                    rows.add(new Row(
                            one.get("name").asText(),
                            design,
                            row.get("rampOhms").asDouble(),
                            row.get("hunts").asBoolean(),
                            halves));
                }
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return rows;
    }

    private static Design design(JsonNode n) {
        double lineVolts = si(n.at("/line/voltage"));
        double hertz = si(n.at("/line/frequency"));
        JsonNode clip = n.get("clip");
        ClipSupply supply = new ClipSupply(
                ClipSupply.Tap.LINE,
                clip.get("rectifier").asText().equals("bridge")
                        ? ClipSupply.Rectifier.BRIDGE
                        : ClipSupply.Rectifier.DIODE,
                si(clip.get("diode-drop")),
                Part.of(si(clip.get("dropper"))),
                new Zener(
                        "zener",
                        Characteristic.exactly(si(clip.at("/zener/voltage"))),
                        si(clip.at("/zener/test-current")),
                        si(clip.at("/zener/slope")),
                        0,
                        OptionalDouble.of(si(clip.at("/zener/power")))),
                Optional.empty());
        String[] rated = n.at("/load/rated").asText().split(" at ");
        double ratedVolts = number(rated[1]);
        Stage stage = n.get("stage").asText().equals("half-wave") ? Stage.HALF_WAVE : Stage.BRIDGE_DC;
        return new Design(
                n.get("title").asText(),
                "",
                Document.EMPTY,
                new Line(lineVolts, hertz, lineVolts, lineVolts, List.of()),
                stage,
                new StageDiodes(si(clip.get("diode-drop")), 0),
                new Load.Resistor(ratedVolts * ratedVolts / number(rated[0])),
                supply,
                ramp(n.get("ramp")),
                trigger(n.get("trigger")),
                new GateDrive(
                        GateDrive.Coupling.DIRECT,
                        Part.of(si(n.at("/gate/series"))),
                        Optional.of(Part.of(si(n.at("/gate/shunt")))),
                        3,
                        20e-6,
                        GateDrive.Polarity.POSITIVE,
                        Optional.empty()),
                new Thyristor(thyristor(n.at("/thyristor/device")), OptionalDouble.of(1)),
                Optional.empty(),
                new Surroundings(0, 50),
                new Wanted(Optional.empty(), Optional.empty()),
                0.5,
                Map.of());
    }

    private static Ramp ramp(JsonNode n) {
        Optional<Pot> pot = n.get("pot").isTextual()
                ? Optional.empty()
                : Optional.of(new Pot(
                        Part.of(si(n.at("/pot/track"))), 0, new PotLaw.Linear(), Pot.Sense.RISING, Optional.empty()));
        return new Ramp(Part.of(si(n.get("capacitor"))), Part.of(si(n.get("fixed"))), pot);
    }

    private static Trigger trigger(JsonNode n) {
        JsonNode d = n.get("device");
        OptionalDouble none = OptionalDouble.empty();
        Unijunction device = new Unijunction(
                "in place",
                Characteristic.exactly(si(d.get("standoff"))),
                Characteristic.exactly(si(d.get("interbase"))),
                Characteristic.exactly(0),
                Characteristic.exactly(si(d.get("emitter-drop"))),
                Characteristic.exactly(0),
                Characteristic.exactly(si(d.get("peak-current"))),
                new Unijunction.Valley(
                        Characteristic.exactly(si(d.at("/valley/current"))),
                        Characteristic.exactly(si(d.at("/valley/voltage"))),
                        si(d.at("/valley/at"))),
                new Unijunction.Saturation(
                        Characteristic.exactly(si(d.at("/saturation/voltage"))),
                        si(d.at("/saturation/current")),
                        si(d.at("/valley/at"))),
                Optional.of(new Unijunction.Modulated(
                        Characteristic.exactly(si(d.at("/modulated/current"))), si(d.at("/modulated/at")))),
                Optional.empty(),
                new Unijunction.Limits(none, none, none, none, none, none, none, none));
        return new Trigger.UnijunctionTrigger(device, Part.of(si(n.get("base-one"))), Part.of(si(n.get("base-two"))));
    }

    private static ThyristorDevice thyristor(JsonNode n) {
        OptionalDouble none = OptionalDouble.empty();
        JsonNode gate = n.get("gate");
        JsonNode point = gate.at("/trigger/0");
        return new ThyristorDevice(
                ThyristorDevice.Kind.SCR,
                "in place",
                new ThyristorDevice.Gate(
                        si(gate.get("knee")),
                        si(gate.get("slope")),
                        new TriggerDemand(List.of(
                                new TriggerDemand.Point(25, si(point.get("current")), si(point.get("voltage"))))),
                        Map.of(),
                        Optional.of(new ThyristorDevice.NonTrigger(0.2, 125)),
                        OptionalDouble.of(si(gate.get("turn-on"))),
                        new ThyristorDevice.GateLimits(none, none, none, none, none, none)),
                Optional.of(TemperatureCurve.at25(si(n.get("latching")))),
                Optional.of(TemperatureCurve.at25(si(n.get("holding")))),
                none,
                Optional.empty(),
                new ThyristorDevice.OnState(0, 0),
                new ThyristorDevice.Limits(none, none, none, none, none, none, none, none),
                none);
    }

    private static double si(JsonNode n) {
        return number(n.asText());
    }

    /** "14 kohm", "0.5 V", "1 ns": only the forms that these files hold. */
    private static double number(String text) {
        String[] parts = text.split(" ");
        double value = Double.parseDouble(parts[0]);
        if (parts.length == 1) {
            return value;
        }
        String unit = parts[1];
        boolean prefixed = unit.length() > 1 && PREFIX.containsKey(unit.substring(0, 1));
        return prefixed ? value * PREFIX.get(unit.substring(0, 1)) : value;
    }
}
