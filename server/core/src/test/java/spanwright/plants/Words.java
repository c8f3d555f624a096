package spanwright.plants;

import java.math.BigDecimal;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberRange;
import spanwright.quantity.Length;

/** The words of one line of a {@link Drawing}. */
final class Words {

    private String rest;

    Words(String line) {
        this.rest = line.strip();
    }

    boolean more() {
        return !rest.isEmpty();
    }

    String next() {
        String[] parts = rest.split("\\s+", 2);
        rest = parts.length == 2 ? parts[1] : "";
        return parts[0];
    }

    /** What stands between double quotes. */
    String quoted() {
        String[] parts = rest.split("\"", 3);
        rest = parts[2].strip();
        return parts[1];
    }

    void skip(String word) {
        if (!next().equals(word)) {
            throw new IllegalArgumentException("no " + word + " before " + rest);
        }
    }

    /** The next word without its prefix, if it begins with a digit after it. */
    Optional<String> optional(String prefix) {
        return rest.matches("(?s)" + Pattern.quote(prefix) + "\\d.*")
                ? Optional.of(next().substring(prefix.length()))
                : Optional.empty();
    }

    double number() {
        return Double.parseDouble(next());
    }

    Length length() {
        return Length.ofMetres(new BigDecimal(next()));
    }

    /** A decimal; null where a dash stands for none. */
    @Nullable
    BigDecimal decimalOrDash() {
        String word = next();
        return word.equals("-") ? null : new BigDecimal(word);
    }

    BigDecimal decimal() {
        return new BigDecimal(next());
    }

    /** The words up to an end word, {@code key=value} or {@code key} alone. */
    Map<String, String> options(String end) {
        Map<String, String> options = new HashMap<>();
        while (more()) {
            String word = next();
            if (word.equals(end)) {
                break;
            }
            String[] parts = word.split("=", 2);
            options.put(parts[0], parts.length == 2 ? parts[1] : "");
        }
        return options;
    }

    static FiberRange range(String text) {
        String[] parts = text.split("-", 2);
        return new FiberRange(Integer.parseInt(parts[0]), Integer.parseInt(parts[parts.length - 1]));
    }

    static List<FiberRange> ranges(String text) {
        return Stream.of(text.split(",", -1)).map(Words::range).toList();
    }
}
