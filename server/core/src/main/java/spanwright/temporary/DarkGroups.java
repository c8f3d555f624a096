package spanwright.temporary;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanwright.circuits.Circuit;
import spanwright.network.Network;
import spanwright.planning.SpareGlass;

/**
 * Sorts circuits that are down into groups that come back together.
 *
 * @param groups in the order to serve them: priority, then more customers first, then code
 * @param strays circuits that nothing hits by the records, or whose ports no path joins
 */
record DarkGroups(List<DarkGroup> groups, List<Circuit> strays) {

    private static final Comparator<Circuit> FIRST = Comparator.comparingInt(Circuit::priority)
            .thenComparing(Comparator.comparingInt(Circuit::customersServed).reversed())
            .thenComparing(Circuit::code);

    static DarkGroups of(SpareGlass glass, List<Circuit> down, ClosedPlant closed) {
        Network network = glass.snapshot().network();
        Map<List<DarkLine>, List<Circuit>> byLines = new LinkedHashMap<>();
        List<Circuit> strays = new ArrayList<>();
        down.stream().sorted(FIRST).forEach(circuit -> {
            List<DarkLine> hit = hit(glass, network, circuit, closed);
            if (hit.isEmpty()) {
                strays.add(circuit);
            } else {
                byLines.computeIfAbsent(hit, lines -> new ArrayList<>()).add(circuit);
            }
        });
        List<DarkGroup> groups = new ArrayList<>();
        byLines.forEach((lines, circuits) -> groups.add(new DarkGroup(circuits, lines)));
        groups.sort(Comparator.comparingInt(DarkGroup::priority)
                .thenComparing(Comparator.comparingInt(DarkGroup::customers).reversed())
                .thenComparing(group -> group.circuits().get(0).code()));
        return new DarkGroups(List.copyOf(groups), List.copyOf(strays));
    }

    private static List<DarkLine> hit(SpareGlass glass, Network network, Circuit circuit, ClosedPlant closed) {
        List<DarkLine> hit = new ArrayList<>();
        for (int fiber = 0; fiber < circuit.fibers(); fiber++) {
            DarkLine.of(network, circuit, fiber).stream()
                    .filter(line -> closed.hits(line, glass::enclosure))
                    .forEach(hit::add);
        }
        return hit;
    }
}
