package spanwright.paper;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanwright.outage.HitCircuit;
import spanwright.outage.Impact;

/** The circuits that a cut hits, in the order to restore; those that come back together share a row. */
public final class RestoreOrder {

    private RestoreOrder() {}

    /**
     * A row of the order.
     *
     * @param circuits at least one; alike in priority, in state, in customers, and in where they are cut
     */
    public record Row(List<HitCircuit> circuits) {

        /** Keeps its own copy. */
        public Row {
            circuits = List.copyOf(circuits);
        }

        /** The circuit, or the first of several and how many come back with it. */
        String codes() {
            String first = first().circuit().code();
            return circuits.size() == 1 ? first : first + " and " + (circuits.size() - 1) + " more";
        }

        /** The first of them. */
        HitCircuit first() {
            return circuits.get(0);
        }

        /** Their customers together. */
        long customers() {
            return circuits.stream()
                    .mapToLong(hit -> hit.circuit().customersServed())
                    .sum();
        }
    }

    /** What is alike of the circuits of a row. */
    private record Key(int priority, boolean single, int customers, List<String> at) {

        Key(HitCircuit hit) {
            this(hit.circuit().priority(), hit.single(), hit.circuit().customersServed(), hit.at());
        }
    }

    /**
     * The rows: in the impact's order by priority, by state and by customers. Circuits that nothing but their codes parts
     * share the row of the first of them that is cut at the same fibers, as one joint brings them all back.
     */
    public static List<Row> of(Impact impact) {
        Map<Key, List<HitCircuit>> rows = new LinkedHashMap<>();
        for (HitCircuit hit : impact.circuits()) {
            rows.computeIfAbsent(new Key(hit), key -> new ArrayList<>()).add(hit);
        }
        return rows.values().stream().map(Row::new).toList();
    }
}
