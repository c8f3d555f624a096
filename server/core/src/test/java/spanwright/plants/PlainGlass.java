package spanwright.plants;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.plant.Cable;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.records.RecordsView;
import spanwright.splicing.EndKey;
import spanwright.splicing.Joint;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/**
 * The glass over plain maps from end key to end key, worked out in the most obvious way: the slow twin of the network.
 * It shares no code with it.
 */
public final class PlainGlass {

    private final RecordsView records;
    private final Map<Long, Long> across = new TreeMap<>();
    private final Map<Long, Long> peers = new HashMap<>();
    private final Map<Long, Integer> joints = new HashMap<>();
    private final Map<Integer, Pass> passAt = new HashMap<>();

    /** The glass of records as they are. */
    public PlainGlass(RecordsView records) {
        this.records = records;
        records.passes().list().forEach(pass -> passAt.put(pass.runRow(), pass));
        records.cables()
                .list()
                .filter(cable -> cable.state() == PlantState.IN_SERVICE)
                .forEach(this::layCable);
        records.panels().list().filter(panel -> inService(panel.enclosure())).forEach(this::layPanel);
        records.splitters()
                .list()
                .filter(splitter -> inService(splitter.enclosure()))
                .forEach(this::laySplitter);
        records.joints().list().filter(joint -> !joint.planned()).forEach(this::join);
        records.cables()
                .list()
                .filter(cable -> cable.state() == PlantState.IN_SERVICE)
                .forEach(this::passThrough);
    }

    /** The glass as if a planned job were built: each of its joints in the place of what its ends are in. */
    public PlainGlass(RecordsView records, String job) {
        this(records);
        for (int id : records.plannedJoints(job)) {
            Joint joint = records.joints().get(id);
            for (int index = 0; index < joint.count(); index++) {
                free(joint.a().key(index));
                free(joint.b().key(index));
            }
            join(joint);
        }
    }

    private boolean inService(int enclosure) {
        return records.enclosures().get(enclosure).state() == PlantState.IN_SERVICE;
    }

    private void layCable(Cable cable) {
        int fibers = records.cableTypes().get(cable.cableType()).fibers();
        List<RunRow> cuts = cutsOf(cable);
        for (int index = 1; index < cuts.size(); index++) {
            for (int fiber = 1; fiber <= fibers; fiber++) {
                lay(
                        EndKey.of(LegKind.AHEAD, cuts.get(index - 1).id(), fiber),
                        EndKey.of(LegKind.BACK, cuts.get(index).id(), fiber));
            }
        }
    }

    private List<RunRow> cutsOf(Cable cable) {
        List<RunRow> run = new ArrayList<>(records.runRows()
                .list()
                .filter(row -> row.cable() == cable.id())
                .toList());
        run.sort(Comparator.comparingInt(RunRow::seq));
        List<RunRow> cuts = new ArrayList<>();
        for (RunRow row : run) {
            boolean outer = row.equals(run.get(0)) || row.equals(run.get(run.size() - 1));
            Pass pass = passAt.get(row.id());
            if (outer || (pass != null && inService(pass.enclosure()))) {
                cuts.add(row);
            }
        }
        return cuts;
    }

    private void layPanel(Panel panel) {
        for (int port = 1; port <= panel.ports(); port++) {
            lay(EndKey.of(LegKind.REAR, panel.id(), port), EndKey.of(LegKind.FRONT, panel.id(), port));
        }
    }

    private void laySplitter(Splitter splitter) {
        for (int input = 1; input <= splitter.inputs(); input++) {
            across.put(EndKey.of(LegKind.IN, splitter.id(), input), NO_END);
        }
        for (int output = 1; output <= splitter.outputs(); output++) {
            across.put(EndKey.of(LegKind.OUT, splitter.id(), output), NO_END);
        }
    }

    /** Where glass leads into a splitter. */
    public static final long NO_END = -1;

    private void lay(long one, long other) {
        across.put(one, other);
        across.put(other, one);
    }

    private void join(Joint joint) {
        for (int index = 0; index < joint.count(); index++) {
            long a = joint.a().key(index);
            long b = joint.b().key(index);
            joints.put(a, joint.id());
            joints.put(b, joint.id());
            if (across.containsKey(a) && across.containsKey(b) && inService(joint.enclosure())) {
                peers.put(a, b);
                peers.put(b, a);
            }
        }
    }

    private void free(long end) {
        Long other = peers.remove(end);
        joints.remove(end);
        if (other != null) {
            peers.remove(other);
            joints.remove(other);
        }
    }

    private void passThrough(Cable cable) {
        int fibers = records.cableTypes().get(cable.cableType()).fibers();
        for (RunRow row : cutsOf(cable)) {
            for (int fiber = 1; fiber <= fibers; fiber++) {
                long back = EndKey.of(LegKind.BACK, row.id(), fiber);
                long ahead = EndKey.of(LegKind.AHEAD, row.id(), fiber);
                if (across.containsKey(back)
                        && across.containsKey(ahead)
                        && !joints.containsKey(back)
                        && !joints.containsKey(ahead)
                        && !opened(row.id(), fiber)) {
                    peers.put(back, ahead);
                    peers.put(ahead, back);
                }
            }
        }
    }

    private boolean opened(int row, int fiber) {
        Pass pass = passAt.get(row);
        for (FiberRange range : pass == null ? List.<FiberRange>of() : pass.opened()) {
            for (int index = 0; index < range.count(); index++) {
                if (range.at(index) == fiber) {
                    return true;
                }
            }
        }
        return false;
    }

    /** All ends in the network, by key; a splitter's inner ones have none. */
    public List<Long> ends() {
        return List.copyOf(across.keySet());
    }

    /** The end joined to an end, or null. */
    public @Nullable Long peer(long end) {
        return peers.get(end);
    }

    /** The joint that names an end, or 0. */
    public int joint(long end) {
        return joints.getOrDefault(end, 0);
    }

    /** The other end of an end's piece; {@link #NO_END} for a splitter's terminal. */
    public long across(long end) {
        return Objects.requireNonNull(across.get(end));
    }

    /** The ends by which a walk enters the pieces, from one that it enters by an end on; it stops where it began. */
    public List<Long> walk(long from) {
        List<Long> walk = new ArrayList<>();
        Long end = from;
        do {
            walk.add(end);
            long out = across(end);
            end = out == NO_END ? null : peers.get(out);
        } while (end != null && end != from);
        return walk;
    }

    /** Whether a walk that enters by an end comes back to it. */
    public boolean circle(long from) {
        List<Long> walk = walk(from);
        long out = across(walk.get(walk.size() - 1));
        Long next = out == NO_END ? null : peers.get(out);
        return next != null && next == from;
    }

    /** Codes of the circuits, but for retired ones, whose two ports two ends are. */
    public SortedSet<String> circuits(long one, long other) {
        TreeSet<String> codes = new TreeSet<>();
        records.circuits()
                .list()
                .filter(circuit -> circuit.status() != CircuitStatus.RETIRED)
                .forEach(circuit -> {
                    for (int index = 0; index < circuit.fibers(); index++) {
                        long a = front(circuit, true, index);
                        long z = front(circuit, false, index);
                        if ((a == one && z == other) || (a == other && z == one)) {
                            codes.add(circuit.code());
                        }
                    }
                });
        return codes;
    }

    private static long front(Circuit circuit, boolean a, int index) {
        var ports = a ? circuit.a() : circuit.z();
        return EndKey.of(LegKind.FRONT, ports.panel(), ports.ports().at(index));
    }
}
