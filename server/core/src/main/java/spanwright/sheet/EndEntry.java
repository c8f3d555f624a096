package spanwright.sheet;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.SnapshotEditor;
import spanwright.records.Relation;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** Enters what is said of ends, within the glass or within one planned job. */
final class EndEntry {

    private static final String GLASS = "";

    private final SheetEntry sheet;
    private final SnapshotEditor editor;
    private final String job;
    private final List<Statement> statements;
    private final EndWishes wishes;
    /** Of each range of joints said, the indexes that are recorded so already. */
    private final Map<Statement, BitSet> done = new HashMap<>();
    /** What was known of joints that were taken apart, by their two ends, the lower key first. */
    private final Map<Pair, JointFacts> known = new HashMap<>();
    /** Ends whose joint was taken apart and of which nothing is said, with the line that did it. */
    private final Map<Long, TextPlace> freed = new LinkedHashMap<>();

    /** Two ends joined, the lower key first. */
    private record Pair(long low, long high) {

        static Pair of(long one, long other) {
            return new Pair(Math.min(one, other), Math.max(one, other));
        }
    }

    EndEntry(SheetEntry sheet, String job, List<Statement> statements) {
        this.sheet = sheet;
        this.editor = sheet.editor();
        this.job = job;
        this.statements = statements;
        this.wishes = new EndWishes(statements);
    }

    void enter() {
        takeApart();
        if (job.equals(GLASS)) {
            buildPlans();
            List<EndState> states = new ArrayList<>();
            clearStates(states);
            new TubeEntry(sheet, statements, freed).enter();
            addJoints();
            addStates(states);
        } else {
            addJoints();
        }
    }

    private int jointAt(long key) {
        Leg leg = new Leg(EndKey.kind(key), EndKey.owner(key));
        return job.equals(GLASS)
                ? editor.findJoint(leg, EndKey.number(key))
                : editor.findPlanned(job, leg, EndKey.number(key));
    }

    private void takeApart() {
        Map<Integer, TextPlace> touched = new LinkedHashMap<>();
        for (long key : wishes.ends()) {
            int joint = jointAt(key);
            EndWishes.Wish wish = wishes.find(key);
            if (joint != 0 && wish != null) {
                touched.putIfAbsent(joint, wish.statement().place());
            }
        }
        touched.forEach((id, place) -> takeApart(editor.records().joints().get(id), place));
    }

    private void takeApart(Joint joint, TextPlace place) {
        BitSet kept = new BitSet();
        for (int index = 0; index < joint.count(); index++) {
            if (stays(joint, index)) {
                kept.set(index);
            } else {
                known.put(Pair.of(joint.a().key(index), joint.b().key(index)), joint.facts());
                free(joint.a().key(index), place);
                free(joint.b().key(index), place);
            }
        }
        if (kept.cardinality() < joint.count()) {
            keepParts(joint, kept, place);
        }
    }

    private void free(long key, TextPlace place) {
        if (wishes.find(key) == null) {
            freed.put(key, place);
        }
    }

    private void keepParts(Joint joint, BitSet kept, TextPlace place) {
        sheet.apply(place, Change.remove(joint));
        for (RangeParts.Run run : RangeParts.runs(kept)) {
            int id = editor.records().newIdentity(RecordKind.JOINT);
            sheet.apply(place, Change.add(RangeParts.part(joint, id, run)));
        }
    }

    /** Whether a joint's pair is as said, or nothing is said of it. */
    private boolean stays(Joint joint, int index) {
        EndWishes.Wish a = wishes.find(joint.a().key(index));
        EndWishes.Wish b = wishes.find(joint.b().key(index));
        if (a == null && b == null) {
            return true;
        }
        if (a == null
                || !(a.statement() instanceof Statement.Joins joins)
                || a.partner() != joint.b().key(index)) {
            return false;
        }
        boolean same =
                joins.type() == joint.type() && facts(joins, joint.facts()).equals(joint.facts());
        if (same) {
            done.computeIfAbsent(joins, any -> new BitSet()).set(a.index());
        }
        return same;
    }

    /** What is known of a joint once a line is said over what was known; no light, no new trust in it. */
    private static JointFacts facts(Statement.Joins joins, @Nullable JointFacts before) {
        LegKind glass = joins.b().leg().kind();
        boolean ofSplitter = glass == LegKind.IN || glass == LegKind.OUT;
        JointWords words = LightProof.weigh(joins.words(), before);
        return before == null ? words.facts(joins.type(), ofSplitter) : words.over(before);
    }

    /** A joint made as its job planned it takes the plan's place. */
    private void buildPlans() {
        for (Statement statement : statements) {
            if (statement instanceof Statement.Joins joins && joins.words().job() != null) {
                buildPlan(joins, joins.words().job());
            }
        }
    }

