package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Characteristic;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Surroundings;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Winding;
import clipramp.engine.ClippedSupply;
import clipramp.engine.Network;
import clipramp.engine.NetworkOfDesign;
import clipramp.margins.Margin.Sense;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What a figure is called at the edges of its demand, which of several is the worst, and where a design is judged. */
class FindingTest {
    private static final OptionalDouble FREE = OptionalDouble.empty();

    private static Finding finding(Sense sense, double demand, double offered) {
        return new Finding("here", demand, offered, sense, "f");
    }

    @ParameterizedTest
    @CsvSource({
        // GATE_TIME and THYRISTOR_RMS hold from a ratio of 1.2, the least reserve to raw figures of a sheet.
        "GATE_TIME,10,12,HOLDS",
        "GATE_TIME,10,11.99,TIGHT",
        "GATE_TIME,10,10,TIGHT",
        "GATE_TIME,10,9.99,FAILS",
        "GATE_TIME,10,0,FAILS",
        "GATE_TIME,0,0,HOLDS",
        "GATE_TIME,NaN,1,NOT_JUDGED",
        "GATE_TIME,1,NaN,NOT_JUDGED",
        "GATE_CHARGE,10,1,TIGHT",
        "THYRISTOR_RMS,12,10,HOLDS",
        "THYRISTOR_RMS,11.99,10,TIGHT",
        "THYRISTOR_RMS,10,10,TIGHT",
        "THYRISTOR_RMS,9.99,10,FAILS",
        "THYRISTOR_RMS,10,0,HOLDS",
        "THYRISTOR_RMS,0,0,HOLDS",
        "THYRISTOR_RMS,0,1,FAILS",
    })
    void theVerdictTurnsAtTheDemandAndAtTheReserve(MarginKind kind, double demand, double offered, Verdict verdict) {
        assertThat(kind.holdsFrom()).isEqualTo(kind == MarginKind.GATE_CHARGE ? kind.holdsFrom() : 1.2);
        assertThat(finding(kind.sense(), demand, offered).verdict(kind)).isEqualTo(verdict);
    }

    @Test
    void theRatioIsAboveOneOnTheGoodSideAndAbsentWithoutADivisor() {
        assertThat(finding(Sense.AT_LEAST, 10, 15).ratio()).hasValue(1.5);
        assertThat(finding(Sense.AT_MOST, 15, 10).ratio()).hasValue(1.5);
        assertThat(finding(Sense.AT_LEAST, 0, 15).ratio()).isEmpty();
        assertThat(finding(Sense.AT_MOST, 15, 0).ratio()).isEmpty();
        assertThat(finding(Sense.AT_MOST, Double.NaN, 1).ratio()).isEmpty();
        assertThat(finding(Sense.AT_LEAST, 1, Double.NaN).ratio()).isEmpty();
    }

    @Test
    void theGravestVerdictIsTheWorstAndThenTheSmallestRatio() {
        MarginKind kind = MarginKind.THYRISTOR_RMS;
        Finding easy = finding(Sense.AT_MOST, 10, 1);
        Finding idle = finding(Sense.AT_MOST, 10, 0);
        Finding close = finding(Sense.AT_MOST, 10, 8);
        Finding over = finding(Sense.AT_MOST, 10, 11);
        Finding farOver = finding(Sense.AT_MOST, 10, 20);
        Finding forbidden = finding(Sense.AT_MOST, 0, 3);
        Finding missing = Finding.missing(kind, "any condition", "a datum");
        assertThat(Finding.worst(kind, List.of(idle, easy, close)).offered()).isEqualTo(8);
        assertThat(Finding.worst(kind, List.of(close, over, easy)).offered()).isEqualTo(11);
        assertThat(Finding.worst(kind, List.of(over, farOver, close)).offered()).isEqualTo(20);
        assertThat(Finding.worst(kind, List.of(farOver, forbidden)).offered()).isEqualTo(3);
        assertThat(Finding.worst(kind, List.of(missing, easy)).verdict()).isEqualTo(Verdict.NOT_JUDGED);
        assertThat(Finding.worst(kind, List.of(missing, over)).verdict()).isEqualTo(Verdict.FAILS);
        Margin margin = Finding.worst(kind, List.of(over));
        assertThat(margin.ratio().orElseThrow()).isCloseTo(10 / 11.0, within(1e-15));
        assertThat(margin.remedy()).isEqualTo(kind.remedy());
        assertThat(margin.unit()).isEqualTo("A");
    }

    @Test
    void aDesignIsJudgedOnEveryLineAtEveryTemperature() {
        Design heater = SampleDesigns.heater();
        assertThat(JudgedCondition.of(heater, FREE, FREE))
                .extracting(JudgedCondition::words)
                .containsExactlyInAnyOrder(
                        "nominal line, 0 °C",
                        "nominal line, 25 °C",
                        "nominal line, 50 °C",
                        "low line, 0 °C",
                        "low line, 25 °C",
                        "low line, 50 °C",
                        "high line, 0 °C",
                        "high line, 25 °C",
                        "high line, 50 °C");
        Design steady = heater.withLine(new Line(230, 60, 230, 253, List.of()));
        assertThat(JudgedCondition.of(steady.withSurroundings(new Surroundings(25, 25)), FREE, FREE))
                .extracting(JudgedCondition::condition)
                .containsExactlyInAnyOrder(new Condition(230, 60, 25), new Condition(253, 60, 25));
        Design capped = heater.withLine(new Line(230, 50, 207, 230, List.of()));
        assertThat(JudgedCondition.of(capped.withSurroundings(new Surroundings(25, 25)), FREE, FREE))
                .extracting(JudgedCondition::words)
                .containsExactlyInAnyOrder("nominal line, 25 °C", "low line, 25 °C");
        assertThat(JudgedCondition.of(heater, OptionalDouble.of(200), OptionalDouble.of(70)))
                .containsExactly(new JudgedCondition(new Condition(200, 50, 70), "200 V, 70 °C"));
    }

