package spanwright.http;

import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Posting;

/** Takes changes of rows of the records folder, and posts all of them or none. */
public interface PostingDesk {

    /**
     * Posts.
     *
     * @param by the person, not blank
     * @param reason why, not blank
     * @param unchangedSince the posting that the changes rest on: refused where there is a later one; null for any
     * @param changes at least one
     */
    Result post(String by, String reason, @Nullable Integer unchangedSince, List<RowChange> changes);

    /**
     * Takes a posting back by another, which is the inverse of it; nothing is erased.
     *
     * @param posting its number
     * @param by the person, not blank
     * @param reason why, not blank
     */
    Result takeBack(int posting, String by, String reason);

    /** What is done to a row. */
    enum Action {
        /** It is added. */
        ADD,
        /** Some of its columns are changed. */
        CHANGE,
        /** It is removed. */
        REMOVE
    }

    /**
     * One row's change.
     *
     * @param action what is done
     * @param table the table of the records folder, without .csv
     * @param key natural key of the row to change or remove, text by column
     * @param row text by column; null makes a column blank
     */
    record RowChange(Action action, String table, Map<String, String> key, Map<String, @Nullable String> row) {}

    /** What became of it. */
    sealed interface Result {

        /**
         * It is durable.
         *
         * @param posting its head
         */
        record Posted(Posting posting) implements Result {}

        /**
         * Nothing of it is kept.
         *
         * @param faults every one
         */
        record Refused(List<RowFault> faults) implements Result {

            /** Keeps its own copy. */
            public Refused {
                faults = List.copyOf(faults);
            }
        }
    }

    /**
     * What is wrong with a change.
     *
     * @param change its index in the request, from 0
     * @param column the column that is wrong, or null where it is the row as a whole
     * @param text what is wrong and what would be right
     */
    record RowFault(int change, @Nullable String column, String text) {}
}
