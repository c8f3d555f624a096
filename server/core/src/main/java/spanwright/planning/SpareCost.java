package spanwright.planning;

import java.util.Comparator;

/**
 * What an option costs, the gravest first: it is compared in this order.
 *
 * @param opened enclosures in which new splices are made
 * @param splices new splices, those of all its paths
 * @param unverified joints crossed as they are that nobody has verified, those of all its paths
 * @param loss what its worst path loses, in microdecibels
 */
public record SpareCost(int opened, int splices, int unverified, long loss) implements Comparable<SpareCost> {

    private static final Comparator<SpareCost> ORDER = Comparator.comparingInt(SpareCost::opened)
            .thenComparingInt(SpareCost::splices)
            .thenComparingInt(SpareCost::unverified)
            .thenComparingLong(SpareCost::loss);

    @Override
    public int compareTo(SpareCost other) {
        return ORDER.compare(this, other);
    }
}
