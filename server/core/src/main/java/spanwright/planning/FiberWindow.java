package spanwright.planning;

/**
 * Neighbouring fibers of a cable, to which a choice is held.
 *
 * @param first from 1
 * @param last the last of them
 */
record FiberWindow(int first, int last) {

    boolean holds(int fiber) {
        return fiber >= first && fiber <= last;
    }
}
