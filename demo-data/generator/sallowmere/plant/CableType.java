package sallowmere.plant;

/** The makes of cable in the demo; names and figures are invented. */
public enum CableType {
    /** The two feeders. */
    FEEDER("LT-288", 288, 1.0, false),
    /** The ring's loose-tube reels. */
    RING("LT-144", 144, 1.0, false),
    /** The ring's ribbon reel. */
    RING_RIBBON("RB-144", 144, 0.6, true),
    /** Laterals from the feeder to a cabinet. */
    LATERAL("LT-24", 24, 1.0, false),
    /** Large distribution cables. */
    DISTRIBUTION("LT-96", 96, 1.0, false),
    /** Small distribution cables. */
    DISTRIBUTION_SMALL("LT-48", 48, 1.0, false);

    private final String code;
    private final int fibers;
    private final double overlength;
    private final boolean ribbon;

    CableType(String code, int fibers, double overlength, boolean ribbon) {
        this.code = code;
        this.fibers = fibers;
        this.overlength = overlength;
        this.ribbon = ribbon;
    }

    /** Its code in the records. */
    public String code() {
        return code;
    }

    /** How many fibers it holds, twelve to a tube. */
    public int fibers() {
        return fibers;
    }

    /** Excess length of its glass in per cent. */
    public double overlength() {
        return overlength;
    }

    /** Whether its tubes hold ribbons of twelve. */
    public boolean ribbon() {
        return ribbon;
    }
}
