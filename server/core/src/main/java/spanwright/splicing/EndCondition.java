package spanwright.splicing;

import java.util.Arrays;
import java.util.Optional;

/** What became of an end that no joint uses. */
public enum EndCondition {
    /** Cut and capped. */
    CAPPED("capped"),
    /** Cut and stored in a tray. */
    STORED("stored"),
    /** Laid bare, not cut. */
    THROUGH("through"),
    /** Nobody knows. */
    UNKNOWN("unknown");

    private final String word;

    EndCondition(String word) {
        this.word = word;
    }

    /** How a records folder and a screen write it. */
    public String word() {
        return word;
    }

    /** The one written so, if any. */
    public static Optional<EndCondition> find(String word) {
        return Arrays.stream(values()).filter(value -> value.word.equals(word)).findFirst();
    }
}
