package spanwright.repair;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.records.RecordsEditor;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** Carries a cable's place in enclosures, its joints and the states of its ends over to rows of another cable. */
final class MovedEnds {

    private final RecordsEditor records;
    private final Consumer<Change> apply;
    private final Map<Integer, Integer> rows = new HashMap<>();
    private final Map<Integer, Pass> passes = new HashMap<>();

    MovedEnds(RecordsEditor records, Consumer<Change> apply) {
        this.records = records;
        this.apply = apply;
    }

    /** A row's place is taken by a row of another cable, which is in the same enclosure with the same fibers opened. */
    void move(RunRow was, RunRow is, int cable) {
        rows.put(was.id(), is.id());
        Optional<Pass> pass = records.findPassAt(was.id());
        pass.ifPresent(old -> {
            passes.put(was.id(), old);
            apply.accept(Change.add(new Pass(
                    records.newIdentity(RecordKind.PASS),
                    old.enclosure(),
                    cable,
                    is.id(),
                    old.opened(),
                    old.tubesOpened())));
        });
    }

    /** Joints and states follow; each keeps its identity. Then the old places are given up. */
    void finish() {
        records.joints()
                .list()
                .filter(joint -> moves(joint.a()) || moves(joint.b()))
                .toList()
                .forEach(joint -> apply.accept(Change.replace(
                        joint,
                        new Joint(
                                joint.id(),
                                joint.type(),
                                joint.enclosure(),
                                moved(joint.a()),
                                moved(joint.b()),
                                joint.facts()))));
        records.endStates()
                .list()
                .filter(state -> moves(state.ends()))
                .toList()
                .forEach(state -> apply.accept(Change.replace(
                        state,
                        new EndState(
                                state.id(),
                                state.enclosure(),
                                moved(state.ends()),
                                state.condition(),
                                state.trust(),
                                state.verifiedOn()))));
    }

    /** Gives up the old places; nothing may name them any more. */
    void giveUp() {
        passes.values().forEach(pass -> apply.accept(Change.remove(pass)));
    }

    private boolean moves(EndRange ends) {
        return isCable(ends.leg()) && rows.containsKey(ends.leg().owner());
    }

    private static boolean isCable(Leg leg) {
        return leg.kind() == LegKind.BACK || leg.kind() == LegKind.AHEAD;
    }

    private EndRange moved(EndRange ends) {
        Integer row = rows.get(ends.leg().owner());
        return row == null || !isCable(ends.leg())
                ? ends
                : new EndRange(new Leg(ends.leg().kind(), row), ends.numbers());
    }
}
