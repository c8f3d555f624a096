package spanwright.boot;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;

/** Answers worked by hand: an answer may hold more members, but those that are expected as they are. */
final class Expected {

    private static final ObjectMapper MAPPER = new ObjectMapper();

    /** Lengths are expected to the micrometre and losses to the microdecibel, the last digit rounded by hand. */
    private static final double LAST_DIGIT = 1.001e-6;

    private Expected() {}

    static JsonNode read(Path file) {
        try {
            return MAPPER.readTree(Files.readString(file));
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    static JsonNode read(String json) {
        try {
            return MAPPER.readTree(json);
        } catch (JsonProcessingException notJson) {
            throw new AssertionError("not one JSON document: " + json, notJson);
        }
    }

    static void assertHeldBy(JsonNode answer, JsonNode expected) {
        held("", answer, expected);
    }

    private static void held(String at, JsonNode answer, JsonNode expected) {
        if (expected.isObject()) {
            for (Map.Entry<String, JsonNode> member : expected.properties()) {
                assertThat(answer.has(member.getKey()))
                        .as(at + "/" + member.getKey() + " is there")
                        .isTrue();
                held(at + "/" + member.getKey(), answer.path(member.getKey()), member.getValue());
            }
        } else if (expected.isArray()) {
            assertThat(answer.size()).as(at + " items: " + answer).isEqualTo(expected.size());
            for (int item = 0; item < expected.size(); item++) {
                held(at + "/" + item, answer.path(item), expected.path(item));
            }
        } else if (expected.isNumber()) {
            assertThat(Math.abs(answer.asDouble() - expected.asDouble()))
                    .as(at + ": " + answer + " for " + expected)
                    .isLessThan(LAST_DIGIT);
            assertThat(answer.isNumber()).as(at).isTrue();
        } else {
            assertThat(answer).as(at).isEqualTo(expected);
        }
    }
}
