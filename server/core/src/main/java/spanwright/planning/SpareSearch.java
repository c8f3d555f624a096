package spanwright.planning;

import java.util.BitSet;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import spanwright.network.Network;
import spanwright.quantity.Wavelength;

/**
 * Finds the path over spare glass with the least work, and of those the least loss, that keeps a bound of loss: exactly,
 * by setting labels of work and loss in order. Light goes on along a spare piece and across a joint as it is for nothing;
 * it changes over to another spare end of the enclosure by a new splice or pigtail, to another free front of the structure
 * by a jumper. One thread's.
 *
 * <p>Of pieces that are alike one is tried in each direction: more never helps, for a path that enters the same bundle
 * twice the same way would do with less.
 */
public final class SpareSearch {

    private final SpareGlass glass;
    private final Runnable step;
    private final Map<Wavelength, SearchLosses> losses = new HashMap<>();

    private BitSet closed = new BitSet();
    private SpareMarks closedMarks;

    /** A search of that glass that runs to its end. */
    public SpareSearch(SpareGlass glass) {
        this(glass, () -> {});
    }

    /**
     * A search of that glass.
     *
     * @param step run every so often while it searches; it stops the search by what it throws
     */
    public SpareSearch(SpareGlass glass, Runnable step) {
        this.glass = glass;
        this.step = step;
        this.closedMarks = new SpareMarks(network());
    }

    /** The glass it searches. */
    public SpareGlass glass() {
        return glass;
    }

    /** The best path, if there is one. */
    public Optional<SpareWay> find(SpareQuery query) {
        return new SpareLabels(
                        glass,
                        losses.computeIfAbsent(query.wavelength(), nm -> new SearchLosses(glass.snapshot(), nm)),
                        marks(query.closed()),
                        query,
                        step)
                .find();
    }

    /** What is closed stays the same for many searches in a row. */
    private SpareMarks marks(BitSet pieces) {
        if (!pieces.equals(closed)) {
            closed = pieces;
            closedMarks = new SpareMarks(network()).closed(pieces);
        }
        return closedMarks;
    }

    Network network() {
        return glass.snapshot().network();
    }
}
