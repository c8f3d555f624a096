package sallowmere.ring;

import java.util.List;
import sallowmere.geo.Point;
import sallowmere.plant.Plant;
import sallowmere.plant.Structure;

/** The sites and the three trunks that join them into a ring. */
public final class Ring {
    /** The code that structures and spans of the shared bridge bear. */
    public static final String BRIDGE_RISK = "wendlecote-bridge";

    /** The code that the shared entrance of the headend bears. */
    public static final String ENTRANCE_RISK = "he-1-entrance";

    private static final Point ENTRANCE = new Point(-8_000, 500);

    private final Trunk south;
    private final Trunk north;
    private final Trunk east;

    private Ring(Trunk south, Trunk north, Trunk east) {
        this.south = south;
        this.north = north;
        this.east = east;
    }

    /** Builds the headend, both huts and the three trunks. */
    public static Ring build(Plant plant) {
        Structure headend = plant.structure(new Structure(
                "HE-1", "building", ENTRANCE.plus(new Point(-80, 28.6)), "1 Sluice Street, Sallowmere", "", "headend"));
        Structure vault = plant.structure(new Structure(
                "EV-1", "vault", ENTRANCE, "Sluice Street, Sallowmere", ENTRANCE_RISK, "both feeders enter here"));
        Structure spare = plant.structure(new Structure(
                "EV-2",
                "vault",
                ENTRANCE.plus(new Point(-110, 90)),
                "Weighhouse Lane, Sallowmere",
                "",
                "vacant ducts"));
        plant.span(headend, vault, "duct", List.of(), ENTRANCE_RISK);
        plant.span(headend, spare, "duct");
        Trunk south = FeederSouth.build(plant, headend, vault);
        Trunk north = FeederNorth.build(plant, headend, vault);
        Trunk east = RingEast.build(plant);
        return new Ring(south, north, east);
    }

    /** FDR-S, headend to Pinnock Ferry. */
    public Trunk south() {
        return south;
    }

    /** FDR-N, headend to Bracken Forks. */
    public Trunk north() {
        return north;
    }

    /** RNG-E, Bracken Forks to Pinnock Ferry. */
    public Trunk east() {
        return east;
    }
}
