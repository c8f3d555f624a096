package spanwright.draft;

import java.math.BigDecimal;
import java.util.LinkedHashSet;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;

/** Numbers that a hand writes for another: two neighbouring digits swapped, or one digit mistaken. */
final class MarkEdits {

    private MarkEdits() {}

    /** The first that is right; swapped digits are tried before mistaken ones. */
    static Optional<BigDecimal> find(BigDecimal number, Predicate<BigDecimal> right) {
        String text = number.toPlainString();
        Set<String> edits = new LinkedHashSet<>();
        for (int at = 0; at + 1 < text.length(); at++) {
            if (digit(text, at) && digit(text, at + 1)) {
                edits.add(text.substring(0, at) + text.charAt(at + 1) + text.charAt(at) + text.substring(at + 2));
            }
        }
        for (int at = 0; at < text.length(); at++) {
            for (char digit = '0'; digit <= '9' && digit(text, at); digit++) {
                edits.add(text.substring(0, at) + digit + text.substring(at + 1));
            }
        }
        edits.remove(text);
        return edits.stream().map(BigDecimal::new).filter(right).findFirst();
    }

    private static boolean digit(String text, int at) {
        return Character.isDigit(text.charAt(at));
    }
}
