package spanwright.planning;

import java.util.HashSet;
import java.util.Set;
import java.util.stream.Stream;
import spanwright.circuits.Circuit;
import spanwright.network.Snapshot;
import spanwright.plant.RunRow;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;
import spanwright.trace.Connector;
import spanwright.trace.Fiber;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

/**
 * What a path must not meet.
 *
 * @param spans identities of spans
 * @param enclosures identities of enclosures
 */
public record Avoided(Set<Integer> spans, Set<Integer> enclosures) {

    /** Nothing. */
    public static final Avoided NOTHING = new Avoided(Set.of(), Set.of());

    /** Keeps its own copies. */
    public Avoided {
        spans = Set.copyOf(spans);
        enclosures = Set.copyOf(enclosures);
    }

    /** The spans and enclosures that a circuit's paths meet. */
    public static Avoided of(Snapshot snapshot, Circuit circuit) {
        Set<Integer> spans = new HashSet<>();
        Set<Integer> enclosures = new HashSet<>();
        for (Path path : new Tracer(snapshot).ofCircuit(circuit)) {
            path.list(Fiber.class).forEach(fiber -> add(fiber, spans, enclosures));
            path.list(Connector.class)
                    .forEach(connector -> enclosures.add(connector.enclosure().id()));
            path.ends().stream()
                    .filter(end -> EndKey.kind(end.key()) == LegKind.FRONT)
                    .forEach(end -> enclosures.add(snapshot.records()
                            .panels()
                            .get(EndKey.owner(end.key()))
                            .enclosure()));
        }
        return new Avoided(spans, enclosures);
    }

    private static void add(Fiber fiber, Set<Integer> spans, Set<Integer> enclosures) {
        int first = Math.min(fiber.fromRow(), fiber.toRow());
        int last = Math.max(fiber.fromRow(), fiber.toRow());
        fiber.lay().rows().subList(first + 1, last + 1).stream()
                .map(RunRow::span)
                .flatMap(Stream::ofNullable)
                .forEach(spans::add);
        fiber.from().ifPresent(enclosure -> enclosures.add(enclosure.id()));
        fiber.to().ifPresent(enclosure -> enclosures.add(enclosure.id()));
    }
}
