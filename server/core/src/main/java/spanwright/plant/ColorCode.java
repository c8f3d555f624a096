package spanwright.plant;

import java.util.List;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/**
 * A colour order by position.
 *
 * @param id lasting identity
 * @param code unique
 * @param colors colour in words; the first is position 1
 */
public record ColorCode(int id, String code, List<String> colors) implements Recorded {

    /** Keeps its own copy of the list. */
    public ColorCode {
        colors = List.copyOf(colors);
    }

    @Override
    public RecordKind kind() {
        return RecordKind.COLOR_CODE;
    }
}
