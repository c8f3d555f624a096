package spanwright.plants;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.network.Snapshot;

/**
 * A ring of sites drawn from a seed, with spare fibers the other way round: a cable from each site to the next by two
 * handholes, with coils and sheath marks; its fibers at each site either on panels, some of them patched through, or
 * spliced on; circuits on some of the runs from port to port.
 */
public final class RandomRing {

    private static final int FIBERS = 6;

    private final Random random;
    private final int sites;
    private final boolean[][] spliced;
    private final boolean[][] patched;
    private final List<String> lines = new ArrayList<>();

    private RandomRing(long seed) {
        random = new Random(seed);
        sites = 3 + random.nextInt(4);
        spliced = new boolean[sites][FIBERS + 1];
        patched = new boolean[sites][FIBERS + 1];
    }

    /** The ring of a seed, as posting 1. */
    public static Snapshot of(long seed) {
        RandomRing ring = new RandomRing(seed);
        ring.draw();
        return Drawing.of(String.join("\n", ring.lines));
    }

    /** The changes that enter all records of a state, in an order in which they can be. */
    public static List<Change> changes(Snapshot snapshot) {
        List<Change> changes = new ArrayList<>();
        for (RecordKind kind : RecordKind.values()) {
            for (int id = 0; id < snapshot.records().limit(kind); id++) {
                Recorded record = snapshot.records().record(kind, id);
                if (record != null) {
                    changes.add(Change.add(record));
                }
            }
        }
        return changes;
    }

    private void draw() {
        for (int site = 0; site < sites; site++) {
            for (int part = 0; part < 3; part++) {
                double angle = 2 * Math.PI * (3 * site + part) / (3 * sites);
                lines.add("structure " + (part == 0 ? "S" + site : "H" + site + part) + " " + Math.cos(angle) / 100
                        + " " + Math.sin(angle) / 100);
            }
        }
        for (int site = 0; site < sites; site++) {
            cable(site);
        }
        for (int site = 0; site < sites; site++) {
            int before = (site + sites - 1) % sites;
            lines.add("enclosure E" + site + " S" + site + " tray=1 : F-" + site + " F-" + before);
            lines.add("panel E" + site + " A " + FIBERS);
            lines.add("panel E" + site + " B " + FIBERS);
        }
        for (int site = 0; site < sites; site++) {
            for (int fiber = 1; fiber <= FIBERS; fiber++) {
                join(site, fiber);
            }
        }
        circuits();
    }

    /** Marks rise or fall, in metres, read at every handhole on both sides or on one. */
    private void cable(int site) {
        int[] coils = {10 * random.nextInt(3), 10 * random.nextInt(4)};
        int[] lengths = {300 + random.nextInt(200), 300 + random.nextInt(200), 300 + random.nextInt(200)};
        String name = "F-" + site;
        lines.add("cable " + name + " " + FIBERS + " tube=3 : S" + site + " " + lengths[0] + " H" + site + "1 +"
                + coils[0] + " " + lengths[1] + " H" + site + "2 +" + coils[1] + " " + lengths[2] + " S"
                + (site + 1) % sites);
        int sign = random.nextBoolean() ? 1 : -1;
        int mark = 5000;
        for (int row = 1; row <= 2; row++) {
            mark += sign * (lengths[row - 1] + 3 + random.nextInt(9));
            int in = mark;
            mark += sign * coils[row - 1];
            if (random.nextInt(4) > 0) {
                lines.add("mark " + name + " " + row + " " + in + " " + mark);
            }
        }
    }

    private void join(int site, int fiber) {
        int before = (site + sites - 1) % sites;
        String trust = random.nextInt(3) > 0 ? " trust=verified" : "";
        spliced[site][fiber] = random.nextInt(4) == 0;
        patched[site][fiber] = !spliced[site][fiber] && random.nextInt(5) == 0;
        if (spliced[site][fiber]) {
            lines.add("splice E" + site + " : F-" + before + " back " + fiber + " = F-" + site + " ahead " + fiber
                    + trust);
            return;
        }
        lines.add("term E" + site + "/A/" + fiber + " = F-" + site + " ahead " + fiber + trust);
        lines.add("term E" + site + "/B/" + fiber + " = F-" + before + " back " + fiber + trust);
        if (patched[site][fiber]) {
            lines.add("jumper E" + site + "/B/" + fiber + " = E" + site + "/A/" + fiber + " 3");
        }
    }

    private void circuits() {
        for (int site = 0; site < sites; site++) {
            for (int fiber = 1; fiber <= FIBERS; fiber++) {
                int end = runsTo(site, fiber);
                if (end >= 0 && random.nextInt(5) < 2) {
                    lines.add("circuit C-" + site + "-" + fiber + " E" + site + "/A/" + fiber + " E" + end + "/B/"
                            + fiber + (random.nextBoolean() ? " budget=" + (3 + random.nextInt(12)) : ""));
                }
            }
        }
    }

    /** The site where a fiber's run from a port comes to a port again; below 0 where it does not begin or end so. */
    private int runsTo(int site, int fiber) {
        if (spliced[site][fiber] || patched[site][fiber]) {
            return -1;
        }
        int at = site;
        do {
            at = (at + 1) % sites;
        } while (at != site && (spliced[at][fiber] || patched[at][fiber]));
        return at == site ? -1 : at;
    }
}
