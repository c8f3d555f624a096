package spanwright.http;

import io.javalin.http.Context;
import spanwright.answers.AlarmReferences;
import spanwright.answers.Json;
import spanwright.answers.SuspectsDocument;
import spanwright.answers.View;
import spanwright.suspicion.Suspects;

/** Which spans and enclosures explain alarms. It is asked by a body, which may be long, and changes nothing. */
final class SuspectsRoute {

    private static final int LARGEST_BODY = 16 << 20;

    private final Answering answering;
    private final Guard guard;

    SuspectsRoute(Answering answering, Guard guard) {
        this.answering = answering;
        this.guard = guard;
    }

    void suspects(Context ctx) {
        guard.checkPosting(ctx);
        Question question = new Question(ctx, Answering.AS_OF, Answering.AS_IF);
        AlarmsBody body = AlarmsBody.read(
                SentBody.read(ctx, LARGEST_BODY, "A list of alarms", "leave out circuits far from the outage"));
        View view = answering.view(question);
        Suspects suspects = Suspects.of(
                view.snapshot(),
                AlarmReferences.read(answering.views(), view, body.down(), body.up(), body.byPath(), body.opened()));
        Answering.json(ctx, Json.bytes(new SuspectsDocument(view, suspects)::write));
    }
}
