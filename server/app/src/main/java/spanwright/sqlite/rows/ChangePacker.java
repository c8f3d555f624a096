package spanwright.sqlite.rows;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.Recorded;

/** Packs the changes of a posting into pages of one table each, in order, and reads them back. */
public final class ChangePacker {

    /** A page is ended once it is this long, so that no question about one change reads megabytes. */
    private static final int FULL = 1 << 15;

    private static final int ADDED = 1;
    private static final int REMOVED = 2;
    private static final int BEFORE = 3;
    private static final int AFTER = 4;
    private static final Column CHANGE = new Column("change", ColumnType.INTEGER);
    private static final List<Head> HEADS =
            Layouts.all().stream().map(Head::new).toList();

    /** One page: packed rows of one table, headed by their columns. */
    public static final class Page {

        private final String table;
        private final byte[] rows;

        /** A page as it was packed. */
        public Page(String table, byte[] rows) {
            this.table = table;
            this.rows = rows;
        }

        /** The table of its rows. */
        public String table() {
            return table;
        }

        /** The packed rows; not to be changed. */
        public byte[] rows() {
            return rows;
        }
    }

    /** What the pages of one table have in common: its columns, the sort of change before them. */
    private static final class Head {

        final Layout layout;
        final List<Column> columns;
        /** The columns as a page begins with them. */
        final byte[] packed;

        Head(Layout layout) {
            this.layout = layout;
            this.columns =
                    Stream.concat(Stream.of(CHANGE), layout.columns().stream()).toList();
            ByteWriter bytes = new ByteWriter(512);
            PackedWriter.writeColumns(columns, bytes);
            this.packed = bytes.copy();
        }
    }

    private ChangePacker() {}

    /** Packs changes in order, and gives each page as it is full. */
    public static void pack(List<Change> changes, Consumer<Page> pages) {
        int from = 0;
        while (from < changes.size()) {
            Head head = HEADS.get(changes.get(from).kind().ordinal());
            Layout layout = head.layout;
            ByteWriter rows = new ByteWriter(1024);
            PackedWriter writer = new PackedWriter(head.columns, rows);
            int at = from;
            while (at < changes.size() && changes.get(at).kind() == layout.kind() && rows.size() < FULL) {
                pack(changes.get(at++), layout, writer);
            }
            ByteWriter page = new ByteWriter(rows.size() + head.packed.length + 16);
            page.raw(head.packed, 0, head.packed.length);
            page.varint(writer.rows());
            page.raw(rows.array(), 0, rows.size());
            pages.accept(new Page(layout.table(), page.copy()));
            from = at;
        }
    }

    private static void pack(Change change, Layout layout, PackedWriter writer) {
        Recorded before = change.before();
        Recorded after = change.after();
        if (before != null) {
            packSide(after == null ? REMOVED : BEFORE, before, layout, writer);
        }
        if (after != null) {
            packSide(before == null ? ADDED : AFTER, after, layout, writer);
        }
    }

    private static void packSide(int side, Recorded record, Layout layout, PackedWriter writer) {
        writer.integer(side);
        layout.write(record, writer);
        writer.endRow();
    }

    /** Reads the changes of a page. */
    public static List<Change> unpack(Page page) {
        Layout layout = Layouts.of(page.table());
        ByteReader in = new ByteReader(page.rows(), 0);
        List<Column> packed = PackedReader.columns(in);
        int rows = in.count();
        PackedReader reader = new PackedReader(packed, HEADS.get(layout.kind().ordinal()).columns, in);
        List<Change> changes = new ArrayList<>();
        Recorded before = null;
        for (int row = 0; row < rows; row++) {
            reader.nextRow();
            int side = reader.number();
            Recorded record = layout.read(reader);
            if (side == BEFORE) {
                before = record;
            } else {
                changes.add(change(side, before, record));
            }
        }
        return changes;
    }

    private static Change change(int side, @Nullable Recorded before, Recorded record) {
        return switch (side) {
            case ADDED -> Change.add(record);
            case REMOVED -> Change.remove(record);
            default -> {
                if (side != AFTER || before == null) {
                    throw new IllegalArgumentException("a change of an unknown sort: " + side);
                }
                yield Change.replace(before, record);
            }
        };
    }
}
