package spanwright.answers;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.Collection;
import java.util.function.BiConsumer;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Position;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;

/**
 * Writes one JSON document, member by member. Numbers are plain decimals without exponents. One thread's.
 *
 * <p>Lost to this: a tree of nodes, and records written by reflection; both cost twice the time on a large answer.
 */
public final class Json {

    private static final JsonFactory FACTORY = new JsonFactory();
    private static final int DEGREE_DIGITS = 9;
    private static final int MICRO_DIGITS = 6;

    private final JsonGenerator out;
    private final char[] digits = new char[32];

    private Json(JsonGenerator out) {
        this.out = out;
    }

    /** The bytes (UTF-8) of one object whose members the body writes. */
    public static byte[] bytes(Consumer<Json> body) {
        return write(body, false);
    }

    /** The same, on several lines for a person, with a line break at the end. */
    public static byte[] lines(Consumer<Json> body) {
        return write(body, true);
    }

    private static byte[] write(Consumer<Json> body, boolean pretty) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream(4096);
        try (JsonGenerator out = FACTORY.createGenerator(bytes)) {
            if (pretty) {
                out.setPrettyPrinter(new DefaultPrettyPrinter(
                        Separators.createDefaultInstance().withObjectFieldValueSpacing(Separators.Spacing.AFTER)));
            }
            new Json(out).objectHere(body);
            if (pretty) {
                out.writeRaw('\n');
            }
        } catch (IOException impossible) {
            throw new UncheckedIOException(impossible);
        }
        return bytes.toByteArray();
    }

    /** A member that is an object. */
    public Json object(String name, Consumer<Json> body) {
        name(name);
        return objectHere(body);
    }

    /** A member that is a list, one object an item. */
    public <T> Json list(String name, Iterable<T> items, BiConsumer<Json, T> body) {
        name(name);
        return put(() -> {
            out.writeStartArray();
            for (T item : items) {
                objectHere(json -> body.accept(json, item));
            }
            out.writeEndArray();
        });
    }

    /** A member that is a list whose items the body writes. */
    public Json list(String name, Consumer<Json> body) {
        name(name);
        return listHere(body);
    }

    /** A member that is a list of texts. */
    public Json texts(String name, Collection<String> items) {
        return list(name, json -> items.forEach(json::textHere));
    }

    /** A member that is a list of whole numbers. */
    public Json wholes(String name, Collection<? extends Number> items) {
        return list(name, json -> items.forEach(item -> put(() -> out.writeNumber(item.longValue()))));
    }

    /** A text, or null. */
    public Json text(String name, @Nullable String value) {
        name(name);
        return value == null ? put(out::writeNull) : textHere(value);
    }

    /** A date as {@code 2026-03-31}, or null. */
    public Json date(String name, @Nullable LocalDate value) {
        return text(name, value == null ? null : value.toString());
    }

    /** True or false. */
    public Json flag(String name, boolean value) {
        name(name);
        return put(() -> out.writeBoolean(value));
    }

    /** A whole number. */
    public Json whole(String name, long value) {
        name(name);
        return put(() -> out.writeNumber(value));
    }

    /** A whole number, or null. */
    public Json whole(String name, @Nullable Integer value) {
        return value == null ? none(name) : whole(name, value.longValue());
    }

    /** Null. */
    public Json none(String name) {
        name(name);
        return put(out::writeNull);
    }

    /** A length in metres, exact to the micrometre, or null. */
    public Json metres(String name, @Nullable Length value) {
        if (value == null) {
            return none(name);
        }
        name(name);
        return fixed(value.micrometres(), MICRO_DIGITS);
    }

    /** A loss in decibels, exact to the microdecibel, or null. */
    public Json decibels(String name, @Nullable Loss value) {
        if (value == null) {
            return none(name);
        }
        name(name);
        return fixed(value.microdecibels(), MICRO_DIGITS);
    }

    /** A number as it is, without an exponent, or null. */
    public Json number(String name, @Nullable Double value) {
        return value == null ? none(name) : number(name, BigDecimal.valueOf(value));
    }

    /** A number as it is, without an exponent, or null. */
    public Json number(String name, @Nullable BigDecimal value) {
        if (value == null) {
            return none(name);
        }
        name(name);
        return numberHere(value);
    }

    /** Members {@code lon} and {@code lat} in degrees. */
    public Json place(Position position) {
        name("lon");
        degreesHere(position.lon());
        name("lat");
        return degreesHere(position.lat());
    }

    /** An item of a list: an object. */
    public Json objectHere(Consumer<Json> body) {
        // The one place that every answer passes again and again, so that a stopped question ends soon.
        if (Thread.currentThread().isInterrupted()) {
            throw new Unanswerable(Unanswerable.Kind.TOO_SLOW, "The answer took too long and was stopped.");
        }
        put(out::writeStartObject);
        body.accept(this);
        return put(out::writeEndObject);
    }

    /** An item of a list: a list whose items the body writes. */
    public Json listHere(Consumer<Json> body) {
        put(out::writeStartArray);
        body.accept(this);
        return put(out::writeEndArray);
    }

    /** An item of a list: a text. */
    public Json textHere(String value) {
        return put(() -> out.writeString(value));
    }

    /** An item of a list: a number as it is, without an exponent. */
    public Json numberHere(BigDecimal value) {
        BigDecimal plain = value.stripTrailingZeros();
        return put(() -> out.writeNumber(plain.toPlainString()));
    }

    /** An item of a list: degrees, to 9 decimals (a tenth of a millimetre). */
    public Json degreesHere(double value) {
        return fixed(Math.round(value * 1e9), DEGREE_DIGITS);
    }

    /** An item of a list: metres. */
    public Json metresHere(Length value) {
        return fixed(value.micrometres(), MICRO_DIGITS);
    }

    /** An item of a list: a position as {@code [lon, lat]}. */
    public Json positionHere(Position position) {
        return listHere(json -> json.degreesHere(position.lon()).degreesHere(position.lat()));
    }

    /** Writes value / 10^decimals without trailing zeros. */
    private Json fixed(long value, int decimals) {
        int at = digits.length;
        long rest = Math.abs(value);
        boolean fraction = false;
        for (int place = 0; place < decimals; place++, rest /= 10) {
            char digit = (char) ('0' + rest % 10);
            if (fraction || digit != '0') {
                digits[--at] = digit;
                fraction = true;
            }
        }
        if (fraction) {
            digits[--at] = '.';
        }
        do {
            digits[--at] = (char) ('0' + rest % 10);
            rest /= 10;
        } while (rest > 0);
        if (value < 0) {
            digits[--at] = '-';
        }
        int from = at;
        return put(() -> out.writeNumber(digits, from, digits.length - from));
    }

    /** A member's name, before what an item of a list would be. */
    Json name(String name) {
        return put(() -> out.writeFieldName(name));
    }

    private Json put(Step step) {
        try {
            step.write();
        } catch (IOException impossible) {
            throw new UncheckedIOException(impossible);
        }
        return this;
    }

    /** One step of writing to memory, which cannot fail. */
    private interface Step {
        void write() throws IOException;
    }
}
