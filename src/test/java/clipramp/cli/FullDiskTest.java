package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** A disk that takes no more, as Linux words it. */
class FullDiskTest {
    private static final IOException FULL = new IOException("No space left on device");

    private final ByteArrayOutputStream complaints = new ByteArrayOutputStream();
    private final Terminal terminal = new Terminal(
            new ByteArrayInputStream(new byte[0]),
            new OutputStream() {
                @Override
                public void write(int b) throws IOException {
                    throw FULL;
                }
            },
            complaints,
            Map.of(),
            false,
            StandardCharsets.UTF_8);

    @Test
    void aLongAnswerThatDoesNotFitIsToldOnce() {
        int code = Cli.run(new String[] {"explain", "LGPL-2.1"}, terminal, Optional.empty());

        assertThat(code).isEqualTo(4);
        assertThat(complaints.toString(StandardCharsets.UTF_8).lines())
                .containsExactly("clipramp: the answer cannot be written: No space left on device.");
    }

    @Test
    void fontsThatCannotBeUnpackedAreNoFaultOfTheProgram() {
        Output err = new Output(complaints, StandardCharsets.UTF_8, false);
        int code = new Failures(new Session(terminal, err, err, false, Optional.empty()), List.of()).guard(() -> {
            throw new ExceptionInInitializerError(new UncheckedIOException("the fonts cannot be unpacked", FULL));
        });
        err.flush();

        assertThat(code).isEqualTo(4);
        assertThat(complaints.toString(StandardCharsets.UTF_8)).contains("the fonts cannot be unpacked");
    }
}
