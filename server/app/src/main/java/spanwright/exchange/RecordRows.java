package spanwright.exchange;

import java.io.IOException;
import java.util.TreeMap;
import java.util.function.Predicate;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.ColorCode;
import spanwright.plant.FiberType;
import spanwright.plant.FiberValues;
import spanwright.plant.RunRow;
import spanwright.records.RecordsView;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.Splitter;

/** The rows of each table that records make, in the order in which they were entered. */
final class RecordRows {

    /** Takes rows one after another. */
    interface Taker {
        /** A row as cells by column; the array is used again for the next row. */
        void take(String[] cells) throws IOException;
    }

    private final RecordsView view;
    private final Formats formats;

    RecordRows(RecordsView view) {
        this.view = view;
        this.formats = new Formats(new References(view, new Doubts()));
    }

    /** Gives every row of a table. */
    void each(Table table, Taker taker) throws IOException {
        switch (table) {
            case FIBER_TYPES -> eachFiberType(taker);
            case COLOR_CODES -> eachColor(taker);
            case CABLE_RUNS -> eachRunRow(taker);
            case SPLITTER_OUTPUTS -> eachTap(taker);
            case SPLICES -> each(formats.of(table), ofType(JointKind.SPLICE), taker);
            case TERMINATIONS -> each(formats.of(table), ofType(JointKind.TERMINATION), taker);
            case JUMPERS -> each(formats.of(table), ofType(JointKind.JUMPER), taker);
            default -> each(formats.of(table), any -> true, taker);
        }
    }

    private static Predicate<Recorded> ofType(JointKind type) {
        return record -> ((Joint) record).type() == type;
    }

    private void each(Rows<?> rows, Predicate<Recorded> which, Taker taker) throws IOException {
        Cells cells = new Cells(rows.table());
        RecordKind kind = rows.kind();
        for (int id = 1; id < view.limit(kind); id++) {
            Recorded record = view.record(kind, id);
            if (record != null && which.test(record)) {
                rows.writeRecord(record, cells);
                taker.take(cells.texts());
            }
        }
    }

    private void eachFiberType(Taker taker) throws IOException {
        Cells cells = new Cells(Table.FIBER_TYPES);
        for (FiberType type : view.fiberTypes().list().toList()) {
            for (FiberValues values : type.values()) {
                FiberTypeRows.write(type, values, cells);
                taker.take(cells.texts());
            }
        }
    }

    private void eachColor(Taker taker) throws IOException {
        Cells cells = new Cells(Table.COLOR_CODES);
        for (ColorCode code : view.colorCodes().list().toList()) {
            for (int index = 0; index < code.colors().size(); index++) {
                ColorCodeLoad.write(code, index, cells);
                taker.take(cells.texts());
            }
        }
    }

    private void eachRunRow(Taker taker) throws IOException {
        RunRowRows rows = formats.runRows();
        Cells cells = new Cells(Table.CABLE_RUNS);
        for (int cable = 1; cable < view.limit(RecordKind.CABLE); cable++) {
            for (RunRow row : view.runOf(cable)) {
                rows.write(row, cells);
                taker.take(cells.texts());
            }
        }
    }

    private void eachTap(Taker taker) throws IOException {
        Cells cells = new Cells(Table.SPLITTER_OUTPUTS);
        for (Splitter splitter : view.splitters().list().toList()) {
            for (int output : new TreeMap<>(splitter.outputLosses()).keySet()) {
                TapLoad.write(formats.refs(), splitter, output, cells);
                taker.take(cells.texts());
            }
        }
    }
}
