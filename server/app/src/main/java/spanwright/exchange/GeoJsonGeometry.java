package spanwright.exchange;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;

/** Geometries of RFC 7946, section 3.1: lon lat in WGS 84; a third number, the height, is dropped. */
final class GeoJsonGeometry {

    /** Points, lines and areas have no reference system of their own: all are WGS 84. */
    private static final GeometryFactory FACTORY = new GeometryFactory();

    private static final String KINDS = "Point, MultiPoint, LineString, MultiLineString, Polygon, MultiPolygon";

    private GeoJsonGeometry() {}

    /** Says what is wrong with a geometry and what would be right. */
    static final class WrongGeometry extends Exception {

        private static final long serialVersionUID = 1;

        private final String sentence;

        WrongGeometry(String sentence) {
            super(sentence, null, false, false);
            this.sentence = sentence;
        }

        String sentence() {
            return sentence;
        }
    }

    /** Reads a geometry object. */
    static Geometry read(JsonNode geometry) throws WrongGeometry {
        JsonNode coordinates = geometry.path("coordinates");
        return switch (geometry.path("type").asText()) {
            case "Point" -> FACTORY.createPoint(position(coordinates));
            case "MultiPoint" ->
                FACTORY.createMultiPointFromCoords(
                        positions(coordinates, 1, "a multipoint has one" + " position or more"));
            case "LineString" -> line(coordinates);
            case "MultiLineString" ->
                FACTORY.createMultiLineString(
                        each(coordinates, GeoJsonGeometry::line).toArray(LineString[]::new));
            case "Polygon" -> polygon(coordinates);
            case "MultiPolygon" ->
                FACTORY.createMultiPolygon(
                        each(coordinates, GeoJsonGeometry::polygon).toArray(Polygon[]::new));
            default ->
                throw new WrongGeometry(
                        geometry.has("type")
                                ? "geometry '"
                                        + Texts.shown(geometry.path("type").asText()) + "' is not one of " + KINDS
                                : "the feature has no geometry; give it one of " + KINDS);
        };
    }

    /** Reads one part of a geometry. */
    private interface Part<T> {
        T read(JsonNode node) throws WrongGeometry;
    }

    private static <T> List<T> each(JsonNode nodes, Part<T> part) throws WrongGeometry {
        if (!nodes.isArray() || nodes.isEmpty()) {
            throw new WrongGeometry("the coordinates hold nothing; a geometry has one part or more");
        }
        List<T> list = new ArrayList<>();
        for (JsonNode node : nodes) {
            list.add(part.read(node));
        }
        return list;
    }

    private static LineString line(JsonNode node) throws WrongGeometry {
        return FACTORY.createLineString(positions(node, 2, "a line has two positions or more"));
    }

    private static Polygon polygon(JsonNode node) throws WrongGeometry {
        List<LinearRing> rings = each(node, GeoJsonGeometry::ring);
        return FACTORY.createPolygon(
                rings.get(0), rings.subList(1, rings.size()).toArray(LinearRing[]::new));
    }

    private static LinearRing ring(JsonNode node) throws WrongGeometry {
        Coordinate[] positions = positions(node, 4, "a ring has four positions or more");
        if (!positions[0].equals2D(positions[positions.length - 1])) {
            throw new WrongGeometry("a ring ends where it begins; repeat its first position at its end");
        }
        return FACTORY.createLinearRing(positions);
    }

    private static Coordinate[] positions(JsonNode node, int least, String what) throws WrongGeometry {
        if (!node.isArray() || node.size() < least) {
            throw new WrongGeometry(what);
        }
        Coordinate[] positions = new Coordinate[node.size()];
        for (int index = 0; index < positions.length; index++) {
            positions[index] = position(node.get(index));
        }
        return positions;
    }

    private static Coordinate position(JsonNode node) throws WrongGeometry {
        if (!node.isArray()
                || node.size() < 2
                || !node.get(0).isNumber()
                || !node.get(1).isNumber()) {
            throw new WrongGeometry("'" + Texts.shown(node.toString()) + "' is no position; it is [lon, lat]");
        }
        double lon = node.get(0).doubleValue();
        double lat = node.get(1).doubleValue();
        if (!(Math.abs(lon) <= 180) || !(Math.abs(lat) <= 90)) {
            throw new WrongGeometry("'" + Texts.shown(node.toString())
                    + "' is out of range; a longitude is -180 to 180 and comes first, a latitude is -90 to 90");
        }
        return new Coordinate(lon, lat);
    }
}
