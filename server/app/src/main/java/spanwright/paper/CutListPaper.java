package spanwright.paper;

import java.util.List;
import spanwright.answers.Unanswerable;
import spanwright.answers.View;
import spanwright.outage.HitCircuit;
import spanwright.outage.Impact;

/**
 * The cut list on paper: first what is to be restored in its order, then every fiber of each cut sheath tube by tube, with
 * what it is joined to on both sides and boxes to tick.
 */
public final class CutListPaper {

    /** Rows of a page: fibers, or circuits in the order to restore. */
    public static final int ROWS = 24;

    private static final int MOST_PAGES = 150;
    private static final double CIRCUIT_MM = 66;
    private static final double CUT_AT_MM = 60;
    private static final double TUBE_MM = 18;
    private static final double COLOR_MM = 22;
    private static final double SIDE_MM = 33;

    private final View view;
    private final Impact impact;
    private final List<RestoreOrder.Row> restored;
    private final List<CutSheath> sheaths;

    /**
     * Of what a cut takes down.
     *
     * @throws Unanswerable where that fills more pages than anyone carries
     */
    public CutListPaper(View view, Impact impact) {
        this.view = view;
        this.impact = impact;
        this.restored = RestoreOrder.of(impact);
        int pages = impact.sections().stream()
                .mapToInt(cut -> pages(cut.fibers().size()))
                .sum();
        if (pages > MOST_PAGES) {
            throw new Unanswerable(
                    Unanswerable.Kind.BAD_REQUEST,
                    "That is a cut list of " + pages + " pages, and one has " + MOST_PAGES
                            + " at most; name a span or a place, such as cut=place:F-1@1352.2.",
                    "cut");
        }
        this.sheaths = CutSheath.of(view, impact);
    }

    private static int pages(int rows) {
        return (rows + ROWS - 1) / ROWS;
    }

    /** The rows of the order to restore. */
    public List<RestoreOrder.Row> restored() {
        return restored;
    }

    /** The cut sheaths. */
    public List<CutSheath> sheaths() {
        return sheaths;
    }

    /**
     * The document.
     *
     * @param place what is cut, in words
     * @param self the address of this paper as PDF, or empty
     */
    public String html(String place, Stamp stamp, PaperSize size, String self) {
        Sheets sheets = new Sheets("Cut list", place, stamp, size);
        int pages = Math.max(1, pages(restored.size()));
        for (int page = 0; page < pages; page++) {
            int from = page * ROWS;
            List<RestoreOrder.Row> rows = restored.subList(from, Math.min(restored.size(), from + ROWS));
            sheets.add("In the order to restore", html -> order(html, rows, from));
        }
        for (CutSheath sheath : sheaths) {
            String heading =
                    sheath.cable() + " (" + sheath.type() + "), cut between " + sheath.near() + " and " + sheath.far();
            for (int from = 0; from < sheath.fibers().size(); from += ROWS) {
                List<CutSheath.Fiber> rows =
                        sheath.fibers().subList(from, Math.min(sheath.fibers().size(), from + ROWS));
                sheets.add(heading, html -> fibers(html, sheath, rows));
            }
        }
        return sheets.document(self);
    }

    private void order(Html html, List<RestoreOrder.Row> rows, int from) {
        long down = impact.circuits().stream().filter(HitCircuit::down).count();
        html.element(
                "p",
                impact.customersDown() + " customers down; " + down + " circuits down, "
                        + (impact.circuits().size() - down) + " left single (they work, unprotected); "
                        + impact.fibersCut() + " fibers cut.",
                "class",
                "sum");
        if (rows.isEmpty()) {
            html.element("p", "No working circuit is hit, by the records.");
            return;
        }
        html.open("table", "class", "rows order");
        columns(html, "no", "pr", "state", "circuit", "customers", "cut-at", "tick");
        html.open("thead").open("tr");
        heads(html, "no", "No.", "pr", "Pr.", "state", "State", "circuit", "Circuit", "customers", "Customers");
        heads(html, "cut-at", "Cut at", "tick", "light");
        html.close().close().open("tbody");
        for (int index = 0; index < rows.size(); index++) {
            row(html, rows.get(index), from + index + 1);
        }
        html.close().close();
    }

