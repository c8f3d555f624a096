package spanwright.suspicion;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;

/**
 * Looks for several causes at once. Each further cause is the one that adds most to the score (greedy: at most ln n + 1
 * times as many as the fewest that would do, Chvatal 1979); of the best candidates all pairs are tried, so a double fault
 * among these is found exactly.
 */
final class CauseSets {

    /** The most causes at once. */
    static final int MOST = 8;
    /** So many of the best candidates are tried in pairs. */
    static final int PAIRED = 60;

    private final List<Candidate> candidates;
    private final int down;

    /**
     * Of candidates, best first.
     *
     * @param down the listed circuits numbered below this are down
     */
    CauseSets(List<Candidate> candidates, int down) {
        this.candidates = candidates;
        this.down = down;
    }

    /** The best causes, taken together: indexes into the candidates. */
    List<Integer> find() {
        List<Integer> best = greedy();
        if (candidates.isEmpty() || candidates.get(0).explains() == down) {
            return best;
        }
        double most = score(best);
        int tried = Math.min(PAIRED, candidates.size());
        for (int one = 0; one < tried; one++) {
            for (int other = one + 1; other < tried; other++) {
                double both = score(List.of(one, other));
                if (both > most) {
                    most = both;
                    best = List.of(one, other);
                }
            }
        }
        return best;
    }

    private List<Integer> greedy() {
        List<Integer> chosen = new ArrayList<>();
        BitSet taken = new BitSet();
        while (chosen.size() < MOST) {
            int best = -1;
            // The first cause is the best there is; each further one must be worth more than it costs.
            double most = chosen.isEmpty() ? Double.NEGATIVE_INFINITY : 0;
            for (int index = 0; index < candidates.size(); index++) {
                double gain = gain(candidates.get(index), taken);
                if (gain > most) {
                    most = gain;
                    best = index;
                }
            }
            if (best < 0) {
                break;
            }
            chosen.add(best);
            taken.or(candidates.get(best).circuits);
        }
        return chosen;
    }

    /** What a cause adds to the score where some circuits are taken already. */
    private double gain(Candidate candidate, BitSet taken) {
        BitSet fresh = (BitSet) candidate.circuits.clone();
        fresh.andNot(taken);
        int all = fresh.cardinality();
        fresh.clear(down, Math.max(down, fresh.length()));
        int explains = fresh.cardinality();
        return Likelihood.score(candidate.prior(), explains, all - explains);
    }

    /** The score of causes taken together. */
    double score(List<Integer> chosen) {
        BitSet taken = new BitSet();
        double score = 0;
        for (int index : chosen) {
            score += gain(candidates.get(index), taken);
            taken.or(candidates.get(index).circuits);
        }
        return score;
    }
}
