package clipramp.desk.model;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.power.KnobMap;
import clipramp.power.OperatingPoint;
import clipramp.spread.SpreadResult;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Executor;
import java.util.function.Consumer;

/**
 * The knob under one's fingers: where the ramp is set, what that comes to, and the whole curve. Turns coalesce: the
 * newest wins.
 */
public final class Bench {
    /** Points of the power curve: one a percent of rotation. */
    private static final int CURVE_POINTS = 101;

    private final LatestWins<Reading.Request, Reading> reader;
    private final LatestWins<Knob, Curve> curves;
    private final List<Runnable> readingListeners = new ArrayList<>();
    private final List<Runnable> curveListeners = new ArrayList<>();
    private Optional<Knob> knob = Optional.empty();
    private Setting setting = new Setting.AtKnob(0.5);
    /** Where the firing line was last wanted, so that steps add up over an angle that is jumped. */
    private OptionalDouble aimedRad = OptionalDouble.empty();

    private Optional<Reading> reading = Optional.empty();
    private Optional<Curve> curve = Optional.empty();
    private Optional<SpreadResult> spread = Optional.empty();

    /** A design at a condition. */
    private record Knob(Design design, Condition condition) {}

    /**
     * The power curve.
     *
     * @param design the design
     * @param condition what it was solved at
     * @param points operating points at even steps of rotation; one for a fixed ramp
     */
    public record Curve(Design design, Condition condition, List<OperatingPoint> points) {
        /** Keeps the points as they are. */
        public Curve {
            points = List.copyOf(points);
        }
    }

    /**
     * @param turning where one setting is solved
     * @param sweeping where the curve is solved
     * @param home the thread of this bench
     * @param troubles takes what could not be solved
     */
    Bench(Executor turning, Executor sweeping, Executor home, Consumer<RuntimeException> troubles) {
        reader = new LatestWins<>(Reading::of, turning, home, this::take, trouble -> {
            aimedRad = OptionalDouble.empty();
            reading.ifPresent(r -> setting = r.setting());
            readingListeners.forEach(Runnable::run);
            troubles.accept(trouble);
        });
        curves = new LatestWins<>(Bench::sweep, sweeping, home, this::take, troubles);
    }

    private static Curve sweep(Knob knob) {
        return new Curve(knob.design(), knob.condition(), KnobMap.of(knob.design(), knob.condition(), CURVE_POINTS));
    }

    /** Told at home whenever the knob was read anew. */
    public void onReading(Runnable listener) {
        readingListeners.add(listener);
    }

    /** Told at home whenever there is another power curve, or another spread over it. */
    public void onCurve(Runnable listener) {
        curveListeners.add(listener);
    }

    /** Puts a design on the bench; the knob stays where it is. */
    void put(Design design, Condition condition) {
        Knob next = new Knob(design, condition);
        knob = Optional.of(next);
        aimedRad = OptionalDouble.empty();
        if (!(setting instanceof Setting.AtKnob) && design.ramp().pot().isPresent()) {
            setting = new Setting.AtKnob(position());
        }
        read();
        curves.ask(next);
    }

    /** Turns the knob; positions beyond its stops are its stops. */
    public void turnTo(double position) {
        set(new Setting.AtKnob(Math.min(1, Math.max(0, position))));
    }

    /** Turns the knob by a share of its rotation, -1..1. */
    public void turnBy(double share) {
        turnTo(position() + share);
    }

    /** Moves the firing line to an angle, rad; the ramp's resistance follows. */
    public void fireAt(double rad) {
        set(new Setting.AtAngle(rad));
    }

    /** Moves the firing line from where it is by an angle, rad; earlier where it is negative. */
    public void fireLaterBy(double rad) {
        double from = aimedRad.orElseGet(() ->
                reading.map(r -> r.firingRad().orElse(Math.PI / 2)).orElse(Math.PI / 2));
        fireAt(Math.min(Math.PI, Math.max(0, from + rad)));
    }

    private void set(Setting other) {
        aimedRad = other instanceof Setting.AtAngle angle ? OptionalDouble.of(angle.rad()) : OptionalDouble.empty();
        setting = other;
        read();
    }

    private void read() {
        knob.ifPresent(k -> reader.ask(new Reading.Request(k.design(), k.condition(), setting)));
    }

    private void take(Reading answer) {
        reading = Optional.of(answer);
        if (answer.request().setting().equals(setting)) {
            setting = answer.setting();
        }
        readingListeners.forEach(Runnable::run);
    }

    private void take(Curve answer) {
        curve = Optional.of(answer);
        curveListeners.forEach(Runnable::run);
    }

    /** Where the knob stands, 0..1: as set, else as last read, else in the middle. */
    public double position() {
        if (setting instanceof Setting.AtKnob at) {
            return at.position();
        }
        return reading.map(r -> r.point().position().orElse(0.5)).orElse(0.5);
    }

    /** What was read last; empty before the first design. */
    public Optional<Reading> reading() {
        return reading;
    }

    /** The power curve that was solved last; empty before the first design. */
    public Optional<Curve> curve() {
        return curve;
    }

    /** Lays a spread over lanes and curve, or takes it away. */
    public void lay(Optional<SpreadResult> wanted) {
        if (!spread.equals(wanted)) {
            spread = wanted;
            curveListeners.forEach(Runnable::run);
            readingListeners.forEach(Runnable::run);
        }
    }

    /** The spread that lies over lanes and curve, if one does. */
    public Optional<SpreadResult> spread() {
        return spread;
    }

    /** Whether an answer is still to come. */
    boolean isBusy() {
        return reader.isBusy() || curves.isBusy();
    }
}
