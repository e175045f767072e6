package clipramp.files;

import clipramp.files.Node.Entry;
import clipramp.files.Node.Mapping;
import clipramp.files.Node.Scalar;
import clipramp.files.Node.Sequence;
import clipramp.files.ProfileLibrary.Found;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A profile as people look at it: every figure as written, with where it comes from.
 *
 * @param id its id
 * @param kind its kind
 * @param from where it was found
 * @param digest SHA-256 of its text, hexadecimal
 * @param like the profile that it changes; empty where it stands alone
 * @param figures every figure, in the order of the file
 */
public record Profile(String id, String kind, String from, String digest, String like, List<Figure> figures) {
    /**
     * One figure.
     *
     * @param key key within the profile, such as valley.current
     * @param text as written, such as {min: 8 mA, typ: 10 mA, max: 18 mA}
     * @param source where it comes from
     */
    public record Figure(String key, String text, String source) {}

    /** Keeps the figures as they are. */
    public Profile {
        figures = List.copyOf(figures);
    }

    /**
     * Reads a profile for looking at; its figures are judged where a design uses them.
     *
     * @throws InvalidInputException where it is no YAML of ours
     */
    public static Profile read(Found found) {
        Findings findings = new Findings();
        Mapping tree = YamlTree.read(found.source(), findings).orElse(null);
        if (tree != null) {
            Version.check(tree, findings);
        }
        findings.throwIfAny();
        if (tree == null) {
            throw new IllegalStateException("a profile without a tree has problems");
        }
        Map<String, String> sources = new LinkedHashMap<>();
        if (tree.get("sources").orElse(null) instanceof Mapping mapping) {
            flatten(mapping, "", sources);
        }
        List<Figure> figures = new ArrayList<>();
        collect(tree, "", sources, figures);
        return new Profile(
                found.id(), found.kind(), found.from(), Digest.of(found.source().text()), tree.textOf("like"), figures);
    }

    private static void flatten(Mapping mapping, String prefix, Map<String, String> sources) {
        for (Entry entry : mapping.entries()) {
            if (entry.value() instanceof Scalar scalar) {
                sources.put(prefix + entry.key(), scalar.text());
            } else if (entry.value() instanceof Mapping below) {
                flatten(below, prefix + entry.key() + ".", sources);
            }
        }
    }

    private static void collect(Mapping mapping, String prefix, Map<String, String> sources, List<Figure> figures) {
        for (Entry entry : mapping.entries()) {
            String key = prefix + entry.key();
            if (prefix.isEmpty()
                    && List.of("clipramp", "kind", "id", "like", "sources").contains(key)) {
                continue;
            }
            if (entry.value() instanceof Mapping below && !isSpread(below)) {
                collect(below, key + ".", sources, figures);
            } else {
                figures.add(new Figure(key, text(entry.value()), source(key, sources)));
            }
        }
    }

    private static boolean isSpread(Mapping mapping) {
        return mapping.entries().stream()
                .allMatch(e -> List.of("min", "typ", "max").contains(e.key()));
    }

    /** The source of a key, or of the nearest key around it that names one, or the default's. */
    private static String source(String key, Map<String, String> sources) {
        String around = key;
        while (!around.isEmpty()) {
            String said = sources.get(around);
            if (said != null) {
                return said;
            }
            around = around.contains(".") ? around.substring(0, around.lastIndexOf('.')) : "";
        }
        return sources.getOrDefault("default", "not stated");
    }

    private static String text(Node node) {
        if (node instanceof Mapping mapping) {
            return "{"
                    + String.join(
                            ", ",
                            mapping.entries().stream()
                                    .map(e -> e.key() + ": " + text(e.value()))
                                    .toList())
                    + "}";
        }
        if (node instanceof Sequence sequence) {
            return "["
                    + String.join(
                            ", ", sequence.items().stream().map(Profile::text).toList()) + "]";
        }
        return ((Scalar) node).text();
    }
}
