package spanwright.records;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.CableValue;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.splicing.EndState;
import spanwright.splicing.FiberCount;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Joint;
import spanwright.splicing.Splitter;

/**
 * The rules by which changes enter the records, but for those of ends joined twice, which the network keeps.
 * A change is asked about before it is applied ({@link #refuse}), told when it has been ({@link #applied}),
 * and what only several rows together can break is asked at the end ({@link #finish}).
 *
 * <p>One thread's, for one posting.
 */
public final class EntryRules {

    private final RecordsView view;
    private final LegRules legs;
    private final JointRules joints;
    private final CableRules cables;
    private final Set<Integer> touchedRuns = new LinkedHashSet<>();
    private final Set<Integer> touchedRows = new LinkedHashSet<>();
    private final Set<Integer> touchedSpans = new LinkedHashSet<>();

    /**
     * Rules over a state that is being changed.
     *
     * @param view the state with all changes applied so far, as it is at each call
     */
    public EntryRules(RecordsView view) {
        this.view = view;
        this.legs = new LegRules(view);
        this.joints = new JointRules(view, legs);
        this.cables = new CableRules(view);
    }

    /** Why a change may not be applied to the state as it is; nothing where it may. Every broken rule at once. */
    public List<Refusal> refuse(Change change) {
        Recorded before = change.before();
        Recorded after = change.after();
        if (after != null) {
            Refusals refusals = new Refusals(after);
            CodeRules.ask(view, after, refusals);
            if (before != null) {
                FixedRules.ask(view, before, after, refusals);
            }
            ask(before, after, refusals);
            return refusals.list();
        }
        if (before != null) {
            Refusals refusals = new Refusals(before);
            RemovalRules.ask(view, before, refusals);
            return refusals.list();
        }
        return List.of();
    }

    private void ask(@Nullable Recorded before, Recorded after, Refusals refusals) {
        switch (after.kind()) {
            case SPAN -> SpanRules.ask(view, (Span) after, refusals);
            case CABLE_TYPE -> cables.ask((CableType) before, (CableType) after, refusals);
            case CABLE -> cables.ask((Cable) before, (Cable) after, refusals);
            case CABLE_VALUE -> cables.ask((CableValue) after, refusals);
            case SHEATH_MARK -> cables.ask((SheathMark) after, refusals);
            case PASS -> PassRules.ask(view, (Pass) after, refusals);
            case SPLITTER -> FiberRules.ask((Splitter) after, refusals);
            case JOINT -> joints.ask((Joint) after, refusals);
            case END_STATE -> joints.ask((EndState) after, refusals);
            case FIBER_FLAG -> FiberRules.ask(view, (FiberFlag) after, refusals);
            case FIBER_COUNT -> FiberRules.ask(view, (FiberCount) after, refusals);
            case CIRCUIT -> FiberRules.ask(view, (Circuit) after, refusals);
            default -> {
                // The other kinds are right by themselves.
            }
        }
    }

    /** Notes a change that has been applied. */
    public void applied(Change change) {
        if (change.kind() == RecordKind.JOINT) {
            return;
        }
        legs.forget(change.kind());
        Recorded before = change.before();
        Recorded after = change.after();
        switch (change.kind()) {
            case STRUCTURE -> touchStructure((Structure) before, (Structure) after);
            case SPAN -> touchSpan((Span) before, (Span) after);
            case CABLE -> cables.applied((Cable) before, (Cable) after);
            case RUN_ROW -> {
                touchRun((RunRow) before);
                touchRun((RunRow) after);
            }
            case ENCLOSURE -> touchEnclosure((Enclosure) before, (Enclosure) after);
            default -> {
                // What else several rows can break is asked row by row.
            }
        }
    }

    private void touchStructure(@Nullable Structure before, @Nullable Structure after) {
        if (before != null && after != null && !before.position().equals(after.position())) {
            for (int span : view.owned(Relation.STRUCTURE_SPANS, after.id())) {
                touchedSpans.add(span);
            }
        }
    }

    private void touchSpan(@Nullable Span before, @Nullable Span after) {
        if (before != null && after != null && (before.from() != after.from() || before.to() != after.to())) {
            for (int row : view.owned(Relation.SPAN_RUN_ROWS, after.id())) {
                touchedRuns.add(view.runRows().get(row).cable());
            }
        }
    }

    private void touchRun(@Nullable RunRow row) {
        if (row != null) {
            touchedRuns.add(row.cable());
            touchedRows.add(row.id());
        }
    }

    private void touchEnclosure(@Nullable Enclosure before, @Nullable Enclosure after) {
        if (before != null && after != null && before.structure() != after.structure()) {
            view.passes().owned(Relation.ENCLOSURE_PASSES, after.id()).forEach(pass -> touchedRows.add(pass.runRow()));
        }
    }

    /** What is wrong with what the applied changes touched, seen as a whole; nothing where all is right. */
    public List<Refusal> finish() {
        List<Refusal> refusals = new ArrayList<>();
        touchedSpans.forEach(id -> view.spans().find(id).ifPresent(span -> {
            Refusals found = new Refusals(span);
            SpanRules.ask(view, span, found);
            refusals.addAll(found.list());
        }));
        touchedRuns.forEach(cable -> {
            RunRules.ask(view, view.runOf(cable), refusals);
            askRing(cable, refusals);
        });
        touchedRows.forEach(row -> view.findPassAt(row).ifPresent(pass -> {
            Refusals found = new Refusals(pass);
            PassRules.askPlace(
                    view,
                    pass,
                    view.enclosures().get(pass.enclosure()),
                    view.runRows().get(row),
                    found);
            refusals.addAll(found.list());
        }));
        return refusals;
    }

    /** A ring that is made longer is in its enclosure twice with a row that is no longer its last. */
    private void askRing(int cable, List<Refusal> refusals) {
        Set<Integer> enclosures = new HashSet<>();
        view.passes().owned(Relation.CABLE_PASSES, cable).forEach(pass -> {
            if (!enclosures.add(pass.enclosure())) {
                Refusals found = new Refusals(pass);
                PassRules.askTwice(view, pass, found);
                refusals.addAll(found.list());
            }
        });
    }
}
