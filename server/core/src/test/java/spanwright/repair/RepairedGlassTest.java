package spanwright.repair;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import spanwright.incident.Written;
import spanwright.network.MemoryLedger;
import spanwright.network.RecordsText;
import spanwright.network.Snapshot;
import spanwright.plant.Cable;
import spanwright.plant.SheathMark;
import spanwright.plants.RandomRing;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.Relation;
import spanwright.splicing.SpliceMethod;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

/** What a piece let into a cable of a random ring does to its sheath: what was cut out is gone, what was let in is there. */
class RepairedGlassTest {

    private static final int PLANTS = 60;
    /** A mark is written to a tenth of a millimetre. */
    private static final long NEAR = Length.ofMetres(0.001).micrometres();

    private final Random random = new Random(7);

    @Test
    void the_parts_are_as_long_as_what_is_left_and_the_piece_as_it_was_measured() {
        int drawn = 0;
        for (long seed = 1; seed <= PLANTS; seed++) {
            try (MemoryLedger ledger = new MemoryLedger()) {
                drawn += repair("seed " + seed, ledger, RandomRing.of(seed)) ? 1 : 0;
            }
        }
        assertThat(drawn).as("repairs that draw from a coil").isGreaterThan(PLANTS / 3);
    }

    private boolean repair(String at, MemoryLedger ledger, Snapshot ring) {
        ledger.post("A. Marsh", "Ring", editor -> {
            RandomRing.changes(ring).forEach(editor::replay);
            return List.of();
        });
        Snapshot before = ledger.current();
        List<String> text = RecordsText.of(before);
        Cable cable = before.records().cables().find("F-0").orElseThrow();
        CableLay lay = CableLay.of(before.records(), cable.id());
        long coil = lay.positions().coil(1).micrometres();
        Length left = new Length(coil == 0 ? 0 : coil * random.nextInt(4) / 4);
        Length piece = lay.routeTo(2).minus(lay.routeTo(1)).plus(Length.ofMetres(random.nextInt(30)));
        Written<RepairDesk.Posted> written =
                new RepairDesk(ledger).post("D. Reed", "Cut", order(left, coil > 0, piece));

        assertThat(written).as(at).isInstanceOf(Written.Kept.class);
        Snapshot after = ledger.current();
        near(at, after, "F-0-1", lay.positions().in(1).plus(left));
        near(at, after, "F-0-2", piece);
        near(at, after, "F-0-3", lay.positions().length().minus(lay.positions().in(2)));
        for (String part : List.of("F-0-1", "F-0-2", "F-0-3")) {
            assertThat(isMonotone(after, part)).as("%s, marks of %s", at, part).isTrue();
        }
        assertThat(RecordsText.of(ledger.asOf(1))).as(at).isEqualTo(text);
        whole(at, before, after);
        return left.micrometres() < coil;
    }

    private static RepairOrder order(Length left, boolean coiled, Length piece) {
        Length tray = Length.ofMetres(1.5);
        return new RepairOrder(
                "F-0",
                null,
                "H01-H02",
                new RepairOrder.Place("R-1", "H01", tray),
                new RepairOrder.Place("R-2", "H02", tray),
                new RepairOrder.Piece(null, null, "R-9", piece),
                coiled ? List.of(new RepairOrder.Coil("H01", left)) : List.of(),
                SpliceMethod.FUSION,
                "Crew 4",
                null,
                null,
                null);
    }

    private static void near(String at, Snapshot after, String code, Length expected) {
        Cable cable = after.records().cables().find(code).orElseThrow();
        long length =
                CableLay.of(after.records(), cable.id()).positions().length().micrometres();
        assertThat(Math.abs(length - expected.micrometres()))
                .as("%s, %s is %d um, not %s", at, code, length, expected)
                .isLessThanOrEqualTo(NEAR);
    }

    /** Whether the marks of a cable rise all along it, or fall; the same twice where nothing is coiled. */
    private static boolean isMonotone(Snapshot snapshot, String code) {
        List<BigDecimal> marks = new ArrayList<>();
        int cable = snapshot.records().cables().find(code).orElseThrow().id();
        snapshot.records()
                .runOf(cable)
                .forEach(row -> snapshot.records()
                        .sheathMarks()
                        .owned(Relation.RUN_ROW_MARKS, row.id())
                        .forEach(mark -> add(marks, mark)));
        boolean rises = true;
        boolean falls = true;
        for (int index = 1; index < marks.size(); index++) {
            rises &= marks.get(index).compareTo(marks.get(index - 1)) >= 0;
            falls &= marks.get(index).compareTo(marks.get(index - 1)) <= 0;
        }
        return rises || falls;
    }

    private static void add(List<BigDecimal> marks, SheathMark mark) {
        addMark(marks, mark.markIn());
        addMark(marks, mark.markOut());
    }

    private static void addMark(List<BigDecimal> marks, @Nullable BigDecimal mark) {
        if (mark != null) {
            marks.add(mark);
        }
    }

    private static void whole(String at, Snapshot before, Snapshot after) {
        Tracer was = new Tracer(before);
        Tracer is = new Tracer(after);
        before.records()
                .circuits()
                .list()
                .forEach(circuit -> assertThat(is.ofCircuit(circuit))
                        .as("%s, %s", at, circuit.code())
                        .hasSameSizeAs(was.ofCircuit(circuit))
                        .allMatch(Path::complete));
    }
}
