package spanwright.http;

import io.javalin.http.Context;
import java.io.IOException;
import java.io.InputStream;
import spanwright.answers.Json;
import spanwright.answers.LightDocument;
import spanwright.answers.LightNames;
import spanwright.answers.RowTexts;
import spanwright.answers.TraceQuestion;
import spanwright.answers.View;
import spanwright.outage.LightAnswer;
import spanwright.outage.LightQuestion;
import spanwright.outage.TemporaryPaths;

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
        LightBody body = LightBody.read(body(ctx));
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
        LightAnswer answer = TemporaryPaths.find(view.snapshot(), asked);
        Answering.json(ctx, Json.bytes(json -> new LightDocument(view, rows, body.until()).write(json, answer)));
    }

    private static byte[] body(Context ctx) {
        try (InputStream in = ctx.req().getInputStream()) {
            byte[] body = in.readNBytes(LARGEST_BODY + 1);
            if (body.length > LARGEST_BODY) {
                throw new ProblemException(Problem.tooLarge("A question is " + LARGEST_BODY + " bytes long at most."));
            }
            return body;
        } catch (IOException broken) {
            throw new ProblemException(Problem.badRequest("The body ended before its end.", null));
        }
    }
}
