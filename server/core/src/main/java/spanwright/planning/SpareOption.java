package spanwright.planning;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;

/**
 * Spare fibers from one structure to another, all along the same spans.
 *
 * @param runs a path each
 * @param sameTube whether they lie in one tube throughout each cable
 * @param opened identities of the enclosures in which new splices are made, in order
 * @param jumpers new jumpers, those of all its paths
 * @param glass the longest path's
 * @param loss the worst path's; null where the loss of a fiber at the wavelength is not known
 * @param spans identities of the spans, in order
 * @param cost what it is ranked by
 */
public record SpareOption(
        List<SpareRun> runs,
        boolean sameTube,
        List<Integer> opened,
        int jumpers,
        Length glass,
        @Nullable Loss loss,
        List<Integer> spans,
        SpareCost cost) {

    /** Keeps its own copies. */
    public SpareOption {
        runs = List.copyOf(runs);
        opened = List.copyOf(opened);
        spans = List.copyOf(spans);
    }

    /** Whether every joint that is there on the way is verified. */
    public boolean verified() {
        return cost.unverified() == 0;
    }
}
