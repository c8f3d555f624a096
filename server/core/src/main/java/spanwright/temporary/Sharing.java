package spanwright.temporary;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.IntUnaryOperator;
import spanwright.planning.SpareWork;

/**
 * Shares out what several want: each wish is granted one of its choices or nothing, no resource is used twice. Best is
 * the most wishes of the first priority, then of the second and so on, then the most customers, then the least work. By
 * branch and bound: exact, unless it is cut short, which the outcome says. One thread's.
 *
 * <p>The bound counts bundles, sets of resources of a kind such as the ports of a panel: those who all need some of a
 * bundle are no more than it holds.
 */
final class Sharing {

    /** A wish that is granted nothing. */
    static final int NOTHING = -1;

    static final int CLASSES = 5;
    private static final int MOST_STEPS = 400;

    private final List<Wish> wishes;
    private final List<Integer> order;
    private final IntUnaryOperator bundleOf;
    private final Set<Integer> used = new HashSet<>();
    private final int[] now;
    private int[] best;
    private SharingScore bestScore = SharingScore.NONE;
    private int steps;

    /**
     * What somebody wants.
     *
     * @param priority 1 is served first ... 5
     * @param customers how many hang on it
     * @param choices any one of them will do
     */
    record Wish(int priority, int customers, List<Choice> choices) {

        Wish {
            choices = List.copyOf(choices);
        }
    }

    /**
     * One way to grant a wish.
     *
     * @param resources what it uses
     * @param work what it costs
     */
    record Choice(List<Integer> resources, SpareWork work) {

        Choice {
            resources = List.copyOf(resources);
        }
    }

    /**
     * What is granted.
     *
     * @param choices by wish the index of its choice, or {@link #NOTHING}
     * @param proven whether nothing serves more; where the search was not cut short, nothing is less work either
     */
    record Outcome(List<Integer> choices, boolean proven) {}

    private Sharing(List<Wish> wishes, IntUnaryOperator bundleOf) {
        this.wishes = wishes;
        this.bundleOf = bundleOf;
        this.now = new int[wishes.size()];
        Arrays.fill(now, NOTHING);
        this.best = now.clone();
        this.order = new ArrayList<>();
        for (int index = 0; index < wishes.size(); index++) {
            order.add(index);
        }
        order.sort(Comparator.<Integer>comparingInt(index -> wishes.get(index).priority())
                .thenComparing(index -> -wishes.get(index).customers()));
    }

    /** Shares out. */
    static Outcome of(List<Wish> wishes, IntUnaryOperator bundleOf) {
        Sharing sharing = new Sharing(List.copyOf(wishes), bundleOf);
        sharing.step(0, SharingScore.NONE);
        SharingScore most = new SharingBound(sharing.open(0), bundleOf).atMost(SharingScore.NONE);
        return new Outcome(
                Arrays.stream(sharing.best).boxed().toList(),
                sharing.steps < MOST_STEPS || sharing.bestScore.servesAsManyAs(most));
    }

    private void step(int place, SharingScore score) {
        if (score.compareTo(bestScore) > 0) {
            bestScore = score;
            best = now.clone();
        }
        if (place == order.size() || steps >= MOST_STEPS) {
            return;
        }
        steps++;
        List<Wish> rest = open(place);
        if (new SharingBound(rest, bundleOf).atMost(score).compareTo(bestScore) <= 0) {
            return;
        }
        int index = order.get(place);
        Wish wish = wishes.get(index);
        for (int choice = 0; choice < wish.choices().size(); choice++) {
            Choice taken = wish.choices().get(choice);
            if (Collections.disjoint(used, taken.resources())) {
                used.addAll(taken.resources());
                now[index] = choice;
                step(place + 1, score.with(wish, taken.work()));
                now[index] = NOTHING;
                taken.resources().forEach(used::remove);
            }
        }
        step(place + 1, score);
    }

    /** The wishes from a place on that can still be granted, with the choices that are left. */
    private List<Wish> open(int place) {
        List<Wish> open = new ArrayList<>();
        for (int at = place; at < order.size(); at++) {
            Wish wish = wishes.get(order.get(at));
            List<Choice> left = wish.choices().stream()
                    .filter(choice -> Collections.disjoint(used, choice.resources()))
                    .toList();
            if (!left.isEmpty()) {
                open.add(new Wish(wish.priority(), wish.customers(), left));
            }
        }
        return open;
    }
}
