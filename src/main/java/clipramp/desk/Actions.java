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

    /** Asks where to save readings; {@code then} runs once they are saved. */
    void saveReadings(ReadingsTable table, Runnable then);

    /** Asks whether readings that are in no file give way to others, and goes on if they do. */
    void replaceReadings(Runnable then);

    /** Asks whether readings that are in no file are saved first, and goes on unless the user would rather go back. */
    void leaveReadings(Runnable save, Runnable then);

    /** Takes a file that was dropped on the window: readings onto the Fit page, anything else as a design. */
    void takeFile(Path file);

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
        BENCH("_Bench"),
        LINE("_Line current"),
        FAULTS("_Faults"),
        SPREAD("_Spread"),
        SIZE("Si_ze"),
        FIT("Fi_t"),
        RECORD("_Record");

        private final String menuWords;

        Page(String menuWords) {
            this.menuWords = menuWords;
        }

        String words() {
            return menuWords.replace("_", "");
        }

        /** The words with a line under the letter that chooses the page in the menu. */
        String menuWords() {
            return menuWords;
        }

        int digit() {
            return ordinal() + 1;
        }
    }
}
