package spanwright.suspicion;

import java.time.LocalDate;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;

/**
 * What is known of an outage from afar.
 *
 * @param down circuits that are down
 * @param up circuits that are up
 * @param byPath whether a protected circuit that is up is known to be so on its own path
 * @param opened identities of enclosures that a crew is known to have opened lately
 * @param posted days of postings that made splices lately without a day of their own, by the enclosure's identity
 * @param today the day for which it is asked, or null: joints made lately are then not looked for
 */
public record Alarms(
        List<Circuit> down,
        List<Circuit> up,
        boolean byPath,
        Set<Integer> opened,
        Map<Integer, LocalDate> posted,
        @Nullable LocalDate today) {

    /** Keeps its own copies; refuses none down, and a circuit both down and up. */
    public Alarms {
        down = List.copyOf(new LinkedHashSet<>(down));
        up = List.copyOf(new LinkedHashSet<>(up));
        opened = Set.copyOf(opened);
        posted = Map.copyOf(posted);
        Set<Circuit> both = new HashSet<>(down);
        both.retainAll(new HashSet<>(up));
        if (down.isEmpty() || !both.isEmpty()) {
            throw new IllegalArgumentException("no alarms to explain: " + both);
        }
    }

    /** Alarms of which no posting is asked. */
    public Alarms(
            List<Circuit> down, List<Circuit> up, boolean byPath, Set<Integer> opened, @Nullable LocalDate today) {
        this(down, up, byPath, opened, Map.of(), today);
    }

    /** The circuits whose being up proves that their path is whole. */
    List<Circuit> proving() {
        return byPath
                ? up
                : up.stream()
                        .filter(circuit -> circuit.protectionGroup() == null)
                        .toList();
    }
}
