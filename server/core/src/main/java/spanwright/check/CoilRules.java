package spanwright.check;

import java.util.function.Consumer;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.records.Relation;

/** Coils that the marks contradict, and coils that nobody is sure of: both move a fault place. */
final class CoilRules implements Rule {

    /** A mark is read to about a metre: less than this is no contradiction. */
    private static final Length READING = Length.ofMetres(2);

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        checked.records().runRows().list().forEach(row -> {
            checked.records()
                    .sheathMarks()
                    .owned(Relation.RUN_ROW_MARKS, row.id())
                    .filter(mark -> mark.ink()
                            .equals(checked.records().cables().get(row.cable()).marksInk()))
                    .forEach(mark -> against(checked, row, mark, found));
            unsure(checked, row, found);
        });
    }

    private static void against(Checked checked, RunRow row, SheathMark mark, Consumer<Finding> found) {
        if (mark.markIn() == null || mark.markOut() == null) {
            return;
        }
        Length coil = Length.of(mark.markOut(), mark.unit())
                .minus(Length.of(mark.markIn(), mark.unit()))
                .abs();
        Length apart = coil.minus(row.slack()).abs();
        if (apart.compareTo(READING) > 0
                && apart.metres() > 0.2 * Math.max(coil.metres(), row.slack().metres())) {
            found.accept(new Finding(
                    Severity.WARNING,
                    "coil-against-marks",
                    "cable_runs.csv",
                    checked.cable(row.cable()),
                    "At " + checked.structure(row) + " " + row.slack() + " of " + checked.cable(row.cable())
                            + " is recorded as coiled, but its marks leave " + coil + ".",
                    "Look at the coil and record what is there; the marks govern the lengths until then."));
        }
    }

    private static void unsure(Checked checked, RunRow row, Consumer<Finding> found) {
        if (row.slackTrust() == Trust.UNKNOWN && row.slack().micrometres() > 0) {
            found.accept(new Finding(
                    Severity.NOTE,
                    "coil-not-sure",
                    "cable_runs.csv",
                    checked.cable(row.cable()),
                    "Nobody is sure of the " + row.slack() + " of " + checked.cable(row.cable()) + " coiled at "
                            + checked.structure(row) + ".",
                    "Look at it on the next visit: it moves every fault place beyond it."));
        }
    }
}
