package clipramp.cli;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.json.JsonWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.Collection;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;

/**
 * Builds one JSON answer. A number that is not finite becomes null, so that no answer ever holds NaN or Infinity; keys
 * always stay. The answer exists as a whole before the first byte is written.
 */
final class Json {
    private final StringWriter text = new StringWriter();
    private final JsonGenerator generator;

    private Json(boolean ascii) throws IOException {
        JsonFactory factory = JsonFactory.builder()
                .configure(JsonWriteFeature.ESCAPE_NON_ASCII, ascii)
                .build();
        DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
        DefaultPrettyPrinter printer = new DefaultPrettyPrinter();
        printer.indentObjectsWith(indenter);
        printer.indentArraysWith(indenter);
        generator = factory.createGenerator(text).setPrettyPrinter(printer);
    }

    /**
     * @param ascii whether every other sign is escaped
     * @param members writes the members of the one object
     * @return the object and a line feed
     */
    static String object(boolean ascii, Consumer<Json> members) {
        try {
            Json json = new Json(ascii);
            json.generator.writeStartObject();
            members.accept(json);
            json.generator.writeEndObject();
            json.generator.close();
            return json.text + "\n";
        } catch (IOException impossible) {
            throw new UncheckedIOException(impossible);
        }
    }

    Json put(String key, @Nullable String value) {
        return member(key, () -> {
            if (value == null) {
                generator.writeNull();
            } else {
                generator.writeString(value);
            }
        });
    }

    Json put(String key, double value) {
        return member(key, () -> write(value));
    }

    Json put(String key, int value) {
        return member(key, () -> generator.writeNumber(value));
    }

    Json put(String key, boolean value) {
        return member(key, () -> generator.writeBoolean(value));
    }

    Json put(String key, OptionalDouble value) {
        return put(key, value.orElse(Double.NaN));
    }

    Json putNull(String key) {
        return member(key, generator::writeNull);
    }

    Json putWords(String key, Collection<String> values) {
        return member(key, () -> {
            generator.writeStartArray();
            for (String value : values) {
                generator.writeString(value);
            }
            generator.writeEndArray();
        });
    }

    Json putNumbers(String key, double[] values) {
        return member(key, () -> {
            generator.writeStartArray();
            for (double value : values) {
                write(value);
            }
            generator.writeEndArray();
        });
    }

    Json putObject(String key, Consumer<Json> members) {
        return member(key, () -> writeObject(members));
    }

    /** An object, or null where there is nothing to tell. */
    <T> Json putObject(String key, Optional<T> value, Members<T> members) {
        return value.isPresent() ? putObject(key, json -> members.write(json, value.get())) : putNull(key);
    }

    <T> Json putObjects(String key, Collection<? extends T> values, Members<T> members) {
        return member(key, () -> {
            generator.writeStartArray();
            for (T value : values) {
                writeObject(json -> members.write(json, value));
            }
            generator.writeEndArray();
        });
    }

    /** Writes one value's members. */
    interface Members<T> {
        void write(Json json, T value);
    }

    private interface Write {
        void run() throws IOException;
    }

    private Json member(String key, Write value) {
        try {
            generator.writeFieldName(key);
            value.run();
            return this;
        } catch (IOException impossible) {
            throw new UncheckedIOException(impossible);
        }
    }

    private void writeObject(Consumer<Json> members) throws IOException {
        generator.writeStartObject();
        members.accept(this);
        generator.writeEndObject();
    }

    private void write(double value) throws IOException {
        if (!Double.isFinite(value)) {
            generator.writeNull();
        } else if (value == Math.rint(value) && Math.abs(value) < 1e15) {
            generator.writeNumber((long) value);
        } else {
            generator.writeNumber(value);
        }
    }
}
