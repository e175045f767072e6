package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Linear forms obey the rules of linear algebra: what is done to the forms is done to their values. */
class AffineTest {
    private static final Affine ONE = form(2, -3, 5, -7, 11);
    private static final Affine OTHER = form(-13, 17, -19, 23, -29);

    private static Affine form(double ramp, double flux, double source, double sourceSlope, double constant) {
        Affine form = new Affine();
        form.set(ramp, source, constant);
        form.flux = flux;
        form.sourceSlope = sourceSlope;
        return form;
    }

    /** At ramp 1.5, core 0.25, source 4 and source slope 0.5. */
    private static double value(Affine form) {
        return form.at(1.5, 0.25, 4) + 0.5 * form.sourceSlope;
    }

    private static Affine copyOf(Affine form) {
        Affine copy = new Affine();
        copy.copy(form);
        return copy;
    }

    @Test
    void theValueIsTheSumOfTheTerms() {
        assertThat(value(ONE)).isCloseTo(2 * 1.5 - 3 * 0.25 + 5 * 4 - 7 * 0.5 + 11, within(1e-12));
    }

    @Test
    void addingAMultipleAddsThatMultipleOfTheValue() {
        Affine sum = copyOf(ONE);
        sum.add(-0.5, OTHER);
        assertThat(value(sum)).isCloseTo(value(ONE) - 0.5 * value(OTHER), within(1e-12));
        assertThat(sum.sourceSlope).isCloseTo(-7 - 0.5 * 23, within(1e-12));
    }

    @Test
    void theNegativeHasTheNegativeValue() {
        Affine negative = copyOf(ONE);
        negative.negate();
        assertThat(value(negative)).isCloseTo(-value(ONE), within(1e-12));
        assertThat(negative.sourceSlope).isEqualTo(7);
        assertThat(negative.flux).isEqualTo(3);
    }

    @Test
    void takingALevelOffRemembersWhatMayHaveCancelled() {
        Affine below = copyOf(ONE);
        below.below(-10);
        assertThat(value(below)).isCloseTo(value(ONE) + 10, within(1e-12));
        assertThat(below.cancelled).isEqualTo(10);
        assertThat(copyOf(below).cancelled).isEqualTo(10);
    }

    @Test
    void settingAnewForgetsEverything() {
        Affine form = copyOf(ONE);
        form.below(3);
        form.set(1, 2, 3);
        assertThat(value(form)).isCloseTo(1.5 + 8 + 3, within(1e-12));
        assertThat(form.cancelled).isZero();
        form.zero();
        assertThat(value(form)).isZero();
    }
}
