package spanwright.exchange;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.RunRow;
import spanwright.records.Refusal;
import spanwright.records.RunRules;

/**
 * Enters {@code cable_runs.csv}: the rows of a cable wherever they stand, then each run as a whole, together with
 * what the records file holds of it.
 */
final class RunLoad implements TableLoad {

    /** Identities are given in the order of the runs, when all rows are known. */
    private static final int NOT_YET = 1;

    /** A row read, and the line it stands on. */
    private record Read(RunRow row, int line) {}

    private final Entering entering;
    private final RunRowRows rows;
    private final Map<Integer, List<Read>> byCable = new LinkedHashMap<>();

    RunLoad(Entering entering, RunRowRows rows) {
        this.entering = entering;
        this.rows = rows;
    }

    @Override
    public void enter(Row row) {
        RunRow run = rows.read(row, NOT_YET);
        if (run == null) {
            entering.doubts().add(Table.CABLE_RUNS, rows.key(row));
        } else {
            byCable.computeIfAbsent(run.cable(), cable -> new ArrayList<>()).add(new Read(run, row.line()));
        }
    }

    @Override
    public void end() {
        byCable.forEach(this::enter);
        byCable.clear();
    }

    private void enter(int cable, List<Read> reads) {
        reads.sort(Comparator.comparingInt(read -> read.row.seq()));
        List<RunRow> run = new ArrayList<>(entering.view().runOf(cable));
        int first = entering.view().limit(RecordKind.RUN_ROW);
        for (int index = 0; index < reads.size(); index++) {
            RunRow row = withIdentity(reads.get(index).row, entering.newIdentity(RecordKind.RUN_ROW));
            entering.lines().note(row, reads.get(index).line);
            run.add(row);
        }
        run.sort(Comparator.comparingInt(RunRow::seq));
        List<Refusal> refusals = new ArrayList<>();
        List<RunRow> whole = RunRules.complete(entering.view(), run, refusals);
        boolean doubtful = Runs.inDoubt(entering.refs(), cable);
        if (!refusals.isEmpty()) {
            entering.doubts()
                    .add(Table.CABLE_RUNS, entering.view().cables().get(cable).code());
        }
        if (doubtful) {
            return;
        }
        refusals.forEach(refusal -> entering.refuse(refusal, lineOf(refusal, reads)));
        if (refusals.isEmpty()) {
            whole.stream()
                    .filter(row -> row.id() >= first)
                    .forEach(row -> entering.add(Table.CABLE_RUNS, reads.get(row.id() - first).line, row));
        }
    }

    private int lineOf(Refusal refusal, List<Read> reads) {
        Recorded record = refusal.record();
        int line = record == null ? 0 : entering.lines().of(record);
        return line == 0 ? reads.get(0).line : line;
    }

    private static RunRow withIdentity(RunRow row, int id) {
        return new RunRow(
                id,
                row.cable(),
                row.seq(),
                row.structure(),
                row.span(),
                row.slack(),
                row.slackTrust(),
                row.slackOn(),
                row.duct());
    }
}
