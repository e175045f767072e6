package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

/** RFC 4180, section 2: rules 1 (CRLF), 5 and 6 (quoting), 7 (doubled quotes). */
class CsvTest {
    @Test
    void recordsEndInCarriageReturnAndLineFeed() {
        assertThat(new Csv()
                        .words(List.of("aaa", "bbb"))
                        .words(List.of("1", "2"))
                        .text())
                .isEqualTo("aaa,bbb\r\n1,2\r\n");
    }

    @Test
    void commasQuotesAndLineEndsAreQuoted() {
        assertThat(new Csv()
                        .words(List.of("b \"b\" b", "a,c", "two\nlines", "plain"))
                        .text())
                .isEqualTo("\"b \"\"b\"\" b\",\"a,c\",\"two\nlines\",plain\r\n");
    }

    @Test
    void numbersKeepEveryDigitAndMissingOnesAreEmpty() {
        assertThat(Csv.number(0.1)).isEqualTo("0.1");
        assertThat(Csv.number(68000)).isEqualTo("68000");
        assertThat(Csv.number(Double.NaN)).isEmpty();
        assertThat(Csv.number(Double.POSITIVE_INFINITY)).isEmpty();
        assertThat(Double.parseDouble(Csv.number(8.598e-4))).isEqualTo(8.598e-4);
    }
}
