package clipramp.desk;

import clipramp.desk.Actions.Page;
import clipramp.desk.Actions.Shown;
import clipramp.desk.model.Draft;
import clipramp.desk.model.Settings;
import clipramp.desk.model.ViewCondition;
import clipramp.files.Example;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuItem;
import javafx.scene.control.RadioMenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.ToggleGroup;
import javafx.scene.input.KeyCombination;

/** The menu bar. What cannot be done now is not enabled; what names a step says which. */
final class Menus {
    private static final int ZOOM_STEP = 10;

    private final Actions actions;
    private final Draft draft;
    private final MenuBar bar;
    private final Menu recent = new Menu("Open _recent");
    private final MenuItem undo;
    private final MenuItem redo;
    private final List<MenuItem> needDesign = new ArrayList<>();

    Menus(Actions actions, Draft draft) {
        this.actions = actions;
        this.draft = draft;
        undo = item("Undo", "Shortcut+Z", actions::undo);
        redo = item("Redo", "Shortcut+Shift+Z", actions::redo);
        bar = new MenuBar(file(), edit(), view(), help());
        draft.onChange(this::refresh);
        refresh();
    }

    MenuBar node() {
        return bar;
    }

    private Menu file() {
        Menu examples = new Menu("_Examples");
        for (Example example : Example.all()) {
            examples.getItems().add(item(example.title(), "", () -> actions.openExample(example)));
        }
        Menu exports = new Menu("E_xport");
        for (Shown shown : Shown.values()) {
            for (FileAsk.Kind kind : List.of(FileAsk.Kind.SVG, FileAsk.Kind.PNG, FileAsk.Kind.CSV)) {
                String words = capital(shown.words()) + " as " + kind.ending().toUpperCase(Locale.ROOT) + "…";
                exports.getItems().add(item(words, "", () -> actions.export(shown, kind)));
            }
        }
        return new Menu(
                "_File",
                null,
                item("_New design…", "Shortcut+N", actions::startNew),
                item("_Open…", "Shortcut+O", actions::open),
                recent,
                examples,
                new SeparatorMenuItem(),
                needing(item("_Save", "Shortcut+S", actions::save)),
                needing(item("Save _as…", "Shortcut+Shift+S", actions::saveAs)),
                needing(exports),
                needing(item("_Record…", "Shortcut+P", () -> actions.showPage(Page.RECORD))),
                new SeparatorMenuItem(),
                item("_Close", "Shortcut+W", actions::close));
    }

    private Menu edit() {
        Menu menu = new Menu("_Edit", null, undo, redo, new SeparatorMenuItem());
        for (Shown shown : Shown.values()) {
            menu.getItems()
                    .add(needing(item("Copy " + shown.words() + " as picture", "", () -> actions.copyPicture(shown))));
            menu.getItems()
                    .add(needing(item("Copy " + shown.words() + " as table", "", () -> actions.copyTable(shown))));
        }
        return menu;
    }

    private Menu conditions() {
        Menu conditions = new Menu("Con_dition");
        ToggleGroup group = new ToggleGroup();
        for (ViewCondition condition : ViewCondition.values()) {
            RadioMenuItem item = new RadioMenuItem(condition.word());
            item.setToggleGroup(group);
            item.setSelected(condition == ViewCondition.WORST);
            item.setOnAction(event -> actions.setCondition(condition));
            conditions.getItems().add(item);
        }
        return conditions;
    }

    private Menu view() {
        Menu numbers = new Menu("N_umbers as a table");
        for (Shown shown : Shown.values()) {
            numbers.getItems().add(item(capital(shown.words()), "", () -> actions.showNumbers(shown)));
        }
        Menu menu = new Menu("_View");
        for (Page page : Page.values()) {
            menu.getItems()
                    .add(needing(item(page.menuWords(), "Shortcut+" + page.digit(), () -> actions.showPage(page))));
        }
        menu.getItems()
                .addAll(
                        new SeparatorMenuItem(),
                        needing(conditions()),
                        needing(item("Look closer at the _pulse, or back", "Shortcut+L", actions::zoomPulse)),
                        needing(numbers),
                        new SeparatorMenuItem(),
                        item("Zoom _in", "Shortcut+PLUS", () -> actions.zoomBy(ZOOM_STEP)),
                        item("Zoom _out", "Shortcut+MINUS", () -> actions.zoomBy(-ZOOM_STEP)),
                        item("Zoom to 100 %", "Shortcut+0", () -> actions.zoomTo(Settings.LEAST_ZOOM)),
                        item("Zoom to 200 %", "", () -> actions.zoomTo(Settings.MOST_ZOOM)),
                        new SeparatorMenuItem(),
                        item("Theme as the system", "", () -> actions.setLook(Settings.Look.SYSTEM)),
                        item("Theme paper", "", () -> actions.setLook(Settings.Look.PAPER)),
                        item("Theme ink", "", () -> actions.setLook(Settings.Look.INK)));
        return menu;
    }

    private Menu help() {
        return new Menu(
                "_Help",
                null,
                item("Before you build or _measure", "F2", actions::showCautions),
                item("_Keys", "F1", actions::showShortcuts),
                item("_Licences", "", actions::showLicences),
                item("_About clipramp", "", actions::showAbout));
    }

    void showRecent(List<Path> files) {
        recent.getItems().clear();
        for (Path file : files) {
            MenuItem item = item(file.toString(), "", () -> actions.openFile(file));
            item.setMnemonicParsing(false);
            recent.getItems().add(item);
        }
        recent.setDisable(files.isEmpty());
    }

    private void refresh() {
        boolean open = draft.isOpen();
        needDesign.forEach(item -> item.setDisable(!open));
        name(undo, "Undo", draft.undoName());
        name(redo, "Redo", draft.redoName());
    }

    private static void name(MenuItem item, String verb, Optional<String> step) {
        item.setText(step.map(s -> verb + " " + s).orElse(verb));
        item.setMnemonicParsing(false);
        item.setDisable(step.isEmpty());
    }

    private <T extends MenuItem> T needing(T item) {
        needDesign.add(item);
        return item;
    }

    private static MenuItem item(String words, String keys, Runnable action) {
        MenuItem item = new MenuItem(words);
        if (!keys.isEmpty()) {
            item.setAccelerator(KeyCombination.valueOf(keys));
        }
        item.setOnAction(event -> action.run());
        return item;
    }

    private static String capital(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }
}
