package spanwright.plant;

import java.util.Arrays;

/** How a built-in value came from its source. */
public enum SourceStatus {
    /** Stated by the primary text. */
    PRIMARY("READ-P"),
    /** Stated by a secondary page that gives the primary's figure. */
    SECONDARY("READ-S"),
    /** From memory. */
    MEMORY("MEM"),
    /** Reckoned from a published formula. */
    COMPUTED("COMP");

    private final String word;

    SourceStatus(String word) {
        this.word = word;
    }

    /** How the tables of built-in values write it. */
    public String word() {
        return word;
    }

    static SourceStatus get(String word) {
        return Arrays.stream(values())
                .filter(value -> value.word.equals(word))
                .findFirst()
                .orElseThrow(() -> new IllegalStateException("no status " + word));
    }
}
