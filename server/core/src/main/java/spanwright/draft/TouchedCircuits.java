package spanwright.draft;

import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.loss.LossReckoner;
import spanwright.loss.Measurements;
import spanwright.loss.PathLoss;
import spanwright.loss.Reckoning;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.planning.PathCircuits;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

/** The circuits on glass that changes touch, in the order to restore, with what they lose before and after. */
final class TouchedCircuits {

    private static final Comparator<Circuit> FIRST_RESTORED =
            Comparator.comparingInt(Circuit::priority).thenComparing(Circuit::code);

    private TouchedCircuits() {}

    /** All of them, the first to restore first. */
    static List<Circuit> list(Snapshot before, Snapshot after, List<Change> changes) {
        Set<Circuit> touched = new TreeSet<>(FIRST_RESTORED);
        Set<Long> keys = new HashSet<>();
        changes.forEach(change -> Stream.of(change.before(), change.after()).forEach(side -> gather(side, keys)));
        for (Snapshot state : List.of(before, after)) {
            PathCircuits circuits = new PathCircuits(state);
            for (long key : keys) {
                int end = state.network().endOf(key);
                if (end != Network.NONE) {
                    touched.addAll(circuits.through(end >> 1));
                }
            }
        }
        return List.copyOf(touched);
    }

    private static void gather(@Nullable Recorded side, Set<Long> keys) {
        if (side instanceof Joint joint && !joint.planned()) {
            for (EndRange ends : List.of(joint.a(), joint.b())) {
                for (int index = 0; index < ends.count(); index++) {
                    keys.add(ends.key(index));
                }
            }
        }
    }

    /** Each with its loss before and after. */
    static List<TouchedCircuit> reckon(Snapshot before, Snapshot after, List<Circuit> circuits) {
        State was = new State(before);
        State is = new State(after);
        return circuits.stream()
                .map(circuit -> {
                    Wavelength wavelength = circuit.wavelengths().get(0);
                    List<Path> old = was.tracer.ofCircuit(circuit);
                    List<Path> fresh = is.tracer.ofCircuit(circuit);
                    return new TouchedCircuit(
                            circuit,
                            wavelength,
                            old.stream().allMatch(Path::complete),
                            fresh.stream().allMatch(Path::complete),
                            was.loss(old, wavelength),
                            is.loss(fresh, wavelength));
                })
                .toList();
    }

    /** What is asked of one state again and again. */
    private static final class State {

        private final Snapshot snapshot;
        private final Tracer tracer;
        private final Measurements measurements;
        private final Map<Wavelength, LossReckoner> reckoners = new HashMap<>();

        State(Snapshot snapshot) {
            this.snapshot = snapshot;
            this.tracer = new Tracer(snapshot);
            this.measurements = new Measurements(snapshot.records());
        }

        /** The greatest loss of whole paths; null where one is not whole or not known. */
        @Nullable
        Loss loss(List<Path> paths, Wavelength wavelength) {
            Loss most = null;
            for (Path path : paths) {
                Reckoning reckoning = reckoners
                        .computeIfAbsent(
                                wavelength, any -> new LossReckoner(snapshot.records(), wavelength, measurements))
                        .reckon(path);
                if (!path.complete() || !(reckoning instanceof PathLoss loss)) {
                    return null;
                }
                most = most == null || loss.expected().compareTo(most) > 0 ? loss.expected() : most;
            }
            return most;
        }
    }
}
