package clipramp.files;

import clipramp.files.Node.Entry;
import clipramp.files.Node.Mapping;
import clipramp.files.Node.Scalar;
import clipramp.files.Node.Sequence;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** One change to a design's source text. Offsets are in code points, as the parser counts. */
final class TextEdit {
    private final Source source;
    private final int[] signs;
    private final Mapping root;
    private final List<String> notes = new ArrayList<>();

    private TextEdit(Source source, Mapping root) {
        this.source = source;
        this.root = root;
        signs = source.text().codePoints().toArray();
    }

    static TextEdit of(Source source) {
        Findings findings = new Findings();
        Optional<Mapping> root = YamlTree.read(source, findings);
        if (root.isEmpty()) {
            throw new InvalidInputException(findings.problems());
        }
        return new TextEdit(source, root.get());
    }

    List<String> notes() {
        return notes;
    }

    /**
     * Where a path leads.
     *
     * @param steps all of its steps
     * @param found nodes from the root down, as far as they are there
     */
    private record Trail(List<String> steps, List<Node> found) {
        boolean isComplete() {
            return found.size() == steps.size() + 1;
        }

        Node last() {
            return found.get(found.size() - 1);
        }

        List<String> missing() {
            return steps.subList(found.size() - 1, steps.size());
        }
    }

    private Trail trail(String path) {
        List<String> steps = new ArrayList<>();
        for (String part : path.split("\\.", -1)) {
            String[] pieces = part.split("[\\[\\]]+");
            steps.add(pieces.length == 0 ? "" : pieces[0]);
            Arrays.stream(pieces).skip(1).forEach(index -> steps.add("[" + index));
        }
        List<Node> found = new ArrayList<>(List.of(root));
        for (String step : steps) {
            Optional<Node> below = below(found.get(found.size() - 1), step);
            if (below.isEmpty()) {
                break;
            }
            found.add(below.get());
        }
        return new Trail(steps, found);
    }

    private static Optional<Node> below(Node node, String step) {
        if (node instanceof Mapping mapping) {
            return mapping.get(step);
        }
        if (node instanceof Sequence sequence && step.matches("\\[\\d{1,4}")) {
            int index = Integer.parseInt(step.substring(1));
            return index < sequence.items().size()
                    ? Optional.of(sequence.items().get(index))
                    : Optional.empty();
        }
        return Optional.empty();
    }

    Optional<String> valueAt(String path) {
        Trail trail = trail(path);
        if (!trail.isComplete()) {
            return Optional.empty();
        }
        Node node = trail.last();
        return Optional.of(
                node instanceof Scalar s ? s.text() : text(node.place().start(), end(node)));
    }

    String set(String path, String value) {
        Trail trail = trail(path);
        Node last = trail.last();
        if (trail.isComplete()) {
            return replaced(path, trail, value);
        }
        List<String> missing = trail.missing();
        if (missing.stream().anyMatch(s -> s.startsWith("["))) {
            throw refused(last.place(), path, "there is no such list item.");
        }
        String below = nested(missing.subList(1, missing.size()), path, value);
        if (last instanceof Mapping mapping) {
            return isFlow(mapping)
                    ? insertedInFlow(mapping, missing.get(0), below)
                    : insertedLine(mapping, missing, below, path, value);
        }
        if (last instanceof Scalar scalar) {
            String like = scalar.isNone() ? "" : "like: " + scalar.text() + ", ";
            return spliced(last.place().start(), end(last), "{" + like + missing.get(0) + ": " + below + "}");
        }
        throw refused(last.place(), path, "read a list above it; expected keys, {" + missing.get(0) + ": ...}.");
    }

    private InvalidInputException refused(Place place, String path, String sentence) {
        Findings findings = new Findings();
        findings.problem(place, path, sentence);
        return new InvalidInputException(findings.problems());
    }

    /** The value wrapped into the keys that are still missing around it, in braces. */
    private String nested(List<String> steps, String path, String value) {
        if (steps.isEmpty()) {
            return YamlText.value(path, value, true);
        }
        return "{" + steps.get(0) + ": " + nested(steps.subList(1, steps.size()), path, value) + "}";
    }

