package spanwright.sqlite.rows;

import java.util.List;
import java.util.Locale;
import java.util.function.BiConsumer;
import java.util.function.Function;
import java.util.stream.Stream;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/** How records of one kind lie in a table: its columns, the first of them {@code id}, and the way there and back. */
public final class Layout {

    private final RecordKind kind;
    private final List<Column> columns;
    private final BiConsumer<Recorded, RowSink> writer;
    private final Function<RowSource, Recorded> reader;

    private Layout(
            RecordKind kind,
            List<Column> columns,
            BiConsumer<Recorded, RowSink> writer,
            Function<RowSource, Recorded> reader) {
        this.kind = kind;
        this.columns = columns;
        this.writer = writer;
        this.reader = reader;
    }

    /**
     * A layout.
     *
     * @param columns the columns after the id, each a name and a type: {@code "code TEXT", "lon REAL"}
     */
    static <T extends Recorded> Layout of(
            RecordKind kind,
            Class<T> type,
            BiConsumer<T, RowSink> writer,
            Function<RowSource, T> reader,
            String... columns) {
        List<Column> all = Stream.concat(Stream.of("id INTEGER"), Stream.of(columns))
                .map(Layout::column)
                .toList();
        return new Layout(kind, all, (record, sink) -> writer.accept(type.cast(record), sink), reader::apply);
    }

    private static Column column(String text) {
        int space = text.indexOf(' ');
        return new Column(text.substring(0, space), ColumnType.valueOf(text.substring(space + 1)));
    }

    /** Which kind of record. */
    public RecordKind kind() {
        return kind;
    }

    /** The table of the records file. */
    public String table() {
        return kind.name().toLowerCase(Locale.ROOT);
    }

    /** The columns, in order. */
    public List<Column> columns() {
        return columns;
    }

    /** Writes a record as a row. */
    public void write(Recorded record, RowSink sink) {
        sink.integer(record.id());
        writer.accept(record, sink);
    }

    /** Reads a row as a record. */
    public Recorded read(RowSource source) {
        return reader.apply(source);
    }
}
