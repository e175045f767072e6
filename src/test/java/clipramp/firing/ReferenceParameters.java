package clipramp.firing;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Line;
import clipramp.circuit.Part;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import java.util.List;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The numbers of one circuit as model.md section 4 derives them, worked out apart from the engine: the emitter line from
 * two equations in two unknowns, its calibration on V_OB1 by a root finder on the test circuit's node equation.
 *
 * <p>Only what {@link ReferenceIntegrator} covers: unijunction transistor, direct coupling, resistive load.
 */
final class ReferenceParameters {
    final double omega;
    final double crestVolts;
    final List<Line.Harmonic> harmonics;
    final double supplyCrestVolts;
    final double lagRad;
    final boolean opposite;
    final boolean bridge;
    final boolean tapThyristor;
    final double rectifierVolts;
    final double dropperOhms;
    final double zenerFootVolts;
    final double zenerSlopeOhms;
    final double rampOhms;
    final double rampFarads;
    final double standoff;
    final double interbaseOhms;
    final double emitterDropVolts;
    final double peakCurrentAmps;
    final double slopeOhms;
    final double intercept;
    final double valleySiemens;
    final double onBaseTwoOhms;
    final double baseOneOhms;
    final double baseTwoOhms;
    final double quiescentBaseOneOhms;
    final double seriesOhms;
    final double shuntSiemens;
    final double kneeVolts;
    final double gateSlopeOhms;
    final double triggerAmps;
    final double turnOnSeconds;
    final double latchingAmps;
    final double loadDropVolts;
    final double loadOhms;
    final boolean halfWaveStage;
    final double thyristorVolts;

