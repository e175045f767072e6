package clipramp.record;

import clipramp.files.DesignFiles;
import clipramp.files.LoadedDesign;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import clipramp.margins.Judge;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;

/** Records of the shipped examples, for tests and for a person to look at: {@code SampleRecords FOLDER}. */
public final class SampleRecords {
    private SampleRecords() {}

    public static void main(String[] arguments) throws IOException {
        Path folder = Path.of(arguments[0]);
        Files.createDirectories(folder);
        for (String example : List.of(
                "drying-cabinet", "cabinet-gone-wrong", "upper-heaters", "seed-drawer", "shed-heater", "tray-lamp")) {
            Files.write(folder.resolve(example + ".pdf"), DesignRecord.bytes(of(example), PageSize.A4));
        }
        Files.write(
                folder.resolve("drying-cabinet-letter.pdf"), DesignRecord.bytes(of("drying-cabinet"), PageSize.LETTER));
    }

    /** The record's content of an example by its file's name. */
    public static RecordContent of(String example) {
        LoadedDesign loaded = load(example);
        var check = Judge.check(loaded.design(), OptionalDouble.empty(), OptionalDouble.empty());
        return RecordContent.of(loaded, check, ProfileLibrary.shipped(), "0.1.0");
    }

    static LoadedDesign load(String example) {
        String name = example + ".yaml";
        try (var in = SampleRecords.class.getResourceAsStream("/clipramp/examples/" + name)) {
            String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
            return DesignFiles.load(new Source(name, text), List.of(), ProfileLibrary.shipped());
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }
}
