package clipramp.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** Against the tables of IEC 60063 (E24 and below from memory; E48 and E96 as every handbook prints them). */
class PreferredSeriesTest {
    private static double[] decade(PreferredSeries series) {
        return IntStream.range(0, series.perDecade()).mapToDouble(series::at).toArray();
    }

    @Test
    void e24IsTheStandardsTable() {
        assertThat(decade(PreferredSeries.E24))
                .containsExactly(
                        1.0, 1.1, 1.2, 1.3, 1.5, 1.6, 1.8, 2.0, 2.2, 2.4, 2.7, 3.0, 3.3, 3.6, 3.9, 4.3, 4.7, 5.1, 5.6,
                        6.2, 6.8, 7.5, 8.2, 9.1);
    }

    @Test
    void e12E6AndE3ArePartsOfE24() {
        assertThat(decade(PreferredSeries.E12))
                .containsExactly(1.0, 1.2, 1.5, 1.8, 2.2, 2.7, 3.3, 3.9, 4.7, 5.6, 6.8, 8.2);
        assertThat(decade(PreferredSeries.E6)).containsExactly(1.0, 1.5, 2.2, 3.3, 4.7, 6.8);
        assertThat(decade(PreferredSeries.E3)).containsExactly(1.0, 2.2, 4.7);
    }

    @Test
    void e48IsTheStandardsTable() {
        assertThat(decade(PreferredSeries.E48))
                .containsExactly(
                        1.00, 1.05, 1.10, 1.15, 1.21, 1.27, 1.33, 1.40, 1.47, 1.54, 1.62, 1.69, 1.78, 1.87, 1.96, 2.05,
                        2.15, 2.26, 2.37, 2.49, 2.61, 2.74, 2.87, 3.01, 3.16, 3.32, 3.48, 3.65, 3.83, 4.02, 4.22, 4.42,
                        4.64, 4.87, 5.11, 5.36, 5.62, 5.90, 6.19, 6.49, 6.81, 7.15, 7.50, 7.87, 8.25, 8.66, 9.09, 9.53);
    }

    @Test
    void e192Holds920InThePlaceOf919AndE96HasNeither() {
        assertThat(decade(PreferredSeries.E192)).contains(9.20).doesNotContain(9.19);
        assertThat(decade(PreferredSeries.E96)).contains(9.09, 9.31).doesNotContain(9.20, 9.19);
        assertThat(Arrays.stream(decade(PreferredSeries.E192)).distinct().count())
                .isEqualTo(192);
    }

    @Test
    void stepsAndRoundsInEveryDecade() {
        PreferredSeries e12 = PreferredSeries.E12;
        assertThat(e12.nearest(4650)).isEqualTo(4700);
        assertThat(e12.nearest(1e-7)).isEqualTo(1e-7);
        assertThat(e12.nextUp(4700)).isEqualTo(5600);
        assertThat(e12.nextDown(4700)).isEqualTo(3900);
        assertThat(e12.nextUp(8200)).isEqualTo(10_000);
        assertThat(e12.nextDown(1e-9)).isEqualTo(8.2e-10);
        assertThat(e12.atLeast(4700)).isEqualTo(4700);
        assertThat(e12.atLeast(4701)).isEqualTo(5600);
        assertThat(e12.atMost(4699)).isEqualTo(3900);
        assertThat(e12.step(1000, 12)).isEqualTo(10_000);
        assertThat(e12.step(1000, -1)).isEqualTo(820);
        assertThat(e12.contains(4.7e-6)).isTrue();
        assertThat(e12.contains(5e3)).isFalse();
        assertThat(PreferredSeries.E96.nearest(4700)).isEqualTo(4750); // 4640 is off by 1.29 %, 4750 by 1.06 %
    }

    @Test
    void refusesWhatHasNoLogarithm() {
        assertThatThrownBy(() -> PreferredSeries.E24.nearest(0)).hasMessageContaining("above zero");
    }
}
