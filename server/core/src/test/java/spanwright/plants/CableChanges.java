package spanwright.plants;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Pass;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** Draws changes of cables: in and out of service, to another type, longer, by way of more places, cut in two, gone. */
final class CableChanges {

    private final RandomChanges.Entering entering;
    private final RecordsView records;
    private final Chance chance;

    CableChanges(RandomChanges.Entering entering) {
        this.entering = entering;
        this.records = entering.records();
        this.chance = entering.chance();
    }

    void draw() {
        switch (chance.between(0, 7)) {
            case 0 -> entering.any(records.cables().list()).ifPresent(this::changeState);
            case 1 -> entering.any(records.cables().list()).ifPresent(this::changeType);
            case 2 -> entering.any(records.cableTypes().list()).ifPresent(this::widen);
            case 3 -> entering.any(records.cables().list()).ifPresent(this::lengthen);
            case 4 -> entering.any(records.runRows().list()).ifPresent(this::insertAfter);
            case 5 -> entering.any(records.passes().list()).ifPresent(this::cutAt);
            case 6 -> entering.any(records.runRows().list()).ifPresent(this::coil);
            default -> entering.any(records.cables().list()).ifPresent(this::remove);
        }
    }

    private static Cable with(Cable cable, int type, PlantState state) {
        return new Cable(
                cable.id(),
                cable.code(),
                type,
                cable.partOf(),
                cable.marksInk(),
                cable.overlengthPct(),
                cable.reel(),
                cable.installedOn(),
                state,
                cable.note());
    }

    private void changeState(Cable cable) {
        PlantState state = cable.state() == PlantState.IN_SERVICE ? PlantState.ABANDONED : PlantState.IN_SERVICE;
        entering.replace(cable, with(cable, cable.cableType(), state));
    }

    private void changeType(Cable cable) {
        int fibers = records.cableTypes().get(cable.cableType()).fibers();
        entering.any(records.cableTypes().list().filter(type -> type.fibers() >= fibers))
                .ifPresent(type -> entering.replace(cable, with(cable, type.id(), cable.state())));
    }

    private void widen(CableType type) {
        entering.replace(
                type,
                new CableType(
                        type.id(),
                        type.code(),
                        type.fibers() + chance.between(0, 1),
                        type.fibersPerTube(),
                        type.fiberType(),
                        type.overlengthPct() + 0.5,
                        type.ribbon(),
                        type.fibersPerRibbon(),
                        type.colors()));
    }

    private void lengthen(Cable cable) {
        List<RunRow> run = records.runOf(cable.id());
        RunRow last = run.get(run.size() - 1);
        entering.any(records.spans().owned(Relation.STRUCTURE_SPANS, last.structure()))
                .ifPresent(span -> entering.add(row(
                        cable.id(),
                        last.seq() + 1,
                        span.from() == last.structure() ? span.to() : span.from(),
                        span.id())));
    }

    private RunRow row(int cable, int seq, int structure, int span) {
        return new RunRow(
                entering.next(RecordKind.RUN_ROW), cable, seq, structure, span, Length.ZERO, Trust.POSTED, null, null);
    }

    private static RunRow moved(RunRow row, int cable, int seq) {
        return new RunRow(
                row.id(),
                cable,
                seq,
                row.structure(),
                row.span(),
                row.slack(),
                row.slackTrust(),
                row.slackOn(),
                row.duct());
    }

    /** Takes a cable once around the place where one of its rows is. */
    private void insertAfter(RunRow row) {
        int id = entering.next(RecordKind.SPAN);
        Span loop = new Span(
                id,
                "L-" + id,
                row.structure(),
                row.structure(),
                Placement.INDOOR,
                Length.ofMetres(8),
                null,
                PlantState.IN_SERVICE,
                List.of(),
                null);
        List<RunRow> run = records.runOf(row.cable());
        entering.add(loop);
        for (int index = run.size() - 1; index > row.seq(); index--) {
            entering.replace(run.get(index), moved(run.get(index), row.cable(), index + 1));
        }
        entering.add(row(row.cable(), row.seq() + 1, row.structure(), loop.id()));
    }

