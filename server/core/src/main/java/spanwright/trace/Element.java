package spanwright.trace;

import spanwright.plant.Structure;
import spanwright.quantity.Length;

/** One thing that a path meets. */
public sealed interface Element permits Connector, Fiber, Jumper, Splice, SplitterCrossing, Through {

    /** What it is. */
    ElementKind kind();

    /** The structure where it is; of a fiber, where it begins as the walk goes. */
    Structure structure();

    /** The glass in it; zero for all but fibers and jumpers. */
    default Length glass() {
        return Length.ZERO;
    }
}
