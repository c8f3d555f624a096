package spanwright.network;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.records.EndNames;
import spanwright.records.RecordsView;
import spanwright.records.Refusal;
import spanwright.records.Relation;
import spanwright.splicing.EndRange;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/**
 * Ends that a joint or a circuit uses are not taken away: not with the cable's place in an enclosure, not with a
 * splitter or panel or some of its numbers, not by a run that ends earlier. One thread's, for one posting.
 */
final class UsedEnds {

    private final RecordsView records;
    private final EndNames names;
    private final EndUsers users;
    private final Set<Integer> touchedRuns = new LinkedHashSet<>();

    UsedEnds(RecordsView records, EndUsers users) {
        this.records = records;
        this.names = new EndNames(records);
        this.users = users;
    }

    /** Why a change may not be applied that takes ends away; one refusal for each joint that uses them. */
    List<Refusal> refuse(Change change) {
        Recorded before = change.before();
        List<Refusal> refusals = new ArrayList<>();
        if (before instanceof Pass pass && change.after() == null) {
            int fibers = records.cableTypes()
                    .get(records.cables().get(pass.cable()).cableType())
                    .fibers();
            ask(new Leg(LegKind.BACK, pass.runRow()), 1, fibers, before, refusals);
            ask(new Leg(LegKind.AHEAD, pass.runRow()), 1, fibers, before, refusals);
        } else if (before instanceof Splitter splitter) {
            Splitter after = (Splitter) change.after();
            int id = splitter.id();
            ask(new Leg(LegKind.IN, id), from(after == null ? 0 : after.inputs()), splitter.inputs(), before, refusals);
            ask(
                    new Leg(LegKind.OUT, id),
                    from(after == null ? 0 : after.outputs()),
                    splitter.outputs(),
                    before,
                    refusals);
        } else if (before instanceof Panel panel) {
            int first = from(change.after() instanceof Panel after ? after.ports() : 0);
            ask(new Leg(LegKind.REAR, panel.id()), first, panel.ports(), before, refusals);
            ask(new Leg(LegKind.FRONT, panel.id()), first, panel.ports(), before, refusals);
            askCircuits(panel, first, refusals);
        }
        return refusals;
    }

    private static int from(int kept) {
        return kept + 1;
    }

    private void ask(Leg leg, int first, int last, Recorded record, List<Refusal> refusals) {
        if (first > last) {
            return;
        }
        Map<Integer, Long> found = new LinkedHashMap<>();
        users.anywhere(new EndRange(leg, new FiberRange(first, last)), found);
        found.forEach((joint, key) ->
                refusals.add(refusal(record, records.joints().get(joint), names.anywhere(key) + " is joined")));
    }

    private void askCircuits(Panel panel, int first, List<Refusal> refusals) {
        for (int id : records.owned(Relation.PANEL_CIRCUITS, panel.id())) {
            Circuit circuit = records.circuits().get(id);
            for (var ports : List.of(circuit.a(), circuit.z())) {
                int highest = Math.max(ports.ports().first(), ports.ports().last());
                if (ports.panel() == panel.id() && highest >= first) {
                    refusals.add(refusal(panel, circuit, "circuit " + circuit.code() + " ends on port " + highest));
                    return;
                }
            }
        }
    }

    private static Refusal refusal(Recorded record, Recorded user, String what) {
        return new Refusal("end-in-use", what + "; free it first", null, record, user);
    }

    /** Notes a change that has been applied. */
    void applied(Change change) {
        if (change.kind() == RecordKind.RUN_ROW) {
            note((RunRow) change.before());
            note((RunRow) change.after());
        }
    }

    private void note(@Nullable RunRow row) {
        if (row != null) {
            touchedRuns.add(row.cable());
        }
    }

    /** Where runs were changed so that joined glass is there no longer. */
    List<Refusal> finish() {
        List<Refusal> refusals = new ArrayList<>();
        for (int cable : touchedRuns) {
            List<RunRow> run = records.runOf(cable);
            if (!run.isEmpty()) {
                RunRow last = run.get(run.size() - 1);
                askLoose(new Leg(LegKind.BACK, run.get(0).id()), run.get(0), refusals);
                askLoose(new Leg(LegKind.AHEAD, last.id()), last, refusals);
            }
        }
        return refusals;
    }

    private void askLoose(Leg leg, RunRow row, List<Refusal> refusals) {
        for (int joint : users.looseJoints(leg)) {
            refusals.add(refusal(
                    row,
                    records.joints().get(joint),
                    "the run of cable " + records.cables().get(row.cable()).code() + " would "
                            + (leg.kind() == LegKind.BACK ? "begin" : "end") + " at row " + row.seq()
                            + ", but glass beyond it is joined"));
            return;
        }
    }
}
