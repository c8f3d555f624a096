package spanwright.plants;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import spanwright.journal.RecordKind;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** Draws changes of enclosures and of what is in them. */
final class PlantChanges {

    private final RandomChanges.Entering entering;
    private final RecordsView records;
    private final Chance chance;

    PlantChanges(RandomChanges.Entering entering) {
        this.entering = entering;
        this.records = entering.records();
        this.chance = entering.chance();
    }

    void draw() {
        switch (chance.between(0, 8)) {
            case 0, 1 -> entering.any(records.passes().list()).ifPresent(this::open);
            case 2 -> entering.any(records.passes().list()).ifPresent(this::removePass);
            case 3 -> entering.any(records.runRows().list()).ifPresent(this::addPass);
            case 4 -> entering.any(records.enclosures().list()).ifPresent(this::changeState);
            case 5 -> entering.any(records.panels().list()).ifPresent(this::changePanel);
            case 6 -> entering.any(records.splitters().list()).ifPresent(this::changeSplitter);
            case 7 -> entering.any(records.enclosures().list()).ifPresent(this::addPanel);
            default -> entering.any(records.enclosures().list()).ifPresent(this::addSplitter);
        }
    }

    private void open(Pass pass) {
        int cable = records.cables().get(pass.cable()).cableType();
        int fibers = records.cableTypes().get(cable).fibers();
        int first = chance.between(1, fibers);
        List<FiberRange> opened =
                chance.in(40) ? List.of() : List.of(new FiberRange(first, chance.between(first, fibers)));
        entering.replace(
                pass, new Pass(pass.id(), pass.enclosure(), pass.cable(), pass.runRow(), opened, pass.tubesOpened()));
    }

    /** Removes a pass with the joints and end states there. */
    private void removePass(Pass pass) {
        Leg back = new Leg(LegKind.BACK, pass.runRow());
        Leg ahead = new Leg(LegKind.AHEAD, pass.runRow());
        boolean free = entering.removeAll(jointsOn(records, Set.of(back, ahead)))
                && entering.removeAll(records.endStates()
                        .list()
                        .filter(state ->
                                Set.of(back, ahead).contains(state.ends().leg())));
        if (free) {
            entering.remove(pass);
        }
    }

    static Stream<Joint> jointsOn(RecordsView records, Set<Leg> legs) {
        return records.joints()
                .list()
                .filter(joint -> legs.contains(joint.a().leg())
                        || legs.contains(joint.b().leg()));
    }

    private void addPass(RunRow row) {
        if (records.findPassAt(row.id()).isPresent()) {
            return;
        }
        Set<Integer> used = new TreeSet<>();
        records.passesOf(row.cable()).forEach(pass -> used.add(pass.enclosure()));
        entering.any(records.enclosures()
                        .owned(Relation.STRUCTURE_ENCLOSURES, row.structure())
                        .filter(enclosure -> !used.contains(enclosure.id())))
                .ifPresent(enclosure -> entering.add(new Pass(
                        entering.next(RecordKind.PASS),
                        enclosure.id(),
                        row.cable(),
                        row.id(),
                        chance.in(50) ? List.of() : List.of(FiberRange.of(1)),
                        List.of())));
    }

    private void changeState(Enclosure enclosure) {
        PlantState state = enclosure.state() == PlantState.IN_SERVICE
                ? chance.of(PlantState.PLANNED, PlantState.ABANDONED)
                : PlantState.IN_SERVICE;
        entering.replace(
                enclosure,
                new Enclosure(
                        enclosure.id(),
                        enclosure.code(),
                        enclosure.structure(),
                        enclosure.type(),
                        enclosure.trayGlass(),
                        state,
                        enclosure.note()));
    }

    private void changePanel(Panel panel) {
        if (chance.in(60)) {
            entering.replace(
                    panel,
                    new Panel(
                            panel.id(),
                            panel.enclosure(),
                            panel.code(),
                            panel.ports() + chance.between(0, 2),
                            chance.of("SC/APC", "LC/APC")));
            return;
        }
        Leg rear = new Leg(LegKind.REAR, panel.id());
        Leg front = new Leg(LegKind.FRONT, panel.id());
        if (entering.removeAll(records.circuits().owned(Relation.PANEL_CIRCUITS, panel.id()))
                && entering.removeAll(jointsOn(records, Set.of(rear, front)))) {
            entering.remove(panel);
        }
    }

    private void changeSplitter(Splitter splitter) {
        if (chance.in(60)) {
            entering.replace(
                    splitter,
                    new Splitter(
                            splitter.id(),
                            splitter.enclosure(),
                            splitter.code(),
                            2,
                            splitter.outputs() + chance.between(0, 2),
                            splitter.loss(),
                            splitter.outputLosses()));
            return;
        }
        Leg in = new Leg(LegKind.IN, splitter.id());
        Leg out = new Leg(LegKind.OUT, splitter.id());
        if (entering.removeAll(jointsOn(records, Set.of(in, out)))) {
            entering.remove(splitter);
        }
    }

    private void addPanel(Enclosure enclosure) {
        int id = entering.next(RecordKind.PANEL);
        entering.add(new Panel(id, enclosure.id(), "N" + id, chance.between(1, 6), "SC/APC"));
    }

    private void addSplitter(Enclosure enclosure) {
        int id = entering.next(RecordKind.SPLITTER);
        entering.add(new Splitter(id, enclosure.id(), "T" + id, 1, chance.of(2, 4), null, Map.of()));
    }
}
