package spanwright.http;

import io.javalin.http.Context;
import spanwright.answers.Json;
import spanwright.answers.PostingDocuments;
import spanwright.answers.View;
import spanwright.http.PostingDesk.Result;
import spanwright.journal.Posting;

/** Postings: what was posted, the one way to post, and the way to take a posting back. */
final class JournalRoutes {

    private static final int MOST_POSTINGS = 200;
    private static final int MOST_CHANGES = 1_000;
    private static final int FIRST_CHANGES = 200;
    private static final int LARGEST_NUMBER = 999_999_999;
    private static final int LARGEST_UNDO = 1 << 16;

    private final Answering answering;
    private final PostingDocuments documents;
    private final PostingDesk desk;
    private final Guard guard;
    private final int largestBody;

    JournalRoutes(Api api, Answering answering, Guard guard, int largestBody) {
        this.answering = answering;
        this.documents = new PostingDocuments(api.views(), api.rows());
        this.desk = api.desk();
        this.guard = guard;
        this.largestBody = largestBody;
    }

    void list(Context ctx) {
        Question question = new Question(ctx, "limit", "before", Answering.AS_OF);
        int limit = question.whole("limit", 1, MOST_POSTINGS, 50);
        View view = answering.views().of(question.text(Answering.AS_OF), null);
        int before = question.whole("before", 1, LARGEST_NUMBER, LARGEST_NUMBER);
        answering.answer(ctx, view, (json, of) -> documents.list(json, Math.min(before, of.posting() + 1), limit));
    }

    void one(Context ctx) {
        Question question = new Question(ctx, "from_change", "limit");
        int number = question.wholeStep("id", 1, LARGEST_NUMBER);
        int from = question.whole("from_change", 0, LARGEST_NUMBER, 0);
        int limit = question.whole("limit", 1, MOST_CHANGES, FIRST_CHANGES);
        Posting posting = find(number);
        Answering.json(ctx, Json.bytes(json -> documents.one(json, posting, from, limit)));
    }

    private Posting find(int number) {
        return answering
                .views()
                .ledger()
                .findPosting(number)
                .orElseThrow(() -> new ProblemException(Problem.notFound("There is no posting " + number + ".")));
    }

    void post(Context ctx) {
        guard.checkPosting(ctx);
        new Question(ctx);
        PostingBody body = PostingBody.read(SentBody.read(ctx, largestBody, "A posting", "post it in parts"));
        answer(ctx, desk.post(body.by(), body.reason(), body.unchangedSince(), body.changes()));
    }

    /** Takes a posting back by another. */
    void undo(Context ctx) {
        guard.checkPosting(ctx);
        int number = new Question(ctx).wholeStep("id", 1, LARGEST_NUMBER);
        Sent sent = Sent.read(ctx, LARGEST_UNDO, "by", "reason");
        find(number);
        answer(
                ctx,
                desk.takeBack(
                        number,
                        sent.text("by", PostingBody.LONGEST_NAME),
                        sent.text("reason", PostingBody.LONGEST_REASON)));
    }

    private void answer(Context ctx, Result result) {
        if (result instanceof Result.Refused refused) {
            throw new ProblemException(Problem.refused(refused.faults().stream()
                    .map(fault -> new Problem.Fault(fault.change(), fault.column(), fault.text()))
                    .toList()));
        }
        Posting posting = ((Result.Posted) result).posting();
        ctx.status(201).header("Location", "/postings/" + posting.number());
        Answering.json(ctx, Json.bytes(json -> documents.one(json, posting, 0, FIRST_CHANGES)));
    }
}
