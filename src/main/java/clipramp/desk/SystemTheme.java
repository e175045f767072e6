package clipramp.desk;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.TimeUnit;

/** Asks the system whether it is dark, where it can be asked. */
final class SystemTheme {
    private static final int PATIENCE_MILLIS = 800;

    private SystemTheme() {}

    /**
     * @param system name of the operating system, as Java gives it
     */
    static boolean isDark(String system) {
        String name = system.toLowerCase(Locale.ROOT);
        if (name.contains("windows")) {
            String key = "HKCU\\Software\\Microsoft\\Windows\\CurrentVersion\\Themes\\Personalize";
            return answer(List.of("reg", "query", key, "/v", "AppsUseLightTheme"))
                    .contains("0x0");
        }
        if (name.contains("mac")) {
            return answer(List.of("defaults", "read", "-g", "AppleInterfaceStyle"))
                    .contains("Dark");
        }
        return answer(List.of("gsettings", "get", "org.gnome.desktop.interface", "color-scheme"))
                .contains("dark");
    }

    private static String answer(List<String> command) {
        try {
            Process process =
                    new ProcessBuilder(command).redirectErrorStream(true).start();
            if (!process.waitFor(PATIENCE_MILLIS, TimeUnit.MILLISECONDS)) {
                process.destroy();
                return "";
            }
            return new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            return "";
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return "";
        }
    }
}
