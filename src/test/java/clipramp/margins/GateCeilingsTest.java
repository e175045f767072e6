package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Design;
import clipramp.circuit.SampleDesigns;
import clipramp.firing.Firing;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Test;

/** What the gate bears at most, and what the pulse transformer does, each by its rating and by a law of its own. */
class GateCeilingsTest {
    private static final Design HEATER = SampleDesigns.heater();
    private static final Design TWO = SampleDesigns.inverseParallelHeater();
    private static final String LIMITS = "thyristor.device.gate.limits.";

    private static Margin margin(Design design, MarginKind kind) {
        return OnTheBench.of(new GateCeilings(OnTheBench.usual(design)).all(), kind);
    }

    private static Margin transformer(Design design, MarginKind kind) {
        return OnTheBench.of(new TransformerMargins(OnTheBench.usual(design)).all(), kind);
    }

    private static double most(ToDoubleFunction<Pulse> figure) {
        double most = 0;
        for (double ohms : new double[] {5_600, 73_600}) {
            Solution solution = Firing.solve(HEATER, OnTheBench.USUAL, ohms);
            most = Math.max(
                    most,
                    Bench.pulses(solution).stream().mapToDouble(figure).max().orElse(0));
        }
        return most;
    }

    @Test
    void thePeaksAreTheLargestOfEveryPulseAtBothEnds() {
        Margin amps = margin(HEATER, MarginKind.GATE_CURRENT_LIMIT);
        assertThat(amps.demand()).isEqualTo(2);
        assertThat(amps.offered()).isCloseTo(most(Pulse::peakGateAmps), within(1e-12));
        assertThat(amps.formula()).startsWith("typical gate gets ").endsWith("limit 2 A");
        // A typical gate is a knee of 0.7 V and 10 ohm: its voltage at that current follows.
        Margin volts = margin(HEATER, MarginKind.GATE_VOLTAGE_LIMIT);
        assertThat(volts.demand()).isEqualTo(10);
        assertThat(volts.offered()).isCloseTo(0.7 + 10 * amps.offered(), within(1e-9));
        assertThat(volts.formula()).endsWith("limit 10 V");
    }

    @Test
    void thePeakPowerIsAllowedWhatLeavesTheRatedPulsesEnergy() {
        // The sheet's 20 W hold for 1 us: a pulse twice as wide is allowed half, for equal energy.
        Margin power = margin(HEATER, MarginKind.GATE_POWER_LIMIT);
        Pulse pulse = hardest();
        double width = pulse.gateJoules() / pulse.peakGateWatts();
        assertThat(width).isGreaterThan(1e-6);
        assertThat(power.demand()).isCloseTo(20 * 1e-6 / width, within(1e-9));
        assertThat(power.offered()).isCloseTo(pulse.peakGateWatts(), within(1e-9));
        assertThat(power.formula()).contains("P_GM 20 W for 1 µs, so " + Say.watts(power.demand()) + " for this pulse");
        assertThat(power.formula()).contains(Say.seconds(width) + " wide");
    }

    /** The pulse that uses most of what it is allowed, energy over the rated pulse's energy. */
    private static Pulse hardest() {
        Pulse hardest =
                Firing.solve(HEATER, OnTheBench.USUAL, 5_600).shown().pulses().get(0);
        for (double ohms : new double[] {5_600, 73_600}) {
            for (Pulse pulse : Bench.pulses(Firing.solve(HEATER, OnTheBench.USUAL, ohms))) {
                hardest = pulse.gateJoules() > hardest.gateJoules() ? pulse : hardest;
            }
        }
        return hardest;
    }

    @Test
    void aPulseShorterThanTheRatedOneIsAllowedTheWholePeakPower() {
        Design patient = Changed.with(HEATER, LIMITS + "peakWattsForSeconds", OptionalDouble.of(1e-3));
        Margin power = margin(patient, MarginKind.GATE_POWER_LIMIT);
        assertThat(power.demand()).isEqualTo(20);
        assertThat(power.formula()).endsWith("P_GM 20 W for 1 ms");
        assertThat(power.offered()).isCloseTo(most(Pulse::peakGateWatts), within(1e-12));
        Design silent = Changed.with(HEATER, LIMITS + "peakWattsForSeconds", OptionalDouble.empty());
        assertThat(margin(silent, MarginKind.GATE_POWER_LIMIT).formula())
                .endsWith("P_GM 20 W (the sheet states no pulse length)");
    }

    @Test
    void theMeanIsTheEnergyOfEveryPulseAHundredTimesASecond() {
        Solution solution = Firing.solve(HEATER, OnTheBench.USUAL, 5_600);
        List<Pulse> pulses = solution.shown().pulses();
        double joules = pulses.stream().mapToDouble(Pulse::gateJoules).sum();
        Margin mean = margin(HEATER, MarginKind.GATE_MEAN_POWER);
        assertThat(mean.demand()).isEqualTo(0.5);
        assertThat(mean.offered()).isCloseTo(100 * joules, within(1e-12));
        assertThat(mean.formula()).startsWith(pulses.size() + " pulses a half cycle at R_E = 5.6 kΩ");
        assertThat(mean.formula()).endsWith("P_G(AV) 500 mW");
    }

