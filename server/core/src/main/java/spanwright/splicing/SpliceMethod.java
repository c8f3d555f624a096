package spanwright.splicing;

import java.util.Arrays;
import java.util.Optional;

/** How two ends are spliced. */
public enum SpliceMethod {
    /** Fused. */
    FUSION("fusion"),
    /** Held in a mechanical splice. */
    MECHANICAL("mechanical");

    private final String word;

    SpliceMethod(String word) {
        this.word = word;
    }

    /** How a records folder and a screen write it. */
    public String word() {
        return word;
    }

    /** The one written so, if any. */
    public static Optional<SpliceMethod> find(String word) {
        return Arrays.stream(values()).filter(value -> value.word.equals(word)).findFirst();
    }
}
