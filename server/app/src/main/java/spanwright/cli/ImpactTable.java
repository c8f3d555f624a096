package spanwright.cli;

import java.io.PrintWriter;
import java.util.Locale;
import spanwright.answers.View;
import spanwright.circuits.Circuit;
import spanwright.outage.HitCircuit;
import spanwright.outage.Impact;

/** What a cut takes down as a table for a person, 100 columns wide at most. */
final class ImpactTable {

    private static final int WIDTH = 100;
    private static final int AT = 38;
    private static final String ROW = "%8s  %-6s %9s  %-18s %-14s %s%n";

    private final PrintWriter out;
    private final View view;

    ImpactTable(PrintWriter out, View view) {
        this.out = out;
        this.view = view;
    }

    void print(Impact impact) {
        if (impact.circuits().isEmpty()) {
            out.println("No working circuit is hit.");
        } else {
            out.printf(Locale.ROOT, ROW, "priority", "state", "customers", "circuit", "service", "at");
            impact.circuits().forEach(this::row);
            out.println();
        }
        Output.wrapped(out, summary(impact), "", WIDTH);
        out.println("As of posting " + view.posting() + ". Treat every fiber as live until proven dark.");
    }

    private void row(HitCircuit hit) {
        Circuit circuit = hit.circuit();
        String service = circuit.service() == null ? "" : circuit.service();
        out.printf(
                Locale.ROOT,
                ROW,
                circuit.priority(),
                hit.single() ? "single" : "down",
                String.format(Locale.ROOT, "%,d", circuit.customersServed()),
                Output.cut(circuit.code(), 18),
                Output.cut(service, 14),
                Output.cut(String.join(", ", hit.at()), AT));
    }

    private static String summary(Impact impact) {
        long down = impact.circuits().stream().filter(HitCircuit::down).count();
        return String.format(
                Locale.ROOT,
                "%,d circuits down, %,d up without protection; %,d customers down; %,d fibers cut.",
                down,
                impact.circuits().size() - down,
                impact.customersDown(),
                impact.fibersCut());
    }
}
