package clipramp.desk.model;

import clipramp.desk.model.LongRun.Telling;
import clipramp.files.AsBuilt;
import clipramp.files.DesignText;
import clipramp.files.InvalidInputException;
import clipramp.files.ReadingsFile;
import clipramp.files.ReadingsTable;
import clipramp.files.Source;
import clipramp.fit.Fit;
import clipramp.fit.FitResult;
import clipramp.fit.FitWords;
import clipramp.fit.Readings;
import clipramp.fit.UnsettledFitException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** From what was read on the bench to the unit as built. */
public final class Fitting {
    /**
     * What is to be fitted.
     *
     * @param sheet the design that the unit was built to
     * @param file where it lies, for profiles beside it
     * @param name what the readings are called
     * @param table what was read
     * @param celsius ambient temperature of the session, °C
     * @param lineVolts line voltage where none was read, rms, V
     */
    public record Asked(
            Sheet sheet,
            Optional<Path> file,
            String name,
            ReadingsTable table,
            double celsius,
            OptionalDouble lineVolts) {}

    /**
     * What came of it.
     *
     * @param asked what was fitted
     * @param result what the unit is
     * @param built the design with the unit's values
     * @param notes what to know about both
     */
    public record Answer(Asked asked, FitResult result, Sheet built, List<String> notes) {
        /** Keeps the notes as they are. */
        public Answer {
            notes = List.copyOf(notes);
        }

        /** Whether it is about the design as it stands. */
        public boolean isOf(Sheet now) {
            return asked.sheet().text().text().equals(now.text().text());
        }

        /** Whether the design as it stands is this unit. */
        public boolean isTaken(Sheet now) {
            return built.text().text().equals(now.text().text());
        }
    }

    private final Workshop workshop;

    /**
     * @param workshop reads the design as built
     */
    Fitting(Workshop workshop) {
        this.workshop = workshop;
    }

    /**
     * Fits; seconds.
     *
     * @throws InvalidInputException with everything that is wrong with the readings
     * @throws UnsettledFitException where no values can be found
     */
    Answer of(Asked asked, Telling telling) {
        Source source = new Source(asked.name(), asked.table().csv());
        Readings read = ReadingsFile.read(source, asked.sheet().design(), asked.celsius());
        if (asked.lineVolts().isPresent()) {
            read = read.onLine(asked.lineVolts().getAsDouble());
        }
        FitResult result = Fit.run(
                asked.sheet().design(),
                read,
                telling.of((done, of) -> done == 0 ? "Fitting…" : done + (done == 1 ? " fit" : " fits") + " made"));
        DesignText text = AsBuilt.of(asked.sheet().text(), asked.sheet().design(), result);
        List<String> notes = new ArrayList<>(FitWords.notes(result));
        notes.addAll(text.notes());
        return new Answer(asked, result, workshop.read(text, asked.file()), notes);
    }
}
