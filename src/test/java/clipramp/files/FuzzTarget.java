package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Design;
import clipramp.units.Band;
import clipramp.units.Expected;
import clipramp.units.LenientEntry;
import clipramp.units.QuantityReader;
import clipramp.units.QuantityText;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

/** What the fuzzer feeds: each reader takes any bytes and ends in a value or in a refusal that says something. */
enum FuzzTarget {
    /** As a design, as a text to change, and as an override. */
    DESIGN("readsAnyBytes") {
        @Override
        void read(byte[] bytes) {
            orProblems(() -> DesignFiles.load(source("fuzz.yaml", bytes), List.of(), SHIPPED));
            orProblems(() -> DesignText.of(source("fuzz.yaml", bytes))
                    .withValue("ramp.pot.shunt", "1 MΩ")
                    .withValue("title", "x")
                    .without("gate.shunt"));
            orProblems(
                    () -> DesignFiles.load(new Source("wax.yaml", BadInputTest.base()), List.of(text(bytes)), SHIPPED));
        }
    },
    READINGS("readsAnyReadings") {
        @Override
        void read(byte[] bytes) {
            orProblems(() -> ReadingsFile.read(source("fuzz.csv", bytes), WAX, 25));
        }
    },
    RECORDED_LINE("readsAnyRecordedLine") {
        @Override
        void read(byte[] bytes) {
            try {
                assertThat(RecordedLine.of(text(bytes), 50).rmsVolts()).isFinite();
            } catch (IllegalArgumentException e) {
                assertThat(e).hasMessageMatching("(?s).{12,}");
            }
        }
    },
    /** Strictly, as typed into the window, and as a band; the first byte chooses the unit. */
    QUANTITY("readsAnyQuantity") {
        @Override
        void read(byte[] bytes) {
            if (bytes.length == 0) {
                return;
            }
            Unit unit = Unit.values()[Byte.toUnsignedInt(bytes[0]) % Unit.values().length];
            String text = text(Arrays.copyOfRange(bytes, 1, bytes.length));
            Expected expected = Expected.any(unit).withTolerance();
            orRefused(() -> assertReadsBack(QuantityReader.read(text, expected).value(), unit));
            orRefused(() -> LenientEntry.read(text, expected));
            orRefused(() -> Band.read(text, List.of(expected)));
        }
    };

    private static final ProfileLibrary SHIPPED = ProfileLibrary.shipped();
    private static final Design WAX = DesignFiles.load(new Source("wax.yaml", BadInputTest.base()), List.of(), SHIPPED)
            .design();

    private final String folder;

    FuzzTarget(String folder) {
        this.folder = folder;
    }

    /** Folder of the saved corpus, named as the fuzzer's method. */
    String folder() {
        return folder;
    }

    abstract void read(byte[] bytes);

    /** What is written exactly is read exactly. */
    private static void assertReadsBack(double value, Unit unit) {
        double again = QuantityReader.read(QuantityText.exact(value, unit), Expected.any(unit))
                .value();
        assertThat(again).isEqualTo(value);
    }

    private static String text(byte[] bytes) {
        return new String(bytes, StandardCharsets.UTF_8);
    }

    private static Source source(String name, byte[] bytes) {
        try {
            return Source.of(name, new ByteArrayInputStream(bytes));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static void orProblems(Runnable reading) {
        try {
            reading.run();
        } catch (InvalidInputException e) {
            assertThat(e.problems()).isNotEmpty();
        }
    }

    private static void orRefused(Runnable reading) {
        try {
            reading.run();
        } catch (RefusedQuantityException e) {
            assertThat(e.refusal().expected()).isNotEmpty();
        }
    }
}
