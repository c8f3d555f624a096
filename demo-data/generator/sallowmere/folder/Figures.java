package sallowmere.folder;

import java.math.BigDecimal;
import java.math.RoundingMode;

/** Numbers as the records folder writes them: plain decimals without needless noughts. */
public final class Figures {
    private Figures() {}

    /** A number rounded to some decimals. */
    public static String decimal(double value, int decimals) {
        BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP);
        BigDecimal bare = rounded.signum() == 0 ? BigDecimal.ZERO : rounded.stripTrailingZeros();
        return bare.toPlainString();
    }

    /** A number rounded to some decimals, blank where it is nought. */
    public static String decimalOrBlank(double value, int decimals) {
        return value == 0 ? "" : decimal(value, decimals);
    }

    /** A range of whole numbers, rising or falling, or the one number. */
    public static String range(int first, int last) {
        return first == last ? Integer.toString(first) : first + "-" + last;
    }

    /** A code with its number padded by noughts. */
    public static String code(String stem, int number, int digits) {
        String text = Integer.toString(number);
        return stem + "0".repeat(Math.max(0, digits - text.length())) + text;
    }
}
