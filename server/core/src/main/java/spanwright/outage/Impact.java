package spanwright.outage;

import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import spanwright.network.Snapshot;

/**
 * What a cut takes down.
 *
 * @param circuits the working circuits whose path it hits, in the order in which they are restored
 * @param fibersCut the fibers of the cut cables, lit or dark, each once
 * @param customersDown those of the circuits that are down, of a protection group the most
 * @param sections the cable sections that are cut, by cable and along it
 */
public record Impact(List<HitCircuit> circuits, int fibersCut, long customersDown, List<CutSection> sections) {

    /** Keeps its own copies of the lists. */
    public Impact {
        circuits = List.copyOf(circuits);
        sections = List.copyOf(sections);
    }

    /** What cuts, taken together, take down. */
    public static Impact of(Snapshot snapshot, Collection<Cut> cuts) {
        CutGlass glass = new CutGlass(snapshot, cuts);
        List<HitCircuit> hit = new HitCircuits(snapshot, glass).list();
        return new Impact(hit, glass.fibers(), customersDown(hit), glass.sections());
    }

    private static long customersDown(List<HitCircuit> circuits) {
        long alone = 0;
        Map<String, Integer> mostOfGroup = new HashMap<>();
        for (HitCircuit hit : circuits) {
            String group = hit.circuit().protectionGroup();
            if (hit.down() && group == null) {
                alone += hit.circuit().customersServed();
            } else if (hit.down()) {
                mostOfGroup.merge(group, hit.circuit().customersServed(), Math::max);
            }
        }
        return alone
                + mostOfGroup.values().stream().mapToLong(Integer::longValue).sum();
    }
}
