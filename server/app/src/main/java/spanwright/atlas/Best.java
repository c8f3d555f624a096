package spanwright.atlas;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.PriorityQueue;

/** Keeps the best matches, each record once. */
final class Best {

    private final int most;
    private final PriorityQueue<Match> worstFirst = new PriorityQueue<>(Collections.reverseOrder());

    Best(int most) {
        this.most = most;
    }

    boolean wants(Match match) {
        return worstFirst.size() < most || match.compareTo(worstFirst.element()) < 0;
    }

    void offer(Match match) {
        for (Match kept : worstFirst) {
            if (kept.id() == match.id() && kept.named().kind() == match.named().kind()) {
                if (kept.compareTo(match) <= 0) {
                    return;
                }
                worstFirst.remove(kept);
                break;
            }
        }
        worstFirst.add(match);
        if (worstFirst.size() > most) {
            worstFirst.remove();
        }
    }

    List<Match> bestFirst() {
        List<Match> all = new ArrayList<>(worstFirst);
        Collections.sort(all);
        return all;
    }
}
