package clipramp.desk;

import javafx.scene.layout.Region;

/** A page of the window. */
interface PageView {
    Region node();

    /** Told when it is brought up, and whenever the design changes while it is up. */
    default void follow() {}
}
