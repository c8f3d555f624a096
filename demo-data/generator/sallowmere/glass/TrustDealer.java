package sallowmere.glass;

import java.util.EnumMap;
import java.util.Map;
import java.util.Random;

/** Deals trust out to rows so that the joints dealt to each kind keep close to its share. */
final class TrustDealer {
    private final Map<Trust, Integer> dealt = new EnumMap<>(Trust.class);
    private final Random random;
    private int total;

    TrustDealer(Random random) {
        this.random = random;
        for (Trust trust : Trust.values()) {
            dealt.put(trust, 0);
        }
    }

    /** The trust that lags most behind its share; mostly, so that no pattern shows. */
    Trust deal(int joints) {
        Trust best = Trust.POSTED;
        double most = -Double.MAX_VALUE;
        for (Trust trust : Trust.values()) {
            double owed = trust.share() * (total + joints) - dealt.get(trust);
            double wish = owed / Math.sqrt(trust.share()) + 30 * random.nextDouble() - (owed < joints * 0.4 ? 40 : 0);
            if (wish > most) {
                most = wish;
                best = trust;
            }
        }
        count(best, joints);
        return best;
    }

    /** Takes note of joints whose trust the story gives. */
    void count(Trust trust, int joints) {
        dealt.merge(trust, joints, Integer::sum);
        total += joints;
    }
}
