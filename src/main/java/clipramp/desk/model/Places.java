package clipramp.desk.model;

import java.nio.file.Path;
import java.util.Map;

/**
 * Where the window keeps what it remembers.
 *
 * @param config settings and recent files
 * @param state work that may have to be recovered
 */
public record Places(Path config, Path state) {
    private static final String NAME = "clipramp";

    /**
     * Folders by the XDG Base Directory Specification; on Windows under APPDATA and LOCALAPPDATA.
     *
     * @param environment the process's environment
     * @param home the user's home folder
     */
    public static Places of(Map<String, String> environment, Path home) {
        return new Places(
                folder(environment, "XDG_CONFIG_HOME", "APPDATA", home.resolve(".config")),
                folder(
                        environment,
                        "XDG_STATE_HOME",
                        "LOCALAPPDATA",
                        home.resolve(".local").resolve("state")));
    }

    private static Path folder(Map<String, String> environment, String xdg, String windows, Path otherwise) {
        String named = environment.getOrDefault(xdg, "");
        if (!named.isEmpty() && Path.of(named).isAbsolute()) {
            return Path.of(named, NAME);
        }
        String roaming = environment.getOrDefault(windows, "");
        return roaming.isEmpty() ? otherwise.resolve(NAME) : Path.of(roaming, NAME);
    }
}
