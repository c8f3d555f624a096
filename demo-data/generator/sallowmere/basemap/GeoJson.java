package sallowmere.basemap;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import sallowmere.geo.Frame;
import sallowmere.geo.Point;

/** A GeoJSON feature collection (RFC 7946), one feature a line, coordinates to 6 decimals (a tenth of a metre). */
final class GeoJson {
    private final List<String> features = new ArrayList<>();

    void point(String layer, String name, Point place) {
        feature(layer, name, "Point", coordinate(place));
    }

    void line(String layer, String name, List<Point> line) {
        feature(layer, name, "LineString", coordinates(line));
    }

    /** A closed shape, first corner repeated at its end, corners against the clock. */
    void shape(String layer, String name, List<Point> ring) {
        feature(layer, name, "Polygon", "[" + coordinates(wound(ring)) + "]");
    }

    void shapes(String layer, String name, List<List<Point>> rings) {
        String all =
                rings.stream().map(ring -> "[" + coordinates(wound(ring)) + "]").collect(Collectors.joining(","));
        feature(layer, name, "MultiPolygon", "[" + all + "]");
    }

    private void feature(String layer, String name, String type, String coordinates) {
        features.add("{\"type\":\"Feature\",\"properties\":{\"layer\":\"" + layer + "\",\"name\":\"" + name
                + "\"},\"geometry\":{\"type\":\"" + type + "\",\"coordinates\":" + coordinates + "}}");
    }

    private static List<Point> wound(List<Point> ring) {
        double area = 0;
        for (int i = 1; i < ring.size(); i++) {
            area += ring.get(i - 1).x() * ring.get(i).y()
                    - ring.get(i).x() * ring.get(i - 1).y();
        }
        if (area >= 0) {
            return ring;
        }
        List<Point> turned = new ArrayList<>(ring);
        Collections.reverse(turned);
        return turned;
    }

    private static String coordinates(List<Point> line) {
        return line.stream().map(GeoJson::coordinate).collect(Collectors.joining(",", "[", "]"));
    }

    private static String coordinate(Point place) {
        return String.format(Locale.ROOT, "[%.6f,%.6f]", Frame.lon(place), Frame.lat(place));
    }

    void write(Path file) {
        try {
            Files.writeString(
                    file, "{\"type\":\"FeatureCollection\",\"features\":[\n" + String.join(",\n", features) + "\n]}\n");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
