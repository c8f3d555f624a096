package spanwright.trace;

import java.util.List;

/**
 * Where the glass of a path lies on the map.
 *
 * @param points from the path's start on, linear between: every bend of the route, both sides of each coil, of tray glass
 *     and of a jumper; glass, sheath and route rise or stay
 * @param stations the structures passed, in order, once each time
 */
public record GlassTrack(List<TrackPoint> points, List<Station> stations) {

    /** Keeps its own copies. */
    public GlassTrack {
        points = List.copyOf(points);
        stations = List.copyOf(stations);
    }

    /** The track of a path. */
    public static GlassTrack of(Path path) {
        TrackBuilder builder = new TrackBuilder();
        path.elements().forEach(builder::add);
        return builder.build();
    }
}
