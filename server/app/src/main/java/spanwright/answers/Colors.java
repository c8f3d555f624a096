package spanwright.answers;

import java.util.List;
import java.util.stream.IntStream;
import spanwright.plant.BuiltInColors;
import spanwright.plant.CableType;
import spanwright.plant.FiberColors;

/** The colours of a cable's tubes and fibers, in words. */
public final class Colors {

    private final CableType type;
    private final FiberColors order;

    /** Of a type of cable. */
    public Colors(View view, CableType type) {
        this.type = type;
        this.order = view.catalogue()
                .findColors(type.colors())
                .or(() -> BuiltInColors.find(BuiltInColors.list().get(0)))
                .orElseThrow();
    }

    /** The colour of a tube, from 1. */
    public String tube(int tube) {
        return order.at(tube);
    }

    /** The colour of a fiber, from 1, within its tube. */
    public String fiber(int fiber) {
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
