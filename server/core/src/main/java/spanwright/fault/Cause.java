package spanwright.fault;

/** Why a place is not sure; see {@code docs/FAULT-PLACE.md}. */
public enum Cause {
    /** Where the cursor stands on the trace, and the width of the pulse; of the break and of the events used. */
    CURSOR("cursor"),
    /** The glass has another group index than was reckoned with. */
    INDEX("index"),
    /** How much glass lies in a length of sheath. */
    RATIO("ratio"),
    /** Marks are read to a whole number; without marks, lengths of route stand for lengths of sheath. */
    MARKS("marks"),
    /** Coils between the place and what it is reckoned from. */
    COILS("coils"),
    /** Where the records have the structures on the map. */
    MAP("map");

    private final String word;

    Cause(String word) {
        this.word = word;
    }

    /** How an answer writes it. */
    public String word() {
        return word;
    }
}
