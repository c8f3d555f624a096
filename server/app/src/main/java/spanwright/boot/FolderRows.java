package spanwright.boot;

import spanwright.answers.RowTexts;
import spanwright.exchange.RecordRow;
import spanwright.journal.Recorded;
import spanwright.records.Records;

/** Writes records as rows of the records folder. */
final class FolderRows implements RowTexts {

    @Override
    public RowText of(Records records, Recorded record) {
        RecordRow row = RecordRow.of(records, record);
        return new RowText(row.table(), row.code(), row.columns());
    }
}
