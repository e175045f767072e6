package clipramp.desk.model;

import java.util.concurrent.Executor;

/**
 * Where work is done.
 *
 * @param home the window's thread, which owns every model
 * @param turning solves one knob setting; never busy for long
 * @param judging solves curves and margins
 * @param writing reads and writes files, in the order asked
 * @param drawing draws many units, for as long as that takes
 * @param searching searches for values and fits readings, for seconds
 */
public record Workers(
        Executor home, Executor turning, Executor judging, Executor writing, Executor drawing, Executor searching) {}
