package spanwright.http;

import io.javalin.http.Context;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;

/** The body of a request that sends JSON. */
final class SentBody {

    private SentBody() {}

    /**
     * The bytes of a body.
     *
     * @param what what is sent, as a sentence begins: {@code A posting}
     * @param advice what to do where it is too long
     */
    static byte[] read(Context ctx, int largest, String what, String advice) {
        if (!isJson(ctx.contentType())) {
            throw new ProblemException(Problem.unsupported(what + " is sent as application/json."));
        }
        try (InputStream in = ctx.req().getInputStream()) {
            byte[] body = in.readNBytes(largest + 1);
            if (body.length > largest) {
                throw new ProblemException(
                        Problem.tooLarge(what + " is " + largest + " bytes long at most; " + advice + "."));
            }
            return body;
        } catch (IOException broken) {
            throw new ProblemException(Problem.badRequest("The body ended before its end.", null));
        }
    }

    private static boolean isJson(@Nullable String type) {
        return type != null
                && List.of(type.toLowerCase(Locale.ROOT).split(";"))
                        .get(0)
                        .strip()
                        .equals("application/json");
    }
}
