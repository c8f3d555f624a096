package spanwright.loss;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Wavelength;

/** Values tabled by wavelength, linear between neighbours; outside of them there is none. */
final class Curve {

    private final List<Point> points;

    private Curve(List<Point> points) {
        this.points = points;
    }

    /** One tabled value. */
    private record Point(Wavelength wavelength, double value) {}

    /**
     * A value with the tabled wavelengths on both sides of it; the same one twice where it is tabled itself.
     */
    record Reading(double value, Wavelength below, Wavelength above) {

        /** {@code at 1550 nm} or {@code between 1490 nm and 1529 nm}. */
        String where() {
            return below.equals(above) ? "at " + below : "between " + below + " and " + above;
        }
    }

    /** The rows that give a value; rows in any order. */
    static <T> Curve of(
            Iterable<T> rows, Function<T, Wavelength> wavelength, Function<T, @Nullable Double> valueOrNull) {
        List<Point> points = new ArrayList<>();
        for (T row : rows) {
            Double value = valueOrNull.apply(row);
            if (value != null) {
                points.add(new Point(wavelength.apply(row), value));
            }
        }
        points.sort(Comparator.comparing(Point::wavelength));
        return new Curve(points);
    }

    Optional<Reading> at(Wavelength wavelength) {
        for (int index = 0; index < points.size(); index++) {
            Point above = points.get(index);
            int order = above.wavelength().compareTo(wavelength);
            if (order == 0) {
                return Optional.of(new Reading(above.value(), wavelength, wavelength));
            }
            if (order > 0) {
                return index == 0 ? Optional.empty() : Optional.of(between(points.get(index - 1), wavelength, above));
            }
        }
        return Optional.empty();
    }

    private static Reading between(Point below, Wavelength wavelength, Point above) {
        double share = (wavelength.nanometres() - below.wavelength().nanometres())
                / (above.wavelength().nanometres() - below.wavelength().nanometres());
        return new Reading(
                below.value() + share * (above.value() - below.value()), below.wavelength(), above.wavelength());
    }

    /** {@code from 1260 nm to 1650 nm}, for a sentence; {@code nowhere} where nothing is tabled. */
    String reach() {
        return points.isEmpty()
                ? "nowhere"
                : "from " + points.get(0).wavelength() + " to "
                        + points.get(points.size() - 1).wavelength();
    }
}
