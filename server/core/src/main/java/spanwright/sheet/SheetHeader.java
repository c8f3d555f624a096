package spanwright.sheet;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * What a sheet says of all its joints at once; a line may say otherwise. Whatever is not known is null.
 *
 * @param job the job
 * @param splicedBy the crew
 * @param splicedOn the day of the work
 * @param source how it is known: crew's sheet, photo, trace, telephone
 * @param note anything else
 */
public record SheetHeader(
        @Nullable String job,
        @Nullable String splicedBy,
        @Nullable LocalDate splicedOn,
        @Nullable String source,
        @Nullable String note) {

    /** Says nothing. */
    public static final SheetHeader NONE = new SheetHeader(null, null, null, null, null);
}
