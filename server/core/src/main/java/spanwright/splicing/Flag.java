package spanwright.splicing;

import java.util.Arrays;
import java.util.Optional;

/** A flag on fibers. */
public enum Flag {
    /** No light passes. */
    DEAD("dead"),
    /** Evidence contradicts the records. */
    SUSPECT("suspect"),
    /** Let to another. */
    LEASED("leased"),
    /** Held for a plan. */
    RESERVED("reserved");

    private final String word;

    Flag(String word) {
        this.word = word;
    }

    /** How a records folder and a screen write it. */
    public String word() {
        return word;
    }

    /** The one written so, if any. */
    public static Optional<Flag> find(String word) {
        return Arrays.stream(values()).filter(value -> value.word.equals(word)).findFirst();
    }
}
