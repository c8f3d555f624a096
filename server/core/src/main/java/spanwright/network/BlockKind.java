package spanwright.network;

/** What a block of pieces is; the order is part of a stored network and never changes. */
public enum BlockKind {
    /** The fibers of a cable between two neighbouring cuts. */
    SECTION,
    /** The ports of a panel. */
    PANEL,
    /** The terminals of a splitter: inputs first, then outputs. */
    SPLITTER
}
