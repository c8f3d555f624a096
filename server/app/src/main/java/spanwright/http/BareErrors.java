package spanwright.http;

import java.nio.ByteBuffer;
import java.util.List;
import org.eclipse.jetty.http.HttpHeader;
import org.eclipse.jetty.server.Request;
import org.eclipse.jetty.server.Response;
import org.eclipse.jetty.server.handler.ErrorHandler;
import org.eclipse.jetty.util.Callback;

/** What a request hears that is too broken to be routed: a problem document, with nothing of how the program is made. */
final class BareErrors extends ErrorHandler {

    @Override
    public boolean handle(Request request, Response response, Callback callback) {
        int status = response.getStatus() >= 400 ? response.getStatus() : 400;
        response.setStatus(status);
        response.getHeaders().put(HttpHeader.CONTENT_TYPE, Problem.CONTENT_TYPE);
        response.write(true, body(status), callback);
        return true;
    }

    private static ByteBuffer body(int status) {
        Problem problem = status >= 500
                ? new Problem(status, "Internal error", "internal", "The program failed.", null, List.of())
                : new Problem(status, "Bad request", "bad_request", "The request cannot be read.", null, List.of());
        return ByteBuffer.wrap(problem.bytes("/"));
    }
}
