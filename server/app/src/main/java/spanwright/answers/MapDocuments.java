package spanwright.answers;

import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryCollection;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Point;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.simplify.DouglasPeuckerSimplifier;
import spanwright.atlas.Box;
import spanwright.atlas.FibersOf;
import spanwright.atlas.LineOf;
import spanwright.atlas.PlantAtlas;
import spanwright.plant.BaseFeature;
import spanwright.plant.Position;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.Records;
import spanwright.records.Relation;

/** The map as GeoJSON: the plant, and the base map under it. */
public final class MapDocuments {

    private static final int MOST_STRUCTURES = 4_000;
    private static final int MOST_SPANS = 20_000;
    private static final int MOST_FEATURES = 20_000;

    private final Records records;

    /** Of the records of a view. */
    public MapDocuments(View view) {
        this.records = view.records();
    }

    /** Spans, then structures, in a box, thinned by zoom. */
    public void plant(Json json, PlantAtlas atlas, Box box, double zoom) {
        PlantAtlas.Found found = atlas.within(records, box, zoom, MOST_STRUCTURES, MOST_SPANS);
        json.text("type", "FeatureCollection").whole("posting", records.posting());
        json.flag("truncated", !found.all());
        json.list("features", features -> {
            found.spans()
                    .mapToObj(records.spans()::get)
                    .forEach(span -> features.objectHere(item -> span(item, span, zoom)));
            found.structures()
                    .mapToObj(records.structures()::get)
                    .forEach(structure -> features.objectHere(item -> structure(item, structure)));
        });
    }

    private void span(Json json, Span span, double zoom) {
        List<Position> line = LineOf.thinned(LineOf.span(records, span), zoom);
        json.text("type", "Feature")
                .object(
                        "geometry",
                        geometry -> geometry.text("type", "LineString")
                                .list("coordinates", item -> line.forEach(item::positionHere)));
        json.object("properties", properties -> {
            properties.text("record", "span").text("code", span.code());
            properties.text("from", records.structures().get(span.from()).code());
            properties.text("to", records.structures().get(span.to()).code());
            properties
                    .text("placement", span.placement().word())
                    .text("state", span.state().word());
            properties.whole("fibers", FibersOf.span(records, span.id()));
            properties.whole("cables", records.owned(Relation.SPAN_RUN_ROWS, span.id()).length);
        });
    }

    private void structure(Json json, Structure structure) {
        json.text("type", "Feature")
                .object(
                        "geometry",
                        geometry -> geometry.text("type", "Point")
                                .list(
                                        "coordinates",
                                        item -> item.degreesHere(
                                                        structure.position().lon())
                                                .degreesHere(
                                                        structure.position().lat())));
        json.object("properties", properties -> {
            properties.text("record", "structure").text("code", structure.code());
            properties
                    .text("kind", structure.type().word())
                    .text("state", structure.state().word());
            properties.whole("enclosures", records.owned(Relation.STRUCTURE_ENCLOSURES, structure.id()).length);
            properties.whole("fibers", FibersOf.structure(records, structure.id()));
        });
    }

    /**
     * Features of the base map in a box. From afar small ones are left out: what is not as long as some pixels, and
     * names of lesser rank.
     */
    public void base(Json json, Box box, double zoom) {
        Envelope asked = new Envelope(box.west(), box.east(), box.south(), box.north());
        double pixel = LineOf.pixel(zoom);
        List<BaseFeature> inBox = records.baseFeatures()
                .list()
                .filter(feature -> feature.geometry().getEnvelopeInternal().intersects(asked))
                .toList();
        List<BaseFeature> shown = inBox.stream()
                .filter(feature -> isWorthDrawing(feature, pixel, zoom))
                .limit(MOST_FEATURES)
                .toList();
        json.text("type", "FeatureCollection").flag("truncated", shown.size() < inBox.size());
        json.list("features", shown, (item, feature) -> feature(item, feature, pixel));
    }

    private static boolean isWorthDrawing(BaseFeature feature, double pixel, double zoom) {
        Envelope extent = feature.geometry().getEnvelopeInternal();
        if (feature.geometry() instanceof Point) {
            return true;
        }
        int pixels = feature.layer().equals("building") ? 4 : 2;
        return zoom >= 17 || Math.max(extent.getWidth(), extent.getHeight()) >= pixels * pixel;
    }

    private static void feature(Json json, BaseFeature feature, double pixel) {
        Geometry drawn =
                feature.geometry() instanceof LineString || feature.geometry().getNumPoints() > 100
                        ? DouglasPeuckerSimplifier.simplify(feature.geometry(), pixel / 2)
                        : feature.geometry();
        Geometry geometry = drawn.isEmpty() ? feature.geometry() : drawn;
        json.text("type", "Feature").object("geometry", item -> geometry(item, geometry));
        json.object(
                "properties",
                item -> item.text("kind", feature.layer())
                        .text("name", feature.name())
                        .none("rank"));
    }

    private static void geometry(Json json, Geometry geometry) {
        json.text("type", geometry.getGeometryType());
        json.name("coordinates");
        coordinates(json, geometry);
    }

    private static void coordinates(Json json, Geometry geometry) {
        if (geometry instanceof Point point) {
            position(json, point.getCoordinate());
        } else if (geometry instanceof LineString line) {
            line(json, line);
        } else if (geometry instanceof Polygon polygon) {
            json.listHere(rings -> {
                line(rings, polygon.getExteriorRing());
                for (int ring = 0; ring < polygon.getNumInteriorRing(); ring++) {
                    line(rings, polygon.getInteriorRingN(ring));
                }
            });
        } else if (geometry instanceof GeometryCollection parts) {
            json.listHere(items -> {
                for (int part = 0; part < parts.getNumGeometries(); part++) {
                    coordinates(items, parts.getGeometryN(part));
                }
            });
        }
    }

    private static void line(Json json, LineString line) {
        json.listHere(item -> {
            for (Coordinate coordinate : line.getCoordinates()) {
                position(item, coordinate);
            }
        });
    }

    private static void position(Json json, Coordinate coordinate) {
        json.listHere(item -> item.degreesHere(coordinate.x).degreesHere(coordinate.y));
    }

    /** West, south, east, north of all structures, or nothing. */
    static Optional<Box> extent(Records records) {
        return records.structures().list().map(Structure::position).map(Box::at).reduce(Box::around);
    }
}
