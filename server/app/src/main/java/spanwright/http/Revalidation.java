package spanwright.http;

import io.javalin.http.Context;
import java.util.Arrays;

/** Tells callers that what they hold is still right (RFC 9110, 13.1.2: If-None-Match, compared weakly). */
final class Revalidation {

    private Revalidation() {}

    /** Names the answer's ETag; true where the caller holds it already, and then 304 is the answer. */
    static boolean unchanged(Context ctx, String tag) {
        ctx.header("ETag", tag);
        String held = ctx.header("If-None-Match");
        boolean same = held != null
                && Arrays.stream(held.split(","))
                        .map(String::strip)
                        .anyMatch(each -> each.equals("*") || weak(each).equals(weak(tag)));
        if (same) {
            ctx.status(304);
        }
        return same;
    }

    private static String weak(String tag) {
        return tag.startsWith("W/") ? tag.substring(2) : tag;
    }
}
