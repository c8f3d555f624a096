package spanwright.http;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.util.List;
import java.util.NoSuchElementException;
import org.jspecify.annotations.Nullable;
import spanwright.answers.DraftDocument;
import spanwright.answers.Json;
import spanwright.answers.View;
import spanwright.answers.Views;
import spanwright.draft.Draft;
import spanwright.draft.DraftDesk;
import spanwright.draft.DraftOutcome;
import spanwright.draft.DraftState;
import spanwright.draft.DraftStep;
import spanwright.draft.SheetCheck;
import spanwright.plant.Enclosure;
import spanwright.records.Refusal;
import spanwright.sheet.PastedBlock;

/** Drafts of splice sheets: begun, kept at every change, checked, submitted, posted. */
final class DraftRoutes {

    private static final int LARGEST_ID = 999_999_999;
    private static final int LONGEST_REASON = 2_000;
    private static final String REVISION = "revision";

    private final Views views;
    private final DraftDesk desk;
    private final Guard guard;
    private final int largestBody;

    DraftRoutes(Api api, Guard guard, int largestBody) {
        this.views = api.views();
        this.desk = api.drafts();
        this.guard = guard;
        this.largestBody = largestBody;
    }

    private DraftDocument document() {
        return new DraftDocument(views.now());
    }

    void list(Context ctx) {
        Question question = new Question(ctx, "enclosure", "state");
        String code = question.text("enclosure");
        Integer enclosure =
                code == null ? null : (Integer) enclosure(code, "enclosure").id();
        DraftState state = state(question.text("state"));
        List<Draft> drafts = desk.list().stream()
                .filter(draft -> enclosure == null || draft.enclosure() == enclosure)
                .filter(draft -> state == null || draft.state() == state)
                .toList();
        Answering.json(ctx, Json.bytes(json -> json.list("drafts", drafts, document()::head)));
    }

    private static @Nullable DraftState state(@Nullable String word) {
        return word == null
                ? null
                : DraftState.find(word)
                        .orElseThrow(() -> Question.wrong("state", "state is writing, submitted, posted or dropped."));
    }

    private Enclosure enclosure(String code, @Nullable String parameter) {
        return views.now()
                .records()
                .enclosures()
                .find(code)
                .orElseThrow(() -> new ProblemException(new Problem(
                        404,
                        "Not found",
                        "bad_reference",
                        "There is no enclosure " + code + ".",
                        parameter,
                        List.of())));
    }

    void begin(Context ctx) {
        guard.checkPosting(ctx);
        new Question(ctx);
        Sent sent = Sent.read(ctx, largestBody, "enclosure", "author", "lines", "header", "cursor", "answers");
        Enclosure enclosure = enclosure(sent.code("enclosure"), null);
        String author = sent.text("author", PostingBody.LONGEST_NAME);
        Draft draft = kept(desk.begin(enclosure.id(), author, DraftBody.read(sent)), null);
        ctx.status(201).header("Location", "/drafts/" + draft.id());
        answer(ctx, draft);
    }

    void one(Context ctx) {
        answer(ctx, draft(new Question(ctx)));
    }

    private Draft draft(Question question) {
        try {
            return desk.get(question.wholeStep("id", 1, LARGEST_ID));
        } catch (NoSuchElementException none) {
            throw new ProblemException(Problem.notFound(String.valueOf(none.getMessage())));
        }
    }

    private void answer(Context ctx, Draft draft) {
        DraftDocument document = document();
        Answering.json(ctx, Json.bytes(json -> document.one(json, draft, desk.beside(draft))));
    }

    void save(Context ctx) {
        guard.checkPosting(ctx);
        int id = draft(new Question(ctx)).id();
        Sent sent = Sent.read(ctx, largestBody, REVISION, "base", "lines", "header", "cursor", "answers");
        Draft before = desk.get(id);
        Integer seen = sent.findWhole("base", 0, views.now().posting());
        DraftStep step = new DraftStep.Save(DraftBody.read(sent), seen == null ? before.base() : seen);
        answer(ctx, kept(desk.change(id, revision(sent), step), sent));
    }

    private static int revision(Sent sent) {
        Integer revision = sent.findWhole(REVISION, 1, LARGEST_ID);
        if (revision == null) {
            throw Sent.bad("revision is the revision of the draft upon which the change was made.");
        }
        return revision;
    }

