package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** First half cycles, latching through an inductance, and lamps. */
class InrushTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);

    private static Design with(Load load) {
        return Fired.textbook(Stage.TRIAC, 10).withLoad(load);
    }

    @Test
    void aColdLampTakesItsColdRatioTimesItsHotCrestCurrent() {
        Load lamp = new Load.Filament(300, 230, 1.55, 15);
        Inrush inrush = Inrush.worst(with(lamp), EUROPE);
        double hot = Math.sqrt(2) * 300 / 230;
        assertThat(inrush.peakAmps()).isCloseTo(15 * hot, within(1e-9));
        // Half a period of a squared sine: peak squared over 4 f.
        assertThat(inrush.ampsSquaredSeconds()).isCloseTo(Math.pow(15 * hot, 2) / 200, within(1e-9));
        Inrush heater = Inrush.worst(with(new Load.Resistor(230.0 * 230 / 300, 4)), EUROPE);
        assertThat(heater.peakAmps()).isCloseTo(4 * hot, within(1e-9));
    }

    @Test
    void anAlmostPureInductanceTakesTwiceItsSteadyCrestWhenSwitchedOnAtTheZero() {
        // The displaced wave: i = V/(wL) (1 - cos wt), peak 2 V/(wL); from any handbook on transformers.
        double henries = 0.5;
        Inrush inrush = Inrush.worst(with(new Load.Inductive(1e-3, henries, Optional.empty())), EUROPE);
        double crest = Math.sqrt(2) * 230 / (EUROPE.omega() * henries);
        assertThat(inrush.peakAmps()).isCloseTo(2 * crest, within(1e-3 * crest));
    }

    @Test
    void bimbhraExample4Point6PulseLengthForTheLatchingCurrent() {
        // Bimbhra, Power Electronics, example 4.6: 200 V dc, I_L 0.1 A; 0.2 H: 100 us; with 20 ohm 100.5 us; 2 H with
        // 20
        // ohm 1005 us. A line so slow that its crest stands still is a direct voltage.
        Condition still = new Condition(200 / Math.sqrt(2), 1e-3, 25);
        assertThat(micros(1e-6, 0.2, still)).isCloseTo(100, within(0.01));
        assertThat(micros(20, 0.2, still)).isCloseTo(100.5, within(0.01));
        assertThat(micros(20, 2, still)).isCloseTo(1005, within(0.1));
    }

    private static double micros(double ohms, double henries, Condition condition) {
        Design design = with(new Load.Inductive(ohms, henries, Optional.empty()));
        return 1e6
                * PulseLength.secondsToReach(design, condition, Math.PI / 2, 0.1)
                        .getAsDouble();
    }

    @Test
    void applicationNoteLampBarelyReachesTheLatchingCurrent() {
        // ST AN303: a 10 W lamp at 230 V takes a peak of 61 mA against a latching current of 50 mA: a narrow pulse near
        // the zero fails, one nearer the crest does not.
        Design lamp = with(new Load.Filament(10, 230, 1.55, 12));
        double peak =
                Inrush.worst(with(new Load.Resistor(230.0 * 230 / 10)), EUROPE).peakAmps();
        assertThat(peak).isCloseTo(61e-3, within(0.6e-3));
        assertThat(PulseLength.secondsToReach(with(new Load.Resistor(5290)), EUROPE, Math.toRadians(30), 50e-3))
                .isEmpty();
        assertThat(PulseLength.secondsToReach(with(new Load.Resistor(5290)), EUROPE, Math.toRadians(80), 50e-3))
                .hasValue(0);
        assertThat(lamp.load().resistanceOhms()).isEqualTo(5290);
    }

    @Test
    void aLoadThatNeverGetsThereAsksForNoLengthAtAll() {
        Design solenoid = with(new Load.Inductive(100, 50, Optional.empty()));
        assertThat(PulseLength.secondsToReach(solenoid, EUROPE, Math.toRadians(170), 0.05))
                .isEmpty();
    }

    @Test
    void aLampsPowerIsItsRatedPowerAtTheExponentOfItsVoltage() {
        // Handbook law P = P_rated (V/V_rated)^1.55, light ~ V^3.4.
        Design design = with(new Load.Filament(300, 230, 1.55, 15));
        for (double degrees = 5; degrees < 170; degrees += 15) {
            LoadResult lit = LoadPower.atFiringAngle(design, EUROPE, Math.toRadians(degrees));
            double volts = lit.rmsVolts() / 230;
            double share =
                    1 - Math.toRadians(degrees) / Math.PI + Math.sin(2 * Math.toRadians(degrees)) / (2 * Math.PI);
            assertThat(volts).isCloseTo(Math.sqrt(share), within(1e-12));
            if (volts > Math.pow(15, -1 / 0.45)) {
                assertThat(lit.watts()).isCloseTo(300 * Math.pow(volts, 1.55), within(1e-9));
            }
            assertThat(lit.lightShare().getAsDouble()).isCloseTo(Math.pow(volts, 3.4), within(1e-12));
        }
        assertThat(LoadPower.fullWatts(design, EUROPE)).isCloseTo(300, within(1e-9));
    }

    @Test
    void anExponentOfTwoIsAResistor() {
        LoadResult lamp = LoadPower.atFiringAngle(with(new Load.Filament(300, 230, 2, 1)), EUROPE, 1);
        LoadResult heater = LoadPower.atFiringAngle(with(new Load.Resistor(230.0 * 230 / 300)), EUROPE, 1);
        assertThat(lamp.watts()).isCloseTo(heater.watts(), within(1e-9));
        assertThat(lamp.rmsAmps()).isCloseTo(heater.rmsAmps(), within(1e-12));
    }

    @Test
    void aBarelyGlowingFilamentIsNeverColderThanCold() {
        FilamentLaw law = new FilamentLaw(new Load.Filament(300, 230, 1.55, 10));
        assertThat(law.coldOhms()).isCloseTo(230.0 * 230 / 300 / 10, within(1e-9));
        assertThat(law.ohmsAt(0)).isEqualTo(law.coldOhms());
        assertThat(law.ohmsAt(230)).isCloseTo(230.0 * 230 / 300, within(1e-9));
    }
}
