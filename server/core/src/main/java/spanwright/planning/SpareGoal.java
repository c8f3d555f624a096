package spanwright.planning;

/**
 * Where a path may end.
 *
 * @param end an end in the network
 * @param entering whether the path ends as it enters by that end, such as a splitter's input; else as light stands at
 *     that end, its piece crossed, such as a port's front
 * @param plugged whether somebody must plug the equipment in here: a patch, and a visit
 */
public record SpareGoal(int end, boolean entering, boolean plugged) {}
