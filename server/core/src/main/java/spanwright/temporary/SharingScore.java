package spanwright.temporary;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import spanwright.planning.SpareWork;

/**
 * How good a sharing out is; greater is better.
 *
 * @param served how many of each priority, the first first
 * @param customers how many customers
 * @param work what it costs
 */
record SharingScore(List<Integer> served, int customers, SpareWork work) implements Comparable<SharingScore> {

    static final SharingScore NONE = new SharingScore(Collections.nCopies(Sharing.CLASSES, 0), 0, SpareWork.NONE);

    SharingScore {
        served = List.copyOf(served);
    }

    SharingScore with(Sharing.Wish wish, SpareWork more) {
        List<Integer> counts = new ArrayList<>(served);
        counts.set(wish.priority() - 1, counts.get(wish.priority() - 1) + 1);
        return new SharingScore(counts, customers + wish.customers(), work.plus(more));
    }

    boolean servesAsManyAs(SharingScore other) {
        return served.equals(other.served) && customers == other.customers;
    }

    @Override
    public int compareTo(SharingScore other) {
        for (int priority = 0; priority < served.size(); priority++) {
            int compared = Integer.compare(served.get(priority), other.served.get(priority));
            if (compared != 0) {
                return compared;
            }
        }
        return customers != other.customers ? Integer.compare(customers, other.customers) : other.work.compareTo(work);
    }
}
