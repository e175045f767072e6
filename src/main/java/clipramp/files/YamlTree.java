package clipramp.files;

import clipramp.files.Node.Entry;
import clipramp.files.Node.Mapping;
import clipramp.files.Node.Scalar;
import clipramp.files.Node.Sequence;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.dataformat.yaml.YAMLFactory;
import com.fasterxml.jackson.dataformat.yaml.YAMLParser;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * Reads the YAML subset of design files into a tree of raw source text. Duplicate keys, anchors, aliases, tags, second
 * documents, empty values, tabs and deep nesting are refused.
 */
final class YamlTree {
    private static final int DEEPEST = 12;
    private static final YAMLFactory FACTORY = new YAMLFactory();

    private final Source source;
    private final Findings findings;
    private final int[] codePoints;
    private final YAMLParser parser;

    private YamlTree(Source source, Findings findings, YAMLParser parser) {
        this.source = source;
        this.findings = findings;
        this.parser = parser;
        codePoints = source.text().codePoints().toArray();
    }

    /** The document's mapping; empty where a problem was found that leaves nothing to read. */
    static Optional<Mapping> read(Source source, Findings findings) {
        if (source.text().length() > Source.LARGEST_BYTES) {
            findings.problem(
                    Place.of(source.name(), 0, 0), "", "the text is larger than 1 MiB, which no design needs.");
            return Optional.empty();
        }
        if (YamlWords.refuseSigns(source, findings)) {
            return Optional.empty();
        }
        return node(source, findings).flatMap(node -> {
            if (node instanceof Mapping mapping) {
                return Optional.of(mapping);
            }
            findings.problem(
                    Place.of(source.name(), node.place().line(), node.place().column()),
                    "",
                    "a design begins with keys, such as \"clipramp: 1\", each on its own line.");
            return Optional.empty();
        });
    }

    /** Any node: a whole document's, or an override's value. */
    static Optional<Node> node(Source source, Findings findings) {
        try (YAMLParser parser = FACTORY.createParser(source.text())) {
            return new YamlTree(source, findings, parser).document();
        } catch (JsonProcessingException e) {
            YamlWords.translate(e, source, findings);
        } catch (IOException | RuntimeException e) {
            findings.problem(Place.of(source.name(), 1, 1), "", "the text cannot be read as YAML.");
        }
        return Optional.empty();
    }

    private Optional<Node> document() throws IOException {
        JsonToken first = parser.nextToken();
        if (first == null) {
            findings.problem(
                    Place.of(source.name(), 1, 1), "", "the file is empty; a design begins with \"clipramp: 1\".");
            return Optional.empty();
        }
        Optional<Node> node = value("", 1);
        if (node.isPresent() && parser.nextToken() != null) {
            findings.problem(
                    placeOfToken(), "", "a second document begins here; a file holds one design. Take the rest out.");
        }
        return node;
    }

    /** The value at the current token; empty where the rest of the document has to be given up. */
    private Optional<Node> value(String path, int depth) throws IOException {
        Place place = placeOfToken();
        if (depth > DEEPEST) {
            findings.problem(place, path, "nested deeper than " + DEEPEST + " levels, which no design is.");
            return Optional.empty();
        }
        refuseMarks(place, path);
        JsonToken token = parser.currentToken();
        if (token == JsonToken.START_OBJECT) {
            return mapping(path, place, depth);
        }
        if (token == JsonToken.START_ARRAY) {
            return sequence(path, place, depth);
        }
        return Optional.of(scalar(place));
    }

    private Scalar scalar(Place place) throws IOException {
        int sign = signAt(place.start());
        boolean quoted = sign == '"' || sign == '\'' || sign == '|' || sign == '>';
        String text = parser.getText();
        return new Scalar(text == null ? "" : text.strip(), quoted, place);
    }

    private Optional<Node> mapping(String path, Place place, int depth) throws IOException {
        List<Entry> entries = new ArrayList<>();
        Set<String> seen = new HashSet<>();
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            Place keyPlace = placeOfToken();
            String key = parser.currentName();
            String keyPath = path.isEmpty() ? key : path + "." + key;
            refuseMarks(keyPlace, keyPath);
            parser.nextToken();
            Optional<Node> value = value(keyPath, depth + 1);
            if (value.isEmpty()) {
                return Optional.empty();
            }
            if (!seen.add(key)) {
                findings.problem(keyPlace, keyPath, "the key stands twice in one mapping. Keep one of them.");
            } else if (isEmpty(value.get())) {
                refuseEmpty(entries, key, keyPlace, keyPath);
            } else {
                entries.add(new Entry(key, keyPlace, value.get()));
            }
        }
        return Optional.of(new Mapping(entries, closed(place)));
    }

    /** An empty value, or the second half of a comma decimal between braces. */
    private void refuseEmpty(List<Entry> before, String key, Place keyPlace, String keyPath) {
        if (!before.isEmpty() && Character.isDigit(key.isEmpty() ? ' ' : key.charAt(0))) {
            Entry last = before.get(before.size() - 1);
            if (last.value() instanceof Scalar s && s.text().matches("[+-]?\\d+")) {
                String read = s.text() + "," + key;
                int dot = keyPath.lastIndexOf('.', Math.max(0, keyPath.length() - key.length() - 1));
                String path = (dot < 0 ? "" : keyPath.substring(0, dot) + ".") + last.key();
                findings.problem(
                        s.place(),
                        path,
                        read,
                        "a dot",
                        "read \"" + read + "\"; decimals take a dot: " + s.text() + "." + key + "?");
                before.set(
                        before.size() - 1,
                        new Entry(last.key(), last.place(), new Scalar(s.text() + "." + key, false, s.place())));
                return;
            }
        }
        findings.problem(keyPlace, keyPath, "has no value. Write none, or take the key out.");
    }

    private Optional<Node> sequence(String path, Place place, int depth) throws IOException {
        List<Node> items = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            if (parser.currentToken() == null) {
                return Optional.empty();
            }
            String itemPath = path + "[" + items.size() + "]";
            Optional<Node> item = value(itemPath, depth + 1);
            if (item.isEmpty()) {
                return Optional.empty();
            }
            if (isEmpty(item.get())) {
                findings.problem(item.get().place(), itemPath, "has no value. Take the empty item out.");
            }
            items.add(item.get());
        }
        return Optional.of(new Sequence(items, closed(place)));
    }

    private static boolean isEmpty(Node node) {
        return node instanceof Scalar s && s.text().isEmpty() && !s.quoted();
    }

    /** Anchors, aliases and tags show in the source, whatever becomes of them. */
    private void refuseMarks(Place place, String path) throws IOException {
        int sign = signAt(place.start());
        if (parser.isCurrentAlias() || sign == '*') {
            findings.problem(place, path, "aliases (*) are not taken. Write the value out.");
        } else if (sign == '&') {
            findings.problem(place, path, "anchors (&) are not taken. Write the value out where it is needed.");
        } else if (sign == '!') {
            findings.problem(place, path, "tags (!) are not taken. Leave the tag out; every value is its text.");
        }
    }

    private int signAt(int offset) {
        return offset >= 0 && offset < codePoints.length ? codePoints[offset] : -1;
    }

    private Place placeOfToken() {
        JsonLocation from = parser.currentTokenLocation();
        JsonLocation to = parser.currentLocation();
        return new Place(source.name(), from.getLineNr(), from.getColumnNr(), (int) from.getCharOffset(), (int)
                to.getCharOffset());
    }

    private Place closed(Place open) {
        return new Place(open.file(), open.line(), open.column(), open.start(), (int)
                parser.currentLocation().getCharOffset());
    }
}
