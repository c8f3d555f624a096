package spanwright.splicing;

/** What joins two ends. */
public enum JointKind {
    /** Two ends spliced. */
    SPLICE,
    /** Ends brought to the rears of ports: the a side is {@link LegKind#REAR}. */
    TERMINATION,
    /** A jumper between two fronts. */
    JUMPER
}
