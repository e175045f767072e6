package clipramp.files;

import clipramp.files.Devices.Device;
import clipramp.files.Node.Entry;
import clipramp.files.Node.Mapping;
import clipramp.files.Node.Scalar;
import clipramp.files.Node.Sequence;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Applies {@code path=value} to a design's tree before it is read. */
final class Overrides {
    private static final Pattern STEP = Pattern.compile("([^.\\[\\]]+)((?:\\[\\d{1,4}])*)");

    private final Devices devices;
    private final Findings findings;

    Overrides(Devices devices, Findings findings) {
        this.devices = devices;
        this.findings = findings;
    }

    Mapping apply(Mapping tree, List<String> overrides) {
        Mapping changed = tree;
        for (String override : overrides) {
            int equals = override.indexOf('=');
            String path = equals < 0
                    ? override.strip()
                    : override.substring(0, equals).strip();
            String text = equals < 0 ? "" : override.substring(equals + 1).strip();
            if (equals <= 0 || text.isEmpty()) {
                findings.problem(
                        Place.override(),
                        path,
                        override,
                        "key=value",
                        "read \"" + override + "\"; expected key=value, such as ramp.capacitor=220 nF.");
                continue;
            }
            Optional<List<String>> steps = steps(path);
            Optional<Node> value = steps.isPresent() ? value(path, text) : Optional.empty();
            if (value.isPresent()) {
                int before = findings.count();
                Mapping next = (Mapping) set(changed, steps.orElseThrow(), 0, value.get());
                changed = findings.count() == before ? next : changed;
            }
        }
        return changed;
    }

    /** The steps of a path: names, and list indices as digits. */
    private Optional<List<String>> steps(String path) {
        List<String> steps = new ArrayList<>();
        for (String part : path.split("\\.", -1)) {
            Matcher step = STEP.matcher(part);
            if (!step.matches()) {
                findings.problem(
                        Place.override(), path, "is no key. Write names with dots, and [0] for the first of a list.");
                return Optional.empty();
            }
            steps.add(step.group(1));
            Arrays.stream(step.group(2).split("[\\[\\]]+"))
                    .filter(s -> !s.isEmpty())
                    .forEach(index -> steps.add("[" + index));
        }
        return Optional.of(steps);
    }

    private Optional<Node> value(String path, String text) {
        if (!text.startsWith("{") && !text.startsWith("[")) {
            return Optional.of(new Scalar(text, false, Place.override()));
        }
        Findings own = new Findings();
        Optional<Node> node = YamlTree.node(new Source("--with", text), own);
        own.problems().forEach(p -> findings.problem(Place.override(), path, p.message()));
        return own.hasProblems() ? Optional.empty() : node.map(Overrides::placed);
    }

    /** The same node without lines, which an option does not have. */
    private static Node placed(Node node) {
        if (node instanceof Mapping mapping) {
            return new Mapping(
                    mapping.entries().stream()
                            .map(e -> new Entry(e.key(), Place.override(), placed(e.value())))
                            .toList(),
                    Place.override());
        }
        if (node instanceof Sequence sequence) {
            return new Sequence(sequence.items().stream().map(Overrides::placed).toList(), Place.override());
        }
        return new Scalar(((Scalar) node).text(), ((Scalar) node).quoted(), Place.override());
    }

    private Node set(Node node, List<String> steps, int depth, Node value) {
        if (depth == steps.size()) {
            return value;
        }
        String step = steps.get(depth);
        boolean last = depth == steps.size() - 1;
        if (step.startsWith("[")) {
            return setItem(node, steps, depth, value, last);
        }
        Mapping mapping = asMapping(node, steps, depth);
        if (last && isRemoval(value) && !keepsNone(keyOf(steps))) {
            return mapping.without(step);
        }
        Node below = mapping.get(step).orElse(Mapping.empty(Place.override()));
        return with(mapping, step, set(below, steps, depth + 1, value));
    }

    private static Mapping with(Mapping mapping, String key, Node value) {
        List<Entry> entries = new ArrayList<>(mapping.without(key).entries());
        entries.add(new Entry(key, Place.override(), value));
        return new Mapping(entries, mapping.place());
    }

    private static boolean isRemoval(Node value) {
        return value instanceof Scalar s && s.isNone();
    }

    /** Where "none" is itself a word of the key, or the key may be none, it stays and is not assumed. */
    static boolean keepsNone(String path) {
        return KeyCatalogue.standard()
                .find(path)
                .filter(k -> k.words().contains("none") || k.need() == Key.Need.OPTIONAL)
                .isPresent();
    }

    private static String keyOf(List<String> steps) {
        return String.join(".", steps.stream().filter(s -> !s.startsWith("[")).toList());
    }

    private Node setItem(Node node, List<String> steps, int depth, Node value, boolean last) {
        int index = Integer.parseInt(steps.get(depth).substring(1));
        String path = join(steps.subList(0, depth + 1));
        List<Node> items = new ArrayList<>(node instanceof Sequence sequence ? sequence.items() : List.of());
        if (index >= items.size()) {
            findings.problem(
                    Place.override(),
                    path,
                    items.isEmpty()
                            ? "there is no list here."
                            : "the list has " + items.size() + " items, counted from 0.");
            return node;
        }
        if (last && isRemoval(value)) {
            items.remove(index);
        } else {
            items.set(index, set(items.get(index), steps, depth + 1, value));
        }
        return new Sequence(items, node.place());
    }

    /** What a path goes on into: a mapping; a profile's id becomes the profile's own keys. */
    private Mapping asMapping(Node node, List<String> steps, int depth) {
        String path = join(steps.subList(0, depth));
        Optional<DevicePlace> place = Arrays.stream(DevicePlace.values())
                .filter(p -> p.path().equals(path))
                .findFirst();
        boolean profile = (node instanceof Scalar s && !s.isNone())
                || (node instanceof Mapping m && m.get("like").isPresent());
        if (place.isPresent() && profile) {
            return devices.resolve(node, place.get()).map(Overrides::spelledOut).orElse(Mapping.empty(node.place()));
        }
        return node instanceof Mapping mapping ? mapping : Mapping.empty(Place.override());
    }

    private static Mapping spelledOut(Device device) {
        Place place = device.mapping().place();
        Scalar id = new Scalar(Devices.changedName(device.id()), true, place);
        return device.mapping().without("like").with("id", id).with("kind", new Scalar(device.kind(), true, place));
    }

    private static String join(List<String> steps) {
        StringBuilder path = new StringBuilder();
        for (String step : steps) {
            path.append(step.startsWith("[") ? step + "]" : (path.isEmpty() ? "" : ".") + step);
        }
        return path.toString();
    }
}
