package spanwright.http;

import io.javalin.http.Context;
import java.time.LocalDate;
import spanwright.answers.Json;
import spanwright.answers.TemporaryDocument;
import spanwright.answers.View;
import spanwright.incident.IncidentDesk;

/** Temporary joints. What it answers changes with the day, so it is never answered from an earlier answer. */
final class TemporaryRoute {

    private final Answering answering;
    private final IncidentDesk desk;

    TemporaryRoute(Answering answering, IncidentDesk desk) {
        this.answering = answering;
        this.desk = desk;
    }

    void list(Context ctx) {
        View view = answering.view(new Question(ctx, Answering.AS_OF, Answering.AS_IF));
        LocalDate today = LocalDate.ofInstant(desk.now(), view.zone());
        Answering.json(ctx, Json.bytes(new TemporaryDocument(view, answering.changes(view), today)::write));
    }
}
