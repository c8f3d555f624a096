package spanwright.atlas;

import java.util.ArrayList;
import java.util.List;
import spanwright.plant.Line;
import spanwright.plant.Position;
import spanwright.plant.Span;
import spanwright.records.Records;

/** The lines of spans as they are drawn. */
public final class LineOf {

    /** A web map's tile is 256 pixels wide; at zoom 0 one holds the world's 360 degrees. */
    private static final double DEGREES_PER_PIXEL = 360.0 / 256;

    private LineOf() {}

    /** A span's positions from its {@code from} to its {@code to}: its line, else straight between the structures. */
    public static List<Position> span(Records records, Span span) {
        Line line = span.line();
        return line != null
                ? line.positions()
                : List.of(
                        records.structures().get(span.from()).position(),
                        records.structures().get(span.to()).position());
    }

    /** How many degrees a pixel is wide at a zoom. */
    public static double pixel(double zoom) {
        return DEGREES_PER_PIXEL / Math.pow(2, zoom);
    }

    /** The positions that can be told apart at a zoom: those nearer than a pixel to the one kept before are left out. */
    public static List<Position> thinned(List<Position> positions, double zoom) {
        if (positions.size() == 2) {
            return positions;
        }
        double pixel = pixel(zoom);
        List<Position> kept = new ArrayList<>();
        Position last = positions.get(0);
        kept.add(last);
        for (Position position : positions.subList(1, positions.size() - 1)) {
            if (Math.abs(position.lon() - last.lon()) >= pixel || Math.abs(position.lat() - last.lat()) >= pixel) {
                kept.add(position);
                last = position;
            }
        }
        kept.add(positions.get(positions.size() - 1));
        return kept;
    }
}
