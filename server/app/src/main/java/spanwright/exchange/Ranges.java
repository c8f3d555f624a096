package spanwright.exchange;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberRange;

/** Numbers and ranges from 1: {@code 7}, {@code 1-12}, {@code 12-1}, {@code 1-12,25}. */
final class Ranges {

    private static final String MONTH = "(?i:jan|feb|mar|apr|may|jun|jul|aug|sep|sept|oct|nov|dec)[a-z]*\\.?";
    private static final Pattern SPREADSHEET_DATE = Pattern.compile("\\d{1,4}[- /]" + MONTH + "([- /]\\d{2,4})?"
            + "|" + MONTH + "[- /]\\d{1,4}"
            + "|\\d{1,2}[/.]\\d{1,2}([/.]\\d{2,4})?\\.?"
            + "|\\d{4}[-/]\\d{1,2}[-/]\\d{1,2}([T ].*)?"
            + "|\\d{1,2}-\\d{1,2}-\\d{2,4}");
    private static final int FIRST_SERIAL = 36_526;
    private static final int LAST_SERIAL = 73_050;
    private static final String DATE = "; a spreadsheet seems to have turned a range such as 1-12 into a date:"
            + " format the column as text and write 1-12";

    private Ranges() {}

    /**
     * Reads a range from a slice of a row; null and a fault where there is none.
     *
     * @param most the largest number there is, such as the cable's count of fibers
     * @param what what is numbered, such as {@code fibers of cable F-1}
     */
    static @Nullable FiberRange range(Row row, int column, int from, int to, int most, String what) {
        FiberRange range = find(row.chars(), from, to);
        if (range == null) {
            String text = new String(row.chars(), from, to - from);
            row.fault(column, row.named(column) + refusal(text));
            return null;
        }
        int highest = Math.max(range.first(), range.last());
        if (highest > most) {
            row.fault(
                    column,
                    row.named(column) + " names " + highest + "; the " + what + " are 1 to " + most + serial(range));
            return null;
        }
        return range;
    }

    private static String serial(FiberRange range) {
        return range.count() == 1 && range.first() >= FIRST_SERIAL && range.first() <= LAST_SERIAL ? DATE : "";
    }

    private static String refusal(String text) {
        if (SPREADSHEET_DATE.matcher(text.strip()).matches()) {
            return " is not a range" + DATE;
        }
        if (text.matches("0+|0+-[0-9]+|[0-9]+-0+")) {
            return " names 0; numbers begin at 1";
        }
        return " is not a number or a range; write 7, or 1-12, or 12-1 where it falls";
    }

    /** Reads numbers and ranges parted by commas; nothing and faults where any of them is wrong. */
    static List<FiberRange> ranges(Row row, int column, int most, String what) {
        List<FiberRange> ranges = new ArrayList<>();
        int end = row.to(column);
        int begin = row.from(column);
        for (int at = begin; at <= end; at++) {
            if (at == end || row.chars()[at] == ',') {
                FiberRange range = range(row, column, begin, at, most, what);
                if (range == null) {
                    return List.of();
                }
                ranges.add(range);
                begin = at + 1;
            }
        }
        return ranges;
    }

    /** The range in a slice, or null. */
    static @Nullable FiberRange find(char[] chars, int from, int to) {
        int dash = from;
        while (dash < to && chars[dash] != '-') {
            dash++;
        }
        int first = positive(chars, from, dash);
        int last = dash == to ? first : positive(chars, dash + 1, to);
        return first < 1 || last < 1 ? null : new FiberRange(first, last);
    }

    private static int positive(char[] chars, int from, int to) {
        return from < to && chars[from] != '-' ? Decimals.whole(chars, from, to) : 0;
    }
}
