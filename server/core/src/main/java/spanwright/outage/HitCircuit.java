package spanwright.outage;

import java.util.Comparator;
import java.util.List;
import spanwright.circuits.Circuit;

/**
 * A working circuit whose path a cut hits.
 *
 * @param circuit the circuit
 * @param single whether another of its protection group still works: up, but unprotected; else it is down
 * @param whole whether all its paths were whole before the cut
 * @param at where the cut meets its paths, in their order: {@code F-1:3} for glass, else the enclosure; each once
 */
public record HitCircuit(Circuit circuit, boolean single, boolean whole, List<String> at) {

    /** The order in which circuits are restored. */
    static final Comparator<HitCircuit> FIRST_RESTORED = Comparator.<HitCircuit>comparingInt(
                    hit -> hit.circuit.priority())
            .thenComparing(HitCircuit::single)
            .thenComparing(hit -> hit.circuit.customersServed(), Comparator.reverseOrder())
            .thenComparing(hit -> hit.circuit.code(), CodeOrder.BY_CODE_POINT);

    /** Keeps its own copy of the list. */
    public HitCircuit {
        at = List.copyOf(at);
    }

    /** Whether the service is dark. */
    public boolean down() {
        return !single;
    }
}
