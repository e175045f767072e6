package clipramp.desk;

import clipramp.desk.Actions.Page;
import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;
import javafx.scene.control.ToggleButton;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;

/** One tab a page, beside the menus; every one of them is reached by Tab. */
final class PageTabs {
    private final Map<Page, ToggleButton> tabs = new EnumMap<>(Page.class);
    private final HBox box = new HBox();

    PageTabs(Actions actions) {
        for (Page page : Page.values()) {
            ToggleButton tab = new ToggleButton(page.words());
            tab.setId("page-" + page.name().toLowerCase(Locale.ROOT));
            tab.setAccessibleText("Page " + page.words());
            tab.setMinWidth(Region.USE_PREF_SIZE);
            tab.setOnAction(event -> actions.showPage(page));
            tabs.put(page, tab);
            box.getChildren().add(tab);
        }
        box.getStyleClass().addAll("tabs", "page-tabs");
    }

    HBox node() {
        return box;
    }

    /** Marks the page that is shown. */
    void show(Page shown) {
        tabs.forEach((page, tab) -> tab.setSelected(page == shown));
    }
}
