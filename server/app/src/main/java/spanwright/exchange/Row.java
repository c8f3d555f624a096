package spanwright.exchange;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberRange;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/**
 * One row of a table as text, and its values read with every rule that a value alone can break. A value that is
 * blank or wrong reads as null; what is wrong is told to the listener, once for each column read.
 */
final class Row {

    /** Hears what is wrong with a row. */
    interface Listener {
        /** Something is wrong with a column of the row, or with the whole row where the column is null. */
        void fault(Row row, @Nullable String column, String text);
    }

    /** Which numbers a column takes. */
    enum Bound {
        /** Any number. */
        ANY,
        /** 0 or above. */
        FROM_ZERO,
        /** Above 0. */
        ABOVE_ZERO
    }

    private static final BigDecimal MOST_METRES = BigDecimal.valueOf(100_000_000);
    private static final BigDecimal MOST_DECIBELS = BigDecimal.valueOf(100_000);
    private static final BigDecimal MOST_NANOMETRES = BigDecimal.valueOf(100_000);

    private final Table table;
    private final Listener listener;
    private final int[] from;
    private final int[] to;
    private char[] chars = new char[0];
    private int line;
    private long faulty;

    Row(Table table, Listener listener) {
        this.table = table;
        this.listener = listener;
        this.from = new int[table.columns().size()];
        this.to = new int[table.columns().size()];
    }

    /** Takes the row that a reader has come to. */
    void take(CsvReader reader, int[] fieldOf) {
        chars = reader.chars();
        line = reader.line();
        faulty = 0;
        for (int column = 0; column < fieldOf.length; column++) {
            int field = fieldOf[column];
            from[column] = field < 0 ? 0 : reader.start(field);
            to[column] = field < 0 ? 0 : reader.end(field);
        }
    }

    /** Takes texts by column name; columns that are not named are blank. */
    void take(int line, Map<String, String> texts) {
        StringBuilder all = new StringBuilder();
        for (int column = 0; column < from.length; column++) {
            from[column] = all.length();
            all.append(texts.getOrDefault(table.columns().get(column), ""));
            to[column] = all.length();
        }
        this.chars = all.toString().toCharArray();
        this.line = line;
        this.faulty = 0;
    }

    Table table() {
        return table;
    }

    /** The line where it begins; for a posting, the index of the change. */
    int line() {
        return line;
    }

    char[] chars() {
        return chars;
    }

    int from(int column) {
        return from[column];
    }

    int to(int column) {
        return to[column];
    }

    boolean blank(int column) {
        return from[column] == to[column];
    }

    /** Whether anything was found wrong with the row so far. */
    boolean faulty() {
        return faulty != 0;
    }

    /** Whether anything was found wrong with a column so far. */
    boolean faulty(int column) {
        return (faulty & 1L << column) != 0;
    }

    void fault(int column, String text) {
        faulty |= 1L << column;
        listener.fault(this, table.columns().get(column), text);
    }

    /** Something is wrong with the whole row. */
    void fault(String text) {
        faulty |= 1L << 63;
        listener.fault(this, null, text);
    }

    /** {@code lat '91'}, as a fault begins. */
    String named(int column) {
        return table.columns().get(column) + " '" + Texts.shown(text(column)) + "'";
    }

    /** Reports every required column that is blank. */
    void askRequired() {
        for (int column = 0; column < from.length; column++) {
            if (table.required(column) && blank(column)) {
                fault(column, table.columns().get(column) + " is blank; it is required");
            }
        }
    }

    /** The text of a column as it stands; empty where blank. */
    String text(int column) {
        return new String(chars, from[column], to[column] - from[column]);
    }

    /** Free text, or null where blank. */
    @Nullable
    String free(int column) {
        return blank(column) ? null : text(column);
    }

    /** A code: no white space, comma, slash or colon. */
    @Nullable
    String code(int column) {
        for (int index = from[column]; index < to[column]; index++) {
            char c = chars[index];
            if (Texts.forbiddenInCode(c)) {
                fault(
                        column,
                        named(column) + " holds " + Texts.name(c) + "; a code holds no white space, comma, '/' or ':'");
                return null;
            }
        }
        return free(column);
    }

    /** Codes parted by spaces. */
    List<String> codes(int column) {
        List<String> codes = new ArrayList<>();
        for (String code : text(column).split(" +", -1)) {
            for (int index = 0; index < code.length(); index++) {
                if (Texts.forbiddenInCode(code.charAt(index))) {
                    fault(
                            column,
                            named(column) + " holds " + Texts.name(code.charAt(index))
                                    + "; write codes parted by spaces, without white space, comma, '/' or ':' in one");
                    return List.of();
                }
            }
            if (!code.isEmpty()) {
                codes.add(code);
            }
        }
        return codes;
    }

    /** A plain decimal number. */
    @Nullable
    BigDecimal decimal(int column) {
        if (blank(column)) {
            return null;
        }
        if (!Decimals.plain(chars, from[column], to[column])) {
            fault(column, named(column) + " is not a plain decimal number" + Decimals.hint(text(column)));
            return null;
        }
        return new BigDecimal(chars, from[column], to[column] - from[column]);
    }

