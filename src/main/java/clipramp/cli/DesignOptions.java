package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Surroundings;
import clipramp.files.Conditions;
import clipramp.files.DesignFiles;
import clipramp.files.LoadedDesign;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The design that an analysis reads, and the condition that it is solved at. */
final class DesignOptions {
    @Parameters(paramLabel = "FILE", description = "design file; - for standard input")
    String file = "";

    @Option(
            names = "--line",
            paramLabel = "VOLTS",
            order = 1,
            description = "solve and judge at this line voltage, such as 207V")
    @Nullable
    String line;

    @Option(
            names = "--temperature",
            paramLabel = "DEGREES",
            order = 2,
            description = "solve and judge at this ambient temperature, such as 0degC")
    @Nullable
    String temperature;

    @Option(
            names = "--with",
            paramLabel = "KEY=VALUE",
            order = 3,
            description = "replace a value of the design; may be repeated, the last of a key wins")
    List<String> overrides = new ArrayList<>();

    @Mixin
    ProfileOptions profiles = new ProfileOptions();

    LoadedDesign load(Session session) {
        return Inputs.load(session, file, overrides, library(session));
    }

    /** The same from a text that was read already. */
    LoadedDesign load(Session session, Source source) {
        return DesignFiles.load(source, overrides, library(session));
    }

    /** Where this design's profiles are looked for. */
    ProfileLibrary library(Session session) {
        return Inputs.libraryOf(session, file, profiles.shippedOnly());
    }

    /** The line voltage asked for, V. */
    OptionalDouble lineVolts(Design design) {
        return line == null ? OptionalDouble.empty() : OptionalDouble.of(Conditions.lineVolts(line, design.line()));
    }

    /** The temperature asked for, °C. */
    OptionalDouble celsius() {
        return temperature == null ? OptionalDouble.empty() : OptionalDouble.of(Conditions.celsius(temperature));
    }

    /** What knob table and waveforms are solved at: nominal but for what was asked for. */
    Condition condition(Design design) {
        Condition nominal = design.nominalCondition();
        return new Condition(
                lineVolts(design).orElse(nominal.lineVolts()),
                nominal.lineHertz(),
                celsius().orElse(nominal.celsius()));
    }

    /** The design with line voltage and temperature held at what was asked for: what units are drawn from. */
    Design held(Design design) {
        Design held = design;
        if (line != null) {
            double volts = Conditions.lineVolts(line, design.line());
            Line own = design.line();
            held = held.withLine(new Line(volts, own.hertz(), volts, volts, own.harmonics()));
        }
        if (temperature != null) {
            double celsius = Conditions.celsius(temperature);
            held = held.withSurroundings(new Surroundings(celsius, celsius));
        }
        return held;
    }

    Check check(LoadedDesign loaded) {
        return Judge.check(loaded.design(), lineVolts(loaded.design()), celsius());
    }
}
