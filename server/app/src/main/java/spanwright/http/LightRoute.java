package spanwright.http;

import io.javalin.http.Context;
import spanwright.answers.Json;
import spanwright.answers.LightDocument;
import spanwright.answers.LightNames;
import spanwright.answers.RowTexts;
import spanwright.answers.TraceQuestion;
import spanwright.answers.View;
import spanwright.temporary.LightAnswer;
import spanwright.temporary.LightQuestion;
import spanwright.temporary.TemporaryPaths;

/** Temporary paths for what is down. It changes nothing. */
final class LightRoute {

    private static final int LARGEST_BODY = 1 << 20;

    private final Answering answering;
    private final RowTexts rows;
    private final Guard guard;

    LightRoute(Answering answering, RowTexts rows, Guard guard) {
        this.answering = answering;
        this.rows = rows;
        this.guard = guard;
    }

    void light(Context ctx) {
        guard.checkPosting(ctx);
        Question question = new Question(ctx, Answering.AS_OF, Answering.AS_IF);
        LightBody body = LightBody.read(
                SentBody.read(ctx, LARGEST_BODY, "A question for light", "leave out circuits far from the outage"));
        View view = answering.view(question);
        LightQuestion asked = new LightNames(view)
                .question(
                        body.down(),
                        body.cuts(),
                        body.avoid(),
                        body.fromPanels(),
                        body.verifiedOnly(),
                        TraceQuestion.margin(body.margin()),
                        body.offers());
        LightAnswer answer = TemporaryPaths.find(view.snapshot(), asked, LightNames::goOn);
        Answering.json(ctx, Json.bytes(json -> new LightDocument(view, rows, body.until()).write(json, answer)));
    }
}
