package sallowmere.glass;

/** How sure the records are of a joint, with the share of all joints that the demo gives it. */
public enum Trust {
    /** Reviewed and posted. */
    POSTED("posted", 0.70),
    /** Seen or measured since. */
    VERIFIED("verified", 0.18),
    /** From old papers, never reviewed. */
    REPORTED("reported", 0.09),
    /** Nobody knows. */
    UNKNOWN("unknown", 0.03);

    private final String word;
    private final double share;

    Trust(String word, double share) {
        this.word = word;
        this.share = share;
    }

    /** How the records write it. */
    public String word() {
        return word;
    }

    double share() {
        return share;
    }
}
