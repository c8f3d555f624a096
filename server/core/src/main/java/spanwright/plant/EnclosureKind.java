package spanwright.plant;

import java.util.Arrays;
import java.util.Optional;

/** What an enclosure is. */
public enum EnclosureKind {
    /** A splice closure. */
    CLOSURE("closure"),
    /** A terminal where drops leave. */
    TERMINAL("terminal"),
    /** A cabinet. */
    CABINET("cabinet"),
    /** A frame of panels in a building. */
    FRAME("frame");

    private final String word;

    EnclosureKind(String word) {
        this.word = word;
    }

    /** How a records folder and a screen write it. */
    public String word() {
        return word;
    }

    /** The one written so, if any. */
    public static Optional<EnclosureKind> find(String word) {
        return Arrays.stream(values()).filter(value -> value.word.equals(word)).findFirst();
    }
}
