package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class EntryTest {
    @Test
    void aDecimalCommaIsWrittenAsADot() {
        Entry entry = Entry.read("ramp.fixed", "4,7 kΩ ±5 %");
        assertThat(entry.refusal()).isEmpty();
        assertThat(entry.text()).isEqualTo("4.7 kΩ ±5 %");
        assertThat(entry.understood()).isEqualTo("4.7 kΩ −5 % +5 %");
    }

    @Test
    void aCommaThatMayGroupThousandsIsAskedBack() {
        assertThat(Entry.read("ramp.fixed", "1,000").refusal()).contains("1.0 or 1000?");
    }

    @Test
    void aValueOutsideTheWindowIsRefusedWithWhatWasUnderstood() {
        assertThat(Entry.read("clip.dropper", "10 mohm").refusal())
                .isEqualTo("read \"10 mohm\" (0.010 Ω); expected 100 Ω..1 MΩ. 10 Mohm or 10 kohm?");
    }

    @Test
    void anEmptiedPlaceIsWrittenAsNone() {
        assertThat(Entry.read("gate.shunt", "  ").text()).isEqualTo("none");
    }

    @Test
    void whatIsNoQuantityIsLeftToTheReader() {
        assertThat(Entry.read("wanted.lowest", "5 % at 0 %")).isEqualTo(new Entry("5 % at 0 %", "", ""));
    }
}
