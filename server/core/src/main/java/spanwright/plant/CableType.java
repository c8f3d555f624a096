package spanwright.plant;

import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/**
 * A type of cable.
 *
 * @param id lasting identity
 * @param code unique
 * @param fibers how many, above 0
 * @param fibersPerTube how many in a tube or unit, above 0
 * @param fiberType code of the fiber type, built in or recorded
 * @param overlengthPct excess length in per cent; glass = sheath x (1 + overlength/100)
 * @param ribbon whether the fibers lie in ribbons
 * @param fibersPerRibbon how many in a ribbon, or null
 * @param colors code of the colour order, built in or recorded
 */
public record CableType(
        int id,
        String code,
        int fibers,
        int fibersPerTube,
        String fiberType,
        double overlengthPct,
        boolean ribbon,
        @Nullable Integer fibersPerRibbon,
        String colors)
        implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.CABLE_TYPE;
    }

    /**
     * The tube (from 1) in which a fiber lies.
     *
     * @throws IllegalArgumentException where the type has no such fiber
     */
    public int tubeOf(int fiber) {
        return indexOf(fiber) / fibersPerTube + 1;
    }

    /**
     * The position (from 1) of a fiber within its tube.
     *
     * @throws IllegalArgumentException where the type has no such fiber
     */
    public int positionInTube(int fiber) {
        return indexOf(fiber) % fibersPerTube + 1;
    }

    private int indexOf(int fiber) {
        if (fiber < 1 || fiber > fibers) {
            throw new IllegalArgumentException(code + " has fibers 1 to " + fibers + ", not " + fiber);
        }
        return fiber - 1;
    }

    /** How many tubes there are; the last may be part filled. */
    public int tubes() {
        return (fibers + fibersPerTube - 1) / fibersPerTube;
    }
}
