package clipramp.files;

import clipramp.files.LoadedDesign.ProfileUse;
import clipramp.files.Node.Mapping;
import clipramp.files.Node.Scalar;
import clipramp.files.ProfileLibrary.Found;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Finds out what a device is: a profile's id, keys in place, or a profile with some keys changed. */
final class Devices {
    private static final int DEEPEST_LIKE = 4;
    /** The id of a device whose keys stand in the design and that has no name of its own. */
    private static final String IN_PLACE = "in place";

    private final ProfileLibrary library;
    private final Findings findings;
    private final Map<String, Found> used = new LinkedHashMap<>();

    Devices(ProfileLibrary library, Findings findings) {
        this.library = library;
        this.findings = findings;
    }

    /**
     * A device as made out.
     *
     * @param mapping its keys, profiles merged in
     * @param kind its kind; empty where it says none
     * @param id its id, or "in place"
     */
    record Device(Mapping mapping, String kind, String id) {}

    /** Every profile that was used, in the order of first use. */
    List<Found> used() {
        return List.copyOf(used.values());
    }

    List<ProfileUse> uses() {
        return used.values().stream()
                .map(f -> new ProfileUse(
                        f.id(), f.kind(), f.from(), Digest.of(f.source().text()), hides(f)))
                .toList();
    }

    private String hides(Found found) {
        return String.join(
                ", ",
                library.everywhere(found.kind(), found.id()).stream()
                        .filter(other -> !other.from().equals(found.from()))
                        .filter(other ->
                                !other.source().text().equals(found.source().text()))
                        .map(other -> other.from() + " " + other.id())
                        .toList());
    }

    /** The device at a place; empty where it cannot be made out, which has then been said. */
    Optional<Device> resolve(Node node, DevicePlace place) {
        return resolve(node, place, place.path(), List.of());
    }

    private Optional<Device> resolve(Node node, DevicePlace place, String path, List<String> chain) {
        if (node instanceof Scalar scalar) {
            return profile(scalar, place, path, chain);
        }
        if (node instanceof Mapping mapping) {
            return mapping.get("like").isPresent()
                    ? changed(mapping, place, path, chain)
                    : inPlace(mapping, place, path);
        }
        findings.problem(node.place(), path, "read a list; expected a profile's id, or its keys.");
        return Optional.empty();
    }

    private Optional<Device> inPlace(Mapping mapping, DevicePlace place, String path) {
        String kind = mapping.textOf("kind");
        if (kind.isEmpty() && place.kinds().size() == 1) {
            kind = place.kinds().get(0);
        }
        if (!kind.isEmpty() && !place.kinds().contains(kind)) {
            Place at = mapping.get("kind").orElseThrow().place();
            findings.unknown(at, path + ".kind", kind, "read \"" + kind + "\"; no such kind here", place.kinds());
            return Optional.empty();
        }
        String id = mapping.textOf("id");
        return Optional.of(new Device(mapping, kind, id.isEmpty() ? IN_PLACE : id));
    }

    private Optional<Device> changed(Mapping mapping, DevicePlace place, String path, List<String> chain) {
        Node like = mapping.get("like").orElseThrow();
        if (!(like instanceof Scalar base)) {
            findings.problem(like.place(), path + ".like", "expected a profile's id.");
            return Optional.empty();
        }
        return profile(base, place, path + ".like", chain).flatMap(found -> {
            String kind = mapping.textOf("kind");
            if (!kind.isEmpty() && !kind.equals(found.kind())) {
                findings.problem(
                        mapping.get("kind").orElseThrow().place(),
                        path + ".kind",
                        kind,
                        found.kind(),
                        "read \"" + kind + "\"; " + base.text() + " is a " + found.kind()
                                + ", and its kind is fixed. Take the key out.");
                return Optional.empty();
            }
            String id = mapping.textOf("id");
            boolean same = mapping.entries().size() == 1;
            String name = !id.isEmpty() ? id : same ? found.id() : changedName(found.id());
            return Optional.of(new Device(
                    found.mapping().overlaidBy(mapping.without("like").without("id")), found.kind(), name));
        });
    }

    static String changedName(String id) {
        return id.endsWith(", changed") ? id : id + ", changed";
    }

    private Optional<Device> profile(Scalar scalar, DevicePlace place, String path, List<String> chain) {
        String id = scalar.text();
        if (chain.contains(id) || chain.size() >= DEEPEST_LIKE) {
            refuseChain(scalar, path, chain);
            return Optional.empty();
        }
        for (String kind : place.kinds()) {
            Optional<Found> found = library.find(kind, id);
            if (found.isPresent()) {
                used.put(kind + "/" + id, found.get());
                return text(found.get(), place, path, longer(chain, id));
            }
        }
        List<Found> others = library.named(id);
        if (others.isEmpty()) {
            refuseUnknown(scalar, place, path);
        } else {
            refuseOtherKind(scalar, place, path, others.get(0).kind());
        }
        return Optional.empty();
    }

    private static List<String> longer(List<String> chain, String id) {
        List<String> longer = new ArrayList<>(chain);
        longer.add(id);
        return longer;
    }

    private void refuseChain(Scalar scalar, String path, List<String> chain) {
        String id = scalar.text();
        String why = chain.contains(id)
                ? "profiles are like each other in a circle"
                : "profiles are like one another more than " + DEEPEST_LIKE + " deep";
        findings.problem(scalar.place(), path, id, "", why + ": " + String.join(" -> ", longer(chain, id)) + ".");
    }

    private void refuseOtherKind(Scalar scalar, DevicePlace place, String path, String other) {
        String expected = String.join(" or ", place.kinds());
        String sentence =
                "read \"" + scalar.text() + "\", which is a profile of kind " + other + "; expected " + expected + ".";
        findings.problem(scalar.place(), path, scalar.text(), expected, sentence);
    }

    private void refuseUnknown(Scalar scalar, DevicePlace place, String path) {
        List<String> known =
                place.kinds().stream().flatMap(k -> library.ids(k).stream()).toList();
        List<String> near = Nearest.several(scalar.text(), known, 3);
        String hint =
                near.isEmpty() ? "No profile of this kind is there." : "Nearest: " + String.join(", ", near) + ".";
        findings.add(new Problem(
                scalar.place().file(),
                scalar.place().line(),
                scalar.place().column(),
                path,
                scalar.text(),
                "a profile's id, or its keys in braces",
                near.isEmpty() ? "" : near.get(0),
                path + ": read \"" + scalar.text() + "\"; no " + String.join(" or ", place.kinds())
                        + " profile has this id. " + hint));
    }

    private Optional<Device> text(Found found, DevicePlace place, String path, List<String> chain) {
        Optional<Mapping> tree = library.tree(found, findings);
        if (tree.isEmpty()) {
            return Optional.empty();
        }
        Mapping mapping = tree.get();
        if (!require(mapping, "kind", found.kind(), path) || !require(mapping, "id", found.id(), path)) {
            return Optional.empty();
        }
        if (mapping.get("like").isPresent()) {
            return changed(mapping, place, path, chain);
        }
        return Optional.of(new Device(mapping, found.kind(), found.id()));
    }

    private boolean require(Mapping mapping, String key, String value, String path) {
        String read = mapping.textOf(key);
        if (read.equals(value)) {
            return true;
        }
        Place at = mapping.get(key).map(Node::place).orElse(mapping.place());
        String said = read.isEmpty() ? "is missing" : "read \"" + read + "\"";
        findings.problem(
                at, path, read, value, "the profile's " + key + " " + said + "; by its file it is " + value + ".");
        return false;
    }
}
