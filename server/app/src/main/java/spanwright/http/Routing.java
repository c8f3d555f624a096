package spanwright.http;

import io.javalin.http.Context;
import io.javalin.http.Handler;
import io.javalin.router.JavalinDefaultRoutingApi;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.function.UnaryOperator;
import spanwright.answers.Json;

/** Every route of {@code schema/openapi.json}, in its order. */
final class Routing {

    private final JavalinDefaultRoutingApi routes;
    private final UnaryOperator<Handler> timed;

    Routing(JavalinDefaultRoutingApi routes, UnaryOperator<Handler> timed) {
        this.routes = routes;
        this.timed = timed;
    }

    void add(Api api, Guard guard, Answering answering, ServerOptions options) {
        plant(new PlantRoutes(api, answering, options.tile()));
        questions(api, guard, answering);
        postings(new JournalRoutes(api, answering, guard, options.largestBody()));
        incidents(new IncidentRoutes(api, guard, options.largestBody()));
        routes.post("/repairs", new RepairRoute(api, guard, options.largestBody())::post);
        drafts(new DraftRoutes(api, guard, options.largestBody()));
        get("/temporary", new TemporaryRoute(answering, api.incidents())::list);
        papers(new PaperRoutes(api));
        get("/openapi.json", Routing::openApi);
        get("/health", ctx -> {
            new Question(ctx);
            Answering.json(ctx, Json.bytes(json -> json.text("status", "ok")));
        });
    }

    private void plant(PlantRoutes plant) {
        get("/status", plant::status);
        get("/find", plant::find);
        get("/map/plant", plant::mapPlant);
        get("/map/base", plant::mapBase);
        get("/structures/{code}", plant::structure);
        get("/spans/{code}", plant::span);
        get("/enclosures/{code}", plant::enclosure);
        get("/cables/{code}", plant::cable);
        get("/circuits", plant::circuits);
        get("/circuits/{code}", plant::circuit);
    }

    private void questions(Api api, Guard guard, Answering answering) {
        get("/trace", new TraceRoute(answering)::trace);
        get("/fault", new FaultRoute(answering)::fault);
        get("/spares", new SparesRoute(answering)::spares);
        routes.post("/suspects", timed.apply(new SuspectsRoute(answering, guard)::suspects));
        get("/impact", new ImpactRoute(answering)::impact);
        routes.post("/light", timed.apply(new LightRoute(answering, api.rows(), guard)::light));
    }

    private void postings(JournalRoutes journal) {
        get("/postings", journal::list);
        // A posting is never stopped half way: who sent it would not know whether it was kept.
        routes.post("/postings", journal::post);
        get("/postings/{id}", journal::one);
        routes.post("/postings/{id}/undo", journal::undo);
    }

    private void incidents(IncidentRoutes incidents) {
        get("/incidents", incidents::list);
        routes.post("/incidents", incidents::open);
        get("/incidents/{id}", incidents::one);
        routes.post("/incidents/{id}/entries", incidents::write);
        routes.post("/incidents/{id}/close", incidents::close);
    }

    private void papers(PaperRoutes paper) {
        get("/paper/cut-list", paper::cutList);
        get("/paper/cut-list.pdf", paper::cutList);
        get("/paper/crew", paper::crew);
        get("/paper/crew.pdf", paper::crew);
    }

    private void drafts(DraftRoutes drafts) {
        get("/drafts", drafts::list);
        routes.post("/drafts", drafts::begin);
        get("/drafts/{id}", drafts::one);
        routes.post("/drafts/{id}/save", drafts::save);
        routes.post("/drafts/{id}/undo", drafts::undo);
        routes.post("/drafts/{id}/redo", drafts::redo);
        routes.post("/drafts/{id}/check", timed.apply(drafts::check));
        routes.post("/drafts/{id}/paste", timed.apply(drafts::paste));
        routes.post("/drafts/{id}/submit", drafts::submit);
        routes.post("/drafts/{id}/withdraw", drafts::withdraw);
        routes.post("/drafts/{id}/drop", drafts::drop);
        routes.post("/drafts/{id}/post", drafts::post);
    }

    private void get(String path, Handler handler) {
        routes.get(path, timed.apply(handler));
    }

    private static void openApi(Context ctx) {
        new Question(ctx);
        try (InputStream in = Routing.class.getResourceAsStream("/schema/openapi.json")) {
            if (in == null) {
                throw new IllegalStateException("the program was packed without its interface");
            }
            Answering.json(ctx, in.readAllBytes());
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }
}
