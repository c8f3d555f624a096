package spanwright.planning;

/** How a path goes on from one fiber to the next. */
public enum Crossover {
    /** By uncut glass or a joint that is there. */
    AS_IT_IS,
    /** By a new splice. */
    SPLICE,
    /** By a new jumper between the ports of both. */
    JUMPER
}
