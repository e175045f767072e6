package clipramp.cli;

import java.util.Optional;

/**
 * What a command runs in.
 *
 * @param terminal where words come from and go to
 * @param out answers
 * @param err progress and complaints
 * @param ascii whether answers keep to ASCII
 * @param launcher opens the window, where there is one
 */
record Session(Terminal terminal, Output out, Output err, boolean ascii, Optional<Launcher> launcher) {}
