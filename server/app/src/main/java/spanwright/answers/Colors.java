package spanwright.answers;

import java.util.List;
import java.util.stream.IntStream;
import spanwright.plant.BuiltInColors;
import spanwright.plant.CableType;
import spanwright.plant.FiberColors;

/** The colours of a cable's tubes and fibers, in words. */
final class Colors {

    private final CableType type;
    private final FiberColors order;

    Colors(View view, CableType type) {
        this.type = type;
        this.order = view.catalogue()
                .findColors(type.colors())
                .or(() -> BuiltInColors.find(BuiltInColors.list().get(0)))
                .orElseThrow();
    }

    String tube(int tube) {
        return order.at(tube);
    }

    String fiber(int fiber) {
        return order.at(type.positionInTube(fiber));
    }

    /** The colour of each tube, the first tube first. */
    List<String> tubes() {
        return IntStream.rangeClosed(1, type.tubes()).mapToObj(order::at).toList();
    }

    /** The colour of each place in a tube. */
    List<String> places() {
        return IntStream.rangeClosed(1, Math.min(type.fibersPerTube(), type.fibers()))
                .mapToObj(order::at)
                .toList();
    }
}
