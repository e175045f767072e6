package clipramp.firing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Characteristic;
import clipramp.circuit.ClipSupply;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Part;
import clipramp.circuit.Ramp;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The engine driven to the idealisation of the books, on the numbers of their worked examples. */
class TextbookLimitTest {
    private static final double ZENER_VOLTS = 20;

    /**
     * Dropper's and diodes' drops to nothing against the line, base bar to an open circuit, V_D to 0, an emptied
     * capacitor, clipping from theta = 0: what is left is the textbook ramp, R_E C_E ln(1/(1 - eta)) (DEVELOPERS.md, The circuit laws).
     * Numbers: Rashid, Power Electronics 4e, 9.5; Mehta, Principles of Electronics, 21.11; Gupta and Singhal, Power
     * Electronics, 2.29; Bell, Electronic Devices and Circuits, 18.6. A line ten times as high clips ten times as early.
     */
    @ParameterizedTest
    @CsvSource({
        "0.51, 10e3, 0.5e-6",
        "0.54, 5e3, 0.2e-6",
        "0.54, 10e3, 0.2e-6",
        "0.7, 10e3, 0.1e-6",
        "0.65, 47e3, 0.1e-6"
    })
    void firstDelayTendsToTheTextbookPeriod(double standoff, double rampOhms, double rampFarads) {
        double textbook = PublishedRelations.textbookPeriodSeconds(rampOhms, rampFarads, standoff);
        for (double lineVolts : new double[] {1e3, 1e4, 1e5}) {
            Pulse first = first(lineVolts, standoff, rampOhms, rampFarads, 0);
            double clipSeconds = ZENER_VOLTS / (Math.sqrt(2) * lineVolts) / (2 * Math.PI * 50);
            assertThat(first.startSeconds()).isCloseTo(textbook, within(clipSeconds + 5e-4 * textbook));
            assertThat(first.peakPointVolts() / first.supplyVolts()).isCloseTo(standoff, within(1e-6));
        }
    }

    /** The same with V_D = 0.5 V: the fully reset ramp of Rashid 9.5, 44.57 kilohm where the book prints 46.7. */
    @ParameterizedTest
    @CsvSource({"0.51, 10e3, 0.5e-6", "0.63, 20e3, 0.1e-6"})
    void firstDelayTendsToTheFullyResetRampWithAnEmitterDrop(double standoff, double rampOhms, double rampFarads) {
        double drop = 0.5;
        double whole = PublishedRelations.resetRampSeconds(rampOhms, rampFarads, ZENER_VOLTS, standoff, drop);
        // The synchronised ramp starts from about V_D, not from 0 V.
        double fromDrop = PublishedRelations.freeRunningPeriodSeconds(rampOhms, rampFarads, ZENER_VOLTS, 0, drop);
        Pulse first = first(1e4, standoff, rampOhms, rampFarads, drop);
        assertThat(first.startSeconds()).isBetween((whole - fromDrop) * (1 - 2e-3), whole);
    }

    private static Pulse first(double lineVolts, double standoff, double rampOhms, double rampFarads, double drop) {
        Design design = design(lineVolts, standoff, rampOhms, rampFarads, drop);
        return Firing.solve(design, new Condition(lineVolts, 50, 25), rampOhms)
                .shown()
                .pulses()
                .get(0);
    }

    private static Design design(
            double lineVolts, double standoff, double rampOhms, double rampFarads, double dropVolts) {
        OptionalDouble none = OptionalDouble.empty();
        Unijunction ideal = new Unijunction(
                "limit",
                Characteristic.exactly(standoff),
                Characteristic.exactly(1e10),
                Characteristic.exactly(0),
                Characteristic.exactly(dropVolts),
                Characteristic.exactly(0),
                Characteristic.exactly(1e-9),
                new Unijunction.Valley(Characteristic.exactly(8e-3), Characteristic.exactly(dropVolts + 1e-3), 20),
                new Unijunction.Saturation(Characteristic.exactly(dropVolts + 0.05), 1, 20),
                Optional.of(new Unijunction.Modulated(Characteristic.exactly(1e-8), 10)),
                Optional.empty(),
                new Unijunction.Limits(none, none, none, none, none, none, none, none));
        Zener zener = new Zener("limit", Characteristic.exactly(ZENER_VOLTS), 0, 1e-6, 0, none);
        return RandomCircuits.draw(10_000)
                .design()
                .withLine(new Line(lineVolts, 50, lineVolts, lineVolts, List.of()))
                .withClip(new ClipSupply(
                        ClipSupply.Tap.LINE,
                        ClipSupply.Rectifier.BRIDGE,
                        0,
                        Part.of(lineVolts / 10),
                        zener,
                        Optional.empty()))
                .withRamp(new Ramp(Part.of(rampFarads), Part.of(rampOhms), Optional.empty()))
                .withTrigger(new Trigger.UnijunctionTrigger(ideal, Part.of(0.1), Part.of(0)));
    }
}
