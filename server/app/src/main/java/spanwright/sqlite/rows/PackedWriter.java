package spanwright.sqlite.rows;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;

/**
 * Packs rows one after another. Each row begins with a mask of the columns that are not as the row before foretells:
 * a whole number as far from the one before as that one was from its own (so the same again, or counting on), any
 * other value the same again. Only those columns follow. Text that the page holds already is named by its number.
 *
 * <p>A row of records entered in order is a few bytes so, 2 to 12 for a joint. Deflating the pages lost: at its
 * fastest it took longer than all the rest of packing, for a third of the bytes.
 *
 * <p>One thread's.
 */
public final class PackedWriter implements RowSink {

    /** In a column's place: nothing. */
    static final int NONE = 0;
    /** In a text column's place: text that the page does not hold yet. */
    static final int FRESH_TEXT = 1;
    /** In a whole number's place: all eight bytes follow. */
    static final int WIDE = 1;
    /** What the numbers of text, and differences, begin with. */
    static final int FIRST = 2;

    private static final long NARROW = 1L << 60;

    private final ByteWriter out;
    private final ByteWriter cells = new ByteWriter(256);
    private final ColumnType[] types;
    private final boolean[] none;
    private final long[] last;
    private final long[] step;
    private final @Nullable Object[] lastObject;
    private final Map<String, Integer> texts = new HashMap<>();
    private int column;
    private long mask;
    private int rows;

    /** Packs rows of these columns, 64 at most, onto the end of some bytes. */
    public PackedWriter(List<Column> columns, ByteWriter out) {
        if (columns.size() > Long.SIZE) {
            throw new IllegalArgumentException("too many columns to pack: " + columns.size());
        }
        this.out = out;
        this.types = columns.stream().map(Column::type).toArray(ColumnType[]::new);
        this.none = new boolean[types.length];
        this.last = new long[types.length];
        this.step = new long[types.length];
        this.lastObject = new Object[types.length];
        restart();
    }

    /** Writes which columns there are, for {@link PackedReader#columns}. */
    public static void writeColumns(List<Column> columns, ByteWriter out) {
        out.varint(columns.size());
        for (Column column : columns) {
            out.octet(column.type().ordinal());
            out.text(column.name());
        }
    }

    /** Begins a new page: what follows foretells nothing from what went before. */
    public void restart() {
        Arrays.fill(none, true);
        Arrays.fill(last, 0);
        Arrays.fill(step, 0);
        texts.clear();
        rows = 0;
    }

    /** How many rows have ended since the page began. */
    public int rows() {
        return rows;
    }

    /** Ends a row; all its columns have been written. */
    public void endRow() {
        if (column != types.length) {
            throw new IllegalStateException("a row of " + column + " columns, not " + types.length);
        }
        out.varint(mask);
        out.raw(cells.array(), 0, cells.size());
        cells.clear();
        column = 0;
        mask = 0;
        rows++;
    }

    private int next(ColumnType type) {
        if (types[column] != type) {
            throw new IllegalStateException("column " + column + " holds " + types[column] + ", not " + type);
        }
        return column++;
    }

    @Override
    public void none() {
        int at = column++;
        if (!none[at]) {
            none[at] = true;
            mask |= 1L << at;
            cells.varint(NONE);
        }
    }

    @Override
    public void integer(long value) {
        int at = next(ColumnType.INTEGER);
        if (!none[at] && value == last[at] + step[at]) {
            last[at] = value;
            return;
        }
        long difference = value - last[at];
        if (difference > -NARROW && difference < NARROW) {
            cells.varint(FIRST + (difference << 1 ^ difference >> 63));
        } else {
            cells.varint(WIDE);
            cells.fixed(value);
        }
        step[at] = none[at] ? 0 : difference;
        last[at] = value;
        none[at] = false;
        mask |= 1L << at;
    }

    @Override
    public void real(double value) {
        int at = next(ColumnType.REAL);
        long bits = Double.doubleToRawLongBits(value);
        if (none[at] || bits != last[at]) {
            cells.varint(FIRST);
            cells.fixed(bits);
            last[at] = bits;
            none[at] = false;
            mask |= 1L << at;
        }
    }

    @Override
    public void text(String value) {
        int at = next(ColumnType.TEXT);
        if (!none[at] && value.equals(lastObject[at])) {
            return;
        }
        Integer number = texts.putIfAbsent(value, texts.size());
        if (number == null) {
            cells.varint(FRESH_TEXT);
            cells.text(value);
        } else {
            cells.varint(FIRST + number);
        }
        remember(at, value);
    }

    @Override
    public void blob(byte[] value) {
        int at = next(ColumnType.BLOB);
        if (!none[at] && Objects.deepEquals(value, lastObject[at])) {
            return;
        }
        cells.varint(FIRST + value.length);
        cells.raw(value, 0, value.length);
        remember(at, value);
    }

    private void remember(int at, Object value) {
        lastObject[at] = value;
        none[at] = false;
        mask |= 1L << at;
    }
}
