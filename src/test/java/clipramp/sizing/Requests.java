package clipramp.sizing;

import clipramp.files.Example;
import clipramp.files.PartialDesign;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import clipramp.units.PreferredSeries;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.Set;

/** Sizing requests drawn from a seed, over lines, stages and loads; invented, of no particular circuit. */
final class Requests {
    static final ProfileLibrary LIBRARY = ProfileLibrary.shipped();

    private static final List<String> STAGES =
            List.of("bridge-dc", "half-wave", "bridge-ac", "inverse-parallel", "triac");

    private static final List<String> LINES =
            List.of("line-230v-50hz", "line-120v-60hz", "line-100v-50hz", "line-24v-50hz", "line-24v-60hz");

    private Requests() {}

    /** A request that leaves every part open. */
    static String text(long seed) {
        Random random = new Random(seed);
        String stage = STAGES.get(random.nextInt(STAGES.size()));
        boolean byTransformer = stage.equals("triac") || stage.equals("inverse-parallel");
        String line = LINES.get(random.nextInt(byTransformer ? 3 : LINES.size()));
        int volts = Integer.parseInt(line.substring(5, line.indexOf('v')));
        double amps = 0.4 * Math.pow(20, random.nextDouble());
        long watts = Math.round(volts * Math.min(amps, stage.equals("triac") ? 5 : 9));
        boolean half = stage.equals("half-wave");
        int lowest = 4 + random.nextInt(10);
        int highest = half ? 30 + random.nextInt(14) : 70 + random.nextInt(23);
        return String.format(
                Locale.ROOT,
                """
                clipramp: 1
                title: Request %d
                line: %s
                stage: %s
                load: {kind: resistor, rated: %d W at %d V}
                surroundings: {coldest: %d degC, hottest: %d degC}
                wanted: {lowest: %d %% at 0 %%, highest: %d %% at 100 %%}
                """,
                seed,
                line,
                stage,
                watts,
                volts,
                -10 + 5 * random.nextInt(4),
                35 + 5 * random.nextInt(4),
                lowest,
                highest);
    }

    static PartialDesign read(String text) {
        return PartialDesign.read(new Source("request.yaml", text), Set.of(), Set.of(), LIBRARY);
    }

    static SizingRequest request(String text, PreferredSeries series) {
        return read(text).request(LIBRARY, series);
    }

    /** The drying cabinet with other wishes and another load, ramp only open: a grid small enough to try all of it. */
    static SizingRequest ramp(long seed) {
        Random random = new Random(seed);
        String text = Example.named("drying-cabinet").orElseThrow().text();
        text = text.replace("700 W at 230 V", (300 + 10 * random.nextInt(100)) + " W at 230 V")
                .replace("lowest: 5 %", "lowest: " + (3 + random.nextInt(12)) + " %")
                .replace("highest: 94 %", "highest: " + (75 + random.nextInt(20)) + " %")
                .replace(
                        "dropper: 10 kΩ",
                        "dropper: " + List.of("8.2 kΩ", "10 kΩ", "12 kΩ").get(random.nextInt(3)))
                .replace(
                        "device: 2n2647",
                        "device: " + List.of("2n2647", "2n4871").get(random.nextInt(2)));
        PartialDesign partial = PartialDesign.read(
                new Source("ramp.yaml", text),
                EnumSet.of(OpenPart.CAPACITOR, OpenPart.FIXED, OpenPart.TRACK),
                Set.of(),
                LIBRARY);
        return partial.request(LIBRARY, PreferredSeries.E6);
    }
}
