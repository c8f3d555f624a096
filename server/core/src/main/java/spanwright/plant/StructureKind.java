package spanwright.plant;

import java.util.Arrays;
import java.util.Optional;

/** What a structure is. */
public enum StructureKind {
    /** A pole. */
    POLE("pole"),
    /** A handhole. */
    HANDHOLE("handhole"),
    /** A manhole. */
    MANHOLE("manhole"),
    /** A vault. */
    VAULT("vault"),
    /** A pedestal. */
    PEDESTAL("pedestal"),
    /** A cabinet. */
    CABINET("cabinet"),
    /** A hut. */
    HUT("hut"),
    /** A building. */
    BUILDING("building"),
    /** A buried closure or marked place with nothing to open. */
    POINT("point");

    private final String word;

    StructureKind(String word) {
        this.word = word;
    }

    /** How a records folder and a screen write it. */
    public String word() {
        return word;
    }

    /** The one written so, if any. */
    public static Optional<StructureKind> find(String word) {
        return Arrays.stream(values()).filter(value -> value.word.equals(word)).findFirst();
    }
}
