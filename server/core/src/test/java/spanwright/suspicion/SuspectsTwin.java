package spanwright.suspicion;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import spanwright.circuits.Circuit;
import spanwright.network.Snapshot;
import spanwright.plant.Enclosure;
import spanwright.plant.RouteLength;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.records.Records;
import spanwright.trace.Connector;
import spanwright.trace.Element;
import spanwright.trace.Fiber;
import spanwright.trace.Path;
import spanwright.trace.Splice;
import spanwright.trace.SplitterCrossing;
import spanwright.trace.Through;
import spanwright.trace.Tracer;

/**
 * The slow, obvious twin: a set of circuits for every span and every enclosure, out of traces; the constants are those of
 * docs/SUSPECTS.md, written here once more.
 */
final class SuspectsTwin {

    private final Records records;
    private final Map<String, Set<Circuit>> on = new TreeMap<>();
    private final Map<String, Double> priors = new HashMap<>();
    private final Set<Circuit> down;

    SuspectsTwin(Snapshot snapshot, Alarms alarms) {
        this.records = snapshot.records();
        this.down = Set.copyOf(alarms.down());
        Tracer tracer = new Tracer(snapshot);
        List<Circuit> listed = new ArrayList<>(alarms.down());
        for (Circuit circuit : alarms.up()) {
            if (alarms.byPath() || circuit.protectionGroup() == null) {
                listed.add(circuit);
            }
        }
        for (Circuit circuit : listed) {
            for (Path path : tracer.ofCircuit(circuit)) {
                path.elements().forEach(element -> meet(circuit, element));
            }
        }
    }

    private void meet(Circuit circuit, Element element) {
        if (element instanceof Connector connector) {
            enclosure(circuit, connector.enclosure());
        } else if (element instanceof Splice splice) {
            enclosure(circuit, splice.enclosure());
        } else if (element instanceof SplitterCrossing crossing) {
            enclosure(circuit, crossing.enclosure());
        } else if (element instanceof Through through) {
            enclosure(circuit, through.enclosure());
        } else if (element instanceof Fiber fiber) {
            fiber.from().ifPresent(each -> enclosure(circuit, each));
            fiber.to().ifPresent(each -> enclosure(circuit, each));
            int from = Math.min(fiber.fromRow(), fiber.toRow());
            int to = Math.max(fiber.fromRow(), fiber.toRow());
            for (RunRow row : fiber.lay().rows().subList(from + 1, to + 1)) {
                Integer span = row.span();
                if (span != null) {
                    span(circuit, records.spans().get(span));
                }
            }
        }
    }

    private void enclosure(Circuit circuit, Enclosure enclosure) {
        String name = "enclosure " + enclosure.code();
        on.computeIfAbsent(name, key -> new LinkedHashSet<>()).add(circuit);
        priors.put(name, 0.0005 / 365);
    }

    private void span(Circuit circuit, Span span) {
        String name = "span " + span.code();
        on.computeIfAbsent(name, key -> new LinkedHashSet<>()).add(circuit);
        double kilometres = RouteLength.of(
                                span,
                                records.structures().get(span.from()).position(),
                                records.structures().get(span.to()).position())
                        .length()
                        .metres()
                / 1000;
        double rate = switch (span.placement()) {
            case BURIED -> 0.003;
            case AERIAL -> 0.002;
            case DUCT -> 0.0015;
            case UNDERWATER, INDOOR -> 0.0005;
        };
        priors.put(name, (rate * kilometres + 1e-6) / 365);
    }

    /** A line a suspect: its units, how many it explains and contradicts, its score. */
    Set<String> lines() {
        Map<Set<Circuit>, Set<String>> classes = new HashMap<>();
        on.forEach((name, circuits) ->
                classes.computeIfAbsent(circuits, key -> new TreeSet<>()).add(name));
        Set<String> lines = new TreeSet<>();
        classes.forEach((circuits, names) -> {
            long explains = circuits.stream().filter(down::contains).count();
            if (explains > 0) {
                double prior = names.stream()
                        .mapToDouble(name -> priors.getOrDefault(name, 0.0))
                        .sum();
                lines.add(line(names, explains, circuits.size() - explains, prior));
            }
        });
        return lines;
    }

    private static String line(Set<String> names, long explains, long contradicts, double prior) {
        double score = Math.log(prior) + explains * Math.log(0.97 / 0.01) + contradicts * Math.log(0.03 / 0.99);
        return text(names, explains, contradicts, score);
    }

    /** How a suspect is written, to compare. */
    static String text(Set<String> names, long explains, long contradicts, double score) {
        return names + String.format(Locale.ROOT, " %d %d %.6f", explains, contradicts, score);
    }
}
