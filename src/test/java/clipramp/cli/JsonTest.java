package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class JsonTest {
    @Test
    void whatIsNotFiniteIsNullAndItsKeyStays() throws Exception {
        String text = Json.object(
                false,
                json -> json.put("nan", Double.NaN)
                        .put("infinite", Double.NEGATIVE_INFINITY)
                        .put("missing", OptionalDouble.empty())
                        .putNumbers("array", new double[] {1, Double.NaN, 2.5}));

        JsonNode read = new ObjectMapper().readTree(text);
        assertThat(read.get("nan").isNull()).isTrue();
        assertThat(read.get("infinite").isNull()).isTrue();
        assertThat(read.get("missing").isNull()).isTrue();
        assertThat(read.get("array").get(1).isNull()).isTrue();
        assertThat(text).doesNotContain("NaN", "Infinity");
    }

    @Test
    void doublesComeBackExactly() throws Exception {
        double value = 15.477312345678912;
        JsonNode read = new ObjectMapper()
                .readTree(Json.object(false, json -> json.put("v", value).put("w", 230.0)));

        assertThat(read.get("v").doubleValue()).isEqualTo(value);
        assertThat(read.get("w").doubleValue()).isEqualTo(230);
    }

    @Test
    void asciiEscapesWhatItCannotSay() throws Exception {
        String text = Json.object(true, json -> json.putWords("w", List.of("10 kΩ")));

        assertThat(text).matches("(?s)[\\x00-\\x7F]*");
        assertThat(new ObjectMapper().readTree(text).get("w").get(0).textValue())
                .isEqualTo("10 kΩ");
    }
}
