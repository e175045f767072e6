package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class FitWatchTest {
    private static String told(boolean interactive, long quietMillis) throws InterruptedException {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Terminal terminal = new Terminal(
                new ByteArrayInputStream(new byte[0]), err, err, Map.of(), interactive, StandardCharsets.UTF_8);
        Output output = new Output(err, StandardCharsets.UTF_8, false);
        Session session = new Session(terminal, output, output, false, Optional.empty());
        try (FitWatch watch = new FitWatch(session, quietMillis)) {
            watch.progress(3, 4);
            for (int i = 0; i < 500 && interactive && quietMillis == 0 && err.size() == 0; i++) {
                Thread.sleep(10);
            }
        }
        output.flush();
        return err.toString(StandardCharsets.UTF_8);
    }

    @Test
    void aTerminalIsToldAndTheLineIsWiped() throws InterruptedException {
        assertThat(told(true, 0)).contains("fitting: 3 made, ").endsWith("\r");
    }

    @Test
    void whatIsOverSoonSaysNothing() throws InterruptedException {
        assertThat(told(true, 60_000)).isEmpty();
    }

    @Test
    void aPipeIsToldNothing() throws InterruptedException {
        assertThat(told(false, 0)).isEmpty();
    }
}
