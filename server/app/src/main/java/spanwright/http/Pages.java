package spanwright.http;

import io.javalin.http.Context;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;
import java.util.HexFormat;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** The pages and their libraries, out of the jar: each file read once, then kept with its ETag. */
final class Pages {

    private static final Map<String, String> TYPES = Map.of(
            "html", "text/html; charset=utf-8",
            "css", "text/css; charset=utf-8",
            "js", "text/javascript; charset=utf-8",
            "json", "application/json",
            "svg", "image/svg+xml",
            "png", "image/png",
            "ico", "image/x-icon",
            "woff2", "font/woff2",
            "txt", "text/plain; charset=utf-8");

    /** No empty, hidden or upward step; a file with an ending that is served. */
    private static final Pattern SERVED = Pattern.compile("(/[A-Za-z0-9_@-][A-Za-z0-9_@.-]*)+\\.([a-z0-9]+)");

    private static final Pattern INLINE_SCRIPT =
            Pattern.compile("<script(?![^>]*\\ssrc=)[^>]*>(.*?)</script>", Pattern.DOTALL);
    private static final String START = "/index.html";
    private static final String LIBRARIES = "/webjars/";

    private final Map<String, Optional<Page>> pages = new ConcurrentHashMap<>();

    /** Answers with a page; false where there is none of that path. */
    boolean answer(Context ctx, String path) {
        String file = path.equals("/") ? START : path;
        Matcher served = SERVED.matcher(file);
        if (!served.matches() || !TYPES.containsKey(served.group(2))) {
            return false;
        }
        // Only what is in the jar is kept, so asking for ever new names does not fill the memory.
        Optional<Page> page = pages.getOrDefault(file, Optional.empty()).or(() -> read(file));
        page.ifPresent(found -> found.answer(ctx, file.startsWith(LIBRARIES)));
        return page.isPresent();
    }

    private Optional<Page> read(String file) {
        String resource = file.startsWith(LIBRARIES) ? "/META-INF/resources" + file : "/web" + file;
        try (InputStream in = Pages.class.getResourceAsStream(resource)) {
            if (in == null) {
                return Optional.empty();
            }
            byte[] bytes = in.readAllBytes();
            String type = TYPES.get(file.substring(file.lastIndexOf('.') + 1));
            Optional<Page> page = Optional.of(new Page(bytes, String.valueOf(type)));
            pages.put(file, page);
            return page;
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    /** The sources of inline scripts that the start page may run: the SHA-256 of each, as a policy writes it. */
    String inlineScripts() {
        return read(START)
                .map(page -> inlineScripts(new String(page.bytes, StandardCharsets.UTF_8)))
                .orElse("");
    }

    static String inlineScripts(String html) {
        return INLINE_SCRIPT
                .matcher(html)
                .results()
                .map(script -> sha256(script.group(1).getBytes(StandardCharsets.UTF_8)))
                .map(hash -> " 'sha256-" + Base64.getEncoder().encodeToString(hash) + "'")
                .collect(Collectors.joining());
    }

    /** A weak ETag by content: the same whether the bytes travel packed or not. */
    static String tag(byte[] bytes) {
        return "W/\"" + HexFormat.of().formatHex(sha256(bytes), 0, 12) + "\"";
    }

    private static byte[] sha256(byte[] bytes) {
        try {
            return MessageDigest.getInstance("SHA-256").digest(bytes);
        } catch (NoSuchAlgorithmException never) {
            throw new IllegalStateException("every Java has SHA-256", never);
        }
    }

    /** One file. */
    private static final class Page {

        private final byte[] bytes;
        private final String type;
        private final String tag;

        Page(byte[] bytes, String type) {
            this.bytes = bytes;
            this.type = type;
            this.tag = tag(bytes);
        }

        void answer(Context ctx, boolean library) {
            // A library's address holds its version, so what stands there never changes.
            ctx.header("Cache-Control", library ? "public, max-age=31536000, immutable" : "no-cache");
            if (Revalidation.unchanged(ctx, tag)) {
                return;
            }
            ctx.contentType(type).result(bytes);
        }
    }
}
