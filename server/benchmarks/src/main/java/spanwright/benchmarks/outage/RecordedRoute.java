package spanwright.benchmarks.outage;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;
import org.jspecify.annotations.Nullable;
import spanwright.benchmarks.outage.TrueRoute.Reel;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
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
import spanwright.plant.SheathMark;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.records.Refusal;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.SpliceMethod;

/** A true route as the records have it, each number off by its spread. */
final class RecordedRoute {

    private static final FiberRange ONE = new FiberRange(1, 1);

    private final RandomGenerator chance;
    private final Spread spread;
    private final SnapshotEditor editor = Snapshot.empty().edit();
    /** The enclosures in order: the headend, then one behind each reel. */
    private final List<Enclosure> enclosures = new ArrayList<>();

    private final Snapshot snapshot;
    private final int panel;

    RecordedRoute(TrueRoute route, RandomGenerator chance, Spread spread) {
        this.chance = chance;
        this.spread = spread;
        Structure at = structure(0);
        enclosures.add(enclosure(at, 0));
        this.panel = add(new Panel(next(RecordKind.PANEL), enclosures.get(0).id(), "P", 1, "SC/APC"))
                .id();
        RunRow before = null;
        for (Reel reel : route.reels) {
            List<RunRow> rows = reel(reel, at);
            at = editor.records().structures().get(rows.get(rows.size() - 1).structure());
            join(before, rows.get(0));
            before = rows.get(rows.size() - 1);
        }
        List<Refusal> refusals = editor.finish();
        if (!refusals.isEmpty()) {
            throw new IllegalStateException(refusals.toString());
        }
        this.snapshot = editor.build(1);
    }

    Snapshot snapshot() {
        return snapshot;
    }

    /** The port at the headend. */
    long start() {
        return EndKey.of(LegKind.FRONT, panel, 1);
    }

    /** The closure behind so many reels. */
    Enclosure closure(int reels) {
        return enclosures.get(reels);
    }

    private int next(RecordKind kind) {
        return editor.records().newIdentity(kind);
    }

    private <T extends Recorded> T add(T record) {
        List<Refusal> refusals = editor.apply(Change.add(record));
        if (!refusals.isEmpty()) {
            throw new IllegalStateException(refusals.toString());
        }
        return record;
    }

    private double off(double deviation) {
        return deviation * chance.nextGaussian();
    }

    private Structure structure(double place) {
        int id = next(RecordKind.STRUCTURE);
        double recorded = place + off(spread.map());
        return add(new Structure(
                id,
                "H-" + id,
                StructureKind.HANDHOLE,
                new Position(recorded / TrueRoute.DEGREE, 0),
                null,
                null,
                PlantState.IN_SERVICE,
                List.of(),
                null));
    }

    private Enclosure enclosure(Structure at, double tray) {
        int id = next(RecordKind.ENCLOSURE);
        return add(new Enclosure(
                id, "E-" + id, at.id(), EnclosureKind.CLOSURE, Length.ofMetres(tray), PlantState.IN_SERVICE, null));
    }

    private List<RunRow> reel(Reel reel, Structure from) {
        int id = next(RecordKind.CABLE);
        CableType type = add(new CableType(
                next(RecordKind.CABLE_TYPE), "T-" + id, 1, 12, "G.652.D", reel.overlength, false, null, "TIA-598"));
        Cable cable =
                add(new Cable(id, "F-" + id, type.id(), null, "white", null, null, null, PlantState.IN_SERVICE, null));
        List<RunRow> rows = new ArrayList<>();
        Structure at = from;
        double sheath = 1000;
        for (int row = 0; row < reel.places.size(); row++) {
            Structure before = at;
            at = row == 0 ? from : structure(reel.places.get(row));
            sheath += row == 0 ? 0 : reel.spans.get(row - 1);
            rows.add(row(cable, row, before, at, reel.coils.get(row)));
            if (reel.marked) {
                mark(rows.get(row), sheath, sheath + reel.coils.get(row));
            }
            sheath += reel.coils.get(row);
        }
        enclosures.add(enclosure(at, TrueRoute.TRAY));
        return rows;
    }

    private RunRow row(Cable cable, int seq, Structure before, Structure at, double coil) {
        Integer span = null;
        if (seq > 0) {
            int id = next(RecordKind.SPAN);
            span = add(new Span(
                            id,
                            "S-" + id,
                            before.id(),
                            at.id(),
                            Placement.DUCT,
                            null,
                            null,
                            PlantState.IN_SERVICE,
                            List.of(),
                            null))
                    .id();
        }
        double slack = coil > 0 ? Math.max(1, coil + off(spread.coil())) : 0;
        return add(new RunRow(
                next(RecordKind.RUN_ROW),
                cable.id(),
                seq,
                at.id(),
                span,
                Length.ofMetres(slack),
                Trust.POSTED,
                null,
                null));
    }

    /** A bare row has one mark, a coil two; since they were read the coil was drawn on, half a spread either way. */
    private void mark(RunRow row, double in, double out) {
        double drawn = out > in ? off(spread.coil() / 2) : 0;
        BigDecimal arrives = read(in + drawn);
        add(new SheathMark(
                next(RecordKind.SHEATH_MARK),
                row.id(),
                "white",
                LengthUnit.METRE,
                arrives,
                out > in ? read(out - drawn) : arrives,
                null,
                Trust.POSTED));
    }

    private BigDecimal read(double at) {
        return BigDecimal.valueOf(at + off(spread.mark())).setScale(3, RoundingMode.HALF_EVEN);
    }

    /** Joins a reel's beginning to the end of the one before, or to the port. */
    private void join(@Nullable RunRow before, RunRow row) {
        int reels = enclosures.size() - 2;
        Enclosure here = enclosures.get(reels);
        if (before != null) {
            pass(here, before);
        }
        pass(here, row);
        EndRange ahead = new EndRange(new Leg(LegKind.AHEAD, row.id()), ONE);
        EndRange other = before == null
                ? new EndRange(new Leg(LegKind.REAR, panel), ONE)
                : new EndRange(new Leg(LegKind.BACK, before.id()), ONE);
        add(new Joint(
                next(RecordKind.JOINT),
                before == null ? JointKind.TERMINATION : JointKind.SPLICE,
                here.id(),
                other,
                ahead,
                new JointFacts(null, SpliceMethod.FUSION, null, Trust.POSTED, null, null, null, null, null, null)));
    }

    private void pass(Enclosure enclosure, RunRow row) {
        add(new Pass(next(RecordKind.PASS), enclosure.id(), row.cable(), row.id(), List.of(), List.of()));
    }
}
