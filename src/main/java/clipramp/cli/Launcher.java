package clipramp.cli;

import java.util.Optional;

/** Opens the window; whoever starts the program hands one in, so that command line and window never meet. */
@FunctionalInterface
public interface Launcher {
    /**
     * Shows the window and returns when it is closed.
     *
     * @param designFile the design to open, as typed; empty for none
     * @return what to tell the shell
     * @throws UnsupportedOperationException where there is no screen to open a window on
     */
    int open(Optional<String> designFile);
}
