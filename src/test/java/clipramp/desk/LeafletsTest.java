package clipramp.desk;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import javafx.scene.Node;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What the Help menu shows. */
class LeafletsTest {
    @TempDir
    Path home;

    @Test
    void licencesAreOneClickAwayAndEachTextAnother() {
        try (Harness window = Harness.start(home)) {
            window.menu("Help", "Licences");
            Node dialog = window.find("#dialog-licences", Node.class);
            assertThat(Texts.of(dialog)).contains("Apache License, Version 2.0", "jfreechart", "javafx-controls");

            window.press("#licence-LGPL-2-1");
            assertThat(Texts.of(window.find("#dialog-licence", Node.class)))
                    .contains("GNU LESSER GENERAL PUBLIC LICENSE");
        }
    }
}
