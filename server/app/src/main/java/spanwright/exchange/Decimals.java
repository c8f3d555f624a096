package spanwright.exchange;

import java.math.BigDecimal;
import java.util.Locale;

/** Plain decimal numbers: digits, perhaps a minus before and a point with digits behind; no exponent, no grouping. */
final class Decimals {

    /** What {@link #whole} gives where a slice is no whole number. */
    static final int NOT_WHOLE = Integer.MIN_VALUE;

    private static final int MOST_DIGITS = 40;

    private Decimals() {}

    /** Whether a slice is a plain decimal number of at most 40 characters. */
    static boolean plain(char[] chars, int from, int to) {
        int at = from < to && chars[from] == '-' ? from + 1 : from;
        int digits = digits(chars, at, to);
        if (digits == at || to - from > MOST_DIGITS) {
            return false;
        }
        if (digits == to) {
            return true;
        }
        return chars[digits] == '.' && digits + 1 < to && digits(chars, digits + 1, to) == to;
    }

    private static int digits(char[] chars, int from, int to) {
        int at = from;
        while (at < to && chars[at] >= '0' && chars[at] <= '9') {
            at++;
        }
        return at;
    }

    /** The whole number in a slice; numbers beyond a billion read as a billion; {@link #NOT_WHOLE} where none. */
    static int whole(char[] chars, int from, int to) {
        boolean minus = from < to && chars[from] == '-';
        int at = minus ? from + 1 : from;
        if (at == to) {
            return NOT_WHOLE;
        }
        long number = 0;
        for (; at < to; at++) {
            int digit = chars[at] - '0';
            if (digit < 0 || digit > 9) {
                return NOT_WHOLE;
            }
            number = Math.min(number * 10 + digit, 1_000_000_000);
        }
        return (int) (minus ? -number : number);
    }

    /** The same number without zeros behind its decimals. */
    static BigDecimal shortest(BigDecimal number) {
        BigDecimal shortest = number.signum() == 0 ? BigDecimal.ZERO : number.stripTrailingZeros();
        return shortest.scale() < 0 ? shortest.setScale(0) : shortest;
    }

    /** What may have happened to a number that is not plain, and what would be right. */
    static String hint(String text) {
        String lower = text.toLowerCase(Locale.ROOT);
        if (text.length() > MOST_DIGITS) {
            return "; write at most 40 digits";
        }
        if (lower.matches("[+-]?(nan|inf|infinity)")) {
            return "; write a finite number, such as 12.5";
        }
        if (lower.matches("[+-]?[0-9.]+e[+-]?[0-9]+")) {
            return "; write it out without an exponent, such as 1200.5";
        }
        if (lower.matches("[+-]?[0-9]*,[0-9]+")) {
            return "; write a point for the decimals and no grouping, such as 1200.5";
        }
        if (!text.strip().equals(text)) {
            return "; take away the white space around it";
        }
        return "; write digits with a point for the decimals, such as 1200.5, and no unit";
    }
}
