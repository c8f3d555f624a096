package spanwright.network;

import java.util.LinkedHashSet;
import java.util.Set;
import java.util.function.ToLongFunction;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** Notes which cables, panels and splitters need fresh blocks after changes. One thread's. */
final class DirtyPlant {

    final Set<Integer> cables = new LinkedHashSet<>();
    final Set<Integer> panels = new LinkedHashSet<>();
    final Set<Integer> splitters = new LinkedHashSet<>();
    /** Cables that get fresh blocks even where their cuts stay, since joints in an enclosure come or go. */
    final Set<Integer> wholly = new LinkedHashSet<>();
    /** Run rows where no more than the opened fibers changed. */
    final Set<Integer> rows = new LinkedHashSet<>();

    private final RecordsView records;

    DirtyPlant(RecordsView records) {
        this.records = records;
    }

    boolean isEmpty() {
        return cables.isEmpty() && panels.isEmpty() && splitters.isEmpty() && rows.isEmpty();
    }

    void clear() {
        cables.clear();
        panels.clear();
        splitters.clear();
        wholly.clear();
        rows.clear();
    }

    /** Notes a change that has been applied to the records. */
    void note(Change change) {
        switch (change.kind()) {
            case CABLE_TYPE -> noteCableType(change);
            case CABLE -> noteCable(change);
            case RUN_ROW -> noteRunRow(change);
            case ENCLOSURE -> noteEnclosure(change);
            case PASS -> notePass(change);
            case PANEL -> notePanel(change);
            case SPLITTER -> noteSplitter(change);
            default -> {
                // No piece of glass comes or goes with the other kinds.
            }
        }
    }

    private void noteCableType(Change change) {
        if (!same(change, record -> (long) ((CableType) record).fibers())) {
            for (int cable : records.owned(Relation.CABLE_TYPE_CABLES, change.id())) {
                cables.add(cable);
            }
        }
    }

    private void noteCable(Change change) {
        if (!same(change, record -> InService.is((Cable) record) ? ((Cable) record).cableType() : 0L)) {
            cables.add(change.id());
        }
    }

    private void noteRunRow(Change change) {
        if (!same(change, record -> pair(((RunRow) record).cable(), ((RunRow) record).seq()))) {
            noteCableOf((RunRow) change.before());
            noteCableOf((RunRow) change.after());
        }
    }

    private void noteCableOf(@Nullable RunRow row) {
        if (row != null) {
            cables.add(row.cable());
        }
    }

    private void noteEnclosure(Change change) {
        if (inService(change.before()) == inService(change.after())) {
            return;
        }
        records.passes().owned(Relation.ENCLOSURE_PASSES, change.id()).forEach(pass -> noteWholly(pass.cable()));
        for (int panel : records.owned(Relation.ENCLOSURE_PANELS, change.id())) {
            panels.add(panel);
        }
        for (int splitter : records.owned(Relation.ENCLOSURE_SPLITTERS, change.id())) {
            splitters.add(splitter);
        }
    }

    private static boolean inService(@Nullable Recorded enclosure) {
        return enclosure != null && InService.is((Enclosure) enclosure);
    }

    private void noteWholly(int cable) {
        cables.add(cable);
        wholly.add(cable);
    }

    private void notePass(Change change) {
        Pass before = (Pass) change.before();
        Pass after = (Pass) change.after();
        if (before != null
                && after != null
                && before.enclosure() == after.enclosure()
                && before.cable() == after.cable()
                && before.runRow() == after.runRow()) {
            if (!before.opened().equals(after.opened())) {
                rows.add(after.runRow());
            }
            return;
        }
        if (before != null) {
            cables.add(before.cable());
        }
        if (after != null) {
            cables.add(after.cable());
        }
    }

    private void notePanel(Change change) {
        if (!same(change, record -> pair(((Panel) record).enclosure(), ((Panel) record).ports()))) {
            panels.add(change.id());
        }
    }

    private void noteSplitter(Change change) {
        if (!same(change, record -> shapeOf((Splitter) record))) {
            splitters.add(change.id());
        }
    }

    private static long shapeOf(Splitter splitter) {
        return pair(splitter.enclosure(), splitter.inputs() * 1000 + splitter.outputs());
    }

    private static long pair(int high, int low) {
        return (long) high << Integer.SIZE | low;
    }

    private static boolean same(Change change, ToLongFunction<Recorded> of) {
        Recorded before = change.before();
        Recorded after = change.after();
        return before != null && after != null && of.applyAsLong(before) == of.applyAsLong(after);
    }
}
