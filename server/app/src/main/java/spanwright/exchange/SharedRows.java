package spanwright.exchange;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.ColorCode;
import spanwright.plant.FiberType;
import spanwright.plant.FiberValues;
import spanwright.quantity.Loss;
import spanwright.splicing.Splitter;

/**
 * Changes rows of which several make one record: those of a fiber type, of a colour order, the taps of a splitter.
 * The record is taken apart into its rows, they are changed, and it is made anew.
 */
final class SharedRows {

    /** Columns of a fiber type that are alike on all its rows, so that changing one changes all. */
    private static final Set<String> ALIKE = Set.of("zero_dispersion_nm", "dispersion_slope", "pmd_ps_per_sqrt_km");

    private final PostingRows posting;
    private final Table table;
    /** The columns that name the record, and the one that names the row within it. */
    private final List<String> owner;

    private final String within;

    SharedRows(PostingRows posting, Table table) {
        this.posting = posting;
        this.table = table;
        this.owner = table == Table.SPLITTER_OUTPUTS
                ? table.columns().subList(0, 2)
                : table.columns().subList(0, 1);
        this.within = table.columns().get(owner.size());
    }

    void enter(RowChange change) {
        Map<String, String> named = change.action() == RowChange.Action.ADD ? change.row() : change.key();
        for (String column : owner) {
            if (named.getOrDefault(column, "").isEmpty()) {
                posting.fault(column, column + " is blank; it is required to name the row");
                return;
            }
        }
        Recorded before = find(named);
        if (before == null && (change.action() != RowChange.Action.ADD || table == Table.SPLITTER_OUTPUTS)) {
            posting.fault(
                    owner.get(owner.size() - 1),
                    "there is no such row in " + table.word() + "; name one that the" + " records hold");
            return;
        }
        List<Map<String, String>> rows = before == null ? new ArrayList<>() : rows(before);
        if (change(rows, change)) {
            finish(before, rows);
        }
    }

    private boolean change(List<Map<String, String>> rows, RowChange change) {
        if (change.action() == RowChange.Action.ADD) {
            rows.add(change.row());
            return true;
        }
        String asked = change.key().get(within);
        boolean any = false;
        for (Iterator<Map<String, String>> all = rows.iterator(); all.hasNext(); ) {
            Map<String, String> row = all.next();
            if (asked != null && !asked.equals(row.get(within))) {
                continue;
            }
            any = true;
            if (change.action() == RowChange.Action.REMOVE) {
                all.remove();
            } else {
                row.putAll(change.row());
            }
        }
        if (!any) {
            posting.fault(
                    within,
                    "there is no row with " + within + " '" + Texts.shown(String.valueOf(asked)) + "' in "
                            + table.word() + "; name one that the records hold");
        }
        change.row().forEach((column, text) -> {
            if (ALIKE.contains(column)) {
                rows.forEach(row -> row.put(column, text));
            }
        });
        return any;
    }

    private @Nullable Recorded find(Map<String, String> named) {
        var view = posting.editor().records();
        String first = named.getOrDefault(owner.get(0), "");
        return switch (table) {
            case FIBER_TYPES -> view.fiberTypes().find(first).orElse(null);
            case COLOR_CODES -> view.colorCodes().find(first).orElse(null);
            default ->
                view.enclosures()
                        .find(first)
                        .flatMap(enclosure -> view.findSplitter(enclosure.id(), named.getOrDefault(owner.get(1), "")))
                        .orElse(null);
        };
    }

    private List<Map<String, String>> rows(Recorded record) {
        List<Map<String, String>> rows = new ArrayList<>();
        Cells cells = new Cells(table);
        if (record instanceof FiberType type) {
            for (FiberValues values : type.values()) {
                FiberTypeRows.write(type, values, cells);
                rows.add(cells.byColumn());
            }
        } else if (record instanceof ColorCode code) {
            for (int index = 0; index < code.colors().size(); index++) {
                ColorCodeLoad.write(code, index, cells);
                rows.add(cells.byColumn());
            }
        } else if (record instanceof Splitter splitter) {
            for (int output : new TreeMap<>(splitter.outputLosses()).keySet()) {
                TapLoad.write(posting.formats().refs(), splitter, output, cells);
                rows.add(cells.byColumn());
            }
        }
        return rows;
    }

