package spanwright.exchange;

import java.util.Comparator;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.plant.RunRow;
import spanwright.records.Relation;

/** Finds rows of a cable's run. */
final class Runs {

    private static final int MOST_ROWS = 1_000_000;

    private Runs() {}

    /** The run row that two columns name; 0 where it is wrong or in doubt. */
    static int row(References refs, Row row, int cableColumn, int seqColumn) {
        int cable = refs.cables.find(row, cableColumn);
        Integer seq = row.whole(seqColumn, 0, MOST_ROWS);
        if (cable == 0 || seq == null) {
            return 0;
        }
        RunRow found = find(refs, cable, seq);
        if (found == null && !inDoubt(refs, cable)) {
            row.fault(
                    seqColumn,
                    row.named(seqColumn) + ": the run of " + row.text(cableColumn) + " has no such row; "
                            + rows(refs, cable));
        }
        return found == null ? 0 : found.id();
    }

    private static String rows(References refs, int cable) {
        int last = refs.view()
                .runRows()
                .owned(Relation.CABLE_RUN_ROWS, cable)
                .mapToInt(RunRow::seq)
                .max()
                .orElse(-1);
        return last < 0 ? "enter its run in cable_runs.csv" : "its rows are 0 to " + last;
    }

    /** A row of a cable's run, or null. */
    static @Nullable RunRow find(References refs, int cable, int seq) {
        int[] ids = refs.view().owned(Relation.CABLE_RUN_ROWS, cable);
        // Rows are mostly entered in their order, so the place is tried first.
        if (seq < ids.length && refs.view().runRows().get(ids[seq]).seq() == seq) {
            return refs.view().runRows().get(ids[seq]);
        }
        return refs.view()
                .runRows()
                .owned(Relation.CABLE_RUN_ROWS, cable)
                .filter(row -> row.seq() == seq)
                .findFirst()
                .orElse(null);
    }

    /** The rows of a cable's run at a structure, by seq. */
    static List<RunRow> at(References refs, int cable, int structure) {
        return refs.view()
                .runRows()
                .owned(Relation.CABLE_RUN_ROWS, cable)
                .filter(row -> row.structure() == structure)
                .sorted(Comparator.comparingInt(RunRow::seq))
                .toList();
    }

    /** Whether rows of a cable's run were refused. */
    static boolean inDoubt(References refs, int cable) {
        return refs.doubts()
                .cover(Table.CABLE_RUNS, refs.view().cables().get(cable).code());
    }
}
