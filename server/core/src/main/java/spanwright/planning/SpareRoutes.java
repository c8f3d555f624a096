package spanwright.planning;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.PriorityQueue;
import java.util.Set;
import spanwright.network.Block;
import spanwright.plant.RunRow;
import spanwright.records.Records;

/**
 * The best paths that differ in more than the fiber: the best, then the best that does not hold all the sections and
 * visits of the first, and so on. Found by searching again without each part of a path found, so that nothing is left out
 * within the bound of searches. One thread's.
 */
public final class SpareRoutes {

    /** Searches for one question; beyond it what was found is given. */
    static final int MOST_SEARCHES = 24;

    private static final Comparator<SpareWay> BEST =
            Comparator.comparing(SpareWay::work).thenComparingLong(SpareWay::loss);

    private final SpareSearch search;
    private final Records records;

    /** The best paths that a search finds. */
    public SpareRoutes(SpareSearch search) {
        this.search = search;
        this.records = search.glass().snapshot().records();
    }

    /** A path found, and what it was found without. */
    private record Branch(SpareWay way, Set<SpareStretch> without) {}

    /** Up to so many paths, the best first; no two over the same spans and enclosures. */
    public List<SpareWay> list(SpareQuery query, int most) {
        List<SpareWay> found = new ArrayList<>();
        Set<Set<String>> places = new HashSet<>();
        Set<Set<SpareStretch>> tried = new HashSet<>();
        PriorityQueue<Branch> branches = new PriorityQueue<>(Comparator.comparing(Branch::way, BEST));
        branch(query, Set.of(), tried, branches);
        while (found.size() < most && !branches.isEmpty()) {
            Branch next = branches.poll();
            Optional<SpareWay> within = found.stream()
                    .filter(way -> next.way.stretches().containsAll(way.stretches()))
                    .findFirst();
            if (within.isEmpty() && places.add(places(next.way))) {
                found.add(next.way);
            }
            if (found.size() < most) {
                for (SpareStretch stretch : within.orElse(next.way).stretches()) {
                    Set<SpareStretch> without = new HashSet<>(next.without);
                    without.add(stretch);
                    branch(query, without, tried, branches);
                }
            }
        }
        return found;
    }

    private void branch(
            SpareQuery query, Set<SpareStretch> without, Set<Set<SpareStretch>> tried, PriorityQueue<Branch> branches) {
        if (tried.size() < MOST_SEARCHES && tried.add(without)) {
            search.find(query.shunning(without)).ifPresent(way -> branches.add(new Branch(way, without)));
        }
    }

    /** The spans that a path travels and the enclosures where it is joined anew. */
    private Set<String> places(SpareWay way) {
        Set<String> places = new HashSet<>();
        for (SpareStretch stretch : way.stretches()) {
            if (!stretch.visit()) {
                Block section = search.network().blockOf(stretch.id());
                int from = seq(section.fromRow());
                int to = seq(section.toRow());
                records.runOf(section.owner()).stream()
                        .filter(row -> row.seq() > from && row.seq() <= to)
                        .map(RunRow::span)
                        .forEach(span -> places.add("span " + span));
            }
        }
        way.joints().forEach(joint -> places.add("enclosure " + joint.enclosure()));
        return places;
    }

    private int seq(int runRow) {
        return records.runRows().get(runRow).seq();
    }
}
