package spanwright.fault;

import spanwright.quantity.Length;

/**
 * A point of a path's glass.
 *
 * @param part index of the part in which it lies; -1 where the path has no glass
 * @param within the records' length from that part's beginning
 * @param glass glass from the path's start, as known events stretch it
 * @param over glass read beyond the path's end; below 0 where the point is not beyond
 */
record Spot(int part, Length within, Length glass, Length over) {

    /** What a point that is not beyond the end has. */
    static final Length NOT_BEYOND = new Length(-1);

    boolean pastEnd() {
        return over.micrometres() >= 0;
    }
}
