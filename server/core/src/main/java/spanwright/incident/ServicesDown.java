package spanwright.incident;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.records.RecordsView;

/**
 * Turns circuits whose path is down into services that are down or on a single path: circuits of one protection group
 * are one service, which is down where all of them are, and on a single path where only some are.
 */
final class ServicesDown {

    private final RecordsView records;
    private final Map<String, List<Circuit>> services = new TreeMap<>();

    /**
     * Of the circuits that an incident names.
     *
     * @param records as they stood when it was opened
     */
    ServicesDown(RecordsView records, Collection<String> circuits) {
        this.records = records;
        circuits.stream()
                .flatMap(code -> records.circuits().find(code).stream())
                .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                .forEach(this::add);
    }

    private void add(Circuit circuit) {
        String group = circuit.protectionGroup();
        if (group == null) {
            // No code holds a slash, so a circuit never shares the name of a group.
            services.put("/" + circuit.code(), List.of(circuit));
        } else {
            services.computeIfAbsent(group, this::group);
        }
    }

    private List<Circuit> group(String group) {
        return records.circuits()
                .list()
                .filter(each -> group.equals(each.protectionGroup()) && each.status() == CircuitStatus.WORKING)
                .sorted(Comparator.comparing(Circuit::code))
                .collect(Collectors.toList());
    }

    /** How many customers hang on the services that are down; of a service those of its largest circuit. */
    int customers(Set<String> down) {
        return services.values().stream()
                .filter(service -> isDown(service, down))
                .mapToInt(ServicesDown::largest)
                .sum();
    }

    /** Whether any service is down. */
    boolean any(Set<String> down) {
        return services.values().stream().anyMatch(service -> isDown(service, down));
    }

    /** The protection groups of which some circuits are down and not all, by code. */
    List<String> single(Set<String> down) {
        List<String> single = new ArrayList<>();
        services.forEach((group, service) -> {
            if (!isDown(service, down) && service.stream().anyMatch(circuit -> down.contains(circuit.code()))) {
                single.add(group);
            }
        });
        return single;
    }

    /** The circuits of first priority whose service is down, by code. */
    List<String> firstPriority(Set<String> down) {
        return services.values().stream()
                .filter(service -> isDown(service, down))
                .flatMap(List::stream)
                .filter(circuit -> circuit.priority() == 1)
                .map(Circuit::code)
                .sorted()
                .toList();
    }

    private static boolean isDown(List<Circuit> service, Set<String> down) {
        return service.stream().allMatch(circuit -> down.contains(circuit.code()));
    }

    private static int largest(List<Circuit> service) {
        return service.stream().mapToInt(Circuit::customersServed).max().orElse(0);
    }
}