    private void row(Html html, RestoreOrder.Row row, int number) {
        HitCircuit first = row.first();
        html.open("tr");
        html.element("td", Integer.toString(number), "class", "no");
        html.element("td", Integer.toString(first.circuit().priority()), "class", "pr");
        html.open("td", "class", "state")
                .element("strong", first.single() ? "SINGLE" : "DOWN")
                .close();
        Sheets.cell(
                html,
                "circuit",
                CIRCUIT_MM,
                row.codes(),
                row.circuits().size() == 1 ? said(first) : "cut at the same fibers");
        html.element("td", Long.toString(row.customers()), "class", "customers");
        CutAtWords at = new CutAtWords(view, first.at());
        Sheets.cell(html, "cut-at", CUT_AT_MM, at.fibers(), at.colors());
        tick(html);
        html.close();
    }

    private static String said(HitCircuit hit) {
        String service = hit.circuit().service();
        String customer = hit.circuit().customer();
        if (service == null || customer == null) {
            return service == null ? customer == null ? "" : customer : service;
        }
        return service + ", " + customer;
    }

    private static void heads(Html html, String... kindsAndWords) {
        for (int index = 0; index < kindsAndWords.length; index += 2) {
            html.element("th", kindsAndWords[index + 1], "class", kindsAndWords[index], "scope", "col");
        }
    }

    /** Widths of columns, which the style sheet knows by their kinds. */
    private static void columns(Html html, String... kinds) {
        html.open("colgroup");
        for (String kind : kinds) {
            html.empty("col", "class", kind);
        }
        html.close();
    }

    private static void tick(Html html) {
        html.open("td", "class", "tick").element("span", "", "class", "box").close();
    }

    private static void fibers(Html html, CutSheath sheath, List<CutSheath.Fiber> rows) {
        html.open("table", "class", "rows fibers");
        columns(html, "tube", "fiber", "color", "joined", "tick", "tick", "carries", "pr", "joined", "tick", "tick");
        html.open("thead").open("tr");
        html.element("td", "", "colspan", "3");
        side(html, "Near side: to " + sheath.near());
        html.element("td", "", "colspan", "2");
        side(html, "Far side: to " + sheath.far());
        html.close().open("tr");
        heads(html, "tube", "Tube", "fiber", "Fiber", "color", "Color");
        heads(html, "joined", "joined to", "tick", "joined", "tick", "tested");
        heads(html, "carries", "Carries", "pr", "Pr.");
        heads(html, "joined", "joined to", "tick", "joined", "tick", "tested");
        html.close().close().open("tbody");
        for (int index = 0; index < rows.size(); index++) {
            fiber(html, rows, index);
        }
        html.close().close();
    }

    private static void side(Html html, String words) {
        html.open("th", "class", "side", "colspan", "3", "scope", "colgroup");
        Sheets.set(html, Sheets.lines(words, SIDE_MM + 14, 7.5, 1));
        html.close();
    }

    private static void fiber(Html html, List<CutSheath.Fiber> rows, int index) {
        CutSheath.Fiber fiber = rows.get(index);
        boolean begins = index == 0 || rows.get(index - 1).tube() != fiber.tube();
        html.open("tr", "class", begins ? "begins" : "goes-on");
        if (begins) {
            Sheets.cell(html, "tube", TUBE_MM, Integer.toString(fiber.tube()), fiber.tubeColor());
        } else {
            Sheets.cell(html, "tube again", TUBE_MM, "", fiber.tubeColor());
        }
        html.open("td", "class", "fiber")
                .element("strong", Integer.toString(fiber.number()))
                .close();
        Sheets.cell(html, "color", COLOR_MM, "", fiber.color());
        joined(html, fiber.near());
        String state = UseWords.of(fiber.state());
        if (fiber.carries().isEmpty()) {
            Sheets.cell(
                    html, "carries", SIDE_MM, "", fiber.beneath().isEmpty() ? state : state + ": " + fiber.beneath());
        } else {
            Sheets.cell(html, "carries", SIDE_MM, fiber.carriesInWords(), state + ", " + fiber.beneath());
        }
        html.element("td", fiber.priority() == null ? "" : fiber.priority().toString(), "class", "pr");
        joined(html, fiber.far());
        html.close();
    }

    private static void joined(Html html, JoinedWords.Joined joined) {
        Sheets.cell(html, "joined", SIDE_MM, joined.to(), joined.beneath());
        tick(html);
        tick(html);
    }
}
