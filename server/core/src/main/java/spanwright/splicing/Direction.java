package spanwright.splicing;

import java.util.Arrays;
import java.util.Optional;

/** Which way light was sent when a loss was measured. */
public enum Direction {
    /** From the a side to the b side; of a cable, from its start to its end. */
    AB("ab"),
    /** From the b side to the a side. */
    BA("ba");

    private final String word;

    Direction(String word) {
        this.word = word;
    }

    /** How a records folder and a screen write it. */
    public String word() {
        return word;
    }

    /** The one written so, if any. */
    public static Optional<Direction> find(String word) {
        return Arrays.stream(values()).filter(value -> value.word.equals(word)).findFirst();
    }
}
