package spanwright.outage;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Snapshot;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.PlantState;
import spanwright.records.CableLay;
import spanwright.records.Records;
import spanwright.trace.Connector;
import spanwright.trace.Element;
import spanwright.trace.Fiber;
import spanwright.trace.Path;
import spanwright.trace.Splice;
import spanwright.trace.SplitterCrossing;
import spanwright.trace.Through;
import spanwright.trace.Tracer;

/** The slow, obvious twin: traces every circuit and asks of each element whether the cut takes it. */
final class ImpactTwin {

    private final Records records;
    private final List<Cut> cuts;
    private final Map<Circuit, List<Path>> traced = new TreeMap<>(Comparator.comparing(Circuit::id));

    ImpactTwin(Snapshot snapshot, List<Cut> cuts) {
        this.records = snapshot.records();
        this.cuts = cuts;
        Tracer tracer = new Tracer(snapshot);
        records.circuits()
                .list()
                .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                .forEach(circuit -> traced.put(circuit, tracer.ofCircuit(circuit)));
    }

    String text() {
        List<Circuit> hit = new ArrayList<>(
                traced.keySet().stream().filter(each -> !at(each).isEmpty()).toList());
        hit.sort(Comparator.comparingInt(Circuit::priority)
                .thenComparing(this::single)
                .thenComparing(Circuit::customersServed, Comparator.reverseOrder())
                .thenComparing(Circuit::code));
        StringBuilder text = new StringBuilder();
        for (Circuit each : hit) {
            text.append(each.code()).append(single(each) ? " single " : " down ");
            text.append(each.priority())
                    .append(' ')
                    .append(each.customersServed())
                    .append(' ');
            text.append(String.join(" ", at(each))).append('\n');
        }
        return text.append(fibersCut())
                .append(" fibers, ")
                .append(customersDown(hit))
                .append(" customers\n")
                .toString();
    }

    private boolean single(Circuit circuit) {
        return circuit.protectionGroup() != null
                && traced.keySet().stream()
                        .filter(other -> other.id() != circuit.id())
                        .filter(other -> circuit.protectionGroup().equals(other.protectionGroup()))
                        .anyMatch(other ->
                                at(other).isEmpty() && pathsOf(other).stream().allMatch(Path::complete));
    }

    private long customersDown(List<Circuit> hit) {
        long sum = 0;
        Set<String> counted = new TreeSet<>();
        for (Circuit each : hit) {
            if (single(each)) {
                continue;
            }
            String group = each.protectionGroup();
            if (group == null) {
                sum += each.customersServed();
            } else if (counted.add(group)) {
                sum += hit.stream()
                        .filter(other -> group.equals(other.protectionGroup()) && !single(other))
                        .mapToInt(Circuit::customersServed)
                        .max()
                        .orElseThrow();
            }
        }
        return sum;
    }

    private List<Path> pathsOf(Circuit circuit) {
        return traced.getOrDefault(circuit, List.of());
    }

    /** Where the cuts meet a circuit's paths. */
    private Set<String> at(Circuit circuit) {
        Set<String> at = new LinkedHashSet<>();
        for (Path path : pathsOf(circuit)) {
            path.elements().forEach(element -> meet(at, element));
        }
        return at;
    }

    private void meet(Set<String> at, Element element) {
        if (element instanceof Connector connector) {
            enclosure(at, records.enclosures().get(connector.panel().enclosure()));
        } else if (element instanceof Splice splice) {
            enclosure(at, splice.enclosure());
        } else if (element instanceof SplitterCrossing crossing) {
            enclosure(at, crossing.enclosure());
        } else if (element instanceof Through through) {
            enclosure(at, through.enclosure());
        } else if (element instanceof Fiber fiber) {
            fiber.from().ifPresent(from -> enclosure(at, from));
            int from = Math.min(fiber.fromRow(), fiber.toRow());
            int to = Math.max(fiber.fromRow(), fiber.toRow());
            if (cuts.stream().anyMatch(cut -> takes(cut, fiber.lay(), from, to, fiber.fiber()))) {
                at.add(fiber.cable().code() + ":" + fiber.fiber());
            }
            fiber.to().ifPresent(to2 -> enclosure(at, to2));
        }
    }

    private void enclosure(Set<String> at, Enclosure enclosure) {
        boolean cut = cuts.stream()
                .anyMatch(each -> (each instanceof Cut.OfEnclosure of && of.enclosure() == enclosure.id())
                        || (each instanceof Cut.OfStructure site && site.structure() == enclosure.structure()));
        if (cut) {
            at.add(enclosure.code());
        }
    }

    private boolean takes(Cut cut, CableLay lay, int from, int to, int fiber) {
        if (cut instanceof Cut.OfSpan of) {
            return lay.rows().subList(from + 1, to + 1).stream()
                    .anyMatch(row -> row.span() != null && row.span() == of.span());
        }
        if (cut instanceof Cut.OfStructure of) {
            return lay.rows().subList(from, to + 1).stream().anyMatch(row -> row.structure() == of.structure());
        }
        if (cut instanceof Cut.OfCable of) {
            return lay.cable().id() == of.cable();
        }
        if (cut instanceof Cut.OfTube of) {
            return lay.cable().id() == of.cable() && lay.type().tubeOf(fiber) == of.tube();
        }
        return cut instanceof Cut.AtPlace at
                && lay.cable().id() == at.cable()
                && lay.positions().enclosure(from).compareTo(at.position()) <= 0
                && lay.positions().enclosure(to).compareTo(at.position()) >= 0;
    }

    private int fibersCut() {
        Set<String> fibers = new TreeSet<>();
        records.cables()
                .list()
                .filter(cable -> cable.state() == PlantState.IN_SERVICE)
                .forEach(cable -> {
                    CableType type = records.cableTypes().get(cable.cableType());
                    CableLay lay = CableLay.of(records, cable.id());
                    int last = lay.rows().size() - 1;
                    for (int fiber = 1; fiber <= type.fibers(); fiber++) {
                        int number = fiber;
                        if (cuts.stream().anyMatch(cut -> takes(cut, lay, 0, last, number))) {
                            fibers.add(cable.code() + ":" + fiber);
                        }
                    }
                });
        return fibers.size();
    }
}
