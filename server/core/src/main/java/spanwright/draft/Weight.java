package spanwright.draft;

import java.util.Locale;

/** What a slip asks of the person. */
public enum Weight {
    /** It cannot be so: it is mended before the sheet is submitted. */
    ERROR,
    /** It is likely wrong: it is mended, or answered with a reason. */
    WARNING,
    /** Only the person knows: it is answered before the sheet is submitted. */
    PROMPT;

    /** As an answer writes it. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
