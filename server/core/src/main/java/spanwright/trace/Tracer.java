package spanwright.trace;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.records.Records;
import spanwright.records.Relation;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/** Traces paths end to end through one snapshot. One thread's; made for one answer. */
public final class Tracer {

    private final Network network;
    private final Records records;
    private final Walker walker;
    private final Sketcher sketcher;

    /** A tracer of that snapshot. */
    public Tracer(Snapshot snapshot) {
        this(snapshot, new Walker(snapshot.network()), Sketcher.MOST_LAYS);
    }

    Tracer(Snapshot snapshot, Walker walker, int mostLays) {
        this.network = snapshot.network();
        this.records = snapshot.records();
        this.walker = walker;
        this.sketcher = new Sketcher(snapshot, mostLays);
    }

    /**
     * The paths that start at the front of a port and go through its rear; a jumper on that front is not followed.
     * Behind a splitter's input there is a path an output, in order of output. A port not in service is a path of
     * nothing, from its front to its front.
     *
     * @param panel identity of the panel
     * @param port from 1 to the panel's ports
     */
    public List<Path> fromPort(int panel, int port) {
        int front = network.endOf(EndKey.of(LegKind.FRONT, panel, port));
        if (front == Network.NONE) {
            return List.of(nothing(panel, port, null));
        }
        return from(front);
    }

    private List<Path> from(int entered) {
        return walker.all(entered).stream()
                .map(walk -> path(entered, walk, null))
                .toList();
    }

    /**
     * The paths that start at an end and go into its glass; from a splitter's input to its outputs, a path an output,
     * from an output to its inputs. None where that end is not in service.
     *
     * @param key key of the end
     */
    public List<Path> fromEnd(long key) {
        int entered = network.endOf(key);
        return entered == Network.NONE ? List.of() : from(entered);
    }

    private Path nothing(int panel, int port, @Nullable Circuit asked) {
        PathEnd front = sketcher.front(panel, port);
        return new Path(List.of(front, front), List.of(), false, false, List.of(), asked);
    }

    private Path path(int front, Walk walk, @Nullable Circuit asked) {
        List<Element> elements = sketcher.elements(walk.entered());
        if (walk.loop()) {
            close(elements, walk, front);
            return circle(elements, asked);
        }
        return open(sketcher.end(front), sketcher.end(walk.last()), elements, asked);
    }

    /** A circle that closes where it began has one joint more. */
    private void close(List<Element> elements, Walk walk, int start) {
        if (walk.stop() == Walk.Stop.CIRCLE) {
            sketcher.addJoint(elements, walk.entered()[walk.entered().length - 1], start);
        }
    }

    private static Path circle(List<Element> elements, @Nullable Circuit asked) {
        return new Path(List.of(), elements, false, true, List.of(), asked);
    }

    private Path open(PathEnd from, PathEnd to, List<Element> elements, @Nullable Circuit asked) {
        boolean fronts = from.front() && to.front();
        return new Path(
                List.of(from, to), elements, fronts, false, fronts ? circuitsBetween(from, to) : List.of(), asked);
    }

    private List<Circuit> circuitsBetween(PathEnd one, PathEnd other) {
        return records.circuits()
                .owned(Relation.PANEL_CIRCUITS, EndKey.owner(one.key()))
                .filter(circuit -> circuit.status() != CircuitStatus.RETIRED)
                .filter(circuit -> joins(circuit, one.key(), other.key()) || joins(circuit, other.key(), one.key()))
                .sorted(Comparator.comparing(Circuit::code))
                .toList();
    }

    private static boolean joins(Circuit circuit, long a, long z) {
        for (int index = 0; index < circuit.fibers(); index++) {
            if (front(circuit.a(), index) == a && front(circuit.z(), index) == z) {
                return true;
            }
        }
        return false;
    }

    private static long front(PortRange ports, int index) {
        return EndKey.of(LegKind.FRONT, ports.panel(), ports.ports().at(index));
    }

    /** What light meets that enters these ends in order: their pieces, and what joins each to the one before. */
    public List<Element> along(int... entered) {
        return sketcher.elements(entered);
    }

    /**
     * The paths of a circuit, one a fiber, from its a to its z. Where no path joins the two, it is the one from a as far
     * as it goes without a choice, not complete.
     */
    public List<Path> ofCircuit(Circuit circuit) {
        List<Path> paths = new ArrayList<>();
        for (int index = 0; index < circuit.fibers(); index++) {
            paths.add(ofFiber(circuit, index));
        }
        return paths;
    }

    private Path ofFiber(Circuit circuit, int index) {
        int a = network.endOf(front(circuit.a(), index));
        int z = network.endOf(front(circuit.z(), index));
        if (a == Network.NONE) {
            return nothing(circuit.a().panel(), circuit.a().ports().at(index), circuit);
        }
        Optional<Walk> joined = z == Network.NONE ? Optional.empty() : walker.find(a, z);
        Path path = path(a, joined.orElseGet(() -> walker.plain(a)), circuit);
        return new Path(
                path.ends(),
                path.elements(),
                joined.isPresent(),
                path.loop(),
                joined.isPresent() ? with(path.circuits(), circuit) : path.circuits(),
                circuit);
    }

    /** A retired circuit is on no path but the one that was asked for in its name. */
    private static List<Circuit> with(List<Circuit> circuits, Circuit asked) {
        return circuits.contains(asked)
                ? circuits
                : Stream.concat(circuits.stream(), Stream.of(asked))
                        .sorted(Comparator.comparing(Circuit::code))
                        .toList();
    }

    /**
     * The paths through each piece of a fiber from its cable's start on, a piece being the glass between two cuts; each
     * path once, run in the cable's direction. None where the cable is not in service.
     *
     * @param cable identity of the cable
     * @param fiber from 1 to the cable's fibers
     */
    public List<Path> ofFiber(int cable, int fiber) {
        return new FiberTrace(network, walker, cable, fiber)
                .routes().stream().map(this::path).toList();
    }

    private Path path(FiberTrace.Route route) {
        if (route.circle()) {
            List<Element> elements = new ArrayList<>(sketcher.elements(route.onward()));
            if (route.back().length > 0) {
                elements.addAll(sketcher.elements(route.back()));
            }
            if (route.closed()) {
                int[] all = concat(route.onward(), route.back());
                sketcher.addJoint(elements, all[all.length - 1], route.onward()[0]);
            }
            return circle(elements, null);
        }
        int[] entered = concat(route.back(), route.onward());
        return open(sketcher.end(route.first()), sketcher.end(route.last()), sketcher.elements(entered), null);
    }

    private static int[] concat(int[] first, int[] second) {
        int[] both = Arrays.copyOf(first, first.length + second.length);
        System.arraycopy(second, 0, both, first.length, second.length);
        return both;
    }
}
