package spanwright.exchange;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import spanwright.plant.Cable;
import spanwright.plant.Line;
import spanwright.plant.Position;
import spanwright.plant.RouteLine;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.records.RecordsView;

/**
 * The lines of spans and cables on a map: none where there is no place, one position for a point, else lines of two
 * positions or more. A line that crosses the antimeridian is cut there, as RFC 7946, section 3.1.9, asks.
 */
final class MapLines {

    private final RecordsView view;

    MapLines(RecordsView view) {
        this.view = view;
    }

    /** The line of a span; a point where it lies at one structure. */
    List<List<Position>> of(Span span) {
        return cut(positions(span));
    }

    /** The line of a cable along its run; nothing where it has none. */
    List<List<Position>> of(Cable cable) {
        List<Position> all = new ArrayList<>();
        RunRow before = null;
        for (RunRow row : view.runOf(cable.id())) {
            if (before == null || row.span() == null) {
                add(all, position(row.structure()));
            } else {
                Span span = view.spans().get(row.span());
                List<Position> along = new ArrayList<>(positions(span));
                Position from = position(before.structure());
                if (RouteLine.metres(from, along.get(0)) > RouteLine.metres(from, along.get(along.size() - 1))) {
                    // A span may be travelled, and its line be drawn, either way round.
                    Collections.reverse(along);
                }
                along.forEach(position -> add(all, position));
            }
            before = row;
        }
        return cut(all);
    }

    private List<Position> positions(Span span) {
        Line line = span.line();
        if (line != null) {
            return line.positions();
        }
        return span.from() == span.to()
                ? List.of(position(span.from()))
                : List.of(position(span.from()), position(span.to()));
    }

    private Position position(int structure) {
        return view.structures().get(structure).position();
    }

    private static void add(List<Position> all, Position position) {
        if (all.isEmpty() || !all.get(all.size() - 1).equals(position)) {
            all.add(position);
        }
    }

    private static List<List<Position>> cut(List<Position> all) {
        List<List<Position>> lines = new ArrayList<>();
        List<Position> line = new ArrayList<>();
        for (Position position : all) {
            if (!line.isEmpty()) {
                Position last = line.get(line.size() - 1);
                double east = position.lon() - last.lon();
                if (Math.abs(east) > 180) {
                    double edge = Math.copySign(180, last.lon());
                    double lat = latAtEdge(last, position, edge);
                    add(line, new Position(edge, lat));
                    lines.add(line);
                    line = new ArrayList<>(List.of(new Position(-edge, lat)));
                }
            }
            add(line, position);
        }
        if (!line.isEmpty()) {
            lines.add(line);
        }
        // Beside a whole line, a stub of one position on the antimeridian says nothing.
        return lines.size() > 1 ? lines.stream().filter(one -> one.size() > 1).toList() : lines;
    }

    private static double latAtEdge(Position one, Position other, double edge) {
        double unrolled = other.lon() + 2 * edge;
        double way = unrolled - one.lon();
        return way == 0 ? one.lat() : one.lat() + (other.lat() - one.lat()) * (edge - one.lon()) / way;
    }
}
