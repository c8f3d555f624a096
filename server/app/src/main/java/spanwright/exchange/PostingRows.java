package spanwright.exchange;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.network.SnapshotEditor;
import spanwright.plant.RunRow;
import spanwright.records.Refusal;
import spanwright.records.RunRules;

/**
 * Enters changed rows of the records folder into an editor, one after another, by the same readers as a folder.
 *
 * <p>A row to change or remove is named by any columns that name it alone. The usual: a code alone (structures,
 * spans, cable_types, cables, enclosures, circuits), {@code name} (settings), {@code item} (planning_values),
 * {@code enclosure} with {@code splitter} or {@code panel}, {@code enclosure} with {@code cable} (and {@code seq} in
 * a ring), {@code cable} with {@code seq} (cable_runs; with {@code ink} for sheath_marks), {@code cable} with
 * {@code wavelength_nm} (cable_values), {@code fiber_type} with {@code wavelength_nm}, {@code code} with
 * {@code position}, {@code enclosure}, {@code splitter} and {@code output}; for joints {@code enclosure} with
 * {@code a} (splices) or {@code panel} and {@code ports} (terminations), {@code a} (jumpers), where a part of a
 * row's range may be named, and then only that part is changed or removed.
 */
public final class PostingRows {

    private final SnapshotEditor editor;
    private final List<RowFault> faults = new ArrayList<>();
    private final Map<Recorded, Integer> madeBy = new HashMap<>();
    private Formats formats;
    private int index;

    private PostingRows(SnapshotEditor editor) {
        this.editor = editor;
        this.formats = fresh();
    }

    /**
     * Enters changes. Where anything is wrong, the editor holds only part of them and must be thrown away.
     *
     * @return every fault, in order of the changes; nothing where all are entered
     */
    public static List<RowFault> enter(SnapshotEditor editor, List<RowChange> changes) {
        PostingRows rows = new PostingRows(editor);
        for (RowChange change : changes) {
            rows.enter(change);
            rows.index++;
        }
        if (rows.faults.isEmpty()) {
            rows.finish(changes.size() - 1);
        }
        return rows.faults;
    }

    private Formats fresh() {
        return new Formats(new References(editor.records(), new Doubts()));
    }

    SnapshotEditor editor() {
        return editor;
    }

    Formats formats() {
        return formats;
    }

    /** Notes a fault of the change that is being entered. */
    void fault(@Nullable String column, String text) {
        faults.add(new RowFault(index, column, text));
    }

    private void enter(RowChange change) {
        Optional<Table> table = Table.find(change.table());
        if (table.isEmpty()) {
            fault(
                    null,
                    "there is no table '" + Texts.shown(change.table()) + "'"
                            + Near.hint(change.table(), Table.words()));
            return;
        }
        boolean key = knows(table.get(), change.key());
        if (knows(table.get(), change.row()) && key) {
            enter(table.get(), change);
            if (change.action() != RowChange.Action.ADD) {
                // What was found may be renamed or gone.
                formats = fresh();
            }
        }
    }

    private boolean knows(Table table, Map<String, String> texts) {
        boolean all = true;
        for (Map.Entry<String, String> text : texts.entrySet()) {
            String column = text.getKey();
            if (!table.columns().contains(column)) {
                fault(
                        column,
                        "there is no column '" + Texts.shown(column) + "' in " + table.word() + "; there are "
                                + String.join(", ", table.columns()) + Near.hint(column, table.columns()));
                all = false;
            } else if (!Texts.canBeWritten(text.getValue())) {
                fault(column, column + " holds a character that no file can hold; take it out");
                all = false;
            }
        }
        return all;
    }

    private void enter(Table table, RowChange change) {
        switch (table) {
            case FIBER_TYPES, COLOR_CODES, SPLITTER_OUTPUTS -> new SharedRows(this, table).enter(change);
            case SPLICES, TERMINATIONS, JUMPERS -> {
                if (change.action() == RowChange.Action.ADD) {
                    add(table, change.row());
                } else {
                    new JointRanges(this, table).enter(change);
                }
            }
            default -> {
                switch (change.action()) {
                    case ADD -> add(table, change.row());
                    case CHANGE -> change(table, change);
                    case REMOVE -> remove(table, change.key());
                }
            }
        }
    }

    /** Adds a record that a row makes. */
    void add(Table table, Map<String, String> texts) {
        Rows<?> rows = formats.of(table);
        Recorded record = read(rows, texts, editor.records().limit(rows.kind()));
        if (record != null) {
            apply(Change.add(withSpan(record)));
        }
    }

    /** Reads a row; null where anything is wrong with it, which is then noted. */
    @Nullable
    Recorded read(Rows<?> rows, Map<String, String> texts, int id) {
        Row row = row(rows.table(), texts);
        int before = faults.size();
        row.askRequired();
        Recorded record = rows.read(row, id);
        return faults.size() > before ? null : record;
    }

    /** A row whose faults are those of the change that is being entered. */
    Row row(Table table, Map<String, String> texts) {
        Row row = new Row(table, (any, column, text) -> fault(column, text));
        row.take(index, texts);
        return row;
    }

    /** A run row whose span is blank gets the only one that there is. */
    private Recorded withSpan(Recorded record) {
        if (!(record instanceof RunRow row) || row.seq() == 0 || row.span() != null) {
            return record;
        }
        List<RunRow> pair = new ArrayList<>();
        RunRow before = Runs.find(formats.refs(), row.cable(), row.seq() - 1);
        if (before == null) {
            return record;
        }
        pair.add(before);
        pair.add(row);
        return RunRules.complete(editor.records(), pair, new ArrayList<>()).get(1);
    }

    private void change(Table table, RowChange change) {
        Rows<?> rows = formats.of(table);
        Recorded before = new RowFinder(this, table).find(change.key());
        if (before == null) {
            return;
        }
        Map<String, String> texts = texts(rows, before);
        texts.putAll(change.row());
        Recorded after = read(rows, texts, before.id());
        if (after != null) {
            apply(Change.replace(before, SharedRows.keepTaps(before, withSpan(after))));
        }
    }

    /** A record as the texts of its row. */
    static Map<String, String> texts(Rows<?> rows, Recorded record) {
        Cells cells = new Cells(rows.table());
        rows.writeRecord(record, cells);
        return cells.byColumn();
    }

    private void remove(Table table, Map<String, String> key) {
        Recorded before = new RowFinder(this, table).find(key);
        if (before != null) {
            apply(Change.remove(before));
        }
    }

    /** Applies a change, or notes what refuses it; false then. */
    boolean apply(Change change) {
        List<Refusal> refusals = editor.apply(change);
        refusals.forEach(refusal -> fault(refusal.column(), sentence(refusal)));
        Recorded after = change.after();
        if (refusals.isEmpty() && after != null) {
            madeBy.put(after, index);
        }
        return refusals.isEmpty();
    }

    private String sentence(Refusal refusal) {
        Recorded earlier = refusal.earlier();
        if (earlier == null) {
            return refusal.sentence();
        }
        Integer change = madeBy.get(earlier);
        return refusal.sentence() + " (it is "
                + (change == null ? "in the records already" : "made by change " + change + " of this posting") + ")";
    }

    private void finish(int last) {
        for (Refusal refusal : editor.finish()) {
            Recorded record = refusal.record();
            int change = record == null ? last : madeBy.getOrDefault(record, last);
            faults.add(new RowFault(change, refusal.column(), sentence(refusal)));
        }
        faults.sort(Comparator.comparingInt(RowFault::change));
    }
}
