package spanwright.sqlite.rows;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Reads what {@link PackedWriter} packed, row by row, in the order of today's columns. One thread's. */
public final class PackedReader implements RowSource {

    private static final ColumnType[] TYPES = ColumnType.values();

    private ByteReader in;
    private final ColumnType[] types;
    private final int[] places;
    private final boolean[] none;
    private final long[] last;
    private final long[] step;
    private final @Nullable Object[] lastObject;
    private final List<String> texts = new ArrayList<>();
    private int column;

    /**
     * Reads rows packed with some columns as rows of others: matched by name, nothing where there is none.
     *
     * @param packed the columns with which they were packed
     * @param wanted the columns in the order in which they are asked for
     */
    public PackedReader(List<Column> packed, List<Column> wanted, ByteReader in) {
        this.in = in;
        this.types = packed.stream().map(Column::type).toArray(ColumnType[]::new);
        this.places = new int[wanted.size()];
        for (int index = 0; index < places.length; index++) {
            // One place more than there are columns, which never holds anything.
            int place = packed.indexOf(wanted.get(index));
            places[index] = place < 0 ? types.length : place;
        }
        this.none = new boolean[types.length + 1];
        this.last = new long[types.length];
        this.step = new long[types.length];
        this.lastObject = new Object[types.length];
        restart(in);
    }

    /** Reads which columns a page has. */
    public static List<Column> columns(ByteReader in) {
        int count = in.count();
        List<Column> columns = new ArrayList<>();
        for (int index = 0; index < count; index++) {
            ColumnType type = TYPES[in.octet()];
            columns.add(new Column(in.text(), type));
        }
        return columns;
    }

    /** Begins a new page of the same columns. */
    public void restart(ByteReader from) {
        in = from;
        Arrays.fill(none, true);
        Arrays.fill(last, 0);
        Arrays.fill(step, 0);
        texts.clear();
    }

    /** Passes to the next row, which there must be. */
    public void nextRow() {
        column = 0;
        long mask = in.varint();
        for (int at = 0; at < types.length; at++) {
            if ((mask >>> at & 1) != 0) {
                readCell(at);
            } else if (types[at] == ColumnType.INTEGER && !none[at]) {
                last[at] += step[at];
            }
        }
    }

    private void readCell(int at) {
        long head = in.varint();
        if (head == PackedWriter.NONE) {
            none[at] = true;
            return;
        }
        switch (types[at]) {
            case INTEGER -> readInteger(at, head);
            case REAL -> last[at] = in.fixed();
            case TEXT -> lastObject[at] = readText(head);
            case BLOB -> lastObject[at] = in.raw((int) head - PackedWriter.FIRST);
        }
        none[at] = false;
    }

    private void readInteger(int at, long head) {
        long folded = head - PackedWriter.FIRST;
        long value = head == PackedWriter.WIDE ? in.fixed() : last[at] + (folded >>> 1 ^ -(folded & 1));
        step[at] = none[at] ? 0 : value - last[at];
        last[at] = value;
    }

    private String readText(long head) {
        if (head != PackedWriter.FRESH_TEXT) {
            return texts.get((int) head - PackedWriter.FIRST);
        }
        String fresh = in.text();
        texts.add(fresh);
        return fresh;
    }

    private int next(ColumnType type) {
        int place = places[column++];
        if (none[place] || types[place] != type) {
            throw new IllegalStateException("column " + (column - 1) + " of the row holds no " + type);
        }
        return place;
    }

    @Override
    public boolean passNone() {
        boolean nothing = none[places[column]];
        column += nothing ? 1 : 0;
        return nothing;
    }

    @Override
    public long integer() {
        return last[next(ColumnType.INTEGER)];
    }

    @Override
    public double real() {
        return Double.longBitsToDouble(last[next(ColumnType.REAL)]);
    }

    @Override
    public String text() {
        return object(ColumnType.TEXT, String.class);
    }

    @Override
    public byte[] blob() {
        return object(ColumnType.BLOB, byte[].class);
    }

    private <T> T object(ColumnType type, Class<T> as) {
        Object value = lastObject[next(type)];
        if (value == null) {
            throw new IllegalStateException("nothing where " + type + " was promised");
        }
        return as.cast(value);
    }
}
