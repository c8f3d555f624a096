package spanwright.exchange;

import org.jspecify.annotations.Nullable;

/**
 * What refuses a change of a posting.
 *
 * @param change the change's index in the posting, from 0
 * @param column the column at fault, or null where it is the row as a whole
 * @param text what is wrong and what would be right
 */
public record RowFault(int change, @Nullable String column, String text) {}