    /** A plain decimal number within bounds, both included; {@code what} says them in words. */
    @Nullable
    BigDecimal decimal(int column, BigDecimal least, BigDecimal most, String what) {
        BigDecimal number = decimal(column);
        if (number != null && (number.compareTo(least) < 0 || number.compareTo(most) > 0)) {
            fault(column, named(column) + " is out of range; " + what);
            return null;
        }
        return number;
    }

    private @Nullable BigDecimal decimal(int column, Bound bound, BigDecimal most, String unit) {
        BigDecimal number = decimal(column);
        if (number == null) {
            return null;
        }
        boolean low = (bound == Bound.FROM_ZERO && number.signum() < 0)
                || (bound == Bound.ABOVE_ZERO && number.signum() <= 0);
        if (low || number.abs().compareTo(most) > 0) {
            fault(
                    column,
                    named(column) + " is out of range; it is "
                            + (bound == Bound.ANY ? "" : bound == Bound.FROM_ZERO ? "0 or above and " : "above 0 and ")
                            + "at most " + most.toPlainString() + unit);
            return null;
        }
        return number;
    }

    /** A length in metres. */
    @Nullable
    Length metres(int column, Bound bound) {
        BigDecimal number = decimal(column, bound, MOST_METRES, " m");
        if (number == null) {
            return null;
        }
        Length length = Length.ofMetres(number);
        if (bound == Bound.ABOVE_ZERO && length.micrometres() == 0) {
            fault(column, named(column) + " is out of range; lengths are kept to the micrometre, so it would be 0");
            return null;
        }
        return length;
    }

    /** A loss in dB. */
    @Nullable
    Loss decibels(int column, Bound bound) {
        BigDecimal number = decimal(column, bound, MOST_DECIBELS, " dB");
        return number == null ? null : Loss.ofDecibels(number);
    }

    /** A wavelength in nm. */
    @Nullable
    Wavelength nanometres(int column) {
        return blank(column) ? null : nanometres(column, from[column], to[column]);
    }

    /** A wavelength in nm in a part of a column. */
    @Nullable
    Wavelength nanometres(int column, int from, int to) {
        BigDecimal number =
                Decimals.plain(chars, from, to) ? new BigDecimal(chars, from, to - from) : BigDecimal.valueOf(-1);
        // Wavelengths are kept to the picometre.
        if (number.movePointRight(3).compareTo(BigDecimal.ONE) < 0 || number.compareTo(MOST_NANOMETRES) > 0) {
            fault(
                    column,
                    named(column) + " is no wavelength in nm; write a plain decimal number above 0 and at most "
                            + MOST_NANOMETRES + ", such as 1550");
            return null;
        }
        return Wavelength.ofNanometres(number);
    }

    /** A number kept as floating point. */
    @Nullable
    Double number(int column, BigDecimal least, BigDecimal most, String what) {
        BigDecimal number = decimal(column, least, most, what);
        return number == null ? null : Double.valueOf(number.doubleValue());
    }

    /** A whole number within bounds, both included. */
    @Nullable
    Integer whole(int column, int least, int most) {
        if (blank(column)) {
            return null;
        }
        int number = Decimals.whole(chars, from[column], to[column]);
        if (number == Decimals.NOT_WHOLE) {
            fault(column, named(column) + " is not a whole number" + Decimals.hint(text(column)));
            return null;
        }
        if (number < least || number > most) {
            fault(column, named(column) + " is out of range; it is " + least + " to " + most);
            return null;
        }
        return number;
    }

    /** One of a list of words. */
    <E> @Nullable E word(int column, E[] values, Function<E, String> word) {
        if (blank(column)) {
            return null;
        }
        for (E value : values) {
            if (Texts.same(word.apply(value), chars, from[column], to[column])) {
                return value;
            }
        }
        List<String> words = Arrays.stream(values).map(word).collect(Collectors.toList());
        fault(column, named(column) + " is not one of " + String.join(", ", words) + Near.hint(text(column), words));
        return null;
    }

    /** A date; a time is taken for its date in the records' own zone. */
    @Nullable
    LocalDate date(int column, ZoneId zone) {
        if (blank(column)) {
            return null;
        }
        LocalDate date = Dates.find(chars, from[column], to[column]);
        if (date == null) {
            date = Dates.find(text(column), zone);
        }
        if (date == null) {
            fault(
                    column,
                    named(column) + " is not a date; write it as 2026-03-31, or with a time as"
                            + " 2026-03-31T14:05-05:00 or 2026-03-31T14:05Z");
        }
        return date;
    }

    /** A number or a rising or falling range of numbers from 1, such as {@code 1-12}. */
    @Nullable
    FiberRange range(int column, int most, String what) {
        return blank(column) ? null : Ranges.range(this, column, from[column], to[column], most, what);
    }

    /** Numbers and ranges parted by commas, such as {@code 1-12,25}. */
    List<FiberRange> ranges(int column, int most, String what) {
        return blank(column) ? List.of() : Ranges.ranges(this, column, most, what);
    }
}
