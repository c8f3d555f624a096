package spanwright.sheet;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Trust;
import spanwright.splicing.EndState;

/** States of ends as a line says them over what is recorded. */
final class StateFacts {

    private StateFacts() {}

    /** Whether a line says of an end what is recorded of it. */
    static boolean repeats(Statement.States said, EndState recorded) {
        return said.condition() == recorded.condition()
                && (said.trust() == null || said.trust() == recorded.trust())
                && (said.seen() == null || said.seen().equals(recorded.verifiedOn()));
    }

    /** The states to add for some indexes of a line; their identities are given when they are added. */
    static List<EndState> list(Statement.States said, BitSet indexes, int enclosure, Map<Long, EndState> before) {
        List<EndState> states = new ArrayList<>();
        for (RangeParts.Run run : RangeParts.runs(indexes)) {
            EndState known = before.get(said.range().key(run.from()));
            boolean same = known != null && known.condition() == said.condition();
            states.add(new EndState(
                    1,
                    enclosure,
                    RangeParts.part(said.range(), run),
                    said.condition(),
                    trust(said, same ? known : null),
                    seen(said, same ? known : null)));
        }
        return states;
    }

    private static Trust trust(Statement.States said, @Nullable EndState known) {
        if (said.trust() != null) {
            return said.trust();
        }
        return known == null ? Trust.POSTED : known.trust();
    }

    private static @Nullable LocalDate seen(Statement.States said, @Nullable EndState known) {
        if (said.seen() != null) {
            return said.seen();
        }
        return known == null ? null : known.verifiedOn();
    }
}
