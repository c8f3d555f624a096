package spanwright.http;

import io.javalin.http.Context;
import io.javalin.http.Handler;
import io.javalin.router.JavalinDefaultRoutingApi;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import spanwright.answers.Json;

/** Every route of {@code schema/openapi.json}, in its order. */
final class Routing {

    private static final String JSON = "application/json";

    private final JavalinDefaultRoutingApi routes;
    private final Guard guard;
    private final UnaryOperator<Handler> timed;

    Routing(JavalinDefaultRoutingApi routes, Guard guard, UnaryOperator<Handler> timed) {
        this.routes = routes;
        this.guard = guard;
        this.timed = timed;
    }

    void add(Api api) {
        routes.get("/openapi.json", Routing::openApi);
        routes.get("/health", ctx -> json(ctx, json -> json.text("status", "ok")));
    }

    /** Answers with a JSON document. */
    static void json(Context ctx, Consumer<Json> body) {
        ctx.contentType(JSON).result(Json.bytes(body));
    }

    private static void openApi(Context ctx) {
        new Question(ctx);
        try (InputStream in = Routing.class.getResourceAsStream("/schema/openapi.json")) {
            if (in == null) {
                throw new IllegalStateException("the program was packed without its interface");
            }
            ctx.header("Cache-Control", "no-cache").contentType(JSON).result(in.readAllBytes());
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }
}
