package spanwright.benchmarks.store;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicInteger;
import spanwright.benchmarks.grid.GridFolder;
import spanwright.benchmarks.grid.GridPlant;
import spanwright.benchmarks.race.Race;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.plant.FiberRange;
import spanwright.records.Records;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.sqlite.Access;
import spanwright.sqlite.SqliteLedger;

/**
 * Races one durable posting of 12 splices against a bare SQLite transaction of the same rows, and eight writers at once
 * against SQLite with eight connections. Arguments: fiber sections of the plant (default 1,000,000), postings (default
 * 2,000).
 */
public final class PostingRace {

    private static final int WRITERS = 8;

    private final AtomicInteger fresh = new AtomicInteger();
    private final AtomicInteger next = new AtomicInteger();
    private final List<Joint> free;

    private PostingRace(List<Joint> free) {
        this.free = free;
    }

    /** Prints the results as Markdown. */
    public static void main(String[] args) throws Exception {
        int sections = args.length > 0 ? Integer.parseInt(args[0]) : 1_000_000;
        int postings = args.length > 1 ? Integer.parseInt(args[1]) : 2_000;
        try (Workshop workshop = new Workshop()) {
            Records records = new GridPlant(sections, 42).records();
            new GridFolder(records).plant(workshop.path("plant"));
            Path file = workshop.path("own.db");
            try (SqliteLedger ledger = Workshop.open(file, Access.WRITE);
                    BareSqlite bare = new BareSqlite(workshop.path("bare.db"))) {
                Workshop.load(ledger, workshop.path("plant"));
                PostingRace race = new PostingRace(twelves(records));
                race.alone(ledger, bare, postings);
                race.together(ledger, workshop.path("bare.db"), postings * 2);
            }
        }
    }

    /** The splices of the plant that hold twelve fibers and more, twelve of each, as crews would post them. */
    private static List<Joint> twelves(Records records) {
        return records.joints()
                .list()
                .filter(joint -> joint.type() == JointKind.SPLICE && joint.count() >= 12)
                .toList();
    }

    private void alone(Ledger ledger, BareSqlite bare, int postings) throws Exception {
        Race race = new Race("One posting of 12 splices, durable")
                .variant("bare SQLite, synchronous=FULL, 12 rows, two indexes", round -> {
                    bare.twelve(fresh);
                    return "";
                })
                .variant("posting, a range of 12", round -> post(ledger, false))
                .variant("posting, 12 joints singly", round -> post(ledger, true))
                .run(postings / 10, postings);
        System.out.println(race.table());
    }

    private String post(Ledger ledger, boolean singly) {
        Joint joint = free.get(next.getAndIncrement() % free.size());
        int round = next.get() / free.size();
        if (round > 0) {
            throw new IllegalStateException("more postings than splices: take a larger plant");
        }
        Outcome outcome = ledger.post("race", "12 splices", editor -> {
            for (int index = 0; index < (singly ? 12 : 1); index++) {
                EndRange a = part(joint.a(), singly ? index : -1);
                EndRange b = part(joint.b(), singly ? index : -1);
                int id = editor.records().newIdentity(RecordKind.JOINT);
                var refusals =
                        editor.apply(Change.add(new Joint(id, joint.type(), joint.enclosure(), a, b, joint.facts())));
                if (!refusals.isEmpty()) {
                    return refusals;
                }
            }
            return List.of();
        });
        if (outcome instanceof Outcome.Refused refused) {
            throw new IllegalStateException(refused.toString());
        }
        return "";
    }

    private static EndRange part(EndRange side, int index) {
        FiberRange numbers = side.numbers();
        return new EndRange(
                side.leg(),
                index < 0 ? new FiberRange(numbers.first(), numbers.at(11)) : FiberRange.of(numbers.at(index)));
    }

    private void together(Ledger ledger, Path bareFile, int postings) throws Exception {
        double bare = rate(postings, () -> {
            BareSqlite own = new BareSqlite(bareFile);
            return () -> own.twelve(fresh);
        });
        double posted = rate(postings, () -> () -> post(ledger, false));
        System.out.printf(
                Locale.ROOT,
                "%n| %d writers at once | postings a second | times |%n|---|---|---|%n"
                        + "| bare SQLite, %d connections | %.0f | 1.0 |%n| postings, one writer, committed in groups | %.0f | %.1f |%n",
                WRITERS,
                WRITERS,
                bare,
                posted,
                posted / bare);
    }

    /** One durable change. */
    private interface Work {
        void once() throws Exception;
    }

    private static double rate(int postings, Callable<Work> each) throws Exception {
        ExecutorService writers = Executors.newFixedThreadPool(WRITERS);
        try {
            List<Work> works = new ArrayList<>();
            for (int writer = 0; writer < WRITERS; writer++) {
                works.add(each.call());
            }
            long start = System.nanoTime();
            List<Future<?>> done = new ArrayList<>();
            for (Work work : works) {
                done.add(writers.submit(() -> {
                    for (int index = 0; index < postings / WRITERS; index++) {
                        work.once();
                    }
                    return null;
                }));
            }
            for (Future<?> one : done) {
                one.get();
            }
            return postings / (Workshop.since(start).toNanos() / 1e9);
        } finally {
            writers.shutdown();
        }
    }
}
