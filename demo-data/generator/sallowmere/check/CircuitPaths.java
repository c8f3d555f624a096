package sallowmere.check;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Predicate;

/** Which spans each circuit lives on. */
public final class CircuitPaths {
    private final Map<String, Set<String>> spans = new LinkedHashMap<>();

    /** Walks every circuit of a folder. */
    public CircuitPaths(RecordsFolder folder, Network network) {
        Map<String, List<String>> runs = new HashMap<>();
        for (Map<String, String> row : folder.rows("cable_runs.csv")) {
            runs.computeIfAbsent(row.get("cable"), key -> new ArrayList<>()).add(row.get("span"));
        }
        for (Map<String, String> circuit : folder.rows("circuits.csv")) {
            Set<String> taken = new LinkedHashSet<>();
            for (String port : Network.ports(circuit.get("z"))) {
                for (Stretch stretch : network.from(port).stretches()) {
                    int low = Math.min(stretch.from(), stretch.to());
                    int high = Math.max(stretch.from(), stretch.to());
                    taken.addAll(runs.get(stretch.cable()).subList(low + 1, high + 1));
                }
            }
            spans.put(circuit.get("circuit"), taken);
        }
    }

    /** The circuits that live on a span, in the order of the file. */
    public List<String> on(String span) {
        return spans.keySet().stream()
                .filter(circuit -> spans.get(circuit).contains(span))
                .toList();
    }

    /** The circuits, in the order of the file. */
    public List<String> circuits() {
        return new ArrayList<>(spans.keySet());
    }

    /** Spans on which every circuit that is down lives and none that proves itself up. */
    public Set<String> suspects(Predicate<String> down, Predicate<String> up) {
        Set<String> left = null;
        for (String circuit : spans.keySet()) {
            if (down.test(circuit)) {
                left = left == null ? new LinkedHashSet<>(spans.get(circuit)) : left;
                left.retainAll(spans.get(circuit));
            }
        }
        Set<String> suspects = left == null ? new LinkedHashSet<>() : left;
        spans.keySet().stream().filter(up).forEach(circuit -> suspects.removeAll(spans.get(circuit)));
        return suspects;
    }
}
