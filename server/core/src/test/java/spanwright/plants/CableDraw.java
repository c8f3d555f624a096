package spanwright.plants;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.CableValue;
import spanwright.plant.ColorCode;
import spanwright.plant.FiberRange;
import spanwright.plant.FiberType;
import spanwright.plant.FiberValues;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.Span;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.splicing.FiberCount;

/** Draws fiber types, cable types and cables, with their runs over the spans, slack and sheath marks. */
final class CableDraw {

    private static final String OWN_FIBER = "NZ-1";
    private static final String OWN_COLORS = "S-12";

    private final PlantDraft draft;
    private final Chance chance;

    CableDraw(PlantDraft draft, Chance chance) {
        this.draft = draft;
        this.chance = chance;
    }

    void draw(int cables) {
        fiberType();
        colorCode();
        for (int fibers : new int[] {1, 2, 6, 12, 24}) {
            cableType(fibers);
        }
        for (int index = 0; index < cables; index++) {
            cable();
        }
    }

    private void fiberType() {
        draft.add(new FiberType(
                draft.next(RecordKind.FIBER_TYPE),
                OWN_FIBER,
                List.of(values(1310, "0.4", 1.471), values(1550, "0.23", null), values(1625, "0.26", 1.472)),
                chance.perhaps(50, () -> 1500.0),
                chance.perhaps(50, () -> 0.045),
                chance.perhaps(50, () -> 0.1)));
    }

    private static FiberValues values(int nanometres, String loss, @Nullable Double index) {
        Loss perKm = Loss.ofDecibels(new BigDecimal(loss));
        return new FiberValues(Wavelength.ofNanometres(nanometres), perKm, perKm.plus(Loss.ofDecibels(0.05)), index);
    }

    private void colorCode() {
        draft.add(new ColorCode(
                draft.next(RecordKind.COLOR_CODE), OWN_COLORS, List.of("red", "green", "yellow", "blue", "white")));
    }

    private void cableType(int fibers) {
        int id = draft.next(RecordKind.CABLE_TYPE);
        boolean ribbon = fibers >= 12 && chance.in(50);
        draft.add(new CableType(
                id,
                fibers + "F",
                fibers,
                Math.min(fibers, chance.of(4, 6, 12)),
                chance.of("G.652.D", "G.657.A1", OWN_FIBER),
                chance.of(0.0, 1.0, 2.5),
                ribbon,
                ribbon ? Integer.valueOf(6) : null,
                chance.of("TIA-598", OWN_COLORS)));
    }

    private void cable() {
        int id = draft.next(RecordKind.CABLE);
        CableType type = chance.of(draft.cableTypes);
        draft.add(new Cable(
                id,
                "F-" + id,
                type.id(),
                chance.perhaps(25, () -> "LONG-" + chance.between(1, 3)),
                chance.of("white", "white", "yellow"),
                chance.perhaps(20, () -> 1.25),
                chance.perhaps(30, () -> "reel " + id),
                chance.perhaps(30, chance::day),
                chance.in(12) ? chance.of(PlantState.PLANNED, PlantState.ABANDONED) : PlantState.IN_SERVICE,
                chance.perhaps(10, () -> "spliced wet, \"tested\" after")));
        run(id);
        marks(id);
        if (chance.in(20)) {
            draft.add(new CableValue(
                    draft.next(RecordKind.CABLE_VALUE),
                    id,
                    Wavelength.ofNanometres(1550),
                    chance.perhaps(70, () -> 1.4679),
                    chance.decibels(0.18, 0.22),
                    chance.perhaps(50, () -> "reel sheet")));
        }
        if (chance.in(20) && type.fibers() >= 6) {
            draft.add(new FiberCount(
                    draft.next(RecordKind.FIBER_COUNT),
                    id,
                    new FiberRange(1, 6),
                    "feeder 2",
                    new FiberRange(601, 606)));
        }
    }

    private void run(int cable) {
        int structure = chance.of(draft.structures).id();
        int start = structure;
        row(cable, 0, structure, null);
        int rows = chance.between(1, 6);
        for (int seq = 1; seq <= rows; seq++) {
            Span span = chance.of(spansAt(structure));
            structure = span.from() == structure ? span.to() : span.from();
            row(cable, seq, structure, span.id());
        }
        for (Span span : spansAt(structure)) {
            if (structure != start && chance.in(30) && (span.from() == start || span.to() == start)) {
                row(cable, rows + 1, start, span.id());
                return;
            }
        }
    }

    private List<Span> spansAt(int structure) {
        return draft.spans.stream()
                .filter(span -> span.from() == structure || span.to() == structure)
                .toList();
    }

    private void row(int cable, int seq, int structure, @Nullable Integer span) {
        boolean slack = chance.in(30);
        draft.add(new RunRow(
                draft.next(RecordKind.RUN_ROW),
                cable,
                seq,
                structure,
                span,
                slack ? chance.metres(3, 40) : Length.ZERO,
                slack ? chance.of(Trust.values()) : Trust.POSTED,
                slack && chance.in(40) ? chance.day() : null,
                chance.perhaps(15, () -> "B" + chance.between(1, 4))));
    }

    private void marks(int cable) {
        for (String ink : new ArrayList<>(List.of("white", "yellow"))) {
            if (chance.in(40)) {
                marks(cable, ink);
            }
        }
    }

    private void marks(int cable, String ink) {
        LengthUnit unit = chance.of(LengthUnit.values());
        int sign = chance.of(-1, 1);
        BigDecimal at = BigDecimal.valueOf(50_000);
        for (RunRow row : draft.run(cable)) {
            at = at.add(chance.tenths(5, 900).multiply(BigDecimal.valueOf(sign)));
            BigDecimal in = at;
            at = at.add(chance.tenths(0, 40).multiply(BigDecimal.valueOf(sign)));
            boolean both = chance.in(50);
            if (chance.in(70)) {
                draft.add(new SheathMark(
                        draft.next(RecordKind.SHEATH_MARK),
                        row.id(),
                        ink,
                        unit,
                        both || chance.in(50) ? in : null,
                        both ? at : null,
                        chance.perhaps(40, chance::day),
                        chance.of(Trust.values())));
            }
        }
    }
}
