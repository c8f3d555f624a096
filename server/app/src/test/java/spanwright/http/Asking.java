package spanwright.http;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;

/** Asks a server over real HTTP. */
final class Asking {

    private static final HttpClient CLIENT =
            HttpClient.newBuilder().version(HttpClient.Version.HTTP_1_1).build();

    private final URI base;

    Asking(URI base) {
        this.base = base;
    }

    HttpResponse<byte[]> get(String path, String... headers) {
        HttpRequest.Builder request = HttpRequest.newBuilder(base.resolve(path));
        return send(headers.length == 0 ? request : request.headers(headers));
    }

    HttpResponse<byte[]> post(String path, String body, String... headers) {
        HttpRequest.Builder request =
                HttpRequest.newBuilder(base.resolve(path)).POST(HttpRequest.BodyPublishers.ofString(body));
        return send(headers.length == 0 ? request : request.headers(headers));
    }

    HttpResponse<byte[]> method(String method, String path) {
        return send(HttpRequest.newBuilder(base.resolve(path)).method(method, HttpRequest.BodyPublishers.noBody()));
    }

    private static HttpResponse<byte[]> send(HttpRequest.Builder request) {
        try {
            return CLIENT.send(request.build(), HttpResponse.BodyHandlers.ofByteArray());
        } catch (IOException failed) {
            throw new UncheckedIOException(failed);
        } catch (InterruptedException stopped) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(stopped);
        }
    }
}
