package spanwright.http;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import io.javalin.http.Context;
import java.io.IOException;
import java.math.BigDecimal;
import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalDate;
import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/** A JSON object sent in a request's body, read strictly: what is not known is a mistake, and is said to be one. */
final class Sent {

    private static final int DEEPEST = 6;
    private static final int LONGEST_CODE = 200;
    private static final int MOST_DIGITS = 30;
    private static final Pattern CODE = Pattern.compile("\\S+");
    private static final ObjectMapper MAPPER = mapper();

    private final JsonNode root;

    private Sent(JsonNode root) {
        this.root = root;
    }

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

    /** Reads a request's body of so many bytes at most; whatever is wrong is a problem of the request. */
    static Sent read(Context ctx, int largest, String... known) {
        return of(SentBody.read(ctx, largest, "A body", "send it in parts"), known);
    }

    /** Reads an object that has no members but those that are known. */
    static Sent of(byte[] body, String... known) {
        try {
            Sent sent = new Sent(MAPPER.readTree(body));
            object(sent.root, "the body", Set.of(known));
            return sent;
        } catch (JsonProcessingException notJson) {
            throw bad("The body is not one JSON document: " + notJson.getOriginalMessage());
        } catch (IOException impossible) {
            throw bad("The body cannot be read.");
        }
    }

    /** An object within, which has no members but those that are known. */
    static Sent within(JsonNode node, String at, String... known) {
        object(node, at, Set.of(known));
        return new Sent(node);
    }

    /** A list of objects that may be sent; none where it is not. */
    List<Sent> objects(String name, int most, String... known) {
        JsonNode list = root.path(name);
        List<Sent> objects = new ArrayList<>();
        if (list.isMissingNode()) {
            return objects;
        }
        if (!list.isArray() || list.size() > most) {
            throw bad(name + " is a list of " + most + " at most.");
        }
        list.forEach(each -> objects.add(within(each, name + "[" + objects.size() + "]", known)));
        return objects;
    }

    /** A code that must be sent. */
    String code(String name) {
        String code = findCode(name);
        if (code == null) {
            throw bad(name + " is a code: a text without white space.");
        }
        return code;
    }

    /** A code that may be sent, a text without white space; null where it is not, or is null. */
    @Nullable
    String findCode(String name) {
        String code = findText(name, LONGEST_CODE);
        if (code != null && !CODE.matcher(code).matches()) {
            throw bad(name + " is a code: a text without white space.");
        }
        return code;
    }

    /** A date that may be sent; null where it is not, or is null. */
    @Nullable
    LocalDate findDate(String name) {
        String text = findText(name, LONGEST_CODE);
        try {
            return text == null ? null : LocalDate.parse(text);
        } catch (DateTimeException notADate) {
            throw bad(name + " is a date such as 2026-03-31.");
        }
    }

    /** A member as it is; missing where it was not sent. */
    JsonNode member(String name) {
        return root.path(name);
    }

    /** A text that must be sent and may not be blank. */
    String text(String name, int longest) {
        String value = findText(name, longest);
        if (value == null) {
            throw bad(name + " is a text of 1 to " + longest + " characters.");
        }
        return value;
    }

    /** A text that may be sent; null where it is not, or is null. */
    @Nullable
    String findText(String name, int longest) {
        JsonNode node = root.path(name);
        if (node.isMissingNode() || node.isNull()) {
            return null;
        }
        if (!node.isTextual() || node.asText().isBlank() || node.asText().length() > longest) {
            throw bad(name + " is a text of 1 to " + longest + " characters.");
        }
        return node.asText().strip();
    }

    /** Codes that may be sent, without white space; none where they are not. */
    List<String> codes(String name, int most) {
        JsonNode node = root.path(name);
        List<String> codes = new ArrayList<>();
        if (node.isMissingNode() || node.isNull()) {
            return codes;
        }
        if (!node.isArray() || node.size() > most) {
            throw bad(name + " is a list of " + most + " codes at most.");
        }
        for (JsonNode item : node) {
            String code = item.isTextual() ? item.asText() : "";
            if (!CODE.matcher(code).matches() || code.length() > LONGEST_CODE) {
                throw bad(name + "[" + codes.size() + "] is a code: a text without white space.");
            }
            codes.add(code);
        }
        return codes;
    }

    /** A time that must be sent, with its offset. */
    Instant time(String name) {
        JsonNode node = root.path(name);
        try {
            return OffsetDateTime.parse(node.isTextual() ? node.asText().strip() : "")
                    .toInstant();
        } catch (DateTimeException notATime) {
            throw bad(name + " is a time with its offset, such as 2026-03-31T14:05-05:00 or 2026-03-31T19:05Z.");
        }
    }

    /** A whole number that may be sent; null where it is not, or is null. */
    @Nullable
    Integer findWhole(String name, int least, int most) {
        JsonNode node = root.path(name);
        if (node.isMissingNode() || node.isNull()) {
            return null;
        }
        if (!node.isInt() || node.asInt() < least || node.asInt() > most) {
            throw bad(name + " is a whole number from " + least + " to " + most + ".");
        }
        return node.asInt();
    }

    /** A number of few digits, 0 or above, that may be sent; null where it is not, or is null. */
    @Nullable
    BigDecimal findNumber(String name) {
        JsonNode node = root.path(name);
        if (node.isMissingNode() || node.isNull()) {
            return null;
        }
        BigDecimal number = node.isNumber() ? node.decimalValue() : BigDecimal.ONE.negate();
        // The scale is bounded before it is spelled out, lest 1e999999999 fill the memory.
        if (number.signum() < 0 || Math.abs((long) number.scale()) > MOST_DIGITS || number.precision() > MOST_DIGITS) {
            throw bad(name + " is a number, 0 or above.");
        }
        return number;
    }

    /** Whether something is true; false where it is not sent. */
    boolean flag(String name) {
        JsonNode node = root.path(name);
        if (!node.isMissingNode() && !node.isBoolean()) {
            throw bad(name + " is true or false.");
        }
        return node.asBoolean();
    }

    /** Refuses what is not an object, and members that are not known. */
    static void object(JsonNode node, String at, Set<String> known) {
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

    /** The problem of a body. */
    static ProblemException bad(String sentence) {
        return new ProblemException(Problem.badRequest(sentence, null));
    }
}
