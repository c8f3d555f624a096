package spanwright.network;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.EnclosureKind;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.RecordsEditor;
import spanwright.records.Refusal;
import spanwright.records.Register;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.SpliceMethod;
import spanwright.splicing.Splitter;

/**
 * Postings at random upon a small plant: cables laid and taken out, joints made, changed and undone, circuits lit and
 * retired, codes changed. What the rules refuse is left out; now and then a whole posting asks to be refused.
 */
public final class RandomPostings {

    private static final int STRUCTURES = 6;
    private static final int FIBERS = 12;
    private static final Refusal SECOND_THOUGHTS =
            new Refusal("second-thoughts", "The posting is not wanted after all.", null, null, null);

    private final Random random;

    /** Postings that follow from a seed. */
    public RandomPostings(long seed) {
        this.random = new Random(seed);
    }

    /** The first posting: structures in a row, a frame with two panels and a splitter in each. */
    public Ledger.Entry foundation() {
        return editor -> {
            add(
                    editor,
                    new CableType(
                            identity(editor, RecordKind.CABLE_TYPE),
                            "12F",
                            FIBERS,
                            FIBERS,
                            "G.652.D",
                            1.5,
                            false,
                            null,
                            "TIA-598"));
            int before = 0;
            for (int index = 0; index < STRUCTURES; index++) {
                int structure = identity(editor, RecordKind.STRUCTURE);
                add(editor, structure(structure, "P-" + structure, 47 + 0.01 * index));
                if (before != 0) {
                    addSpan(editor, before, structure);
                }
                addFrame(editor, structure);
                before = structure;
            }
            return List.of();
        };
    }

    private static Structure structure(int id, String code, double lat) {
        return new Structure(
                id,
                code,
                StructureKind.POLE,
                new Position(8.5, lat),
                null,
                null,
                PlantState.IN_SERVICE,
                List.of(),
                null);
    }

    private void addSpan(SnapshotEditor editor, int from, int to) {
        int id = identity(editor, RecordKind.SPAN);
        add(
                editor,
                new Span(
                        id,
                        "S-" + id,
                        from,
                        to,
                        Placement.AERIAL,
                        null,
                        null,
                        PlantState.IN_SERVICE,
                        List.of("bridge", "creek"),
                        null));
    }

    private void addFrame(SnapshotEditor editor, int structure) {
        int frame = identity(editor, RecordKind.ENCLOSURE);
        Length tray = Length.ofMetres(1.2);
        add(
                editor,
                new Enclosure(frame, "E-" + frame, structure, EnclosureKind.FRAME, tray, PlantState.IN_SERVICE, null));
        add(editor, new Panel(identity(editor, RecordKind.PANEL), frame, "P", FIBERS, "SC/APC"));
        add(editor, new Panel(identity(editor, RecordKind.PANEL), frame, "Q", FIBERS, "SC/APC"));
        add(
                editor,
                new Splitter(
                        identity(editor, RecordKind.SPLITTER),
                        frame,
                        "S1",
                        1,
                        4,
                        null,
                        Map.of(2, new Loss(3_200_000))));
    }

    /** The next posting of a few changes; one in eight asks to be refused once it has entered them. */
    public Ledger.Entry next() {
        int steps = 1 + random.nextInt(6);
        boolean refused = random.nextInt(8) == 0;
        return editor -> {
            for (int step = 0; step < steps; step++) {
                step(editor);
            }
            return refused ? List.of(SECOND_THOUGHTS) : List.of();
        };
    }

    private void step(SnapshotEditor editor) {
        switch (random.nextInt(11)) {
            case 0 -> layCable(editor);
            case 1, 2 -> splice(editor, Trust.POSTED, null);
            case 3 -> splice(editor, Trust.PLANNED, random.nextBoolean() ? "J-1" : null);
            case 4 -> terminate(editor);
            case 5 -> jumper(editor);
            case 6 -> circuit(editor);
            case 7 -> undoJoint(editor);
            case 8 -> changeJoint(editor);
            case 9 -> rename(editor);
            default -> takeOutCable(editor);
        }
    }

    private static int identity(SnapshotEditor editor, RecordKind kind) {
        return editor.records().newIdentity(kind);
    }