    private void coil(RunRow row) {
        entering.replace(
                row,
                new RunRow(
                        row.id(),
                        row.cable(),
                        row.seq(),
                        row.structure(),
                        row.span(),
                        chance.metres(1, 20),
                        Trust.VERIFIED,
                        null,
                        row.duct()));
    }

    /** Cuts a cable in two in an enclosure amid its run; what was spliced ahead there stays so. */
    private void cutAt(Pass pass) {
        List<RunRow> run = records.runOf(pass.cable());
        RunRow at = records.runRows().get(pass.runRow());
        if (at.seq() == 0 || at.seq() == run.size() - 1) {
            return;
        }
        Cable rest = restOf(records.cables().get(pass.cable()));
        RunRow start = new RunRow(
                entering.next(RecordKind.RUN_ROW),
                rest.id(),
                0,
                at.structure(),
                null,
                Length.ZERO,
                Trust.POSTED,
                null,
                null);
        List<Pass> passes = records.passesOf(pass.cable());
        List<RunRow> beyond = run.subList(at.seq() + 1, run.size());
        boolean laid = entering.add(rest)
                && entering.add(start)
                && beyond.stream().allMatch(row -> entering.replace(row, moved(row, rest.id(), row.seq() - at.seq())))
                && passes.stream().allMatch(this::moveToItsCable)
                && entering.add(new Pass(
                        entering.next(RecordKind.PASS), pass.enclosure(), rest.id(), start.id(), List.of(), List.of()));
        if (laid) {
            moveJoints(new Leg(LegKind.AHEAD, at.id()), new Leg(LegKind.AHEAD, start.id()));
        }
    }

    private Cable restOf(Cable cable) {
        int id = entering.next(RecordKind.CABLE);
        return new Cable(
                id,
                cable.code() + "-" + id,
                cable.cableType(),
                "WAS-" + cable.code(),
                cable.marksInk(),
                null,
                null,
                null,
                cable.state(),
                null);
    }

    /** Makes a pass that of the cable to which its run row belongs now. */
    private boolean moveToItsCable(Pass pass) {
        int cable = records.runRows().get(pass.runRow()).cable();
        return entering.replace(
                pass, new Pass(pass.id(), pass.enclosure(), cable, pass.runRow(), pass.opened(), pass.tubesOpened()));
    }

    private void moveJoints(Leg from, Leg to) {
        for (Joint joint : PlantChanges.jointsOn(records, Set.of(from)).toList()) {
            entering.replace(
                    joint,
                    new Joint(
                            joint.id(),
                            joint.type(),
                            joint.enclosure(),
                            moved(joint.a(), from, to),
                            moved(joint.b(), from, to),
                            joint.facts()));
        }
        entering.removeAll(
                records.endStates().list().filter(state -> state.ends().leg().equals(from)));
    }

    private static EndRange moved(EndRange ends, Leg from, Leg to) {
        return ends.leg().equals(from) ? new EndRange(to, ends.numbers()) : ends;
    }

    private void remove(Cable cable) {
        Set<Leg> legs = new HashSet<>();
        Set<Integer> rows = new TreeSet<>();
        for (RunRow row : records.runOf(cable.id())) {
            rows.add(row.id());
            legs.add(new Leg(LegKind.BACK, row.id()));
            legs.add(new Leg(LegKind.AHEAD, row.id()));
        }
        boolean bare = entering.removeAll(PlantChanges.jointsOn(records, legs))
                && entering.removeAll(records.endStates()
                        .list()
                        .filter(state -> legs.contains(state.ends().leg())))
                && entering.removeAll(records.fiberFlags().owned(Relation.CABLE_FLAGS, cable.id()))
                && entering.removeAll(records.fiberCounts().owned(Relation.CABLE_COUNTS, cable.id()))
                && entering.removeAll(records.cableValues().owned(Relation.CABLE_VALUES, cable.id()))
                && entering.removeAll(records.sheathMarks().list().filter(mark -> rows.contains(mark.runRow())))
                && entering.removeAll(records.passes().owned(Relation.CABLE_PASSES, cable.id()))
                && entering.removeAll(records.runRows().owned(Relation.CABLE_RUN_ROWS, cable.id()));
        if (bare) {
            entering.remove(cable);
        }
    }
}
