package spanwright.plant;

import java.util.List;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/**
 * A cable in an enclosure.
 *
 * @param id lasting identity
 * @param enclosure identity of the enclosure
 * @param cable identity of the cable
 * @param runRow identity of the run row at which it is there
 * @param opened fibers cut here, beside those that joints name
 * @param tubesOpened tubes whose fibers are laid bare, beside those of cut fibers
 */
public record Pass(int id, int enclosure, int cable, int runRow, List<FiberRange> opened, List<FiberRange> tubesOpened)
        implements Recorded {

    /** Keeps its own copies of the lists. */
    public Pass {
        opened = List.copyOf(opened);
        tubesOpened = List.copyOf(tubesOpened);
    }

    @Override
    public RecordKind kind() {
        return RecordKind.PASS;
    }
}
