package spanwright.fault;

import java.util.List;
import java.util.Optional;
import spanwright.quantity.Length;

/** A path's glass laid along what the instrument reads, stretched between known events. One thread's. */
final class GlassRuler {

    /** Half a micrometre: what rounding to the micrometre can do to a length. */
    private static final double ROUNDING = 5e-7;

    private final GlassParts parts;
    private final List<Anchor> anchors;
    private final double[] stretch;

    /**
     * A ruler.
     *
     * @param anchors the points whose readings are known, the path's start first
     * @param stretch by how much each part is longer than the records say
     */
    GlassRuler(GlassParts parts, List<Anchor> anchors, double[] stretch) {
        this.parts = parts;
        this.anchors = anchors;
        this.stretch = stretch;
    }

    GlassParts parts() {
        return parts;
    }

    List<Anchor> anchors() {
        return anchors;
    }

    /** The glass from the path's start to the beginning of a part, in meters, as it is stretched. */
    double glassTo(int part) {
        double metres = 0;
        for (int each = 0; each < part; each++) {
            metres += stretch[each] * parts.part(each).length().metres();
        }
        return metres;
    }

    /** The point at an optical length; none where it lies in or beyond glass whose index is not known. */
    Optional<Spot> locate(double optical) {
        double read = anchors.get(0).optical();
        double glass = 0;
        for (int part = 0; part < parts.size(); part++) {
            double metres = stretch[part] * parts.part(part).length().metres();
            double end = read + metres * parts.part(part).index();
            if (optical <= end + ROUNDING) {
                double within = Math.max(
                        0, Math.min(metres, (optical - read) / parts.part(part).index()));
                return Optional.of(spot(part, within, glass + within, Spot.NOT_BEYOND));
            }
            read = end;
            glass += metres;
        }
        return parts.unknownBeyond() == null ? Optional.of(beyond(optical - read, glass)) : Optional.empty();
    }

    private Spot beyond(double optical, double glass) {
        int last = parts.size() - 1;
        Length over = last < 0 && optical <= ROUNDING
                ? Spot.NOT_BEYOND
                : Length.ofMetres(optical / (last < 0 ? 1 : parts.part(last).index()));
        double within = last < 0 ? 0 : stretch[last] * parts.part(last).length().metres();
        return spot(last, within, glass, over);
    }

    private Spot spot(int part, double within, double glass, Length over) {
        Length records = part < 0 ? Length.ZERO : Length.ofMetres(within / stretch[part]);
        return new Spot(part, records, Length.ofMetres(glass), over);
    }
}
