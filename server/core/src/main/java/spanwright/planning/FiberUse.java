package spanwright.planning;

/** What a fiber of one cable section is used for; the first that is true. */
public enum FiberUse {
    /** A circuit lives on it. */
    IN_USE("in_use"),
    /** Flagged dead. */
    DEAD("dead"),
    /** Flagged suspect. */
    SUSPECT("suspect"),
    /** A jumper is on its glass path, and no circuit. */
    JUMPERED("jumpered"),
    /** Flagged leased. */
    LEASED("leased"),
    /** Flagged reserved. */
    RESERVED("reserved"),
    /** Unused, but a joint or an end state on its glass path is not known. */
    SPARE_UNKNOWN("spare_unknown"),
    /** Unused, all known. */
    SPARE("spare"),
    /** Unused, all verified, and at least one of them. */
    SPARE_VERIFIED("spare_verified");

    private final String word;

    FiberUse(String word) {
        this.word = word;
    }

    /** How an answer writes it. */
    public String word() {
        return word;
    }
}
