package spanwright.exchange;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.network.SnapshotEditor;
import spanwright.plant.FiberRange;
import spanwright.records.RecordsView;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;

/**
 * Changes or removes joints by naming their ends, whole rows or parts of their ranges. Joints do not change: those
 * touched are removed, and what is left of them or has become of them is added.
 */
final class JointRanges {

    /** Columns that name ends: with one of these a change is of one row alone. */
    private static final Set<String> ENDS = Set.of("enclosure", "a", "b", "panel", "ports", "end");

    private final PostingRows posting;
    private final Table table;
    private final SnapshotEditor editor;
    private final RecordsView view;
    private final Rows<?> rows;

    JointRanges(PostingRows posting, Table table) {
        this.posting = posting;
        this.table = table;
        this.editor = posting.editor();
        this.view = editor.records();
        this.rows = posting.formats().of(table);
    }

    void enter(RowChange change) {
        EndRange named = named(change.key());
        if (named == null) {
            return;
        }
        Map<Integer, BitSet> selected = select(named, change.key());
        if (selected == null || !asAsked(selected, change.key())) {
            return;
        }
        boolean ends = change.row().keySet().stream().anyMatch(ENDS::contains);
        if (ends && selected.size() > 1) {
            posting.fault(null, "the key names ends of " + selected.size() + " rows; change the ends of one at a time");
            return;
        }
        selected.forEach((id, indexes) -> replace(view.joints().get(id), indexes, change));
    }

    /** The ends that the key names: those of column a, or the rears of the ports, or else those of column end or b. */
    private @Nullable EndRange named(Map<String, String> key) {
        Row row = posting.row(table, key);
        return switch (table) {
            case JUMPERS -> fronts(row, key.containsKey("a") ? "a" : "b");
            case SPLICES -> glass(row, key.containsKey("a") ? "a" : "b");
            default -> key.containsKey("ports") ? rears(row) : glass(row, "end");
        };
    }

    private @Nullable EndRange fronts(Row row, String name) {
        int column = table.column(name);
        if (row.blank(column)) {
            return needed(name);
        }
        Ports.Found found = posting.formats().ports().find(row, column);
        return found == null
                ? null
                : new EndRange(new Leg(LegKind.FRONT, found.panel().id()), found.numbers());
    }

    private @Nullable EndRange glass(Row row, String name) {
        int column = table.column(name);
        int enclosure = enclosure(row);
        if (row.blank(column)) {
            return needed(name);
        }
        return enclosure == 0 ? null : posting.formats().ends().find(row, column, enclosure);
    }

    private @Nullable EndRange rears(Row row) {
        int enclosure = enclosure(row);
        int panelColumn = table.column("panel");
        if (row.blank(panelColumn)) {
            return needed("panel");
        }
        Panel panel = enclosure == 0
                ? null
                : posting.formats()
                        .ports()
                        .panel(row, panelColumn, enclosure, row.from(panelColumn), row.to(panelColumn));
        if (panel == null) {
            return null;
        }
        FiberRange ports = row.range(table.column("ports"), panel.ports(), "ports of panel " + panel.code());
        return ports == null ? needed("ports") : new EndRange(new Leg(LegKind.REAR, panel.id()), ports);
    }

    private int enclosure(Row row) {
        int column = table.column("enclosure");
        if (row.blank(column)) {
            needed("enclosure");
        }
        return posting.formats().refs().enclosures.find(row, column);
    }

    private @Nullable EndRange needed(String column) {
        posting.fault(column, column + " is blank; the key needs it to name the joints");
        return null;
    }

    /** The indexes of the named ends within each joint that they are in; null where one is in none, which is noted. */
    private @Nullable Map<Integer, BitSet> select(EndRange named, Map<String, String> key) {
        Map<Integer, BitSet> selected = new LinkedHashMap<>();
        for (int index = 0; index < named.count(); index++) {
            int number = named.numbers().at(index);
            int id = joint(named.leg(), number, key);
            if (id == 0) {
                posting.fault(
                        null,
                        "there is no such row in " + table.word() + ": " + number + " of the ends named is"
                                + " not joined; name ends that are");
                return null;
            }
            Joint joint = view.joints().get(id);
            Table held = Lines.tableOf(joint);
            if (table != held) {
                posting.fault(
                        null,
                        "there is no such row in " + table.word() + ": the end is in a row of " + held.word()
                                + "; change it there");
                return null;
            }
            BitSet indexes = selected.computeIfAbsent(id, any -> new BitSet());
            note(indexes, joint.a(), named.leg(), number);
            note(indexes, joint.b(), named.leg(), number);
        }
        return selected;
    }

    private static void note(BitSet indexes, EndRange side, Leg leg, int number) {
        if (side.leg().equals(leg) && side.numbers().contains(number)) {
            indexes.set(Math.abs(number - side.numbers().first()));
        }
    }

