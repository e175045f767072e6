package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import clipramp.cli.TextTable.Align;
import org.junit.jupiter.api.Test;

class TextTableTest {
    @Test
    void figuresStandOnTheirDecimalSign() {
        TextTable table =
                new TextTable(Spelling.FULL, "").column(Align.LEFT, "name").column(Align.DECIMAL, "ratio");
        table.row("a", "1.63").row("b", "12").row("c", "–").row("long name", "0.5");

        assertThat(table.lines())
                .containsExactly(
                        "name       ratio", //
                        "a           1.63",
                        "b          12",
                        "c           –",
                        "long name   0.5");
    }

    @Test
    void anEmptyHeadTakesNoLine() {
        TextTable table =
                new TextTable(Spelling.FULL, "  ").column(Align.LEFT, "").column(Align.LEFT, "");

        assertThat(table.row("a", "b").lines()).containsExactly("  a  b");
    }

    @Test
    void columnsLineUpInAsciiToo() {
        TextTable table =
                new TextTable(Spelling.ASCII, "").column(Align.RIGHT, "R_E").column(Align.LEFT, "");

        assertThat(table.row("4.7 kΩ", "x").row("100 kΩ", "x").lines())
                .containsExactly(
                        "     R_E", //
                        "4.7 kohm  x",
                        "100 kohm  x");
    }

    @Test
    void aRowWithTooFewCellsIsRefused() {
        TextTable table =
                new TextTable(Spelling.FULL, "").column(Align.LEFT, "a").column(Align.LEFT, "b");

        assertThatThrownBy(() -> table.row("one")).hasMessageContaining("1 cells for 2 columns");
    }
}