    private static boolean add(SnapshotEditor editor, Recorded record) {
        return editor.apply(Change.add(record)).isEmpty();
    }

    private <T extends Recorded> @Nullable T any(Register<T> register) {
        List<T> all = register.list().toList();
        return all.isEmpty() ? null : all.get(random.nextInt(all.size()));
    }

    private void layCable(SnapshotEditor editor) {
        RecordsEditor records = editor.records();
        int first = 1 + random.nextInt(STRUCTURES - 1);
        int last = Math.min(STRUCTURES, first + 1 + random.nextInt(3));
        int cable = identity(editor, RecordKind.CABLE);
        add(editor, new Cable(cable, "F-" + cable, 1, null, "white", null, null, null, PlantState.IN_SERVICE, null));
        for (int at = first; at <= last; at++) {
            int row = identity(editor, RecordKind.RUN_ROW);
            Integer span = at == first ? null : (Integer) (at - 1);
            add(
                    editor,
                    new RunRow(
                            row,
                            cable,
                            at - first,
                            at,
                            span,
                            Length.ofMetres(random.nextInt(20)),
                            Trust.POSTED,
                            null,
                            null));
            int enclosure = records.enclosures().get(at).id();
            if (at == first || at == last || random.nextInt(4) > 0) {
                add(
                        editor,
                        new Pass(
                                identity(editor, RecordKind.PASS),
                                enclosure,
                                cable,
                                row,
                                List.of(),
                                List.of(FiberRange.of(1))));
            }
        }
    }

    private void takeOutCable(SnapshotEditor editor) {
        RecordsEditor records = editor.records();
        Cable cable = any(records.cables());
        if (cable == null) {
            return;
        }
        List<Integer> rows = records.runOf(cable.id()).stream().map(RunRow::id).toList();
        boolean joined = records.joints().list().anyMatch(joint -> onRun(joint.a(), rows) || onRun(joint.b(), rows));
        if (!joined) {
            records.passesOf(cable.id()).forEach(pass -> editor.apply(Change.remove(pass)));
            records.runOf(cable.id()).forEach(row -> editor.apply(Change.remove(row)));
            editor.apply(Change.remove(cable));
        }
    }

    private static boolean onRun(EndRange ends, List<Integer> rows) {
        return ends.leg().kind().ordinal() <= LegKind.AHEAD.ordinal()
                && rows.contains(ends.leg().owner());
    }

    private List<Leg> legsIn(RecordsEditor records, int enclosure) {
        List<Leg> legs = new ArrayList<>();
        records.passes().list().filter(pass -> pass.enclosure() == enclosure).forEach(pass -> {
            int seq = records.runRows().get(pass.runRow()).seq();
            int last = records.runOf(pass.cable()).size() - 1;
            if (seq > 0) {
                legs.add(new Leg(LegKind.BACK, pass.runRow()));
            }
            if (seq < last) {
                legs.add(new Leg(LegKind.AHEAD, pass.runRow()));
            }
        });
        return legs;
    }

    private EndRange ends(Leg leg, int count) {
        int first = 1 + random.nextInt(FIBERS - count + 1);
        int last = first + count - 1;
        return new EndRange(leg, random.nextBoolean() ? new FiberRange(first, last) : new FiberRange(last, first));
    }

    private void splice(SnapshotEditor editor, Trust trust, @Nullable String job) {
        int enclosure = 1 + random.nextInt(STRUCTURES);
        List<Leg> legs = legsIn(editor.records(), enclosure);
        if (legs.size() > 1) {
            int count = 1 + random.nextInt(6);
            EndRange a = ends(legs.get(random.nextInt(legs.size())), count);
            EndRange b = ends(legs.get(random.nextInt(legs.size())), count);
            Loss loss = random.nextBoolean() ? new Loss(random.nextInt(300_000)) : null;
            addJoint(editor, JointKind.SPLICE, enclosure, a, b, facts(SpliceMethod.FUSION, loss, trust, job, null));
        }
    }

    private static JointFacts facts(
            @Nullable SpliceMethod method,
            @Nullable Loss loss,
            Trust trust,
            @Nullable String job,
            @Nullable Length jumper) {
        return new JointFacts("T1", method, loss, trust, null, null, null, null, job, jumper);
    }

