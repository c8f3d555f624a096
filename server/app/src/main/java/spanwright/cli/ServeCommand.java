package spanwright.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import spanwright.cli.Program.ServeOrder;
import spanwright.cli.Program.Serving;

/** Serves the pages and the HTTP interface. */
@Command(
        name = "serve",
        description = "Serves the pages and the HTTP interface until it is stopped (Ctrl-C).",
        mixinStandardHelpOptions = true)
final class ServeCommand implements Callable<Integer> {

    private final Program program;

    @Spec
    private CommandSpec spec;

    @Option(names = "--records", required = true, paramLabel = "FILE", description = "The records file.")
    private Path records;

    @Option(
            names = "--host",
            paramLabel = "ADDRESS",
            defaultValue = "127.0.0.1",
            description = "The address to listen at. Default: ${DEFAULT-VALUE}, which only this machine reaches."
                    + " At any other address, whoever reaches it may read the records; there are no accounts.")
    private String host;

    @Option(
            names = "--port",
            paramLabel = "PORT",
            defaultValue = "8080",
            description = "The port to listen at. Default: ${DEFAULT-VALUE}; 0: any that is free.")
    private int port;

    @Option(
            names = "--tile",
            paramLabel = "URL",
            description = "Address of map tiles with {z}, {x}, {y}. Off by default: whoever serves tiles learns where"
                    + " the plant is.")
    private @Nullable String tile;

    @Option(names = "--tile-attribution", paramLabel = "TEXT", description = "Whose tiles they are.")
    private @Nullable String attribution;

    ServeCommand(Program program) {
        this.program = program;
    }

    @Override
    public Integer call() {
        try (Serving serving = program.serve(new ServeOrder(records, host, port, tile, attribution))) {
            announce(spec.commandLine().getErr(), serving);
            serving.await();
            return 0;
        }
    }

    static void announce(PrintWriter err, Serving serving) {
        err.println("Spanwright answers at " + serving.address() + " until it is stopped (Ctrl-C).");
        if (!serving.loopback()) {
            err.println("Whoever reaches that address may read these records: there are no accounts, and nothing is");
            err.println("encrypted. Postings are taken from this machine only.");
        }
        err.flush();
    }
}
