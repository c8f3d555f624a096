package spanwright.plant;

import java.util.Arrays;
import java.util.Optional;

/** How sure the records are of a fact. */
public enum Trust {
    /** Not done yet. */
    PLANNED("planned"),
    /** The field says so. */
    REPORTED("reported"),
    /** Reviewed and posted. */
    POSTED("posted"),
    /** Seen in the field since. */
    VERIFIED("verified"),
    /** Nobody knows; never counts as good. */
    UNKNOWN("unknown");

    private final String word;

    Trust(String word) {
        this.word = word;
    }

    /** How a records folder and a screen write it. */
    public String word() {
        return word;
    }

    /** The one written so, if any. */
    public static Optional<Trust> find(String word) {
        return Arrays.stream(values()).filter(value -> value.word.equals(word)).findFirst();
    }
}
