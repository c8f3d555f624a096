package spanwright.paper;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;

/** A paper of several pages, each with the same head and foot. */
final class Sheets {

    /** The standing line of every printed sheet. */
    static final String STANDING =
            "Positions are records, not a locate. Call before you dig. Treat every fiber as live until proven dark."
                    + " Follow local codes and licensed practice.";

    private static final double POINTS_PER_MM = 72 / 25.4;
    private static final double PLACE_MM = 118;
    private static final double STAMP_MM = 68;
    private static final double TITLE_POINTS = 9;
    private static final double PLACE_POINTS = 13;
    private static final double SMALL_POINTS = 7.5;

    private final String title;
    private final String place;
    private final Stamp stamp;
    private final PaperSize size;
    private final List<Page> pages = new ArrayList<>();

    /**
     * A paper without pages.
     *
     * @param title what paper it is
     * @param place what it is of: on every page
     */
    Sheets(String title, String place, Stamp stamp, PaperSize size) {
        this.title = title;
        this.place = place;
        this.stamp = stamp;
        this.size = size;
    }

    /**
     * Adds a page.
     *
     * @param heading what this page is of
     * @param body writes it
     */
    void add(String heading, Consumer<Html> body) {
        pages.add(new Page(heading, body));
    }

    /**
     * The document.
     *
     * @param self the address of this paper as PDF, or empty
     */
    String document(String self) {
        Html html = new Html();
        html.open("html", "lang", "en").open("head");
        html.empty("meta", "charset", "utf-8").element("title", title + ": " + place);
        html.empty("meta", "name", "description", "content", title + " of " + place);
        html.empty("meta", "name", "viewport", "content", "width=device-width, initial-scale=1");
        html.empty("link", "rel", "icon", "type", "image/svg+xml", "href", "/mark.svg");
        html.empty("link", "rel", "stylesheet", "type", "text/css", "href", "/style/paper.css");
        html.empty("link", "rel", "stylesheet", "type", "text/css", "href", "/style/paper-" + size.word() + ".css");
        html.close().open("body", "class", "paper");
        if (!self.isEmpty()) {
            html.open("nav", "class", "not-printed", "aria-label", "This paper");
            html.element("a", "PDF, " + size.title(), "href", self).text(" or print this page at 100 %, ");
            html.text(size.title() + ", without a head and foot of the browser's own.")
                    .close();
        }
        html.open("main");
        for (int index = 0; index < pages.size(); index++) {
            page(html, pages.get(index), index);
        }
        return html.close().close().close().document();
    }

    private void page(Html html, Page page, int index) {
        String number = "page " + (index + 1) + " of " + pages.size();
        html.open("section", "class", "sheet", "aria-label", number);
        head(html, number, index == 0);
        html.element("h2", page.heading, "class", "part");
        page.body.accept(html);
        html.open("div", "class", "foot").element("p", STANDING).close();
        html.close();
    }

    private void head(Html html, String number, boolean first) {
        html.open("div", "class", "head").open("div", "class", "head-left");
        line(html, "p", "title", stamp.owner().isEmpty() ? title : title + ", " + stamp.owner(), TITLE_POINTS, 1);
        line(html, first ? "h1" : "p", "place", place, PLACE_POINTS, 2);
        html.close().open("div", "class", "head-right");
        html.element("p", number, "class", "number");
        for (String each : List.of(stamp.records(), stamp.printed())) {
            html.open("p", "class", "stamp");
            set(html, Typeface.REGULAR.lines(each, STAMP_MM * POINTS_PER_MM, SMALL_POINTS, 2));
            html.close();
        }
        html.close().close();
    }

    private static void line(Html html, String tag, String kind, String text, double points, int most) {
        html.open(tag, "class", kind);
        set(html, Typeface.BOLD.lines(text, PLACE_MM * POINTS_PER_MM, points, most));
        html.close();
    }

    /** Writes lines that were set already. */
    static void set(Html html, List<String> lines) {
        for (String each : lines) {
            html.element("span", each, "class", "line");
        }
    }

    /**
     * A cell of a table with one strong line, and beneath it lines that are not.
     *
     * @param width of the cell, in mm, its padding included
     * @param strong bold; where there is nothing beneath, it may take all lines
     * @param beneath in regular weight, or empty
     */
    static void cell(Html html, String kind, double width, String strong, String beneath) {
        double room = (width - 2.4) * POINTS_PER_MM;
        html.open("td", "class", kind).open("strong");
        set(html, Typeface.BOLD.lines(strong, room, 8, beneath.isEmpty() ? 2 : 1));
        html.close();
        set(html, Typeface.REGULAR.lines(beneath, room, SMALL_POINTS, strong.isEmpty() ? 2 : 1));
        html.close();
    }

    /** Lines of regular text within a width in mm. */
    static List<String> lines(String text, double width, double points, int most) {
        return Typeface.REGULAR.lines(text, width * POINTS_PER_MM, points, most);
    }

    /** A page: its heading and what writes its body. */
    private record Page(String heading, Consumer<Html> body) {}
}
