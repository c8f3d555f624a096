package spanwright.outage;

import java.util.BitSet;
import java.util.List;
import spanwright.network.Block;

/**
 * A cable section that is cut.
 *
 * @param section the section
 * @param fibers the fibers of it that are cut, rising, from 1
 */
public record CutSection(Block section, List<Integer> fibers) {

    /** Keeps its own copy of the list. */
    public CutSection {
        fibers = List.copyOf(fibers);
    }

    CutSection(Block section, BitSet fibers) {
        this(section, fibers.stream().mapToObj(bit -> bit + 1).toList());
    }
}
