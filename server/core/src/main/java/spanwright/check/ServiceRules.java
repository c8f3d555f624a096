package spanwright.check;

import java.util.function.Consumer;
import spanwright.plant.Cable;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;

/** Plant in service that hangs on plant which is not. */
final class ServiceRules implements Rule {

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        checked.records()
                .cables()
                .list()
                .filter(cable -> cable.state() == PlantState.IN_SERVICE)
                .forEach(cable -> checked.records().runOf(cable.id()).forEach(row -> row(checked, cable, row, found)));
    }

    private static void row(Checked checked, Cable cable, RunRow row, Consumer<Finding> found) {
        Structure structure = checked.records().structures().get(row.structure());
        tell(cable, "structure " + structure.code(), structure.state(), found);
        if (row.span() != null) {
            Span span = checked.records().spans().get(row.span());
            tell(cable, "span " + span.code(), span.state(), found);
        }
    }

    private static void tell(Cable cable, String what, PlantState state, Consumer<Finding> found) {
        if (state != PlantState.IN_SERVICE) {
            found.accept(new Finding(
                    Severity.ERROR,
                    "cable-on-plant-not-in-service",
                    "cable_runs.csv",
                    cable.code(),
                    cable.code() + " is in service, but its run goes by " + what + ", which is " + state.word() + ".",
                    "Put one of the two in the state that it is in."));
        }
    }
}
