package clipramp.desk.model;

import clipramp.circuit.Design;
import clipramp.files.DesignText;
import clipramp.files.LoadedDesign;

/**
 * A design file as it stands on the desk, with what was read from it. Editing makes another.
 *
 * @param text the file's text
 * @param loaded what it says
 */
public record Sheet(DesignText text, LoadedDesign loaded) {
    /** The design that the text says. */
    public Design design() {
        return loaded.design();
    }
}
