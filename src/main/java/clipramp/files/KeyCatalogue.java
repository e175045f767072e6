package clipramp.files;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * Every key of design files and profiles, once. The reader takes windows, defaults and known names from it; what
 * {@code explain} and the README's table say is made of it too.
 */
public final class KeyCatalogue {
    private static final KeyCatalogue STANDARD = new KeyCatalogue(
            Stream.concat(DesignKeys.all().stream(), DeviceKeys.all().stream()).toList());

    private final Map<String, Key> byPath = new LinkedHashMap<>();
    private final Map<String, List<String>> under = new LinkedHashMap<>();

    private KeyCatalogue(List<Key> keys) {
        for (Key key : keys) {
            if (byPath.put(key.path(), key) != null) {
                throw new IllegalStateException("a key stands twice in the catalogue: " + key.path());
            }
            int dot = key.path().lastIndexOf('.');
            if (dot >= 0 || !DevicePlace.isKind(key.path())) {
                String around = dot < 0 ? "" : key.path().substring(0, dot);
                under.computeIfAbsent(around, p -> new ArrayList<>()).add(key.name());
            }
        }
    }

    /** The catalogue of format version 1. */
    public static KeyCatalogue standard() {
        return STANDARD;
    }

    /** All keys, in the order in which a design is written, then each kind of device. */
    public List<Key> all() {
        return List.copyOf(byPath.values());
    }

    /** A key by its whole path, such as clip.dropper or unijunction.standoff; list indices in it do not count. */
    public Optional<Key> find(String path) {
        String plain = path.indexOf('[') < 0 ? path : path.replaceAll("\\[\\d+]", "");
        return Optional.ofNullable(byPath.get(plain));
    }

    /**
     * Keys that a person may mean: the whole path; a path through a device, such as trigger.device.standoff; or the last
     * part alone, such as standoff.
     *
     * @return all that fit; empty where nothing does
     */
    public List<Key> meant(String words) {
        String plain = words.strip().replaceAll("\\[\\d+]", "");
        Optional<Key> exact = find(plain);
        if (exact.isPresent()) {
            return List.of(exact.get());
        }
        for (DevicePlace place : DevicePlace.values()) {
            if (plain.startsWith(place.path() + ".")) {
                String own = plain.substring(place.path().length() + 1);
                return place.kinds().stream()
                        .flatMap(kind -> find(kind + "." + own).stream())
                        .toList();
            }
        }
        return byPath.values().stream()
                .filter(k -> k.path().endsWith("." + plain))
                .toList();
    }

    Key require(String path) {
        return find(path).orElseThrow(() -> new IllegalStateException("no such key in the catalogue: " + path));
    }

    /** Names directly under a path. */
    List<String> namesUnder(String path) {
        return under.getOrDefault(path, List.of());
    }
}
