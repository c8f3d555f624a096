package spanwright.http;

import io.javalin.http.Context;
import java.net.URI;
import org.jspecify.annotations.Nullable;

/** What every answer tells the browser not to do. */
final class SafeHeaders {

    private final String policy;

    /**
     * The headers.
     *
     * @param inlineScripts sources of the inline scripts of the start page, each with a space before it
     * @param tile tiles that the operator named, or null
     */
    SafeHeaders(String inlineScripts, ServerOptions.@Nullable Tile tile) {
        this.policy = String.join(
                "; ",
                "default-src 'none'",
                "script-src 'self'" + inlineScripts,
                "style-src 'self'",
                "img-src 'self' data:" + (tile == null ? "" : " " + origin(tile.url())),
                "font-src 'self'",
                "connect-src 'self'",
                "base-uri 'none'",
                "form-action 'none'",
                "frame-ancestors 'none'");
    }

    /** The origin of a tile address, in which {s} may stand for one of several servers. */
    private static String origin(String url) {
        URI address = URI.create(url.replace("{s}", "any").replaceAll("[{}]", ""));
        String port = address.getPort() < 0 ? "" : ":" + address.getPort();
        String host = String.valueOf(address.getHost());
        return address.getScheme() + "://" + (host.startsWith("any.") ? "*" + host.substring(3) : host) + port;
    }

    void write(Context ctx) {
        ctx.header("Content-Security-Policy", policy);
        ctx.header("X-Content-Type-Options", "nosniff");
        ctx.header("X-Frame-Options", "DENY");
        ctx.header("Referrer-Policy", "no-referrer");
        ctx.header("Cross-Origin-Opener-Policy", "same-origin");
        ctx.header("Cross-Origin-Resource-Policy", "same-origin");
        ctx.header("Permissions-Policy", "geolocation=(self), camera=(), microphone=()");
        ctx.header("Vary", "Accept-Encoding");
    }
}
