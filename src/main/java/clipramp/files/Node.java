package clipramp.files;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A design file's tree: raw source text with its place, never YAML's own types. */
sealed interface Node {
    Place place();

    /**
     * @param text the scalar as written, quotes and folding taken off
     * @param quoted whether it stood in quotes or was a block scalar
     */
    record Scalar(String text, boolean quoted, Place place) implements Node {
        boolean isNone() {
            return text.equals("none");
        }
    }

    /** Keys in the order of the file. */
    record Mapping(List<Entry> entries, Place place) implements Node {
        public Mapping {
            entries = List.copyOf(entries);
        }

        static Mapping empty(Place place) {
            return new Mapping(List.of(), place);
        }

        Optional<Node> get(String key) {
            return entry(key).map(Entry::value);
        }

        Optional<Entry> entry(String key) {
            return entries.stream().filter(e -> e.key().equals(key)).findFirst();
        }

        String textOf(String key) {
            return get(key).map(n -> n instanceof Scalar s ? s.text() : "").orElse("");
        }

        /** Where the value of a dotted key stands, or the nearest mapping around it; the file's first line at last. */
        Place placeOf(String dotted) {
            Node here = this;
            for (String step : dotted.split("\\.", -1)) {
                Optional<Node> below = here instanceof Mapping mapping ? mapping.get(step) : Optional.empty();
                if (below.isEmpty()) {
                    break;
                }
                here = below.get();
            }
            return here == this ? Place.of(place.file(), 1, 1) : here.place();
        }

        Mapping with(String key, Node value) {
            List<Entry> changed = new ArrayList<>();
            boolean replaced = false;
            for (Entry entry : entries) {
                boolean same = entry.key().equals(key);
                changed.add(same ? new Entry(key, entry.place(), value) : entry);
                replaced |= same;
            }
            if (!replaced) {
                changed.add(new Entry(key, value.place(), value));
            }
            return new Mapping(changed, place);
        }

        Mapping without(String key) {
            return new Mapping(
                    entries.stream().filter(e -> !e.key().equals(key)).toList(), place);
        }

        /** This mapping with another laid over it: mappings merge key by key, everything else replaces. */
        Mapping overlaidBy(Mapping other) {
            Mapping merged = new Mapping(entries, other.place);
            for (Entry entry : other.entries) {
                Node below = get(entry.key()).orElse(entry.value());
                Node value = below instanceof Mapping b && entry.value() instanceof Mapping o
                        ? b.overlaidBy(o)
                        : entry.value();
                merged = merged.without(entry.key()).withEntry(new Entry(entry.key(), entry.place(), value));
            }
            return merged;
        }

        private Mapping withEntry(Entry entry) {
            List<Entry> longer = new ArrayList<>(entries);
            longer.add(entry);
            return new Mapping(longer, place);
        }
    }

    /**
     * @param key the key as written
     * @param place the key's place
     * @param value its value
     */
    record Entry(String key, Place place, Node value) {}

    /** A list. */
    record Sequence(List<Node> items, Place place) implements Node {
        public Sequence {
            items = List.copyOf(items);
        }
    }
}
