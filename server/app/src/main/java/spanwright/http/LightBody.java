package spanwright.http;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;

/**
 * The body of a question for temporary paths, read strictly.
 *
 * @param down codes of circuits that are down; none: all that the cuts take down
 * @param cuts what is cut, such as {@code span:S-1}
 * @param avoid what is suspect, in the same notation
 * @param fromPanels panels whose free ports may feed splitters, such as {@code HUT-S/OLT}
 * @param verifiedOnly whether spare glass must be verified
 * @param margin kept free of each budget, in dB
 * @param offers most offers a group
 * @param until last day of the temporary joints, or null
 */
record LightBody(
        List<String> down,
        List<String> cuts,
        List<String> avoid,
        List<String> fromPanels,
        boolean verifiedOnly,
        BigDecimal margin,
        int offers,
        @Nullable LocalDate until) {

    private static final int MOST_NAMED = 5_000;
    private static final int MOST_OFFERS = 5;
    private static final Set<String> MEMBERS = new TreeSet<>(
            List.of("down", "cuts", "avoid", "from_panels", "verified_only", "margin_db", "offers", "until"));
    private static final ObjectMapper MAPPER = JsonMapper.builder()
            .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
            .enable(DeserializationFeature.USE_BIG_DECIMAL_FOR_FLOATS)
            .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
            .build();

    /** Reads a body; whatever is wrong is a problem of the request. */
    static LightBody read(byte[] body) {
        JsonNode root = parse(body);
        root.fieldNames().forEachRemaining(name -> {
            if (!MEMBERS.contains(name)) {
                throw bad("The body has no member " + name + "; there are " + String.join(", ", MEMBERS) + ".");
            }
        });
        LightBody read = new LightBody(
                texts(root, "down"),
                texts(root, "cuts"),
                texts(root, "avoid"),
                texts(root, "from_panels"),
                verifiedOnly(root),
                margin(root),
                offers(root),
                until(root));
        if (read.cuts.isEmpty() && read.avoid.isEmpty()) {
            throw bad("Name at least one place in cuts or avoid; without it no glass is known to be whole.");
        }
        return read;
    }

    private static JsonNode parse(byte[] body) {
        try {
            JsonNode root = MAPPER.readTree(body);
            if (root.isObject()) {
                return root;
            }
        } catch (JsonProcessingException notJson) {
            throw bad("The body is not one JSON document: " + notJson.getOriginalMessage());
        } catch (IOException impossible) {
            throw bad("The body cannot be read.");
        }
        throw bad("The body is an object.");
    }

    private static List<String> texts(JsonNode root, String name) {
        JsonNode list = root.path(name);
        if (list.isMissingNode()) {
            return List.of();
        }
        List<String> texts = new ArrayList<>();
        if (!list.isArray() || list.size() > MOST_NAMED) {
            throw bad(name + " is a list of " + MOST_NAMED + " codes at most.");
        }
        for (JsonNode each : list) {
            if (!each.isTextual()) {
                throw bad(name + " is a list of texts.");
            }
            texts.add(each.asText());
        }
        return List.copyOf(texts);
    }

    private static boolean verifiedOnly(JsonNode root) {
        JsonNode node = root.path("verified_only");
        if (!node.isMissingNode() && !node.isBoolean()) {
            throw bad("verified_only is true or false.");
        }
        return node.asBoolean(true);
    }

    private static BigDecimal margin(JsonNode root) {
        JsonNode node = root.path("margin_db");
        if (node.isMissingNode()) {
            return BigDecimal.ZERO;
        }
        if (!node.isNumber() || node.decimalValue().scale() > 6) {
            throw bad("margin_db is a number of dB.");
        }
        return node.decimalValue();
    }

    private static int offers(JsonNode root) {
        JsonNode node = root.path("offers");
        if (node.isMissingNode()) {
            return 1;
        }
        if (!node.isInt() || node.asInt() < 1 || node.asInt() > MOST_OFFERS) {
            throw bad("offers is a whole number from 1 to " + MOST_OFFERS + ".");
        }
        return node.asInt();
    }

    private static @Nullable LocalDate until(JsonNode root) {
        JsonNode node = root.path("until");
        if (node.isMissingNode() || node.isNull()) {
            return null;
        }
        try {
            return LocalDate.parse(node.asText());
        } catch (DateTimeParseException notADay) {
            throw bad("until is a day such as 2026-03-31.");
        }
    }

    private static ProblemException bad(String sentence) {
        return new ProblemException(Problem.badRequest(sentence, null));
    }
}
