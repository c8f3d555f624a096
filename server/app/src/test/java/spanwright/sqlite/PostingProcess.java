package spanwright.sqlite;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.network.RandomPostings;
import spanwright.network.SnapshotEditor;
import spanwright.plant.Setting;
import spanwright.records.Refusal;

/**
 * A process of its own that posts to a records file until it is killed. It says {@code opened}, or why not, and then
 * {@code posted N} once it has been told that posting N is durable.
 */
final class PostingProcess {

    /** So many settings make a posting a bulk one, beside which threads work. */
    private static final int BULK = Draft.BULK + 5_000;

    private PostingProcess() {}

    /**
     * Posts for ever.
     *
     * @param arguments the records file, a seed
     */
    public static void main(String[] arguments) throws InterruptedException {
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        long seed = Long.parseLong(arguments[1]);
        Opening opening = SqliteLedger.open(Path.of(arguments[0]), Access.WRITE);
        if (opening instanceof Opening.Unopened unopened) {
            out.println(unopened.sentence());
            return;
        }
        SqliteLedger ledger = ((Opening.Opened) opening).ledger();
        out.println("opened");
        RandomPostings postings = new RandomPostings(seed);
        if (ledger.current().records().posting() == 0) {
            post(ledger, postings.foundation(), out);
        }
        List<Thread> clients = new ArrayList<>();
        for (int client = 0; client < 3; client++) {
            RandomPostings own = new RandomPostings(seed + client);
            clients.add(new Thread(() -> postForEver(ledger, own, out)));
        }
        clients.forEach(Thread::start);
        for (Thread client : clients) {
            client.join();
        }
    }

    private static void postForEver(Ledger ledger, RandomPostings postings, PrintStream out) {
        for (int count = 1; count > 0; count++) {
            post(
                    ledger,
                    count % 40 == 0
                            ? editor -> bulk(editor.records().limit(RecordKind.SETTING), editor)
                            : postings.next(),
                    out);
        }
    }

    private static List<Refusal> bulk(int first, SnapshotEditor editor) {
        for (int count = 0; count < BULK; count++) {
            int id = editor.records().newIdentity(RecordKind.SETTING);
            editor.replay(Change.add(new Setting(id, "bulk " + id, "of " + first)));
        }
        return List.of();
    }

    private static void post(Ledger ledger, Ledger.Entry entry, PrintStream out) {
        if (ledger.post("Ana", "until killed", entry) instanceof Outcome.Posted posted) {
            out.println("posted " + posted.posting().number());
        }
    }

    /** Starts one, with the class path of this process. */
    static Process start(Path file, long seed) throws IOException {
        return start(PostingProcess.class, file, seed);
    }

    /** Starts the program of a class so. */
    static Process start(Class<?> main, Path file, long seed) throws IOException {
        return new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-Xmx512m",
                        "-XX:TieredStopAtLevel=1",
                        "-cp",
                        System.getProperty("java.class.path"),
                        main.getName(),
                        file.toString(),
                        Long.toString(seed))
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
    }
}
