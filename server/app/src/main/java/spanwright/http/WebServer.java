package spanwright.http;

import io.javalin.Javalin;
import io.javalin.compression.CompressionStrategy;
import io.javalin.compression.Gzip;
import io.javalin.config.JavalinConfig;
import io.javalin.http.Context;
import io.javalin.http.Handler;
import io.javalin.http.HttpResponseException;
import io.javalin.util.JavalinBindException;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.net.URI;
import java.time.Duration;
import org.eclipse.jetty.server.HttpConfiguration;
import org.eclipse.jetty.server.HttpConnectionFactory;
import org.eclipse.jetty.server.NetworkConnectionLimit;
import org.eclipse.jetty.server.Server;
import org.eclipse.jetty.server.ServerConnector;
import org.eclipse.jetty.util.thread.QueuedThreadPool;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import spanwright.answers.Unanswerable;

/** The running server. Close it to stop it. */
public final class WebServer implements AutoCloseable {

    private static final Logger LOG = LoggerFactory.getLogger("spanwright.http");
    private static final Duration IDLE = Duration.ofSeconds(60);
    private static final int SMALLEST_GZIPPED = 1024;
    private static final String NO_SUCH_PATH = "Nothing is at this address; /openapi.json lists what there is.";

    private final ServerOptions options;
    private final Guard guard;
    private final Watch watch;
    private final Pages pages = new Pages();
    private final SafeHeaders headers;
    private final Javalin javalin;

    private WebServer(ServerOptions options, Api api) {
        Answering answering = new Answering(api.views(), api.finder());
        this.options = options;
        this.guard = new Guard(options.host());
        this.watch = new Watch(options.timeLimit());
        this.headers = new SafeHeaders(pages.inlineScripts(), options.tile());
        this.javalin = Javalin.create(config -> configure(config, api, answering));
    }

    /** Puts a server together that does not listen yet. */
    public static WebServer prepare(ServerOptions options, Api api) {
        return new WebServer(options, api);
    }

    /**
     * Starts to listen.
     *
     * @throws CannotListenException where the address or the port cannot be had; the server is then closed
     */
    public WebServer listen() {
        try {
            javalin.start();
            return this;
        } catch (JavalinBindException taken) {
            close();
            throw new CannotListenException(options.host(), options.port());
        }
    }

    /** Whether only this machine reaches an address to listen at. */
    public static boolean isLoopback(String host) {
        return Guard.isLoopback(host);
    }

    /** Where the start page is. */
    public URI address() {
        String host = options.host().contains(":") ? "[" + options.host() + "]" : options.host();
        return URI.create("http://" + host + ":" + javalin.port() + "/");
    }

    @Override
    public void close() {
        javalin.stop();
        watch.close();
    }

    private void configure(JavalinConfig config, Api api, Answering answering) {
        config.startup.showJavalinBanner = false;
        config.startup.showOldJavalinVersionWarning = false;
        config.startup.startupWatcherEnabled = false;
        config.http.prefer405over404 = true;
        config.http.maxRequestSize = options.largestBody();
        CompressionStrategy gzip = new CompressionStrategy(null, new Gzip(1));
        gzip.setDefaultMinSizeForCompression(SMALLEST_GZIPPED);
        config.http.compressionStrategy = gzip;
        config.jetty.threadPool = threads();
        config.jetty.addConnector(this::connector);
        config.jetty.modifyServer(server -> server.setErrorHandler(new BareErrors()));
        config.requestLogger.http(WebServer::log);
        config.routes.before(ctx -> {
            headers.write(ctx);
            guard.checkAny(ctx);
        });
        new Routing(config.routes, this::timed).add(api, guard, answering, options);
        config.routes.get("/", this::page);
        config.routes.get("/<path>", this::page);
        config.router.javaLangErrorHandler(WebServer::answerError);
        answerProblems(config);
    }

    private Handler timed(Handler handler) {
        return ctx -> {
            watch.begin();
            try {
                handler.handle(ctx);
            } finally {
                watch.end();
            }
        };
    }

    private void page(Context ctx) {
        if (!pages.answer(ctx, ctx.path())) {
            throw new ProblemException(Problem.notFound(NO_SUCH_PATH));
        }
    }

    private static void answerProblems(JavalinConfig config) {
        config.routes.exception(ProblemException.class, (problem, ctx) -> answer(ctx, problem.problem()));
        config.routes.exception(Unanswerable.class, (question, ctx) -> answer(ctx, Problem.of(question)));
        config.routes.exception(HttpResponseException.class, (failure, ctx) -> answer(ctx, problemOf(failure)));
        config.routes.exception(Exception.class, (bug, ctx) -> {
            LOG.error("failed path={}", ctx.path(), bug);
            answer(ctx, Problem.internal());
        });
    }

    /** Out of memory, a class that cannot be loaded: there may be little left to answer with. */
    private static void answerError(HttpServletResponse response, Error error) {
        LOG.error("failed", error);
        try {
            response.setStatus(500);
            response.setContentType(Problem.CONTENT_TYPE);
            response.getOutputStream().write(Problem.internal().bytes("/"));
        } catch (IOException gone) {
            LOG.debug("the caller left", gone);
        }
    }

    private static Problem problemOf(HttpResponseException failure) {
        return switch (failure.getStatus()) {
            case 404 -> Problem.notFound(NO_SUCH_PATH);
            case 405 -> Problem.methodNotAllowed("This address is not asked so; /openapi.json says how.");
            case 413 -> Problem.tooLarge("The body is larger than this server takes; post it in parts.");
            default -> Problem.badRequest("The request cannot be read.", null);
        };
    }

    private static void answer(Context ctx, Problem problem) {
        ctx.status(problem.status()).contentType(Problem.CONTENT_TYPE);
        ctx.header("Cache-Control", "no-store").removeHeader("ETag");
        if (problem.status() == 503) {
            ctx.header("Retry-After", "5");
        }
        ctx.result(problem.bytes(ctx.req().getRequestURI()));
    }

    private static void log(Context ctx, Float millis) {
        // The path only: a query may hold names of customers.
        LOG.info(
                "method={} path={} status={} ms={}",
                ctx.method(),
                ctx.path().replaceAll("\\p{Cntrl}", "?"),
                ctx.statusCode(),
                Math.round(millis * 10) / 10.0);
    }

    private QueuedThreadPool threads() {
        int least = Math.min(8, options.threads());
        QueuedThreadPool threads = new QueuedThreadPool(options.threads(), least, (int) IDLE.toMillis());
        threads.setName("http");
        return threads;
    }

    private ServerConnector connector(Server server, HttpConfiguration http) {
        http.setSendServerVersion(false);
        http.setSendDateHeader(true);
        ServerConnector connector = new ServerConnector(server, 1, 1, new HttpConnectionFactory(http));
        connector.setHost(options.host());
        connector.setPort(options.port());
        connector.setIdleTimeout(IDLE.toMillis());
        connector.setAcceptQueueSize(options.waiting());
        // A connection has one request at a time, so this bounds the requests that wait for a thread.
        server.addBean(new NetworkConnectionLimit(options.threads() + options.waiting(), connector));
        return connector;
    }
}
