package spanwright.plants;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Pass;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.Span;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
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
        if (run.isEmpty()) {
            return;
        }
        RunRow last = run.get(run.size() - 1);
        entering.any(records.spans().owned(Relation.STRUCTURE_SPANS, last.structure()))
                .ifPresent(span -> entering.add(row(
                        cable.id(),
                        last.seq() + 1,
                        span.from() == last.structure() ? span.to() : span.from(),
                        span.id())));
    }

    private RunRow row(int cable, int seq, int structure, @Nullable Integer span) {
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

    /** Cuts a cable in two in an enclosure amid its run; what was joined ahead of it stays joined. */
    private void cutAt(Pass pass) {
        List<RunRow> run = records.runOf(pass.cable());
        RunRow at = records.runRows().get(pass.runRow());
        if (at.seq() == 0 || at.seq() == run.size() - 1) {
            return;
        }
        List<RunRow> beyond = run.subList(at.seq() + 1, run.size());
        Set<Leg> legs = legsOf(beyond);
        legs.add(new Leg(LegKind.AHEAD, at.id()));
        List<Joint> joints = PlantChanges.jointsOn(records, legs).toList();
        List<Pass> passes = records.passesOf(pass.cable()).stream()
                .filter(other -> records.runRows().get(other.runRow()).seq() > at.seq())
                .toList();
        if (!entering.removeAll(joints.stream())
                || !entering.removeAll(statesOn(legs))
                || !entering.removeAll(marksOn(beyond))
                || !entering.removeAll(passes.stream())
                || !removeBackward(beyond)) {
            return;
        }
        Map<Integer, Integer> rows = new HashMap<>();
        Cable rest = restOf(records.cables().get(pass.cable()));
        rows.put(at.id(), enter(rest, 0, at.structure(), null));
        beyond.forEach(row -> rows.put(row.id(), enter(rest, row.seq() - at.seq(), row.structure(), row.span())));
        enterPass(pass.enclosure(), rest, rows.get(at.id()));
        passes.forEach(other -> enterPass(other.enclosure(), rest, rows.get(other.runRow())));
        joints.forEach(joint -> entering.add(new Joint(
                entering.next(RecordKind.JOINT),
                joint.type(),
                joint.enclosure(),
                moved(joint.a(), legs, rows),
                moved(joint.b(), legs, rows),
                joint.facts())));
    }

    private static Set<Leg> legsOf(List<RunRow> rows) {
        Set<Leg> legs = new HashSet<>();
        for (RunRow row : rows) {
            legs.add(new Leg(LegKind.BACK, row.id()));
            legs.add(new Leg(LegKind.AHEAD, row.id()));
        }
        return legs;
    }

    private Stream<EndState> statesOn(Set<Leg> legs) {
        return records.endStates()
                .list()
                .filter(state -> legs.contains(state.ends().leg()));
    }

    private Stream<SheathMark> marksOn(List<RunRow> rows) {
        return rows.stream().flatMap(row -> records.sheathMarks().owned(Relation.RUN_ROW_MARKS, row.id()));
    }

    private boolean removeBackward(List<RunRow> rows) {
        return IntStream.rangeClosed(1, rows.size()).allMatch(index -> entering.remove(rows.get(rows.size() - index)));
    }

    private Cable restOf(Cable cable) {
        int id = entering.next(RecordKind.CABLE);
        Cable rest = new Cable(
                id,
                "R-" + id,
                cable.cableType(),
                "WAS-" + cable.code(),
                cable.marksInk(),
                null,
                null,
                null,
                cable.state(),
                null);
        entering.add(rest);
        return rest;
    }

    private int enter(Cable cable, int seq, int structure, @Nullable Integer span) {
        RunRow row = row(cable.id(), seq, structure, span);
        entering.add(row);
        return row.id();
    }

    private void enterPass(int enclosure, Cable cable, @Nullable Integer row) {
        if (row != null) {
            entering.add(new Pass(entering.next(RecordKind.PASS), enclosure, cable.id(), row, List.of(), List.of()));
        }
    }

    private static EndRange moved(EndRange ends, Set<Leg> legs, Map<Integer, Integer> rows) {
        return legs.contains(ends.leg())
                ? new EndRange(
                        new Leg(ends.leg().kind(), rows.getOrDefault(ends.leg().owner(), 0)), ends.numbers())
                : ends;
    }

    private void remove(Cable cable) {
        List<RunRow> run = records.runOf(cable.id());
        Set<Leg> legs = legsOf(run);
        boolean named = records.measurements()
                .list()
                .anyMatch(measured -> measured.what().startsWith(cable.code() + ":")
                        || measured.what().startsWith(cable.code() + " "));
        boolean bare = !named
                && entering.removeAll(PlantChanges.jointsOn(records, legs))
                && entering.removeAll(statesOn(legs))
                && entering.removeAll(records.fiberFlags().owned(Relation.CABLE_FLAGS, cable.id()))
                && entering.removeAll(records.fiberCounts().owned(Relation.CABLE_COUNTS, cable.id()))
                && entering.removeAll(records.cableValues().owned(Relation.CABLE_VALUES, cable.id()))
                && entering.removeAll(marksOn(run))
                && entering.removeAll(records.passes().owned(Relation.CABLE_PASSES, cable.id()))
                && removeBackward(run);
        if (bare) {
            entering.remove(cable);
        }
    }
}
