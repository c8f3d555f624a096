package spanwright.exchange;

import java.time.LocalDate;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.RunRow;
import spanwright.plant.Trust;
import spanwright.quantity.Length;

/** Rows of {@code cable_runs.csv}; a span left blank is filled in when the whole run is known. */
final class RunRowRows extends Rows<RunRow> {

    private static final int CABLE = Table.CABLE_RUNS.column("cable");
    private static final int SEQ = Table.CABLE_RUNS.column("seq");
    private static final int STRUCTURE = Table.CABLE_RUNS.column("structure");
    private static final int SPAN = Table.CABLE_RUNS.column("span");
    private static final int SLACK = Table.CABLE_RUNS.column("slack_m");
    private static final int SLACK_TRUST = Table.CABLE_RUNS.column("slack_trust");
    private static final int SLACK_ON = Table.CABLE_RUNS.column("slack_on");
    private static final int DUCT = Table.CABLE_RUNS.column("duct");
    private static final int MOST_ROWS = 1_000_000;

    RunRowRows(References refs) {
        super(Table.CABLE_RUNS, RecordKind.RUN_ROW, refs);
    }

    @Override
    @Nullable
    RunRow read(Row row, int id) {
        int cable = refs.cables.find(row, CABLE);
        Integer seq = row.whole(SEQ, 0, MOST_ROWS);
        int structure = refs.structures.find(row, STRUCTURE);
        int span = refs.spans.find(row, SPAN);
        Length slack = row.metres(SLACK, Row.Bound.FROM_ZERO);
        Trust slackTrust = row.word(SLACK_TRUST, Trust.values(), Trust::word);
        LocalDate slackOn = row.date(SLACK_ON, refs.zone());
        String duct = row.free(DUCT);
        if (cable == 0 || seq == null || structure == 0 || (span == 0 && !row.blank(SPAN))) {
            return null;
        }
        return new RunRow(
                id,
                cable,
                seq,
                structure,
                span == 0 ? null : Integer.valueOf(span),
                Objects.requireNonNullElse(slack, Length.ZERO),
                Objects.requireNonNullElse(slackTrust, Trust.POSTED),
                slackOn,
                duct);
    }

    @Override
    void write(RunRow run, Cells cells) {
        cells.put(CABLE, refs.cable(run.cable()));
        cells.put(SEQ, run.seq());
        cells.put(STRUCTURE, refs.structure(run.structure()));
        Integer span = run.span();
        cells.put(SPAN, span == null ? null : refs.span(span));
        cells.put(SLACK, run.slack());
        cells.put(SLACK_TRUST, run.slackTrust().word());
        cells.put(SLACK_ON, run.slackOn());
        cells.put(DUCT, run.duct());
    }

    /** A run with a row in doubt is in doubt as a whole, so the key is the cable. */
    @Override
    String key(Row row) {
        return row.text(CABLE);
    }
}
