package spanwright.outage;

/**
 * The way of one fiber of a circuit: the ends by which it enters one glass path after another, from the circuit's a on.
 *
 * @param enterings the ends, in order; none where its port is not in service
 * @param target the front where it ends, or -1 where it does not come there
 */
@SuppressWarnings("ArrayRecordComponent") // Made and read in this package alone, by the thousand; never compared.
public record Route(int[] enterings, int target) {

    static final Route NOWHERE = new Route(new int[0], -1);

    /** Whether it comes from the circuit's a to its z. */
    public boolean whole() {
        return target >= 0;
    }
}
