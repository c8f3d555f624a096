package spanwright.http;

import io.javalin.http.Context;
import spanwright.answers.Json;
import spanwright.answers.RepairDocument;
import spanwright.repair.RepairDesk;

/** A piece let into a cut cable: tried, or posted as one. */
final class RepairRoute {

    private final RepairDesk desk;
    private final Guard guard;
    private final int largestBody;

    RepairRoute(Api api, Guard guard, int largestBody) {
        this.desk = new RepairDesk(api.views().ledger());
        this.guard = guard;
        this.largestBody = largestBody;
    }

    void post(Context ctx) {
        guard.checkPosting(ctx);
        boolean asked = new Question(ctx, "preview").yes("preview");
        RepairBody body = RepairBody.read(ctx, largestBody);
        if (asked || body.preview()) {
            RepairDocument document =
                    new RepairDocument(ProblemException.unlessRefused(desk.preview(body.order())), null);
            Answering.json(ctx, Json.bytes(document::write));
            return;
        }
        RepairDesk.Posted posted = ProblemException.unlessRefused(desk.post(body.by(), body.reason(), body.order()));
        ctx.status(201).header("Location", "/postings/" + posted.posting());
        Answering.json(ctx, Json.bytes(new RepairDocument(posted.made(), posted.posting())::write));
    }
}
