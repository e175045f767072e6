package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.engine.InductiveCurrent;

/**
 * The first half cycle of a load that was off for long, switched on at the worst instant. A cold resistance is kept for
 * the whole half cycle, which is on the safe side: a filament warms within a few milliseconds. An inductive load's core is
 * taken as not saturating (DEVELOPERS.md, Commutation, snubber, inrush).
 *
 * @param peakAmps largest current, A
 * @param ampsSquaredSeconds integral of the squared current over that half cycle's conduction, A²s
 * @param coldOhms resistance that the load begins with, ohm
 */
public record Inrush(double peakAmps, double ampsSquaredSeconds, double coldOhms) {
    private static final double STEP_RAD = Math.toRadians(5);
    private static final double LATER_RAD = 2e-5;

    /**
     * The worst first half cycle: of a resistance from the zero on, of an inductance from the worst angle that a search in
     * steps of five degrees finds.
     *
     * @param design stage and load
     * @param condition line voltage
     */
    public static Inrush worst(Design design, Condition condition) {
        double cold = design.load().resistanceOhms() / design.load().coldRatio();
        if (design.load() instanceof Load.Inductive inductive) {
            return inductive(design, condition, inductive);
        }
        ResistorCurrent path = new ResistorCurrent(design.withLoad(new Load.Resistor(cold)), condition);
        HalfCycleCurrent first = path.firedAt(true, 0);
        HalfCycleCurrent second = path.firedAt(false, 0);
        return new Inrush(
                Math.max(first.peakAmps(), second.peakAmps()),
                Math.max(first.squareAmpRad(), second.squareAmpRad()) / condition.omega(),
                cold);
    }

    /** Fired from rest at every angle up to the crest: the earlier, the larger the displaced first wave. */
    private static Inrush inductive(Design design, Condition condition, Load.Inductive load) {
        LoadLoop loop = LoadLoop.of(design, condition, load);
        int order = SpanTotals.highestOrder(design.line());
        double peak = 0;
        double square = 0;
        // The earliest angle at which the line drives it, or a thousandth of a degree later.
        double earliest = Math.asin(Math.min(1, loop.dropVolts() / (Math.sqrt(2) * condition.lineVolts())));
        for (double rad = earliest + LATER_RAD; rad <= Math.PI / 2; rad += STEP_RAD) {
            if (loop.drivingVolts(rad) <= 0) {
                continue;
            }
            int direction = loop.directionAt(rad);
            InductiveCurrent current = loop.throughThyristor(rad, direction, 0);
            double end = Math.min(current.extinctionRad(rad + 2 * Math.PI), rad + 2 * Math.PI);
            CurrentSpan span = loop.thyristorSpan(rad, end, direction, current);
            peak = Math.max(peak, SpanPeak.of(span, order));
            square = Math.max(square, SpanQuadrature.squareAmpRad(span, order));
        }
        return new Inrush(peak, square / condition.omega(), load.resistanceOhms());
    }
}
