package spanwright.exchange;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * What a posting does to a row of a table.
 *
 * @param action what is done
 * @param table the table, without {@code .csv}
 * @param key the row to change or remove, text by column: any columns that name it alone, such as its natural key
 * @param row text by column; empty makes a column blank; for a change, the columns that change
 */
public record RowChange(Action action, String table, Map<String, String> key, Map<String, String> row) {

    /** Keeps its own copies, in order. */
    public RowChange {
        key = new LinkedHashMap<>(key);
        row = new LinkedHashMap<>(row);
    }

    /** What is done. */
    public enum Action {
        /** The row is added. */
        ADD,
        /** Some of its columns are changed. */
        CHANGE,
        /** It is removed. */
        REMOVE
    }
}
