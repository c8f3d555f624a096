package spanwright.suspicion;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import spanwright.circuits.Circuit;
import spanwright.network.Snapshot;
import spanwright.plant.RouteLength;
import spanwright.plant.Span;
import spanwright.records.Records;

/** Weighs all causes of alarms. Units on which the same listed circuits live are one candidate. */
final class Suspicion {

    /** How many of the best candidates are kept, those of one kind. */
    private static final int KEPT = 400;

    private static final Comparator<Candidate> BEST_FIRST = Comparator.comparingDouble(Candidate::score)
            .reversed()
            .thenComparingInt(Candidate::contradicts)
            .thenComparing(candidate -> candidate.kind)
            .thenComparingInt(candidate -> candidate.members().get(0));

    private final Records records;
    private final RouteUnits units;
    private final List<Circuit> listed;
    private final int down;
    private final Signatures signatures = new Signatures();
    private final Map<Signatures.Sum, Candidate> sheaths = new LinkedHashMap<>();
    private final Map<Signatures.Sum, Candidate> tubes = new LinkedHashMap<>();
    private final Map<Signatures.Sum, Candidate> ports = new LinkedHashMap<>();
    private final List<Candidate> best = new ArrayList<>();
    private int total;

    Suspicion(Snapshot snapshot, Alarms alarms) {
        this.records = snapshot.records();
        this.units = new RouteUnits(snapshot);
        this.down = alarms.down().size();
        this.listed =
                Stream.concat(alarms.down().stream(), alarms.proving().stream()).toList();
        weigh();
        best.addAll(new Crossings(snapshot, units, alarms).find(listed, down));
        total += best.size();
        Stream.of(sheaths, tubes, ports)
                .forEach(kind -> best.addAll(
                        kind.values().stream().sorted(BEST_FIRST).limit(KEPT).toList()));
        Collections.sort(best, BEST_FIRST);
        fill();
    }

    private void weigh() {
        for (int index = 0; index < listed.size(); index++) {
            signatures.next(index < down);
            units.walk(listed.get(index), signatures::add);
        }
        for (int unit = 0; unit < units.limit(); unit++) {
            if (signatures.down(unit) > 0 && (units.isSpan(unit) || units.isEnclosure(unit))) {
                put(sheaths, Suspect.Kind.CUT, unit, fixed(unit));
            }
        }
        for (int unit = 0; unit < units.limit(); unit++) {
            if (signatures.down(unit) > 0 && !units.isSpan(unit) && !units.isEnclosure(unit)) {
                other(unit);
            }
        }
        total = sheaths.size() + tubes.size() + ports.size();
    }

    private void other(int unit) {
        if (units.other(unit) instanceof RouteUnits.Tube tube) {
            if (!sheaths.containsKey(signatures.sum(unit))) {
                put(tubes, Suspect.Kind.CUT, unit, tube(tube));
            }
        } else {
            put(ports, Suspect.Kind.END, unit, Likelihood.port());
        }
    }

    private void put(Map<Signatures.Sum, Candidate> kind, Suspect.Kind word, int unit, double probability) {
        Candidate candidate = kind.computeIfAbsent(signatures.sum(unit), sum -> new Candidate(word));
        candidate.add(unit, probability);
        candidate.counts(signatures.down(unit), signatures.up(unit));
    }

    private double fixed(int unit) {
        return units.isSpan(unit) ? probability(records.spans().get(unit)) : Likelihood.enclosure();
    }

    private double probability(Span span) {
        return Likelihood.span(span.placement(), route(span));
    }

    /** The route of a span. */
    RouteLength route(Span span) {
        return RouteLength.of(
                span,
                records.structures().get(span.from()).position(),
                records.structures().get(span.to()).position());
    }

    private double tube(RouteUnits.Tube tube) {
        double sheath = 0;
        for (int span : units.spansOf(tube.section())) {
            sheath += probability(records.spans().get(span));
        }
        return Likelihood.tube(sheath);
    }

    /** Tells each candidate its circuits, and its units in order along a route. */
    private void fill() {
        Map<Integer, Candidate> ofUnit = new HashMap<>();
        for (Candidate candidate : best) {
            if (candidate.kind != Suspect.Kind.CROSSED) {
                candidate.members().forEach(unit -> ofUnit.put(unit, candidate));
            }
        }
        for (int index = 0; index < listed.size(); index++) {
            int circuit = index;
            units.walk(listed.get(index), unit -> {
                Candidate candidate = ofUnit.get(unit);
                if (candidate != null) {
                    candidate.met(circuit, unit);
                }
            });
        }
    }

    /** The candidates, best first. */
    List<Candidate> candidates() {
        return best;
    }

    int total() {
        return total;
    }

    RouteUnits units() {
        return units;
    }

    Circuit circuit(int index) {
        return listed.get(index);
    }

    /** The listed circuits numbered below this are down. */
    int down() {
        return down;
    }

    double probabilityOf(Span span) {
        return probability(span);
    }
}
