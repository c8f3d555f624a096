package spanwright.http;

import java.time.Duration;
import org.jspecify.annotations.Nullable;

/**
 * How the server listens, and its bounds.
 *
 * @param host the address to listen at
 * @param port the port, 0 for any that is free
 * @param threads most requests answered at once, 4 or above
 * @param waiting most requests that wait for a thread
 * @param timeLimit longest that one answer may take
 * @param largestBody most bytes of a posting
 * @param tile tile address that the operator named, or null
 */
public record ServerOptions(
        String host,
        int port,
        int threads,
        int waiting,
        Duration timeLimit,
        int largestBody,
        @Nullable Tile tile) {

    /** Refuses bounds of nothing. */
    public ServerOptions {
        if (port < 0 || port > 65_535 || threads < 4 || waiting < 1 || largestBody < 1 || timeLimit.isNegative()) {
            throw new IllegalArgumentException("not a server: port " + port + ", threads " + threads);
        }
    }

    /** The bounds that hold where nobody says otherwise. */
    public static ServerOptions at(String host, int port) {
        int threads = Math.max(16, 8 * Runtime.getRuntime().availableProcessors());
        return new ServerOptions(host, port, threads, 256, Duration.ofSeconds(30), 32 << 20, null);
    }

    /** The same with tiles from elsewhere; they tell their operator where the plant is. */
    public ServerOptions withTile(Tile named) {
        return new ServerOptions(host, port, threads, waiting, timeLimit, largestBody, named);
    }

    /** The same with another limit of time. */
    public ServerOptions withTimeLimit(Duration limit) {
        return new ServerOptions(host, port, threads, waiting, limit, largestBody, tile);
    }

    /** The same with another bound of bodies. */
    public ServerOptions withLargestBody(int bytes) {
        return new ServerOptions(host, port, threads, waiting, timeLimit, bytes, tile);
    }

    /**
     * Raster tiles that the operator named.
     *
     * @param url their address with {z}, {x}, {y}
     * @param attribution whose they are
     */
    public record Tile(String url, String attribution) {}
}
