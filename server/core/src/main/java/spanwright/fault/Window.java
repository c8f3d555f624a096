package spanwright.fault;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import spanwright.plant.Position;
import spanwright.plant.RouteLine;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.trace.Fiber;
import spanwright.trace.GlassTrack;
import spanwright.trace.Path;
import spanwright.trace.TrackPoint;

/**
 * The stretch of a path within which the true place lies.
 *
 * @param line where it lies on the map, from the side of the port on; one position where it does not leave a structure
 * @param coils the structures whose coils it touches, the nearest first
 */
public record Window(List<Position> line, List<Structure> coils) {

    /** Keeps its own copies. */
    public Window {
        line = List.copyOf(line);
        coils = List.copyOf(coils);
    }

    /**
     * The window around a point.
     *
     * @param at the point, along the path's sheath
     * @param within how far it reaches either side
     */
    static Window of(Path path, Length at, Length within) {
        Length from = at.minus(within);
        Length to = at.plus(within);
        return new Window(line(GlassTrack.of(path).points(), from, to), coils(path, at, within));
    }

    private static List<Position> line(List<TrackPoint> points, Length from, Length to) {
        List<Position> line = new ArrayList<>();
        TrackPoint before = points.get(0);
        for (TrackPoint point : points) {
            findBetween(before, point, from).ifPresent(place -> add(line, place));
            if (point.sheath().compareTo(from) >= 0 && point.sheath().compareTo(to) <= 0) {
                add(line, point.position());
            }
            findBetween(before, point, to).ifPresent(place -> add(line, place));
            before = point;
        }
        return line;
    }

    private static void add(List<Position> line, Position place) {
        if (line.isEmpty() || !line.get(line.size() - 1).equals(place)) {
            line.add(place);
        }
    }

    /** The position at a length of sheath, where that lies strictly between two points. */
    private static Optional<Position> findBetween(TrackPoint before, TrackPoint after, Length sheath) {
        if (before.sheath().compareTo(sheath) >= 0 || after.sheath().compareTo(sheath) <= 0) {
            return Optional.empty();
        }
        double share = (double) sheath.minus(before.sheath()).micrometres()
                / after.sheath().minus(before.sheath()).micrometres();
        return Optional.of(
                RouteLine.along(List.of(before.position(), after.position())).at(share));
    }

    /** A coil of the path, and how far it is from the point. */
    private record NearCoil(Structure structure, Length away) {}

    private static List<Structure> coils(Path path, Length at, Length within) {
        List<NearCoil> coils = new ArrayList<>();
        Length walked = Length.ZERO;
        for (Fiber fiber : path.list(Fiber.class)) {
            addCoils(coils, fiber, at.minus(walked));
            walked = walked.plus(fiber.sheath());
        }
        return coils.stream()
                .filter(coil -> coil.away().compareTo(within) <= 0)
                .sorted(Comparator.comparing(NearCoil::away))
                .map(NearCoil::structure)
                .distinct()
                .toList();
    }

    /**
     * Adds the coils of a fiber.
     *
     * @param at the point, from where the walk comes into the fiber; beyond it perhaps
     */
    private static void addCoils(List<NearCoil> coils, Fiber fiber, Length at) {
        CableLay lay = fiber.lay();
        Length position = fiber.ahead()
                ? fiber.fromPosition().plus(at)
                : fiber.fromPosition().minus(at);
        int last = Math.max(fiber.fromRow(), fiber.toRow());
        for (int row = Math.min(fiber.fromRow(), fiber.toRow()); row <= last; row++) {
            if (lay.positions().coil(row).micrometres() > 0) {
                Length shortOf = lay.positions().in(row).minus(position);
                Length beyond = position.minus(lay.positions().out(row));
                coils.add(new NearCoil(lay.structure(row), larger(Length.ZERO, larger(shortOf, beyond))));
            }
        }
    }

    private static Length larger(Length one, Length other) {
        return one.compareTo(other) >= 0 ? one : other;
    }
}
