package spanwright.splicing;

import spanwright.plant.FiberRange;

/**
 * Ends of one leg, in order.
 *
 * @param leg the side
 * @param numbers the fibers, inputs, outputs or ports
 */
public record EndRange(Leg leg, FiberRange numbers) {

    /** How many ends. */
    public int count() {
        return numbers.count();
    }

    /** The key of the end at an index from 0 to count - 1. */
    public long key(int index) {
        return leg.key(numbers.at(index));
    }
}
