package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.units.PreferredSeries;
import java.util.Collections;
import java.util.Set;
import java.util.TreeSet;

/**
 * What is wanted, what is decided and what is open.
 *
 * @param design line, stage, load, surroundings, wanted and every decided part; what stands at an open part is a start
 *     and may be anything
 * @param open parts to choose
 * @param stock what they are chosen from
 * @param series preferred values of resistors and capacitors; capacitors take E12 at most
 */
public record SizingRequest(Design design, Set<OpenPart> open, Stock stock, PreferredSeries series) {
    /** Puts the open parts in the order of the signal. */
    public SizingRequest {
        open = Collections.unmodifiableSet(new TreeSet<>(open));
    }

    /** The same with one part decided. */
    SizingRequest decided(Design with, OpenPart part) {
        Set<OpenPart> rest = new TreeSet<>(open);
        rest.remove(part);
        return new SizingRequest(with, rest, stock, series);
    }

    boolean isOpen(OpenPart part) {
        return open.contains(part);
    }

    /** Capacitors are made in E6 and E12 whatever the resistors are. */
    PreferredSeries capacitorSeries() {
        return series.perDecade() < PreferredSeries.E12.perDecade() ? series : PreferredSeries.E12;
    }
}
