package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.files.Key;
import clipramp.files.KeyCatalogue;
import clipramp.files.Licences;
import clipramp.margins.MarginKind;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import org.junit.jupiter.api.Test;

class ExplainTest {
    @Test
    void everyKeyIsExplained() {
        for (Key key : KeyCatalogue.standard().all()) {
            CliRun run = CliRun.of("explain", key.path());
            assertThat(run.code()).as(key.path()).isZero();
            assertThat(run.out()).contains(key.path()).contains("default");
        }
    }

    @Test
    void everyMarginIsExplained() {
        for (MarginKind kind : MarginKind.values()) {
            CliRun run = CliRun.of("explain", kind.id());
            assertThat(run.code()).as(kind.id()).isZero();
            assertThat(run.out()).contains(kind.id(), kind.title());
        }
    }

    @Test
    void aPathThroughADeviceIsExplained() {
        assertThat(CliRun.of("explain", "trigger.device.standoff").out()).contains("unijunction.standoff");
    }

    @Test
    void anUnknownOneIsToldTheNearest() {
        assertThat(CliRun.of("explain", "ramp.capasitor").err()).contains("Nearest: ramp.capacitor");
        assertThat(CliRun.of("explain", "gate-peak-curent").err()).contains("Nearest: gate-peak-current");
    }

    @Test
    void theAnswerForMachinesHasTheSame() throws IOException {
        JsonNode answer = new ObjectMapper()
                .readTree(CliRun.of("explain", "clip.dropper", "--json").out());

        assertThat(answer.at("/format/name").textValue()).isEqualTo("explain");
        assertThat(answer.at("/keys/0/path").textValue()).isEqualTo("clip.dropper");
        assertThat(answer.at("/keys/0/unit").textValue()).isEqualTo("Ω");
    }

    @Test
    void theCautionsArePrintedWhole() {
        String words = CliRun.of("explain", "safety").out().replaceAll("\\s+", " ");

        assertThat(words).contains("Mains voltage kills.").contains("It says nothing about the circuit as a whole.");
    }

    @Test
    void licencesAreToldAndEachTextIsThere() {
        CliRun overview = CliRun.of("explain", "licences");
        assertThat(overview.code()).isZero();
        assertThat(overview.out()).contains("Apache-2.0", "jfreechart", "LGPL-2.1", "explain");
        for (String id : Licences.ids()) {
            assertThat(CliRun.of("explain", id).out()).as(id).isEqualTo(Licences.text(id));
        }
    }
}
