package clipramp.desk.model;

import clipramp.circuit.Condition;
import clipramp.faults.FaultSheet;
import clipramp.faults.Faults;
import clipramp.files.LoadedDesign;
import java.util.Optional;

/** Works every single fault of a design out, away from the window. */
public final class FaultRun {
    /**
     * What is to be worked out.
     *
     * @param loaded the design as read
     * @param condition line and temperature that the figures hold at
     */
    public record Asked(LoadedDesign loaded, Condition condition) {}

    /**
     * What came of it.
     *
     * @param asked what was asked
     * @param sheet every fault
     */
    public record Answer(Asked asked, FaultSheet sheet) {}

    private FaultRun() {}

    static LongRun<Asked, Answer> on(Workers workers) {
        return new LongRun<>("The faults could not be worked out", FaultRun::solve, workers.drawing(), workers.home());
    }

    private static Answer solve(Asked asked, LongRun.Telling telling) {
        FaultSheet sheet = Faults.of(
                asked.loaded().design(), asked.condition(), telling.of((done, of) -> done + " of " + of + " faults"));
        return new Answer(asked, sheet);
    }

    /** What is to be asked of a design as it stands; empty where none lies on the desk. */
    public static Optional<Asked> of(Draft draft, ViewCondition condition) {
        return draft.sheet().map(sheet -> new Asked(sheet.loaded(), condition.solvedAt(sheet.design())));
    }
}
