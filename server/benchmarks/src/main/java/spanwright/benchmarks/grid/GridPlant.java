package spanwright.benchmarks.grid;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.EnclosureKind;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.Wavelength;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;
import spanwright.splicing.Joint;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** A plant of a wanted size as records. */
public final class GridPlant {

    private static final double SPACING_DEGREES = 0.002;
    /** A false origin in the open ocean: nothing real lies under it. */
    private static final Position ORIGIN = new Position(-123, -48);

    private final Grid grid;
    private final Walks walks;
    private final Map<Integer, Integer> typeByFibers = new HashMap<>();
    private final List<Recorded> records = new ArrayList<>();
    /** Place of a port within its node's panel, from 1. */
    private final int[] portNumber;

    /**
     * A plant.
     *
     * @param sections about how many fiber sections
     * @param seed the same seed gives the same plant
     */
    public GridPlant(int sections, long seed) {
        Random random = new Random(seed);
        grid = new Grid(sections, random);
        walks = new Walks(grid, random);
        portNumber = new int[walks.ports.size()];
        numberPorts();
        structures();
        cables();
        enclosures();
        splittersAndPanels();
        records.addAll(new GridJoints(grid, walks, portNumber).joints());
        circuits();
    }

    /** How many fiber sections it has. */
    public int sections() {
        return grid.sections;
    }

    /** How many single joints it has. */
    public int joints() {
        return records.stream()
                .filter(Joint.class::isInstance)
                .mapToInt(record -> ((Joint) record).count())
                .sum();
    }

    /** All its records, each after those it refers to. */
    public List<Recorded> list() {
        return List.copyOf(records);
    }

    /** Its records as a state. */
    public Records records() {
        RecordsEditor editor = Records.empty().edit();
        records.forEach(record -> editor.apply(Change.add(record)));
        return editor.build(1);
    }

    private void numberPorts() {
        int[] perNode = new int[grid.nodes()];
        for (int port = 0; port < portNumber.length; port++) {
            portNumber[port] = ++perNode[walks.ports.get(port).node()];
        }
    }

    private void structures() {
        for (int node = 0; node < grid.nodes(); node++) {
            int row = node / grid.side;
            int column = node % grid.side;
            Position position =
                    new Position(ORIGIN.lon() + column * SPACING_DEGREES, ORIGIN.lat() - row * SPACING_DEGREES);
            records.add(new Structure(
                    node + 1,
                    "HH-" + (node + 1),
                    StructureKind.HANDHOLE,
                    position,
                    null,
                    null,
                    PlantState.IN_SERVICE,
                    List.of(),
                    null));
        }
        for (int cable = 0; cable < grid.cables; cable++) {
            records.add(new Span(
                    cable + 1,
                    "SP-" + (cable + 1),
                    grid.from[cable] + 1,
                    grid.to[cable] + 1,
                    Placement.DUCT,
                    Length.ofMetres(200),
                    null,
                    PlantState.IN_SERVICE,
                    List.of(),
                    null));
        }
    }

    private void cables() {
        for (int cable = 0; cable < grid.cables; cable++) {
            int type = type(grid.fibers[cable]);
            records.add(new Cable(
                    cable + 1, "F-" + (cable + 1), type, null, "white", null, null, null, PlantState.IN_SERVICE, null));
            records.add(row(2 * cable + 1, cable, 0, grid.from[cable], null));
            records.add(row(2 * cable + 2, cable, 1, grid.to[cable], cable + 1));
        }
    }

    private int type(int fibers) {
        return typeByFibers.computeIfAbsent(fibers, count -> {
            int id = typeByFibers.size() + 1;
            records.add(new CableType(id, count + "F", count, 12, "G.652.D", 1, false, null, "TIA-598"));
            return id;
        });
    }

    private static RunRow row(int id, int cable, int seq, int node, @Nullable Integer span) {
        return new RunRow(id, cable + 1, seq, node + 1, span, Length.ofMetres(10), Trust.POSTED, null, null);
    }

    private void enclosures() {
        for (int node = 0; node < grid.nodes(); node++) {
            records.add(new Enclosure(
                    node + 1,
                    "C-" + (node + 1),
                    node + 1,
                    EnclosureKind.CLOSURE,
                    Length.ofMetres(1),
                    PlantState.IN_SERVICE,
                    null));
        }
        for (int cable = 0; cable < grid.cables; cable++) {
            records.add(new Pass(2 * cable + 1, grid.from[cable] + 1, cable + 1, 2 * cable + 1, List.of(), List.of()));
            records.add(new Pass(2 * cable + 2, grid.to[cable] + 1, cable + 1, 2 * cable + 2, List.of(), List.of()));
        }
    }

    private void splittersAndPanels() {
        for (int index = 0; index < walks.splitters.size(); index++) {
            int node = walks.splitters.get(index).node();
            records.add(new Splitter(index + 1, node + 1, "S" + (index + 1), 1, 32, null, Map.of()));
        }
        int[] ports = new int[grid.nodes()];
        walks.ports.forEach(port -> ports[port.node()]++);
        for (int node = 0; node < grid.nodes(); node++) {
            if (ports[node] > 0) {
                records.add(new Panel(node + 1, node + 1, "P", ports[node], "SC/APC"));
            }
        }
    }

    private void circuits() {
        int id = 0;
        for (Walks.Service service : walks.services) {
            id++;
            records.add(new Circuit(
                    id,
                    "CT-" + id,
                    null,
                    null,
                    3,
                    1,
                    List.of(Wavelength.ofNanometres(1310)),
                    null,
                    null,
                    port(service.a()),
                    port(service.z()),
                    CircuitStatus.WORKING));
        }
    }

    private PortRange port(int port) {
        return new PortRange(walks.ports.get(port).node() + 1, FiberRange.of(portNumber[port]));
    }
}
