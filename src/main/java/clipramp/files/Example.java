package clipramp.files;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;

/**
 * A design that comes with the program.
 *
 * @param id its file's name without ending
 * @param title what it is
 * @param about what there is to see
 */
public record Example(String id, String title, String about) {
    private static final List<Example> ALL = List.of(
            new Example("drying-cabinet", "Drying cabinet", "700 W heater, one SCR behind a bridge; everything works"),
            new Example("shed-heater", "Shed heater", "400 W on a triac, timed by a small transformer's winding"),
            new Example("upper-heaters", "Upper heaters", "two SCRs in inverse parallel on a pulse transformer"),
            new Example("seed-drawer", "Seed drawer", "5 W at 24 V with a programmable unijunction"),
            new Example("tray-lamp", "Sorting tray", "10 W from a 24 V transformer, half-wave"),
            new Example(
                    "tray-lamp-programmable",
                    "Sorting tray, carried over",
                    "the same lamp with a programmable unijunction"),
            new Example("store-fan", "Store fan", "an inductive load on a triac, its train of pulses latching it"),
            new Example(
                    "store-fan-narrow-pulse",
                    "Store fan, narrow pulse",
                    "the same fan before: pulses too short to latch"),
            new Example("tasting-lamps", "Tasting lamps", "filament lamps, dimmed"),
            new Example("cabinet-gone-wrong", "Cabinet gone wrong", "a bad design: look for the margins that fail"));

    /** All of them, the plain one first. */
    public static List<Example> all() {
        return ALL;
    }

    /** The one of an id; empty where there is none. */
    public static Optional<Example> named(String id) {
        return ALL.stream().filter(example -> example.id().equals(id)).findFirst();
    }

    /** The design file's text. */
    public String text() {
        try (InputStream in = Example.class.getResourceAsStream("/clipramp/examples/" + id + ".yaml")) {
            if (in == null) {
                throw new IllegalStateException("the program's own example " + id + " is missing");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
