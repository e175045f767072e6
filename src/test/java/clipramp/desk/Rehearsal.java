package clipramp.desk;

import clipramp.cli.Cli;
import clipramp.cli.Terminal;
import clipramp.files.Example;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What a user's first minutes do, once: the application image keeps the classes that this loads ready in its archive, so
 * that they need not be read and checked at every start.
 */
public final class Rehearsal {
    private Rehearsal() {}

    public static void main(String[] arguments) throws IOException {
        Path home = Files.createTempDirectory("rehearsal");
        for (Example example : Example.all()) {
            String design = home.resolve(example.id() + ".yaml").toString();
            command("new", "--from=" + example.id(), "--out=" + design);
            command("check", design);
            command("map", design, "--for-power=50%");
        }
        String design = home.resolve("drying-cabinet.yaml").toString();
        List.of(
                        List.of("check", design, "--json"),
                        List.of("check", design, "--with=ramp.capacitor=47nF"),
                        List.of("check", design, "--with=ramp.capasitor=47nF"),
                        List.of("map", design, "--csv", "--plot=" + home.resolve("map.svg")),
                        List.of("trace", design, "--plot=" + home.resolve("trace.png")),
                        List.of("spread", design, "--samples=200"),
                        List.of("size", design, "--out=" + home.resolve("sized.yaml")),
                        List.of("faults", design),
                        List.of("record", design, "--out=" + home.resolve("record.pdf")),
                        List.of("explain", "ramp.capacitor"),
                        List.of("explain", "safety"),
                        List.of("parts"),
                        List.of("check", "--help"),
                        List.of("--help"),
                        List.<String>of())
                .forEach(words -> command(words.toArray(String[]::new)));
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            window.press("#page-record");
            window.press("#page-bench");
            window.settle();
        }
        System.exit(0);
    }

    private static void command(String... words) {
        Terminal nowhere = new Terminal(
                new ByteArrayInputStream(new byte[0]),
                new ByteArrayOutputStream(),
                new ByteArrayOutputStream(),
                Map.of(),
                false,
                StandardCharsets.UTF_8);
        Cli.run(words, nowhere, Optional.empty());
    }
}
