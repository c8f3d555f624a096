package spanwright.suspicion;

import spanwright.plant.Placement;
import spanwright.plant.RouteLength;

/**
 * How likely a cause is, and how likely it makes the alarms: see docs/SUSPECTS.md, which gives the status of every
 * constant. Probabilities are for one day.
 */
final class Likelihood {

    /** Of a circuit being reported down that the cause does not take: equipment, another cause, a wrong record. */
    private static final double DOWN_UNEXPLAINED = 0.01;
    /** Of a circuit being reported up that the cause takes: a missing alarm, a wrong record. */
    private static final double UP_ALTHOUGH_CUT = 0.03;

    /** What a circuit that is down adds where the cause explains it. */
    static final double EXPLAINED = Math.log((1 - UP_ALTHOUGH_CUT) / DOWN_UNEXPLAINED);
    /** What a circuit that is up adds, below 0, where the cause should have taken it down. */
    static final double CONTRADICTED = Math.log(UP_ALTHOUGH_CUT / (1 - DOWN_UNEXPLAINED));

    private static final double DAYS = 365;
    private static final double METRES = 1000;
    /** Of all in an enclosure failing at once, in a year. */
    private static final double ENCLOSURE_A_YEAR = 0.0005;
    /** Of equipment, jumper or drop behind one port failing, in a year. */
    private static final double PORT_A_YEAR = 0.1;
    /** Share of cable damage that takes one tube and leaves the others. */
    private static final double ONE_TUBE = 0.02;
    /** Of tubes crossed when an enclosure was opened and its joints made anew. */
    private static final double CROSSED = 0.02;
    /** Of crossings: tubes of the same colour, one with a tracer. */
    private static final double SAME_COLOR = 0.5;
    /** Of crossings: tubes side by side. */
    private static final double SIDE_BY_SIDE = 0.3;
    /** Of crossings: one tube wrongly joined, to what does not show. */
    private static final double ALONE = 0.1;
    /** Days after which a crossing made then is half as likely to come to light only now. */
    private static final double HALF_LIFE = 3;
    /** Of postings that bear no day of splicing: that the work was done shortly before. */
    static final double POSTED_AFTER = 0.5;
    /** How many days an opening is looked back to. */
    static final int LATELY = 14;

    private static final int COLORS = 12;

    private Likelihood() {}

    /** Of damage to a span on a day. */
    static double span(Placement placement, RouteLength route) {
        double kilometres = route.length().metres() / METRES;
        return (perKilometreAYear(placement) * kilometres + 1e-6) / DAYS;
    }

    private static double perKilometreAYear(Placement placement) {
        return switch (placement) {
            case BURIED -> 0.003;
            case AERIAL -> 0.002;
            case DUCT -> 0.0015;
            case UNDERWATER, INDOOR -> 0.0005;
        };
    }

    static double enclosure() {
        return ENCLOSURE_A_YEAR / DAYS;
    }

    static double port() {
        return PORT_A_YEAR / DAYS;
    }

    /** Of damage to one tube where damage to the whole sheath has a probability. */
    static double tube(double sheath) {
        return sheath * ONE_TUBE;
    }

    /** Of a crossing that it comes to light only so many days after it was made, against the night it was made. */
    static double fresh(double days) {
        return Math.pow(0.5, days / HALF_LIFE);
    }

    /**
     * Of two tubes crossed at an enclosure.
     *
     * @param fresh how likely a crossing there comes to light only now, at most 1
     * @param tubes how many tubes the cable has
     * @param other the other tube; 0 where only one shows
     */
    static double crossed(double fresh, int tubes, int tube, int other) {
        double lately = CROSSED * fresh;
        int apart = Math.abs(tube - other);
        if (other == 0) {
            return lately * ALONE / tubes;
        }
        if (apart == COLORS) {
            return lately * SAME_COLOR / (tubes - COLORS);
        }
        if (apart == 1) {
            return lately * SIDE_BY_SIDE / (tubes - 1);
        }
        return lately * (1 - SAME_COLOR - SIDE_BY_SIDE - ALONE) * 2 / ((double) tubes * tubes);
    }

    /** Whether two tubes are easily taken for each other: of one colour but for a tracer, or side by side. */
    static boolean alike(int tube, int other) {
        return Math.abs(tube - other) == COLORS || Math.abs(tube - other) == 1;
    }

    /** The logarithm of the odds of a cause. */
    static double score(double prior, int explains, int contradicts) {
        return Math.log(prior) + explains * EXPLAINED + contradicts * CONTRADICTED;
    }
}
