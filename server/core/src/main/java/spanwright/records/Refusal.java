package spanwright.records;

import org.jspecify.annotations.Nullable;
import spanwright.journal.Recorded;

/**
 * Why a record cannot be entered: a rule of the records is broken.
 *
 * @param code a stable code, such as {@code end-joined-twice}
 * @param sentence what is wrong and what would be right, for a person
 * @param column the column of the records folder at fault, or null where it is the row as a whole
 * @param record the record refused, or null where there is none to name
 * @param earlier the record it clashes with, or null
 */
public record Refusal(
        String code,
        String sentence,
        @Nullable String column,
        @Nullable Recorded record,
        @Nullable Recorded earlier) {}
