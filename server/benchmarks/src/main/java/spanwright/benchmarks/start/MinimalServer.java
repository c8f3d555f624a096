package spanwright.benchmarks.start;

import io.javalin.Javalin;

/** The least that Javalin can do: one fixed answer. */
public final class MinimalServer {

    private MinimalServer() {}

    /** Serves on a port of the loopback address. */
    public static void main(String[] args) {
        Javalin.create(config -> {
                    config.startup.showJavalinBanner = false;
                    config.routes.get("/", context -> context.result("here"));
                })
                .start("127.0.0.1", Integer.parseInt(args[0]));
    }
}
