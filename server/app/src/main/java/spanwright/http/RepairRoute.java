package spanwright.http;

import io.javalin.http.Context;
import java.util.List;
import spanwright.answers.Json;
import spanwright.answers.RepairDocument;
import spanwright.outage.RepairDesk;
import spanwright.outage.Written;
import spanwright.records.Refusal;

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
            RepairDocument document = new RepairDocument(kept(desk.preview(body.order())), null);
            Answering.json(ctx, Json.bytes(document::write));
            return;
        }
        RepairDesk.Posted posted = kept(desk.post(body.by(), body.reason(), body.order()));
        ctx.status(201).header("Location", "/postings/" + posted.posting());
        Answering.json(ctx, Json.bytes(new RepairDocument(posted.made(), posted.posting())::write));
    }

    private static <T> T kept(Written<T> written) {
        if (written instanceof Written.Refused<T> refused) {
            List<Refusal> refusals = refused.refusals();
            throw new ProblemException(Problem.refused(refusals.stream()
                    .map(refusal -> new Problem.Fault(0, refusal.column(), refusal.sentence()))
                    .toList()));
        }
        return ((Written.Kept<T>) written).kept();
    }
}
