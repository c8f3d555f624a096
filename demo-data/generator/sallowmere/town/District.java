package sallowmere.town;

import java.util.List;
import sallowmere.geo.Point;
import sallowmere.plant.Cable;
import sallowmere.plant.Structure;
import sallowmere.ring.Trunk;

/**
 * A cabinet with all that hangs on it.
 *
 * @param plan where it lies
 * @param trunk the feeder that feeds it
 * @param tap the structure where the lateral leaves the feeder
 * @param cabinet the cabinet
 * @param centre the middle of its part of town
 * @param lateral the lateral, from tap to cabinet
 * @param distribution the three distribution cables from the cabinet
 * @param terminals the fourteen terminals
 * @param streets its streets
 */
public record District(
        TownPlan plan,
        Trunk trunk,
        Structure tap,
        Structure cabinet,
        Point centre,
        Cable lateral,
        List<Cable> distribution,
        List<TerminalSite> terminals,
        List<Street> streets) {

    /** Keeps its own copies of the lists. */
    public District {
        distribution = List.copyOf(distribution);
        terminals = List.copyOf(terminals);
        streets = List.copyOf(streets);
    }

    /** The cabinet's number as its codes bear it: two digits. */
    public String number() {
        return (plan.cabinet() < 10 ? "0" : "") + plan.cabinet();
    }

    /** The feeder tube that feeds it: 4 to 9. */
    public int tube() {
        return plan.cabinet() <= 6 ? plan.cabinet() + 3 : plan.cabinet() - 3;
    }

    /** How many splitters its cabinet has: 7 in the odd ones, 6 in the even ones. */
    public int splitters() {
        return plan.cabinet() % 2 == 1 ? 7 : 6;
    }
}
