package spanwright.http;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.http.PostingDesk.Action;
import spanwright.http.PostingDesk.RowChange;

/**
 * The body of a posting, read strictly: what is not known is a mistake, and is said to be one.
 *
 * @param by the person
 * @param reason why
 * @param changes at least one
 */
record PostingBody(String by, String reason, List<RowChange> changes) {

    private static final int LONGEST_NAME = 200;
    private static final int LONGEST_REASON = 2_000;
    private static final int MOST_CHANGES = 100_000;
    private static final int DEEPEST = 6;
    private static final Pattern COLUMN = Pattern.compile("[a-z0-9_]+");
    private static final ObjectMapper MAPPER = mapper();

    private static ObjectMapper mapper() {
        ObjectMapper mapper = JsonMapper.builder()
                .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
                .enable(DeserializationFeature.USE_BIG_DECIMAL_FOR_FLOATS)
                .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
                .build();
        mapper.getFactory()
                .setStreamReadConstraints(StreamReadConstraints.builder()
                        .maxNestingDepth(DEEPEST)
                        .maxNumberLength(40)
                        .build());
        return mapper;
    }

    /** Reads a body; whatever is wrong is a problem of the request. */
    static PostingBody read(byte[] body) {
        JsonNode root;
        try {
            root = MAPPER.readTree(body);
        } catch (JsonProcessingException notJson) {
            throw bad("The body is not one JSON document: " + notJson.getOriginalMessage());
        } catch (IOException impossible) {
            throw bad("The body cannot be read.");
        }
        object(root, "the body", Set.of("by", "reason", "changes"));
        String by = text(root, "by", LONGEST_NAME);
        String reason = text(root, "reason", LONGEST_REASON);
        JsonNode list = root.path("changes");
        if (!list.isArray() || list.isEmpty() || list.size() > MOST_CHANGES) {
            throw bad("changes is a list of 1 to " + MOST_CHANGES + " changes.");
        }
        List<RowChange> changes = new ArrayList<>();
        for (JsonNode each : list) {
            changes.add(change(each, "changes[" + changes.size() + "]"));
        }
        return new PostingBody(by, reason, List.copyOf(changes));
    }

    private static RowChange change(JsonNode node, String at) {
        object(node, at, Set.of("action", "table", "row", "key"));
        Action action = action(node.path("action"), at);
        JsonNode table = node.path("table");
        if (!table.isTextual()) {
            throw bad(at + ".table is a table of the records folder, without .csv.");
        }
        Map<String, String> key = new LinkedHashMap<>();
        columns(node.path("key"), at + ".key").forEach((column, value) -> key.put(column, value == null ? "" : value));
        Map<String, @Nullable String> row = columns(node.path("row"), at + ".row");
        if (action != Action.REMOVE && row.isEmpty()) {
            throw bad(at + ".row is needed to " + node.path("action").asText() + ".");
        }
        if (action != Action.ADD && key.isEmpty()) {
            throw bad(at + ".key is needed to " + node.path("action").asText() + ".");
        }
        return new RowChange(action, table.asText(), key, row);
    }

    private static Action action(JsonNode node, String at) {
        for (Action action : Action.values()) {
            if (node.isTextual() && action.name().toLowerCase(Locale.ROOT).equals(node.asText())) {
                return action;
            }
        }
        throw bad(at + ".action is add, change or remove.");
    }

    private static Map<String, @Nullable String> columns(JsonNode node, String at) {
        Map<String, @Nullable String> columns = new LinkedHashMap<>();
        if (node.isMissingNode()) {
            return columns;
        }
        if (!node.isObject()) {
            throw bad(at + " is an object of values by column.");
        }
        for (Map.Entry<String, JsonNode> field : node.properties()) {
            if (!COLUMN.matcher(field.getKey()).matches()) {
                throw bad(at + " names a column in small letters, digits and _.");
            }
            columns.put(field.getKey(), value(field.getValue(), at + "." + field.getKey()));
        }
        return columns;
    }

    private static @Nullable String value(JsonNode node, String at) {
        if (node.isNull()) {
            return null;
        }
        if (node.isTextual()) {
            return node.asText();
        }
        if (node.isNumber()) {
            // The scale is bounded before it is spelled out, lest 1e999999999 fill the memory.
            BigDecimal number = node.decimalValue();
            if (Math.abs((long) number.scale()) <= 30) {
                return number.toPlainString();
            }
        }
        throw bad(at + " is a text, a number or null.");
    }

    private static String text(JsonNode root, String name, int longest) {
        JsonNode node = root.path(name);
        if (!node.isTextual() || node.asText().isBlank() || node.asText().length() > longest) {
            throw bad(name + " is a text of 1 to " + longest + " characters.");
        }
        return node.asText().strip();
    }

    private static void object(JsonNode node, String at, Set<String> known) {
        if (!node.isObject()) {
            throw bad(at + " is an object.");
        }
        node.fieldNames().forEachRemaining(name -> {
            if (!known.contains(name)) {
                throw bad(
                        at + " has no member " + name + "; there are " + String.join(", ", new TreeSet<>(known)) + ".");
            }
        });
    }

    private static ProblemException bad(String sentence) {
        return new ProblemException(Problem.badRequest(sentence, null));
    }
}
