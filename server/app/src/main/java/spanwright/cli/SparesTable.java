package spanwright.cli;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import spanwright.answers.SparesReply;
import spanwright.planning.SpareOption;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;

/** Options of spare fibers for a person, 100 columns wide at most, lengths in the unit that people read first. */
final class SparesTable {

    private static final int WIDTH = 100;
    private static final String ROW = "%-6s  %6s  %7s  %7s  %10s  %12s  %8s  %s%n";

    private final PrintWriter out;
    private final SparesReply reply;
    private final SparesReply.Asked asked;
    private final LengthUnit unit;

    SparesTable(PrintWriter out, SparesReply reply, SparesReply.Asked asked) {
        this.out = out;
        this.reply = reply;
        this.asked = asked;
        this.unit = reply.view().unit();
    }

    void print() {
        String wish = asked.fibers() + (asked.fibers() == 1 ? " spare fiber" : " spare fibers") + " from "
                + asked.from() + " to " + asked.to();
        if (reply.options().isEmpty()) {
            out.println("No " + wish + (asked.sameTube() ? " in one tube" : "")
                    + (asked.avoid() == null ? "" : " clear of " + asked.avoid()) + ".");
        } else {
            out.println(wish + ":");
            out.println();
            out.printf(
                    Locale.ROOT,
                    ROW,
                    "option",
                    "opened",
                    "splices",
                    "jumpers",
                    "unverified",
                    "glass, " + unit.symbol(),
                    "loss, dB",
                    "one tube");
            for (int index = 0; index < reply.options().size(); index++) {
                row(index + 1, reply.options().get(index));
            }
        }
        out.println();
        Output.wrapped(
                out,
                "As of posting " + reply.view().posting()
                        + ". Losses expected at 1550 nm, connectors at the two ends apart. Spare by the records:"
                        + " treat every fiber as live until proven dark.",
                "",
                WIDTH);
    }

    private void row(int number, SpareOption option) {
        out.printf(
                Locale.ROOT,
                ROW,
                number,
                option.opened().size(),
                option.cost().splices(),
                option.jumpers(),
                option.cost().unverified(),
                length(option.glass()),
                option.loss() == null
                        ? "unknown"
                        : String.format(Locale.ROOT, "%.2f", option.loss().decibels()),
                option.sameTube() ? "yes" : "no");
        Output.wrapped(out, fibers(option), "        ", WIDTH);
        if (!option.opened().isEmpty()) {
            Output.wrapped(out, "Open " + String.join(", ", reply.opened(option)) + ".", "        ", WIDTH);
        }
    }

    /** The fibers cable by cable: {@code FDR-S-1:229-232, FDR-S-2:229-232}. */
    private String fibers(SpareOption option) {
        Map<String, Set<Integer>> ofCable = new LinkedHashMap<>();
        option.runs().stream()
                .map(reply::glass)
                .forEach(glass -> glass.forEach(fiber -> {
                    int colon = fiber.lastIndexOf(':');
                    ofCable.computeIfAbsent(fiber.substring(0, colon), key -> new TreeSet<>())
                            .add(Integer.valueOf(fiber.substring(colon + 1)));
                }));
        List<String> parts = new ArrayList<>();
        ofCable.forEach((cable, fibers) -> parts.add(cable + ":" + ranges(List.copyOf(fibers))));
        return String.join(", ", parts) + ".";
    }

    private static String ranges(List<Integer> fibers) {
        List<String> ranges = new ArrayList<>();
        int first = fibers.get(0);
        int last = first;
        for (int fiber : fibers) {
            if (fiber > last + 1) {
                ranges.add(range(first, last));
                first = fiber;
            }
            last = fiber;
        }
        ranges.add(range(first, last));
        return String.join("+", ranges);
    }

    private static String range(int first, int last) {
        return first == last ? "" + first : first + "-" + last;
    }

    private String length(Length length) {
        return String.format(Locale.ROOT, unit == LengthUnit.FOOT ? "%,.0f" : "%,.1f", length.in(unit));
    }
}
