package spanwright.records;

import java.util.List;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;

/**
 * The rules of a cable in an enclosure: it is at the enclosure's structure, one enclosure a run row, one run row an
 * enclosure but for a ring, whose first and last row may both be there.
 */
final class PassRules {

    private PassRules() {}

    static void ask(RecordsView view, Pass pass, Refusals refusals) {
        Enclosure enclosure = view.enclosures().get(pass.enclosure());
        RunRow row = view.runRows().get(pass.runRow());
        if (row.cable() != pass.cable()) {
            refusals.add(
                    "pass-of-other-cable",
                    "seq",
                    "the run row is of cable " + Names.cable(view, row.cable()) + ", not of "
                            + Names.cable(view, pass.cable()) + "; name a row of its own run");
        }
        askPlace(view, pass, enclosure, row, refusals);
        view.passes()
                .owned(Relation.RUN_ROW_PASSES, row.id())
                .filter(other -> other.id() != pass.id())
                .findFirst()
                .ifPresent(other -> refusals.add(
                        "run-row-in-two-enclosures",
                        "seq",
                        Names.of(view, row) + " is in enclosure " + Names.enclosure(view, other.enclosure())
                                + "; a run row has one enclosure at most",
                        other));
        askTwice(view, pass, refusals);
        askOpened(view, pass, refusals);
    }

    /** Asks that a cable is in the enclosure once but for a ring; also where its run has got another first or last row. */
    static void askTwice(RecordsView view, Pass pass, Refusals refusals) {
        view.passes()
                .owned(Relation.CABLE_PASSES, pass.cable())
                .filter(other -> other.id() != pass.id()
                        && other.enclosure() == pass.enclosure()
                        && other.runRow() != pass.runRow()
                        && !ring(view, pass, other))
                .findFirst()
                .ifPresent(other -> refusals.add(
                        "cable-twice-in-enclosure",
                        "seq",
                        "cable " + Names.cable(view, pass.cable()) + " is in enclosure "
                                + Names.enclosure(view, pass.enclosure())
                                + " already; only its first and its last row may both be there",
                        other));
    }

    static void askPlace(RecordsView view, Pass pass, Enclosure enclosure, RunRow row, Refusals refusals) {
        if (row.structure() != enclosure.structure()) {
            List<RunRow> there = view.runOf(pass.cable()).stream()
                    .filter(one -> one.structure() == enclosure.structure())
                    .toList();
            refusals.add(
                    "run-row-elsewhere",
                    "seq",
                    Names.of(view, row) + " is at " + Names.structure(view, row.structure()) + ", but enclosure "
                            + enclosure.code() + " is at " + Names.structure(view, enclosure.structure()) + "; "
                            + (there.isEmpty()
                                    ? "the cable does not visit it"
                                    : "name row "
                                            + Names.choice(there.stream().map(one -> Integer.toString(one.seq())))));
        }
    }

    private static boolean ring(RecordsView view, Pass one, Pass other) {
        List<RunRow> run = view.runOf(one.cable());
        int first = run.get(0).id();
        int last = run.get(run.size() - 1).id();
        return (one.runRow() == first && other.runRow() == last) || (one.runRow() == last && other.runRow() == first);
    }

    private static void askOpened(RecordsView view, Pass pass, Refusals refusals) {
        CableType type = view.cableTypes().get(view.cables().get(pass.cable()).cableType());
        askWithin(pass.opened(), type.fibers(), "opened", "fibers", refusals);
        askWithin(pass.tubesOpened(), type.tubes(), "tubes_opened", "tubes", refusals);
    }

    private static void askWithin(List<FiberRange> ranges, int most, String column, String what, Refusals refusals) {
        for (FiberRange range : ranges) {
            if (range.first() > most || range.last() > most) {
                refusals.add(
                        "number-above-count",
                        column,
                        range + " is too large; the " + what + " of the cable are 1 to " + most);
            }
        }
    }
}
