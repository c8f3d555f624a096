package spanwright.temporary;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.IntUnaryOperator;
import org.jspecify.annotations.Nullable;
import spanwright.planning.SpareWork;

/** No sharing out of what is left can be better than this says. */
final class SharingBound {

    private final List<Sharing.Wish> open;
    private final IntUnaryOperator bundleOf;

    SharingBound(List<Sharing.Wish> open, IntUnaryOperator bundleOf) {
        this.open = open;
        this.bundleOf = bundleOf;
    }

    /** The best that a score can still become. */
    SharingScore atMost(SharingScore score) {
        Map<Integer, Set<Integer>> bundles = new HashMap<>();
        open.forEach(wish -> wish.choices()
                .forEach(choice -> choice.resources()
                        .forEach(resource -> bundles.computeIfAbsent(
                                        bundleOf.applyAsInt(resource), bundle -> new HashSet<>())
                                .add(resource))));
        SharingScore least = limited(score, null, Integer.MAX_VALUE);
        for (Map.Entry<Integer, Set<Integer>> bundle : bundles.entrySet()) {
            SharingScore bound =
                    limited(score, bundle.getKey(), bundle.getValue().size());
            least = bound.compareTo(least) < 0 ? bound : least;
        }
        return least;
    }

    /** The best where all that is short is one bundle: those who need little of it go first. */
    private SharingScore limited(SharingScore score, @Nullable Integer bundle, int holds) {
        int left = holds;
        List<Integer> served = new ArrayList<>(score.served());
        int customers = score.customers();
        int granted = 0;
        for (int priority = 1; priority <= Sharing.CLASSES; priority++) {
            int of = priority;
            List<Sharing.Wish> wishes =
                    open.stream().filter(wish -> wish.priority() == of).toList();
            int count = 0;
            for (int need :
                    wishes.stream().map(wish -> need(wish, bundle)).sorted().toList()) {
                if (need <= left) {
                    left -= need;
                    count++;
                }
            }
            served.set(of - 1, served.get(of - 1) + count);
            customers += wishes.stream()
                    .map(Sharing.Wish::customers)
                    .sorted(Comparator.reverseOrder())
                    .limit(count)
                    .mapToInt(Integer::intValue)
                    .sum();
            granted += count;
        }
        SpareWork work = open.stream()
                .map(wish -> wish.choices().stream()
                        .map(Sharing.Choice::work)
                        .min(Comparator.naturalOrder())
                        .orElseThrow())
                .sorted()
                .limit(granted)
                .reduce(score.work(), SpareWork::plus);
        return new SharingScore(served, customers, work);
    }

    private int need(Sharing.Wish wish, @Nullable Integer bundle) {
        return bundle == null
                ? 0
                : wish.choices().stream()
                        .mapToInt(choice -> (int) choice.resources().stream()
                                .filter(resource -> bundleOf.applyAsInt(resource) == bundle)
                                .count())
                        .min()
                        .orElse(0);
    }
}
