package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.figures.NumberTable;
import clipramp.files.Example;
import clipramp.files.ReadingsTable;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is kept between starts: settings, unsaved work, tables on the clipboard. */
class MemoryTest {
    @TempDir
    Path folder;

    private Places places() {
        return new Places(folder.resolve("config"), folder.resolve("state"));
    }

    @Test
    void foldersFollowTheXdgBaseDirectorySpecification() {
        Path home = Path.of("/home/somebody");
        assertThat(Places.of(Map.of(), home))
                .isEqualTo(new Places(home.resolve(".config/clipramp"), home.resolve(".local/state/clipramp")));
        assertThat(Places.of(Map.of("XDG_CONFIG_HOME", "/c", "XDG_STATE_HOME", "/s"), home))
                .isEqualTo(new Places(Path.of("/c/clipramp"), Path.of("/s/clipramp")));
        // "All paths set in these environment variables must be absolute", else they are ignored.
        assertThat(Places.of(Map.of("XDG_CONFIG_HOME", "c"), home).config())
                .isEqualTo(home.resolve(".config/clipramp"));
    }

    @Test
    void settingsComeBackAsTheyWere() throws IOException {
        Settings settings = Settings.FIRST
                .withLook(Settings.Look.INK)
                .withZoomPercent(150)
                .withCautionsRead()
                .withRecent(folder.resolve("a.yaml"))
                .withRecent(folder.resolve("b.yaml"))
                .withRecent(folder.resolve("a.yaml"));
        settings.save(places());
        assertThat(Settings.load(places())).isEqualTo(settings);
        assertThat(settings.recent()).containsExactly(folder.resolve("a.yaml"), folder.resolve("b.yaml"));
    }

    @Test
    void settingsThatCannotBeReadAreTheFirstStarts() throws IOException {
        assertThat(Settings.load(places())).isEqualTo(Settings.FIRST);
        Files.createDirectories(places().config());
        Files.writeString(
                places().config().resolve("desk.properties"), "zoom=9999\nlook=plaid\n\\uZZZZ", StandardCharsets.UTF_8);
        assertThat(Settings.load(places())).isEqualTo(Settings.FIRST);
    }

    @Test
    void workOfALivingProcessIsNotOfferedAndOfADeadOneIs() throws IOException {
        Recovery own = new Recovery(places(), ProcessHandle.current(), 1);
        own.keep(Optional.of(folder.resolve("mine.yaml")), "clipramp: 1\n");
        Recovery other = new Recovery(places(), ProcessHandle.current(), 2);
        assertThat(other.leftBehind()).isEmpty();
        Path unsaved = places().state().resolve("unsaved");
        // The same id with another start: the process that wrote it is gone and its id came round again.
        Files.copy(
                Files.list(unsaved).findFirst().orElseThrow(),
                unsaved.resolve(ProcessHandle.current().pid() + "-1-1.yaml"));
        List<Recovery.Left> left = other.leftBehind();
        assertThat(left).hasSize(1);
        assertThat(left.get(0).file()).hasValue(folder.resolve("mine.yaml"));
        assertThat(left.get(0).text()).isEqualTo("clipramp: 1\n");
        other.forget(left.get(0));
        assertThat(other.leftBehind()).isEmpty();
    }

    @Test
    void typedReadingsAreKeptWithTheDesignUntilTheyAreSaved() throws IOException {
        ReadingsTable typed = new ReadingsTable(
                List.of("knob (%)", "firing angle (deg)", "note"), List.of(List.of("50", "75.2", "warm, \"noon\"")));
        Recovery own = new Recovery(places(), ProcessHandle.current(), 1);
        own.follow(
                Optional.of(folder.resolve("mine.yaml")), "clipramp: 1\n# unsaved reading: says the author's remark\n");
        Path unsaved = places().state().resolve("unsaved");
        assertThat(unsaved).doesNotExist();
        own.keepReadings(Optional.of(typed));
        assertThat(unsaved).isDirectoryContaining(file -> true);
        Path left = unsaved.resolve(ProcessHandle.current().pid() + "-1-1.yaml");
        Files.copy(Files.list(unsaved).findFirst().orElseThrow(), left);
        Recovery other = new Recovery(places(), ProcessHandle.current(), 2);
        assertThat(other.leftBehind()).singleElement().satisfies(work -> {
            assertThat(work.file()).hasValue(folder.resolve("mine.yaml"));
            assertThat(work.text()).isEqualTo("clipramp: 1\n# unsaved reading: says the author's remark\n");
            assertThat(work.readings()).hasValue(typed);
        });
        own.keep(Optional.of(folder.resolve("mine.yaml")), "clipramp: 1\ntitle: changed\n");
        own.forgetDesign();
        Files.delete(left);
        assertThat(unsaved).isDirectoryContaining(file -> true);
        own.keepReadings(Optional.empty());
        assertThat(unsaved).isEmptyDirectory();
    }

    @Test
    void whatIsNoUnsavedWorkIsLeftAlone() throws IOException {
        Path unsaved = Files.createDirectories(places().state().resolve("unsaved"));
        Files.writeString(unsaved.resolve("notes.yaml"), "shopping", StandardCharsets.UTF_8);
        assertThat(new Recovery(places(), ProcessHandle.current(), 1).leftBehind())
                .isEmpty();
    }

    /** RFC 4180: CR LF, quotes doubled, a cell with a comma quoted. */
    @Test
    void tablesAreCsvAndTabbed() {
        NumberTable table =
                new NumberTable(List.of("angle °", "says"), List.of(List.of("−1.5", "a, \"b\""), List.of("–", "c")));
        assertThat(TableText.csv(table)).isEqualTo("angle °,says\r\n-1.5,\"a, \"\"b\"\"\"\r\n,c\r\n");
        assertThat(TableText.tabbed(table)).isEqualTo("angle °\tsays\n-1.5\ta, \"b\"\n\tc\n");
    }

    @Test
    void everyExampleCanBeReadAndTheCautionsAreThere() {
        for (Example example : Example.all()) {
            assertThat(example.text()).startsWith("#").contains("clipramp: 1");
        }
        assertThat(Cautions.read()).anyMatch(p -> p.heading() && p.text().equals("Measuring"));
    }
}
