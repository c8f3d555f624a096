package spanwright.temporary;

import java.util.List;
import spanwright.circuits.Circuit;

/**
 * Circuits that come back together: those that share the glass paths that are hit, such as the subscribers of one
 * splitter.
 *
 * @param circuits by priority, then more customers first, then code
 * @param lines the glass paths that are hit, in the order of the first circuit's fibers
 */
public record DarkGroup(List<Circuit> circuits, List<DarkLine> lines) {

    /** Keeps its own copies; refuses a group of nobody. */
    public DarkGroup {
        circuits = List.copyOf(circuits);
        lines = List.copyOf(lines);
        if (circuits.isEmpty()) {
            throw new IllegalArgumentException("nobody is dark");
        }
    }

    /** The best priority of its circuits. */
    public int priority() {
        return circuits.get(0).priority();
    }

    /** The customers on all of its circuits. */
    public int customers() {
        return circuits.stream().mapToInt(Circuit::customersServed).sum();
    }

    /** How many fibers each path of it takes. */
    public int fibers() {
        return lines.size();
    }
}
