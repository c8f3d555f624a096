package spanwright.http;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Clock;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import spanwright.answers.LastChanges;
import spanwright.answers.RowTexts;
import spanwright.answers.Views;
import spanwright.boot.RecordsRows;
import spanwright.draft.DraftDesk;
import spanwright.draft.MemoryDrafts;
import spanwright.incident.IncidentDesk;
import spanwright.incident.MemoryIncidents;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.network.Ledger;
import spanwright.network.MemoryLedger;
import spanwright.network.Outcome;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.Setting;
import spanwright.plants.RandomPlant;
import spanwright.plants.RandomRing;
import spanwright.records.Records;
import spanwright.records.Refusal;

/** A real server on any free port, over a ledger in memory. */
final class TestServer implements AutoCloseable {

    private final Ledger ledger = new MemoryLedger(Clock.systemUTC());
    private final ServerOptions options;
    private final RowTexts rows;
    private final PostingDesk desk;
    private @Nullable WebServer server;

    TestServer() {
        this(ServerOptions.at("127.0.0.1", 0));
    }

    TestServer(ServerOptions options) {
        this.options = options;
        this.rows = new PlainRows();
        this.desk = new SettingsDesk(ledger);
    }

    private TestServer(RowTexts rows, Function<Ledger, PostingDesk> desk) {
        this.options = ServerOptions.at("127.0.0.1", 0);
        this.rows = rows;
        this.desk = desk.apply(ledger);
    }

    /** One that writes and takes every row of a records folder, as the program does. */
    static TestServer ofAllRows() {
        return new TestServer(RecordsRows.texts(), RecordsRows::desk);
    }

    /** Posts a random plant, as if read from a trusted store. */
    Ledger plant(long seed) {
        RandomPlant plant = RandomPlant.of(seed);
        post(editor -> {
            plant.changes().forEach(editor::replay);
            return List.of();
        });
        return ledger;
    }

    /** Posts all records of a state, as if read from a trusted store. */
    void plant(Snapshot snapshot) {
        post(editor -> {
            RandomRing.changes(snapshot).forEach(editor::replay);
            return List.of();
        });
    }

    void rename(Ledger ledger, String owner) {
        post(editor -> {
            Optional<Setting> before = editor.records().settings().find("owner");
            int id = before.map(Setting::id).orElseGet(() -> editor.records().newIdentity(RecordKind.SETTING));
            Setting after = new Setting(id, "owner", owner);
            return editor.apply(before.isPresent() ? Change.replace(before.get(), after) : Change.add(after));
        });
    }

    void post(Ledger.Entry entry) {
        assertThat(ledger.post("A. Marsh", "Sheet 0412", entry)).isInstanceOf(Outcome.Posted.class);
    }

    Ledger ledger() {
        return ledger;
    }

    WebServer server() {
        WebServer running = server == null ? WebServer.prepare(options, api()).listen() : server;
        server = running;
        return running;
    }

    Asking asking() {
        return new Asking(server().address());
    }

    private Api api() {
        return new Api(
                new Views(ledger),
                new LastChanges(ledger),
                rows,
                desk,
                new IncidentDesk(ledger, new MemoryIncidents(Clock.systemUTC()), Clock.systemUTC()),
                new DraftDesk(ledger, new MemoryDrafts(Clock.systemUTC())),
                "0.1.0",
                false);
    }

    @Override
    public void close() {
        if (server != null) {
            server.close();
        }
        ledger.close();
    }

    /** Rows of settings are written out, others by their table's name alone. */
    private static final class PlainRows implements RowTexts {

        @Override
        public RowText of(Records records, Recorded record) {
            return record instanceof Setting setting
                    ? new RowText("settings", setting.name(), Map.of("name", setting.name(), "value", setting.value()))
                    : new RowText("structures", null, Map.of());
        }
    }

    /** Takes changes of settings. */
    private record SettingsDesk(Ledger ledger) implements PostingDesk {

        @Override
        public Result post(String by, String reason, @Nullable Integer unchangedSince, List<RowChange> changes) {
            return result(ledger.post(by, reason, editor -> enter(editor, changes)));
        }

        @Override
        public Result takeBack(int posting, String by, String reason) {
            return result(ledger.post(by, reason, editor -> editor.takeBack(ledger.changesOf(posting))));
        }

        private static Result result(Outcome outcome) {
            return outcome instanceof Outcome.Posted posted
                    ? new Result.Posted(posted.posting())
                    : new Result.Refused(((Outcome.Refused) outcome)
                            .refusals().stream()
                                    .map(refusal -> new RowFault(0, refusal.column(), refusal.sentence()))
                                    .toList());
        }

        private static List<Refusal> enter(SnapshotEditor editor, List<RowChange> changes) {
            return changes.stream()
                    .flatMap(change -> editor
                            .apply(Change.add(new Setting(
                                    editor.records().newIdentity(RecordKind.SETTING),
                                    String.valueOf(change.row().get("name")),
                                    String.valueOf(change.row().get("value")))))
                            .stream())
                    .toList();
        }
    }
}
