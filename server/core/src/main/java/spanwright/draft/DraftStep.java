package spanwright.draft;

/** What is done to a draft. */
public sealed interface DraftStep {

    /**
     * Something is written.
     *
     * @param text all that stands in it now
     * @param base the last posting that its author has seen
     */
    record Save(DraftText text, int base) implements DraftStep {}

    /** The last change is undone. */
    record Undo() implements DraftStep {}

    /** What was undone is done again. */
    record Redo() implements DraftStep {}

    /**
     * It is handed over to be posted.
     *
     * @param by who does so
     */
    record Submit(String by) implements DraftStep {}

    /** It is taken back to be written on. */
    record Withdraw() implements DraftStep {}

    /** It is given up. */
    record Drop() implements DraftStep {}

    /**
     * It is in the records.
     *
     * @param posting as which posting
     * @param fingerprint what it said
     */
    record Posted(int posting, String fingerprint) implements DraftStep {}
}
