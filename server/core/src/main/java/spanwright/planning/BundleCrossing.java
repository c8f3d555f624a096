package spanwright.planning;

import java.util.List;

/**
 * How fibers of one bundle can go over to another.
 *
 * @param whole how many can at most without a splice
 * @param openings identities of the enclosures in which they can be spliced
 */
record BundleCrossing(int whole, List<Integer> openings) {

    /** Whether so many can go over. */
    boolean leads(int fibers) {
        return whole >= fibers || !openings.isEmpty();
    }
}