    @Test
    void theStandingVoltageIsTheBaseBarsShareOfTheHighestSupply() {
        // R1p = 39 || 1000 ohm under 470 + 4700 ohm of bar, R_GK at the gate direct; the zener's 21 V at the most.
        double base = 1 / (1 / 39.0 + 1 / 1000.0);
        double share = base / (470 + 4_700 + base);
        Margin standing = margin(HEATER, MarginKind.GATE_STANDING_VOLTAGE);
        assertThat(standing.demand()).isEqualTo(0.2);
        assertThat(standing.offered()).isBetween(20.7 * share, 21.5 * share);
        assertThat(standing.formula()).contains("x " + Say.ohms(base)).contains("V_GD 200 mV at a junction of 125 °C");
        assertThat(margin(TWO, MarginKind.GATE_STANDING_VOLTAGE).offered()).isZero();
        assertThat(margin(TWO, MarginKind.GATE_STANDING_VOLTAGE).formula())
                .startsWith("no base bar current reaches the gate");
    }

    @Test
    void whatTheProfileDoesNotStateIsNamedByItsKey() {
        for (String[] missing : new String[][] {
            {"amps", "GATE_CURRENT_LIMIT", "limits.current"},
            {"volts", "GATE_VOLTAGE_LIMIT", "limits.voltage"},
            {"peakWatts", "GATE_POWER_LIMIT", "limits.peak-power"},
            {"meanWatts", "GATE_MEAN_POWER", "limits.mean-power"},
        }) {
            Design design = Changed.with(HEATER, LIMITS + missing[0], OptionalDouble.empty());
            Margin margin = margin(design, MarginKind.valueOf(missing[1]));
            assertThat(margin.verdict()).isEqualTo(Verdict.NOT_JUDGED);
            assertThat(margin.formula())
                    .isEqualTo("not judged: the profile states no thyristor.device.gate." + missing[2]);
        }
        Design none = Changed.with(HEATER, "thyristor.device.gate.nonTrigger", Optional.empty());
        assertThat(margin(none, MarginKind.GATE_STANDING_VOLTAGE).formula())
                .isEqualTo("not judged: the profile states no thyristor.device.gate.non-trigger");
    }

    @Test
    void aDriveWithoutATransformerHasNoMarginsOfOne() {
        assertThat(new TransformerMargins(OnTheBench.usual(HEATER)).all()).isEmpty();
        assertThat(new TransformerMargins(OnTheBench.usual(TWO)).all())
                .extracting(Margin::kind)
                .containsExactly(
                        MarginKind.TRANSFORMER_VOLT_SECONDS,
                        MarginKind.GATE_REVERSE_VOLTAGE,
                        MarginKind.TRANSFORMER_CORE);
    }

    @Test
    void aCoreHoldsItsInductanceTimesItsCurrent() {
        // Flux linkage L I; the pulse's own volt-seconds and what stood before the pulse make it (Faraday).
        double amps = Math.max(
                Firing.study(TWO, OnTheBench.USUAL, 5_600)
                        .transformerDuty()
                        .orElseThrow()
                        .magnetisingPeakAmps(),
                Firing.study(TWO, OnTheBench.USUAL, 73_600)
                        .transformerDuty()
                        .orElseThrow()
                        .magnetisingPeakAmps());
        Margin core = transformer(TWO, MarginKind.TRANSFORMER_CORE);
        assertThat(core.demand()).isEqualTo(250e-6);
        assertThat(core.offered()).isCloseTo(2e-3 * amps, within(1e-15));
        assertThat(core.formula())
                .startsWith("2 mH x " + Say.amps(amps) + " = " + Say.voltSeconds(2e-3 * amps))
                .endsWith("rating 250 µVs");
        Margin pulse = transformer(TWO, MarginKind.TRANSFORMER_VOLT_SECONDS);
        assertThat(pulse.demand()).isEqualTo(250e-6);
        assertThat(pulse.offered()).isPositive().isLessThan(core.offered());
        assertThat(transformer(TWO, MarginKind.GATE_REVERSE_VOLTAGE).demand()).isEqualTo(5);
        assertThat(transformer(TWO, MarginKind.GATE_REVERSE_VOLTAGE).offered()).isPositive();
    }

    @Test
    void aTransformerWithoutARatingSaysSo() {
        Design unrated = Changed.with(TWO, "gate.transformer.voltSeconds", OptionalDouble.empty());
        for (MarginKind kind : List.of(MarginKind.TRANSFORMER_CORE, MarginKind.TRANSFORMER_VOLT_SECONDS)) {
            assertThat(transformer(unrated, kind).formula())
                    .isEqualTo("not judged: the design states no gate.transformer.volt-seconds");
        }
        Design gate = Changed.with(TWO, LIMITS + "reverseVolts", OptionalDouble.empty());
        assertThat(transformer(gate, MarginKind.GATE_REVERSE_VOLTAGE).formula())
                .isEqualTo("not judged: the profile states no thyristor.device.gate.limits.reverse");
    }
}
