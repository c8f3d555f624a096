package spanwright.benchmarks.start;

import java.io.IOException;
import java.net.ServerSocket;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import spanwright.benchmarks.race.Race;

/**
 * Races the launch of the program on the demo's records against a minimal server's, each to its first answered page.
 * Arguments: the program's jar, the demo's folder, rounds (default 9).
 */
public final class StartRace {

    private static final long PATIENCE_NANOS = 60_000_000_000L;

    private final HttpClient client = HttpClient.newHttpClient();
    private final String java =
            Path.of(System.getProperty("java.home"), "bin", "java").toString();

    private StartRace() {}

    /** Prints the results as Markdown. */
    public static void main(String[] args) throws Exception {
        String jar = args[0];
        int rounds = args.length > 2 ? Integer.parseInt(args[2]) : 9;
        Path folder = Files.createTempDirectory("spanwright-start");
        String records = folder.resolve("demo.db").toString();
        StartRace start = new StartRace();
        start.runToEnd("-jar", jar, "load", args[1], "--records", records);
        // Opened and closed once, as any file is that has been served before.
        start.untilFirstPage("-jar", jar, "serve", "--records", records, "--port");
        Race race = new Race("Launch to the first answered page")
                .variant(
                        "a minimal Javalin server",
                        round -> start.untilFirstPage(
                                "-cp", System.getProperty("java.class.path"), MinimalServer.class.getName()))
                .variant(
                        "the program on the demo's records",
                        round -> start.untilFirstPage("-jar", jar, "serve", "--records", records, "--port"))
                .run(1, rounds);
        System.out.println(race.table());
        Race demo = new Race("The demo, loaded into a fresh file, to the first answered page")
                .variant(
                        "demo",
                        round -> start.untilFirstPage(
                                "-jar",
                                jar,
                                "demo",
                                "--records",
                                folder.resolve("fresh" + round + ".db").toString(),
                                "--port"))
                .run(1, Math.max(3, rounds / 3));
        System.out.println(demo.table());
    }

    private void runToEnd(String... arguments) throws Exception {
        int status = launch(List.of(arguments)).waitFor();
        if (status != 0) {
            throw new IllegalStateException("exit status " + status);
        }
    }

    private Process launch(List<String> arguments) throws IOException {
        List<String> command = new ArrayList<>(List.of(java));
        command.addAll(arguments);
        return new ProcessBuilder(command)
                .redirectErrorStream(true)
                .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                .start();
    }

    /** Launches a server whose last argument is its port, and waits for its page. */
    private String untilFirstPage(String... arguments) throws Exception {
        int port = freePort();
        List<String> all = new ArrayList<>(List.of(arguments));
        all.add(Integer.toString(port));
        Process process = launch(all);
        try {
            long until = System.nanoTime() + PATIENCE_NANOS;
            while (!answers(port)) {
                if (System.nanoTime() > until || !process.isAlive()) {
                    throw new IllegalStateException("no page: " + String.join(" ", all));
                }
                Thread.sleep(5);
            }
            return "answered";
        } finally {
            process.destroy();
            process.waitFor();
        }
    }

    private boolean answers(int port) throws InterruptedException {
        try {
            HttpRequest request = HttpRequest.newBuilder(URI.create("http://127.0.0.1:" + port + "/"))
                    .build();
            return client.send(request, HttpResponse.BodyHandlers.discarding()).statusCode() == 200;
        } catch (IOException refused) {
            return false;
        }
    }

    private static int freePort() throws IOException {
        try (ServerSocket socket = new ServerSocket(0)) {
            return socket.getLocalPort();
        }
    }
}
