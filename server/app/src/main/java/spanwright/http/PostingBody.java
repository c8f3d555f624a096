package spanwright.http;

import com.fasterxml.jackson.databind.JsonNode;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.http.PostingDesk.Action;
import spanwright.http.PostingDesk.RowChange;

/**
 * The body of a posting, read strictly: what is not known is a mistake, and is said to be one.
 *
 * @param by the person
 * @param reason why
 * @param unchangedSince the posting that it rests on, or null
 * @param changes at least one
 */
record PostingBody(String by, String reason, @Nullable Integer unchangedSince, List<RowChange> changes) {

    static final int LONGEST_NAME = 200;
    static final int LONGEST_REASON = 2_000;
    private static final int MOST_CHANGES = 100_000;
    private static final int LARGEST_NUMBER = 999_999_999;
    private static final Pattern COLUMN = Pattern.compile("[a-z0-9_]+");

    /** Reads a body; whatever is wrong is a problem of the request. */
    static PostingBody read(byte[] body) {
        Sent sent = Sent.of(body, "by", "reason", "unchanged_since", "changes");
        String by = sent.text("by", LONGEST_NAME);
        String reason = sent.text("reason", LONGEST_REASON);
        Integer unchangedSince = sent.findWhole("unchanged_since", 0, LARGEST_NUMBER);
        JsonNode list = sent.member("changes");
        if (!list.isArray() || list.isEmpty() || list.size() > MOST_CHANGES) {
            throw Sent.bad("changes is a list of 1 to " + MOST_CHANGES + " changes.");
        }
        List<RowChange> changes = new ArrayList<>();
        for (JsonNode each : list) {
            changes.add(change(each, "changes[" + changes.size() + "]"));
        }
        return new PostingBody(by, reason, unchangedSince, List.copyOf(changes));
    }

    private static RowChange change(JsonNode node, String at) {
        Sent.object(node, at, Set.of("action", "table", "row", "key"));
        Action action = action(node.path("action"), at);
        JsonNode table = node.path("table");
        if (!table.isTextual()) {
            throw Sent.bad(at + ".table is a table of the records folder, without .csv.");
        }
        Map<String, String> key = new LinkedHashMap<>();
        columns(node.path("key"), at + ".key").forEach((column, value) -> key.put(column, value == null ? "" : value));
        Map<String, @Nullable String> row = columns(node.path("row"), at + ".row");
        if (action != Action.REMOVE && row.isEmpty()) {
            throw Sent.bad(at + ".row is needed to " + node.path("action").asText() + ".");
        }
        if (action != Action.ADD && key.isEmpty()) {
            throw Sent.bad(at + ".key is needed to " + node.path("action").asText() + ".");
        }
        return new RowChange(action, table.asText(), key, row);
    }

    private static Action action(JsonNode node, String at) {
        for (Action action : Action.values()) {
            if (node.isTextual() && action.name().toLowerCase(Locale.ROOT).equals(node.asText())) {
                return action;
            }
        }
        throw Sent.bad(at + ".action is add, change or remove.");
    }

    private static Map<String, @Nullable String> columns(JsonNode node, String at) {
        Map<String, @Nullable String> columns = new LinkedHashMap<>();
        if (node.isMissingNode()) {
            return columns;
        }
        if (!node.isObject()) {
            throw Sent.bad(at + " is an object of values by column.");
        }
        for (Map.Entry<String, JsonNode> field : node.properties()) {
            if (!COLUMN.matcher(field.getKey()).matches()) {
                throw Sent.bad(at + " names a column in small letters, digits and _.");
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
        throw Sent.bad(at + " is a text, a number or null.");
    }
}
