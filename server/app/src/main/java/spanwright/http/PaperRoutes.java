package spanwright.http;

import io.javalin.http.Context;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.answers.CutReferences;
import spanwright.answers.FaultReply;
import spanwright.answers.View;
import spanwright.answers.Views;
import spanwright.fault.FaultPlace;
import spanwright.incident.Incident;
import spanwright.incident.IncidentDesk;
import spanwright.outage.Cut;
import spanwright.outage.Impact;
import spanwright.paper.CrewPaper;
import spanwright.paper.CrewPlace;
import spanwright.paper.CutListPaper;
import spanwright.paper.PaperSize;
import spanwright.paper.PdfPrinter;
import spanwright.paper.PlaceWords;
import spanwright.paper.Stamp;
import spanwright.quantity.LengthUnit;

/** Paper for those who go out, as HTML to print and as PDF. */
final class PaperRoutes {

    private static final int MOST_CUTS = 200;
    private static final int LARGEST_ID = 999_999_999;
    private static final String CUT = "cut";
    private static final String INCIDENT = "incident";
    private static final String PAPER = "paper";
    private static final String PLACE = "place";
    private static final String PDF = ".pdf";

    private final Views views;
    private final IncidentDesk desk;

    PaperRoutes(Api api) {
        this.views = api.views();
        this.desk = api.incidents();
    }

    void cutList(Context ctx) {
        Question question = new Question(ctx, CUT, INCIDENT, PAPER, Answering.AS_OF, Answering.AS_IF);
        Incident incident = incident(question).orElse(null);
        List<String> cuts = cuts(question, incident);
        View view = view(question, incident);
        Impact impact = Impact.of(view.snapshot(), new CutReferences(view.records()).list(cuts));
        String place = (incident == null ? "" : "Incident " + incident.id() + ": " + incident.title() + ". ")
                + new PlaceWords(view).cuts(cuts);
        CutListPaper paper = new CutListPaper(view, impact);
        answer(ctx, paper.html(place, stamp(view), size(question, view), asPdf(ctx)));
    }

    void crew(Context ctx) {
        List<String> known = new ArrayList<>(FaultRoute.PARAMETERS);
        known.addAll(List.of(CUT, PLACE, PAPER));
        Question question = new Question(ctx, known.toArray(String[]::new));
        View view = views.of(question.text(Answering.AS_OF), question.text(Answering.AS_IF));
        CrewPaper paper = new CrewPaper(view, place(question, view));
        answer(ctx, paper.html(stamp(view), size(question, view), asPdf(ctx)));
    }

    /** The place of a reading, or one along a cable that is written as a cut at it is. */
    private static CrewPlace place(Question question, View view) {
        String written = question.text(CUT);
        if (written == null) {
            List<FaultPlace> places =
                    FaultReply.of(view, FaultRoute.asked(question)).found().places();
            return CrewPlace.of(places.get(question.whole(PLACE, 1, places.size(), 1) - 1));
        }
        if (new CutReferences(view.records()).list(List.of(written)).get(0) instanceof Cut.AtPlace at) {
            return CrewPlace.of(view, view.records().cables().get(at.cable()), at.position());
        }
        throw Question.wrong(CUT, "The crew's page is of one place along a cable, such as cut=place:F-1@1352.2.");
    }

    private static List<String> cuts(Question question, @Nullable Incident incident) {
        List<String> named = question.texts(CUT);
        List<String> cuts =
                named.isEmpty() && incident != null ? incident.start().cuts() : named;
        if (cuts.isEmpty() || cuts.size() > MOST_CUTS) {
            throw Question.wrong(
                    CUT,
                    incident == null || !named.isEmpty()
                            ? "Name what is cut, 1 to " + MOST_CUTS + " things, such as cut=span:S-1."
                            : "Incident " + incident.id()
                                    + " was opened without anything taken as cut; name it, such as" + " cut=span:S-1.");
        }
        return cuts;
    }

    private Optional<Incident> incident(Question question) {
        try {
            return question.findWhole(INCIDENT, 1, LARGEST_ID)
                    .map(id -> desk.log(id).incident());
        } catch (NoSuchElementException none) {
            throw new ProblemException(Problem.notFound(String.valueOf(none.getMessage())));
        }
    }

    /** The view asked for; an incident's own frozen one where none is. */
    private View view(Question question, @Nullable Incident incident) {
        String asOf = question.text(Answering.AS_OF);
        String frozen = incident == null ? null : Integer.toString(incident.posting());
        return views.of(asOf == null ? frozen : asOf, question.text(Answering.AS_IF));
    }

    private Stamp stamp(View view) {
        return Stamp.of(views, view, desk.now());
    }

    private static PaperSize size(Question question, View view) {
        String word = question.text(PAPER);
        if (word == null) {
            return view.unit() == LengthUnit.FOOT ? PaperSize.LETTER : PaperSize.A4;
        }
        return PaperSize.find(word)
                .orElseThrow(() -> Question.wrong(
                        PAPER, PAPER + " is " + String.join(" or ", PaperSize.words()) + ", not '" + word + "'."));
    }

    /** The address of the same paper as PDF. */
    private static String asPdf(Context ctx) {
        String query = ctx.queryParamMap().entrySet().stream()
                .flatMap(entry -> entry.getValue().stream()
                        .map(value -> entry.getKey() + "=" + URLEncoder.encode(value, StandardCharsets.UTF_8)))
                .collect(Collectors.joining("&"));
        return ctx.path() + PDF + "?" + query;
    }

    private static void answer(Context ctx, String html) {
        // It says when it was printed, so it is never taken from a store.
        ctx.header("Cache-Control", "no-store");
        if (ctx.path().endsWith(PDF)) {
            ctx.contentType("application/pdf").result(PdfPrinter.print(html));
        } else {
            ctx.contentType("text/html; charset=utf-8").result(html);
        }
    }
}
