package spanwright.trace;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Enclosure;
import spanwright.plant.Position;
import spanwright.plant.RouteLine;
import spanwright.plant.SheathPositions;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.records.CableLay;

/** Lays a track element by element. */
final class TrackBuilder {

    private final List<TrackPoint> points = new ArrayList<>();
    private final List<Stop> stops = new ArrayList<>();
    private Length glass = Length.ZERO;
    private Length sheath = Length.ZERO;
    private Length route = Length.ZERO;

    /** A structure at which the track has come to, while it stays there. */
    private static final class Stop {

        private final Structure structure;
        private @Nullable Enclosure enclosure;
        private TrackPoint at;
        private @Nullable TrackPoint coilFrom;
        private @Nullable TrackPoint coilTo;
        private Length coil = Length.ZERO;

        private Stop(Structure structure, @Nullable Enclosure enclosure, TrackPoint at) {
            this.structure = structure;
            this.enclosure = enclosure;
            this.at = at;
        }

        /** Whether the track stays at this stop: the same structure, and not from one enclosure to another. */
        private boolean holds(Structure other, @Nullable Enclosure within) {
            return structure.id() == other.id()
                    && (enclosure == null || within == null || enclosure.id() == within.id());
        }

        private Station station() {
            return new Station(
                    structure, enclosure, coilFrom == null || coilTo == null ? at : middle(coilFrom, coilTo), coil);
        }

        private static TrackPoint middle(TrackPoint from, TrackPoint to) {
            return new TrackPoint(
                    between(from.glass(), to.glass()),
                    between(from.sheath(), to.sheath()),
                    between(from.route(), to.route()),
                    from.position());
        }

        private static Length between(Length from, Length to) {
            return new Length(from.micrometres() + (to.micrometres() - from.micrometres()) / 2);
        }
    }

    void add(Element element) {
        switch (element.kind()) {
            case FIBER -> addFiber((Fiber) element);
            case JUMPER -> addJumper((Jumper) element);
            case CONNECTOR -> stay(element, ((Connector) element).enclosure());
            case SPLICE -> stay(element, ((Splice) element).enclosure());
            case THROUGH -> stay(element, ((Through) element).enclosure());
            case SPLITTER -> stay(element, ((SplitterCrossing) element).enclosure());
        }
    }

    private void stay(Element element, Enclosure enclosure) {
        mark(element.structure().position());
        comeTo(element.structure(), enclosure);
    }

    private void addJumper(Jumper jumper) {
        mark(jumper.structure().position());
        glass = glass.plus(jumper.glass());
        mark(jumper.structure().position());
    }

    private void addFiber(Fiber fiber) {
        CableLay lay = fiber.lay();
        Length glassFrom = glass.plus(fiber.fromTray());
        Length sheathFrom = sheath;
        mark(fiber.structure().position());
        comeTo(fiber.structure(), enclosure(fiber.from()));
        Leg leg = new Leg(lay, fiber.fromPosition(), glassFrom, sheathFrom);
        goTo(leg, fiber.fromPosition(), fiber.structure().position());
        int step = fiber.ahead() ? 1 : -1;
        coil(
                leg,
                fiber.fromRow(),
                fiber.ahead()
                        ? lay.positions().out(fiber.fromRow())
                        : lay.positions().in(fiber.fromRow()));
        for (int row = fiber.fromRow() + step; row != fiber.toRow() + step; row += step) {
            travel(leg, row, fiber.ahead());
            boolean last = row == fiber.toRow();
            comeTo(lay.structure(row), last ? enclosure(fiber.to()) : null);
            SheathPositions positions = lay.positions();
            coil(leg, row, last ? fiber.toPosition() : fiber.ahead() ? positions.out(row) : positions.in(row));
        }
        glass = glass.plus(fiber.toTray());
        mark(fiber.toStructure().position());
        atJoint();
    }

    private static @Nullable Enclosure enclosure(Optional<Enclosure> enclosure) {
        return enclosure.orElse(null);
    }

    /** A fiber's cable as it is walked: where its sheath and its glass began. */
    private record Leg(CableLay lay, Length from, Length glassFrom, Length sheathFrom) {}

    /** Goes on along the sheath to a position. */
    private void goTo(Leg leg, Length position, Position place) {
        Length walked = position.minus(leg.from()).abs();
        sheath = leg.sheathFrom().plus(walked);
        glass = leg.glassFrom().plus(leg.lay().glass(walked));
        mark(place);
    }

    private void coil(Leg leg, int row, Length to) {
        TrackPoint before = points.get(points.size() - 1);
        goTo(leg, to, leg.lay().structure(row).position());
        TrackPoint after = points.get(points.size() - 1);
        Length coiled = after.sheath().minus(before.sheath());
        if (coiled.micrometres() > 0) {
            Stop stop = stops.get(stops.size() - 1);
            stop.coilFrom = stop.coilFrom == null ? before : stop.coilFrom;
            stop.coilTo = after;
            stop.coil = stop.coil.plus(coiled);
        }
    }

    /** Along the span between a row and the one before it as the walk goes, bend by bend. */
    private void travel(Leg leg, int row, boolean ahead) {
        CableLay lay = leg.lay();
        int spanTo = ahead ? row : row + 1;
        Length from = ahead ? lay.positions().out(spanTo - 1) : lay.positions().in(spanTo);
        Length to = ahead ? lay.positions().in(spanTo) : lay.positions().out(spanTo - 1);
        Length length = lay.route(spanTo).length();
        RouteLine line =
                ahead ? lay.route(spanTo).line() : lay.route(spanTo).line().reversed();
        Length routeFrom = route;
        for (int bend = 0; bend < line.positions().size(); bend++) {
            double fraction = line.fractionOf(bend);
            route = routeFrom.plus(length.times(fraction));
            goTo(
                    leg,
                    from.plus(to.minus(from).times(fraction)),
                    line.positions().get(bend));
        }
    }

    private void mark(Position place) {
        TrackPoint point = new TrackPoint(glass, sheath, route, place);
        if (points.isEmpty() || !points.get(points.size() - 1).equals(point)) {
            points.add(point);
        }
    }

    /** The track is at a structure, in an enclosure or not: it stays at the same stop, or comes to the next one. */
    private void comeTo(Structure structure, @Nullable Enclosure enclosure) {
        Stop stop = stops.isEmpty() ? null : stops.get(stops.size() - 1);
        if (stop == null || !stop.holds(structure, enclosure)) {
            stops.add(new Stop(structure, enclosure, points.get(points.size() - 1)));
        } else if (stop.enclosure == null) {
            stop.enclosure = enclosure;
        }
    }

    /** Without a coil a stop is where its first joint is. */
    private void atJoint() {
        stops.get(stops.size() - 1).at = points.get(points.size() - 1);
    }

    GlassTrack build() {
        return new GlassTrack(points, stops.stream().map(Stop::station).toList());
    }
}
