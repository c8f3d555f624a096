package spanwright.http;

import io.javalin.http.Context;
import java.security.SecureRandom;
import java.util.HexFormat;
import java.util.function.BiConsumer;
import spanwright.answers.Changes;
import spanwright.answers.Json;
import spanwright.answers.View;
import spanwright.answers.Views;

/** Answers from the view that a request asks for, and tells a caller who holds that answer already so. */
final class Answering {

    /** Parameters of every answer that reads the records. */
    static final String AS_OF = "as_of";

    static final String AS_IF = "as_if";
    private static final String JSON = "application/json";
    private static final int START_BYTES = 6;

    private final Views views;
    private final Changes.Finder finder;
    /** This run of the program, so that an answer of another file or version is never taken for ours. */
    private final String run;

    Answering(Views views, Changes.Finder finder) {
        this.views = views;
        this.finder = finder;
        byte[] random = new byte[START_BYTES];
        new SecureRandom().nextBytes(random);
        this.run = HexFormat.of().formatHex(random);
    }

    /** The view that a question asks for. */
    View view(Question question) {
        return views.of(question.text(AS_OF), question.text(AS_IF));
    }

    /** The views. */
    Views views() {
        return views;
    }

    /** By which postings the records of a view were changed. */
    Changes changes(View view) {
        return new Changes(view, finder);
    }

    /**
     * Answers with a document of a view. An address and the last posting that its view takes in determine the answer,
     * so the ETag is that posting.
     */
    void answer(Context ctx, View view, BiConsumer<Json, View> body) {
        if (!Revalidation.unchanged(ctx, "W/\"" + run + "-" + view.posting() + "\"")) {
            json(ctx, Json.bytes(json -> body.accept(json, view)));
        } else {
            ctx.header("Cache-Control", "private, no-cache");
        }
    }

    /** Answers with a JSON document. */
    static void json(Context ctx, byte[] document) {
        ctx.header("Cache-Control", "private, no-cache").contentType(JSON).result(document);
    }
}
