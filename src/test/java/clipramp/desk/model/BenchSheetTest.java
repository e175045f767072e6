package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import clipramp.desk.model.BenchSheet.Column;
import clipramp.files.InvalidInputException;
import clipramp.files.ReadingsTable;
import clipramp.files.Source;
import java.util.List;
import org.junit.jupiter.api.Test;

class BenchSheetTest {
    private static Column column(BenchSheet sheet, String head) {
        return sheet.columns().stream()
                .filter(c -> c.head().equals(head))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void aFileComesBackAsItWas() {
        ReadingsTable table = ReadingsTable.of(new Source(
                "a.csv", "# said\nknob (%) +-1,delay (us) ±2 %,note\n5,1200,\"left, warm\"\n\n50,,\"a \"\"b\"\"\"\n"));
        BenchSheet sheet = new BenchSheet(true);
        sheet.load(table);
        assertThat(sheet.shown().stream().map(Column::written))
                .containsExactlyInAnyOrder("knob (%) ±1", "delay (us) ±2 %", "note");
        assertThat(ReadingsTable.of(new Source("b.csv", sheet.table().csv()))
                        .rows()
                        .get(0))
                .containsExactlyInAnyOrder("5", "1200", "left, warm");
        assertThat(sheet.table().csv()).contains("\"a \"\"b\"\"\"");
    }

    /** As a spreadsheet puts it on the clipboard: tabs, and decimal commas where the country has them. */
    @Test
    void cellsFromASpreadsheetFillFromWhereTheKeyboardStands() {
        BenchSheet sheet = new BenchSheet(true);
        Column line = column(sheet, "line voltage (V)");
        sheet.paste(1, line, "228,4\t142,9\n233\t118,6\n");
        assertThat(sheet.cell(1, line)).isEqualTo("228.4");
        assertThat(sheet.cell(2, column(sheet, "firing angle (deg)"))).isEqualTo("118.6");
        assertThat(sheet.isEmpty(0)).isTrue();
    }

    @Test
    void aTableWithItsHeadsTakesThePlaceOfWhatStoodThere() {
        BenchSheet sheet = new BenchSheet(true);
        sheet.paste(0, sheet.shown().get(0), "knob (%) ±1\tload power (W)\n10\t35,2\n90\t610\n");
        assertThat(sheet.shown().stream().map(Column::head).toList()).isEqualTo(List.of("knob (%)", "load power (W)"));
        assertThat(sheet.cell(0, column(sheet, "load power (W)"))).isEqualTo("35.2");
        assertThat(column(sheet, "knob (%)").accuracy()).isEqualTo("1");
    }

    @Test
    void whatCouldBeAThousandIsLeftToBeAskedBack() {
        assertThat(BenchSheet.tidied("5,1")).isEqualTo("5.1");
        assertThat(BenchSheet.tidied("1,000")).isEqualTo("1,000");
        assertThat(BenchSheet.tidied(" 2,5 % ")).isEqualTo("2.5 %");
    }

    @Test
    void columnsThatAreNotShownAreNotWritten() {
        BenchSheet sheet = new BenchSheet(false);
        Column angle = column(sheet, "firing angle (deg)");
        sheet.set(0, angle, "90");
        assertThat(sheet.table().csv())
                .startsWith("line voltage (V),firing angle (deg),")
                .contains("\n,90,");
        angle.setShown(false);
        assertThat(sheet.table().csv()).doesNotContain("90");
    }

    @Test
    void anUnclosedQuoteIsNamed() {
        assertThatThrownBy(() -> ReadingsTable.of(new Source("a.csv", "knob (%)\n\"5")))
                .isInstanceOf(InvalidInputException.class)
                .hasMessageContaining("never closed");
    }
}
