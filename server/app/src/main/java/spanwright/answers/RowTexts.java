package spanwright.answers;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Recorded;
import spanwright.records.Records;

/** Writes a record as a row of the records folder. */
public interface RowTexts {

    /**
     * The row of a record.
     *
     * @param records the records that it is part of, whose codes name what it refers to
     */
    RowText of(Records records, Recorded record);

    /**
     * A row.
     *
     * @param table the table of the records folder, without .csv
     * @param code what it is about, in the notation of the records, or null
     * @param columns text by column, in the folder's order; blank columns left out
     */
    record RowText(String table, @Nullable String code, Map<String, String> columns) {

        /** Keeps its own copy, in order. */
        public RowText {
            columns = Collections.unmodifiableMap(new LinkedHashMap<>(columns));
        }
    }
}
