package clipramp.desk;

import clipramp.desk.model.Places;
import com.sun.javafx.tk.RenderJob;
import com.sun.javafx.tk.Toolkit;
import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import javafx.application.Platform;
import javafx.stage.Stage;

/** From the start of the process to the first painted window: {@code StartSpeed}. */
public final class StartSpeed {
    private StartSpeed() {}

    public static void main(String[] arguments) throws IOException {
        Path home = Files.createTempDirectory("start");
        Platform.setImplicitExit(false);
        Platform.startup(() -> {
            Theme.loadFonts();
            Places places = new Places(home.resolve("config"), home.resolve("state"));
            new Desk.Setup(places, Map.of(), home, stage -> new Harness.ToldAsk())
                    .show(new Stage(), Optional.empty(), () -> {});
            Platform.runLater(() ->
                    Platform.runLater(() -> Toolkit.getToolkit().addRenderJob(new RenderJob(StartSpeed::painted))));
        });
    }

    private static void painted() {
        long millis = ManagementFactory.getRuntimeMXBean().getUptime();
        Duration processor = ProcessHandle.current().info().totalCpuDuration().orElse(Duration.ZERO);
        System.out.printf(Locale.ROOT, "painted after %d ms, %d ms of processor%n", millis, processor.toMillis());
        System.exit(0);
    }
}
