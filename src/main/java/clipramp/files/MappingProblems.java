package clipramp.files;

import clipramp.files.Node.Mapping;
import clipramp.files.Node.Scalar;
import java.util.List;
import java.util.Set;

/** The words for what is wrong with one mapping's keys. */
final class MappingProblems {
    private final Findings findings;
    private final Mapping node;
    private final String path;
    private final List<String> known;

    /**
     * @param findings where problems go
     * @param node the mapping
     * @param path its key as a person names it
     * @param known the keys that the catalogue has under it
     */
    MappingProblems(Findings findings, Mapping node, String path, List<String> known) {
        this.findings = findings;
        this.node = node;
        this.path = path;
        this.known = known;
    }

    String pathOf(String name) {
        return path.isEmpty() ? name : path + "." + name;
    }

    void missing(String name, Key key) {
        if (isMistyped(name)) {
            return;
        }
        String example = key.kind() == Key.Kind.MAPPING
                ? "{" + String.join(", ", KeyCatalogue.standard().namesUnder(key.path())) + "}"
                : key.range();
        findings.problem(
                node.place(), pathOf(name), "", example, "is missing; expected " + example + ". " + key.meaning());
    }

    /** Whether an unknown key stands here that is nearest to this one: then that is the problem, and told as such. */
    private boolean isMistyped(String name) {
        return node.entries().stream()
                .map(Node.Entry::key)
                .anyMatch(k -> !known.contains(k) && Nearest.to(k, known).equals(name));
    }

    void wrongShape(String name, Node found, String expected) {
        String read =
                found instanceof Scalar s ? "\"" + s.text() + "\"" : found instanceof Mapping ? "a mapping" : "a list";
        findings.problem(found.place(), pathOf(name), read, expected, "read " + read + "; expected " + expected + ".");
    }

    void noSuchWord(String name, Scalar scalar, List<String> words) {
        String read = scalar.text();
        String nearest = Nearest.to(read, words);
        String hint = nearest.isEmpty() ? "" : ". Nearest: " + nearest;
        String expected = String.join(" | ", words);
        Place place = scalar.place();
        findings.add(new Problem(
                place.file(),
                place.line(),
                place.column(),
                pathOf(name),
                read,
                expected,
                nearest,
                pathOf(name) + ": read \"" + read + "\"; expected " + expected + hint + "."));
    }

    /** Refuses what was neither taken nor allowed: unknown keys, and known ones that have no place here. */
    void leftOver(Set<String> taken, Set<String> allowed, String why) {
        for (Node.Entry entry : node.entries()) {
            if (taken.contains(entry.key()) || allowed.contains(entry.key())) {
                continue;
            }
            if (known.contains(entry.key())) {
                findings.problem(
                        entry.place(),
                        pathOf(entry.key()),
                        "has no place " + (why.isEmpty() ? "here" : why) + ". Take it out.");
            } else {
                findings.unknown(entry.place(), pathOf(entry.key()), entry.key(), "unknown key", known);
            }
        }
    }
}
