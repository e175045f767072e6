package clipramp.files;

import clipramp.files.Node.Mapping;
import clipramp.files.Node.Scalar;

/** The line {@code clipramp: 1} that every file begins with. */
final class Version {
    static final int CURRENT = 1;

    private Version() {}

    static void check(Mapping mapping, Findings findings) {
        Node node = mapping.get("clipramp").orElse(null);
        if (node == null) {
            findings.problem(
                    Place.of(mapping.place().file(), 1, 1),
                    "clipramp",
                    "",
                    "1",
                    "is missing; a file begins with \"clipramp: 1\", its format version.");
            return;
        }
        String text = node instanceof Scalar s ? s.text() : "";
        if (text.equals(String.valueOf(CURRENT))) {
            return;
        }
        String advice = text.matches("[1-9]\\d{0,8}")
                ? "this is format version " + text + ", newer than this program, which reads " + CURRENT
                        + ". Get a newer clipramp."
                : "read \"" + text + "\"; expected 1, the format version.";
        findings.problem(node.place(), "clipramp", text, "1", advice);
    }
}
