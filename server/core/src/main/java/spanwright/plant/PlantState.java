package spanwright.plant;

import java.util.Arrays;
import java.util.Optional;

/** Whether plant is there to be used. */
public enum PlantState {
    /** Built and walked, cut or spare. */
    IN_SERVICE("in service"),
    /** Not built: drawn and listed only. */
    PLANNED("planned"),
    /** Left in place: drawn and listed only. */
    ABANDONED("abandoned");

    private final String word;

    PlantState(String word) {
        this.word = word;
    }

    /** How a records folder and a screen write it. */
    public String word() {
        return word;
    }

    /** The one written so, if any. */
    public static Optional<PlantState> find(String word) {
        return Arrays.stream(values()).filter(value -> value.word.equals(word)).findFirst();
    }
}
