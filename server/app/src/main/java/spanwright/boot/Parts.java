package spanwright.boot;

import java.io.IOException;
import java.net.URI;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import spanwright.answers.LastChanges;
import spanwright.answers.View;
import spanwright.answers.Views;
import spanwright.cli.Program;
import spanwright.cli.WrongInput;
import spanwright.draft.DraftDesk;
import spanwright.exchange.Fault;
import spanwright.exchange.FolderExport;
import spanwright.exchange.FolderLoad;
import spanwright.exchange.GeoJsonExport;
import spanwright.http.Api;
import spanwright.http.CannotListenException;
import spanwright.http.ServerOptions;
import spanwright.http.WebServer;
import spanwright.incident.IncidentDesk;
import spanwright.journal.Posting;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.records.Refusal;
import spanwright.sqlite.Access;
import spanwright.sqlite.Opening;
import spanwright.sqlite.SqliteLedger;

/** The parts of the program, put together: storage, records folders, the HTTP interface, behind the command line. */
final class Parts implements Program {

    private static final String LOOPBACK = "127.0.0.1";
    private static final int USUAL_PORT = 8080;

    @Override
    public String version() {
        String packed = Parts.class.getPackage().getImplementationVersion();
        return packed == null ? "not packed" : packed;
    }

    @Override
    public Ledger open(Path records) {
        return open(records, Access.READ);
    }

    private static SqliteLedger open(Path records, Access access) {
        Path folder = records.toAbsolutePath().getParent();
        if (folder != null && !Files.isDirectory(folder)) {
            throw new WrongInput("There is no folder " + folder + " for the records file; make it first.");
        }
        Opening opening = SqliteLedger.open(records, access);
        if (opening instanceof Opening.Unopened unopened) {
            throw new WrongInput(unopened.sentence());
        }
        return ((Opening.Opened) opening).ledger();
    }

    @Override
    public LoadResult load(Path folder, Path records, String by, String reason, Consumer<String> progress) {
        if (!Files.exists(folder)) {
            throw new WrongInput("There is no folder or file " + folder + " to load.");
        }
        try (Ledger ledger = open(records, Access.WRITE)) {
            return load(folder, ledger, by, reason, progress);
        }
    }

    private static LoadResult load(Path folder, Ledger ledger, String by, String reason, Consumer<String> progress) {
        List<Fault> faults = new ArrayList<>();
        List<String> read = new ArrayList<>();
        Outcome outcome = ledger.post(by, reason, editor -> {
            faults.addAll(FolderLoad.load(folder, editor, (table, rows, done) -> {
                String count = String.format(Locale.ROOT, "%,d %s", rows, table.replace('_', ' '));
                progress.accept(done ? count : count + " so far ...");
                if (done) {
                    read.add(count);
                }
            }));
            return faults.stream().map(Parts::refusal).toList();
        });
        if (outcome instanceof Outcome.Posted posted) {
            return new LoadResult.Loaded(posted.posting(), read);
        }
        List<String> lines = faults.isEmpty()
                ? ((Outcome.Refused) outcome)
                        .refusals().stream().map(Refusal::sentence).toList()
                : faults.stream().map(Fault::toString).toList();
        return new LoadResult.Refused(lines);
    }

    private static Refusal refusal(Fault fault) {
        return new Refusal("folder", fault.text(), null, null, null);
    }

    @Override
    public void export(View view, @Nullable Posting posting, ExportFormat format, Path out) {
        try {
            switch (format) {
                case FOLDER -> FolderExport.write(view.records(), out);
                case GEOJSON ->
                    GeoJsonExport.write(view.records(), posting == null ? null : view.time(posting.at()), out);
            }
        } catch (FileAlreadyExistsException there) {
            throw new WrongInput(out + " is there already; name one that is not there yet.");
        } catch (IOException unwritable) {
            throw new WrongInput(out + " cannot be written: " + unwritable.getMessage());
        }
    }

    @Override
    public Serving serve(ServeOrder order) {
        ServerOptions options = options(order);
        SqliteLedger ledger = open(order.records(), Access.WRITE);
        try {
            if (ledger.current().records().posting() == 0) {
                throw new WrongInput("There is no records file " + order.records() + "; load a folder into it first.");
            }
            return listen(WebServer.prepare(options, api(ledger, false)), ledger, order.host());
        } catch (RuntimeException failed) {
            ledger.close();
            throw failed;
        }
    }

    private static Serving listen(WebServer server, Ledger ledger, String host) {
        try {
            return new Running(server.listen(), ledger, WebServer.isLoopback(host));
        } catch (CannotListenException taken) {
            throw new WrongInput(String.valueOf(taken.getMessage()));
        }
    }

    @Override
    public Serving demo(Path records, @Nullable Integer port) {
        ServerOptions options =
                options(new ServeOrder(records, LOOPBACK, port == null ? USUAL_PORT : port, null, null));
        SqliteLedger ledger = open(records, Access.WRITE);
        try {
            Api api = api(ledger, true);
            // The server is put together while the folder is read: either takes a second of a cold start.
            CompletableFuture<WebServer> server = CompletableFuture.supplyAsync(() -> WebServer.prepare(options, api));
            LoadResult result = load(PackedDemo.unpack(), ledger, "demo", "The demo, all invented", step -> {});
            if (result instanceof LoadResult.Refused refused) {
                server.join().close();
                throw new WrongInput(String.join(System.lineSeparator(), refused.lines()));
            }
            try {
                return listen(server.join(), ledger, LOOPBACK);
            } catch (WrongInput taken) {
                if (port != null) {
                    throw taken;
                }
                return listen(WebServer.prepare(ServerOptions.at(LOOPBACK, 0), api), ledger, LOOPBACK);
            }
        } catch (RuntimeException failed) {
            ledger.close();
            throw failed;
        }
    }

    private static ServerOptions options(ServeOrder order) {
        if (order.port() < 0 || order.port() > 65_535) {
            throw new WrongInput("A port is a number from 0 to 65535, not " + order.port() + ".");
        }
        ServerOptions options = ServerOptions.at(order.host(), order.port());
        return order.tileUrl() == null
                ? options
                : options.withTile(new ServerOptions.Tile(
                        order.tileUrl(), order.tileAttribution() == null ? "" : order.tileAttribution()));
    }

    private Api api(SqliteLedger ledger, boolean demo) {
        return new Api(
                new Views(ledger),
                new LastChanges(ledger),
                new FolderRows(),
                new RowDesk(ledger),
                new IncidentDesk(ledger, ledger.incidents(), Clock.systemUTC()),
                new DraftDesk(ledger, ledger.drafts()),
                version(),
                demo);
    }

    @Override
    public void browse(URI page) {
        Browser.open(page);
    }

    /** A server and the ledger it answers from. */
    private record Running(WebServer server, Ledger ledger, boolean loopback) implements Serving {

        @Override
        public URI address() {
            return server.address();
        }

        @Override
        public void await() {
            Thread stopping = new Thread(this::close, "stop");
            Runtime.getRuntime().addShutdownHook(stopping);
            try {
                new CountDownLatch(1).await();
            } catch (InterruptedException stopped) {
                // Stopped from within the process; whoever waited goes on to close, which an interrupt would disturb.
                Runtime.getRuntime().removeShutdownHook(stopping);
            }
        }

        @Override
        public void close() {
            server.close();
            ledger.close();
        }
    }
}
