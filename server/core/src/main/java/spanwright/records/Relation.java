package spanwright.records;

/** The ways in which one record owns others, each an index. */
public enum Relation {
    /** Spans that begin or end at a structure. */
    STRUCTURE_SPANS,
    /** Run rows at a structure. */
    STRUCTURE_RUN_ROWS,
    /** Enclosures in a structure. */
    STRUCTURE_ENCLOSURES,
    /** Run rows reached over a span. */
    SPAN_RUN_ROWS,
    /** Cables of a type. */
    CABLE_TYPE_CABLES,
    /** Run rows of a cable, by seq. */
    CABLE_RUN_ROWS,
    /** Passes of a cable. */
    CABLE_PASSES,
    /** Values from a reel's own sheet. */
    CABLE_VALUES,
    /** Flags on a cable's fibers. */
    CABLE_FLAGS,
    /** Other numberings of a cable's fibers. */
    CABLE_COUNTS,
    /** Sheath marks at a run row. */
    RUN_ROW_MARKS,
    /** The pass at a run row, one at most. */
    RUN_ROW_PASSES,
    /** Passes in an enclosure. */
    ENCLOSURE_PASSES,
    /** Splitters in an enclosure. */
    ENCLOSURE_SPLITTERS,
    /** Panels in an enclosure. */
    ENCLOSURE_PANELS,
    /** End states in an enclosure. */
    ENCLOSURE_END_STATES,
    /** Circuits that end on a panel's ports. */
    PANEL_CIRCUITS,
    /** Circuits of a protection group, and of those that share a number with it; see {@link RecordsView#groupCircuits}. */
    GROUP_CIRCUITS
}
