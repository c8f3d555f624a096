package spanwright.cli;

import java.io.PrintWriter;
import java.util.List;
import java.util.Locale;
import spanwright.answers.View;
import spanwright.plant.Enclosure;
import spanwright.plant.Span;
import spanwright.quantity.LengthUnit;
import spanwright.suspicion.Suspect;
import spanwright.suspicion.Suspects;

/** What explains alarms, as a table for a person, 100 columns wide at most. */
final class SuspectsTable {

    private static final int WIDTH = 100;
    private static final int ROWS = 15;
    private static final int WHAT = 48;
    private static final String ROW = "%3s  %8s %8s %8s %10s  %s%n";

    private final PrintWriter out;
    private final View view;
    private final LengthUnit unit;

    SuspectsTable(PrintWriter out, View view) {
        this.out = out;
        this.view = view;
        this.unit = view.unit();
    }

    void print(Suspects suspects) {
        if (suspects.list().isEmpty()) {
            out.println("The records know no path of these circuits.");
        } else {
            out.printf(Locale.ROOT, ROW, "", "score", "explains", "against", "route " + unit.symbol(), "suspect");
            for (int index = 0; index < Math.min(ROWS, suspects.list().size()); index++) {
                row(index + 1, suspects.list().get(index));
            }
            out.println();
        }
        if (suspects.together().size() > 1) {
            List<String> numbers = suspects.together().stream()
                    .map(index -> Integer.toString(index + 1))
                    .toList();
            Output.wrapped(out, "Several causes explain most: " + String.join(" and ", numbers) + ".", "", WIDTH);
        }
        out.println(suspects.total() + " suspects in all. As of posting " + view.posting()
                + ". These follow from the records; the glass decides.");
    }

    private void row(int number, Suspect suspect) {
        out.printf(
                Locale.ROOT,
                ROW,
                number,
                String.format(Locale.ROOT, "%.1f", suspect.score()),
                suspect.explains().size(),
                suspect.contradicts().size(),
                String.format(Locale.ROOT, "%,.0f", suspect.route().in(unit)),
                Output.cut(describe(suspect), WHAT));
    }

    private static String describe(Suspect suspect) {
        return switch (suspect.kind()) {
            case CROSSED -> "crossed at " + codes(suspect.enclosures()) + ": " + String.join(" with ", suspect.tubes());
            case END -> "behind " + String.join(", ", suspect.ports());
            case CUT -> suspect.tubes().isEmpty() ? sheath(suspect) : "tube " + String.join(", ", suspect.tubes());
        };
    }

    private static String sheath(Suspect suspect) {
        Span span = suspect.span();
        if (span == null) {
            return codes(suspect.enclosures());
        }
        int more = suspect.spans().size() - 1 + suspect.enclosures().size();
        return span.code() + (more == 0 ? "" : " and " + more + " more");
    }

    private static String codes(List<Enclosure> enclosures) {
        return String.join(", ", enclosures.stream().map(Enclosure::code).toList());
    }
}
