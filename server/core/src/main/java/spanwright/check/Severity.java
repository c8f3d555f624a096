package spanwright.check;

import java.util.Locale;

/** How much a finding weighs. */
public enum Severity {
    /** The records cannot be right as they are. */
    ERROR,
    /** Something is likely wrong, or due. */
    WARNING,
    /** Worth knowing. */
    NOTE;

    /** As an answer writes it. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
