package spanwright.exchange;

import spanwright.journal.Recorded;

/**
 * Enters the rows of a table of which each is a record.
 *
 * @param <T> the record
 */
final class PlainLoad<T extends Recorded> implements TableLoad {

    private final Entering entering;
    private final Rows<T> rows;

    PlainLoad(Entering entering, Rows<T> rows) {
        this.entering = entering;
        this.rows = rows;
    }

    @Override
    public void enter(Row row) {
        T record = rows.read(row, entering.view().limit(rows.kind()));
        if (record == null || !entering.add(rows.table(), row.line(), record)) {
            String key = rows.key(row);
            if (key != null) {
                entering.doubts().add(rows.table(), key);
            }
        }
    }
}