    private void buildPlan(Statement.Joins joins, String planned) {
        Map<Integer, BitSet> built = new LinkedHashMap<>();
        BitSet left = left(joins);
        for (int index = left.nextSetBit(0); index >= 0; index = left.nextSetBit(index + 1)) {
            int id = editor.findPlanned(
                    planned, joins.a().leg(), joins.a().numbers().at(index));
            if (id != 0) {
                Pair made = Pair.of(joins.a().key(index), joins.b().key(index));
                note(editor.records().joints().get(id), made, built.computeIfAbsent(id, any -> new BitSet()));
            }
        }
        built.forEach((id, indexes) -> {
            Joint joint = editor.records().joints().get(id);
            if (!indexes.isEmpty()) {
                indexes.flip(0, joint.count());
                keepParts(joint, indexes, joins.place());
            }
        });
    }

    /** Notes where a joint joins two ends. */
    private static void note(Joint joint, Pair ends, BitSet indexes) {
        for (int index = 0; index < joint.count(); index++) {
            if (Pair.of(joint.a().key(index), joint.b().key(index)).equals(ends)) {
                indexes.set(index);
            }
        }
    }

    /** Takes away the states of ends of which something else is said; those said anew are added once the glass is cut. */
    private void clearStates(List<EndState> add) {
        List<EndState> here = editor.records()
                .endStates()
                .owned(Relation.ENCLOSURE_END_STATES, sheet.enclosure())
                .toList();
        Map<Long, EndState> before = new HashMap<>();
        for (EndState state : here) {
            BitSet kept = new BitSet();
            TextPlace place = null;
            for (int index = 0; index < state.ends().count(); index++) {
                long key = state.ends().key(index);
                before.put(key, state);
                EndWishes.Wish wish = wishes.find(key);
                boolean same = wish == null
                        || (wish.statement() instanceof Statement.States said && StateFacts.repeats(said, state));
                kept.set(index, same);
                place = same || wish == null ? place : wish.statement().place();
                if (same && wish != null) {
                    done.computeIfAbsent(wish.statement(), any -> new BitSet()).set(wish.index());
                }
            }
            if (place != null) {
                sheet.apply(place, Change.remove(state));
                for (RangeParts.Run run : RangeParts.runs(kept)) {
                    int id = editor.records().newIdentity(RecordKind.END_STATE);
                    sheet.apply(place, Change.add(RangeParts.part(state, id, run)));
                }
            }
        }
        statements.stream()
                .filter(Statement.States.class::isInstance)
                .map(Statement.States.class::cast)
                .forEach(said -> add.addAll(StateFacts.list(said, left(said), sheet.enclosure(), before)));
    }

    private BitSet left(Statement statement) {
        BitSet left = new BitSet();
        left.set(0, statement.ends().get(0).count());
        left.andNot(done.getOrDefault(statement, new BitSet()));
        return left;
    }

    private void addJoints() {
        for (Statement statement : statements) {
            if (statement instanceof Statement.Joins joins) {
                for (RangeParts.Run run : RangeParts.runs(left(joins))) {
                    addJoints(joins, run);
                }
            }
        }
    }

    /** Adds joints of a run, those alike in one range. */
    private void addJoints(Statement.Joins joins, RangeParts.Run run) {
        int from = run.from();
        while (from < run.to()) {
            JointFacts facts = facts(joins, before(joins, from));
            int to = from + 1;
            while (to < run.to() && facts(joins, before(joins, to)).equals(facts)) {
                to++;
            }
            RangeParts.Run part = new RangeParts.Run(from, to);
            sheet.apply(
                    joins.place(),
                    Change.add(new Joint(
                            editor.records().newIdentity(RecordKind.JOINT),
                            joins.type(),
                            sheet.enclosure(),
                            RangeParts.part(joins.a(), part),
                            RangeParts.part(joins.b(), part),
                            facts)));
            from = to;
        }
    }

    /** What was known of the same two ends joined; null where they were not. */
    private @Nullable JointFacts before(Statement.Joins joins, int index) {
        return known.get(Pair.of(joins.a().key(index), joins.b().key(index)));
    }

    private void addStates(List<EndState> states) {
        for (EndState state : states) {
            EndState fresh = new EndState(
                    editor.records().newIdentity(RecordKind.END_STATE),
                    state.enclosure(),
                    state.ends(),
                    state.condition(),
                    state.trust(),
                    state.verifiedOn());
            EndWishes.Wish wish = wishes.find(state.ends().key(0));
            if (wish != null) {
                sheet.apply(wish.statement().place(), Change.add(fresh));
            }
        }
    }
}
