package spanwright.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/** Circuits that share a front with no splitter between them: wavelengths on one fiber, or a slip. */
final class CircuitFrontRules implements Rule {

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        Map<Long, List<Circuit>> byFront = new TreeMap<>();
        checked.records()
                .circuits()
                .list()
                .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                .forEach(circuit -> {
                    enter(byFront, circuit, circuit.a());
                    enter(byFront, circuit, circuit.z());
                });
        byFront.forEach((front, circuits) -> {
            if (circuits.size() > 1 && !splits(checked.network(), front)) {
                found.accept(finding(checked, front, circuits));
            }
        });
    }

    private static void enter(Map<Long, List<Circuit>> byFront, Circuit circuit, PortRange ports) {
        for (int index = 0; index < ports.ports().count(); index++) {
            long key = EndKey.of(LegKind.FRONT, ports.panel(), ports.ports().at(index));
            byFront.computeIfAbsent(key, none -> new ArrayList<>()).add(circuit);
        }
    }

    /** Whether the glass path behind a front ends at a splitter. */
    private static boolean splits(Network network, long front) {
        int end = network.endOf(front);
        if (end == Network.NONE) {
            return false;
        }
        PathIndex paths = network.paths();
        int path = paths.pathOf(end >> 1);
        int other = paths.firstEnd(path) == end ? paths.lastEnd(path) : paths.firstEnd(path);
        return network.blockOf(other >> 1).kind() == BlockKind.SPLITTER;
    }

    private static Finding finding(Checked checked, long front, List<Circuit> circuits) {
        String port = JointText.port(checked.records(), EndKey.owner(front), Integer.toString(EndKey.number(front)));
        String codes = circuits.stream().map(Circuit::code).sorted().collect(Collectors.joining(", "));
        long wavelengths = circuits.stream()
                .flatMap(circuit -> circuit.wavelengths().stream())
                .distinct()
                .count();
        long all = circuits.stream()
                .mapToLong(circuit -> circuit.wavelengths().size())
                .sum();
        return new Finding(
                wavelengths == all ? Severity.NOTE : Severity.WARNING,
                "circuits-share-front",
                "circuits.csv",
                port,
                codes + " share the front of " + port + ", and no splitter stands between them.",
                wavelengths == all
                        ? "Nothing, where they are wavelengths on one fiber."
                        : "Give each its own port, or its own wavelength, or record the splitter.");
    }
}
