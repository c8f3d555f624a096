package spanwright.paper;

import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.Polygon;
import spanwright.answers.View;
import spanwright.atlas.LineOf;
import spanwright.plant.BaseFeature;
import spanwright.plant.Position;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.records.CableLay;

/** Draws the surroundings of a place: base map, route, structures, scale and north. Lengths on paper in 0.1 mm. */
final class PlaceMap {

    private static final int WIDTH = 1900;
    private static final int HEIGHT = 820;
    private static final double LEAST_METRES = 90;
    private static final double MOST_METRES = 2_000;
    private static final double METRES_PER_DEGREE = 111_195;
    private static final int MOST_LABELS = 18;
    private static final int LETTERS = 26;

    private final View view;
    private final CrewPlace place;
    private final Html html;
    private final double metresPerUnit;
    private final double metresPerLon;
    private final Envelope frame;
    private final List<Rectangle2D> labels = new ArrayList<>();

    PlaceMap(View view, CrewPlace place, Html html) {
        this.view = view;
        this.place = place;
        this.html = html;
        this.metresPerLon =
                METRES_PER_DEGREE * Math.cos(Math.toRadians(place.position().lat()));
        this.metresPerUnit = halfHeight() / (HEIGHT / 2.0);
        double lon = metresPerUnit * WIDTH / 2 / metresPerLon;
        double lat = metresPerUnit * HEIGHT / 2 / METRES_PER_DEGREE;
        Position at = place.position();
        this.frame = new Envelope(at.lon() - lon, at.lon() + lon, at.lat() - lat, at.lat() + lat);
    }

    /** So much, in meters, that the structures on both sides are on the map. */
    private double halfHeight() {
        CableLay lay = place.lay();
        Length sheath = place.sheath();
        if (lay == null || sheath == null) {
            return LEAST_METRES;
        }
        var spot = lay.positions().place(sheath);
        int from = Math.max(0, spot.row() - 1);
        int to = Math.min(lay.rows().size() - 1, spot.onSpan() ? spot.row() : spot.row() + 1);
        double most = LEAST_METRES;
        for (int row = from; row <= to; row++) {
            Position position = lay.structure(row).position();
            double east = Math.abs(position.lon() - place.position().lon()) * metresPerLon * HEIGHT / WIDTH;
            double north = Math.abs(position.lat() - place.position().lat()) * METRES_PER_DEGREE;
            most = Math.max(most, 1.3 * Math.max(east, north));
        }
        return Math.min(most, MOST_METRES);
    }

    /** Writes the drawing. */
    void write() {
        html.open(
                "svg",
                "xmlns",
                "http://www.w3.org/2000/svg",
                "class",
                "map",
                "viewBox",
                "0 0 " + WIDTH + " " + HEIGHT,
                "role",
                "img",
                "aria-label",
                "Map of the place, drawn from the records, north up");
        view.records().baseFeatures().list().filter(this::isSeen).forEach(this::base);
        view.records().spans().list().forEach(span -> line(LineOf.span(view.records(), span), "#000", 2));
        route();
        cross();
        structures();
        scale();
        north();
        path(
                "M2 2L" + (WIDTH - 2) + " 2L" + (WIDTH - 2) + " " + (HEIGHT - 2) + "L2 " + (HEIGHT - 2) + "Z",
                "none",
                "#000",
                3);
        html.close();
    }

    private boolean isSeen(BaseFeature feature) {
        return feature.geometry().getEnvelopeInternal().intersects(frame);
    }

    private void base(BaseFeature feature) {
        Geometry whole = feature.geometry();
        for (int part = 0; part < whole.getNumGeometries(); part++) {
            Geometry geometry = whole.getGeometryN(part);
            boolean area = geometry instanceof Polygon;
            String fill = !area ? "none" : feature.layer().equals("building") ? "#ddd" : "#f2f2f2";
            if (geometry.getNumPoints() > 1) {
                path(path(geometry.getCoordinates()), fill, "#999", area ? 2 : 8);
            }
        }
        if (feature.name() != null) {
            Coordinate middle = whole.getCoordinates()[whole.getNumPoints() / 2];
            if (frame.contains(middle)) {
                label(x(middle.x), y(middle.y), feature.name(), 22);
            }
        }
    }

    private void route() {
        CableLay lay = place.lay();
        if (lay == null) {
            return;
        }
        for (int row = 1; row < lay.rows().size(); row++) {
            line(lay.route(row).line().positions(), "#000", 9);
        }
    }

