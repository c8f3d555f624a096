package spanwright.suspicion;

import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Predicate;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.outage.CodeOrder;
import spanwright.plant.Enclosure;
import spanwright.plant.Span;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.records.EndNames;
import spanwright.records.Records;
import spanwright.splicing.EndKey;
import spanwright.splicing.Joint;

/** Says of a candidate what it is in the records. */
final class SuspectWriter {

    /** How many doubtful joints are named, and on the paths of how many circuits they are looked for. */
    private static final int MOST_JOINTS = 20;

    private static final int MOST_CIRCUITS = 50;

    private final Records records;
    private final Network network;
    private final Suspicion suspicion;
    private final EndNames names;
    private final Map<Circuit, Set<Joint>> doubtful = new HashMap<>();

    SuspectWriter(Snapshot snapshot, Suspicion suspicion) {
        this.records = snapshot.records();
        this.network = snapshot.network();
        this.suspicion = suspicion;
        this.names = new EndNames(records);
    }

    Suspect write(Candidate candidate) {
        RouteUnits units = suspicion.units();
        Set<Span> spans = new LinkedHashSet<>();
        Set<Enclosure> enclosures = new LinkedHashSet<>();
        Set<String> tubes = new LinkedHashSet<>(candidate.tubes);
        Set<String> ports = new LinkedHashSet<>();
        for (int unit : candidate.units) {
            if (units.isSpan(unit)) {
                spans.add(records.spans().get(unit));
            } else if (units.isEnclosure(unit)) {
                enclosures.add(records.enclosures().get(units.enclosure(unit)));
            } else if (units.other(unit) instanceof RouteUnits.Tube tube) {
                tubes.add(records.cables().get(tube.section().owner()).code() + "/" + tube.tube());
                for (int span : units.spansOf(tube.section())) {
                    spans.add(records.spans().get(span));
                }
            } else if (units.other(unit) instanceof RouteUnits.Port port) {
                ports.add(names.end(port.front()));
                enclosures.add(enclosure(port));
            }
        }
        List<Circuit> explains = circuits(candidate, index -> index < suspicion.down());
        return new Suspect(
                candidate.kind,
                likeliest(spans),
                spans.isEmpty() ? enclosures.stream().findFirst().orElse(null) : null,
                List.copyOf(spans),
                List.copyOf(enclosures),
                spans.stream().map(span -> suspicion.route(span).length()).reduce(Length.ZERO, Length::plus),
                List.copyOf(tubes),
                List.copyOf(ports),
                explains,
                circuits(candidate, index -> index >= suspicion.down()),
                candidate.score(),
                restsOn(explains));
    }

    private Enclosure enclosure(RouteUnits.Port port) {
        int panel = EndKey.owner(port.front());
        return records.enclosures().get(records.panels().get(panel).enclosure());
    }

    private @Nullable Span likeliest(Set<Span> spans) {
        return spans.stream()
                .max(Comparator.comparingDouble(suspicion::probabilityOf))
                .orElse(null);
    }

    private List<Circuit> circuits(Candidate candidate, Predicate<Integer> which) {
        return candidate.circuits.stream()
                .boxed()
                .filter(which)
                .map(suspicion::circuit)
                .sorted(Comparator.comparing(Circuit::code, CodeOrder.BY_CODE_POINT))
                .toList();
    }

    private List<Joint> restsOn(List<Circuit> explains) {
        Set<Joint> found = new LinkedHashSet<>();
        explains.stream()
                .limit(MOST_CIRCUITS)
                .forEach(circuit -> found.addAll(doubtful.computeIfAbsent(circuit, this::doubtful)));
        return found.stream().limit(MOST_JOINTS).toList();
    }

    private Set<Joint> doubtful(Circuit circuit) {
        Set<Joint> found = new LinkedHashSet<>();
        for (int[] ends : suspicion.units().ends(circuit)) {
            for (int end : ends) {
                int id = network.joint(end);
                if (id != 0) {
                    Joint joint = records.joints().get(id);
                    Trust trust = joint.facts().trust();
                    if (trust == Trust.UNKNOWN || trust == Trust.REPORTED) {
                        found.add(joint);
                    }
                }
            }
        }
        return found;
    }
}
