package spanwright.plant;

import java.util.Arrays;
import java.util.Optional;

/** How a span is placed. */
public enum Placement {
    /** On poles. */
    AERIAL("aerial"),
    /** In a duct. */
    DUCT("duct"),
    /** Directly in the ground. */
    BURIED("buried"),
    /** Within a building. */
    INDOOR("indoor"),
    /** Under water. */
    UNDERWATER("underwater");

    private final String word;

    Placement(String word) {
        this.word = word;
    }

    /** How a records folder and a screen write it. */
    public String word() {
        return word;
    }

    /** The one written so, if any. */
    public static Optional<Placement> find(String word) {
        return Arrays.stream(values()).filter(value -> value.word.equals(word)).findFirst();
    }
}
