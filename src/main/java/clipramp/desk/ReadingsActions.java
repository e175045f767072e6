package clipramp.desk;

import clipramp.files.ReadingsTable;
import clipramp.files.Source;
import clipramp.files.WholeFile;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;

/** Opens and saves files of bench readings. */
final class ReadingsActions {
    private static final String NAME = "readings.csv";

    private final Service service;

    ReadingsActions(Service service) {
        this.service = service;
    }

    void open(Consumer<ReadingsTable> then) {
        service.asks().toOpen(FileAsk.Kind.CSV).ifPresent(file -> open(file, then));
    }

    void open(Path file, Consumer<ReadingsTable> then) {
        List<ReadingsTable> read = new ArrayList<>(1);
        service.away(
                "The readings cannot be opened",
                () -> read.add(ReadingsTable.of(Source.of(file))),
                () -> read.forEach(then));
    }

    /** Readings are told from designs by their ending. */
    static boolean isReadings(Path file) {
        return String.valueOf(file.getFileName()).toLowerCase(Locale.ROOT).endsWith("." + FileAsk.Kind.CSV.ending());
    }

    void save(ReadingsTable table, Optional<Path> beside, Runnable then) {
        service.asks()
                .toWrite(FileAsk.Kind.CSV, NAME, beside)
                .ifPresent(file -> service.away(
                        "The readings cannot be saved", () -> WholeFile.write(file, table.csv(), true), () -> {
                            then.run();
                            service.window().say("Saved " + file.getFileName());
                        }));
    }
}
