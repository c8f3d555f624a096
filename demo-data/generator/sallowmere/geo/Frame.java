package sallowmere.geo;

import java.util.Locale;

/**
 * Between the plane of the demo and longitude and latitude (WGS 84).
 *
 * <p>The false origin lies in the open Pacific near 48 S 123 W, so that nothing invented here overlies real plant.
 * Only {@link StrictMath} is used, so that every machine writes the same digits.
 */
public final class Frame {
    /** Longitude of the false origin in degrees. */
    public static final double ORIGIN_LON = -123;

    /** Latitude of the false origin in degrees. */
    public static final double ORIGIN_LAT = -48;

    // WGS 84: equatorial radius in metres and first eccentricity squared, from the flattening 1/298.257223563.
    private static final double RADIUS = 6_378_137;
    private static final double FLATTENING = 1 / 298.257223563;
    private static final double ECCENTRICITY_SQUARED = FLATTENING * (2 - FLATTENING);

    private Frame() {}

    /** Latitude of a place in degrees. */
    public static double lat(Point place) {
        return ORIGIN_LAT + StrictMath.toDegrees(place.y() / meridian(ORIGIN_LAT));
    }

    /** Longitude of a place in degrees. */
    public static double lon(Point place) {
        return ORIGIN_LON + StrictMath.toDegrees(place.x() / parallel(lat(place)));
    }

    /**
     * Metres between two places on the ellipsoid, of their coordinates as they are written (7 decimals).
     * Mid-latitude formula; better than a millimetre up to a kilometre.
     */
    public static double distance(Point p, Point q) {
        return distance(written(lon(p)), written(lat(p)), written(lon(q)), written(lat(q)));
    }

    /** Metres between two places given in degrees; better than a millimetre up to a kilometre. */
    public static double distance(double lon1, double lat1, double lon2, double lat2) {
        double mid = (lat1 + lat2) / 2;
        double north = StrictMath.toRadians(lat2 - lat1) * meridian(mid);
        double east = StrictMath.toRadians(lon2 - lon1) * parallel(mid);
        return StrictMath.hypot(north, east);
    }

    /** Degrees as a records folder writes them. */
    public static String degrees(double value) {
        return String.format(Locale.ROOT, "%.7f", value);
    }

    /** Longitude and latitude of a place as well-known text writes them. */
    public static String lonLat(Point place) {
        return degrees(lon(place)) + " " + degrees(lat(place));
    }

    private static double written(double degrees) {
        return Double.parseDouble(degrees(degrees));
    }

    private static double meridian(double lat) {
        double sine = StrictMath.sin(StrictMath.toRadians(lat));
        double root = StrictMath.sqrt(1 - ECCENTRICITY_SQUARED * sine * sine);
        return RADIUS * (1 - ECCENTRICITY_SQUARED) / (root * root * root);
    }

    private static double parallel(double lat) {
        double radians = StrictMath.toRadians(lat);
        double sine = StrictMath.sin(radians);
        return RADIUS * StrictMath.cos(radians) / StrictMath.sqrt(1 - ECCENTRICITY_SQUARED * sine * sine);
    }
}
