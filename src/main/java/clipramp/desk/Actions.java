package clipramp.desk;

import clipramp.desk.model.Recovery;
import clipramp.desk.model.Resized;
import clipramp.desk.model.Settings;
import clipramp.desk.model.ViewCondition;
import clipramp.desk.model.Wish;
import clipramp.files.Example;
import clipramp.files.ReadingsTable;
import java.nio.file.Path;
import java.util.function.Consumer;

/** What the user can ask of the window, from menus, keys and pages alike. */
interface Actions {
    void startNew();

    void propose(Wish wish, boolean entering);

    /** Asks for a file of readings and takes it apart. */
    void openReadings(Consumer<ReadingsTable> then);

    void saveReadings(ReadingsTable table);

    /** Takes a proposed design over and shows a page of it. */
    void takeProposal(Resized found, Page page);

    void changeAnswers();

    void giveUpNew();

    void open();

    void openFile(Path file);

    void openExample(Example example);

    void recover(Recovery.Left work);

    void forget(Recovery.Left work);

    void save();

    void saveAs();

    void saveRecord();

    void undo();

    void redo();

    void showCautions();

    void showShortcuts();

    void showLicences();

    void showAbout();

    void showNumbers(Shown what);

    void copyPicture(Shown what);

    void copyTable(Shown what);

    void export(Shown what, FileAsk.Kind kind);

    void showPage(Page page);

    void zoomBy(int percent);

    void zoomTo(int percent);

    void setLook(Settings.Look look);

    void setCondition(ViewCondition condition);

    void zoomPulse();

    void close();

    /** A figure on the bench. */
    enum Shown {
        LANES("lanes"),
        KNOB("power curve"),
        CIRCUIT("circuit"),
        LINE("line current");

        private final String words;

        Shown(String words) {
            this.words = words;
        }

        String words() {
            return words;
        }
    }

    /** The pages of a window with a design, in the order of their tabs; Ctrl and a digit bring one up. */
    enum Page {
        BENCH("Bench", 1),
        LINE("Line current", 6),
        FAULTS("Faults", 7),
        SPREAD("Spread", 3),
        SIZE("Size", 4),
        FIT("Fit", 5),
        RECORD("Record", 2);

        private final String words;
        private final int digit;

        Page(String words, int digit) {
            this.words = words;
            this.digit = digit;
        }

        String words() {
            return words;
        }

        int digit() {
            return digit;
        }
    }
}
