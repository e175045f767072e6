package clipramp.spread;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Characteristic;
import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Line;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.Ramp;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Surroundings;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import clipramp.engine.UnitValues;
import clipramp.power.KnobMap;
import clipramp.power.OperatingPoint;
import clipramp.runs.Watch;
import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ForkJoinPool;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;

/** Many units at once: what must hold of them whatever the seed. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class SpreadTest {
    private static final SpreadOptions SOME = new SpreadOptions(300, 7, DrawLaw.NORMAL, 0);

    private final Histogram[] last = new Histogram[1];

    /** The heater's spread, which several tests look at. */
    private final SpreadResult heater = Spread.run(SampleDesigns.heater(), SOME, Watch.NONE, drawn -> last[0] = drawn);

    @Test
    void theSameSeedGivesTheSameAnswerWhateverTheNumberOfThreads() throws Exception {
        Design design = SampleDesigns.heater();
        assertThat(inPool(1, design)).isEqualTo(heater);
        assertThat(inPool(3, design)).isEqualTo(heater);
    }

    @Test
    void anotherSeedGivesOtherUnits() {
        Design design = SampleDesigns.heater();
        List<Factor> factors = Factors.of(design);
        UnitValues one = UnitValues.nominal(design);
        UnitValues other = UnitValues.nominal(design);
        new Lot(design, factors, DrawLaw.NORMAL, 7).draw(5, one);
        new Lot(design, factors, DrawLaw.NORMAL, 8).draw(5, other);
        assertThat(other.capacitorFarads).isNotEqualTo(one.capacitorFarads);
        assertThat(other.standoff).isNotEqualTo(one.standoff);
        assertThat(other.lineVolts).isNotEqualTo(one.lineVolts);
    }

    private static SpreadResult inPool(int threads, Design design) throws Exception {
        ForkJoinPool pool = new ForkJoinPool(threads);
        try {
            return pool.submit(() -> Spread.run(design, SOME, Watch.NONE)).get();
        } finally {
            pool.shutdown();
        }
    }

    @Test
    void theWorstCaseEnclosesEveryUnit() {
        Design design = SampleDesigns.heater();
        Lot lot = new Lot(design, Factors.of(design), DrawLaw.UNIFORM, 3);
        Sampling sampling = new Sampling(lot, new double[] {1, 0.5, 0}, 300);
        sampling.run(Watch.NONE, drawn -> {});
        SpreadResult result = Spread.run(design, new SpreadOptions(300, 3, DrawLaw.UNIFORM, 0), Watch.NONE);
        for (int p = 0; p < 3; p++) {
            PositionSpread told = result.positions().get(5 * p);
            double[] fractions = sampling.fraction[p];
            assertThat(told.worstFraction().least())
                    .isLessThanOrEqualTo(Arrays.stream(fractions).min().orElseThrow());
            assertThat(told.worstFraction().greatest())
                    .isGreaterThanOrEqualTo(Arrays.stream(fractions).max().orElseThrow());
            double[] angles = sampling.firingRad[p];
            assertThat(told.worstFiring().least())
                    .isLessThanOrEqualTo(Arrays.stream(angles).min().orElseThrow());
            assertThat(told.worstFiring().greatest())
                    .isGreaterThanOrEqualTo(Arrays.stream(angles).max().orElseThrow());
        }
    }

    @Test
    void unitsWithoutTolerancesAreAllTheNominalOne() {
        Design exact = exactButFor(Characteristic.exactly(0.65));
        SpreadResult result = Spread.run(exact, SOME, Watch.NONE);
        assertThat(result.factors()).extracting(Factor::path).containsExactly("line.frequency");
        OperatingPoint nominal = KnobMap.at(exact, exact.nominalCondition(), 0.5);
        PositionSpread told = result.positions().get(5);
        assertThat(told.worstFraction().nominal()).isCloseTo(nominal.load().fraction(), within(1e-9));
        // What the line's frequency alone does: a later angle by as much as the half cycle is shorter.
        assertThat(told.fraction().get(3)).isCloseTo(nominal.load().fraction(), within(2e-3));
        assertThat(told.worstFraction().greatest() - told.worstFraction().least())
                .isLessThan(0.02);
    }

    @Test
    void theOnlyToleranceIsTheWholeSpread() {
        SpreadResult result = Spread.run(exactButFor(Characteristic.of(0.56, 0.65, 0.75)), SOME, Watch.NONE);
        Influence most = result.influences().get(0);
        assertThat(most.path()).isEqualTo("trigger.device.standoff");
        assertThat(most.total()).isGreaterThan(0.95);
        assertThat(most.firstOrder()).isGreaterThan(0.8);
        assertThat(most.firingLowRad()).isLessThan(most.firingHighRad());
        assertThat(result.sentence()).contains("standoff ratio");
    }

    @Test
    void aTighterPartNarrowsTheBand() {
        Design wide = SampleDesigns.heater();
        Pot pot = wide.ramp().pot().orElseThrow();
        Design tight = wide.withRamp(new Ramp(
                wide.ramp().capacitor(),
                wide.ramp().fixed(),
                Optional.of(
                        new Pot(Part.of(pot.track().value()), pot.endOhms(), pot.law(), pot.sense(), pot.shunt()))));
        assertThat(width(Spread.run(tight, SOME, Watch.NONE))).isLessThan(0.95 * width(heater));
    }

    private static double width(SpreadResult result) {
        List<Double> fractions = result.positions().get(5).fraction();
        return fractions.get(5) - fractions.get(1);
    }

    @Test
    void aCancelledRunTellsOfTheFinishedPart() {
        SpreadResult result =
                Spread.run(SampleDesigns.heater(), new SpreadOptions(50_000, 1, DrawLaw.NORMAL, 0), new Watch() {
                    private boolean seen;

                    @Override
                    public void progress(int done, int of) {
                        seen = true;
                    }

                    @Override
                    public boolean isCancelled() {
                        return seen;
                    }
                });
        assertThat(result.isComplete()).isFalse();
        assertThat(result.units()).isBetween(1, 49_999);
        assertThat(result.positions()).hasSize(11);
        assertThat(result.wanted().orElseThrow().of()).isEqualTo(result.units());
    }

    @Test
    void theHistogramCountsEveryUnitOnce() {
        assertThat(last[0].counts().stream().mapToInt(Integer::intValue).sum()).isEqualTo(300);
        assertThat(last[0].position()).isEqualTo(0.5);
    }

    @Test
    void drawingAUnitAllocatesNothing() {
        Design design = SampleDesigns.heater();
        Lot lot = new Lot(design, Factors.of(design), DrawLaw.NORMAL, 1);
        UnitSolver solver = new UnitSolver(design);
        UnitOutcome outcome = new UnitOutcome();
        var unit = lot.blank();
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long thread = Thread.currentThread().getId();
        long allocated = Long.MAX_VALUE;
        // What the virtual machine itself allocates now and then is not meant: the quietest of some batches counts.
        for (int batch = 0; batch < 12; batch++) {
            long before = threads.getThreadAllocatedBytes(thread);
            for (int i = 0; i < 300; i++) {
                lot.draw(300L * batch + i, unit);
                solver.solve(unit, 0.5, outcome);
            }
            allocated = Math.min(allocated, threads.getThreadAllocatedBytes(thread) - before);
        }
        assertThat(allocated).as("bytes for 300 units").isZero();
    }

    /** The heater with nothing but its standoff ratio open. */
    private static Design exactButFor(Characteristic standoff) {
        Design heater = SampleDesigns.heater();
        UnijunctionTrigger trigger = (UnijunctionTrigger) heater.trigger();
        Unijunction sheet = trigger.device();
        Unijunction device = new Unijunction(
                sheet.id(),
                standoff,
                Characteristic.exactly(sheet.interbaseOhms().nominal()),
                Characteristic.exactly(sheet.interbaseDriftPerKelvin().nominal()),
                Characteristic.exactly(sheet.emitterDropVolts().nominal()),
                Characteristic.exactly(sheet.emitterDriftVoltsPerKelvin().nominal()),
                Characteristic.exactly(sheet.peakCurrentAmps().nominal()),
                new Unijunction.Valley(
                        Characteristic.exactly(sheet.valley().amps().nominal()),
                        Characteristic.exactly(sheet.valley().volts().nominal()),
                        sheet.valley().atVolts()),
                sheet.saturation(),
                sheet.modulated(),
                Optional.empty(),
                sheet.limits());
        ClipSupply clip = heater.clip();
        Zener zener = clip.zener();
        Ramp ramp = heater.ramp();
        Pot pot = ramp.pot().orElseThrow();
        return heater.withLine(new Line(230, 50, 230, 230, List.of()))
                .withSurroundings(new Surroundings(25, 25))
                .withClip(new ClipSupply(
                        clip.tap(),
                        clip.rectifier(),
                        clip.diodeDropVolts(),
                        Part.of(clip.dropper().value()),
                        new Zener(
                                zener.id(),
                                Characteristic.exactly(zener.volts().nominal()),
                                zener.testCurrentAmps(),
                                zener.slopeOhms(),
                                zener.driftPerKelvin(),
                                zener.ratedWatts()),
                        clip.winding()))
                .withRamp(new Ramp(
                        Part.of(ramp.capacitor().value()),
                        Part.of(ramp.fixed().value()),
                        Optional.of(new Pot(
                                Part.of(pot.track().value()), pot.endOhms(), pot.law(), pot.sense(), pot.shunt()))))
                .withTrigger(new UnijunctionTrigger(device, Part.of(47), Part.of(470)))
                .withGate(new GateDrive(
                        GateDrive.Coupling.DIRECT,
                        Part.of(0),
                        Optional.of(Part.of(1000)),
                        3,
                        20e-6,
                        GateDrive.Polarity.POSITIVE,
                        Optional.empty()));
    }
}
