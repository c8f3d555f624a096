package spanwright.cli;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import spanwright.cli.Program.Serving;

/** Loads the demo into a fresh file and serves it. */
@Command(
        name = "demo",
        description = "Loads the demo, an invented network, into a fresh records file and serves it.",
        mixinStandardHelpOptions = true)
final class DemoCommand implements Callable<Integer> {

    private final Program program;

    @Spec
    private CommandSpec spec;

    @Option(
            names = "--records",
            paramLabel = "FILE",
            description = "Keep the records in this file, which is not there yet. Default: a file that goes when the"
                    + " demo ends.")
    private @Nullable Path records;

    @Option(
            names = "--port",
            paramLabel = "PORT",
            description = "The port to listen at. Default: 8080, or any that is free where that is taken.")
    private @Nullable Integer port;

    @Option(names = "--no-browser", description = "Do not open the browser.")
    private boolean noBrowser;

    DemoCommand(Program program) {
        this.program = program;
    }

    @Override
    public Integer call() {
        if (records != null) {
            if (Files.exists(records)) {
                throw new WrongInput(records + " is there already; the demo loads into a fresh file."
                        + " To serve that file: serve --records " + records);
            }
            return run(records);
        }
        Path folder = fresh();
        try {
            return run(folder.resolve("sallowmere.db"));
        } finally {
            clear(folder);
        }
    }

    private int run(Path file) {
        try (Serving serving = program.demo(file, port)) {
            ServeCommand.announce(spec.commandLine().getErr(), serving);
            if (!noBrowser) {
                program.browse(serving.address());
            }
            serving.await();
            return 0;
        }
    }

    private static Path fresh() {
        try {
            return Files.createTempDirectory("spanwright-demo");
        } catch (IOException full) {
            throw new UncheckedIOException(full);
        }
    }

    private static void clear(Path folder) {
        try (var files = Files.list(folder)) {
            for (Path file : files.toList()) {
                Files.deleteIfExists(file);
            }
            Files.deleteIfExists(folder);
        } catch (IOException gone) {
            // The system's temporary folder is cleared by the system.
            folder.toFile().deleteOnExit();
        }
    }
}