    ReferenceParameters(Design design, Condition condition, double rampOhms) {
        this.rampOhms = rampOhms;
        omega = 2 * Math.PI * condition.lineHertz();
        crestVolts = Math.sqrt(2) * condition.lineVolts();
        harmonics = design.line().harmonics();
        ClipSupply clip = design.clip();
        supplyCrestVolts = crestVolts * clip.winding().map(w -> w.ratio()).orElse(1.0);
        lagRad = clip.winding().map(w -> w.lagRad()).orElse(0.0);
        opposite = clip.winding().map(w -> w.opposite()).orElse(false);
        bridge = clip.rectifier() == ClipSupply.Rectifier.BRIDGE;
        tapThyristor = clip.tap() == ClipSupply.Tap.THYRISTOR;
        rectifierVolts = clip.diodeDropVolts() * (bridge ? 2 : 1);
        dropperOhms = clip.dropper().value();
        double warmer = condition.celsius() - 25;
        zenerSlopeOhms = clip.zener().slopeOhms();
        zenerFootVolts = clip.zener().volts().nominal() * (1 + clip.zener().driftPerKelvin() * warmer)
                - zenerSlopeOhms * clip.zener().testCurrentAmps();
        rampFarads = design.ramp().capacitor().value();

        Trigger.UnijunctionTrigger trigger = (Trigger.UnijunctionTrigger) design.trigger();
        Unijunction ujt = trigger.device();
        baseOneOhms = trigger.baseOne().value();
        baseTwoOhms = trigger.baseTwo().value();
        standoff = ujt.standoff().nominal();
        double bar25 = ujt.interbaseOhms().nominal();
        interbaseOhms = bar25 * (1 + ujt.interbaseDriftPerKelvin().nominal() * warmer);
        double drop25 = ujt.emitterDropVolts().nominal();
        emitterDropVolts = drop25 + ujt.emitterDriftVoltsPerKelvin().nominal() * warmer;
        peakCurrentAmps = ujt.peakCurrentAmps().nominal();
        double spec = ujt.valley().atVolts();
        double valleyAmps = ujt.valley().amps().nominal();
        double valleyVolts = ujt.valley().volts().nominal();
        valleySiemens = valleyAmps / spec;
        onBaseTwoOhms =
                ujt.modulated().map(m -> m.atVolts() / m.amps().nominal()).orElse((1 - standoff) * interbaseOhms);
        if (ujt.baseOnePulse().isPresent()) {
            Unijunction.BaseOnePulse test = ujt.baseOnePulse().get();
            double onBaseTwo25 =
                    ujt.modulated().map(m -> m.atVolts() / m.amps().nominal()).orElse((1 - standoff) * bar25);
            UnivariateFunction excess = slope -> {
                double xi = (valleyVolts - slope * valleyAmps - drop25) / spec;
                double bar = test.supplyVolts() / (bar25 + test.baseOneOhms());
                double peak = bar * (test.baseOneOhms() + standoff * bar25) + drop25;
                double v = test.nominalVolts();
                double emitter = (peak - v - drop25 - xi * test.supplyVolts()) / slope;
                return emitter + (test.supplyVolts() - v) / onBaseTwo25 - v / test.baseOneOhms();
            };
            slopeOhms = new BrentSolver(1e-15, 1e-13).solve(300, excess, 1e-3, 1e6);
        } else {
            // V_D + xi u + r i = v through the valley point and through the saturation point.
            double u = ujt.saturation().atVolts();
            double i = ujt.saturation().amps();
            double v = ujt.saturation().volts().nominal() - drop25;
            double determinant = spec * i - u * valleyAmps;
            slopeOhms = (spec * v - u * (valleyVolts - drop25)) / determinant;
        }
        intercept = (valleyVolts - slopeOhms * valleyAmps - drop25) / spec;

        GateDrive gate = design.gate();
        seriesOhms = gate.series().value();
        shuntSiemens = gate.shunt().map(Part::value).map(r -> 1 / r).orElse(0.0);
        double quiescentSiemens = shuntSiemens == 0 ? 0 : 1 / (seriesOhms + 1 / shuntSiemens);
        quiescentBaseOneOhms = 1 / (1 / baseOneOhms + quiescentSiemens);

        ThyristorDevice thyristor = design.thyristor().device();
        kneeVolts = thyristor.gate().kneeVolts();
        gateSlopeOhms = thyristor.gate().slopeOhms();
        triggerAmps = thyristor.gate().trigger().ampsAt(condition.celsius());
        turnOnSeconds = thyristor.gate().turnOnSeconds().orElse(0);
        boolean scr = thyristor.kind() == ThyristorDevice.Kind.SCR;
        latchingAmps =
                thyristor.latching().map(c -> c.ampsAt(condition.celsius())).orElse(0.0)
                        + (scr ? 0.7 * (shuntSiemens + 1 / (seriesOhms + baseOneOhms)) : 0);
        thyristorVolts = thyristor.onState().thresholdVolts();
        Stage stage = design.stage();
        loadDropVolts =
                thyristorVolts + stage.bridgeDiodes() * design.stageDiodes().dropVolts();
        loadOhms = design.load().resistanceOhms()
                + thyristor.onState().slopeOhms()
                + stage.bridgeDiodes() * design.stageDiodes().slopeOhms();
        halfWaveStage = stage == Stage.HALF_WAVE;
    }

    /** Line against its crest at an angle of its own fundamental. */
    double shape(double rad) {
        double sum = Math.sin(rad);
        for (Line.Harmonic h : harmonics) {
            sum += h.share() * Math.sin(h.order() * rad + h.phaseRad());
        }
        return sum;
    }

    /** Derivative of {@link #shape} by the angle. */
    double shapeRate(double rad) {
        double sum = Math.cos(rad);
        for (Line.Harmonic h : harmonics) {
            sum += h.share() * h.order() * Math.cos(h.order() * rad + h.phaseRad());
        }
        return sum;
    }

    /** Whether the two half cycles of the line mirror each other. */
    boolean isSymmetric() {
        return harmonics.stream().noneMatch(h -> h.order() % 2 == 0 && h.share() != 0);
    }

    /** Zero of the line near 0 (rising) or near pi (falling), rad. */
    double zeroRad(boolean rising) {
        double middle = rising ? 0 : Math.PI;
        if (harmonics.isEmpty()) {
            return middle;
        }
        return new BrentSolver(1e-15, 1e-15).solve(200, this::shape, middle - 1.5, middle + 1.5, middle);
    }
}
