package clipramp.spread;

import clipramp.engine.UnitValues;
import clipramp.spread.TrimmerGoals.Mark;
import clipramp.spread.TrimmerGoals.Setting;

/**
 * How a unit's trimmers are set: at nominal line and temperature, first with the knob at the highest wanted setting, then
 * at the lowest, each to the firing angle that the nominal unit has there. A track that may be less than it says reaches as
 * far as the least one does.
 */
final class TrimmerSetting {
    /** From firing angles nearer than this, as a share, one last step along the unit's own slope leaves a tenth at most. */
    private static final double NEAR = 5e-5;

    /** And from this near along the nominal unit's. */
    private static final double THERE = 5e-6;

    /** Two or three do for most units; where the angle is jumped over, the nearest of these is taken. */
    private static final int MOST_RUNS = 16;

    private static final double LEAST_FOLLOW = 0.3;
    private static final double MOST_FOLLOW = 3;

    private final TrimmerGoals goals;
    private final UnitSolver solver;

    TrimmerSetting(TrimmerGoals goals, UnitSolver solver) {
        this.goals = goals;
        this.solver = solver;
    }

    /** Whether the logarithm of a firing angle may move like that with the logarithm of R_E, but for a jump. */
    static boolean isLikely(double follow) {
        return follow > LEAST_FOLLOW && follow < MOST_FOLLOW;
    }

    /** Sets the trimmers of a unit, whose line and temperature stay as they are. */
    void set(UnitValues unit) {
        Figures parts = new Figures(unit.parts());
        Setting setting = goals.known(parts).orElseGet(() -> {
            Setting found = found(unit);
            goals.keep(parts, found);
            return found;
        });
        unit.highTrimOhms = setting.highOhms();
        unit.lowTrimOhms = setting.lowOhms();
    }

    private Setting found(UnitValues unit) {
        double volts = unit.lineVolts;
        double hertz = unit.lineHertz;
        double celsius = unit.celsius;
        goals.bench(unit);
        double ratio = goals.delayPerOhm() / solver.delayPerOhm(unit);
        if (goals.highReach() > 0) {
            ratio = high(unit, ratio);
        }
        if (goals.lowReach() > 0) {
            low(unit, ratio);
        }
        unit.lineVolts = volts;
        unit.lineHertz = hertz;
        unit.celsius = celsius;
        return new Setting(unit.highTrimOhms, unit.lowTrimOhms);
    }

    /** Sets the one and says what the unit needs of the nominal unit's R_E, which holds nearly as well for the other. */
    private double high(UnitValues unit, double ratio) {
        Mark mark = goals.highest();
        double ohms = ohmsFor(unit, mark, mark.rampOhms() * ratio);
        double rest = unit.rampOhms(mark.trackShare()) - unit.highTrimOhms;
        unit.highTrimOhms = Math.max(0, Math.min(goals.highReach(), ohms - rest));
        return ohms / mark.rampOhms();
    }

    private void low(UnitValues unit, double ratio) {
        Mark mark = goals.lowest();
        double ohms = ohmsFor(unit, mark, mark.rampOhms() * ratio) - unit.fixedOhms - unit.highTrimOhms;
        double bare = unit.usedTrackOhms(mark.trackShare());
        // Parallel resistances: 1/ohms = 1/bare + 1/across.
        double across = ohms <= 0 ? 0 : ohms < bare ? ohms * bare / (bare - ohms) : Double.POSITIVE_INFINITY;
        unit.lowTrimOhms = Math.max(0, Math.min(goals.lowReach(), across - unit.potShuntOhms));
    }

    /** A secant over logarithms, its first slope the nominal unit's; the later R_E, the later it fires. */
    private double ohmsFor(UnitValues unit, Mark mark, double guess) {
        double ohms = guess;
        double follow = mark.follow();
        double early = 0;
        double late = Double.POSITIVE_INFINITY;
        double ohmsBefore = Double.NaN;
        double radBefore = Double.NaN;
        double best = guess;
        double off = Double.POSITIVE_INFINITY;
        for (int run = 0; run < MOST_RUNS; run++) {
            double rad = solver.latestRad(unit, ohms);
            double lacking = Math.log(mark.firingRad() / rad);
            double seen = Math.log(rad / radBefore) / Math.log(ohms / ohmsBefore);
            boolean known = isLikely(seen);
            follow = known ? seen : follow;
            ohmsBefore = ohms;
            radBefore = rad;
            double next = ohms * Math.exp(lacking / follow);
            if (Math.abs(lacking) < (known ? NEAR : THERE)) {
                return next;
            }
            if (Math.abs(lacking) < off) {
                off = Math.abs(lacking);
                best = ohms;
            }
            early = lacking > 0 ? ohms : early;
            late = lacking > 0 ? late : ohms;
            ohms = next > early && next < late ? next : Math.sqrt(early * late);
        }
        return best;
    }
}
