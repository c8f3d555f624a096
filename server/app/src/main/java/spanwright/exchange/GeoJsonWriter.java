package spanwright.exchange;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.Closeable;
import java.io.IOException;
import java.io.OutputStream;
import java.util.Iterator;
import java.util.List;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Point;
import org.locationtech.jts.geom.Polygon;
import spanwright.plant.BaseFeature;
import spanwright.plant.Position;

/**
 * Writes feature collections of RFC 7946, a feature a line; every coordinate with as many digits as name it. Where all
 * of it lies ({@code bbox}) follows the features, when it is known.
 */
final class GeoJsonWriter implements Closeable {

    private final JsonGenerator json;
    private double west = Double.POSITIVE_INFINITY;
    private double south = Double.POSITIVE_INFINITY;
    private double east = Double.NEGATIVE_INFINITY;
    private double north = Double.NEGATIVE_INFINITY;

    GeoJsonWriter(OutputStream bytes) throws IOException {
        this.json = new JsonFactory().createGenerator(bytes);
    }

    /** Begins the collection; its own members may follow, then {@link #features}. */
    void begin() throws IOException {
        json.writeStartObject();
        json.writeStringField("type", "FeatureCollection");
    }

    /** Writes a member of the collection that RFC 7946 does not know. */
    void member(String name, @Nullable String value) throws IOException {
        json.writeStringField(name, value);
    }

    /** Writes a member of the collection that RFC 7946 does not know. */
    void member(String name, int value) throws IOException {
        json.writeNumberField(name, value);
    }

    /** Begins the features. */
    void features() throws IOException {
        json.writeArrayFieldStart("features");
    }

    /** Begins a feature, to be followed by its properties and its geometry. */
    void feature(@Nullable String id) throws IOException {
        json.writeRaw('\n');
        json.writeStartObject();
        json.writeStringField("type", "Feature");
        if (id != null) {
            json.writeStringField("id", id);
        }
        json.writeObjectFieldStart("properties");
    }

    /** Writes a property as text. */
    void property(String name, String value) throws IOException {
        json.writeStringField(name, value);
    }

    /** Writes a property as a number, given as a plain decimal. */
    void number(String name, String value) throws IOException {
        json.writeFieldName(name);
        json.writeNumber(value);
    }

    /** Ends the properties and writes a feature's place: nothing, a point, or lines. */
    void geometry(List<List<Position>> lines) throws IOException {
        json.writeEndObject();
        json.writeFieldName("geometry");
        if (lines.isEmpty()) {
            json.writeNull();
        } else if (lines.size() == 1) {
            List<Position> only = lines.get(0);
            begin(only.size() == 1 ? "Point" : "LineString");
            if (only.size() == 1) {
                position(only.get(0).lon(), only.get(0).lat());
            } else {
                positions(only);
            }
            json.writeEndObject();
        } else {
            begin("MultiLineString");
            json.writeStartArray();
            for (List<Position> line : lines) {
                positions(line);
            }
            json.writeEndArray();
            json.writeEndObject();
        }
        json.writeEndObject();
    }

    private void begin(String type) throws IOException {
        json.writeStartObject();
        json.writeStringField("type", type);
        json.writeFieldName("coordinates");
    }

    private void positions(List<Position> positions) throws IOException {
        json.writeStartArray();
        for (Position position : positions) {
            position(position.lon(), position.lat());
        }
        json.writeEndArray();
    }

    private void position(double lon, double lat) throws IOException {
        west = Math.min(west, lon);
        east = Math.max(east, lon);
        south = Math.min(south, lat);
        north = Math.max(north, lat);
        json.writeStartArray();
        json.writeNumber(Cells.plain(lon));
        json.writeNumber(Cells.plain(lat));
        json.writeEndArray();
    }

    /** Writes the whole of a base map. */
    void baseMap(Stream<BaseFeature> features) throws IOException {
        begin();
        features();
        for (Iterator<BaseFeature> all = features.iterator(); all.hasNext(); ) {
            BaseFeature feature = all.next();
            feature(null);
            property("layer", feature.layer());
            String name = feature.name();
            if (name != null) {
                property("name", name);
            }
            json.writeEndObject();
            json.writeFieldName("geometry");
            geometry(feature.geometry());
            json.writeEndObject();
        }
        close();
    }

    private void geometry(Geometry geometry) throws IOException {
        begin(geometry.getGeometryType());
        parts(geometry);
        json.writeEndObject();
    }

    private void parts(Geometry geometry) throws IOException {
        if (geometry instanceof Point point) {
            position(point.getX(), point.getY());
        } else if (geometry instanceof LineString line) {
            json.writeStartArray();
            for (Coordinate coordinate : line.getCoordinates()) {
                position(coordinate.x, coordinate.y);
            }
            json.writeEndArray();
        } else if (geometry instanceof Polygon polygon) {
            json.writeStartArray();
            parts(polygon.getExteriorRing());
            for (int hole = 0; hole < polygon.getNumInteriorRing(); hole++) {
                parts(polygon.getInteriorRingN(hole));
            }
            json.writeEndArray();
        } else {
            json.writeStartArray();
            for (int part = 0; part < geometry.getNumGeometries(); part++) {
                parts(geometry.getGeometryN(part));
            }
            json.writeEndArray();
        }
    }

    @Override
    public void close() throws IOException {
        json.writeEndArray();
        json.writeRaw('\n');
        if (west <= east) {
            json.writeArrayFieldStart("bbox");
            for (double edge : new double[] {west, south, east, north}) {
                json.writeNumber(Cells.plain(edge));
            }
            json.writeEndArray();
        }
        json.writeEndObject();
        json.close();
    }
}
