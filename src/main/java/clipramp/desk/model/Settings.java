package clipramp.desk.model;

import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Properties;

/**
 * What the window remembers between starts.
 *
 * @param look which palette
 * @param zoomPercent 100..200
 * @param cautionsRead whether the safety cautions were closed once
 * @param recent files opened or saved, newest first
 */
public record Settings(Look look, int zoomPercent, boolean cautionsRead, List<Path> recent) {
    /** Which palette the window takes. */
    public enum Look {
        /** As the system has it, where it can be asked. */
        SYSTEM,
        /** Dark on light. */
        PAPER,
        /** Light on dark. */
        INK
    }

    /** Least zoom, per cent. */
    public static final int LEAST_ZOOM = 100;
    /** Greatest zoom, per cent. */
    public static final int MOST_ZOOM = 200;
    /** What holds on the first start. */
    public static final Settings FIRST = new Settings(Look.SYSTEM, LEAST_ZOOM, false, List.of());

    private static final String FILE = "desk.properties";
    private static final int MOST_RECENT = 8;

    /** Keeps the zoom within its limits. */
    public Settings {
        zoomPercent = Math.max(LEAST_ZOOM, Math.min(MOST_ZOOM, zoomPercent));
        recent = List.copyOf(recent);
    }

    /** The same with another palette. */
    public Settings withLook(Look other) {
        return new Settings(other, zoomPercent, cautionsRead, recent);
    }

    /** The same at another zoom, kept within its limits. */
    public Settings withZoomPercent(int percent) {
        return new Settings(look, percent, cautionsRead, recent);
    }

    /** The same with the safety cautions closed. */
    public Settings withCautionsRead() {
        return new Settings(look, zoomPercent, true, recent);
    }

    /** With a file at the head of the recent ones. */
    public Settings withRecent(Path file) {
        List<Path> files = new ArrayList<>();
        files.add(file.toAbsolutePath().normalize());
        recent.stream().filter(f -> !f.equals(files.get(0))).forEach(files::add);
        return new Settings(look, zoomPercent, cautionsRead, files.subList(0, Math.min(MOST_RECENT, files.size())));
    }

    /** Reads them; the first start's where there are none or they cannot be read. */
    public static Settings load(Places places) {
        Properties kept = new Properties();
        try (Reader in = Files.newBufferedReader(places.config().resolve(FILE), StandardCharsets.UTF_8)) {
            kept.load(in);
        } catch (IOException | IllegalArgumentException e) {
            return FIRST;
        }
        List<Path> recent = new ArrayList<>();
        for (int i = 0; i < MOST_RECENT; i++) {
            String file = kept.getProperty("recent." + i, "");
            if (!file.isEmpty()) {
                recent.add(Path.of(file));
            }
        }
        return new Settings(
                look(kept.getProperty("look", "")),
                number(kept.getProperty("zoom", "")),
                Boolean.parseBoolean(kept.getProperty("cautions-read", "false")),
                recent);
    }

    private static Look look(String word) {
        for (Look look : Look.values()) {
            if (look.name().toLowerCase(Locale.ROOT).equals(word)) {
                return look;
            }
        }
        return Look.SYSTEM;
    }

    private static int number(String text) {
        return text.matches("\\d{1,4}") ? Integer.parseInt(text) : LEAST_ZOOM;
    }

    /**
     * Writes them, whole or not at all.
     *
     * @throws IOException where they cannot be written
     */
    public void save(Places places) throws IOException {
        Properties kept = new Properties();
        kept.setProperty("look", look.name().toLowerCase(Locale.ROOT));
        kept.setProperty("zoom", Integer.toString(zoomPercent));
        kept.setProperty("cautions-read", Boolean.toString(cautionsRead));
        for (int i = 0; i < recent.size(); i++) {
            kept.setProperty("recent." + i, recent.get(i).toString());
        }
        Files.createDirectories(places.config());
        Path beside = Files.createTempFile(places.config(), "desk", ".part");
        try (Writer out = Files.newBufferedWriter(beside, StandardCharsets.UTF_8)) {
            kept.store(out, null);
        }
        Files.move(beside, places.config().resolve(FILE), StandardCopyOption.REPLACE_EXISTING);
    }
}