    private void finish(@Nullable Recorded before, List<Map<String, String>> rows) {
        if (rows.isEmpty() && before != null && !(before instanceof Splitter)) {
            posting.apply(Change.remove(before));
            return;
        }
        Recorded after = make(before, rows);
        if (after != null) {
            posting.apply(before == null ? Change.add(after) : Change.replace(before, after));
        }
    }

    private @Nullable Recorded make(@Nullable Recorded before, List<Map<String, String>> rows) {
        var view = posting.editor().records();
        return switch (table) {
            case FIBER_TYPES -> fiberType(before == null ? view.limit(RecordKind.FIBER_TYPE) : before.id(), rows);
            case COLOR_CODES -> colorCode(before == null ? view.limit(RecordKind.COLOR_CODE) : before.id(), rows);
            default -> taps((Splitter) Objects.requireNonNull(before), rows);
        };
    }

    private @Nullable Recorded fiberType(int id, List<Map<String, String>> rows) {
        FiberTypeRows.Gathered gathered = new FiberTypeRows.Gathered();
        String code = null;
        boolean faulty = false;
        for (Map<String, String> texts : rows) {
            Row row = posting.row(table, texts);
            row.askRequired();
            code = row.code(FiberTypeRows.TYPE);
            gathered.take(row);
            faulty |= row.faulty();
        }
        return faulty || code == null ? null : gathered.type(id, code);
    }

    private @Nullable Recorded colorCode(int id, List<Map<String, String>> rows) {
        Map<Integer, String> colors = new TreeMap<>();
        String code = null;
        for (Map<String, String> texts : rows) {
            Row row = posting.row(table, texts);
            row.askRequired();
            code = row.code(ColorCodeLoad.CODE);
            Integer position = row.whole(ColorCodeLoad.POSITION, 1, ColorCodeLoad.MOST_POSITIONS);
            String color = row.free(ColorCodeLoad.COLOR);
            if (code == null || position == null || color == null) {
                return null;
            }
            if (colors.putIfAbsent(position, color) != null) {
                row.fault(
                        ColorCodeLoad.POSITION,
                        row.named(ColorCodeLoad.POSITION) + " stands twice in code " + code
                                + "; write one row a position");
                return null;
            }
        }
        if (code == null || !gapless(colors)) {
            posting.fault(within, "positions of a colour order are 1, 2, 3 ... without gaps");
            return null;
        }
        return new ColorCode(id, code, List.copyOf(colors.values()));
    }

    private static boolean gapless(Map<Integer, String> colors) {
        int expected = 1;
        for (int position : colors.keySet()) {
            if (position != expected++) {
                return false;
            }
        }
        return true;
    }

    private @Nullable Recorded taps(Splitter splitter, List<Map<String, String>> rows) {
        Map<Integer, Loss> losses = new HashMap<>();
        for (Map<String, String> texts : rows) {
            Row row = posting.row(table, texts);
            row.askRequired();
            Integer output = row.whole(TapLoad.OUTPUT, 1, splitter.outputs());
            Loss loss = row.decibels(TapLoad.LOSS, Row.Bound.FROM_ZERO);
            if (output == null || loss == null) {
                return null;
            }
            if (losses.putIfAbsent(output, loss) != null) {
                row.fault(
                        TapLoad.OUTPUT,
                        row.named(TapLoad.OUTPUT) + " of splitter " + splitter.code()
                                + " stands twice; write one row an output");
                return null;
            }
        }
        return TapLoad.withTaps(splitter, losses);
    }

    /** A splitter that its own row changes keeps its taps, which are rows of another table. */
    static Recorded keepTaps(Recorded before, Recorded after) {
        return before instanceof Splitter old && after instanceof Splitter changed
                ? TapLoad.withTaps(changed, new LinkedHashMap<>(old.outputLosses()))
                : after;
    }
}