    @Test
    void coldestAndHottestAreEndsOfWhatIsJudged() {
        Bench bench = new Bench(SampleDesigns.heater(), FREE, FREE);
        assertThat(bench.coldest()).hasSize(3).allMatch(at -> at.condition().celsius() == 0);
        assertThat(bench.hottest()).hasSize(3).allMatch(at -> at.condition().celsius() == 50);
        assertThat(bench.leastOhms()).isCloseTo(5_600, within(1e-9));
        assertThat(bench.mostOhms()).isCloseTo(73_600, within(1e-9));
        assertThat(bench.midOhms()).isCloseTo(39_600, within(1e-9));
        assertThat(bench.settings()).hasSize(11);
        assertThat(new Bench(SampleDesigns.heater(), OptionalDouble.of(200), OptionalDouble.of(70)).usual())
                .isEqualTo(new Condition(200, 50, 70));
    }

    @Test
    void sheetLimitsMoveTheOneFigureThatTheyAreAbout() {
        // 2N2646: peak-point current 5 uA at most, valley current 4 mA at least; 2N6027 at 10 k: 5 uA and 70 uA.
        Design heater = SampleDesigns.heater();
        var greedy = (UnijunctionTrigger) SheetLimits.highestPeakCurrent(heater).trigger();
        assertThat(greedy.device().peakCurrentAmps().nominal()).isEqualTo(5e-6);
        assertThat(greedy.device().valley())
                .isEqualTo(SampleDesigns.unijunction2n2646().valley());
        var lasting =
                (UnijunctionTrigger) SheetLimits.lowestValleyCurrent(heater).trigger();
        assertThat(lasting.device().valley().amps().nominal()).isEqualTo(4e-3);
        assertThat(lasting.device().valley().volts().nominal()).isEqualTo(2);
        assertThat(lasting.device().peakCurrentAmps().nominal()).isEqualTo(1e-6);
        assertThat(lasting.baseOne()).isEqualTo(heater.trigger().baseOne());

        Design programmable = SampleDesigns.programmableHeater();
        var highest = (ProgrammableTrigger)
                SheetLimits.highestPeakCurrent(programmable).trigger();
        assertThat(figures(highest.device().peakCurrentAmps())).containsExactly(5e-6, 2e-6);
        assertThat(figures(highest.device().valleyCurrentAmps())).containsExactly(150e-6, 18e-6);
        var lowest = (ProgrammableTrigger)
                SheetLimits.lowestValleyCurrent(programmable).trigger();
        assertThat(figures(lowest.device().valleyCurrentAmps())).containsExactly(70e-6, 18e-6);
        assertThat(figures(lowest.device().peakCurrentAmps())).containsExactly(4e-6, 1.25e-6);
    }

    private static List<Double> figures(List<AtGateResistance> table) {
        return table.stream()
                .map(AtGateResistance::value)
                .map(Characteristic::nominal)
                .toList();
    }

    @Test
    void theValleyVoltageGrowsWithTheSupplyFromTheEmittersDrop() {
        // Through V_D = 0.47 V at no supply and V_V = 2 V at 20 V.
        Design heater = SampleDesigns.heater();
        assertThat(SheetLimits.valleyVolts(heater, 0)).isCloseTo(0.47, within(1e-12));
        assertThat(SheetLimits.valleyVolts(heater, 20)).isCloseTo(2, within(1e-12));
        assertThat(SheetLimits.valleyVolts(heater, 10)).isCloseTo(1.235, within(1e-12));
        // One silicon junction, common practice 0.6 V.
        assertThat(SheetLimits.valleyVolts(SampleDesigns.programmableHeater(), 20))
                .isEqualTo(0.6);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1, 18, 24, 230})
    void theClippedSupplysCrestKeepsKirchhoffsCurrentLaw(double secondaryVolts) {
        Design design = Changed.with(
                SampleDesigns.heater(), "clip.winding", Optional.of(new Winding(230, secondaryVolts, false, 0)));
        Condition high = new Condition(253, 50, 25);
        Network network = NetworkOfDesign.of(design, high, 40_000);
        double supply = ClippedSupply.crestVolts(design, high, network);
        double source = Math.sqrt(2) * 253 * secondaryVolts / 230 - 1.4;
        double peak = network.peakShare() * supply + network.emitterDropVolts;
        double taken = supply * network.standingSiemens()
                + (supply - peak) / 40_000
                + Math.max(0, (supply - network.zenerKneeVolts) / network.zenerSlopeOhms);
        double brought = (source - supply) / 10_000;
        assertThat(supply).isNotNegative();
        if (supply > 0) {
            assertThat(taken).isCloseTo(brought, within(1e-12));
        }
        assertThat(supply > network.zenerKneeVolts).isEqualTo(secondaryVolts > 100);
    }
}
