package spanwright.journal;

/** The kinds of record, in an order in which each refers only to kinds before it (or to its own). */
public enum RecordKind {
    /** A named setting of the records. */
    SETTING,
    /** A structure: pole, handhole, manhole, building ... */
    STRUCTURE,
    /** A stretch of route between two structures. */
    SPAN,
    /** A fiber type with its values by wavelength. */
    FIBER_TYPE,
    /** A colour order by position. */
    COLOR_CODE,
    /** A cable type. */
    CABLE_TYPE,
    /** One continuous sheath. */
    CABLE,
    /** A value of one reel from its own sheet. */
    CABLE_VALUE,
    /** One row of a cable's run. */
    RUN_ROW,
    /** The sheath marks read at one run row. */
    SHEATH_MARK,
    /** An enclosure. */
    ENCLOSURE,
    /** A cable in an enclosure: one row of enclosure_cables. */
    PASS,
    /** A splitter, its unequal taps included. */
    SPLITTER,
    /** A panel of ports. */
    PANEL,
    /** A range of joints made alike: splices, terminations or a jumper. */
    JOINT,
    /** What became of an end that no joint uses. */
    END_STATE,
    /** One measured loss. */
    MEASUREMENT,
    /** Fibers flagged dead, suspect, leased or reserved. */
    FIBER_FLAG,
    /** Another numbering of the same fibers. */
    FIBER_COUNT,
    /** A circuit. */
    CIRCUIT,
    /** A planning value. */
    PLANNING_VALUE,
    /** A feature of the base map. */
    BASE_FEATURE
}
