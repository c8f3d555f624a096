package spanwright.draft;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import spanwright.plant.SheathPositions;
import spanwright.plant.SheathTie;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.records.CableLay;
import spanwright.sheet.CableLeg;
import spanwright.sheet.Statement;
import spanwright.splicing.LegKind;

/** Legs taken for the other way, sheath marks in the wrong unit, turned, or with digits mistaken. */
final class CableSlips {

    /** Sheath between two marks over its route and coils: outside this a mark is misread. */
    private static final double LEAST = 0.95;

    private static final double MOST = 1.30;

    private CableSlips() {}

    static void find(CheckedSheet sheet, Consumer<Slip> found) {
        for (Statement statement : sheet.statements()) {
            if (statement instanceof Statement.LegSeen seen) {
                direction(sheet, seen, found);
                if (seen.mark() != null && seen.unit() != null) {
                    mark(sheet, seen, seen.mark(), seen.unit(), found);
                }
            }
        }
    }

    private static void direction(CheckedSheet sheet, Statement.LegSeen seen, Consumer<Slip> found) {
        String toward = seen.toward();
        if (toward == null || toward.equals(seen.leg().toward().code())) {
            return;
        }
        Optional<CableLeg> other = sheet.legs().list().stream()
                .filter(leg -> leg.cable().id() == seen.leg().cable().id()
                        && leg.toward().code().equals(toward))
                .findFirst();
        found.accept(Slip.error(
                seen.toPlace(),
                "leg-reversed",
                seen.leg().name() + " leads to " + seen.leg().toward().code() + ", not to " + toward + ".",
                other.map(leg -> leg.name() + " leads to " + toward
                                + ": was the closure turned round? Then back and ahead change places in every line of"
                                + " this cable.")
                        .orElse("Name " + seen.leg().toward().code() + ", or another cable.")));
    }

    private static void mark(
            CheckedSheet sheet, Statement.LegSeen seen, BigDecimal number, LengthUnit unit, Consumer<Slip> found) {
        CableLay lay = CableLay.of(sheet.after().records(), seen.leg().cable().id());
        int row = lay.index(seen.leg().row().id());
        boolean out = seen.leg().leg().kind() == LegKind.AHEAD;
        List<SheathTie> ties = lay.positions().ties();
        int at = -1;
        for (int index = 0; index < ties.size(); index++) {
            at = ties.get(index).row() == row && ties.get(index).out() == out ? index : at;
        }
        if (at < 0) {
            return;
        }
        Neighbours near = new Neighbours(
                lay,
                at,
                at > 0 ? ties.get(at - 1) : null,
                at + 1 < ties.size() ? ties.get(at + 1) : null,
                way(ties, at));
        if (near.fits(number, unit)) {
            return;
        }
        LengthUnit other = unit == LengthUnit.FOOT ? LengthUnit.METRE : LengthUnit.FOOT;
        String text = "The mark " + number.toPlainString() + " " + unit.symbol() + " on "
                + seen.leg().name()
                + (near.turns(number, unit) ? " turns against those beside it" : " does not fit the route")
                + near.words() + ".";
        Optional<BigDecimal> edited = MarkEdits.find(number, candidate -> near.fits(candidate, unit));
        String mend = near.fits(number, other)
                ? "In " + other.symbol() + " it would fit: look at the unit."
                : edited.map(right -> "One digit away, " + right.toPlainString() + " " + unit.symbol()
                                + " would fit: read it again.")
                        .orElse("Read it again: another ink, or a change of reel that is not recorded?");
        found.accept(Slip.error(seen.markPlace(), near.fits(number, other) ? "mark-unit" : "mark-misread", text, mend));
    }

    /** Whether the marks but for one rise (1) or fall (-1); 0 where nothing tells. */
    private static int way(List<SheathTie> ties, int but) {
        SheathTie before = null;
        int sum = 0;
        for (int index = 0; index < ties.size(); index++) {
            if (index != but) {
                sum += before == null ? 0 : ties.get(index).mark().compareTo(before.mark());
                before = ties.get(index);
            }
        }
        return Integer.signum(sum);
    }

    /** The marks beside one, and what lies between. */
    private record Neighbours(
            CableLay lay,
            int at,
            @Nullable SheathTie before,
            @Nullable SheathTie after,
            int way) {

        private SheathTie self() {
            return lay.positions().ties().get(at);
        }

        private Length nominal(SheathTie tie) {
            SheathPositions plain = SheathPositions.of(
                    lay.rows().stream().map(row -> row.slack()).toList(),
                    IntStream.range(1, lay.rows().size())
                            .mapToObj(row -> lay.route(row).length())
                            .toList(),
                    List.of());
            return tie.out() ? plain.out(tie.row()) : plain.in(tie.row());
        }

        boolean fits(BigDecimal number, LengthUnit unit) {
            return !turns(number, unit) && spans(number, unit, before) && spans(number, unit, after);
        }

        boolean turns(BigDecimal number, LengthUnit unit) {
            Length mark = Length.of(number, unit);
            int from = before == null ? way : mark.compareTo(before.mark());
            int to = after == null ? way : after.mark().compareTo(mark);
            return from * to < 0 || (way != 0 && (from * way < 0 || to * way < 0));
        }

        private boolean spans(BigDecimal number, LengthUnit unit, @Nullable SheathTie other) {
            if (other == null || other.row() == self().row()) {
                return true;
            }
            double sheath = Length.of(number, unit).minus(other.mark()).abs().metres();
            double route = nominal(self()).minus(nominal(other)).abs().metres();
            return route == 0 || (sheath / route >= LEAST && sheath / route <= MOST);
        }

        String words() {
            return (before == null ? "" : ", after " + words(before))
                    + (after == null ? "" : ", before " + words(after));
        }

        private String words(SheathTie tie) {
            double route = nominal(self()).minus(nominal(tie)).abs().metres();
            return tie.number().toPlainString() + " " + tie.unit().symbol() + " at "
                    + lay.structure(tie.row()).code() + ", " + Math.round(route) + " m of route and coils away";
        }
    }
}
