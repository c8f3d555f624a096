package spanwright.planning;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import spanwright.network.Snapshot;
import spanwright.plants.Drawing;
import spanwright.records.Records;

/** The best option against its slow twin on small random plants, for one and two fibers, in one tube and not. */
class SpareOptionsTwinTest {

    private static final int PLANTS = 250;
    private static final int FIBERS = 4;

    @Test
    void the_best_option_costs_what_the_twin_says_and_is_spare_throughout() {
        int found = 0;
        for (long seed = 1; seed <= PLANTS; seed++) {
            Snapshot snapshot = Drawing.of(plant(new Random(seed)));
            Records records = snapshot.records();
            int from = records.structures().find("S0").orElseThrow().id();
            int to = records.structures().find("S3").orElseThrow().id();
            SpareOptionsTwin twin = new SpareOptionsTwin(snapshot, from, to);
            for (int fibers = 1; fibers <= 2; fibers++) {
                for (boolean sameTube : new boolean[] {false, true}) {
                    List<SpareOption> options = new SpareOptions(snapshot)
                            .list(new SpareQuestion(from, to, fibers, sameTube, Avoided.NOTHING));
                    String best = options.isEmpty() ? null : text(options.get(0).cost());
                    assertThat(best)
                            .as("seed %d, %d fibers, same tube %s", seed, fibers, sameTube)
                            .isEqualTo(twin.best(fibers, sameTube));
                    options.forEach(option -> assertSpare(snapshot, option, sameTube));
                    found += options.isEmpty() ? 0 : 1;
                }
            }
        }
        assertThat(found).isGreaterThan(PLANTS);
    }

    private static String text(SpareCost cost) {
        return cost.opened() + " " + cost.splices() + " " + cost.unverified();
    }

    private static void assertSpare(Snapshot snapshot, SpareOption option, boolean sameTube) {
        SpareGlass glass = new SpareGlass(snapshot);
        List<Integer> pieces = option.runs().stream()
                .flatMap(run -> run.entered().stream())
                .map(end -> end >> 1)
                .toList();
        assertThat(pieces).doesNotHaveDuplicates().allMatch(glass::isSpare);
        assertThat(option.sameTube() || !sameTube).isTrue();
        for (SpareRun run : option.runs()) {
            for (int step = 0; step < run.crossovers().size(); step++) {
                int exit = run.entered().get(step) ^ 1;
                int next = run.entered().get(step + 1);
                assertThat(glass.enclosure(exit)).isEqualTo(glass.enclosure(next));
                assertThat(snapshot.network().peer(exit) == next)
                        .isEqualTo(run.crossovers().get(step) == Crossover.AS_IT_IS);
            }
        }
    }

    /** Four structures, an enclosure each, a cable between most pairs, joined and flagged by chance. */
    private static String plant(Random random) {
        StringBuilder plant = new StringBuilder();
        StringBuilder[] passes = new StringBuilder[4];
        for (int at = 0; at < 4; at++) {
            plant.append("structure S" + at + " 0.0" + at + " 0.0" + at % 2 + "\n");
            passes[at] = new StringBuilder("enclosure E" + at + " S" + at + " :");
        }
        StringBuilder later = new StringBuilder();
        int[] tails = new int[4];
        String[] tail = new String[4];
        for (int one = 0; one < 4; one++) {
            for (int other = one + 1; other < 4; other++) {
                if (random.nextInt(3) > 0) {
                    String cable = "F" + one + other;
                    plant.append("cable " + cable + " 4 tube=2 : S" + one + " 1000 S" + other + "\n");
                    passes[one].append(' ').append(cable);
                    passes[other].append(' ').append(cable);
                    flag(cable, random, later);
                    ends(one, cable + " ahead ", tail, tails, random, later);
                    ends(other, cable + " back ", tail, tails, random, later);
                }
            }
        }
        for (int at = 0; at < 4; at++) {
            plant.append(passes[at]).append('\n');
            if (tail[at] != null) {
                for (int fiber = tails[at] + 1; fiber <= FIBERS; fiber++) {
                    later.append("state E" + at + " : " + tail[at] + fiber + " = stored\n");
                }
            }
        }
        return plant.append(later).toString();
    }

    private static void flag(String cable, Random random, StringBuilder later) {
        for (int fiber = 1; fiber <= FIBERS; fiber++) {
            if (random.nextInt(4) == 0) {
                String flag = List.of("dead", "reserved", "leased").get(random.nextInt(3));
                later.append("flag " + cable + " " + fiber + " " + flag + "\n");
            }
        }
    }

    /** Ends of a cable joined to those that the one before it left over, in order; the rest is stored. */
    private static void ends(int at, String end, String[] tail, int[] tails, Random random, StringBuilder later) {
        int joined = tail[at] == null ? 0 : random.nextInt(FIBERS + 1);
        String before = tail[at];
        for (int fiber = 1; fiber <= FIBERS; fiber++) {
            int other = fiber + tails[at];
            boolean joins = before != null && fiber <= joined && other <= FIBERS;
            if (joins) {
                later.append("splice E" + at + " : " + before + other + " = " + end + fiber
                        + (random.nextBoolean() ? " trust=verified" : "") + "\n");
            }
        }
        int used = before == null ? 0 : Math.min(joined, FIBERS - tails[at]);
        if (before != null) {
            for (int fiber = tails[at] + used + 1; fiber <= FIBERS; fiber++) {
                later.append("state E" + at + " : " + before + fiber + " = stored\n");
            }
        }
        tail[at] = end;
        tails[at] = used;
    }
}
