package spanwright.fault;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.fault.GlassPart.Kind;
import spanwright.quantity.Length;
import spanwright.trace.Connector;
import spanwright.trace.Element;
import spanwright.trace.Fiber;
import spanwright.trace.Jumper;
import spanwright.trace.Path;
import spanwright.trace.Splice;
import spanwright.trace.SplitterCrossing;
import spanwright.trace.Through;

/**
 * The glass of a path as far as its group index is known, in the order in which light meets it, and the joints between.
 * One thread's.
 */
final class GlassParts {

    private final Path path;
    private final List<GlassPart> parts = new ArrayList<>();
    private final List<JointPoint> joints = new ArrayList<>();
    private @Nullable String unknownBeyond;

    private GlassParts(Path path) {
        this.path = path;
    }

    /**
     * A joint of the path, or an enclosure that it passes uncut.
     *
     * @param enclosure identity of the enclosure
     * @param part index of the part that begins there
     */
    record JointPoint(int enclosure, int part) {}

    /** The glass of a path. */
    static GlassParts of(Path path, GlassIndex index) {
        GlassParts glass = new GlassParts(path);
        for (int element = 0; element < path.elements().size() && glass.unknownBeyond == null; element++) {
            glass.add(element, path.elements().get(element), index);
        }
        return glass;
    }

    private void add(int at, Element element, GlassIndex index) {
        switch (element.kind()) {
            case FIBER, JUMPER -> addGlass(at, element, index);
            case CONNECTOR -> joint(((Connector) element).enclosure().id());
            case SPLICE -> joint(((Splice) element).enclosure().id());
            case THROUGH -> joint(((Through) element).enclosure().id());
            case SPLITTER -> joint(((SplitterCrossing) element).enclosure().id());
        }
    }

    private void joint(int enclosure) {
        joints.add(new JointPoint(enclosure, parts.size()));
    }

    private void addGlass(int at, Element element, GlassIndex index) {
        Optional<Double> value = index.find(element);
        if (value.isEmpty()) {
            unknownBeyond = index.whyNot(element);
            return;
        }
        if (element instanceof Fiber fiber) {
            tray(at, Kind.TRAY_FROM, fiber.fromTray(), value.get());
            parts.add(new GlassPart(at, Kind.SHEATH, fiber.lay().glass(fiber.sheath()), value.get()));
            tray(at, Kind.TRAY_TO, fiber.toTray(), value.get());
        } else {
            parts.add(new GlassPart(at, Kind.JUMPER, ((Jumper) element).glass(), value.get()));
        }
    }

    private void tray(int at, Kind kind, Length length, double index) {
        if (length.micrometres() > 0) {
            parts.add(new GlassPart(at, kind, length, index));
        }
    }

    Path path() {
        return path;
    }

    int size() {
        return parts.size();
    }

    GlassPart part(int part) {
        return parts.get(part);
    }

    Element element(int part) {
        return path.elements().get(parts.get(part).element());
    }

    List<JointPoint> joints() {
        return joints;
    }

    /** Whether the path comes to an enclosure. */
    boolean comesTo(int enclosure) {
        return joints.stream().anyMatch(joint -> joint.enclosure() == enclosure);
    }

    /** Why the index of the glass that follows is not known; null where it is known to the path's end. */
    @Nullable
    String unknownBeyond() {
        return unknownBeyond;
    }

    /** The sheath of the fibers before a part, and of its own fiber where that lies before it. */
    Length sheathBefore(int part) {
        Length sheath = Length.ZERO;
        for (int earlier = 0; earlier < part; earlier++) {
            if (parts.get(earlier).kind() == Kind.SHEATH) {
                sheath = sheath.plus(((Fiber) element(earlier)).sheath());
            }
        }
        return sheath;
    }
}
