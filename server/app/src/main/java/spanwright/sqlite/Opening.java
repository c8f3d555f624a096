package spanwright.sqlite;

/** What became of an attempt to open a records file. */
public sealed interface Opening {

    /**
     * It is open.
     *
     * @param ledger to be closed by whoever asked
     */
    record Opened(SqliteLedger ledger) implements Opening {}

    /**
     * It is not, and nothing about it was changed.
     *
     * @param code a stable code, such as {@code records-torn}
     * @param sentence what is wrong and what would be right, for a person
     */
    record Unopened(String code, String sentence) implements Opening {}
}
