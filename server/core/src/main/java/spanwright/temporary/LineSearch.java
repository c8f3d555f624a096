package spanwright.temporary;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import spanwright.circuits.Circuit;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.planning.SpareGlass;
import spanwright.planning.SpareGoal;
import spanwright.planning.SpareQuery;
import spanwright.planning.SpareRoutes;
import spanwright.planning.SpareSearch;
import spanwright.planning.SpareStart;
import spanwright.planning.SpareWay;
import spanwright.splicing.Panel;

/**
 * Searches the ways of one group: where its ends may be, what is left of its own glass, and one way after another for each
 * fiber, each the best beside those before it. One thread's.
 */
final class LineSearch {

    /** How many first fibers are tried to which a second does not fit. */
    private static final int MOST_TRIES = 8;

    private final SpareSearch search;
    private final SpareGlass glass;
    private final Network network;
    private final DarkGroup group;
    private final List<Panel> fromPanels;
    private final List<Long> bounds;
    private final BitSet own = new BitSet();

    /**
     * For a group.
     *
     * @param bounds the most that each of its lines may lose, in microdecibels
     * @param closed pieces of its own glass that are hit
     */
    LineSearch(SpareSearch search, DarkGroup group, List<Panel> fromPanels, List<Long> bounds, BitSet closed) {
        this.search = search;
        this.glass = search.glass();
        this.network = glass.snapshot().network();
        this.group = group;
        this.fromPanels = List.copyOf(fromPanels);
        this.bounds = List.copyOf(bounds);
        group.lines().forEach(line -> line.pieces(network).forEach(own::set));
        own.andNot(closed);
    }

    /**
     * What a search may use.
     *
     * @param closed pieces and enclosures that it may not
     * @param verifiedOnly whether spare glass must be verified
     * @param bounded whether the budget bounds it
     * @param taken pieces that others have taken
     */
    record Terms(ClosedPlant closed, boolean verifiedOnly, boolean bounded, Set<Integer> taken) {

        Terms unverified() {
            return new Terms(closed, false, bounded, taken);
        }

        Terms unbounded() {
            return new Terms(closed, verifiedOnly, false, taken);
        }

        Terms around(ClosedPlant other) {
            return new Terms(other, verifiedOnly, bounded, taken);
        }

        Terms without(Set<Integer> pieces) {
            return new Terms(closed, verifiedOnly, bounded, pieces);
        }
    }

    /** Whether a budget bounds any of the lines. */
    boolean isBounded() {
        return bounds.stream().anyMatch(bound -> bound != SpareQuery.UNBOUNDED);
    }

    /** Pieces of the group's own glass that are left. */
    BitSet own() {
        return own;
    }

    /** The best ways for all lines, if there are any. */
    Optional<List<SpareWay>> find(Terms terms) {
        return list(terms, 1).stream().findFirst();
    }

    /** Up to so many ways that differ in more than fibers, the best first; each a way a line. */
    List<List<SpareWay>> list(Terms terms, int most) {
        SpareQuery query = query(terms, 0, List.of());
        List<List<SpareWay>> found = new ArrayList<>();
        for (SpareWay first :
                most == 1 ? search.find(query).stream().toList() : new SpareRoutes(search).list(query, most)) {
            rest(terms, first).ifPresent(found::add);
        }
        return found;
    }

    private Optional<List<SpareWay>> rest(Terms terms, SpareWay first) {
        Terms now = terms;
        Optional<SpareWay> lead = Optional.of(first);
        for (int tries = 0; tries < MOST_TRIES && lead.isPresent(); tries++) {
            Optional<List<SpareWay>> ways = complete(now, lead.get());
            if (ways.isPresent() || group.lines().size() == 1) {
                return ways;
            }
            Set<Integer> taken = new HashSet<>(now.taken());
            List<Integer> pieces = lead.get().pieces();
            taken.addAll(pieces.stream().filter(piece -> !own.get(piece)).toList());
            now = now.without(taken);
            lead = search.find(query(now, 0, List.of()));
        }
        return Optional.empty();
    }

