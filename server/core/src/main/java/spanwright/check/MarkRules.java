package spanwright.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.plant.RouteLength;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.Span;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.records.Relation;

/** Sheath marks that cannot be: marks that turn, sheath much shorter or longer than its route, an ink never read. */
final class MarkRules implements Rule {

    /** Sheath between two marks over its route, slack included: outside this a mark is misread or in the wrong unit. */
    private static final double LEAST = 0.95;

    private static final double MOST = 1.30;

    /** One mark read, with the nominal position where it was read. */
    private record Read(RunRow row, BigDecimal number, LengthUnit unit, Length nominal, Length route) {

        Length mark() {
            return Length.of(number, unit);
        }

        String text() {
            return number.toPlainString() + " " + unit.symbol();
        }
    }

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        checked.records().cables().list().forEach(cable -> {
            List<Read> reads = reads(checked, cable);
            turns(checked, cable, reads, found);
            for (int index = 1; index < reads.size(); index++) {
                againstRoute(checked, cable, reads.get(index - 1), reads.get(index), found);
            }
            inkNeverRead(checked, cable, reads, found);
        });
    }

    private static List<Read> reads(Checked checked, Cable cable) {
        List<Read> reads = new ArrayList<>();
        Length nominal = Length.ZERO;
        Length route = Length.ZERO;
        for (RunRow row : checked.records().runOf(cable.id())) {
            Length span = spanLength(checked, row.span());
            nominal = nominal.plus(span);
            route = route.plus(span);
            SheathMark mark = governing(checked, cable, row);
            if (mark != null && mark.markIn() != null) {
                reads.add(new Read(row, mark.markIn(), mark.unit(), nominal, route));
            }
            nominal = nominal.plus(row.slack());
            if (mark != null && mark.markOut() != null) {
                reads.add(new Read(row, mark.markOut(), mark.unit(), nominal, route));
            }
        }
        return reads;
    }

    private static Length spanLength(Checked checked, @Nullable Integer id) {
        if (id == null) {
            return Length.ZERO;
        }
        Span span = checked.records().spans().get(id);
        return RouteLength.of(
                        span,
                        checked.records().structures().get(span.from()).position(),
                        checked.records().structures().get(span.to()).position())
                .length();
    }

    private static @Nullable SheathMark governing(Checked checked, Cable cable, RunRow row) {
        return checked.records()
                .sheathMarks()
                .owned(Relation.RUN_ROW_MARKS, row.id())
                .filter(mark -> mark.ink().equals(cable.marksInk()))
                .findFirst()
                .orElse(null);
    }

    private static void turns(Checked checked, Cable cable, List<Read> reads, Consumer<Finding> found) {
        int way = 0;
        for (int index = 1; index < reads.size(); index++) {
            int step = reads.get(index).mark().compareTo(reads.get(index - 1).mark());
            if (step * way < 0) {
                found.accept(
                        new Finding(
                                Severity.ERROR,
                                "marks-turn",
                                "sheath_marks.csv",
                                cable.code(),
                                "The " + cable.marksInk() + " marks of " + cable.code() + " turn at "
                                        + checked.structure(reads.get(index - 1).row()) + ": "
                                        + reads.get(index - 1).text() + ", then "
                                        + reads.get(index).text() + " at "
                                        + checked.structure(reads.get(index).row()) + ".",
                                "Read the marks again: digits swapped, another ink, or a change of reel that is not recorded?"));
            }
            way = step == 0 ? way : step;
        }
    }

    /** Coils count on the side of the route: the sheath lies in them too. */
    private static void againstRoute(Checked checked, Cable cable, Read from, Read to, Consumer<Finding> found) {
        double nominal = to.nominal().minus(from.nominal()).metres();
        if (nominal <= 0 || to.route().equals(from.route())) {
            return;
        }
        double sheath = to.mark().minus(from.mark()).abs().metres();
        double share = sheath / nominal;
        if (share < LEAST || share > MOST) {
            found.accept(new Finding(
                    Severity.WARNING,
                    "sheath-against-route",
                    "sheath_marks.csv",
                    cable.code(),
                    "From " + checked.structure(from.row()) + " to " + checked.structure(to.row()) + " the marks of "
                            + cable.code() + " (" + from.text() + ", " + to.text() + ") imply "
                            + Math.round(sheath) + " m of sheath on " + Math.round(nominal) + " m of route and coils.",
                    unitSlip(share)));
        }
    }

    private static String unitSlip(double share) {
        double feet = LengthUnit.FOOT.micrometres() / 1e6;
        if (share * feet >= LEAST && share * feet <= MOST) {
            return "The marks may be feet entered as metres: set their unit to ft.";
        }
        if (share / feet >= LEAST && share / feet <= MOST) {
            return "The marks may be metres entered as feet: set their unit to m.";
        }
        return "Read the marks again, or mend the length of the spans or the slack between.";
    }

    private static void inkNeverRead(Checked checked, Cable cable, List<Read> reads, Consumer<Finding> found) {
        boolean others = checked.records().runOf(cable.id()).stream()
                .anyMatch(row -> checked.records().owned(Relation.RUN_ROW_MARKS, row.id()).length > 0);
        if (reads.isEmpty() && others) {
            found.accept(new Finding(
                    Severity.WARNING,
                    "governing-ink-never-read",
                    "cables.csv",
                    cable.code(),
                    "The " + cable.marksInk() + " marks govern " + cable.code() + ", but only other inks were read.",
                    "Name the ink that was read in marks_ink, or read the " + cable.marksInk() + " marks."));
        }
    }
}
