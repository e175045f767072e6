package clipramp.firing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.ClipSupply;
import clipramp.firing.RandomCircuits.Drawn;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What must hold in every circuit, on drawn ones; the seed is named where it does not. */
class FiringPropertiesTest {
    private static final long FIRST_SEED = 10_000;

    static Stream<Drawn> drawn() {
        return LongStream.range(FIRST_SEED, FIRST_SEED + 60).mapToObj(RandomCircuits::draw);
    }

    private static Solution solve(Drawn drawn) {
        return Firing.solve(drawn.design(), drawn.condition(), drawn.rampOhms());
    }

    /** Every resistance times k, every current and capacitance over k: the same instants, every energy over k. */
    @ParameterizedTest
    @MethodSource("drawn")
    void scalingResistancesUpAndCapacitorsDownLeavesTimesAlone(Drawn drawn) {
        double k = Math.exp(new SplittableRandom(drawn.seed()).nextDouble(-1.5, 1.5));
        Solution plain = solve(drawn);
        Solution scaled = solve(ScaledCircuit.of(drawn, k));
        assertThat(scaled.settling()).isEqualTo(plain.settling());
        assertThat(scaled.halves()).hasSameSizeAs(plain.halves());
        for (int h = 0; h < plain.halves().size(); h++) {
            HalfCycle a = plain.halves().get(h);
            HalfCycle b = scaled.halves().get(h);
            assertThat(b.pulses()).hasSameSizeAs(a.pulses());
            assertThat(b.firingIndex()).isEqualTo(a.firingIndex());
            assertThat(b.endVolts()).isCloseTo(a.endVolts(), within(1e-7));
            for (int i = 0; i < a.pulses().size(); i++) {
                Pulse p = a.pulses().get(i);
                Pulse q = b.pulses().get(i);
                assertThat(q.startSeconds()).isCloseTo(p.startSeconds(), within(1e-8 * a.seconds()));
                assertThat(q.gateJoules() * k).isCloseTo(p.gateJoules(), within(1e-7 * p.gateJoules() + 1e-18));
                assertThat(q.capacitorJoules() * k)
                        .isCloseTo(p.capacitorJoules(), within(1e-7 * Math.abs(p.capacitorJoules()) + 1e-18));
            }
        }
    }

    @ParameterizedTest
    @MethodSource("drawn")
    void everyHalfCycleStartsWhereTheLastEnded(Drawn drawn) {
        Solution solution = solve(drawn);
        List<HalfCycle> halves = solution.halves();
        assertThat(solution.settling()).isNotEqualTo(Solution.Settling.NEVER);
        for (int h = 0; h < halves.size(); h++) {
            HalfCycle next = halves.get((h + 1) % halves.size());
            assertThat(next.startVolts()).isCloseTo(halves.get(h).endVolts(), within(2e-9));
        }
    }

    /** What the source gives beyond the rectifier is what the parts turn into heat: nothing is stored over a period. */
    @ParameterizedTest
    @MethodSource("drawn")
    void sourceGivesWhatThePartsDissipate(Drawn drawn) {
        boolean wholePeriod = drawn.design().clip().rectifier() == ClipSupply.Rectifier.DIODE
                || solve(drawn).halves().size() == 1;
        if (!wholePeriod) {
            return;
        }
        double dropperOhms = drawn.design().clip().dropper().value();
        Waveforms w = Firing.waveforms(drawn.design(), drawn.condition(), drawn.rampOhms(), 20_000);
        double joules = 0;
        for (int i = 1; i < w.seconds().length; i++) {
            double before = w.dropperAmps()[i - 1] * (w.supplyVolts()[i - 1] + dropperOhms * w.dropperAmps()[i - 1]);
            double after = w.dropperAmps()[i] * (w.supplyVolts()[i] + dropperOhms * w.dropperAmps()[i]);
            joules += (before + after) / 2 * (w.seconds()[i] - w.seconds()[i - 1]);
        }
        double given = joules / w.seconds()[w.seconds().length - 1];
        Dissipation d = Firing.dissipation(drawn.design(), drawn.condition(), drawn.rampOhms());
        double turnedIntoHeat = d.dropperWatts()
                + d.zenerWatts()
                + d.baseOneWatts()
                + d.baseTwoWatts()
                + d.rampWatts()
                + d.deviceWatts()
                + d.gateWatts()
                + d.gateSeriesWatts()
                + d.gateShuntWatts();
        assertThat(turnedIntoHeat).isCloseTo(given, within(1e-5 * given));
    }

    /** Steady, no stall, no pulse under way at the zero: there a larger R_E never fires earlier. */
    @ParameterizedTest
    @MethodSource("drawn")
    void firesLaterWhenTheRampResistorGrows(Drawn drawn) {
        double last = 0;
        for (double factor = 1; factor < 1.6; factor += 0.1) {
            Solution solution = Firing.solve(drawn.design(), drawn.condition(), drawn.rampOhms() * factor);
            HalfCycle half = solution.halves().get(0);
            if (solution.hunts() || half.stalled() || half.pulses().isEmpty()) {
                return;
            }
            double first = half.pulses().stream()
                    .mapToDouble(Pulse::startSeconds)
                    .min()
                    .orElseThrow();
            assertThat(first).isGreaterThanOrEqualTo(last);
            last = first;
        }
    }

    /** More samples are more places to look at, not another solution. */
    @ParameterizedTest
    @MethodSource("drawn")
    void samplingMoreFinelyChangesNothing(Drawn drawn) {
        Waveforms coarse = Firing.waveforms(drawn.design(), drawn.condition(), drawn.rampOhms(), 2);
        Waveforms fine = Firing.waveforms(drawn.design(), drawn.condition(), drawn.rampOhms(), 997);
        double close = 1e-12 * coarse.seconds()[coarse.seconds().length - 1];
        int common = 0;
        int at = 0;
        for (int i = 0; i < coarse.seconds().length; i++) {
            while (fine.seconds()[at] < coarse.seconds()[i] - close) {
                at++;
            }
            if (fine.seconds()[at] <= coarse.seconds()[i] + close) {
                common++;
                assertThat(fine.rampVolts()[at]).isCloseTo(coarse.rampVolts()[i], within(1e-9));
            }
        }
        // Both ends and every event at least.
        assertThat(common).isGreaterThanOrEqualTo(4);
    }

    /** The solved hunting circuit: two half cycles that feed each other, and the load gets dc. */
    @Test
    void huntingHalfCyclesFeedEachOther() {
        ReferenceCases.Row row = ReferenceCases.rows().stream()
                .filter(ReferenceCases.Row::hunts)
                .findFirst()
                .orElseThrow();
        Solution solution = Firing.solve(row.design(), row.design().nominalCondition(), row.rampOhms());
        assertThat(solution.settling()).isEqualTo(Solution.Settling.HUNTS);
        assertThat(solution.state()).isEqualTo(FiringState.HUNTS);
        HalfCycle one = solution.halves().get(0);
        HalfCycle other = solution.halves().get(1);
        assertThat(one.endVolts()).isCloseTo(other.startVolts(), within(1e-9));
        assertThat(other.endVolts()).isCloseTo(one.startVolts(), within(1e-9));
        assertThat(one.firingRad().orElseThrow() - other.firingRad().orElseThrow())
                .satisfies(apart -> assertThat(Math.toDegrees(Math.abs(apart))).isBetween(0.8, 0.9));
        assertThat(one.pulses().size()).isNotEqualTo(other.pulses().size());
    }
}