    private Optional<List<SpareWay>> complete(Terms terms, SpareWay first) {
        List<SpareWay> ways = new ArrayList<>(List.of(first));
        for (int line = 1; line < group.lines().size(); line++) {
            Optional<SpareWay> next = search.find(query(terms, line, ways));
            if (next.isEmpty()) {
                return Optional.empty();
            }
            ways.add(next.get());
        }
        return Optional.of(ways);
    }

    private SpareQuery query(Terms terms, int line, List<SpareWay> before) {
        Set<Integer> taken = new HashSet<>(terms.taken());
        Set<Integer> visits = new HashSet<>();
        for (SpareWay way : before) {
            taken.addAll(way.pieces());
            visits.addAll(way.visits());
        }
        Circuit circuit = group.circuits().get(0);
        return SpareQuery.of(
                        starts(line, before),
                        goals(line, before),
                        circuit.wavelengths().get(0))
                .over(own, terms.closed().pieces(), terms.closed().enclosures())
                .verified(terms.verifiedOnly())
                .within(terms.bounded() ? bounds.get(line) : SpareQuery.UNBOUNDED)
                .beside(taken, visits);
    }

    private List<SpareStart> starts(int line, List<SpareWay> before) {
        int from = group.lines().get(line).from();
        if (DarkLine.inSplitter(network, from)) {
            return List.of(new SpareStart(from ^ 1, false, false));
        }
        if (paired() && !before.isEmpty()) {
            List<Integer> ends = before.stream().map(way -> way.start().end()).toList();
            return beside(from, ends, before.get(0).start().plugged()).stream()
                    .map(end -> new SpareStart(end, true, end != from))
                    .toList();
        }
        List<SpareStart> starts = new ArrayList<>(List.of(new SpareStart(from, true, false)));
        if (movable()) {
            Set<Integer> fronts = new LinkedHashSet<>(glass.freeFronts(structure(from)));
            if (DarkLine.inSplitter(network, group.lines().get(line).to())) {
                fromPanels.forEach(panel -> fronts.addAll(glass.freeFrontsOf(panel.id())));
            }
            fronts.remove(from);
            fronts.forEach(front -> starts.add(new SpareStart(front, true, true)));
        }
        return starts;
    }

    private List<SpareGoal> goals(int line, List<SpareWay> before) {
        int to = group.lines().get(line).to();
        if (DarkLine.inSplitter(network, to)) {
            return List.of(new SpareGoal(to ^ 1, true, false));
        }
        if (paired() && !before.isEmpty()) {
            List<Integer> ends = before.stream().map(way -> way.goal().end()).toList();
            return beside(to, ends, before.get(0).goal().plugged()).stream()
                    .map(end -> new SpareGoal(end, false, end != to))
                    .toList();
        }
        List<SpareGoal> goals = new ArrayList<>(List.of(new SpareGoal(to, false, false)));
        int from = group.lines().get(line).from();
        boolean sameStructure = !DarkLine.inSplitter(network, from) && structure(from) == structure(to);
        if (movable() && !sameStructure) {
            glass.freeFronts(structure(to)).forEach(front -> goals.add(new SpareGoal(front, false, true)));
        }
        return goals;
    }

    /** Circuits on several fibers end on ports side by side, and all of their fibers move or none. */
    private boolean paired() {
        return group.circuits().get(0).fibers() > 1;
    }

    private boolean movable() {
        return group.circuits().stream()
                .allMatch(circuit -> circuit.fibers() == 1
                        || circuit.fibers() == group.lines().size());
    }

    private List<Integer> beside(int own, List<Integer> before, boolean plugged) {
        if (!plugged) {
            return List.of(own);
        }
        int last = before.get(before.size() - 1);
        Block block = network.blockOf(last >> 1);
        List<Integer> steps = before.size() == 1 ? List.of(2, -2) : List.of(last - before.get(before.size() - 2));
        return steps.stream()
                .map(step -> last + step)
                .filter(end -> end >> 1 >= block.firstPiece() && end >> 1 < block.firstPiece() + block.count())
                .filter(end -> glass.freeFrontsOf(block.owner()).contains(end))
                .toList();
    }

    private int structure(int front) {
        return glass.structure(glass.enclosure(front));
    }
}
