package spanwright.browser;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The program itself, run as people run it: {@code demo} on a fresh records file, on a port that the system picks.
 * For one thread; a test class starts one and closes it at its end.
 */
final class DemoServer implements AutoCloseable {

    private static final Pattern ADDRESS = Pattern.compile("http://[^\\s/]+:\\d+");
    private static final long START_SECONDS = 120;
    private static final int LINES_KEPT = 40;

    private final Process process;
    private final Path folder;
    private final Deque<String> said = new ArrayDeque<>();
    private final CompletableFuture<String> address = new CompletableFuture<>();

    private DemoServer(Process process, Path folder) {
        this.process = process;
        this.folder = folder;
    }

    /**
     * Starts the server and waits until it says where it listens.
     *
     * @throws IllegalStateException with what it said, where it ends or stays silent
     */
    static DemoServer start() {
        try {
            Path folder = Files.createTempDirectory("spanwright-demo");
            Process process = new ProcessBuilder(command(folder.resolve("demo.db")))
                    .redirectErrorStream(true)
                    .start();
            DemoServer server = new DemoServer(process, folder);
            server.awaitAddress();
            return server;
        } catch (IOException cause) {
            throw new UncheckedIOException(cause);
        }
    }

    /** Where it listens, as {@code http://host:port}. */
    String address() {
        return address.join();
    }

    /**
     * Ends the server and removes its records.
     *
     * @throws IllegalStateException with what it said last, where it had ended by itself
     */
    @Override
    public void close() {
        boolean running = process.isAlive();
        process.destroy();
        try {
            if (!process.waitFor(10, TimeUnit.SECONDS)) {
                process.destroyForcibly().waitFor();
            }
            try (var files = Files.list(folder)) {
                for (Path file : files.toList()) {
                    Files.delete(file);
                }
            }
            Files.delete(folder);
        } catch (InterruptedException cause) {
            Thread.currentThread().interrupt();
        } catch (IOException cause) {
            throw new UncheckedIOException(cause);
        }
        if (!running) {
            throw new IllegalStateException("The server ended by itself. It said last:\n" + lastLines());
        }
    }

    private static List<String> command(Path records) {
        Path java = Path.of(System.getProperty("java.home"), "bin", "java");
        String jar = System.getProperty("spanwright.jar");
        return List.of(
                java.toString(),
                "-Xmx1g",
                "-jar",
                jar,
                "demo",
                "--no-browser",
                "--records",
                records.toString(),
                "--port",
                "0");
    }

    private void awaitAddress() {
        Thread reader = new Thread(this::read, "demo-server-output");
        reader.setDaemon(true);
        reader.start();
        try {
            address.get(START_SECONDS, TimeUnit.SECONDS);
        } catch (InterruptedException cause) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("Interrupted while the server was starting.", cause);
        } catch (ExecutionException | TimeoutException cause) {
            process.destroyForcibly();
            throw new IllegalStateException("The server did not say where it listens. It said:\n" + lastLines(), cause);
        }
    }

    /** Reads on after the address was found, so that the server never waits for its output to be taken. */
    private void read() {
        try (BufferedReader output = process.inputReader()) {
            for (String line = output.readLine(); line != null; line = output.readLine()) {
                keep(line);
                Matcher matcher = ADDRESS.matcher(line);
                if (matcher.find()) {
                    address.complete(matcher.group());
                }
            }
            address.completeExceptionally(new IllegalStateException("The server ended."));
        } catch (IOException cause) {
            address.completeExceptionally(cause);
        }
    }

    private void keep(String line) {
        synchronized (said) {
            said.addLast(line);
            if (said.size() > LINES_KEPT) {
                said.removeFirst();
            }
        }
    }

    private String lastLines() {
        synchronized (said) {
            return String.join("\n", said);
        }
    }
}
