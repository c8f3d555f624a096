package spanwright.benchmarks.outage;

import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;

/**
 * A route as it truly is, drawn from a seed: reels end to end along the equator, handholes every hundred meters or so, a
 * coil now and then, a closure where reels meet. All in meters.
 */
final class TrueRoute {

    /** Meters of one degree along the equator of WGS 84. */
    static final double DEGREE = Math.toRadians(1) * 6_378_137;

    static final double TRAY = 1.5;
    private static final double SLACK = 30;

    final List<Reel> reels = new ArrayList<>();

    /** One reel: stretches of sheath and how much glass is in them. */
    static final class Reel {
        /** Where its structures are, the first where the reel before ends. */
        final List<Double> places = new ArrayList<>();
        /** Sheath on the span that leads to each structure but the first. */
        final List<Double> spans = new ArrayList<>();
        /** Sheath coiled at each structure. */
        final List<Double> coils = new ArrayList<>();
        /** Glass in a meter of sheath, a span and the coil behind it. */
        final List<Double> ratios = new ArrayList<>();
        /** Whether its marks were read. */
        boolean marked;
        /** Excess length by the records, per cent. */
        double overlength;
    }

    TrueRoute(RandomGenerator chance, Spread spread) {
        int count = chance.nextInt(1, 5);
        double at = 0;
        for (int reel = 0; reel < count; reel++) {
            Reel drawn = reel(chance, spread, at);
            reels.add(drawn);
            at = drawn.places.get(drawn.places.size() - 1);
        }
    }

    private static Reel reel(RandomGenerator chance, Spread spread, double from) {
        Reel reel = new Reel();
        reel.marked = chance.nextInt(4) > 0;
        reel.overlength = 0.5 + chance.nextInt(16) / 10.0;
        double whole = 1 + reel.overlength / 100 + spread.ratio() * chance.nextGaussian();
        int spans = chance.nextInt(8, 20);
        double at = from;
        reel.places.add(at);
        reel.coils.add(0.0);
        reel.ratios.add(whole);
        for (int span = 0; span < spans; span++) {
            double length = chance.nextDouble(80, 200);
            at += length;
            reel.places.add(at);
            reel.spans.add(length * (1 + spread.unmarked() * chance.nextGaussian()));
            boolean coil = span < spans - 1 && chance.nextInt(4) == 0;
            reel.coils.add(coil ? SLACK + chance.nextDouble(-5, 5) : 0.0);
            reel.ratios.add(whole + spread.ratioBySpan() * chance.nextGaussian());
        }
        return reel;
    }

    /** Glass from the port to the joint behind a reel. */
    double glassTo(int reels) {
        double glass = 0;
        for (int reel = 0; reel < reels; reel++) {
            Reel each = this.reels.get(reel);
            glass += (reel > 0 ? TRAY : 0) + TRAY;
            for (int row = 0; row < each.places.size(); row++) {
                glass += glassOf(each, row);
            }
        }
        return glass;
    }

    private static double glassOf(Reel reel, int row) {
        double span = row == 0 ? 0 : reel.spans.get(row - 1);
        return (span + reel.coils.get(row)) * reel.ratios.get(row);
    }

    /** Glass from the port to a share of a span, which leads to a row. */
    double glassTo(int reel, int row, double share) {
        Reel on = reels.get(reel);
        double glass = glassTo(reel) + (reel > 0 ? TRAY : 0);
        for (int each = 0; each < row; each++) {
            glass += glassOf(on, each);
        }
        return glass + on.spans.get(row - 1) * share * on.ratios.get(row);
    }

    /** Where a share of a span, which leads to a row, is. */
    double place(int reel, int row, double share) {
        Reel on = reels.get(reel);
        return on.places.get(row - 1) * (1 - share) + on.places.get(row) * share;
    }
}