    /** The place, struck through in a ring. */
    private void cross() {
        double x = WIDTH / 2.0;
        double y = HEIGHT / 2.0;
        StringBuilder ring = new StringBuilder();
        for (int step = 0; step < 32; step++) {
            double turn = Math.PI * step / 16;
            ring.append(step == 0 ? 'M' : 'L').append(at(x + 32 * Math.cos(turn), y + 32 * Math.sin(turn)));
        }
        path(ring + "Z", "none", "#000", 7);
        path("M" + at(x - 40, y - 40) + "L" + at(x + 40, y + 40), "none", "#000", 7);
        path("M" + at(x - 40, y + 40) + "L" + at(x + 40, y - 40), "none", "#000", 7);
        labels.add(new Rectangle2D.Double(x - 45, y - 45, 90, 90));
    }

    private void structures() {
        CableLay lay = place.lay();
        List<Structure> seen = new ArrayList<>();
        if (lay != null) {
            for (int row = 0; row < lay.rows().size(); row++) {
                seen.add(lay.structure(row));
            }
        }
        view.records().structures().list().forEach(seen::add);
        seen.stream()
                .distinct()
                .filter(each ->
                        frame.contains(each.position().lon(), each.position().lat()))
                .forEach(this::structure);
    }

    private void structure(Structure structure) {
        double x = x(structure.position().lon());
        double y = y(structure.position().lat());
        path(
                "M" + at(x - 9, y - 9) + "L" + at(x + 9, y - 9) + "L" + at(x + 9, y + 9) + "L" + at(x - 9, y + 9) + "Z",
                "#fff",
                "#000",
                4);
        label(x + 14, y - 10, structure.code(), 27);
    }

    private void label(double x, double y, String text, int size) {
        String said = text.length() > LETTERS ? text.substring(0, LETTERS) : text;
        double width = Typeface.BOLD.width(said, size);
        Rectangle2D room = new Rectangle2D.Double(x, y - size, width, size);
        if (x + width < WIDTH
                && x > 0
                && y < HEIGHT
                && y > size
                && labels.size() < MOST_LABELS
                && labels.stream().noneMatch(room::intersects)) {
            labels.add(room);
            text(x, y, said, size);
        }
    }

    private void scale() {
        double unit = view.unit() == LengthUnit.FOOT ? 0.3048 : 1;
        double most = metresPerUnit * WIDTH / 4 / unit;
        double step = Math.pow(10, Math.floor(Math.log10(most)));
        double length = most >= 5 * step ? 5 * step : most >= 2 * step ? 2 * step : step;
        double units = length * unit / metresPerUnit;
        path(
                "M30 " + (HEIGHT - 75) + "L" + at(60 + units, HEIGHT - 75) + "L" + at(60 + units, HEIGHT - 15) + "L30 "
                        + (HEIGHT - 15) + "Z",
                "#fff",
                "none",
                0);
        path(
                "M40 " + (HEIGHT - 40) + "L40 " + (HEIGHT - 25) + "L" + at(40 + units, HEIGHT - 25) + "L"
                        + at(40 + units, HEIGHT - 40),
                "none",
                "#000",
                5);
        text(
                46,
                HEIGHT - 42,
                String.format(Locale.ROOT, "%,.0f %s", length, view.unit().symbol()),
                26);
    }

    private void north() {
        double x = WIDTH - 60;
        path("M" + at(x, 20) + "L" + at(x + 18, 75) + "L" + at(x, 62) + "L" + at(x - 18, 75) + "Z", "#000", "#000", 1);
        text(x - 11, 108, "N", 30);
    }

    private void line(List<Position> positions, String stroke, int width) {
        Envelope own = new Envelope();
        positions.forEach(each -> own.expandToInclude(each.lon(), each.lat()));
        if (own.intersects(frame)) {
            path(
                    path(positions.stream()
                            .map(each -> new Coordinate(each.lon(), each.lat()))
                            .toArray(Coordinate[]::new)),
                    "none",
                    stroke,
                    width);
        }
    }

    private String path(Coordinate[] line) {
        StringBuilder path = new StringBuilder();
        for (Coordinate each : line) {
            path.append(path.length() == 0 ? 'M' : 'L').append(at(x(each.x), y(each.y)));
        }
        return path.toString();
    }

    private void path(String d, String fill, String stroke, int width) {
        html.empty("path", "d", d, "fill", fill, "stroke", stroke, "stroke-width", Integer.toString(width));
    }

    private void text(double x, double y, String text, int size) {
        String points = Integer.toString(size);
        html.element("text", text, "x", tenth(x), "y", tenth(y), "font-size", points, "font-weight", "bold");
    }

    private double x(double lon) {
        return WIDTH / 2.0 + (lon - place.position().lon()) * metresPerLon / metresPerUnit;
    }

    private double y(double lat) {
        return HEIGHT / 2.0 - (lat - place.position().lat()) * METRES_PER_DEGREE / metresPerUnit;
    }

    private static String at(double x, double y) {
        return tenth(x) + " " + tenth(y);
    }

    private static String tenth(double units) {
        return String.format(Locale.ROOT, "%.1f", units);
    }
}
