package spanwright.http;

import io.javalin.http.Context;
import java.time.DateTimeException;
import java.time.Instant;
import java.time.OffsetDateTime;
import java.util.List;
import java.util.NoSuchElementException;
import org.jspecify.annotations.Nullable;
import spanwright.answers.CutReferences;
import spanwright.answers.IncidentDocuments;
import spanwright.answers.Json;
import spanwright.answers.View;
import spanwright.answers.Views;
import spanwright.incident.EntryDraft;
import spanwright.incident.EntryKind;
import spanwright.incident.Incident;
import spanwright.incident.IncidentDesk;
import spanwright.incident.IncidentDraft;
import spanwright.incident.IncidentLog;
import spanwright.incident.IncidentStart;
import spanwright.outage.HitCircuit;
import spanwright.outage.Impact;

/** Incidents: what there is, and the ways to open, follow and close one. */
final class IncidentRoutes {

    private static final int LARGEST_ID = 999_999_999;
    private static final int LONGEST_TEXT = 2_000;
    private static final int MOST_CIRCUITS = 10_000;
    private static final int MOST_CUTS = 100;

    private final Views views;
    private final IncidentDesk desk;
    private final IncidentDocuments documents;
    private final Guard guard;
    private final int largestBody;

    IncidentRoutes(Api api, Guard guard, int largestBody) {
        this.views = api.views();
        this.desk = api.incidents();
        this.documents = new IncidentDocuments(views, desk);
        this.guard = guard;
        this.largestBody = largestBody;
    }

    void list(Context ctx) {
        new Question(ctx);
        Answering.json(ctx, Json.bytes(documents::list));
    }

    void one(Context ctx) {
        Question question = new Question(ctx, "at");
        IncidentLog log = log(question);
        Instant at = at(question.text("at"));
        if (at.isBefore(log.incident().beganAt())) {
            throw Question.wrong("at", "The incident had not begun by then.");
        }
        Answering.json(ctx, Json.bytes(json -> documents.one(json, log, at)));
    }

    private IncidentLog log(Question question) {
        try {
            return desk.log(question.wholeStep("id", 1, LARGEST_ID));
        } catch (NoSuchElementException none) {
            throw new ProblemException(Problem.notFound(String.valueOf(none.getMessage())));
        }
    }

    private Instant at(@Nullable String text) {
        try {
            return text == null ? desk.now() : OffsetDateTime.parse(text).toInstant();
        } catch (DateTimeException notATime) {
            throw Question.wrong("at", "at is a time with its offset, such as 2026-03-31T14:05-05:00.");
        }
    }

    void open(Context ctx) {
        guard.checkPosting(ctx);
        new Question(ctx);
        Sent sent = Sent.read(ctx, largestBody, "title", "by", "began_at", "cuts", "down", "up", "reading");
        List<String> cuts = sent.codes("cuts", MOST_CUTS);
        IncidentStart start = new IncidentStart(
                cuts,
                down(cuts, sent.codes("down", MOST_CIRCUITS)),
                sent.codes("up", MOST_CIRCUITS),
                sent.findText("reading", LONGEST_TEXT));
        IncidentDraft draft = new IncidentDraft(
                sent.text("title", PostingBody.LONGEST_NAME),
                sent.text("by", PostingBody.LONGEST_NAME),
                sent.time("began_at"),
                start);
        Incident incident = ProblemException.unlessRefused(desk.open(draft));
        answerKept(ctx, incident.id());
    }

    /** The circuits that are down: those named, else those that what is believed cut takes down by the records. */
    private List<String> down(List<String> cuts, List<String> named) {
        if (cuts.isEmpty() || !named.isEmpty()) {
            return named;
        }
        View now = views.now();
        return Impact.of(now.snapshot(), new CutReferences(now.records()).list(cuts)).circuits().stream()
                .filter(HitCircuit::down)
                .map(hit -> hit.circuit().code())
                .toList();
    }

    void write(Context ctx) {
        guard.checkPosting(ctx);
        int id = log(new Question(ctx)).incident().id();
        Sent sent = Sent.read(ctx, largestBody, "kind", "at", "by", "text", "circuits", "users", "oc3", "corrects");
        EntryKind kind = EntryKind.find(sent.text("kind", PostingBody.LONGEST_NAME))
                .orElseThrow(() -> Sent.bad("kind is one of " + String.join(", ", EntryKind.words()) + "."));
        ProblemException.unlessRefused(desk.write(
                id,
                new EntryDraft(
                        kind,
                        sent.time("at"),
                        sent.text("by", PostingBody.LONGEST_NAME),
                        sent.findText("text", LONGEST_TEXT),
                        sent.codes("circuits", MOST_CIRCUITS),
                        sent.findWhole("users", 0, LARGEST_ID),
                        sent.findNumber("oc3"),
                        sent.findWhole("corrects", 1, LARGEST_ID))));
        answerKept(ctx, id);
    }

    void close(Context ctx) {
        guard.checkPosting(ctx);
        int id = log(new Question(ctx)).incident().id();
        Sent sent = Sent.read(ctx, largestBody, "at", "by", "text");
        EntryDraft closed = EntryDraft.of(EntryKind.CLOSED, sent.time("at"), sent.text("by", PostingBody.LONGEST_NAME));
        String text = sent.findText("text", LONGEST_TEXT);
        ProblemException.unlessRefused(desk.write(id, text == null ? closed : closed.saying(text)));
        answerKept(ctx, id);
    }

    private void answerKept(Context ctx, int id) {
        ctx.status(201).header("Location", "/incidents/" + id);
        Answering.json(ctx, Json.bytes(json -> documents.one(json, desk.log(id), desk.now())));
    }
}
