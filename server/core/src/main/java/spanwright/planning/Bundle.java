package spanwright.planning;

import java.util.List;

/**
 * Cable sections that run the same spans between the same two structures, as seen in one direction.
 *
 * @param id its number
 * @param back number of the same sections seen the other way
 * @param from identity of the structure where it begins
 * @param to identity of the structure where it ends
 * @param spans identities of its spans, in order
 * @param entries the ends by which light enters its spare fibers, cable after cable
 * @param loss what its best fiber costs
 */
record Bundle(int id, int back, int from, int to, List<Integer> spans, List<Integer> entries, long loss) {

    Bundle {
        spans = List.copyOf(spans);
        entries = List.copyOf(entries);
    }
}
