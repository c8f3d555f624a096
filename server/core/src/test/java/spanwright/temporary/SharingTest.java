package spanwright.temporary;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import spanwright.planning.SpareWork;

/** Sharing out against a twin that tries everything. */
class SharingTest {

    @Test
    void nothing_served_by_another_sharing_is_better() {
        int contested = 0;
        for (long seed = 1; seed <= 300; seed++) {
            List<Sharing.Wish> wishes = wishes(new Random(seed));
            Sharing.Outcome outcome = Sharing.of(wishes, resource -> resource / 3);
            SharingScore best = everything(wishes, 0, new HashSet<>(), SharingScore.NONE);
            assertThat(outcome.proven()).as("seed %d", seed).isTrue();
            assertThat(score(wishes, outcome.choices())).as("seed %d", seed).isEqualTo(best);
            contested += outcome.choices().contains(Sharing.NOTHING) ? 1 : 0;
        }
        assertThat(contested).isGreaterThan(100);
    }

    @Test
    void eight_ports_go_to_the_groups_with_most_customers() {
        List<Sharing.Wish> wishes = new ArrayList<>();
        for (int splitter = 0; splitter < 28; splitter++) {
            List<Sharing.Choice> ports = new ArrayList<>();
            for (int port = 0; port < 8; port++) {
                ports.add(new Sharing.Choice(List.of(port), SpareWork.NONE));
            }
            wishes.add(new Sharing.Wish(4, 10 + splitter, ports));
        }

        Sharing.Outcome outcome = Sharing.of(wishes, port -> 0);

        assertThat(outcome.proven()).isTrue();
        for (int splitter = 0; splitter < 28; splitter++) {
            assertThat(outcome.choices().get(splitter) != Sharing.NOTHING).isEqualTo(splitter >= 20);
        }
    }

    @Test
    void two_of_a_priority_go_before_one_with_more_customers() {
        SpareWork work = SpareWork.NONE;
        List<Sharing.Wish> wishes = List.of(
                new Sharing.Wish(1, 90, List.of(new Sharing.Choice(List.of(1, 2), work))),
                new Sharing.Wish(1, 1, List.of(new Sharing.Choice(List.of(1), work))),
                new Sharing.Wish(1, 1, List.of(new Sharing.Choice(List.of(2), work))));

        assertThat(Sharing.of(wishes, resource -> 0).choices()).containsExactly(Sharing.NOTHING, 0, 0);
    }

    private static List<Sharing.Wish> wishes(Random random) {
        List<Sharing.Wish> wishes = new ArrayList<>();
        for (int count = 1 + random.nextInt(5); count > 0; count--) {
            List<Sharing.Choice> choices = new ArrayList<>();
            for (int choice = random.nextInt(4); choice > 0; choice--) {
                Set<Integer> resources = new HashSet<>();
                for (int use = 1 + random.nextInt(3); use > 0; use--) {
                    resources.add(random.nextInt(7));
                }
                choices.add(new Sharing.Choice(
                        List.copyOf(resources), new SpareWork(random.nextInt(3), 0, random.nextInt(3), 0, 0)));
            }
            wishes.add(new Sharing.Wish(1 + random.nextInt(3), random.nextInt(40), choices));
        }
        return wishes;
    }

    private static SharingScore everything(List<Sharing.Wish> wishes, int at, Set<Integer> used, SharingScore score) {
        if (at == wishes.size()) {
            return score;
        }
        SharingScore best = everything(wishes, at + 1, used, score);
        for (Sharing.Choice choice : wishes.get(at).choices()) {
            if (Collections.disjoint(used, choice.resources())) {
                Set<Integer> more = new HashSet<>(used);
                more.addAll(choice.resources());
                SharingScore other = everything(wishes, at + 1, more, score.with(wishes.get(at), choice.work()));
                best = other.compareTo(best) > 0 ? other : best;
            }
        }
        return best;
    }

    private static SharingScore score(List<Sharing.Wish> wishes, List<Integer> choices) {
        SharingScore score = SharingScore.NONE;
        for (int index = 0; index < choices.size(); index++) {
            int choice = choices.get(index);
            if (choice != Sharing.NOTHING) {
                Sharing.Wish wish = wishes.get(index);
                score = score.with(wish, wish.choices().get(choice).work());
            }
        }
        return score;
    }
}