    /** The joint of an end: that planned within the job that the key names, else that in the glass, else the only plan. */
    private int joint(Leg leg, int number, Map<String, String> key) {
        boolean planned = "planned".equals(key.get("trust"));
        String job = key.getOrDefault("job", "");
        if (planned && (!job.isEmpty() || key.containsKey("job"))) {
            return editor.findPlanned(job.isEmpty() ? "planned" : job, leg, number);
        }
        int joint = planned ? 0 : editor.findJoint(leg, number);
        for (String each : joint == 0 ? view.plannedJobs() : List.<String>of()) {
            int found = editor.findPlanned(each, leg, number);
            if (found != 0 && joint != 0) {
                return 0;
            }
            joint = Math.max(joint, found);
        }
        return joint;
    }

    /** Whether what else the key says is so of every part selected; noted where not. */
    private boolean asAsked(Map<Integer, BitSet> selected, Map<String, String> key) {
        Map<String, String> rest = new LinkedHashMap<>(key);
        List<String> ends = List.of("a", "b", "ports", "end", "panel");
        for (Map.Entry<Integer, BitSet> each : selected.entrySet()) {
            Map<String, String> texts = PostingRows.texts(rows, view.joints().get(each.getKey()));
            for (Map.Entry<String, String> asked : rest.entrySet()) {
                boolean compared =
                        !ends.contains(asked.getKey()) && !asked.getKey().equals("job");
                if (compared && !texts.getOrDefault(asked.getKey(), "").equals(asked.getValue())) {
                    posting.fault(
                            asked.getKey(),
                            asked.getKey() + " '" + Texts.shown(asked.getValue())
                                    + "' is not so of that row; it is '"
                                    + Texts.shown(texts.getOrDefault(asked.getKey(), "")) + "'");
                    return false;
                }
            }
        }
        return partnersAsAsked(selected, key);
    }

    /** Where the key names both sides, they are joined to each other. */
    private boolean partnersAsAsked(Map<Integer, BitSet> selected, Map<String, String> key) {
        boolean both =
                (key.containsKey("a") && key.containsKey("b")) || (key.containsKey("ports") && key.containsKey("end"));
        if (!both) {
            return true;
        }
        Row row = posting.row(table, key);
        String column = table == Table.TERMINATIONS ? "end" : "b";
        EndRange other = table == Table.JUMPERS ? fronts(row, column) : glass(row, column);
        EndRange named = named(key);
        if (other == null || named == null) {
            return false;
        }
        boolean right = other.count() == named.count();
        for (int index = 0; right && index < named.count(); index++) {
            right = joined(selected.keySet(), named.key(index), other.key(index));
        }
        if (!right) {
            posting.fault(
                    column, "the ends of both sides of the key are not joined to each other; name one side alone");
        }
        return right;
    }

    private boolean joined(Set<Integer> joints, long one, long other) {
        for (int id : joints) {
            Joint joint = view.joints().get(id);
            for (int index = 0; index < joint.count(); index++) {
                long a = joint.a().key(index);
                long b = joint.b().key(index);
                if ((a == one && b == other) || (a == other && b == one)) {
                    return true;
                }
            }
        }
        return false;
    }

    private void replace(Joint joint, BitSet indexes, RowChange change) {
        List<Joint> kept = new ArrayList<>();
        List<Joint> changed = new ArrayList<>();
        for (int from = 0; from < joint.count(); ) {
            boolean in = indexes.get(from);
            int to = in ? indexes.nextClearBit(from) : indexes.nextSetBit(from);
            int end = to < 0 || to > joint.count() ? joint.count() : to;
            (in ? changed : kept).add(part(joint, from, end));
            from = end;
        }
        List<Recorded> after = new ArrayList<>();
        if (change.action() == RowChange.Action.CHANGE) {
            for (Joint each : changed) {
                Map<String, String> texts = PostingRows.texts(rows, each);
                texts.putAll(change.row());
                Recorded read = posting.read(rows, texts, 1);
                if (read == null) {
                    return;
                }
                after.add(read);
            }
        }
        if (posting.apply(Change.remove(joint))) {
            after.addAll(kept);
            after.forEach(record -> posting.apply(Change.add(withIdentity((Joint) record))));
        }
    }

    private Joint withIdentity(Joint joint) {
        int id = view.limit(RecordKind.JOINT);
        return new Joint(id, joint.type(), joint.enclosure(), joint.a(), joint.b(), joint.facts());
    }

    private static Joint part(Joint joint, int from, int to) {
        return new Joint(
                joint.id(),
                joint.type(),
                joint.enclosure(),
                part(joint.a(), from, to),
                part(joint.b(), from, to),
                joint.facts());
    }

    private static EndRange part(EndRange ends, int from, int to) {
        FiberRange numbers = ends.numbers();
        return new EndRange(ends.leg(), new FiberRange(numbers.at(from), numbers.at(to - 1)));
    }
}
