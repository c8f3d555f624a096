package spanwright.answers;

import java.util.List;
import net.sf.geographiclib.Geodesic;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Position;

/** The true bearing in which something leaves a place. */
final class Bearing {

    private Bearing() {}

    /** Degrees from north, 0 to below 360, in which a line leaves its first position; null where it goes nowhere. */
    static @Nullable Double leaving(List<Position> line) {
        Position from = line.get(0);
        for (Position to : line) {
            if (!to.equals(from)) {
                double azimuth = Geodesic.WGS84.Inverse(from.lat(), from.lon(), to.lat(), to.lon()).azi1;
                return Math.round((azimuth < 0 ? azimuth + 360 : azimuth) * 100) / 100.0 % 360;
            }
        }
        return null;
    }
}
