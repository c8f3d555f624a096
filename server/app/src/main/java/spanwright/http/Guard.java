package spanwright.http;

import io.javalin.http.Context;
import java.net.InetAddress;
import java.net.URI;
import java.net.UnknownHostException;
import java.util.Locale;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * Who may ask what. A page of another site must not read or post through the browser of the person at this machine:
 * neither by a name that it points here (so a loopback server answers to loopback names only), nor by a request
 * across sites (so a posting's Origin must be this server). Nobody posts from another machine.
 */
final class Guard {

    private static final Set<String> LOOPBACK_NAMES = Set.of("localhost", "127.0.0.1", "[::1]");

    private final boolean loopbackOnly;

    Guard(String host) {
        this.loopbackOnly = isLoopback(host);
    }

    /** Whether an address to listen at is reached from this machine alone. */
    static boolean isLoopback(String host) {
        try {
            return InetAddress.getByName(host).isLoopbackAddress();
        } catch (UnknownHostException unknown) {
            return false;
        }
    }

    /** Refuses a request that reached this server by a name which is not its own. */
    void checkAny(Context ctx) {
        if (loopbackOnly && !isLoopbackName(ctx.header("Host"))) {
            throw new ProblemException(Problem.forbidden(
                    "This server answers on this machine only; ask it as http://localhost or http://127.0.0.1."));
        }
    }

    /** Refuses a posting that does not come from this machine, or that another site's page sends. */
    void checkPosting(Context ctx) {
        if (!isLoopback(ctx.req().getRemoteAddr()) || !isLoopbackName(ctx.header("Host"))) {
            throw new ProblemException(
                    Problem.forbidden("Postings are taken from this machine only, at http://localhost or 127.0.0.1."));
        }
        String site = ctx.header("Sec-Fetch-Site");
        boolean otherSite = site != null && !site.equals("same-origin") && !site.equals("none");
        if (otherSite || !isOwnOrigin(ctx.header("Origin"), ctx.header("Host"))) {
            throw new ProblemException(Problem.forbidden("Postings are taken from this server's own pages only."));
        }
    }

    private static boolean isOwnOrigin(@Nullable String origin, @Nullable String host) {
        return origin == null || origin.equalsIgnoreCase("http://" + host);
    }

    private static boolean isLoopbackName(@Nullable String host) {
        if (host == null) {
            return false;
        }
        try {
            String name = URI.create("http://" + host).getHost();
            return name != null && LOOPBACK_NAMES.contains(name.toLowerCase(Locale.ROOT));
        } catch (IllegalArgumentException notAHost) {
            return false;
        }
    }
}
