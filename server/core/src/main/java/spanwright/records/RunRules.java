package spanwright.records;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.plant.RunRow;
import spanwright.plant.Span;

/**
 * The rules of a cable's run as a whole: rows 0, 1, 2 ... from the cable's start, two at least, each but the
 * first reached over a span that joins its structure to the one before.
 */
public final class RunRules {

    private RunRules() {}

    /**
     * Fills in the spans left blank, where exactly one span joins the two structures.
     *
     * @param rows the rows of one cable, by seq; rows of equal seq in the order in which they were entered
     * @param refusals gets every broken rule
     * @return the rows, as far as they could be filled in
     */
    public static List<RunRow> complete(RecordsView view, List<RunRow> rows, List<Refusal> refusals) {
        List<RunRow> filled = new ArrayList<>(rows.size());
        RunRow before = null;
        for (RunRow row : rows) {
            RunRow whole = row;
            if (before == null || row.seq() != before.seq() + 1) {
                askStart(view, before, row, refusals);
            } else if (row.span() == null) {
                whole = withSpan(view, before, row, refusals);
            } else {
                askSpan(view, before, row, view.spans().get(row.span()), refusals);
            }
            filled.add(whole);
            before = row;
        }
        if (rows.size() == 1) {
            RunRow only = rows.get(0);
            refusals.add(refusal(
                    "run-too-short",
                    only,
                    "seq",
                    null,
                    "the run of " + Names.cable(view, only.cable())
                            + " has one row; it needs two at least, where it begins and where it ends"));
        }
        return filled;
    }

    /** Asks the same of rows that are entered, whose spans must all be known. */
    static void ask(RecordsView view, List<RunRow> rows, List<Refusal> refusals) {
        List<RunRow> filled = complete(view, rows, refusals);
        for (int index = 0; index < rows.size(); index++) {
            if (rows.get(index).span() == null && filled.get(index).span() != null) {
                refusals.add(refusal(
                        "run-span-blank",
                        rows.get(index),
                        "span",
                        null,
                        "no span leads to " + Names.of(view, rows.get(index)) + "; name the span travelled"));
            }
        }
    }

    private static void askStart(RecordsView view, @Nullable RunRow before, RunRow row, List<Refusal> refusals) {
        if (before == null && row.seq() == 0) {
            if (row.span() != null) {
                refusals.add(refusal(
                        "run-span-on-first-row",
                        row,
                        "span",
                        null,
                        "row 0 of " + Names.cable(view, row.cable())
                                + " has a span; the run begins there, so leave it blank"));
            }
        } else if (before != null && before.seq() == row.seq()) {
            refusals.add(refusal(
                    "run-row-twice",
                    row,
                    "seq",
                    before,
                    "row " + row.seq() + " of " + Names.cable(view, row.cable())
                            + " is there already; a run is 0, 1, 2 ... with each row once"));
        } else {
            int expected = before == null ? 0 : before.seq() + 1;
            refusals.add(refusal(
                    "run-not-consecutive",
                    row,
                    "seq",
                    null,
                    "row " + row.seq() + " of " + Names.cable(view, row.cable()) + " stands where row " + expected
                            + " should; a run is 0, 1, 2 ... from the cable's start"));
        }
    }

    private static void askSpan(RecordsView view, RunRow before, RunRow row, Span span, List<Refusal> refusals) {
        if (!joins(span, before.structure(), row.structure())) {
            refusals.add(refusal(
                    "run-span-elsewhere",
                    row,
                    "span",
                    null,
                    "span " + Names.of(view, span) + " does not join " + Names.structure(view, before.structure())
                            + " to " + Names.structure(view, row.structure()) + "; name one that does"
                            + offer(view, before, row)));
        }
    }

    private static String offer(RecordsView view, RunRow before, RunRow row) {
        List<Span> spans = between(view, before.structure(), row.structure());
        return spans.isEmpty() ? "" : ": " + Names.list(spans.stream().map(Span::code));
    }

    private static RunRow withSpan(RecordsView view, RunRow before, RunRow row, List<Refusal> refusals) {
        List<Span> spans = between(view, before.structure(), row.structure());
        if (spans.size() == 1) {
            return new RunRow(
                    row.id(),
                    row.cable(),
                    row.seq(),
                    row.structure(),
                    spans.get(0).id(),
                    row.slack(),
                    row.slackTrust(),
                    row.slackOn(),
                    row.duct());
        }
        String pair = Names.structure(view, before.structure()) + " and " + Names.structure(view, row.structure());
        refusals.add(refusal(
                "run-span-blank",
                row,
                "span",
                null,
                spans.isEmpty()
                        ? "no span joins " + pair + "; enter one, or name the structures that the cable passes between"
                        : Names.list(spans.stream().map(Span::code)) + " join " + pair
                                + "; name the one that the cable travels"));
        return row;
    }

    /** The spans that join two structures (or one to itself), as entered. */
    static List<Span> between(RecordsView view, int one, int other) {
        return view.spans()
                .owned(Relation.STRUCTURE_SPANS, one)
                .filter(span -> joins(span, one, other))
                .toList();
    }

    private static boolean joins(Span span, int one, int other) {
        return (span.from() == one && span.to() == other) || (span.from() == other && span.to() == one);
    }

    private static Refusal refusal(String code, RunRow row, String column, @Nullable RunRow earlier, String sentence) {
        return new Refusal(code, sentence, column, row, earlier);
    }
}
