package spanwright.temporary;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import spanwright.circuits.Circuit;
import spanwright.loss.Budget;
import spanwright.loss.ElementLoss;
import spanwright.loss.LossReckoner;
import spanwright.loss.Measurements;
import spanwright.loss.PathLoss;
import spanwright.loss.Reckoning;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.planning.SpareQuery;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.trace.ElementKind;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

/**
 * The most that a glass path of a group may lose, so that each circuit over it keeps its budget: the budget less the
 * margin less what the rest of the circuit's path loses as it is. One thread's.
 */
final class LineBounds {

    private final Network network;
    private final Snapshot snapshot;
    private final Tracer tracer;
    private final Loss margin;
    private final Measurements measurements;
    private final Map<Wavelength, LossReckoner> reckoners = new HashMap<>();

    LineBounds(Snapshot snapshot, Loss margin) {
        this.snapshot = snapshot;
        this.network = snapshot.network();
        this.tracer = new Tracer(snapshot);
        this.margin = margin;
        this.measurements = new Measurements(snapshot.records());
    }

    /** One bound a line of the group, in microdecibels; unbounded where no budget is known. */
    List<Long> of(DarkGroup group) {
        List<Long> bounds = new ArrayList<>();
        group.lines().forEach(line -> bounds.add(SpareQuery.UNBOUNDED));
        for (Circuit circuit : group.circuits()) {
            String written = circuit.budget();
            if (written != null) {
                Budget.find(written).ifPresent(budget -> bound(group, circuit, budget, bounds));
            }
        }
        return bounds;
    }

    private void bound(DarkGroup group, Circuit circuit, Budget budget, List<Long> bounds) {
        List<Path> paths = tracer.ofCircuit(circuit);
        for (int fiber = 0; fiber < paths.size(); fiber++) {
            List<DarkLine> lines = DarkLine.of(network, circuit, fiber);
            Reckoning reckoning = reckoners
                    .computeIfAbsent(
                            circuit.wavelengths().get(0), nm -> new LossReckoner(snapshot.records(), nm, measurements))
                    .reckon(paths.get(fiber));
            if (reckoning instanceof PathLoss loss && paths.get(fiber).complete()) {
                for (int leg = 0; leg < lines.size(); leg++) {
                    int line = group.lines().indexOf(lines.get(leg));
                    if (line >= 0) {
                        Loss left = budget.max()
                                .minus(margin)
                                .minus(loss.expected())
                                .plus(leg(loss, leg));
                        bounds.set(line, Math.min(bounds.get(line), left.microdecibels()));
                    }
                }
            }
        }
    }

    /** What is lost between two splitters of a path, or between one and the path's end. */
    private static Loss leg(PathLoss loss, int leg) {
        int crossed = 0;
        Loss sum = Loss.ZERO;
        for (ElementLoss element : loss.elements()) {
            if (element.element().kind() == ElementKind.SPLITTER) {
                crossed++;
            } else if (crossed == leg) {
                sum = sum.plus(element.expected());
            }
        }
        return sum;
    }
}
