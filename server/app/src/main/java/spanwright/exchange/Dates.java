package spanwright.exchange;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.time.YearMonth;
import java.time.ZoneId;
import org.jspecify.annotations.Nullable;

/** Dates as {@code 2026-03-31}, times as {@code 2026-03-31T14:05-05:00}, {@code ...Z} or without an offset. */
final class Dates {

    private static final int DATE_LENGTH = 10;

    private Dates() {}

    /** The date that a slice gives as {@code 2026-03-31}; null where it gives none that way. */
    static @Nullable LocalDate find(char[] chars, int from, int to) {
        if (to - from != DATE_LENGTH || chars[from + 4] != '-' || chars[from + 7] != '-' || chars[from] == '-') {
            return null;
        }
        int year = Decimals.whole(chars, from, from + 4);
        int month = Decimals.whole(chars, from + 5, from + 7);
        int day = Decimals.whole(chars, from + 8, to);
        boolean right = year > 0
                && month >= 1
                && month <= 12
                && day >= 1
                && day <= YearMonth.of(year, month).lengthOfMonth();
        return right ? LocalDate.of(year, month, day) : null;
    }

    /** The date of the time that a text gives, in the zone; null where it gives none. */
    static @Nullable LocalDate find(String text, ZoneId zone) {
        if (text.length() <= DATE_LENGTH || !Character.isDigit(text.charAt(0))) {
            return null;
        }
        try {
            if (text.endsWith("Z") || text.indexOf('+') > 0 || text.lastIndexOf('-') > DATE_LENGTH) {
                return OffsetDateTime.parse(text).atZoneSameInstant(zone).toLocalDate();
            }
            return LocalDateTime.parse(text).toLocalDate();
        } catch (DateTimeException e) {
            return null;
        }
    }
}
