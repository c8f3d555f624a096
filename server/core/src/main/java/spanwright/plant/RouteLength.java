package spanwright.plant;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;

/**
 * How long a span is along its route, and where it lies.
 *
 * @param length the measured length, else the WGS 84 geodesic length of the line
 * @param basis {@link LengthBasis#MEASURED} or {@link LengthBasis#GEODESIC}
 * @param line its line from the span's {@code from} to its {@code to}, the straight geodesic where none is drawn
 */
public record RouteLength(Length length, LengthBasis basis, RouteLine line) {

    /**
     * The route length of a span.
     *
     * @param from where the structure at its beginning is
     * @param to where the structure at its end is
     */
    public static RouteLength of(Span span, Position from, Position to) {
        RouteLine line = lineOf(span.line(), from, to);
        Length measured = span.measuredLength();
        return measured != null
                ? new RouteLength(measured, LengthBasis.MEASURED, line)
                : new RouteLength(Length.ofMetres(line.metres()), LengthBasis.GEODESIC, line);
    }

    /** A drawn line may run either way round; it is turned so that it begins at the structure it is nearer to. */
    private static RouteLine lineOf(@Nullable Line drawn, Position from, Position to) {
        if (drawn == null) {
            return RouteLine.along(List.of(from, to));
        }
        RouteLine line = RouteLine.along(drawn.positions());
        Position first = drawn.positions().get(0);
        if (first.equals(from)) {
            return line;
        }
        Position last = drawn.positions().get(drawn.positions().size() - 1);
        double asDrawn = RouteLine.metres(from, first) + RouteLine.metres(to, last);
        double turned = RouteLine.metres(from, last) + RouteLine.metres(to, first);
        return turned < asDrawn ? line.reversed() : line;
    }

    /** The same span travelled from its {@code to} to its {@code from}. */
    public RouteLength reversed() {
        return new RouteLength(length, basis, line.reversed());
    }
}
