package spanwright.plant;

/**
 * A place on the WGS 84 ellipsoid.
 *
 * @param lon longitude in degrees, -180 to 180, east positive
 * @param lat latitude in degrees, -90 to 90, north positive
 */
public record Position(double lon, double lat) {

    /** Refuses a place that is not on the globe. */
    public Position {
        if (!(Math.abs(lon) <= 180) || !(Math.abs(lat) <= 90)) {
            throw new IllegalArgumentException("not a place: lon " + lon + " lat " + lat);
        }
    }
}
