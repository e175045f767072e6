package clipramp.files;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.Document;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.Ramp;
import clipramp.circuit.Snubber;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.Surroundings;
import clipramp.circuit.Thyristor;
import clipramp.circuit.Trigger;
import clipramp.circuit.Wanted;
import clipramp.files.Devices.Device;
import clipramp.files.Node.Mapping;
import java.util.Arrays;
import java.util.Map;
import java.util.Optional;

/** Turns a design's tree into records; all problems at once. */
final class DesignReader {
    private static final double USUAL_LINE_VOLTS = 230;

    private final Scope root;
    private final Findings findings;
    private final Devices devices;

    DesignReader(Mapping tree, Findings findings, Devices devices) {
        root = new Scope(findings, tree, "", "");
        this.findings = findings;
        this.devices = devices;
    }

    /** What the mappings of a design hold; a part that could not be read at all is empty. */
    private record Parts(
            Optional<Line> line,
            Optional<Stage> stage,
            StageDiodes stageDiodes,
            Optional<Load> load,
            Optional<ClipSupply> clip,
            Optional<Ramp> ramp,
            Optional<Trigger> trigger,
            Optional<GateDrive> gate,
            Optional<Thyristor> thyristor,
            Optional<Snubber> snubber) {}

    /** Empty where there are problems. */
    Optional<Design> read() {
        root.take("clipramp");
        String title = root.text("title");
        String notes = root.text("notes");
        Document document = RestSections.document(root);
        Parts parts = parts();
        Optional<Surroundings> surroundings = RestSections.surroundings(root);
        Wanted wanted = RestSections.wanted(root);
        double derating = RestSections.derating(root);
        Map<String, String> designators = RestSections.designators(root);
        root.close("");
        new SoundnessCheck(root, findings)
                .check(parts.stage(), parts.clip(), parts.gate(), parts.load(), parts.thyristor(), parts.snubber());
        if (findings.hasProblems()) {
            return Optional.empty();
        }
        return root.make(
                findings.count(),
                () -> new Design(
                        title,
                        notes,
                        document,
                        parts.line().orElseThrow(),
                        parts.stage().orElseThrow(),
                        parts.stageDiodes(),
                        parts.load().orElseThrow(),
                        parts.clip().orElseThrow(),
                        parts.ramp().orElseThrow(),
                        parts.trigger().orElseThrow(),
                        parts.gate().orElseThrow(),
                        parts.thyristor().orElseThrow(),
                        parts.snubber(),
                        surroundings.orElseThrow(),
                        wanted,
                        derating,
                        designators));
    }

    private Parts parts() {
        Optional<Line> line = line();
        Optional<Stage> stage = stage();
        boolean halfWave = stage.equals(Optional.of(Stage.HALF_WAVE));
        boolean triac = stage.equals(Optional.of(Stage.TRIAC));
        Optional<ClipSupply> clip = root.child("clip").flatMap(s -> ClipSection.read(s, devices, halfWave));
        double drop = clip.map(ClipSupply::diodeDropVolts).orElse(0.0);
        double lineVolts = line.map(Line::volts).orElse(USUAL_LINE_VOLTS);
        return new Parts(
                line,
                stage,
                stageDiodes(stage, drop),
                root.child("load").flatMap(s -> LoadSection.read(s, lineVolts, drop)),
                clip,
                root.child("ramp").flatMap(RampSection::read),
                root.child("trigger").flatMap(s -> TriggerSection.read(s, devices)),
                root.child("gate").flatMap(GateSection::read),
                root.child("thyristor").flatMap(s -> ThyristorSection.read(s, devices, triac)),
                root.child("snubber").flatMap(RestSections::snubber));
    }

    private Optional<Stage> stage() {
        return root.word("stage")
                .flatMap(w -> Arrays.stream(Stage.values())
                        .filter(s -> s.word().equals(w))
                        .findFirst());
    }

    private Optional<Line> line() {
        return ClipSection.device(root, devices, "line", DevicePlace.LINE)
                .map(Device::mapping)
                .flatMap(m -> LineSection.read(new Scope(findings, m, "line", "line")));
    }

    private StageDiodes stageDiodes(Optional<Stage> stage, double dropVolts) {
        Optional<Scope> scope = root.child("stage-diodes");
        if (scope.isPresent()) {
            return LoadSection.diodes(scope.get(), dropVolts);
        }
        if (stage.isPresent() && stage.get().bridgeDiodes() > 0) {
            Scope empty = new Scope(findings, Mapping.empty(root.place()), "stage-diodes", "stage-diodes");
            return LoadSection.diodes(empty, dropVolts);
        }
        return new StageDiodes(dropVolts, 0);
    }
}
