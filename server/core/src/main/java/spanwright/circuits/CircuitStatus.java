package spanwright.circuits;

import java.util.Arrays;
import java.util.Optional;

/** Whether a circuit works. */
public enum CircuitStatus {
    /** In use. */
    WORKING("working"),
    /** Not yet in use. */
    PLANNED("planned"),
    /** No longer in use: it uses nothing. */
    RETIRED("retired");

    private final String word;

    CircuitStatus(String word) {
        this.word = word;
    }

    /** How a records folder and a screen write it. */
    public String word() {
        return word;
    }

    /** The one written so, if any. */
    public static Optional<CircuitStatus> find(String word) {
        return Arrays.stream(values()).filter(value -> value.word.equals(word)).findFirst();
    }
}