    private static void addJoint(
            SnapshotEditor editor, JointKind kind, int enclosure, EndRange a, EndRange b, JointFacts facts) {
        add(editor, new Joint(identity(editor, RecordKind.JOINT), kind, enclosure, a, b, facts));
    }

    private void terminate(SnapshotEditor editor) {
        int enclosure = 1 + random.nextInt(STRUCTURES);
        List<Leg> legs = legsIn(editor.records(), enclosure);
        if (!legs.isEmpty()) {
            int count = 1 + random.nextInt(6);
            EndRange rear = ends(new Leg(LegKind.REAR, panelIn(enclosure)), count);
            EndRange glass = ends(legs.get(random.nextInt(legs.size())), count);
            addJoint(
                    editor, JointKind.TERMINATION, enclosure, rear, glass, facts(null, null, Trust.POSTED, null, null));
        }
    }

    private int panelIn(int enclosure) {
        return 2 * enclosure - random.nextInt(2);
    }

    private void jumper(SnapshotEditor editor) {
        int enclosure = 1 + random.nextInt(STRUCTURES);
        EndRange a = ends(new Leg(LegKind.FRONT, 2 * enclosure - 1), 1);
        EndRange b = ends(new Leg(LegKind.FRONT, 2 * enclosure), 1);
        JointFacts facts = facts(null, null, Trust.POSTED, null, Length.ofMetres(3));
        addJoint(editor, JointKind.JUMPER, enclosure, a, b, facts);
    }

    private void circuit(SnapshotEditor editor) {
        Circuit lit = any(editor.records().circuits());
        if (lit != null && random.nextBoolean()) {
            editor.apply(Change.replace(lit, circuit(lit.id(), lit.a(), lit.z(), CircuitStatus.RETIRED)));
            return;
        }
        int count = 1 + random.nextInt(2);
        PortRange a = ports(count);
        PortRange z = ports(count);
        add(editor, circuit(identity(editor, RecordKind.CIRCUIT), a, z, CircuitStatus.WORKING));
    }

    private PortRange ports(int count) {
        int first = 1 + random.nextInt(FIBERS - count + 1);
        return new PortRange(panelIn(1 + random.nextInt(STRUCTURES)), new FiberRange(first, first + count - 1));
    }

    private static Circuit circuit(int id, PortRange a, PortRange z, CircuitStatus status) {
        List<Wavelength> wavelengths = List.of(Wavelength.ofNanometres(1310));
        return new Circuit(id, "C-" + id, null, null, 3, 1, wavelengths, "B+", null, a, z, status);
    }

    private void undoJoint(SnapshotEditor editor) {
        Joint joint = any(editor.records().joints());
        if (joint != null) {
            editor.apply(Change.remove(joint));
        }
    }

    private void changeJoint(SnapshotEditor editor) {
        Joint joint = any(editor.records().joints());
        if (joint != null) {
            Trust trust = Stream.of(Trust.VERIFIED, Trust.POSTED, Trust.PLANNED)
                    .skip(random.nextInt(3))
                    .findFirst()
                    .orElseThrow();
            JointFacts facts = facts(
                    joint.facts().method(), null, trust, "J-2", joint.facts().jumperLength());
            editor.apply(Change.replace(
                    joint, new Joint(joint.id(), joint.type(), joint.enclosure(), joint.a(), joint.b(), facts)));
        }
    }

    private void rename(SnapshotEditor editor) {
        Cable laid = any(editor.records().cables());
        if (laid != null && random.nextInt(3) == 0) {
            PlantState state = laid.state() == PlantState.IN_SERVICE ? PlantState.PLANNED : PlantState.IN_SERVICE;
            editor.apply(Change.replace(
                    laid, new Cable(laid.id(), laid.code(), 1, null, "white", null, null, null, state, null)));
            return;
        }
        Structure was = any(editor.records().structures());
        if (was != null) {
            String code = "P-" + was.id() + (was.code().endsWith("x") ? "" : "x");
            editor.apply(
                    Change.replace(was, structure(was.id(), code, was.position().lat())));
        }
    }
}