    void undo(Context ctx) {
        step(ctx, new DraftStep.Undo());
    }

    void redo(Context ctx) {
        step(ctx, new DraftStep.Redo());
    }

    void withdraw(Context ctx) {
        step(ctx, new DraftStep.Withdraw());
    }

    void drop(Context ctx) {
        step(ctx, new DraftStep.Drop());
    }

    private void step(Context ctx, DraftStep step) {
        guard.checkPosting(ctx);
        int id = draft(new Question(ctx)).id();
        Sent sent = Sent.read(ctx, largestBody, REVISION);
        answer(ctx, kept(desk.change(id, revision(sent), step), null));
    }

    void submit(Context ctx) {
        guard.checkPosting(ctx);
        int id = draft(new Question(ctx)).id();
        Sent sent = Sent.read(ctx, largestBody, REVISION, "by");
        answer(ctx, kept(desk.submit(id, revision(sent), sent.text("by", PostingBody.LONGEST_NAME)), null));
    }

    void check(Context ctx) {
        guard.checkPosting(ctx);
        Draft draft = draft(new Question(ctx));
        Sent.read(ctx, largestBody);
        SheetCheck check = desk.check(draft)
                .orElseThrow(() -> new ProblemException(
                        Problem.notFound("The enclosure of draft " + draft.id() + " is gone from the records.")));
        DraftDocument document = document();
        Answering.json(ctx, Json.bytes(json -> document.check(json, draft, check)));
    }

    void paste(Context ctx) {
        guard.checkPosting(ctx);
        Draft draft = draft(new Question(ctx));
        JsonNode text = Sent.read(ctx, largestBody, "text").member("text");
        if (!text.isTextual() || text.asText().isBlank()) {
            throw Sent.bad("text is the block of cells: rows parted by line breaks, cells by tabs, else by commas.");
        }
        View now = views.now();
        PastedBlock block = PastedBlock.read(now.records(), draft.enclosure(), text.asText());
        Answering.json(ctx, Json.bytes(json -> DraftDocument.pasted(json, block)));
    }

    void post(Context ctx) {
        guard.checkPosting(ctx);
        int id = draft(new Question(ctx)).id();
        Sent sent = Sent.read(ctx, largestBody, REVISION, "by", "reason");
        DraftOutcome outcome = desk.post(
                id, revision(sent), sent.text("by", PostingBody.LONGEST_NAME), sent.text("reason", LONGEST_REASON));
        Draft draft = kept(outcome, null);
        ctx.status(201).header("Location", "/postings/" + draft.posting());
        answer(ctx, draft);
    }

    /** What was kept; else the problem that says why nothing was. */
    private Draft kept(DraftOutcome outcome, @Nullable Sent yours) {
        if (outcome instanceof DraftOutcome.Kept kept) {
            return kept.draft();
        }
        if (outcome instanceof DraftOutcome.Refused refused) {
            List<Refusal> refusals = refused.refusals();
            throw new ProblemException(Problem.refused(refusals.stream()
                    .map(refusal -> new Problem.Fault(0, refusal.column(), refusal.sentence()))
                    .toList()));
        }
        if (outcome instanceof DraftOutcome.Stale stale) {
            Draft now = stale.now();
            DraftDocument document = document();
            throw new ProblemException(Problem.conflict(
                            "stale_revision",
                            "Draft " + now.id() + " is at revision " + now.revision()
                                    + " by now, so nothing of this was kept. Both are here: take over what is yours.")
                    .with(json -> {
                        json.object("theirs", item -> document.one(item, now, desk.beside(now)));
                        json.texts(
                                "yours",
                                yours == null
                                        ? List.of()
                                        : DraftBody.read(yours).lines());
                    }));
        }
        DraftOutcome.Conflicting conflicting = (DraftOutcome.Conflicting) outcome;
        throw new ProblemException(Problem.conflict(
                        "plant_changed",
                        "The plant was changed since posting "
                                + conflicting.draft().base()
                                + " where this sheet speaks of it, so nothing was posted. Withdraw it, look at the"
                                + " tubes, and save it with the base that you have seen.")
                .with(json -> json.list("conflicts", conflicting.tubes(), DraftDocument::conflict)));
    }
}
