package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Changed;
import clipramp.circuit.Design;
import clipramp.circuit.SampleDesigns;
import clipramp.margins.Margin.Sense;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Laws that hold for every design, on drawn ones: values spread by up to a factor of four either way. */
class JudgePropertiesTest {
    private static final long SEED = 7_0815;
    private static final int DRAWS = 12;
    private static final List<String> VALUES = List.of(
            "clip.dropper.value",
            "ramp.capacitor.value",
            "ramp.fixed.value",
            "ramp.pot.track.value",
            "trigger.baseOne.value",
            "load.resistanceOhms");

    private static Design drawn(Random random) {
        List<Design> from = List.of(
                SampleDesigns.heater(),
                SampleDesigns.halfWaveHeater(),
                SampleDesigns.thyristorTapHeater(),
                SampleDesigns.programmableHeater(),
                SampleDesigns.inverseParallelHeater(),
                SampleDesigns.windingHeater(0.4 * random.nextDouble(), random.nextBoolean()));
        Design design = from.get(random.nextInt(from.size()));
        double[] values = {
            design.clip().dropper().value(),
            design.ramp().capacitor().value(),
            design.ramp().fixed().value(),
            design.ramp().pot().orElseThrow().track().value(),
            design.trigger().baseOne().value(),
            design.load().resistanceOhms()
        };
        for (int i = 0; i < values.length; i++) {
            design = Changed.with(design, VALUES.get(i), values[i] * Math.pow(4, 2 * random.nextDouble() - 1));
        }
        return design;
    }

    @Test
    void everyDrawnDesignIsJudgedConsistentlyAndAPinnedConditionIsNeverWorseThanTheWorst() {
        Random random = new Random(SEED);
        for (int draw = 0; draw < DRAWS; draw++) {
            Design design = drawn(random);
            String what = "seed " + SEED + " draw " + draw + " " + design.stage();
            Check free = Judge.check(design, OptionalDouble.empty(), OptionalDouble.empty());
            assertThat(free.verdict()).as(what).isEqualTo(free.margins().get(0).verdict());
            for (Margin margin : free.margins()) {
                consistent(margin, what + " " + margin.id());
            }
            Check pinned = Judge.check(design, OptionalDouble.of(design.line().lowVolts()), OptionalDouble.of(0));
            for (Margin margin : pinned.margins()) {
                notWorse(margin, free, what + " " + margin.id());
            }
        }
    }

    private static void consistent(Margin margin, String what) {
        if (margin.verdict() == Verdict.NOT_JUDGED) {
            assertThat(margin.ratio()).as(what).isEmpty();
            return;
        }
        assertThat(margin.demand()).as(what).isFinite();
        assertThat(margin.offered()).as(what).isFinite();
        boolean meets = margin.sense() == Sense.AT_LEAST
                ? margin.offered() >= margin.demand()
                : margin.offered() <= margin.demand();
        assertThat(meets)
                .as(what)
                .isEqualTo(margin.verdict() == Verdict.HOLDS
                        || margin.verdict() == Verdict.TIGHT && margin.ratio().orElseThrow() >= 1);
    }

    /**
     * Angle drift is left out: pinned to a line it looks at the frequency alone, from another angle. So is the standing
     * gate voltage, asked at the hottest by definition.
     */
    private static void notWorse(Margin pinned, Check free, String what) {
        Margin worst = free.margins().stream()
                .filter(m -> m.kind() == pinned.kind())
                .findFirst()
                .orElseThrow();
        boolean comparable = pinned.verdict() != Verdict.NOT_JUDGED
                && worst.verdict() != Verdict.NOT_JUDGED
                && pinned.kind() != MarginKind.ANGLE_DRIFT
                && pinned.kind() != MarginKind.GATE_STANDING_VOLTAGE
                && !settingsDiffer(pinned.kind());
        if (comparable && pinned.ratio().isPresent() && worst.ratio().isPresent()) {
            assertThat(pinned.ratio().getAsDouble())
                    .as(what)
                    .isGreaterThanOrEqualTo(worst.ratio().getAsDouble() * (1 - 1e-9));
        }
    }

    /** Whole-knob margins look at every setting at the usual condition only, which pinning moves. */
    private static boolean settingsDiffer(MarginKind kind) {
        return kind == MarginKind.HUNTING
                || kind == MarginKind.DC_IN_LOAD
                || kind == MarginKind.END_PULSE
                || kind == MarginKind.FULL_POWER_PULSE;
    }
}
