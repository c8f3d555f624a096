package spanwright.suspicion;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntConsumer;
import java.util.stream.IntStream;
import spanwright.circuits.Circuit;
import spanwright.journal.RecordKind;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.outage.CircuitRoutes;
import spanwright.outage.Route;
import spanwright.plant.CableType;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.records.Records;

/**
 * What circuits live on, in numbered units: spans, enclosures, tubes of cable sections, ports. The numbers are dense, so
 * that what is counted for each lies in an array.
 */
final class RouteUnits {

    private final Records records;
    private final Network network;
    private final CircuitRoutes routes;
    private final int spans;
    private final int fixed;
    private final Map<Object, Integer> others = new HashMap<>();
    private final List<Object> otherUnits = new ArrayList<>();
    private final Map<Integer, Lies> sections = new HashMap<>();

    RouteUnits(Snapshot snapshot) {
        this.records = snapshot.records();
        this.network = snapshot.network();
        this.routes = new CircuitRoutes(network);
        this.spans = records.limit(RecordKind.SPAN);
        this.fixed = spans + records.limit(RecordKind.ENCLOSURE);
    }

    /** A tube of a cable section. */
    record Tube(Block section, int tube) {}

    /** The front of a port. */
    record Port(long front) {}

    /** Where a section lies: what it meets from its start to its end. */
    @SuppressWarnings("ArrayRecordComponent") // Made and read here alone, by the thousand; never compared.
    private record Lies(int from, int[] spans, int to, CableType type) {}

    boolean isSpan(int unit) {
        return unit < spans;
    }

    boolean isEnclosure(int unit) {
        return unit >= spans && unit < fixed;
    }

    int enclosure(int unit) {
        return unit - spans;
    }

    int ofEnclosure(int enclosure) {
        return spans + enclosure;
    }

    /** The tube or port of a unit that is neither span nor enclosure. */
    Object other(int unit) {
        return otherUnits.get(unit - fixed);
    }

    /** Units are numbered below this; more may come. */
    int limit() {
        return fixed + otherUnits.size();
    }

    private int number(Object other) {
        return others.computeIfAbsent(other, key -> {
            otherUnits.add(key);
            return fixed + otherUnits.size() - 1;
        });
    }

    /** The units on a circuit's paths in their order; one may come several times. */
    void walk(Circuit circuit, IntConsumer hearer) {
        for (Route route : routes.of(circuit)) {
            for (int entering : route.enterings()) {
                for (int end : routes.glass(route, entering)) {
                    meet(end, hearer);
                }
            }
            if (route.enterings().length > 0) {
                hearer.accept(number(new Port(network.keyOf(route.enterings()[0]))));
            }
            if (route.whole()) {
                hearer.accept(number(new Port(network.keyOf(route.target()))));
            }
        }
    }

    /** The ends by which a circuit enters its pieces, one list a fiber. */
    List<int[]> ends(Circuit circuit) {
        return routes.of(circuit).stream()
                .map(route -> IntStream.of(route.enterings())
                        .flatMap(entering -> IntStream.of(routes.glass(route, entering)))
                        .toArray())
                .toList();
    }

    private void meet(int end, IntConsumer hearer) {
        Block block = network.blockOf(end >> 1);
        if (block.kind() == BlockKind.SECTION) {
            section(block, end, hearer);
        } else {
            int enclosure = block.kind() == BlockKind.PANEL
                    ? records.panels().get(block.owner()).enclosure()
                    : records.splitters().get(block.owner()).enclosure();
            hearer.accept(spans + enclosure);
        }
    }

    private void section(Block block, int end, IntConsumer hearer) {
        Lies lies = sections.computeIfAbsent(block.firstPiece(), key -> lies(block));
        boolean ahead = (end & 1) == 0;
        enclosure(ahead ? lies.from : lies.to, hearer);
        for (int index = 0; index < lies.spans.length; index++) {
            hearer.accept(lies.spans[ahead ? index : lies.spans.length - 1 - index]);
        }
        hearer.accept(number(new Tube(block, lies.type.tubeOf(block.number(end >> 1)))));
        enclosure(ahead ? lies.to : lies.from, hearer);
    }

    private void enclosure(int enclosure, IntConsumer hearer) {
        if (enclosure != 0) {
            hearer.accept(spans + enclosure);
        }
    }

    private Lies lies(Block section) {
        int from = records.runRows().get(section.fromRow()).seq();
        int to = records.runRows().get(section.toRow()).seq();
        int[] travelled = records.runOf(section.owner()).stream()
                .filter(row -> row.seq() > from && row.seq() <= to && row.span() != null)
                .mapToInt(RouteUnits::span)
                .toArray();
        CableType type =
                records.cableTypes().get(records.cables().get(section.owner()).cableType());
        return new Lies(enclosureAt(section.fromRow()), travelled, enclosureAt(section.toRow()), type);
    }

    private static int span(RunRow row) {
        Integer span = row.span();
        return span == null ? 0 : span;
    }

    /** The spans on which a section lies, from its start. */
    int[] spansOf(Block section) {
        return sections.computeIfAbsent(section.firstPiece(), key -> lies(section))
                .spans
                .clone();
    }

    private int enclosureAt(int runRow) {
        return records.findPassAt(runRow)
                .map(pass -> records.enclosures().get(pass.enclosure()))
                .filter(enclosure -> enclosure.state() == PlantState.IN_SERVICE)
                .map(enclosure -> enclosure.id())
                .orElse(0);
    }
}
