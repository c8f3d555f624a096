package spanwright.exchange;

import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/**
 * How the rows of one table are read into records and written out of them, one row a record.
 *
 * @param <T> the record
 */
abstract class Rows<T extends Recorded> {

    private final Table table;
    private final RecordKind kind;

    /** What the rows refer to. */
    final References refs;

    Rows(Table table, RecordKind kind, References refs) {
        this.table = table;
        this.kind = kind;
        this.refs = refs;
    }

    Table table() {
        return table;
    }

    RecordKind kind() {
        return kind;
    }

    /**
     * Reads a row. What is wrong with it is told to its listener; where only a lesser value is wrong or missing,
     * a stand-in takes its place, so that the rest can be checked. Required columns that are blank have been
     * reported already.
     *
     * @param id the identity that the record gets
     * @return the record, or null where what others rely on is wrong, or refers to a row that is wrong itself
     */
    abstract @Nullable T read(Row row, int id);

    /** Writes a record into the cells of a row. */
    abstract void write(T record, Cells cells);

    /** Writes a record of the table's kind into the cells of a row. */
    @SuppressWarnings("unchecked") // A table's rows are of its kind.
    final void writeRecord(Recorded record, Cells cells) {
        write((T) record, cells);
    }

    /** What other rows name this one by, as {@link Doubts} keeps it; null where nothing refers to it. */
    @Nullable
    String key(Row row) {
        return null;
    }
}
