package spanwright.splicing;

/** The kinds of side from which ends can be joined; the order is part of an end's key and never changes. */
public enum LegKind {
    /** Glass that leaves a run row toward the start of its cable; the owner is the run row. */
    BACK,
    /** Glass that leaves a run row toward the end of its cable; the owner is the run row. */
    AHEAD,
    /** A splitter's inputs; the owner is the splitter. */
    IN,
    /** A splitter's outputs; the owner is the splitter. */
    OUT,
    /** The rears of a panel's ports; the owner is the panel. */
    REAR,
    /** The fronts of a panel's ports; the owner is the panel. */
    FRONT
}