    private String replaced(String path, Trail trail, String value) {
        Node node = trail.last();
        boolean insideFlow =
                trail.found().subList(0, trail.found().size() - 1).stream().anyMatch(this::isFlow);
        String written = YamlText.value(path, value, insideFlow);
        int start = node.place().start();
        if (isBlock(node)) {
            String old = text(start, end(node));
            if (old.contains("#")) {
                notes.add("Comments inside " + path + " were not kept.");
            }
            int back = start;
            while (back > 0 && (signs[back - 1] == ' ' || signs[back - 1] == '\n' || signs[back - 1] == '\r')) {
                back--;
            }
            boolean item = back > 0 && signs[back - 1] == '-';
            boolean comment = back < start && signs[back - 1] != ':' && !item;
            return comment ? spliced(start, end(node), "  " + written) : spliced(back, end(node), " " + written);
        }
        if (node instanceof Scalar && (signs[start] == '|' || signs[start] == '>')) {
            return spliced(start, end(node), written + lineBreak());
        }
        return spliced(start, end(node), written);
    }

    private String insertedInFlow(Mapping mapping, String key, String value) {
        String entry = key + ": " + value;
        if (mapping.entries().isEmpty()) {
            return spliced(mapping.place().start(), mapping.place().end(), "{" + entry + "}");
        }
        int at = end(lastOf(mapping));
        return spliced(at, at, ", " + entry);
    }

    private String insertedLine(Mapping mapping, List<String> missing, String below, String path, String value) {
        int indent = mapping.entries().isEmpty()
                ? 0
                : mapping.entries().get(0).place().column() - 1;
        String written = missing.size() == 1 ? YamlText.value(path, value, false) : below;
        int at = mapping.entries().isEmpty() ? signs.length : end(lastOf(mapping));
        boolean afterBreak = at > 0 && signs[at - 1] == '\n';
        while (!afterBreak && at < signs.length && signs[at] != '\n' && signs[at] != '\r') {
            at++;
        }
        String line = " ".repeat(indent) + missing.get(0) + ": " + written;
        return afterBreak ? spliced(at, at, line + lineBreak()) : spliced(at, at, lineBreak() + line);
    }

    private static Node lastOf(Mapping mapping) {
        return mapping.entries().get(mapping.entries().size() - 1).value();
    }

    String remove(String path) {
        Trail trail = trail(path);
        if (!trail.isComplete() || trail.steps().get(trail.steps().size() - 1).startsWith("[")) {
            return source.text();
        }
        Mapping parent = (Mapping) trail.found().get(trail.found().size() - 2);
        Entry entry = parent.entry(trail.steps().get(trail.steps().size() - 1)).orElseThrow();
        int start = entry.place().start();
        int end = end(entry.value());
        if (isFlow(parent)) {
            return removedFromFlow(parent, start, end);
        }
        if (parent.entries().size() == 1) {
            throw refused(entry.place(), path, "is the only key here; take out the key around it instead.");
        }
        int lineEnd = end;
        while (lineEnd < signs.length && signs[lineEnd] != '\n') {
            lineEnd++;
        }
        if (text(start, lineEnd).contains("#")) {
            notes.add("The comment beside " + path + " went with it.");
        }
        int lineStart = start - (entry.place().column() - 1);
        return spliced(lineStart, end > 0 && signs[end - 1] == '\n' ? end : Math.min(signs.length, lineEnd + 1), "");
    }

    private String removedFromFlow(Mapping parent, int start, int end) {
        int after = end;
        while (after < signs.length && Character.isWhitespace(signs[after])) {
            after++;
        }
        if (after < signs.length && signs[after] == ',') {
            after++;
            while (after < signs.length && signs[after] == ' ') {
                after++;
            }
            return spliced(start, after, "");
        }
        int before = start;
        while (before > parent.place().start() + 1 && signs[before - 1] != ',') {
            before--;
        }
        return spliced(signs[before - 1] == ',' ? before - 1 : start, end, "");
    }

    private boolean isFlow(Node node) {
        int start = node.place().start();
        return !(node instanceof Scalar)
                && start >= 0
                && start < signs.length
                && (signs[start] == '{' || signs[start] == '[');
    }

    private boolean isBlock(Node node) {
        return !(node instanceof Scalar) && !isFlow(node);
    }

    /** Offset behind a node's last sign; a block ends with its last value, not with the comments behind it. */
    private int end(Node node) {
        if (isBlock(node)) {
            if (node instanceof Mapping mapping && !mapping.entries().isEmpty()) {
                return end(lastOf(mapping));
            }
            if (node instanceof Sequence sequence && !sequence.items().isEmpty()) {
                return end(sequence.items().get(sequence.items().size() - 1));
            }
        }
        return node.place().end();
    }

    private String text(int start, int end) {
        return new String(signs, start, end - start);
    }

    private String spliced(int start, int end, String between) {
        return text(0, start) + between + text(end, signs.length);
    }

    private String lineBreak() {
        return source.text().contains("\r\n") ? "\r\n" : "\n";
    }
}
