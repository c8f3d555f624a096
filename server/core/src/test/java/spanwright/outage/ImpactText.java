package spanwright.outage;

import java.util.stream.Collectors;

/** An impact as lines of text. */
final class ImpactText {

    private ImpactText() {}

    /** {@code C-1 down 3 1 F-1:3 E2}: circuit, state, priority, customers, where; then what is cut in all. */
    static String of(Impact impact) {
        return impact.circuits().stream()
                        .map(hit -> hit.circuit().code() + (hit.single() ? " single " : " down ")
                                + hit.circuit().priority() + " " + hit.circuit().customersServed() + " "
                                + String.join(" ", hit.at()) + "\n")
                        .collect(Collectors.joining())
                + impact.fibersCut() + " fibers, " + impact.customersDown() + " customers\n";
    }
}
