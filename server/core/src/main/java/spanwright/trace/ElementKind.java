package spanwright.trace;

/** What an element of a path is. */
public enum ElementKind {
    /** A port crossed: one connector pair. */
    CONNECTOR("connector"),
    /** A splice, that of a pigtail included. */
    SPLICE("splice"),
    /** Glass of one fiber between two neighbouring enclosures. */
    FIBER("fiber"),
    /** An enclosure that the fiber passes uncut. */
    THROUGH("through"),
    /** A jumper between two fronts. */
    JUMPER("jumper"),
    /** A splitter crossed. */
    SPLITTER("splitter");

    private final String word;

    ElementKind(String word) {
        this.word = word;
    }

    /** How an answer writes it. */
    public String word() {
        return word;
    }
}
