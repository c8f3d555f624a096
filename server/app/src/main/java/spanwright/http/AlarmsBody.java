package spanwright.http;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * Which circuits are down and up, as sent.
 *
 * @param down codes of circuits
 * @param up codes of circuits
 * @param byPath whether the alarms are by path
 * @param opened codes of enclosures opened lately
 */
record AlarmsBody(List<String> down, List<String> up, boolean byPath, List<String> opened) {

    private static final String DOWN = "down";
    private static final String UP = "up";
    private static final String BY_PATH = "by_path";
    private static final String OPENED = "opened";
    private static final Set<String> MEMBERS = Set.of(DOWN, UP, BY_PATH, OPENED);
    private static final ObjectMapper MAPPER = JsonMapper.builder()
            .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
            .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
            .build();

    /** Keeps its own copies of the lists. */
    AlarmsBody {
        down = List.copyOf(down);
        up = List.copyOf(up);
        opened = List.copyOf(opened);
    }

    /** Reads a body; whatever is wrong is a problem of the request. */
    static AlarmsBody read(byte[] body) {
        JsonNode root;
        try {
            root = MAPPER.readTree(body);
        } catch (JsonProcessingException notJson) {
            throw bad("The body is not one JSON document: " + notJson.getOriginalMessage(), null);
        } catch (IOException unreadable) {
            throw bad("The body is not JSON.", null);
        }
        if (!root.isObject()) {
            throw bad("Alarms are one JSON object with the members down, up, by_path, opened.", null);
        }
        root.fieldNames().forEachRemaining(name -> {
            if (!MEMBERS.contains(name)) {
                throw bad("There is no member " + name + "; there are down, up, by_path, opened.", name);
            }
        });
        JsonNode byPath = root.path(BY_PATH);
        if (!byPath.isMissingNode() && !byPath.isBoolean()) {
            throw bad("by_path is true or false.", BY_PATH);
        }
        return new AlarmsBody(codes(root, DOWN), codes(root, UP), byPath.asBoolean(), codes(root, OPENED));
    }

    private static List<String> codes(JsonNode root, String name) {
        JsonNode list = root.path(name);
        if (list.isMissingNode()) {
            return List.of();
        }
        if (!list.isArray()) {
            throw bad(name + " is a list of codes.", name);
        }
        List<String> codes = new ArrayList<>();
        for (JsonNode code : list) {
            if (!code.isTextual()) {
                throw bad(name + " is a list of codes, each a text.", name);
            }
            codes.add(code.asText());
        }
        return codes;
    }

    private static ProblemException bad(String sentence, @Nullable String member) {
        return new ProblemException(Problem.badRequest(sentence, member));
    }
}
