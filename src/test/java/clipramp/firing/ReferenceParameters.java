package clipramp.firing;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Line;
import clipramp.circuit.Part;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The numbers of one circuit at one condition, worked out apart from the engine. Only what {@link ReferenceIntegrator}
 * covers: the load is a resistor.
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
    final boolean programmable;
    final double upperOhms;
    final double lowerOhms;
    final double standoff;
    final double interbaseOhms;
    final double emitterDropVolts;
    /** Drop of the saturated emitter line at no current and no supply, V. */
    final double emitterOnVolts;

    final double peakCurrentAmps;
    final double slopeOhms;
    final double intercept;
    final double valleySiemens;
    final double onBaseTwoOhms;
    final double baseOneOhms;
    final double baseTwoOhms;
    final double ratio;
    final int secondaries;
    final double primaryOhms;
    final double secondaryOhms;
    final double magnetisingHenries;
    final boolean hasClamp;
    final double clampVolts;
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

        baseOneOhms = design.trigger().baseOne().value();
        ReferenceDevice device = ReferenceDevice.of(design.trigger(), warmer);
        programmable = device.programmable();
        upperOhms = device.upperOhms();
        lowerOhms = device.lowerOhms();
        standoff = device.standoff();
        interbaseOhms = device.interbaseOhms();
        baseTwoOhms = device.baseTwoOhms();
        emitterDropVolts = device.dropVolts();
        emitterOnVolts = device.onVolts();
        peakCurrentAmps = device.peakAmps();
        slopeOhms = device.slopeOhms();
        intercept = device.intercept();
        valleySiemens = device.valleySiemens();
        onBaseTwoOhms = device.onBaseTwoOhms();

        GateDrive gate = design.gate();
        seriesOhms = gate.series().value();
        shuntSiemens = gate.shunt().map(Part::value).map(r -> 1 / r).orElse(0.0);
        Optional<PulseTransformer> transformer = gate.transformer();
        ratio = transformer.map(PulseTransformer::ratio).orElse(1.0);
        secondaries = transformer.map(PulseTransformer::secondaries).orElse(1);
        primaryOhms = transformer.map(PulseTransformer::primaryOhms).orElse(0.0);
        secondaryOhms = transformer.map(PulseTransformer::secondaryOhms).orElse(0.0);
        magnetisingHenries =
                transformer.map(PulseTransformer::magnetisingHenries).orElse(0.0);
        hasClamp = transformer.map(PulseTransformer::clampDiode).orElse(false);
        clampVolts = clip.diodeDropVolts();

        ThyristorDevice thyristor = design.thyristor().device();
        kneeVolts = thyristor.gate().kneeVolts();
        gateSlopeOhms = thyristor.gate().slopeOhms();
        triggerAmps = thyristor.gate().trigger().ampsAt(condition.celsius());
        turnOnSeconds = thyristor.gate().turnOnSeconds().orElse(0);
        boolean scr = thyristor.kind() == ThyristorDevice.Kind.SCR;
        // Behind R_G a conducting gate finds base one's resistor, or a winding that is closed for as long as latching
        // takes.
        double behindOhms = transformer.isPresent() ? Double.POSITIVE_INFINITY : baseOneOhms;
        latchingAmps =
                thyristor.latching().map(c -> c.ampsAt(condition.celsius())).orElse(0.0)
                        + (scr ? 0.7 * (shuntSiemens + 1 / (seriesOhms + behindOhms)) : 0);
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
