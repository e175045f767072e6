package clipramp.desk.model;

import clipramp.circuit.RefusedCircuit;
import clipramp.files.InvalidInputException;
import clipramp.files.Problem;
import clipramp.fit.UnsettledFitException;
import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.NoSuchFileException;
import java.util.List;
import java.util.stream.Collectors;

/**
 * A failure in words: the one place where exceptions become something that a person can act on.
 *
 * @param headline what could not be done
 * @param text why, and what to do
 */
public record Trouble(String headline, String text) {
    private static final int MOST_PROBLEMS = 12;

    /**
     * A failure in words.
     *
     * @param what what could not be done, such as "The file cannot be opened"
     * @param failure what was thrown
     */
    public static Trouble of(String what, Throwable failure) {
        if (failure instanceof InvalidInputException invalid) {
            return new Trouble(what, problems(invalid.problems()));
        }
        if (failure instanceof NoSuchFileException missing) {
            return new Trouble(what, "There is no file " + missing.getFile() + ". Was it moved or renamed?");
        }
        if (failure instanceof AccessDeniedException denied) {
            return new Trouble(
                    what,
                    denied.getFile() + " may not be read or written by you. Choose another place, or ask for leave.");
        }
        if (failure instanceof IOException) {
            return new Trouble(what, "The file system says: " + failure.getMessage());
        }
        if (failure instanceof RefusedCircuit
                || failure instanceof Reading.NoSuchAngleException
                || failure instanceof UnsettledFitException
                || failure instanceof IllegalArgumentException) {
            return new Trouble(what, String.valueOf(failure.getMessage()));
        }
        return new Trouble(
                what,
                "This is a fault of the program, not of yours. Your work is kept. Please report it with the design and"
                        + " these words: " + failure.getClass().getSimpleName() + ", " + failure.getMessage() + ", at "
                        + place(failure));
    }

    private static String problems(List<Problem> problems) {
        String shown = problems.stream().limit(MOST_PROBLEMS).map(Problem::text).collect(Collectors.joining("\n"));
        int more = problems.size() - MOST_PROBLEMS;
        return more > 0 ? shown + "\nand " + more + " more" : shown;
    }

    private static String place(Throwable failure) {
        StackTraceElement[] trace = failure.getStackTrace();
        return trace.length == 0 ? "an unknown place" : trace[0].getClassName() + " line " + trace[0].getLineNumber();
    }
}
