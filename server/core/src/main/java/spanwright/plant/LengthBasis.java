package spanwright.plant;

/** Where a length comes from. */
public enum LengthBasis {
    /** Sheath marks read on both sides. */
    MARKS("marks"),
    /** Route length and coils; no marks on both sides. */
    NOMINAL("nominal"),
    /** Taped or wheeled along the route. */
    MEASURED("measured"),
    /** The line on the map, on the WGS 84 ellipsoid. */
    GEODESIC("geodesic"),
    /** Entered as such, such as a jumper's. */
    RECORDED("recorded");

    private final String word;

    LengthBasis(String word) {
        this.word = word;
    }

    /** How a file and a screen write it. */
    public String word() {
        return word;
    }
}
