package spanwright.answers;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.outage.CutSection;
import spanwright.outage.Impact;
import spanwright.planning.SectionUse;

/** What the fibers of cut sections carry, ranked by the circuits in the order to restore. One question's. */
public final class CutFibers {

    private final View view;
    private final Impact impact;
    private final Map<Integer, Integer> rank = new HashMap<>();

    /** Of what a cut takes down. */
    public CutFibers(View view, Impact impact) {
        this.view = view;
        this.impact = impact;
        impact.circuits().forEach(hit -> rank.put(hit.circuit().id(), rank.size()));
    }

    /** The fibers in the order to restore: those of the first circuits first, dark ones last. */
    public List<CutFiber> inOrder(CutSection cut) {
        List<CutFiber> found = new ArrayList<>();
        for (int number : cut.fibers()) {
            SectionUse use = view.uses().of(cut.section(), number);
            List<Circuit> carried = use.circuits().stream()
                    .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                    .sorted(Comparator.comparingInt(circuit -> rank.getOrDefault(circuit.id(), rank.size())))
                    .toList();
            int first = carried.isEmpty()
                    ? Integer.MAX_VALUE
                    : rank.getOrDefault(carried.get(0).id(), rank.size());
            found.add(new CutFiber(number, carried, use, first));
        }
        found.sort(Comparator.comparingInt(CutFiber::rank).thenComparingInt(CutFiber::number));
        return found;
    }

    /** {@code down} or {@code single} as the first circuit on it is, else what else the fiber is used for. */
    public String state(CutFiber fiber) {
        return fiber.rank < impact.circuits().size()
                ? impact.circuits().get(fiber.rank).single() ? "single" : "down"
                : fiber.use.use().word();
    }

    /**
     * A fiber of a cut section.
     *
     * @param number from 1
     * @param carries the working circuits on it, the first to be restored first
     * @param use what it is used for
     * @param rank the place of its first circuit in the order to restore, from 0; beyond that order where there is none
     */
    public record CutFiber(int number, List<Circuit> carries, SectionUse use, int rank) {

        /** Keeps its own copy of the list. */
        public CutFiber {
            carries = List.copyOf(carries);
        }

        /** The priority of its first circuit, or null where none works on it. */
        public @Nullable Integer priority() {
            return carries.isEmpty() ? null : (Integer) carries.get(0).priority();
        }
    }
}
