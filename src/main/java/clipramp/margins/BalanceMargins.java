package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.firing.Solution;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import java.util.ArrayList;
import java.util.DoubleSummaryStatistics;
import java.util.List;

/** Whether successive half cycles are alike, in angle and in what the load draws from the line. */
final class BalanceMargins {
    /** Share of the full rms current that may flow as dc: a rule of ours. */
    private static final double DC_SHARE = 0.01;

    /** By how much alternating firing angles may differ: a rule of ours, 0.6 % of full power at 90 degrees. */
    private static final double HUNTING_DEGREES = 0.5;

    private final Bench bench;
    private final Design design;
    private final Condition usual;

    BalanceMargins(Bench bench, Condition usual) {
        this.bench = bench;
        this.design = bench.design();
        this.usual = usual;
    }

    List<Margin> all() {
        List<Margin> margins = new ArrayList<>();
        margins.add(hunting());
        if (design.stage().isFullWave()) {
            margins.add(dcInLoad());
        }
        return margins;
    }

    private Margin hunting() {
        MarginKind kind = MarginKind.HUNTING;
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            List<Double> settings =
                    at.condition().equals(usual) ? bench.settings() : List.of(bench.leastOhms(), bench.mostOhms());
            for (double ohms : settings) {
                Solution solution = bench.solution(at.condition(), ohms);
                double apart = solution.hunts() ? spreadRad(solution) : 0;
                findings.add(new Finding(
                        at.words(),
                        HUNTING_DEGREES,
                        Math.toDegrees(apart),
                        kind.sense(),
                        "R_E = " + Say.ohms(ohms)
                                + (solution.hunts()
                                        ? ": half cycles alternate, " + Say.angle(apart) + " apart"
                                        : ": every line period is like the one before")));
            }
        }
        return Finding.worst(kind, findings);
    }

    /** Largest less smallest firing angle; a half cycle that does not fire counts as fired at its end. */
    private static double spreadRad(Solution solution) {
        DoubleSummaryStatistics angles = solution.halves().stream()
                .mapToDouble(half -> half.firingRad().orElse(Math.PI))
                .summaryStatistics();
        return angles.getMax() - angles.getMin();
    }

    private Margin dcInLoad() {
        MarginKind kind = MarginKind.DC_IN_LOAD;
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            if (!at.condition().equals(usual)) {
                continue;
            }
            double full = LoadPower.fullRmsAmps(design, at.condition());
            for (double ohms : bench.settings()) {
                LoadResult load = bench.load(at.condition(), ohms);
                double dc = Math.abs(load.dcAmps());
                findings.add(new Finding(
                        at.words(),
                        DC_SHARE * full,
                        dc,
                        kind.sense(),
                        "R_E = " + Say.ohms(ohms) + ": dc " + Say.amps(dc) + ", full rms current " + Say.amps(full)));
            }
        }
        return Finding.worst(kind, findings);
    }
}
