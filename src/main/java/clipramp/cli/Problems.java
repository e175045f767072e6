package clipramp.cli;

import clipramp.files.Conditions;
import clipramp.files.InvalidInputException;
import clipramp.files.Nearest;
import clipramp.files.Problem;
import clipramp.units.Expected;
import clipramp.units.Unit;
import java.util.List;

/** Refusals of options, in the same shape as those of design files. */
final class Problems {
    private Problems() {}

    /**
     * @param place command or option that it is about; may be empty
     * @param path option or key
     * @param message the sentence
     */
    static Problem of(String place, String path, String message) {
        return new Problem(place.isEmpty() ? Program.NAME : place, 0, 0, path, "", "", "", message);
    }

    /** An option that cannot be used as given. */
    static InvalidInputException refused(String option, String message) {
        return new InvalidInputException(List.of(of(option, option, message)));
    }

    /** A word that is not known, with the nearest that is. */
    static InvalidInputException unknown(String place, String word, String what, List<String> known) {
        String nearest = Nearest.to(word, known);
        String hint = nearest.isEmpty() ? "Known: " + String.join(", ", known) + "." : "Nearest: " + nearest + ".";
        return new InvalidInputException(List.of(new Problem(
                place.isEmpty() ? Program.NAME : place,
                0,
                0,
                word,
                word,
                String.join(", ", known),
                nearest,
                "\"" + word + "\" " + what + ". " + hint)));
    }

    /** An option's value as a whole number. */
    static int whole(String option, String text, int least, int most) {
        double value = Conditions.of(option, text, Expected.within(Unit.NUMBER, least, most));
        if (value != Math.rint(value)) {
            throw refused(option, "read \"" + text + "\"; expected a whole number, " + least + ".." + most + ".");
        }
        return (int) value;
    }

    /** One of a few words. */
    static String word(String option, String text, List<String> known) {
        if (!known.contains(text)) {
            throw unknown(option, text, "is not what " + option + " takes", known);
        }
        return text;
    }

    /** As a line for people: where it stands, then the sentence. */
    static String text(Problem problem) {
        return problem.line() > 0 ? problem.text() : problem.file() + ": " + problem.message();
    }

    static String json(List<Problem> problems, boolean ascii) {
        return Json.object(
                ascii,
                json -> json.putObjects("problems", problems, (p, problem) -> {
                    p.put("file", problem.file());
                    position(p, "line", problem.line());
                    position(p, "column", problem.column());
                    p.put("path", problem.path())
                            .put("read", problem.read())
                            .put("expected", problem.expected())
                            .put("nearest", problem.nearest())
                            .put("message", problem.message());
                }));
    }

    /** Lines and columns count from 1; 0 says that there is none. */
    private static void position(Json json, String key, int value) {
        if (value > 0) {
            json.put(key, value);
        } else {
            json.putNull(key);
        }
    }
}
