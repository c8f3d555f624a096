package spanwright.planning;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plants.RandomPlant;
import spanwright.quantity.Wavelength;

/** The search against its slow twin on random plants, where half of the glass may be used whatever is recorded of it. */
class SpareSearchTwinTest {

    private static final int PLANTS = 200;

    @Test
    void the_best_path_costs_what_the_twin_says_and_uses_each_piece_once() {
        int found = 0;
        int bounded = 0;
        for (long seed = 1; seed <= PLANTS; seed++) {
            Snapshot snapshot = Snapshot.of(RandomPlant.of(seed).entered());
            if (snapshot.network().pieces() > 0) {
                SpareQuery query = query(snapshot, new Random(seed));
                Optional<SpareWay> way = check(seed, snapshot, query);
                if (way.isPresent()) {
                    found++;
                    Optional<SpareWay> less =
                            check(seed, snapshot, query.within(way.get().loss() - 1));
                    bounded += less.isPresent() ? 1 : 0;
                }
            }
        }
        assertThat(found).isGreaterThan(PLANTS / 3);
        assertThat(bounded).isGreaterThan(5);
    }

    private static Optional<SpareWay> check(long seed, Snapshot snapshot, SpareQuery query) {
        Optional<SpareWay> way = new SpareSearch(new SpareGlass(snapshot)).find(query);
        SpareTwin.Cost best = new SpareTwin(snapshot, query).best();
        assertThat(way.map(each -> each.work() + " " + each.loss()))
                .as("seed %d %s", seed, best == null ? "" : best.trail())
                .isEqualTo(Optional.ofNullable(best).map(each -> each.work() + " " + each.loss()));
        way.ifPresent(each -> {
            assertThat(each.pieces()).as("seed %d", seed).doesNotHaveDuplicates();
            assertThat(each.joints())
                    .as("seed %d", seed)
                    .hasSizeLessThanOrEqualTo(
                            each.work().splices() + each.work().patches());
        });
        return way;
    }

    @Test
    void the_next_best_paths_hold_no_better_one_whole_and_never_get_better() {
        int several = 0;
        for (long seed = 1; seed <= PLANTS; seed++) {
            Snapshot snapshot = Snapshot.of(RandomPlant.of(seed).entered());
            if (snapshot.network().pieces() > 0) {
                List<SpareWay> ways = new SpareRoutes(new SpareSearch(new SpareGlass(snapshot)))
                        .list(query(snapshot, new Random(seed)), 3);
                several += ways.size() > 1 ? 1 : 0;
                for (int later = 1; later < ways.size(); later++) {
                    SpareWay before = ways.get(later - 1);
                    SpareWay way = ways.get(later);
                    assertThat(way.work()).as("seed %d", seed).isGreaterThanOrEqualTo(before.work());
                    for (SpareWay better : ways.subList(0, later)) {
                        assertThat(way.stretches().containsAll(better.stretches()))
                                .as("seed %d", seed)
                                .isFalse();
                    }
                }
            }
        }
        assertThat(several).isGreaterThan(5);
    }

    private static SpareQuery query(Snapshot snapshot, Random random) {
        Network network = snapshot.network();
        List<Integer> fronts = new ArrayList<>();
        List<Integer> terminals = new ArrayList<>();
        BitSet own = new BitSet();
        BitSet closed = new BitSet();
        Set<Integer> taken = new HashSet<>();
        for (int piece = 0; piece < network.pieces(); piece++) {
            BlockKind kind = network.blockOf(piece).kind();
            if (kind == BlockKind.PANEL) {
                fronts.add(2 * piece + 1);
            } else if (kind == BlockKind.SPLITTER) {
                terminals.add(2 * piece);
            }
            own.set(piece, kind != BlockKind.SPLITTER && random.nextInt(2) == 0);
            closed.set(piece, random.nextInt(12) == 0);
            if (random.nextInt(20) == 0) {
                taken.add(piece);
            }
        }
        List<SpareStart> starts = new ArrayList<>();
        List<SpareGoal> goals = new ArrayList<>();
        Collections.shuffle(fronts, random);
        Collections.shuffle(terminals, random);
        for (int count = 0; count < 3 && count < fronts.size() / 2; count++) {
            starts.add(new SpareStart(fronts.get(2 * count), true, random.nextBoolean()));
            goals.add(new SpareGoal(fronts.get(2 * count + 1), false, random.nextBoolean()));
        }
        for (int count = 0; count < 2 && count < terminals.size() / 2; count++) {
            starts.add(new SpareStart(terminals.get(2 * count), false, false));
            goals.add(new SpareGoal(terminals.get(2 * count + 1), true, false));
        }
        return SpareQuery.of(starts, goals, Wavelength.ofNanometres(1310))
                .over(own, closed, new BitSet())
                .beside(taken, Set.of());
    }
}
