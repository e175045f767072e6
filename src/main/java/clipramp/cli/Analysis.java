package clipramp.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Mixin;

/** A command that reads a design and solves it: what all of them take. */
abstract class Analysis implements Callable<Integer> {
    final Session session;

    @Mixin
    DesignOptions design = new DesignOptions();

    @Mixin
    StandardOptions standard = new StandardOptions();

    Analysis(Session session) {
        this.session = session;
    }
}
