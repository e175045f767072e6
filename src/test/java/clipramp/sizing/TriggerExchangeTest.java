package clipramp.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.engine.NetworkOfDesign;
import clipramp.engine.ProgrammableDevice;
import clipramp.units.PreferredSeries;
import java.util.List;
import org.junit.jupiter.api.Test;

class TriggerExchangeTest {
    private static Design programmable() {
        return SampleDesigns.heater()
                .withTrigger(SampleDesigns.programmableHeater().trigger());
    }

    @Test
    void theDividerOfAStandoffRatioOfAThirdIsThePrintedOne() {
        // Rashid, Power Electronics, 4th edition, example 9.6: eta 1/3, R_G 20 kohm gives 60 kohm and 30 kohm.
        Part[] divider = TriggerExchange.divider(1 / 3.0, 20e3, SampleDesigns.heater());
        assertThat(divider[1].value() / (divider[0].value() + divider[1].value()))
                .isCloseTo(1 / 3.0, within(0.006));
        assertThat(divider[0].value()).isCloseTo(60e3, within(0.35 * 60e3));
        assertThat(divider[1].value()).isCloseTo(30e3, within(0.35 * 30e3));
        assertThat(PreferredSeries.E24.contains(divider[0].value())).isTrue();
        assertThat(PreferredSeries.E24.contains(divider[1].value())).isTrue();
    }

    @Test
    void everyDividerFiresAtTheUnijunctionsOwnShareOfTheSupply() {
        Design own = SampleDesigns.heater();
        Condition usual = own.nominalCondition();
        double share = NetworkOfDesign.of(own, usual, 10e3).peakShare();
        List<TriggerExchange> dividers = TriggerExchange.dividers(own, programmable());
        assertThat(dividers).hasSizeGreaterThan(1);
        for (TriggerExchange exchange : dividers) {
            assertThat(NetworkOfDesign.of(exchange.design(), usual, 10e3).peakShare())
                    .isCloseTo(share, within(0.01));
            assertThat(exchange.design().ramp()).isEqualTo(own.ramp());
        }
    }

    @Test
    void oneOfThemStandsNearEveryGateResistanceThatTheSheetTabulates() {
        List<Double> gates = TriggerExchange.dividers(SampleDesigns.heater(), programmable()).stream()
                .map(exchange -> ProgrammableDevice.gateOhms(
                        (ProgrammableTrigger) exchange.design().trigger()))
                .toList();
        // 2N6027 and 2N6028: peak and valley currents are given at 10 kohm (manufacturer's data sheet).
        assertThat(gates).anySatisfy(ohms -> assertThat(ohms / 10e3).isBetween(0.7, 1.4));
    }
}
