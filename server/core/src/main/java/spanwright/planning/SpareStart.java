package spanwright.planning;

/**
 * Where a path may begin.
 *
 * @param end an end in the network
 * @param entering whether light enters the piece by that end, such as a port by its front; else it stands at that end and
 *     goes on by what is joined to it, such as a splitter's output
 * @param plugged whether somebody must plug the equipment in here: a patch, and a visit
 */
public record SpareStart(int end, boolean entering, boolean plugged) {}
