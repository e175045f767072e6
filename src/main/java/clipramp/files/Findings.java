package clipramp.files;

import clipramp.files.LoadedDesign.Assumed;
import clipramp.units.Refusal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** What a reading has found so far: problems, defaults used, notes. One reading, one thread. */
final class Findings {
    private static final int MOST_PROBLEMS = 100;

    private final List<Problem> problems = new ArrayList<>();
    private final List<Assumed> assumed = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();
    private final List<String> alsoRead = new ArrayList<>();

    void add(Problem problem) {
        if (problems.size() < MOST_PROBLEMS && !problems.contains(problem)) {
            problems.add(problem);
        }
    }

    /** A problem whose message is the key, a colon and a sentence. */
    void problem(Place place, String path, String sentence) {
        problem(place, path, "", "", sentence);
    }

    void problem(Place place, String path, String read, String expected, String sentence) {
        String message = path.isEmpty() ? sentence : path + ": " + sentence;
        add(new Problem(place.file(), place.line(), place.column(), path, read, expected, "", message));
    }

    void refused(Place place, String path, Refusal refusal) {
        problem(place, path, refusal.read(), refusal.expected(), refusal.message());
    }

    /** A word that is not known, with the nearest known one. */
    void unknown(Place place, String path, String read, String what, List<String> known) {
        String nearest = Nearest.to(read, known);
        String hint = nearest.isEmpty() ? "Known: " + String.join(", ", known) + "." : "Nearest: " + nearest + ".";
        String message = path + ": " + what + ". " + hint;
        add(new Problem(
                place.file(), place.line(), place.column(), path, read, String.join(", ", known), nearest, message));
    }

    void assume(String path, String value) {
        assumed.add(new Assumed(path, value));
    }

    void note(String text) {
        if (!notes.contains(text)) {
            notes.add(text);
        }
    }

    boolean hasProblems() {
        return !problems.isEmpty();
    }

    int count() {
        return problems.size();
    }

    List<Problem> problems() {
        return problems.stream()
                .sorted(Comparator.comparingInt((Problem p) -> p.line()).thenComparingInt(Problem::column))
                .toList();
    }

    List<Assumed> assumed() {
        return assumed;
    }

    /** Text of a file that the design names, which its digest covers. */
    void alsoRead(String text) {
        alsoRead.add(text);
    }

    List<String> alsoRead() {
        return List.copyOf(alsoRead);
    }

    List<String> notes() {
        return notes;
    }

    void throwIfAny() {
        if (hasProblems()) {
            throw new InvalidInputException(problems());
        }
    }
}
