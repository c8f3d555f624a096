package spanwright.loss;

/** What a loss rests on. */
public enum LossBasis {
    /** Measured. */
    MEASURED("measured"),
    /** A planning value. */
    PLANNING("planning"),
    /** The table of the fiber type. */
    TYPE("type"),
    /** The reel's own sheet. */
    SHEET("sheet"),
    /** Nothing is lost there. */
    NONE("none");

    private final String word;

    LossBasis(String word) {
        this.word = word;
    }

    /** How an answer writes it. */
    public String word() {
        return word;
    }
}
