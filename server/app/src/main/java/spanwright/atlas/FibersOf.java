package spanwright.atlas;

import java.util.stream.IntStream;
import spanwright.plant.Cable;
import spanwright.plant.PlantState;
import spanwright.records.Records;
import spanwright.records.Relation;

/** Counts fibers by place. */
public final class FibersOf {

    private FibersOf() {}

    /** Fibers of the in-service cables that lie on a span. */
    public static int span(Records records, int span) {
        return cables(records, Relation.SPAN_RUN_ROWS, span)
                .mapToObj(records.cables()::get)
                .mapToInt(cable -> fibers(records, cable))
                .sum();
    }

    /** Fibers of the in-service cables that visit a structure, each cable once. */
    public static int structure(Records records, int structure) {
        return cables(records, Relation.STRUCTURE_RUN_ROWS, structure)
                .distinct()
                .mapToObj(records.cables()::get)
                .mapToInt(cable -> fibers(records, cable))
                .sum();
    }

    private static IntStream cables(Records records, Relation relation, int owner) {
        return IntStream.of(records.owned(relation, owner))
                .map(row -> records.runRows().get(row).cable());
    }

    private static int fibers(Records records, Cable cable) {
        return cable.state() == PlantState.IN_SERVICE
                ? records.cableTypes().get(cable.cableType()).fibers()
                : 0;
    }
}
